import { useEffect, useRef, useState } from 'preact/hooks';
import type { AppServices } from '../../../../app/app-services.ts';
import type { LiveSurvey } from '../../../../app/capture/live-survey.ts';
import type { StationSoFar } from '../../../../core/assessment/station-so-far.ts';
import type { CalculationFault } from '../../../../core/shading/calculation.ts';
import { weatherBytes } from '../../shade/weather-choice.ts';

export interface LiveAccess {
  found: StationSoFar | null;
  fault: CalculationFault | null;
  /** Whether the figures lag behind what is traced. */
  stale: boolean;
}

export interface LiveQuestion extends LiveSurvey {
  station: string;
  plane: string;
}

/** Figures that are younger than this are not called stale: they would blink with every tap [ms]. */
const STALE_MS = 900;

/**
 * The access of one station before one plane and how sure it is, anew whenever the question changes. One question is at
 * the worker at a time; of those that come meanwhile the last one counts, so that figures follow a sweep on a slow phone
 * too.
 */
export function useLiveAccess(services: AppServices, question: LiveQuestion | null): LiveAccess {
  const [live, setLive] = useState<LiveAccess>({ found: null, fault: null, stale: false });
  const wanted = useRef<LiveQuestion | null>(null);
  const busy = useRef(false);
  const left = useRef<AbortController | null>(null);

  useEffect(() => {
    const leaving = new AbortController();
    left.current = leaving;
    return () => leaving.abort();
  }, [services]);

  useEffect(() => {
    wanted.current = question;
    if (!busy.current) void work();
  }, [question]);

  async function work(): Promise<void> {
    busy.current = true;
    const { signal } = left.current!;
    while (wanted.current && !signal.aborted) {
      const { station, plane, ...request } = wanted.current;
      wanted.current = null;
      const late = setTimeout(() => setLive((before) => ({ ...before, stale: true })), STALE_MS);
      const weatherFile = (await weatherBytes(services.weather, request.survey.climate)) ?? undefined;
      const outcome = await services.assess.soFar({ ...request, weatherFile }, { plane, station }, signal);
      clearTimeout(late);
      if (signal.aborted) break;
      setLive(({ found }) =>
        outcome.ok
          ? { found: outcome.value, fault: null, stale: false }
          : { found, fault: outcome.fault, stale: found !== null },
      );
    }
    busy.current = false;
  }
  return live;
}
