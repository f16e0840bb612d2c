import type { CalculationFault } from '../../../core/shading/calculation.ts';
import { ProblemList } from '../../components/problem-list.tsx';
import { CALCULATION_MESSAGES } from './calculation-messages.ts';

/** Why there is no result, and the way on. */
export function Fault({ fault, onRetry }: { fault: CalculationFault; onRetry: () => void }) {
  const { what, remedy } = CALCULATION_MESSAGES[fault.code];
  return (
    <div class="fault" role="alert">
      <p>
        <strong>{what}</strong> {remedy}
      </p>
      {fault.problems && <ProblemList problems={fault.problems} />}
      {fault.detail && <p class="small">{fault.detail}</p>}
      <div>
        <button type="button" class="main" onClick={onRetry}>
          {fault.code === 'cancelled' ? 'Calculate' : 'Try again'}
        </button>
      </div>
    </div>
  );
}
