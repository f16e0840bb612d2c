import { obstructionKinds, type ObstructionKindRow } from '../../../core/survey/obstruction-kinds.ts';
import { ordered } from '../../../core/survey/order.ts';
import type { Obstruction } from '../../../core/survey/survey.ts';
import { percentText } from '../../value-text.ts';
import { WideTable } from '../../components/wide-table.tsx';

function transmittanceText({ transmittance }: Obstruction, kind: ObstructionKindRow | undefined): string {
  if (transmittance === undefined) return kind?.leaves ? 'usual for its kind' : 'none';
  if (typeof transmittance === 'number') return percentText(transmittance);
  const [least, most] = [Math.min(...transmittance), Math.max(...transmittance)];
  return least === most ? percentText(least) : `${percentText(least)} to ${percentText(most)} by month`;
}

function ObstructionRow({ obstruction }: { obstruction: Obstruction }) {
  const kind = obstructionKinds.find((row) => row.kind === obstruction.kind);
  return (
    <tr>
      <th scope="row">
        {obstruction.name} <span class="faint small under">{kind?.name ?? obstruction.kind}</span>
      </th>
      <td class="number">{obstruction.distance === undefined ? 'unknown' : `${obstruction.distance} m`}</td>
      <td>{transmittanceText(obstruction, kind)}</td>
    </tr>
  );
}

/** What stands around the site. */
export function ObstructionsTable({ obstructions }: { obstructions: Obstruction[] }) {
  return (
    <WideTable label="Obstructions">
      <thead>
        <tr>
          <th scope="col">Obstruction</th>
          <th scope="col" class="number">
            Distance
          </th>
          <th scope="col">Light that passes</th>
        </tr>
      </thead>
      <tbody>
        {ordered(obstructions).map((obstruction) => (
          <ObstructionRow key={obstruction.id} obstruction={obstruction} />
        ))}
      </tbody>
    </WideTable>
  );
}
