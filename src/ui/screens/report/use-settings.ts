import { useEffect, useState } from 'preact/hooks';
import type { AppServices } from '../../../app/app-services.ts';
import { attempt } from '../../../app/attempt.ts';
import type { ReportSettings } from '../../../app/report-settings.ts';
import { firstSettings } from '../../../app/report-settings.ts';

/** The kept settings, null until they are read, and the way to change them: shown at once, then kept. */
export function useSettings({
  reportSettings,
  state,
}: AppServices): [ReportSettings | null, (settings: ReportSettings) => void] {
  const [settings, setSettings] = useState<ReportSettings | null>(null);
  useEffect(() => {
    let isStale = false;
    const begin = (kept: ReportSettings | null) => {
      if (!isStale) setSettings(kept ?? firstSettings(navigator.language));
    };
    reportSettings.load().then(begin, () => begin(null));
    return () => {
      isStale = true;
    };
  }, [reportSettings]);
  const change = (changed: ReportSettings) => {
    setSettings(changed);
    void attempt(state, () => reportSettings.save(changed));
  };
  return [settings, change];
}
