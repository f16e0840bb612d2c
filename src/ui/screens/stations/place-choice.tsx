import { arrayPlacesOf, type ArrayPlace } from '../../../core/survey/array-places.ts';
import type { RoofPlane, Survey } from '../../../core/survey/survey.ts';
import { offsetInput } from '../../length-text.ts';
import { proposedName, type StationDraft } from './station-draft.ts';

/** Corners and centre of the plane a new station stands on, each one tap; those without a station come first. */
export function PlaceChoice(props: {
  draft: StationDraft;
  survey: Survey;
  plane: RoofPlane;
  onChange: (part: Partial<StationDraft>) => void;
}) {
  const { draft, survey, plane, onChange } = props;
  const places = arrayPlacesOf(survey, plane);
  if (places.length === 0) return null;
  const texts = ({ x, y }: ArrayPlace) => ({ x: offsetInput(x, draft.unit), y: offsetInput(y, draft.unit) });
  const isChosen = (place: ArrayPlace) => draft.x === texts(place).x && draft.y === texts(place).y;
  return (
    <div class="place-choice" role="group" aria-label="Corners and centre">
      {places.map((place) => (
        <button
          key={place.name}
          type="button"
          aria-pressed={isChosen(place)}
          onClick={() => onChange({ ...texts(place), ...proposedName(draft, survey, plane, place.name) })}
        >
          <span class="place-name">{place.name}</span>
          {!place.isMissing && <span class="small under">has a station</span>}
        </button>
      ))}
    </div>
  );
}
