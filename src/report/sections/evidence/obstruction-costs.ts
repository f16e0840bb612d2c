import type { StationAssessment } from '../../../core/shading/assessment.ts';
import { monthlyTransmittance } from '../../../core/survey/obstruction-kinds.ts';
import { obstructionsById } from '../../../core/survey/served-planes.ts';
import type { Obstruction, Survey } from '../../../core/survey/survey.ts';
import type { Block, Table } from '../../contents/report-contents.ts';
import { shownText } from '../../shown-text.ts';
import type { Speech } from '../../speech.ts';
import type { SectionKind } from '../section-kind.ts';

/** What each obstruction takes at each station. */
export const obstructionCosts: SectionKind = {
  id: 'obstruction-costs',
  part: 'evidence',
  write: ({ assessment, survey }, speech) => {
    const { words } = speech;
    const blocks = assessment.planes.flatMap((plane) =>
      plane.stations.flatMap((station) => stationBlocks(shownText(plane.name), station, survey, speech)),
    );
    if (blocks.length === 0) return null;
    return {
      heading: words['costs.heading'],
      blocks: [{ kind: 'paragraph', text: words['costs.explained'], small: true }, ...blocks],
    };
  },
};

function stationBlocks(plane: string, station: StationAssessment, survey: Survey, speech: Speech): Block[] {
  if (station.obstructions.length === 0) return [];
  const known = obstructionsById(survey);
  const nameOf = (id: string) => shownText(known.get(id)?.name ?? id);
  const { words } = speech;
  return [
    { kind: 'table', table: costTable(plane, station, survey, speech) },
    ...station.groups.map(({ obstructions, gainIfAllRemoved }): Block => ({
      kind: 'paragraph',
      text: words['costs.group'](
        speech.list(obstructions.map(nameOf)),
        words['costs.points'](speech.number(100 * gainIfAllRemoved, 1)),
      ),
      small: true,
    })),
  ];
}

function costTable(plane: string, station: StationAssessment, survey: Survey, speech: Speech): Table {
  const { words } = speech;
  const known = obstructionsById(survey);
  const points = (share: number) => speech.number(100 * share, 1);
  return {
    caption: words['costs.caption'](plane, shownText(station.name)),
    columns: [
      { head: words['costs.obstruction'] },
      { head: words['costs.gain'], number: true },
      { head: words['costs.loss'], number: true },
      { head: words['costs.distance'], number: true },
      { head: words['costs.passes'], number: true },
    ],
    rows: station.obstructions.map(({ id, name, gainIfRemoved, lossIfAlone }) => {
      const obstruction = known.get(id);
      const distance = obstruction?.distance;
      return [
        shownText(name),
        points(gainIfRemoved),
        points(lossIfAlone),
        distance === undefined ? words['costs.unknown-distance'] : speech.length(distance),
        obstruction ? passingText(obstruction, survey.site.latitude, speech) : '–',
      ];
    }),
  };
}

function passingText(obstruction: Obstruction, latitude: number, speech: Speech): string {
  const months = monthlyTransmittance(obstruction, latitude);
  return speech.range(speech.percent(Math.min(...months)), speech.percent(Math.max(...months)));
}
