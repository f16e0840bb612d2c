import { isRecord, shown } from '../core/survey/json-value.ts';
import type { Parsed, Problem } from '../core/survey/problem.ts';
import type { Firm } from '../report/report-input.ts';
import { readSurveyText } from './read-file.ts';

const FIELDS = ['name', 'lines', 'colour'];

/** A report of nobody's: no name, no rule in colour. */
export const NO_FIRM: Firm = { name: '', lines: [], colour: null };

/** Reads who makes the report from a JSON file: `{ "name": "…", "lines": ["…"], "colour": "#17406e" }`. */
export function readFirm(file: string): Parsed<Firm> {
  const read = readSurveyText(file);
  return read.ok ? parseFirm(read.value.text) : read;
}

export function parseFirm(text: string): Parsed<Firm> {
  let value: unknown;
  try {
    value = JSON.parse(text.replace(/^\ufeff/, ''));
  } catch {
    return refused([{ path: 'file', message: 'The text is not JSON.' }]);
  }
  if (!isRecord(value))
    return refused([{ path: 'file', message: `The file must hold an object; it holds ${shown(value)}.` }]);
  const { name = '', lines = [], colour = null } = value;
  const problems: Problem[] = Object.keys(value)
    .filter((field) => !FIELDS.includes(field))
    .map((field) => ({ path: field, message: `A firm has ${FIELDS.join(', ')}; this is none of them.` }));
  if (typeof name !== 'string')
    problems.push({ path: 'name', message: `A text is needed; it is ${shown(name)}.` });
  if (!Array.isArray(lines))
    problems.push({ path: 'lines', message: `A list of texts is needed; it is ${shown(lines)}.` });
  else
    lines.forEach((line: unknown, place) => {
      if (typeof line !== 'string')
        problems.push({ path: `lines[${place}]`, message: `A text is needed; it is ${shown(line)}.` });
    });
  if (colour !== null && !(typeof colour === 'string' && /^#[0-9a-f]{6}$/i.test(colour)))
    problems.push({
      path: 'colour',
      message: `Six hexadecimal digits after # are needed, such as "#17406e"; it is ${shown(colour)}.`,
    });
  if (problems.length > 0) return refused(problems);
  return {
    ok: true,
    value: { name: name as string, lines: lines as string[], colour: colour as string | null },
    warnings: [],
  };
}

const refused = (problems: Problem[]): Parsed<never> => ({ ok: false, problems });
