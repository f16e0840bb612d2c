import type { SectionProps } from '../../section.ts';
import { ObstructionsTable } from './obstructions-table.tsx';
import { SiteSummary } from './site-summary.tsx';

/** Where the site is, what is known of it, and what stands around. */
export function SiteSection({ survey }: SectionProps) {
  return (
    <div class="stack">
      <h2>Site</h2>
      <SiteSummary survey={survey} />
      <h2>Obstructions</h2>
      {survey.obstructions.length > 0 ? (
        <ObstructionsTable obstructions={survey.obstructions} />
      ) : (
        <p>No obstruction yet.</p>
      )}
    </div>
  );
}
