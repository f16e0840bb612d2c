import type { Parsed } from '../core/survey/problem.ts';
import type { Survey } from '../core/survey/survey.ts';
import type { AppState } from './app-state.ts';
import type { AssessClient } from './assess-client.ts';
import type { CaptureDevices } from './capture/sensor-interfaces.ts';
import type { BackupStore } from './backup/backup-store.ts';
import type { DraftStore } from './draft-store.ts';
import type { LocationSource } from './location-source.ts';
import type { PhotoStore } from './photo-store.ts';
import type { ReportSettingsStore } from './report-settings.ts';
import type { SurveyStore } from './survey-store.ts';
import type { WeatherStore } from './weather-store.ts';

/** A sample survey that ships with the app. */
export interface SampleSurvey {
  name: string;
  title: string;
  /** Text of the survey file. */
  text: () => Promise<string>;
}

/** All that actions and screens work with; made once, by main. */
export interface AppServices {
  state: AppState;
  store: SurveyStore;
  weather: WeatherStore;
  photos: PhotoStore;
  backup: BackupStore;
  reportSettings: ReportSettingsStore;
  drafts: DraftStore;
  location: LocationSource;
  assess: AssessClient;
  /** What a capture needs of the device; loaded when the first one is opened. */
  capture: () => Promise<CaptureDevices>;
  /** Of the program. */
  version: string;
  samples: SampleSurvey[];
  parse: (text: string) => Promise<Parsed<Survey>>;
  newId: () => string;
  /** SHA-256, hexadecimal. */
  hash: (contents: Uint8Array) => Promise<string>;
  /** Milliseconds since 1970. */
  now: () => number;
  /** Asks the browser to keep what is stored; a refusal is normal. */
  keepStorage: () => Promise<void>;
  /** Takes the waiting version of the app into use and reloads. */
  useNewVersion: () => void;
}
