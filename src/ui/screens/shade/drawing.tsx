import { useMemo } from 'preact/hooks';
import type { Picture } from '../../../report/marks.ts';
import type { Palette } from '../../../report/painters/svg.ts';
import { svgText } from '../../../report/painters/svg.ts';

/** The sheet's own inks, so that a picture turns with the paper. */
const SCREEN_PALETTE: Palette = {
  ink: 'var(--ink)',
  faint: 'var(--faint)',
  rule: 'var(--rule)',
  paper: 'var(--paper)',
  sheet: 'var(--sheet)',
  accent: 'var(--accent)',
};

/** A picture on the screen. With no label it is left out for screen readers: words beside it say the same. */
export function Drawing({ picture, id, label }: { picture: Picture; id: string; label?: string }) {
  const html = useMemo(
    () =>
      svgText(picture, {
        idPrefix: id,
        palette: SCREEN_PALETTE,
        font: 'system-ui, sans-serif',
        attributes: 'aria-hidden="true" focusable="false"',
      }),
    [picture, id],
  );
  const role =
    label === undefined ? { 'aria-hidden': true as const } : { role: 'img' as const, 'aria-label': label };
  return <div class="drawing" {...role} dangerouslySetInnerHTML={{ __html: html }} />;
}
