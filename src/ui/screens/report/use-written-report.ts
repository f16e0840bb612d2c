import { useEffect, useMemo, useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import { dayAt } from '../../../app/actions/start-survey.ts';
import type { ReportSettings } from '../../../app/report-settings.ts';
import { canonicalText } from '../../../core/survey/canonical-text.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import type { PhotoImage } from '../../../report/contents/report-contents.ts';
import { reportContents } from '../../../report/report-contents.ts';
import type { ComparedAssessment, ReportInput } from '../../../report/report-input.ts';
import type { LanguageId } from '../../../report/words/languages.ts';
import { LANGUAGES } from '../../../report/words/languages.ts';
import type { ComparedResult } from './compared-choice.ts';
import type { WrittenReport } from './report-files.ts';
import { reportPhotos } from './report-photos.ts';
import type { EvidenceState } from './use-evidence.ts';

/** What belongs to a state of a survey and takes a moment to have. */
interface Beside {
  survey: Survey;
  fingerprint: string;
  photos: ReadonlyMap<string, PhotoImage>;
}

/** The report written out; null until all of it is there. */
export function useWrittenReport(
  services: AppServices,
  survey: Survey,
  made: EvidenceState['made'],
  settings: ReportSettings | null,
): WrittenReport | null {
  const [beside, setBeside] = useState<Beside | null>(null);
  useEffect(() => {
    let isStale = false;
    const work = async () => {
      const fingerprint = await services.hash(new TextEncoder().encode(canonicalText(survey)));
      const photos = await reportPhotos(services.photos, survey).catch(() => new Map<string, PhotoImage>());
      if (!isStale) setBeside({ survey, fingerprint, photos });
    };
    void work();
    return () => {
      isStale = true;
    };
  }, [services, survey]);
  return useMemo(() => {
    if (!made || !settings || beside?.survey !== survey) return null;
    const input = inputOf(services, { made, settings, beside });
    return { input, contents: reportContents(input) };
  }, [services, survey, made, settings, beside]);
}

function inputOf(
  services: AppServices,
  {
    made,
    settings,
    beside,
  }: { made: NonNullable<EvidenceState['made']>; settings: ReportSettings; beside: Beside },
): ReportInput {
  const language = languageOf(settings.language);
  const { survey, evidence } = made;
  return {
    ...evidence,
    survey,
    fingerprint: beside.fingerprint,
    madeOn: dayAt(services.now(), survey.site.timeZone),
    version: services.version,
    photos: beside.photos,
    firm: settings.firm,
    choices: { ...settings, language },
    compared: made.compared && comparedOf(made.compared, language),
  };
}

/** The report's language, English where it has none like that. */
export const languageOf = (wanted: string): LanguageId =>
  LANGUAGES.find(({ id }) => id === wanted)?.id ?? 'en';

function comparedOf(
  { without, title, assessment }: ComparedResult,
  language: LanguageId,
): ComparedAssessment {
  const { words } = LANGUAGES.find(({ id }) => id === language)!;
  const name = without === null ? (title ?? '') : words['compared.without'](without);
  return { name, assessment, sameSurvey: without !== null };
}
