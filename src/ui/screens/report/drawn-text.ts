import type { DrawnText } from '../../../report/painters/pdf/typesetter.ts';

/** Dots to a point: sharp on a printer. */
const SCALE = 4;
/** Share of the size above and below the line that tall and low letters may need. */
const [ABOVE, BELOW] = [1.25, 0.45];

/** A text drawn with the letters this device has, as a picture on a see-through ground; null where it has no canvas. */
export function drawnText(text: string, size: number, bold: boolean): DrawnText | null {
  const canvas = document.createElement('canvas');
  const context = canvas.getContext('2d');
  if (!context) return null;
  const font = `${bold ? '600 ' : ''}${size * SCALE}px serif`;
  context.font = font;
  const width = context.measureText(text).width;
  canvas.width = Math.max(1, Math.ceil(width));
  canvas.height = Math.max(1, Math.ceil(size * SCALE * (ABOVE + BELOW)));
  // the size of a canvas resets what was set
  context.font = font;
  context.fillStyle = '#14120d';
  context.fillText(text, 0, size * SCALE * ABOVE);
  const letters = atob(canvas.toDataURL('image/png').split(',')[1]);
  const png = Uint8Array.from(letters, (letter) => letter.charCodeAt(0));
  return { png, width: canvas.width / SCALE, height: canvas.height / SCALE, baseline: size * ABOVE };
}
