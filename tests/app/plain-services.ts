import { AppError } from '../../src/app/app-error.ts';
import { appState } from '../../src/app/app-state.ts';
import type { PickedFile } from '../../src/app/actions/import-surveys.ts';
import type { Step, StoredSurvey, SurveyStore } from '../../src/app/survey-store.ts';
import { fieldsOf, surveyOf, type FieldChange } from '../../src/core/survey/field-changes.ts';
import { parseSurvey, surveyFromJson } from '../../src/core/survey/parse-survey.ts';

interface Done extends Step {
  back: FieldChange[];
  forth: FieldChange[];
  undone: boolean;
}

interface Kept {
  fields: FieldChange[];
  done: Done[];
  deletedAt: number | null;
}

/** A survey store in a plain map, with the same promises as the one on the device. */
export function plainStore(): SurveyStore {
  const kept = new Map<string, Kept>();
  const found = (id: string): Promise<Kept> => {
    const survey = kept.get(id);
    return survey ? Promise.resolve(survey) : Promise.reject(new AppError('survey-missing'));
  };
  const load = (id: string): Promise<StoredSurvey | null> => {
    const stored = kept.get(id);
    if (!stored) return Promise.resolve(null);
    const document = surveyOf(stored.fields);
    const parsed = surveyFromJson(document);
    const { deletedAt } = stored;
    return Promise.resolve(
      parsed.ok
        ? { id, deletedAt, state: 'readable', survey: parsed.value, warnings: parsed.warnings }
        : { id, deletedAt, state: 'unreadable', document, problems: parsed.problems },
    );
  };
  return {
    load,
    list: () =>
      Promise.resolve(
        [...kept].map(([id, { fields, deletedAt }]) => ({
          id,
          title: fields.findLast(({ path }) => path === 'title')?.value as string,
          planes: 0,
          stations: 0,
          obstructions: 0,
          changedAt: 0,
          deletedAt,
        })),
      ),
    create: (survey) => {
      if (kept.has(survey.id)) return Promise.reject(new AppError('survey-exists'));
      kept.set(survey.id, { fields: fieldsOf(survey), done: [], deletedAt: null });
      return Promise.resolve();
    },
    applyChanges: (id, changes, step) =>
      found(id).then(({ fields, done }) => {
        fields.push(...changes);
        if (!step) return null;
        done.splice(0, done.length, ...done.filter(({ undone }) => !undone));
        const number = done.length + 1;
        done.push({ ...step, number, forth: changes, undone: false });
        return number;
      }),
    steps: (id) => {
      const done = kept.get(id)?.done ?? [];
      return Promise.resolve({
        undo: done.findLast(({ undone }) => !undone) ?? null,
        redo: done.find(({ undone }) => undone) ?? null,
      });
    },
    undo: (id, number) =>
      found(id).then(({ fields, done }) => {
        const last = done.findLast(({ undone }) => !undone);
        if (!last || (number !== undefined && last.number !== number)) return null;
        fields.push(...last.back);
        last.undone = true;
        return last;
      }),
    redo: (id) =>
      found(id).then(({ fields, done }) => {
        const next = done.find(({ undone }) => undone);
        if (!next) return null;
        fields.push(...next.forth);
        next.undone = false;
        return next;
      }),
    remove: (id) => found(id).then((survey) => void (survey.deletedAt = 1)),
    restore: (id) => found(id).then((survey) => void (survey.deletedAt = null)),
    erase: (id) => Promise.resolve(void kept.delete(id)),
  };
}

/** What actions need, without a browser. */
export function plainServices() {
  let made = 0;
  let asked = 0;
  return {
    state: appState(),
    store: plainStore(),
    parse: (text: string) => Promise.resolve(parseSurvey(text)),
    newId: () => `new-${++made}`,
    keepStorage: () => Promise.resolve(void asked++),
    timesKept: () => asked,
  };
}

export const pickedFile = (name: string, content: unknown): PickedFile => {
  const text = typeof content === 'string' ? content : JSON.stringify(content);
  return { name, size: text.length, text: () => Promise.resolve(text) };
};
