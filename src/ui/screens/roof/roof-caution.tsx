/** What must be said wherever somebody may climb. */
export function RoofCaution() {
  return (
    <aside class="caution small stack" aria-label="Caution">
      <p>
        <strong>Measure from the ground or a ladder where you can.</strong> The safest climb is the one not
        made: a slope can be read along a gable from below, a bearing from a plan.
      </p>
      <p>
        Ladders and roofs: follow the rules for work at height that hold where you are; secure the ladder and
        yourself, do not go up alone, in wind, wet or frost, or near overhead lines. Fragile coverings and
        skylights do not carry a person.
      </p>
    </aside>
  );
}
