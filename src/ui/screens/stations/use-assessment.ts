import { useEffect, useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import type { Assessment } from '../../../core/shading/assessment.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { weatherBytes } from '../shade/weather-choice.ts';

/** The figures of a survey, computed off the main thread; null until they are there, and where they cannot be had. */
export function useAssessment(services: AppServices, survey: Survey): Assessment | null {
  const [assessment, setAssessment] = useState<Assessment | null>(null);
  useEffect(() => {
    if (survey.planes.length === 0 || survey.stations.length === 0) return undefined;
    const leaving = new AbortController();
    const work = async () => {
      const weatherFile = (await weatherBytes(services.weather, survey.climate)) ?? undefined;
      const outcome = await services.assess.assess({ survey, weatherFile }, () => undefined, leaving.signal);
      if (!leaving.signal.aborted) setAssessment(outcome.ok ? outcome.value : null);
    };
    // The Shade section tells what is wrong; here the figures are left out.
    void work().catch(() => setAssessment(null));
    return () => leaving.abort();
  }, [services, survey]);
  return assessment;
}
