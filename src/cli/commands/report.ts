import { basename } from 'node:path';
import type { Problem } from '../../core/survey/problem.ts';
import type { ReportInput } from '../../report/report-input.ts';
import { LANGUAGES } from '../../report/words/languages.ts';
import { ASSESS_OPTIONS, ASSESS_OPTIONS_HELP, assessChoice } from '../assess-choice.ts';
import type { Command, CommandCall, ExitCode, Terminal } from '../command.ts';
import { textOption, UsageError, wordOption } from '../command.ts';
import { problemLines, warningLines } from '../problem-lines.ts';
import { progressTeller } from '../progress.ts';
import { fileBeside, refusedFile, writeForm } from '../report-file.ts';
import type { ReportForm } from '../report-forms.ts';
import { REPORT_FORMS } from '../report-forms.ts';
import type { ReportOrder } from '../report-made.ts';
import { reportMade } from '../report-made.ts';
import { shownWords } from '../shown-name.ts';

const LANGUAGE_IDS = LANGUAGES.map(({ id }) => id);

export const report: Command = {
  name: 'report',
  usage: 'FILE --html|--pdf [options]',
  summary: 'The report of a survey: a letter for the house, with the evidence behind it.',
  help: `
  --html                       one page that needs nothing beside it, to read, send and print
  --pdf                        the same as a PDF file, with its typeface inside; letters that it lacks are boxes
  --csv                        every figure as a table: quantity, plane, station, obstruction, period, value,
                               low, high, unit, ids, what it is compared with, run, item, and metres of
                               change; unrounded, decimal points. --json says what each quantity means
  --json                       the same on standard output (or in --out): { format: "noonmark-figures",
                               version, survey: { id, title, surveyedOn, fingerprint }, madeOn, program,
                               climate, transposition, stepMinutes, quantities, figures: [ … ] }; value is
                               null in a month without sun; period is "year", "month 06", "month 06 hour 13"
                               (local standard time), "year azimuth 20 to 41.5", "month 06 day 21 span 1" and
                               "stretch 1" for hours and days of shade, an instant for a heading check, or empty
  --out FILE                   where to; for one form at a time. Without it beside the survey, as
                               NAME-report.html, NAME-report.pdf, NAME-figures.csv
  --replace                    writes over a former report of the same name; any other file is left as it is
  --language LANGUAGE          ${LANGUAGE_IDS.join(', ')}
  --units metric|us            metric where it is left out
  --paper a4|letter            a4 where it is left out
  --firm FILE                  who makes the report: { "name": "…", "lines": ["…"], "colour": "#17406e" }
  --photos FOLDER              pictures of the survey's photos, such as the folder "photos" of an unpacked
                               backup; found by their contents. Without it the report has their captions
  --against FILE               another survey of the same site, to compare with
  --made-on DATE               the day of the report, YYYY-MM-DD; today where it is left out
${ASSESS_OPTIONS_HELP}

The report names the fingerprint of the survey; "check" tells that of a file.
Nothing is written where a file cannot be used; exit code 1 then, with what is wrong and where.`,
  options: {
    html: { type: 'boolean' },
    pdf: { type: 'boolean' },
    csv: { type: 'boolean' },
    json: { type: 'boolean' },
    out: { type: 'string' },
    replace: { type: 'boolean' },
    language: { type: 'string' },
    units: { type: 'string' },
    paper: { type: 'string' },
    firm: { type: 'string' },
    photos: { type: 'string' },
    against: { type: 'string' },
    'made-on': { type: 'string' },
    ...ASSESS_OPTIONS,
  },
  async run(call) {
    const { terminal } = call;
    const [file] = call.files;
    const order = orderOf(call, file);
    const targets = targetsOf(call, file);
    const replace = call.values.replace === true;
    const refused = targets.flatMap(({ to, form }) =>
      to === null ? [] : (refusedFile(to, form, replace) ?? []),
    );
    if (refused.length > 0) return told(terminal, refused);
    const made = await reportMade(order, progressTeller(terminal, file));
    if (!made.ok) return told(terminal, made.problems);
    terminal.err(warningLines('', made.warnings));
    return written(targets, made.value, replace, terminal);
  },
};

/** A form and the file it goes to; null for standard output. */
interface Target {
  form: ReportForm;
  to: string | null;
}

function targetsOf(call: CommandCall, survey: string): Target[] {
  const forms = REPORT_FORMS.filter(({ option }) => call.values[option] === true);
  if (forms.length === 0)
    throw new UsageError(`Say which form: ${REPORT_FORMS.map(({ option }) => `--${option}`).join(', ')}.`);
  const out = textOption(call, 'out');
  if (out === undefined)
    return forms.map((form) => ({ form, to: form.option === 'json' ? null : fileBeside(survey, form) }));
  if (forms.length > 1)
    throw new UsageError(
      `--out is for one form, got ${forms.map(({ option }) => `--${option}`).join(', ')}.`,
    );
  return [{ form: forms[0], to: out }];
}

function orderOf(call: CommandCall, file: string): ReportOrder {
  return {
    file,
    against: textOption(call, 'against'),
    firm: textOption(call, 'firm'),
    photos: textOption(call, 'photos'),
    madeOn: madeOn(call),
    choices: {
      language: wordOption(call, 'language', LANGUAGE_IDS) ?? 'en',
      units: wordOption(call, 'units', ['metric', 'us'] as const) ?? 'metric',
      paper: wordOption(call, 'paper', ['a4', 'letter'] as const) ?? 'a4',
      thresholds: {},
    },
    assess: assessChoice(call),
  };
}

function madeOn(call: CommandCall): string {
  const given = textOption(call, 'made-on');
  if (given === undefined) return dayOf(new Date());
  const time = /^\d{4}-\d{2}-\d{2}$/.test(given) ? Date.parse(`${given}T00:00:00Z`) : NaN;
  // the 30th of February would be read as the 2nd of March
  if (Number.isNaN(time) || !new Date(time).toISOString().startsWith(given))
    throw new UsageError(`--made-on must be a day such as 2026-05-14, got "${given}"`);
  return given;
}

const two = (number: number) => String(number).padStart(2, '0');
/** Where the machine stands. */
const dayOf = (now: Date) => `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;

async function written(
  targets: readonly Target[],
  input: ReportInput,
  replace: boolean,
  terminal: Terminal,
): Promise<ExitCode> {
  const asJson = targets.some(({ to }) => to === null);
  const problems: Problem[] = [];
  for (const { form, to } of targets) {
    const contents = await form.write(input);
    if (to === null) {
      terminal.out(contents as string);
      continue;
    }
    const problem = writeForm(to, contents, replace);
    const line = `${shownWords(basename(to))}: written, ${sizeOf(contents)}\n`;
    if (problem) problems.push(problem);
    else if (asJson) terminal.err(line);
    else terminal.out(line);
  }
  return problems.length > 0 ? told(terminal, problems) : 0;
}

const sizeOf = (contents: string | Uint8Array) => `${Math.ceil(Buffer.byteLength(contents) / 1000)} kB`;

function told(terminal: Terminal, problems: readonly Problem[]): 1 {
  terminal.err(problemLines('', problems));
  return 1;
}
