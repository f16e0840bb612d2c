import type { RoofPlane, Station, Survey } from '../../../core/survey/survey.ts';
import { LengthField } from '../../components/lengths/length-field.tsx';
import { lengthText, typedOffset } from '../../length-text.ts';
import { valueOf } from '../../typed.ts';
import { IN_FRAME, type StationDraft, type StationFaults } from './station-draft.ts';

/** A roof is rarely longer, nor a site wider; beyond, feet may have been typed as metres. */
const USUAL_METRES = 40;

/** How far a plane reaches along its eave and up its slope, metres, as far as it was measured. */
function reachOf({ width, slopeLength, outline }: RoofPlane): { along?: number; up?: number } {
  if (!outline) return { along: width, up: slopeLength };
  return { along: Math.max(...outline.map(({ x }) => x)), up: Math.max(...outline.map(({ y }) => y)) };
}

/** Where a station stands: on its plane, or in the site's frame. */
export function StationPlace(props: {
  draft: StationDraft;
  survey: Survey;
  station: Station | null;
  faults: StationFaults;
  onChange: (part: Partial<StationDraft>) => void;
}) {
  const { draft, survey, faults, onChange } = props;
  const given = props.station?.position;
  const plane = survey.planes.find(({ id }) => id === draft.on);
  const field = (
    key: 'x' | 'y' | 'east' | 'northward' | 'up',
    label: string,
    stored?: number,
    reach?: number,
  ) => (
    <LengthField
      label={label}
      value={draft[key]}
      signed
      stored={stored}
      usual={reach ?? USUAL_METRES}
      notice={pastEdge(draft, draft[key], stored, reach)}
      onInput={(text) => onChange({ [key]: text })}
      fault={faults[key]}
    />
  );
  if (plane) {
    const stored = given && 'on' in given ? given : undefined;
    const { along, up } = reachOf(plane);
    return (
      <>
        <p class="faint small">
          Measured from the lower-left corner of the plane, looking up the slope; empty where not measured.
        </p>
        <div class="pair">
          {field('x', 'Along the eave', stored?.x, along)}
          {field('y', 'Up the slope', stored?.y, up)}
        </div>
      </>
    );
  }
  if (draft.on !== IN_FRAME) return null;
  const stored = given && !('on' in given) ? given : undefined;
  return (
    <>
      <p class="faint small">
        From the one point of the site that the corners of the planes are measured from; west, south and down
        as minus.
      </p>
      <div class="pair">
        {field('east', 'East', stored?.east)}
        {field('northward', 'North', stored?.north)}
        {field('up', 'Up', stored?.up)}
      </div>
    </>
  );
}

/** A station may stand beside its plane, on a ladder say; but mostly it is a slip. */
function pastEdge({ unit }: StationDraft, text: string, stored?: number, reach?: number): string | undefined {
  const metres = valueOf(typedOffset(text, unit, stored));
  if (metres === undefined || reach === undefined || metres <= reach) return undefined;
  return `Past the edge of the plane, which reaches to ${lengthText(reach, unit)}. Is that so?`;
}
