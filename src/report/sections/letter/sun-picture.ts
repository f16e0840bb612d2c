import { rangesBetween } from '../../../core/angles/azimuth-ranges.ts';
import type { Block } from '../../contents/report-contents.ts';
import type { PictureWords } from '../../pictures/picture-words.ts';
import { halved, smoothDensity } from '../../pictures/smooth-density.ts';
import type { DayLine, HourLine } from '../../pictures/sun-lines.ts';
import { dayLines, hourLines } from '../../pictures/sun-lines.ts';
import { unrolledHorizon } from '../../pictures/unrolled-horizon.ts';
import type { ReportInput } from '../../report-input.ts';
import type { Speech } from '../../speech.ts';
import { PICTURE_TEXT, PICTURE_WIDTH } from './picture-size.ts';
import { pictureWords } from './picture-words.ts';
import type { MeasuredRoof } from './roofs.ts';
import { obstructionNames } from './roofs.ts';

/** The sun over the site, the same for all roofs. */
export interface SunOverSite {
  days: DayLine[];
  hours: HourLine[];
  words: PictureWords;
}

export function sunOverSite({ survey }: ReportInput, speech: Speech): SunOverSite {
  const words = pictureWords(speech);
  return { days: dayLines(survey.site, words), hours: hourLines(survey.site), words };
}

const PICTURE = { width: PICTURE_WIDTH, height: 280, textSize: PICTURE_TEXT };

/** The sky as a roof's darkest station sees it. */
export function sunPicture(
  roof: MeasuredRoof,
  { days, hours, words: inPicture }: SunOverSite,
  report: ReportInput,
  speech: Speech,
): Block {
  const { words } = speech;
  const { site, obstructions } = report.survey;
  const nameOf = obstructionNames(report);
  const { shade } = roof.evidence.stations.find(({ id }) => id === roof.evidence.lowest!.id)!;
  const picture = unrolledHorizon(
    {
      site,
      shade,
      density: smoothDensity(halved(shade.density)),
      days,
      hours,
      names: new Map(obstructions.map(({ id }) => [id, nameOf(id)])),
      ...PICTURE,
      whole: false,
      plain: true,
    },
    inPicture,
  );
  const seen = shade.profile.obstructionIds.map(nameOf);
  const hasRings = rangesBetween(shade.observed).length > 0;
  return {
    kind: 'picture',
    picture,
    caption: hasRings ? `${words['sun.caption']} ${words['sun.caption-rings']}` : words['sun.caption'],
    alternative:
      seen.length > 0
        ? words['sun.alternative'](roof.name, speech.list(seen))
        : words['sun.alternative-open'](roof.name),
  };
}
