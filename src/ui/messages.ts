import type { AppErrorCode } from '../app/app-error.ts';
import type { Notice } from '../app/app-state.ts';

export interface Message {
  what: string;
  /** What a person can do about it. */
  remedy: string;
}

/** Codes to sentences, in one place. */
export const ERROR_MESSAGES: Record<AppErrorCode, Message> = {
  'storage-refused': {
    what: 'This browser does not let Noonmark store anything.',
    remedy:
      'Private windows and blocked site data do that. Open Noonmark in an ordinary window, or allow site data for this address.',
  },
  'storage-full': {
    what: 'There is no room left on this device, so nothing was changed. What was stored before is safe.',
    remedy: 'Free some space (photos and videos take most), or export and erase old surveys, then try again.',
  },
  'storage-lost': {
    what: 'The connection to this device’s storage was lost. What was stored before is safe.',
    remedy: 'Close Noonmark fully and open it again. If that does not help, restart the device.',
  },
  'storage-waiting': {
    what: 'Another tab runs an older Noonmark and holds the surveys.',
    remedy: 'Close the other Noonmark tabs. This one then goes on by itself.',
  },
  'storage-taken-over': {
    what: 'A newer Noonmark is open in another tab. This tab has stopped storing.',
    remedy: 'Reload this tab to go on with the newer version.',
  },
  'storage-newer': {
    what: 'The surveys on this device were stored by a newer Noonmark than this one.',
    remedy: 'Reload once with a connection, so that the newer version is fetched. Nothing was changed.',
  },
  'survey-missing': {
    what: 'This survey is not on this device.',
    remedy:
      'It may have been erased, or the link was made on another device. Import its file to open it here.',
  },
  'survey-exists': {
    what: 'A survey with the same id is on this device already.',
    remedy: 'Import the file again and say whether to keep both.',
  },
  'reading-conflict': {
    what: 'The file holds a raw reading that differs from the one stored under the same id. Nothing was changed.',
    remedy: 'Raw readings are never put over. Import the file again and keep both.',
  },
  'survey-unreadable': {
    what: 'This version of Noonmark cannot read that survey, so it was left as it is.',
    remedy: 'Export it as it is stored, and open it with the version that wrote it.',
  },
  'change-refused': {
    what: 'That would leave the survey in a state that cannot be read, so nothing was changed.',
    remedy:
      'Later changes may stand on what it touches. Take those back first, or make the change by hand. The reason is below.',
  },
  'file-unreadable': {
    what: 'The file could not be read.',
    remedy:
      'It may have been moved, or it lies in a cloud that is out of reach now. Copy it to this device first.',
  },
  'import-running': {
    what: 'Other files are being imported just now.',
    remedy: 'Wait until their report is shown, then give these again.',
  },
  'report-not-written': {
    what: 'The report could not be written as that file. The survey is safe.',
    remedy:
      'Save it as a web page, which prints too. If this device is short of memory, close other apps and try again.',
  },
  'part-missing': {
    what: 'A part of Noonmark could not be loaded.',
    remedy: 'Reload the page. If a new version came in meanwhile, that brings it up.',
  },
  unexpected: {
    what: 'Something went wrong that should not have. What was stored before is safe.',
    remedy:
      'Reload the page and try again. If it happens again, export your surveys and report it with the words below.',
  },
};

const NOTICES: Record<Notice['code'], (title: string) => string> = {
  'survey-deleted': (title) => `“${title}” is deleted.`,
  'survey-renamed': (title) => `Renamed to “${title}”.`,
  'survey-duplicated': (title) => `Copied to “${title}”.`,
  'survey-replaced': (title) => `“${title}” is replaced by the file.`,
  'survey-changed': (title) => `“${title}” is changed.`,
  'survey-restored': (title) => `“${title}” is back in the list.`,
  'entry-added': (title) => `“${title}” is added.`,
  'entry-changed': (title) => `“${title}” is changed.`,
  'entry-deleted': (title) => `“${title}” is deleted.`,
  'step-undone': (title) => `Taken back: “${title}”.`,
  'step-redone': (title) => `Done again: “${title}”.`,
  'weather-file-forgotten': (name) => `The weather file ${name} is no longer on this device.`,
};

export function noticeText({ code, title }: Pick<Notice, 'code' | 'title'>): string {
  return NOTICES[code](title);
}

const UNITS: [factor: number, unit: string][] = [
  [1e9, 'GB'],
  [1e6, 'MB'],
  [1e3, 'kB'],
];

/** Bytes in words, two digits where they help. */
export function sizeText(bytes: number): string {
  const [factor, unit] = UNITS.find(([least]) => bytes >= least) ?? [1, 'bytes'];
  const amount = bytes / factor;
  return `${amount.toFixed(amount < 10 && factor > 1 ? 1 : 0)} ${unit}`;
}
