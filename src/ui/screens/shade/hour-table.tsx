import { useMemo } from 'preact/hooks';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import { hourBars, hoursWithLight } from '../../../report/pictures/hour-bars.ts';
import { MONTH_NAMES } from '../../../report/pictures/picture-words.ts';
import { ColumnHeads } from '../../components/column-heads.tsx';
import { WideTable } from '../../components/wide-table.tsx';
import { Drawing } from './drawing.tsx';
import { standardTimeText } from './standard-time-text.ts';
import { useWidth } from './use-width.ts';

/** The hours of each month as ink bars, and the same in figures. */
export function HourTable({ shade, timeZone }: { shade: StationShade; timeZone: string }) {
  const [box, width] = useWidth<HTMLDivElement>();
  const access = (shade.imagined ?? shade.measured).solarAccess.hourly;
  const picture = useMemo(
    () => width > 0 && hourBars({ unshaded: shade.unshaded.hourly, access, width }),
    [shade, access, width],
  );
  const hours = hoursWithLight(access);
  if (!hours) return null;
  const columns = Array.from({ length: hours[1] - hours[0] + 1 }, (_, i) => hours[0] + i);
  return (
    <section class="shade-hours">
      <h2>Hour by hour</h2>
      <p class="small">
        Hours of standard time, {standardTimeText(timeZone)}. A bar is as high as the hour’s light in a month;
        the ink in it is what arrives
        {shade.imagined ? ', with the change imagined' : ''}.
      </p>
      <div ref={box}>{picture && <Drawing picture={picture} id="hours" />}</div>
      <details>
        <summary>Values</summary>
        <WideTable label="Solar access by month and hour, percent">
          <ColumnHeads heads={['%', ...columns.map((hour) => ({ number: `${hour}–${hour + 1}` }))]} />
          <tbody>
            {MONTH_NAMES.map((name, month) => (
              <tr key={name}>
                <th scope="row">{name.slice(0, 3)}</th>
                {columns.map((hour) => (
                  <td key={hour} class="number">
                    {shareText(access[month][hour])}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </WideTable>
      </details>
    </section>
  );
}

const shareText = (share: number | null): string => (share === null ? '–' : (share * 100).toFixed(0));
