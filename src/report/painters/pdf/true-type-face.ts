/**
 * Which letters a TrueType file has and how wide they are. Reads the character map of format 4 for Unicode's first plane
 * and the horizontal metrics. Ref: ISO/IEC 14496-22 (Open Font Format), tables cmap, head, hhea, hmtx.
 */
export class TrueTypeFace {
  private readonly widths = new Map<number, number>();

  /** @throws RangeError where the bytes are no such file. */
  constructor(bytes: Uint8Array) {
    const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
    const tables = tableOffsets(view);
    const offset = (tag: string): number => {
      const at = tables.get(tag);
      if (at === undefined) throw new RangeError(`a TrueType file with a table ${tag}`);
      return at;
    };
    const unitsPerEm = view.getUint16(offset('head') + 18);
    const metrics = view.getUint16(offset('hhea') + 34);
    const [hmtx, map] = [offset('hmtx'), unicodeMap(view, offset('cmap'))];
    for (const [code, glyph] of mappedCodes(view, map))
      this.widths.set(code, view.getUint16(hmtx + 4 * Math.min(glyph, metrics - 1)) / unitsPerEm);
  }

  has(code: number): boolean {
    return this.widths.has(code);
  }

  /** In the unit of `size`; letters the file does not have count as nothing. */
  width(text: string, size: number): number {
    let ems = 0;
    for (const letter of text) ems += this.widths.get(letter.codePointAt(0)!) ?? 0;
    return ems * size;
  }
}

function tableOffsets(view: DataView): Map<string, number> {
  const tables = new Map<string, number>();
  if (view.byteLength < 12) return tables;
  for (let i = 0; i < view.getUint16(4); i++) {
    const at = 12 + 16 * i;
    const tag = String.fromCharCode(...[0, 1, 2, 3].map((place) => view.getUint8(at + place)));
    tables.set(tag, view.getUint32(at + 8));
  }
  return tables;
}

/** Where the map of platform 3 (Windows), encoding 1 (Unicode, first plane) begins. */
function unicodeMap(view: DataView, cmap: number): number {
  for (let i = 0; i < view.getUint16(cmap + 2); i++) {
    const at = cmap + 4 + 8 * i;
    const map = cmap + view.getUint32(at + 4);
    if (view.getUint16(at) === 3 && view.getUint16(at + 2) === 1 && view.getUint16(map) === 4) return map;
  }
  throw new RangeError('a TrueType file with a Unicode character map of format 4');
}

function* mappedCodes(view: DataView, map: number): Generator<[code: number, glyph: number]> {
  const segments = view.getUint16(map + 6) / 2;
  const [ends, starts] = [map + 14, map + 16 + 2 * segments];
  const [deltas, ranges] = [starts + 2 * segments, starts + 4 * segments];
  for (let i = 0; i < segments; i++) {
    const [start, end] = [view.getUint16(starts + 2 * i), view.getUint16(ends + 2 * i)];
    const [delta, range] = [view.getUint16(deltas + 2 * i), view.getUint16(ranges + 2 * i)];
    for (let code = start; code <= end && code < 0xffff; code++) {
      const listed = range && view.getUint16(ranges + 2 * i + range + 2 * (code - start));
      const glyph = range && !listed ? 0 : ((range ? listed : code) + delta) & 0xffff;
      if (glyph !== 0) yield [code, glyph];
    }
  }
}
