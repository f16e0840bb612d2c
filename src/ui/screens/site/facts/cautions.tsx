import type { FactGroupId } from '../../../../core/survey/site-facts-general.ts';

const CAUTIONS: Record<FactGroupId, string[]> = {
  roof: [
    'Look from the ground, a window or the attic where you can. On a ladder or a roof, follow the rules for work at height that hold where you are.',
    'Whether the roof carries an array is for a structural engineer or the local code to say, not for this list.',
  ],
  access: [
    'Do not go near overhead lines, and do not touch what may hold asbestos. If in doubt, stay down and write it here.',
  ],
  electrical: [
    'Look, do not open. Covers of boards and meters come off only by the hands of a licensed electrician; seals of the grid operator stay on.',
    'What is written here prepares an order. Local codes, the grid operator’s rules and a licensed electrician decide.',
  ],
};

/** The caution that goes with a group of facts. */
export function Caution({ group }: { group: FactGroupId }) {
  return (
    <aside class="caution small stack" aria-label="Caution">
      {CAUTIONS[group].map((sentence) => (
        <p key={sentence}>{sentence}</p>
      ))}
    </aside>
  );
}
