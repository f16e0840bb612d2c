import type { RoofPlane, Survey } from '../../../core/survey/survey.ts';
import { PhotoStrip } from '../../components/photos/photo-strip.tsx';
import { lengthUnit } from '../../device/length-unit.ts';
import { lengthInput, lengthText } from '../../length-text.ts';
import { degreesText } from '../../value-text.ts';
import { measurePath, newStationPath } from '../stations/station-path.ts';

function sizeOf({ width, slopeLength, outline }: RoofPlane): string {
  if (outline) return `outline of ${outline.length} corners`;
  const unit = lengthUnit.value;
  if (width === undefined && slopeLength === undefined) return 'size not measured';
  if (width === undefined) return `${lengthText(slopeLength ?? 0, unit)} up the slope, width not measured`;
  if (slopeLength === undefined) return `${lengthText(width, unit)} wide, length not measured`;
  return unit === 'feet'
    ? `${lengthText(width, unit)} × ${lengthText(slopeLength, unit)}`
    : `${lengthInput(width, unit)} × ${lengthText(slopeLength, unit)}`;
}

/** A plane of the list: how it lies, how large it is, and what can be done with it. */
export function PlaneRow(props: {
  survey: Survey;
  plane: RoofPlane;
  onEdit: () => void;
  onDuplicate: () => void;
  onDelete: () => void;
}) {
  const { plane } = props;
  const { name } = plane;
  return (
    <li class="stack entry">
      <div>
        <h3>{name}</h3>
        <p>
          Tilt <strong class="figure">{degreesText(plane.surfaceTilt)}</strong>, faces{' '}
          <strong class="figure">{degreesText(plane.surfaceAzimuth)}</strong>
        </p>
        <p class="faint small">{sizeOf(plane)}</p>
      </div>
      <PhotoStrip survey={props.survey} subject={{ kind: 'plane', id: plane.id }} name={name} />
      <div class="form-actions">
        <button type="button" aria-label={`Change ${name}`} onClick={props.onEdit}>
          Change
        </button>
        <a
          class="button"
          href={measurePath(props.survey.id, plane.id)}
          aria-label={`Measure ${name} with the phone`}
        >
          Measure with the phone
        </a>
        <a
          class="button"
          href={newStationPath(props.survey.id, plane.id)}
          aria-label={`Add a station on ${name}`}
        >
          Add a station
        </a>
        <button type="button" aria-label={`Duplicate ${name}`} onClick={props.onDuplicate}>
          Duplicate
        </button>
        <button type="button" aria-label={`Delete ${name}`} onClick={props.onDelete}>
          Delete
        </button>
      </div>
    </li>
  );
}
