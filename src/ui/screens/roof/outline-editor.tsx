import type { LengthUnit } from '../../../core/pointing/tape-length.ts';
import { TypedRows } from '../../components/typed-rows/typed-rows.tsx';
import type { CornerDraft } from './plane-draft.ts';

/** The corners of a plane as a table: lengths along the eave and up the slope, in order around the edge. */
export function OutlineEditor(props: {
  corners: CornerDraft[];
  unit: LengthUnit;
  fault: string | null;
  onChange: (corners: CornerDraft[]) => void;
}) {
  const inFeet = props.unit === 'feet';
  const unit = inFeet ? 'ft' : 'm';
  return (
    <div class="stack">
      <p class="faint small">
        From the lower-left corner, looking up the slope; {inFeet ? `feet, such as 4' 6",` : 'metres'} along
        the eave to the right, then up the slope. In order around the edge.
      </p>
      <TypedRows
        rows={props.corners}
        columns={[
          { field: 'x', head: `Along (${unit})`, spoken: 'along the eave' },
          { field: 'y', head: `Up (${unit})`, spoken: 'up the slope' },
        ]}
        head="Corner"
        one="corner"
        add="Add a corner"
        fewest={3}
        letters={inFeet}
        fault={props.fault}
        onChange={props.onChange}
      />
    </div>
  );
}
