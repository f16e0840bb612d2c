import type { AppServices, SampleSurvey } from '../app-services.ts';
import { AppError } from '../app-error.ts';
import { refreshList } from './refresh-list.ts';

type Needs = Pick<AppServices, 'state' | 'store' | 'parse' | 'keepStorage'>;

async function sampleText(sample: SampleSurvey): Promise<string> {
  try {
    return await sample.text();
  } catch (cause) {
    throw new AppError('part-missing', cause);
  }
}

/** Stores a sample, unless it is on this device already, and gives its id to be opened. */
export async function openSample(services: Needs, sample: SampleSurvey): Promise<string> {
  const { store, parse, keepStorage } = services;
  const parsed = await parse(await sampleText(sample));
  if (!parsed.ok) throw new AppError('unexpected', parsed.problems[0]?.message);
  const { id } = parsed.value;
  const stored = await store.load(id);
  if (stored === null) await store.create(parsed.value);
  else if (stored.deletedAt !== null) await store.restore(id);
  await refreshList(services);
  await keepStorage();
  return id;
}
