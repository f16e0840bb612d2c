import { obstructionKinds } from '../../../core/survey/obstruction-kinds.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { Months, Obstruction } from '../../../core/survey/survey.ts';
import { WideTable } from './wide-table.tsx';

const percent = (share: number): string => `${Math.round(share * 100)} %`;

function transmittanceText(transmittance: number | Months | undefined): string {
  if (transmittance === undefined) return 'the kind’s own';
  if (typeof transmittance === 'number') return percent(transmittance);
  const [least, most] = [Math.min(...transmittance), Math.max(...transmittance)];
  return least === most ? percent(least) : `${percent(least)} to ${percent(most)} by month`;
}

function kindName(obstruction: Obstruction): string {
  return obstructionKinds.find(({ kind }) => kind === obstruction.kind)?.name ?? obstruction.kind;
}

/** What stands around the site. */
export function ObstructionsTable({ obstructions }: { obstructions: Obstruction[] }) {
  return (
    <WideTable label="Obstructions">
      <thead>
        <tr>
          <th scope="col">Obstruction</th>
          <th scope="col">Kind</th>
          <th scope="col" class="number">
            Distance
          </th>
          <th scope="col">Light that passes</th>
        </tr>
      </thead>
      <tbody>
        {ordered(obstructions).map((obstruction) => (
          <tr key={obstruction.id}>
            <th scope="row">{obstruction.name}</th>
            <td>{kindName(obstruction)}</td>
            <td class="number">
              {obstruction.distance === undefined ? 'unknown' : `${obstruction.distance} m`}
            </td>
            <td>{transmittanceText(obstruction.transmittance)}</td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}
