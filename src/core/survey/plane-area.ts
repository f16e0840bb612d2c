import type { RoofPlane } from './survey.ts';

/**
 * Area of a roof plane along its slope, square metres: of its outline, else width by slope length; null where neither is
 * known. Ref: the area of a polygon by its corners (Gauss's formula).
 */
export function planeArea({
  outline,
  width,
  slopeLength,
}: Pick<RoofPlane, 'outline' | 'width' | 'slopeLength'>): number | null {
  if (outline && outline.length >= 3) {
    let twice = 0;
    outline.forEach(({ x, y }, i) => {
      const next = outline[(i + 1) % outline.length];
      twice += x * next.y - next.x * y;
    });
    return Math.abs(twice) / 2;
  }
  return width !== undefined && slopeLength !== undefined ? width * slopeLength : null;
}
