import { ordered } from '../../../core/survey/order.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { FieldBook } from './field-book.tsx';

/** The field book of every station, the first one open. */
export function AllStations({ survey }: { survey: Survey }) {
  return (
    <div class="stack">
      <h2>Field book</h2>
      {survey.stations.length > 0 ? (
        ordered(survey.stations).map((station, place) => (
          <FieldBook key={station.id} station={station} survey={survey} open={place === 0} />
        ))
      ) : (
        <p>No station yet.</p>
      )}
    </div>
  );
}
