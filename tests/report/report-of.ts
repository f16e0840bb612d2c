import { createHash } from 'node:crypto';
import { surveyEvidence } from '../../src/core/assessment/survey-evidence.ts';
import { clearSkyClimate } from '../../src/core/irradiance/clear-sky-climate.ts';
import { canonicalText } from '../../src/core/survey/canonical-text.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import type { ReportChoices, ReportInput } from '../../src/report/report-input.ts';

export const CHOICES: ReportChoices = { language: 'en', units: 'metric', paper: 'a4', thresholds: {} };

/** What a report of a survey is made from, under a clear sky, on an invented day, by an invented firm. */
export async function reportOf(
  survey: Survey,
  change: Partial<Omit<ReportInput, 'choices'>> & { choices?: Partial<ReportChoices> } = {},
): Promise<ReportInput> {
  const evidence = await surveyEvidence(survey, clearSkyClimate('ineichen'));
  return {
    ...evidence,
    survey,
    fingerprint: createHash('sha256').update(canonicalText(survey)).digest('hex'),
    madeOn: '2026-06-02',
    version: '0.1.0',
    photos: new Map(),
    firm: { name: 'Larkfield Roofs', lines: ['3 Mill Lane', 'office@larkfield.example'], colour: '#1f4e5f' },
    compared: null,
    ...change,
    choices: { ...CHOICES, ...change.choices },
  };
}
