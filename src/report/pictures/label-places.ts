/** A rectangle on the sheet. */
export interface Box {
  left: number;
  top: number;
  right: number;
  bottom: number;
}

export const overlap = (a: Box, b: Box): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** Gives labels places that do not touch each other, first come first served. */
export class LabelPlaces {
  readonly taken: Box[] = [];

  constructor(private readonly bounds: Box) {}

  /** Takes the first of some places that is inside the bounds and free; null where none is. */
  take<T extends Box>(candidates: Iterable<T>): T | null {
    for (const box of candidates) {
      const inside =
        box.left >= this.bounds.left &&
        box.right <= this.bounds.right &&
        box.top >= this.bounds.top &&
        box.bottom <= this.bounds.bottom;
      if (!inside || this.taken.some((other) => overlap(box, other))) continue;
      this.taken.push(box);
      return box;
    }
    return null;
  }
}

/** The box of a line of text whose baseline's middle is at (x, y). */
export const boxAround = (
  x: number,
  y: number,
  width: number,
  size: number,
): Box & { x: number; y: number } => ({
  x,
  y,
  left: x - width / 2 - 1,
  right: x + width / 2 + 1,
  top: y - size * 0.85,
  bottom: y + size * 0.25,
});
