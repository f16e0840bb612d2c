import { AppError } from '../app-error.ts';
import type { AppServices } from '../app-services.ts';

export interface SurveyFile {
  fileName: string;
  text: string;
}

/** File name from a title: letters and digits of any script, joined by hyphens, at most 60 characters. */
export function fileNameOf(title: string): string {
  const stem = title
    .normalize('NFC')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}\p{M}]+/gu, '-')
    .slice(0, 60)
    .replace(/^-+|-+$/g, '');
  return `${stem || 'survey'}.json`;
}

/** The survey as a file. One that cannot be read is given out whole, as it is stored. */
export async function exportSurvey({ store }: Pick<AppServices, 'store'>, id: string): Promise<SurveyFile> {
  const stored = await store.load(id);
  if (stored === null) throw new AppError('survey-missing');
  const readable = stored.state === 'readable';
  const document = readable ? stored.survey : stored.document;
  const fileName = fileNameOf(readable ? stored.survey.title : `unread survey ${id}`);
  return { fileName, text: `${JSON.stringify(document, null, 2)}\n` };
}
