import { useEffect } from 'preact/hooks';
import { attempt } from '../../../app/attempt.ts';
import { forgetWeatherFile, refreshWeatherFiles } from '../../../app/actions/forget-weather-file.ts';
import type { WeatherFileSummary } from '../../../app/weather-store.ts';
import { useApp } from '../../app-context.ts';
import { focusHeading } from '../../components/screen-heading.tsx';
import { sizeText } from '../../messages.ts';

/** Weather files that were used once and kept; they take more room than the surveys. */
export function WeatherFiles() {
  const services = useApp();
  const { state } = services;
  useEffect(() => void attempt(state, () => refreshWeatherFiles(services)), [services, state]);
  const files = state.weatherFiles.value;
  if (files.length === 0) return null;
  const forget = async (file: WeatherFileSummary) => {
    await forgetWeatherFile(services, file);
    focusHeading();
  };
  return (
    <details class="fold">
      <summary>Kept weather files ({files.length})</summary>
      <ul class="ledger">
        {files.map((file) => (
          <li key={file.sha256} class="ledger-line">
            <span class="grow">
              <strong>{file.name}</strong> <span class="faint small">{sizeText(file.bytes)}</span>
            </span>
            <button
              type="button"
              aria-label={`Remove ${file.name}`}
              onClick={() => void attempt(state, () => forget(file))}
            >
              Remove
            </button>
          </li>
        ))}
      </ul>
    </details>
  );
}
