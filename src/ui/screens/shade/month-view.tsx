import { useMemo } from 'preact/hooks';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import { monthColumns } from '../../../report/pictures/month-columns.ts';
import { MONTH_NAMES } from '../../../report/pictures/picture-words.ts';
import { ColumnHeads } from '../../components/column-heads.tsx';
import { Drawing } from './drawing.tsx';
import { energy, percent } from './figures.ts';
import { useWidth } from './use-width.ts';

const HEADS = ['Month', { number: 'Open' }, { number: 'Arrives' }, { number: 'Share' }];

/** Light month by month, with and without what stands in the way. */
export function MonthView({ shade }: { shade: StationShade }) {
  const [box, width] = useWidth<HTMLDivElement>();
  const { measured, imagined, unshaded } = shade;
  const picture = useMemo(
    () =>
      width > 0 &&
      monthColumns({
        unshaded: unshaded.monthly,
        measured: measured.irradiation.monthly,
        imagined: imagined?.irradiation.monthly ?? null,
        width,
        height: 200,
      }),
    [shade, width],
  );
  return (
    <section class="shade-months">
      <h2>Month by month</h2>
      <p class="small">
        Light on the plane, kWh/m². Outline: with nothing in the way. Ink: what arrives.
        {imagined && ' Hatched: what would be gained if the imagined change were made.'}
      </p>
      <div ref={box}>{picture && <Drawing picture={picture} id="months" />}</div>
      <details>
        <summary>Values</summary>
        <table>
          <caption class="visually-hidden">Light on the plane by month, kWh/m²</caption>
          <ColumnHeads heads={imagined ? [...HEADS, { number: 'Imagined' }] : HEADS} />
          <tbody>
            {MONTH_NAMES.map((name, month) => (
              <tr key={name}>
                <th scope="row">{name}</th>
                <td class="number">{energy(unshaded.monthly[month])}</td>
                <td class="number">{energy(measured.irradiation.monthly[month])}</td>
                <td class="number">{share(measured.solarAccess.monthly[month])}</td>
                {imagined && <td class="number">{share(imagined.solarAccess.monthly[month])}</td>}
              </tr>
            ))}
          </tbody>
        </table>
      </details>
    </section>
  );
}

const share = (value: number | null): string => (value === null ? 'no sun' : percent(value));
