import type { SectionProps } from '../../section.ts';
import { PlanesTable } from './planes-table.tsx';

/** The roof planes of the survey. */
export function RoofSection({ survey }: SectionProps) {
  return (
    <div class="stack">
      <h2>Roof planes</h2>
      {survey.planes.length > 0 ? <PlanesTable planes={survey.planes} /> : <p>No roof plane yet.</p>}
    </div>
  );
}
