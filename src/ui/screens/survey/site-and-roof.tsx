import { ordered } from '../../../core/survey/order.ts';
import type { SectionProps } from '../../section.ts';
import { FieldBook } from './field-book.tsx';
import { ObstructionsTable } from './obstructions-table.tsx';
import { PlanesTable } from './planes-table.tsx';
import { SiteFacts } from './site-facts.tsx';

/** What the survey holds: the site, its planes, what stands around, and the field book of each station. */
export function SiteAndRoof({ survey }: SectionProps) {
  return (
    <div class="stack site-and-roof">
      <h2>Site</h2>
      <SiteFacts survey={survey} />
      <h2>Roof planes</h2>
      {survey.planes.length > 0 ? <PlanesTable planes={survey.planes} /> : <p>No roof plane yet.</p>}
      <h2>Obstructions</h2>
      {survey.obstructions.length > 0 ? (
        <ObstructionsTable obstructions={survey.obstructions} />
      ) : (
        <p>No obstruction yet.</p>
      )}
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
