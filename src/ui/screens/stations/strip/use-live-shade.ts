import { useEffect, useRef, useState } from 'preact/hooks';
import type { AppServices } from '../../../../app/app-services.ts';
import type { CalculationFault } from '../../../../core/shading/calculation.ts';
import type { StationShade } from '../../../../core/shading/station-shade.ts';
import type { Survey } from '../../../../core/survey/survey.ts';
import { weatherBytes } from '../../shade/weather-choice.ts';

export interface LiveShade {
  shade: StationShade | null;
  fault: CalculationFault | null;
}

interface Question {
  survey: Survey;
  station: string;
  plane: string;
}

/**
 * The shade of one station over one plane, anew whenever the question changes. One question is at the worker at a time;
 * of those that come meanwhile the last one counts, so that figures follow a sweep on a slow phone too.
 */
export function useLiveShade(services: AppServices, question: Question | null): LiveShade {
  const [live, setLive] = useState<LiveShade>({ shade: null, fault: null });
  const wanted = useRef<Question | null>(null);
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
      const { survey, station, plane } = wanted.current;
      wanted.current = null;
      const weatherFile = (await weatherBytes(services.weather, survey.climate)) ?? undefined;
      const outcome = await services.assess.shade(
        { survey, weatherFile },
        { plane, station, changes: [] },
        signal,
      );
      if (signal.aborted) break;
      setLive((before) =>
        outcome.ok ? { shade: outcome.value, fault: null } : { shade: before.shade, fault: outcome.fault },
      );
    }
    busy.current = false;
  }
  return live;
}
