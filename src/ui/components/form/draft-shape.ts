import { isRecord } from '../../../core/survey/json-value.ts';

/**
 * Whether a stored draft has the shape of a form's texts as they are now: another version of the app may have stored it.
 * Lists may be longer or shorter, and nothing may stand where something may.
 */
export function hasShapeOf(draft: unknown, model: unknown): boolean {
  if (draft === null || model === null) return true;
  if (Array.isArray(model))
    return Array.isArray(draft) && (model.length === 0 || draft.every((item) => hasShapeOf(item, model[0])));
  if (isRecord(model))
    return isRecord(draft) && Object.entries(model).every(([key, part]) => hasShapeOf(draft[key], part));
  return typeof draft === typeof model;
}
