import { useEffect, useState } from 'preact/hooks';
import { changeSurvey } from '../../../app/actions/change-survey.ts';
import type { AppServices } from '../../../app/app-services.ts';
import { attempt } from '../../../app/attempt.ts';
import type { WeatherFileSummary } from '../../../app/weather-store.ts';
import type { Assessment } from '../../../core/shading/assessment.ts';
import type { CalculationFault } from '../../../core/shading/calculation.ts';
import type { ClimateChoice, Survey, TranspositionId } from '../../../core/survey/survey.ts';
import { TRANSPOSITIONS } from '../../../core/transposition/transposition-models.ts';
import { ProblemList } from '../../components/problem-list.tsx';
import { CALCULATION_MESSAGES } from './calculation-messages.ts';

interface Props {
  survey: Survey;
  services: AppServices;
  assessment: Assessment | null;
}

/** Where the light comes from: the climate, kept weather files, and how sky light is laid on a plane. */
export function LightChoice({ survey, services, assessment }: Props) {
  const [kept, setKept] = useState<WeatherFileSummary[]>([]);
  const [fault, setFault] = useState<CalculationFault | null>(null);
  const refresh = () => attempt(services.state, async () => setKept(await services.weather.list()));
  useEffect(() => void refresh(), [services]);
  const change = (after: Survey) => attempt(services.state, () => changeSurvey(services, survey, after));
  const add = async (file: File) => {
    setFault(null);
    const contents = await file.arrayBuffer();
    const read = await services.assess.readWeatherFile(file.name, contents);
    if (!read.ok) return setFault(read.fault);
    await attempt(services.state, async () => {
      const { sha256, name } = await services.weather.keep(file.name, contents);
      await changeSurvey(services, survey, { ...survey, climate: { source: 'weather-file', name, sha256 } });
    });
    await refresh();
    return undefined;
  };
  return (
    <section class="shade-light">
      <h2>Where the light comes from</h2>
      <div class="choices">
        <label class="choice">
          <span>Climate</span>
          <select
            value={valueOf(survey.climate)}
            onChange={({ currentTarget }) =>
              void change({ ...survey, climate: choiceOf(currentTarget.value, kept) })
            }
          >
            <option value="world">World climate, 2° grid</option>
            <option value="clear-sky:ineichen">Clear sky (Ineichen and Perez)</option>
            <option value="clear-sky:haurwitz-erbs">Clear sky (Haurwitz with Erbs)</option>
            {kept.map(({ sha256, name }) => (
              <option key={sha256} value={`weather:${sha256}`}>
                Weather file {name}
              </option>
            ))}
            {isUnkept(survey.climate, kept) && (
              <option value={valueOf(survey.climate)}>{nameOf(survey.climate)} (not on this device)</option>
            )}
          </select>
        </label>
        <label class="choice">
          <span>Sky light on the plane</span>
          <select
            value={survey.transposition ?? 'hay-davies'}
            onChange={({ currentTarget }) =>
              void change({ ...survey, transposition: currentTarget.value as TranspositionId })
            }
          >
            {TRANSPOSITIONS.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </select>
        </label>
        <label class="button file-button">
          Add a weather file
          <input
            class="visually-hidden"
            type="file"
            accept=".epw,.csv,text/csv"
            onChange={({ currentTarget }) => {
              const file = currentTarget.files?.[0];
              currentTarget.value = '';
              if (file) void add(file);
            }}
          />
        </label>
      </div>
      {fault && (
        <div class="fault" role="alert">
          <p>
            <strong>{CALCULATION_MESSAGES[fault.code].what}</strong> {CALCULATION_MESSAGES[fault.code].remedy}
          </p>
          {fault.problems && <ProblemList problems={fault.problems} />}
        </div>
      )}
      {assessment && <Grounds assessment={assessment} />}
    </section>
  );
}

/** What the figures stand on, and what to know before trusting them. */
function Grounds({ assessment }: { assessment: Assessment }) {
  const { climate, warnings } = assessment;
  return (
    <>
      <p class="small">
        {climate.name}. {climate.reference}.
      </p>
      {(climate.warnings.length > 0 || warnings.length > 0) && (
        <ul class="small">
          {climate.warnings.map((text) => (
            <li key={text}>{text}</li>
          ))}
          {warnings.map(({ path, message }) => (
            <li key={path}>{message}</li>
          ))}
        </ul>
      )}
    </>
  );
}

function valueOf(climate: ClimateChoice): string {
  switch (climate.source) {
    case 'world':
      return 'world';
    case 'clear-sky':
      return `clear-sky:${climate.model}`;
    case 'weather-file':
      return `weather:${climate.sha256 ?? climate.name}`;
  }
}

const nameOf = (climate: ClimateChoice): string =>
  climate.source === 'weather-file' ? `Weather file ${climate.name}` : climate.source;

const isUnkept = (climate: ClimateChoice, kept: readonly WeatherFileSummary[]): boolean =>
  climate.source === 'weather-file' && !kept.some(({ sha256 }) => sha256 === climate.sha256);

function choiceOf(value: string, kept: readonly WeatherFileSummary[]): ClimateChoice {
  if (value === 'clear-sky:ineichen') return { source: 'clear-sky', model: 'ineichen' };
  if (value === 'clear-sky:haurwitz-erbs') return { source: 'clear-sky', model: 'haurwitz-erbs' };
  const file = kept.find(({ sha256 }) => value === `weather:${sha256}`);
  return file ? { source: 'weather-file', name: file.name, sha256: file.sha256 } : { source: 'world' };
}
