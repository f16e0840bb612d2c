import { ordered } from '../../../core/survey/order.ts';
import type { RoofPlane } from '../../../core/survey/survey.ts';
import { degreesText } from '../../value-text.ts';
import { WideTable } from '../../components/wide-table.tsx';

function sizeOf({ width, slopeLength, outline }: RoofPlane): string {
  if (outline) return `outline of ${outline.length} corners`;
  return width === undefined || slopeLength === undefined ? '–' : `${width} × ${slopeLength} m`;
}

/** The roof planes: how they lie and how large they are. */
export function PlanesTable({ planes }: { planes: RoofPlane[] }) {
  return (
    <WideTable label="Roof planes">
      <thead>
        <tr>
          <th scope="col">Plane</th>
          <th scope="col" class="number">
            Tilt
          </th>
          <th scope="col" class="number">
            Azimuth
          </th>
          <th scope="col" class="number">
            Size
          </th>
        </tr>
      </thead>
      <tbody>
        {ordered(planes).map((plane) => (
          <tr key={plane.id}>
            <th scope="row">{plane.name}</th>
            <td class="number">{degreesText(plane.surfaceTilt)}</td>
            <td class="number">{degreesText(plane.surfaceAzimuth)}</td>
            <td class="number">{sizeOf(plane)}</td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}
