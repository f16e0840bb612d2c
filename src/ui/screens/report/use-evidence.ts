import { useEffect, useMemo, useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import type { SurveyEvidence } from '../../../core/assessment/survey-evidence.ts';
import type { CalculationFault } from '../../../core/shading/calculation.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { weatherBytes } from '../shade/weather-choice.ts';
import type { ComparedChoice } from './compared-choice.ts';
import { comparedSurvey } from './compared-choice.ts';
import type { ComparedResult } from './compared-choice.ts';

/** What a report is made from, as far as it has been worked out. */
export interface EvidenceState {
  working: { share: number; stage: string } | null;
  fault: CalculationFault | null;
  /** Of the survey it is for: a report never shows the figures of another state of it. */
  made: { survey: Survey; evidence: SurveyEvidence; compared: ComparedResult | null } | null;
  cancel: () => void;
  retry: () => void;
}

/** Why a calculation was ended: nobody looks at it any more. */
const LEFT = 'left';

/** Works out a survey's evidence, and what it is set beside, on the worker. */
export function useEvidence(
  services: AppServices,
  survey: Survey,
  choice: ComparedChoice | null,
): EvidenceState {
  const [attemptNumber, setAttempt] = useState(0);
  const [working, setWorking] = useState<EvidenceState['working']>(null);
  const [fault, setFault] = useState<CalculationFault | null>(null);
  const [made, setMade] = useState<EvidenceState['made']>(null);
  const abort = useMemo(() => new AbortController(), [survey, choice, attemptNumber]);

  useEffect(() => {
    const { signal } = abort;
    const work = async () => {
      setFault(null);
      setWorking({ share: 0, stage: 'Reading the climate' });
      const share = choice ? 0.5 : 1;
      const outcome = await services.assess.evidence(
        await requestOf(services, survey),
        (done, stage) => !signal.aborted && setWorking({ share: share * done, stage }),
        signal,
      );
      const other = outcome.ok && choice ? await comparedSurvey(services, survey, choice) : null;
      const beside =
        other &&
        (await services.assess.assess(
          await requestOf(services, other.survey),
          (done, stage) => !signal.aborted && setWorking({ share: share + (1 - share) * done, stage }),
          signal,
        ));
      if (signal.aborted && signal.reason === LEFT) return;
      setWorking(null);
      const wrong = [outcome, beside].find((one) => one && !one.ok);
      if (wrong && !wrong.ok) setFault(wrong.fault);
      if (outcome.ok && !(wrong && !wrong.ok))
        setMade({
          survey,
          evidence: outcome.value,
          compared: other && beside?.ok ? { ...other, assessment: beside.value } : null,
        });
    };
    void work().catch((error: unknown) => {
      setWorking(null);
      setFault({ code: 'failed', detail: String(error) });
    });
    return () => abort.abort(LEFT);
  }, [services, survey, choice, abort]);

  return {
    working,
    fault,
    made: made?.survey === survey ? made : null,
    cancel: () => abort.abort(),
    retry: () => setAttempt((n) => n + 1),
  };
}

async function requestOf({ weather }: AppServices, survey: Survey) {
  return { survey, weatherFile: (await weatherBytes(weather, survey.climate)) ?? undefined };
}
