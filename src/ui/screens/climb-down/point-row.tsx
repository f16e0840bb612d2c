import type { OpenPoint } from '../../../core/completeness/open-point.ts';
import { isGrave, titleOf } from '../../../core/completeness/point-kinds.ts';
import { curePath } from './cure-path.ts';

/** One point: what it is worth in large numerals, what it is, and the way to its cure. */
export function PointRow({ surveyId, point }: { surveyId: string; point: OpenPoint }) {
  const { kind, subject, sentence, cure } = point;
  return (
    <li>
      <a class="open-point" href={curePath(surveyId, point)}>
        <Effect point={point} />
        <span class="open-point-words">
          <strong>
            {titleOf(kind)}: {subject}
          </strong>
          <span class="small">{sentence}</span>
          <span class="open-point-cure">{cure.words}</span>
        </span>
      </a>
    </li>
  );
}

function Effect({ point: { kind, effect } }: { point: OpenPoint }) {
  if (isGrave(kind)) return <span class="open-point-effect open-point-grave">Do first</span>;
  if (effect === null) return <span class="open-point-effect faint small">not counted</span>;
  return (
    <span class="open-point-effect">
      <b>{effect < 0.05 ? '<\u200a0.1' : effect.toFixed(1)}</b>
      <span class="small">points</span>
    </span>
  );
}
