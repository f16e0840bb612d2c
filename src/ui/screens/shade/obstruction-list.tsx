import type { ObstructionGroup } from '../../../core/shading/assessment.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { listed, percent } from './figures.ts';
import type { Imagined } from './imagined.ts';
import { ObstructionRow, nameOf } from './obstruction-row.tsx';

interface Props {
  survey: Survey;
  shade: StationShade;
  imagined: ReadonlyMap<string, Imagined>;
  onImagine: (id: string, imagined: Imagined | null) => void;
}

/** What stands in the way, the costliest first, each to be imagined away. */
export function ObstructionList({ survey, shade, imagined, onImagine }: Props) {
  const { obstructions, groups } = shade.measured;
  if (obstructions.length === 0)
    return (
      <section class="shade-obstructions">
        <h2>What stands in the way</h2>
        <p>Nothing is traced from here, so nothing is in the way. Azimuths nobody looked at count as open.</p>
      </section>
    );
  const most = Math.max(0.01, ...obstructions.flatMap(({ monthly }) => monthly.map((share) => share ?? 0)));
  return (
    <section class="shade-obstructions">
      <h2>What stands in the way</h2>
      <p class="small">
        In the order of what taking it away would give back, the others left standing. The small bars are the
        months it matters in.
      </p>
      <ol class="obstructions">
        {obstructions.map((row) => (
          <ObstructionRow
            key={row.id}
            row={row}
            obstruction={survey.obstructions.find(({ id }) => id === row.id)!}
            shade={shade}
            most={most}
            imagined={imagined.get(row.id) ?? null}
            onImagine={(change) => onImagine(row.id, change)}
          />
        ))}
      </ol>
      {groups.map((group) => (
        <GroupLine key={group.obstructions.join()} group={group} shade={shade} />
      ))}
    </section>
  );
}

function GroupLine({ group, shade }: { group: ObstructionGroup; shade: StationShade }) {
  const names = group.obstructions.map((id) => nameOf(id, shade.measured));
  return (
    <p class="group-line">
      {listed(names)} hide each other: taking {names.length > 2 ? 'all' : 'both'} away gives back{' '}
      <strong>{percent(group.gainIfAllRemoved)}</strong>, one by one only {percent(group.sumOfSingleGains)}.
    </p>
  );
}
