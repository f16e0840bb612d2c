import { parseSurvey } from '../../core/survey/parse-survey.ts';
import type { Problem } from '../../core/survey/problem.ts';
import type { Command } from '../command.ts';
import { fingerprintOf } from '../fingerprint.ts';
import { problemLines, warningLines } from '../problem-lines.ts';
import { readSurveyText } from '../read-file.ts';
import { shownName, shownWords } from '../shown-name.ts';

interface CheckedFile {
  file: string;
  ok: boolean;
  title?: string;
  fingerprint?: string;
  problems: Problem[];
  warnings: Problem[];
}

export const check: Command = {
  name: 'check',
  usage: 'FILE... [--json]',
  summary: 'Whether survey files can be read, and what is wrong with them where.',
  help: `
  --json   { files: [ { file, ok, title, fingerprint, problems: [ { path, message } ], warnings } ] }

The fingerprint is the SHA-256 of what the survey says, whatever the order of its fields: a copy that was changed has
another. A report prints it.

Exit code 1 where any file has a problem. Warnings alone leave it at 0.`,
  options: { json: { type: 'boolean' } },
  run({ files, values, terminal }) {
    const checked = files.map(checkFile);
    if (values.json) terminal.out(`${JSON.stringify({ files: checked }, null, 1)}\n`);
    for (const { file, ok, title, fingerprint, problems, warnings } of checked) {
      terminal.err(problemLines(file, problems));
      terminal.err(warningLines(file, warnings));
      const verdict = ok ? `a good survey, "${shownName(title ?? '')}"` : 'cannot be used as it is';
      if (values.json) continue;
      terminal.out(`${shownWords(file)}: ${verdict}\n`);
      if (fingerprint) terminal.out(`  fingerprint ${fingerprint}\n`);
    }
    return checked.every(({ ok }) => ok) ? 0 : 1;
  },
};

function checkFile(file: string): CheckedFile {
  const read = readSurveyText(file);
  const parsed = read.ok ? parseSurvey(read.value.text) : read;
  if (!parsed.ok) return { file, ok: false, problems: parsed.problems, warnings: [] };
  const { value: survey, warnings } = parsed;
  return {
    file,
    ok: true,
    title: survey.title,
    fingerprint: fingerprintOf(survey),
    problems: [],
    warnings,
  };
}
