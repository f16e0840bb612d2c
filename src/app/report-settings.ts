/** How this device's reports are written, and on whose paper; kept until changed. */
export interface ReportSettings {
  /** BCP 47, such as `de`. */
  language: string;
  units: 'metric' | 'us';
  paper: 'a4' | 'letter';
  firm: {
    name: string;
    lines: string[];
    /** Six hexadecimal digits after `#`. */
    colour: string | null;
  };
  /** What a programme asks for at least, shares 0 to 1; absent ones are not asked. */
  thresholds: { solarAccess?: number; orientationFactor?: number; product?: number };
}

export interface ReportSettingsStore {
  /** Null where none have been kept. */
  load(): Promise<ReportSettings | null>;
  save(settings: ReportSettings): Promise<void>;
}

/** Countries where letters are written on Letter paper (CLDR, from memory). */
const LETTER_REGIONS = ['US', 'CA', 'MX', 'PH', 'CL', 'CO', 'CR', 'GT', 'PA', 'PR', 'SV', 'VE'];

/** Settings to begin with, from the device's language such as `en-US`. */
export function firstSettings(deviceLanguage: string): ReportSettings {
  const [language, ...rest] = deviceLanguage.split('-');
  const region = rest.find((part) => /^[A-Z]{2}$/.test(part)) ?? '';
  return {
    language,
    units: region === 'US' ? 'us' : 'metric',
    paper: LETTER_REGIONS.includes(region) ? 'letter' : 'a4',
    firm: { name: '', lines: [], colour: null },
    thresholds: {},
  };
}
