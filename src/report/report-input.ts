import type { SurveyEvidence } from '../core/assessment/survey-evidence.ts';
import type { Assessment } from '../core/shading/assessment.ts';
import type { Survey } from '../core/survey/survey.ts';
import type { PaperSize, PhotoImage } from './contents/report-contents.ts';
import type { LanguageId } from './words/languages.ts';

/** All that a report is made from. */
export interface ReportInput extends SurveyEvidence {
  survey: Survey;
  /** Of the survey's document, hexadecimal SHA-256; see `canonicalText`. */
  fingerprint: string;
  /** Day the report is made, YYYY-MM-DD. */
  madeOn: string;
  /** Of the program. */
  version: string;
  /** Pictures at hand, by the hash of their bytes. */
  photos: ReadonlyMap<string, PhotoImage>;
  firm: Firm;
  choices: ReportChoices;
  /** Another visit, or the same without some obstructions, to set beside this one. */
  compared: ComparedAssessment | null;
}

export interface ComparedAssessment {
  /** What it is, in the report's language or in the surveyor's own words. */
  name: string;
  assessment: Assessment;
  /** This very survey with something thought away: both err alike, so that their difference is surer than their ranges. */
  sameSurvey: boolean;
}

/** Who makes the report; all of it may be empty. */
export interface Firm {
  name: string;
  /** Address, telephone, mail, registration: as the firm wants them, line by line. */
  lines: string[];
  /** Six hexadecimal digits after `#`. */
  colour: string | null;
}

export interface ReportChoices {
  language: LanguageId;
  units: 'metric' | 'us';
  paper: PaperSize;
  /** What a programme asks for at least, shares 0 to 1; absent ones are not asked. */
  thresholds: Thresholds;
}

export interface Thresholds {
  solarAccess?: number;
  orientationFactor?: number;
  /** Solar access times orientation factor. */
  product?: number;
}
