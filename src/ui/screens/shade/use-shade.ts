import { useEffect, useMemo, useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import type { Assessment } from '../../../core/shading/assessment.ts';
import type { AssessRequest, CalculationFault } from '../../../core/shading/calculation.ts';
import type { StationShade } from '../../../core/shading/station-shade.ts';
import type { ObstructionChange } from '../../../core/shading/what-if.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { weatherBytes } from './weather-choice.ts';

/** What the calculation has come to. The last good results stay while new ones are made. */
export interface ShadeState {
  working: { share: number; stage: string } | null;
  fault: CalculationFault | null;
  assessment: Assessment | null;
  shade: StationShade | null;
  /** Whether `shade` has the changes now wished for in it; else they are still being worked out. */
  settled: boolean;
  cancel: () => void;
  retry: () => void;
}

export interface ShadeWish {
  survey: Survey;
  plane: string | null;
  station: string | null;
  /** What is imagined changed; the same list until another is wished for. */
  changes: readonly ObstructionChange[];
}

/** Runs the assessment of a survey and the shade of one of its stations on the worker. */
export function useShade(services: AppServices, { survey, plane, station, changes }: ShadeWish): ShadeState {
  const [attemptNumber, setAttempt] = useState(0);
  const [working, setWorking] = useState<ShadeState['working']>(null);
  const [fault, setFault] = useState<CalculationFault | null>(null);
  const [assessed, setAssessed] = useState<{ request: AssessRequest; assessment: Assessment } | null>(null);
  const [shade, setShade] = useState<{
    shade: StationShade;
    of: string;
    changes: readonly ObstructionChange[];
  } | null>(null);
  const abort = useMemo(() => new AbortController(), [survey, attemptNumber]);

  useEffect(() => {
    const { signal } = abort;
    const work = async () => {
      setFault(null);
      setWorking({ share: 0, stage: 'Reading the climate' });
      const weatherFile = await weatherBytes(services.weather, survey.climate);
      const request = { survey, weatherFile: weatherFile ?? undefined };
      const outcome = await services.assess.assess(
        request,
        (share, stage) => !signal.aborted && setWorking({ share, stage }),
        signal,
      );
      if (signal.aborted && signal.reason === LEFT) return;
      setWorking(null);
      // figures of another climate must not stand beside a fault of this one
      setAssessed(outcome.ok ? { request, assessment: outcome.value } : null);
      if (!outcome.ok) setFault(outcome.fault);
    };
    void work().catch((error: unknown) => {
      setWorking(null);
      setFault({ code: 'failed', detail: String(error) });
    });
    return () => abort.abort(LEFT);
  }, [services, survey, abort]);

  const request = assessed?.request ?? null;
  useEffect(() => {
    if (!request || request.survey !== survey || plane === null || station === null) return undefined;
    const leaving = new AbortController();
    void services.assess.shade(request, { plane, station, changes }, leaving.signal).then((outcome) => {
      if (leaving.signal.aborted) return;
      if (outcome.ok) setShade({ shade: outcome.value, of: `${plane} ${station}`, changes });
      else setFault(outcome.fault);
    });
    return () => leaving.abort();
  }, [services, request, survey, plane, station, changes]);

  return {
    working,
    fault,
    assessment: assessed?.assessment ?? null,
    shade: shade?.of === `${plane} ${station}` ? shade.shade : null,
    settled: shade?.changes === changes,
    cancel: () => abort.abort(),
    retry: () => setAttempt((n) => n + 1),
  };
}

/** Why a calculation was ended: nobody looks at it any more. */
const LEFT = 'left';
