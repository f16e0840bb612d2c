/** Reads a CSV table after the grammar of RFC 4180; throws where the text does not keep to it. */
export function csvRows(text: string): string[][] {
  const rows: string[][] = [];
  let row: string[] = [];
  let at = 0;
  while (at < text.length) {
    const field = /(?:"((?:[^"]|"")*)"|([^",\r\n]*))(,|\r\n)/y;
    field.lastIndex = at;
    const found = field.exec(text);
    if (!found) throw new Error(`no field of a table at ${at}: ${text.slice(at, at + 40)}`);
    row.push(found[1] === undefined ? found[2] : found[1].replace(/""/g, '"'));
    if (found[3] === '\r\n') {
      rows.push(row);
      row = [];
    }
    at = field.lastIndex;
  }
  return rows;
}
