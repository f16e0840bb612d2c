import { obstructionKinds } from '../../../core/survey/obstruction-kinds.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { Obstruction, Survey } from '../../../core/survey/survey.ts';
import { PhotoStrip } from '../../components/photos/photo-strip.tsx';
import { lengthUnit } from '../../device/length-unit.ts';
import { lengthText } from '../../length-text.ts';
import { percentText } from '../../value-text.ts';

function sharesText({ transmittance, kind }: Obstruction): string {
  const leaves = obstructionKinds.find((row) => row.kind === kind)?.leaves;
  if (transmittance === undefined)
    return leaves ? 'lets through what is usual for its kind' : 'lets nothing through';
  if (typeof transmittance === 'number') return `lets ${percentText(transmittance)} through`;
  const [least, most] = [Math.min(...transmittance), Math.max(...transmittance)];
  const range = least === most ? percentText(least) : `${percentText(least)} to ${percentText(most)}`;
  return `lets ${range} through, by month`;
}

function aboutOf(obstruction: Obstruction): string {
  const kind = obstructionKinds.find((row) => row.kind === obstruction.kind)?.name ?? obstruction.kind;
  const far =
    obstruction.distance === undefined
      ? 'distance unknown'
      : `${lengthText(obstruction.distance, lengthUnit.value)} off`;
  return `${kind}, ${far}, ${sharesText(obstruction)}`;
}

/** What stands around, each with its acts. */
export function ObstructionList(props: {
  survey: Survey;
  onEdit: (obstruction: Obstruction) => void;
  onDelete: (obstruction: Obstruction) => void;
}) {
  return (
    <ul class="entries" aria-label="Obstructions">
      {ordered(props.survey.obstructions).map((obstruction) => (
        <li key={obstruction.id} class="stack entry">
          <div>
            <h3>{obstruction.name}</h3>
            <p class="small">{aboutOf(obstruction)}</p>
          </div>
          <PhotoStrip
            survey={props.survey}
            subject={{ kind: 'obstruction', id: obstruction.id }}
            name={obstruction.name}
          />
          <div class="form-actions">
            <button
              type="button"
              aria-label={`Change ${obstruction.name}`}
              onClick={() => props.onEdit(obstruction)}
            >
              Change
            </button>
            <button
              type="button"
              aria-label={`Delete ${obstruction.name}`}
              onClick={() => props.onDelete(obstruction)}
            >
              Delete
            </button>
          </div>
        </li>
      ))}
    </ul>
  );
}
