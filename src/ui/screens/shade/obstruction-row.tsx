import { useMemo } from 'preact/hooks';
import type { ObstructionShading } from '../../../core/shading/assessment.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import { obstructionKind } from '../../../core/survey/obstruction-kinds.ts';
import type { Obstruction } from '../../../core/survey/survey.ts';
import { hatchFor } from '../../../report/pictures/hatches.ts';
import { MONTH_NAMES } from '../../../report/pictures/picture-words.ts';
import { monthTicks } from '../../../report/pictures/month-ticks.ts';
import { Drawing } from './drawing.tsx';
import { energy, listed, percent } from './figures.ts';
import type { Imagined } from './imagined.ts';
import {
  cutsBelow,
  GROWTHS,
  heightOver,
  imaginedBare,
  imaginedGone,
  imaginedGrown,
  imaginedLower,
} from './imagined.ts';

/** Below this an obstruction's removal gives nothing worth naming, share of the year. */
const NOTHING = 0.0005;

interface Props {
  row: ObstructionShading;
  obstruction: Obstruction;
  shade: StationShade;
  /** The largest share of a month any of them takes, for one scale of all bars. */
  most: number;
  imagined: Imagined | null;
  onImagine: (imagined: Imagined | null) => void;
}

/** One thing in the way: what it takes, when, and what it would be to have it away, lower, higher or bare. */
export function ObstructionRow({ row, obstruction, shade, most, imagined, onImagine }: Props) {
  const place = shade.profile.obstructionIds.indexOf(row.id);
  const swatch = useMemo(() => swatchOf(place), [place]);
  const ticks = useMemo(() => monthTicks(row.monthly, most), [row, most]);
  const { name, removable } = obstructionKind(obstruction.kind);
  return (
    <li class="obstruction">
      <Drawing picture={swatch} id={`swatch-${place}`} />
      <div class="obstruction-words">
        <h3>{row.name}</h3>
        <p class="small faint">{name}</p>
        <p>
          {gainText(row, removable, shade)}{' '}
          <span class="small">Alone it would cost {percent(row.lossIfAlone)}.</span>
        </p>
      </div>
      <Drawing picture={ticks} id={`ticks-${place}`} label={ticksText(row)} />
      {removable && (
        <div class="row imagine">
          <button
            type="button"
            class="switch"
            aria-pressed={imagined?.change.kind === 'gone'}
            aria-label={`Imagine it gone: ${row.name}`}
            onClick={() => onImagine(imagined?.change.kind === 'gone' ? null : imaginedGone(row))}
          >
            Imagine it gone
          </button>
          <Otherwise obstruction={obstruction} shade={shade} imagined={imagined} onImagine={onImagine} />
        </div>
      )}
    </li>
  );
}

/** What else could be asked of it: cuts and growth by whole metres where the distance is known, a crown without leaves. */
function Otherwise({ obstruction, shade, imagined, onImagine }: Omit<Props, 'row' | 'most'>) {
  const choices = otherChoices(obstruction, shade);
  if (choices.length === 0) return null;
  const chosen = choices.findIndex(({ words }) => words === imagined?.words);
  return (
    <select
      aria-label={`Imagine it otherwise: ${obstruction.name}`}
      value={String(chosen)}
      onChange={({ currentTarget }) => onImagine(choices[Number(currentTarget.value)] ?? null)}
    >
      <option value="-1">or otherwise …</option>
      {choices.map(({ words }, i) => (
        <option key={words} value={String(i)}>
          {words.slice(obstruction.name.length + 1)}
        </option>
      ))}
    </select>
  );
}

function otherChoices(obstruction: Obstruction, { profile }: StationShade): Imagined[] {
  const { distance } = obstruction;
  const { leaves } = obstructionKind(obstruction.kind);
  const choices: Imagined[] = [];
  if (distance !== undefined) {
    const height = heightOver(profile, obstruction.id, distance);
    choices.push(...cutsBelow(height).map((by) => imaginedLower(obstruction, { height, distance }, by)));
    if (leaves) choices.push(...GROWTHS.map((by) => imaginedGrown(obstruction, distance, by)));
  }
  if (leaves && leaves.off > leaves.on) {
    const place = profile.obstructionIds.indexOf(obstruction.id) * 12;
    const most = Math.max(...profile.transmittance.subarray(place, place + 12));
    choices.push(imaginedBare(obstruction, Math.max(leaves.off, most)));
  }
  return choices;
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

function gainText({ id, gainIfRemoved }: ObstructionShading, removable: boolean, shade: StationShade) {
  const { measured, unshaded } = shade;
  if (gainIfRemoved >= NOTHING)
    return (
      <>
        {removable ? '' : 'It takes '}
        <strong>{percent(gainIfRemoved)}</strong> of the year’s light
        {removable ? ' comes back if it goes' : ''}, {energy(gainIfRemoved * unshaded.annual)} kWh/m².
      </>
    );
  if (!removable) return 'It takes nothing that the others would leave.';
  const group = measured.groups.find(({ obstructions }) => obstructions.includes(id));
  const others = (group?.obstructions ?? [])
    .filter((other) => other !== id)
    .map((other) => nameOf(other, measured));
  if (others.length === 0) return 'Nothing comes back if it goes.';
  return `Nothing comes back unless ${listed(others)} ${others.length > 1 ? 'go' : 'goes'} too.`;
}

/** What an obstruction of a station is called. */
export const nameOf = (id: string, { obstructions }: StationShade['measured']): string =>
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
