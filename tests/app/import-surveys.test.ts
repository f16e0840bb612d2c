import { describe, expect, it } from 'vitest';
import { AppError } from '../../src/app/app-error.ts';
import { importSurveys } from '../../src/app/actions/import-surveys.ts';
import { settleConflict } from '../../src/app/actions/settle-conflict.ts';
import { inventedSurvey, rawReading } from './invented-survey.ts';
import { pickedFile, plainServices } from './plain-services.ts';

type Services = ReturnType<typeof plainServices>;

async function survey({ store }: Services, id: string) {
  const stored = await store.load(id);
  return stored?.state === 'readable' ? stored.survey : stored;
}

describe('importing files', () => {
  it('stores the good ones, each whole, and tells what is wrong with the others', async () => {
    const services = plainServices();
    const files = [
      pickedFile('good.json', inventedSurvey('a')),
      pickedFile('not-json.json', '{ "format": '),
      pickedFile(
        'steep.json',
        inventedSurvey('b', { planes: [{ ...inventedSurvey().planes[0], surfaceTilt: 300 }] }),
      ),
      pickedFile('also-good.json', inventedSurvey('c')),
    ];
    await importSurveys(services, files);
    const results = services.state.imports.value;
    expect(results.map(({ file, outcome }) => [file, outcome])).toEqual([
      ['good.json', 'stored'],
      ['not-json.json', 'refused'],
      ['steep.json', 'refused'],
      ['also-good.json', 'stored'],
    ]);
    expect(results[2]).toMatchObject({ problems: [{ path: 'planes[0].surfaceTilt' }] });
    expect(services.state.surveys.value?.map(({ id }) => id)).toEqual(['a', 'c']);
    expect(services.state.busy.value).toBe(false);
    expect(services.timesKept()).toBe(1);
  });

  it('refuses a huge file without reading it', async () => {
    const services = plainServices();
    const unread = () => Promise.reject(new Error('was read'));
    await importSurveys(services, [{ name: 'photos.json', size: 100_000_000, text: unread }]);
    expect(services.state.imports.value).toMatchObject([{ outcome: 'refused' }]);
    expect(JSON.stringify(services.state.imports.value)).toContain('100 MB');
  });

  it('takes no further files while it is at work', async () => {
    const services = plainServices();
    const first = importSurveys(services, [pickedFile('a.json', inventedSurvey('a'))]);
    await expect(importSurveys(services, [])).rejects.toMatchObject({ code: 'import-running' });
    await first;
    expect(services.state.imports.value).toMatchObject([{ outcome: 'stored', id: 'a' }]);
  });

  it('tells of a file that cannot be read, and of a full device, and goes on', async () => {
    const services = plainServices();
    const create = services.store.create.bind(services.store);
    services.store.create = (given) =>
      given.id === 'full' ? Promise.reject(new AppError('storage-full')) : create(given);
    await importSurveys(services, [
      { name: 'gone.json', size: 1, text: () => Promise.reject(new Error('gone')) },
      pickedFile('full.json', inventedSurvey('full')),
      pickedFile('fits.json', inventedSurvey('fits')),
    ]);
    expect(services.state.imports.value).toMatchObject([
      { outcome: 'failed', code: 'file-unreadable' },
      { outcome: 'failed', code: 'storage-full' },
      { outcome: 'stored', id: 'fits' },
    ]);
  });
});

describe('a file whose survey is here already', () => {
  const changed = inventedSurvey('a', {
    title: 'Changed elsewhere',
    obstructions: inventedSurvey().obstructions,
  });

  async function conflicting(file = changed): Promise<Services> {
    const services = plainServices();
    await services.store.create(inventedSurvey('a'));
    await importSurveys(services, [pickedFile('again.json', file)]);
    expect(services.state.imports.value).toEqual([]);
    expect(services.state.conflicts.value).toMatchObject([
      { file: 'again.json', storedTitle: 'Mill lane 4, Nowhere' },
    ]);
    expect(await survey(services, 'a')).toEqual(inventedSurvey('a'));
    return services;
  }

  it('can be kept beside it under a new id', async () => {
    const services = await conflicting();
    await settleConflict(services, services.state.conflicts.value[0], 'keep-both');
    expect(await survey(services, 'a')).toEqual(inventedSurvey('a'));
    expect(await survey(services, 'new-1')).toEqual({ ...changed, id: 'new-1' });
    expect(services.state.conflicts.value).toEqual([]);
  });

  it('can replace it, and that can be taken back', async () => {
    const services = await conflicting();
    await settleConflict(services, services.state.conflicts.value[0], 'replace');
    expect(await survey(services, 'a')).toEqual(changed);
    await services.state.notice.value?.undo?.();
    expect(await survey(services, 'a')).toEqual(inventedSurvey('a'));
  });

  it('can be left out', async () => {
    const services = await conflicting();
    await settleConflict(services, services.state.conflicts.value[0], 'leave-out');
    expect(services.state.imports.value).toMatchObject([{ outcome: 'left-out' }]);
    expect(await survey(services, 'a')).toEqual(inventedSurvey('a'));
  });

  it('is told when the device refuses the replacement', async () => {
    const services = await conflicting(inventedSurvey('a', { readings: [rawReading('raw-1', 99)] }));
    services.store.applyChanges = () => Promise.reject(new AppError('reading-conflict'));
    await settleConflict(services, services.state.conflicts.value[0], 'replace');
    expect(services.state.imports.value).toMatchObject([{ outcome: 'failed', code: 'reading-conflict' }]);
    expect(services.state.notice.value).toBeNull();
  });

  it('brings a deleted survey back when it replaces it', async () => {
    const services = plainServices();
    await services.store.create(inventedSurvey('a'));
    await services.store.remove('a');
    await importSurveys(services, [pickedFile('again.json', changed)]);
    expect(services.state.conflicts.value[0].storedIsDeleted).toBe(true);
    await settleConflict(services, services.state.conflicts.value[0], 'replace');
    expect((await services.store.load('a'))?.deletedAt).toBeNull();
    await services.state.notice.value?.undo?.();
    expect((await services.store.load('a'))?.deletedAt).not.toBeNull();
  });
});
