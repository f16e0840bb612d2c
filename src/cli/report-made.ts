import type { AssessOptions } from '../core/assessment/assess-survey.ts';
import { assessSurvey } from '../core/assessment/assess-survey.ts';
import { surveyEvidence } from '../core/assessment/survey-evidence.ts';
import type { Climate } from '../core/irradiance/climate.ts';
import { parseSurvey } from '../core/survey/parse-survey.ts';
import type { Parsed, Problem } from '../core/survey/problem.ts';
import type { Survey } from '../core/survey/survey.ts';
import type { ComparedAssessment, Firm, ReportChoices, ReportInput } from '../report/report-input.ts';
import { Speech } from '../report/speech.ts';
import type { AssessChoice } from './assess-choice.ts';
import { chosenClimate } from './assess-choice.ts';
import { fingerprintOf } from './fingerprint.ts';
import { NO_FIRM, readFirm } from './firm-file.ts';
import { readPhotos } from './photo-folder.ts';
import { programVersion } from './program-version.ts';
import { readSurveyText } from './read-file.ts';

/** What a report is made from, as files and choices. */
export interface ReportOrder {
  file: string;
  /** A survey to set beside it. */
  against: string | undefined;
  firm: string | undefined;
  photos: string | undefined;
  madeOn: string;
  choices: ReportChoices;
  assess: AssessChoice;
}

type Tell = NonNullable<AssessOptions['onProgress']>;

/** Reads what was ordered and computes it: a report's input, or what is wrong with which file. */
export async function reportMade(order: ReportOrder, tell: Tell): Promise<Parsed<ReportInput>> {
  const survey = readSurvey(order.file);
  const firm: Parsed<Firm> =
    order.firm === undefined
      ? { ok: true, value: NO_FIRM, warnings: [] }
      : from(order.firm, readFirm(order.firm));
  const other = order.against === undefined ? null : readSurvey(order.against);
  const problems = [survey, firm, other].flatMap((read) => (read && !read.ok ? read.problems : []));
  if (!survey.ok || !firm.ok || (other && !other.ok)) return { ok: false, problems };
  const photos = order.photos === undefined ? null : readPhotos(order.photos, survey.value.photos ?? []);
  if (photos && !photos.ok) return photos;
  const climate = from(order.file, chosenClimate(order.assess, survey.value, order.file));
  if (!climate.ok) return climate;
  const options = { transposition: order.assess.transposition, stepMinutes: order.assess.stepMinutes };
  const evidence = await surveyEvidence(survey.value, climate.value, { ...options, onProgress: tell });
  const compared =
    other && order.against !== undefined
      ? await comparison(survey.value, other.value, climate.value, order, { ...options, onProgress: tell })
      : null;
  const own = evidence.assessment.warnings.map((warning) => within(order.file, warning));
  return {
    ok: true,
    value: {
      ...evidence,
      survey: survey.value,
      fingerprint: fingerprintOf(survey.value),
      madeOn: order.madeOn,
      version: programVersion(),
      photos: photos?.value ?? new Map(),
      firm: firm.value,
      choices: order.choices,
      compared: compared?.value ?? null,
    },
    warnings: [survey, climate, photos, other, compared].flatMap((read) => read?.warnings ?? []).concat(own),
  };
}

/** Another survey by the light of this one's climate and way of laying it, so that only the sites' shade differs. */
async function comparison(
  survey: Survey,
  other: Survey,
  climate: Climate,
  { against = '', choices }: ReportOrder,
  options: AssessOptions,
): Promise<{ value: ComparedAssessment; warnings: Problem[] }> {
  const transposition = options.transposition ?? survey.transposition ?? 'hay-davies';
  const assessment = await assessSurvey(other, climate, { ...options, transposition });
  const speech = new Speech(choices);
  const name = other.surveyedOn ? `${other.title}, ${speech.day(other.surveyedOn)}` : other.title;
  const apart = metresApart(survey, other);
  const warning = {
    path: 'site',
    message: `Its site lies ${Math.round(apart)} m from that of the report; it is assessed with the other's climate.`,
  };
  return {
    value: { name, assessment, sameSurvey: false },
    warnings: apart > 200 ? [within(against, warning)] : [],
  };
}

/** Over flat ground, near enough to tell one site from another. */
function metresApart({ site: a }: Survey, { site: b }: Survey): number {
  const east = ((b.longitude - a.longitude + 540) % 360) - 180;
  const shrunk = Math.cos(((a.latitude + b.latitude) / 2) * (Math.PI / 180));
  return Math.hypot(b.latitude - a.latitude, east * shrunk) * 111_195;
}

function readSurvey(file: string): Parsed<Survey> {
  const read = readSurveyText(file);
  return from(file, read.ok ? parseSurvey(read.value.text) : read);
}

const within = (file: string, { path, message }: Problem): Problem => ({
  path: `${file}: ${path}`,
  message,
});

/** The same with the file's name before every path, since a report is made from several. */
function from<T>(file: string, read: Parsed<T>): Parsed<T> {
  return read.ok
    ? { ...read, warnings: read.warnings.map((warning) => within(file, warning)) }
    : { ok: false, problems: read.problems.map((problem) => within(file, problem)) };
}
