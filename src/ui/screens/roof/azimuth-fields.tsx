import { fullCircle } from '../../../core/angles/angles.ts';
import { ChoiceField } from '../../components/form/choice-field.tsx';
import { TextField } from '../../components/form/text-field.tsx';
import { numberOf, valueOf } from '../../typed.ts';
import { degreesText } from '../../value-text.ts';
import { typedFacing, type NorthTurns, type PlaneDraft } from './plane-draft.ts';

function hintOf(draft: PlaneDraft, turns: NorthTurns): string {
  const facing = valueOf(typedFacing(draft, turns));
  if (draft.bearingOf === 'facing' && draft.north === 'true')
    return draft.sort === 'flat'
      ? 'On a flat roof it fixes the axes: the direction down the slope if it had one.'
      : 'Degrees clockwise from true north, looking down the slope: 180 faces south.';
  return facing === undefined
    ? 'Degrees clockwise from north.'
    : `The plane then faces ${degreesText(facing)}.`;
}

const NORTH_HINTS: Record<PlaneDraft['north'], (turn: number) => string | undefined> = {
  true: () => undefined,
  grid: (turn) => `On the site’s UTM grid, true north lies ${degreesText(Math.abs(turn), 2)} off.`,
  magnetic: (turn) =>
    `Declination here: ${degreesText(Math.abs(turn))} ${turn < 0 ? 'west' : 'east'}. On a metal roof, or near steel, a compass is of no use.`,
};

/** Which way the plane faces: by its own bearing, or by one along its eave. */
export function AzimuthFields(props: {
  draft: PlaneDraft;
  turns: NorthTurns;
  fault: string | null;
  onChange: (change: Partial<PlaneDraft>) => void;
}) {
  const { draft, turns, fault, onChange } = props;
  const along = numberOf(draft.bearing);
  const sides =
    along === null
      ? ['left', 'right']
      : [-90, 90].map((turn) => degreesText(fullCircle(along + turns[draft.north] + turn)));
  return (
    <fieldset class="fields">
      <legend>Azimuth</legend>
      <ChoiceField
        label="What you know of it"
        value={draft.bearingOf}
        options={[
          { value: 'facing', label: 'The bearing it faces' },
          { value: 'eave', label: 'A bearing along its eave or ridge' },
        ]}
        onChoose={(bearingOf) => onChange({ bearingOf })}
      />
      <div class="pair">
        <TextField
          label="Bearing"
          unit="degrees"
          keys="numbers"
          value={draft.bearing}
          onInput={(bearing) => onChange({ bearing })}
          fault={fault}
          hint={hintOf(draft, turns)}
        />
        <ChoiceField
          label="Counted from"
          value={draft.north}
          options={[
            { value: 'true', label: 'True north' },
            { value: 'grid', label: 'Grid north of a map or plan' },
            { value: 'magnetic', label: 'Magnetic north (a compass)' },
          ]}
          onChoose={(north) => onChange({ north })}
          hint={NORTH_HINTS[draft.north](turns[draft.north])}
        />
      </div>
      {draft.bearingOf === 'eave' && (
        <ChoiceField
          label="Square to the eave, it faces"
          value={draft.otherSide ? 'right' : 'left'}
          options={[
            { value: 'left', label: `${sides[0]}, to the left of that bearing` },
            { value: 'right', label: `${sides[1]}, to the right of that bearing` },
          ]}
          onChoose={(side) => onChange({ otherSide: side === 'right' })}
        />
      )}
    </fieldset>
  );
}
