import { jsonFault } from './json-fault.ts';
import { addHeadingCheckProblems } from './heading-check-checks.ts';
import { isRecord, shown } from './json-value.ts';
import type { JsonRecord } from './json-value.ts';
import { LIMITS } from './limits.ts';
import { migrated } from './migrations.ts';
import { addPlaneProblems } from './plane-checks.ts';
import { ProblemList } from './problem-list.ts';
import type { Parsed } from './problem.ts';
import { addReferenceProblems } from './reference-checks.ts';
import { addSchemaProblems } from './schema-problems.ts';
import { addStructureProblems } from './structure-checks.ts';
import { SURVEY_FORMAT, SURVEY_VERSION } from './survey.ts';
import type { Survey } from './survey.ts';
import { surveyDoubts } from './survey-doubts.ts';
import { surveySchema } from './survey-schema.ts';
import { addTraceProblems } from './trace-checks.ts';
import { unknownFields } from './unknown-fields.ts';
import { addWorkProblems } from './work-limits.ts';

/** Reads a survey from the text of a file: the survey with what a person should know of it, or all that is wrong. */
export function parseSurvey(text: string): Parsed<Survey> {
  if (text.length > LIMITS.textLength)
    return refused(
      'file',
      `The file has ${text.length} characters; the limit is ${LIMITS.textLength} (20 MB). Split the survey.`,
    );
  let value: unknown;
  try {
    value = JSON.parse(text.startsWith('\ufeff') ? text.slice(1) : text);
  } catch {
    return notJson(text);
  }
  return surveyFromJson(value);
}

/**
 * Reads a survey from a value such as `JSON.parse` gives. Documents of older versions are brought to this one; fields
 * this version does not know are kept, with a warning. The value is not changed.
 */
export function surveyFromJson(value: unknown): Parsed<Survey> {
  const problems = new ProblemList();
  if (!isRecord(value))
    return refused(
      'file',
      `The file must hold one survey, an object; it holds ${shown(value)}. Choose a survey file.`,
    );
  const version = versionOf(value, problems);
  if (version === null) return { ok: false, problems: problems.list() };
  addStructureProblems(value, problems);
  if (!problems.isEmpty) return { ok: false, problems: problems.list() };
  const { document } = migrated(value, version);
  addSchemaProblems(document, problems);
  addReferenceProblems(document, problems);
  addPlaneProblems(document, problems);
  addTraceProblems(document, problems);
  addHeadingCheckProblems(document, problems);
  if (!problems.isEmpty) return { ok: false, problems: problems.list() };
  const survey = document as unknown as Survey;
  addWorkProblems(survey, problems);
  if (!problems.isEmpty) return { ok: false, problems: problems.list() };
  const warnings = [...unknownFields(surveySchema, document), ...surveyDoubts(survey)];
  return { ok: true, value: survey, warnings };
}

const refused = (path: string, message: string): Parsed<never> => ({
  ok: false,
  problems: [{ path, message }],
});

function notJson(text: string): Parsed<never> {
  if (text.trim() === '')
    return refused('file', 'The file is empty. Export the survey again, or choose another file.');
  const fault = jsonFault(text);
  const place = fault ? `line ${fault.line}, column ${fault.column}` : 'file';
  return refused(
    place,
    'The text is not JSON here: the file is cut short, damaged or of another kind. Export the survey again, or correct this place.',
  );
}

/** The version a document says it has; null, with a problem, where it is not one this program reads. */
function versionOf(document: JsonRecord, problems: ProblemList): number | null {
  const { format, version } = document;
  if (format !== SURVEY_FORMAT) {
    const is = format === undefined ? 'it has no format' : `its format is ${shown(format)}`;
    problems.add(
      'format',
      `The file is not a survey: ${is}, where "${SURVEY_FORMAT}" is needed. Choose a survey file.`,
    );
    return null;
  }
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    problems.add(
      'version',
      `version must be a whole number from 1 to ${SURVEY_VERSION}; it is ${shown(version)}. Correct it.`,
    );
    return null;
  }
  if (version <= SURVEY_VERSION) return version;
  problems.add(
    'version',
    `The survey is of version ${version}; this Noonmark reads up to version ${SURVEY_VERSION}. Update Noonmark, then open the survey again.`,
  );
  return null;
}
