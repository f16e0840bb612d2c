import { signal } from '@preact/signals';
import { isRecord } from '../../core/survey/json-value.ts';

const KEY = 'noonmark-own-answers';
const MOST = 30;

/** Answers somebody wrote on this device that no list has, by the fact they answer. */
type OwnChoices = Record<string, string[]>;

function stored(): OwnChoices {
  try {
    const value: unknown = JSON.parse(localStorage.getItem(KEY) ?? '{}');
    if (!isRecord(value)) return {};
    const texts = (list: unknown) =>
      Array.isArray(list) ? list.filter((text): text is string => typeof text === 'string') : [];
    return Object.fromEntries(Object.entries(value).map(([id, list]) => [id, texts(list)]));
  } catch {
    // Refused or damaged: the lists alone are offered.
    return {};
  }
}

export const ownChoices = signal<OwnChoices>(stored());

function keep(choices: OwnChoices): void {
  ownChoices.value = choices;
  try {
    localStorage.setItem(KEY, JSON.stringify(choices));
  } catch {
    // Not kept for the next time; it holds for this one.
  }
}

/** Offers an answer from now on. */
export function addOwnChoice(id: string, answer: string): void {
  const known = ownChoices.value[id] ?? [];
  if (answer === '' || known.includes(answer)) return;
  keep({ ...ownChoices.value, [id]: [...known, answer].slice(-MOST) });
}

/** Offers an answer no more; surveys that have it keep it. */
export function dropOwnChoice(id: string, answer: string): void {
  keep({ ...ownChoices.value, [id]: (ownChoices.value[id] ?? []).filter((one) => one !== answer) });
}
