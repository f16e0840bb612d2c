import { useMemo } from 'preact/hooks';
import type { ObstructionGroup, ObstructionShading } from '../../../core/shading/assessment.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import { obstructionKind } from '../../../core/survey/obstruction-kinds.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { hatchFor } from '../../../report/pictures/hatches.ts';
import { MONTH_NAMES } from '../../../report/pictures/month-columns.ts';
import { monthTicks } from '../../../report/pictures/month-ticks.ts';
import { Drawing } from './drawing.tsx';
import { energy, listed, percent } from './figures.ts';

interface Props {
  survey: Survey;
  shade: StationShade;
  gone: ReadonlySet<string>;
  onToggle: (id: string) => void;
}

/** Below this an obstruction's removal gives nothing worth naming, share of the year. */
const NOTHING = 0.0005;

/** What stands in the way, the costliest first, each to be imagined gone. */
export function ObstructionList({ survey, shade, gone, onToggle }: Props) {
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
          <Row
            key={row.id}
            row={row}
            survey={survey}
            shade={shade}
            most={most}
            gone={gone.has(row.id)}
            onToggle={onToggle}
          />
        ))}
      </ol>
      {groups.map((group) => (
        <GroupLine key={group.obstructions.join()} group={group} shade={shade} />
      ))}
    </section>
  );
}

interface RowProps {
  row: ObstructionShading;
  survey: Survey;
  shade: StationShade;
  /** The largest share of a month any of them takes, for one scale of all bars. */
  most: number;
  gone: boolean;
  onToggle: (id: string) => void;
}

function Row({ row, survey, shade, most, gone, onToggle }: RowProps) {
  const obstruction = survey.obstructions.find(({ id }) => id === row.id)!;
  const place = shade.profile.obstructionIds.indexOf(row.id);
  const swatch = useMemo(() => swatchOf(place), [place]);
  const ticks = useMemo(() => monthTicks(row.monthly, most), [row, most]);
  return (
    <li class="obstruction">
      <Drawing picture={swatch} id={`swatch-${place}`} />
      <div class="obstruction-words">
        <h3>{row.name}</h3>
        <p class="small faint">{obstructionKind(obstruction.kind).name}</p>
        <p>
          {gainText(row, shade)} <span class="small">Alone it would cost {percent(row.lossIfAlone)}.</span>
        </p>
      </div>
      <Drawing picture={ticks} id={`ticks-${place}`} label={ticksText(row)} />
      <button
        type="button"
        class="switch"
        aria-pressed={gone}
        aria-label={`Imagine it gone: ${row.name}`}
        onClick={() => onToggle(row.id)}
      >
        Imagine it gone
      </button>
    </li>
  );
}

const swatchOf = (place: number) => ({
  width: 28,
  height: 44,
  marks: [
    {
      kind: 'path' as const,
      lines: [[1, 1, 27, 1, 27, 43, 1, 43]],
      closed: true,
      fill: { hatch: hatchFor(place) },
      pen: { tone: 'ink' as const, width: 1.5 },
    },
  ],
});

function gainText({ id, gainIfRemoved }: ObstructionShading, { measured, unshaded }: StationShade) {
  if (gainIfRemoved >= NOTHING)
    return (
      <>
        <strong>{percent(gainIfRemoved)}</strong> of the year’s light comes back if it goes,{' '}
        {energy(gainIfRemoved * unshaded.annual)} kWh/m².
      </>
    );
  const partners = measured.groups.find(({ obstructions }) => obstructions.includes(id))?.obstructions ?? [];
  const others = partners.filter((other) => other !== id).map((other) => nameOf(other, measured));
  return others.length > 0
    ? `Nothing comes back unless ${listed(others)} ${others.length > 1 ? 'go' : 'goes'} too.`
    : 'Nothing comes back if it goes.';
}

const nameOf = (id: string, { obstructions }: StationShade['measured']): string =>
  obstructions.find((row) => row.id === id)?.name ?? id;

function ticksText({ name, monthly }: ObstructionShading): string {
  const most = monthly.reduce<number>(
    (best, share, month) => ((share ?? 0) > (monthly[best] ?? 0) ? month : best),
    0,
  );
  const share = monthly[most] ?? 0;
  if (share < NOTHING) return `${name}: matters in no month by itself`;
  return `${name}: matters most in ${MONTH_NAMES[most]}, ${percent(share)} of that month`;
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
