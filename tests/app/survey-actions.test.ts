import { describe, expect, it } from 'vitest';
import { deleteSurvey, eraseSurvey } from '../../src/app/actions/delete-survey.ts';
import { copyTitle, duplicateSurvey } from '../../src/app/actions/duplicate-survey.ts';
import { exportSurvey, fileNameOf } from '../../src/app/actions/export-survey.ts';
import { findUnreadable } from '../../src/app/actions/find-unreadable.ts';
import { importSurveys } from '../../src/app/actions/import-surveys.ts';
import { openSample } from '../../src/app/actions/open-sample.ts';
import { openSurvey } from '../../src/app/actions/open-survey.ts';
import { renameSurvey } from '../../src/app/actions/rename-survey.ts';
import { attempt } from '../../src/app/attempt.ts';
import { inventedSurvey } from './invented-survey.ts';
import { pickedFile, plainServices } from './plain-services.ts';

async function withSurvey(id = 'a') {
  const services = plainServices();
  await services.store.create(inventedSurvey(id));
  return services;
}

describe('export', () => {
  it('gives a file that imports as the same survey', async () => {
    const services = await withSurvey();
    const { fileName, text } = await exportSurvey(services, 'a');
    expect(fileName).toBe('mill-lane-4-nowhere.json');
    const elsewhere = plainServices();
    await importSurveys(elsewhere, [pickedFile(fileName, text)]);
    expect(await elsewhere.store.load('a')).toMatchObject({ survey: inventedSurvey('a') });
  });

  it('gives a survey that cannot be read as it is stored', async () => {
    const services = await withSurvey();
    await services.store.applyChanges('a', [{ path: 'version', value: 9 }]);
    const { text } = await exportSurvey(services, 'a');
    expect(JSON.parse(text)).toEqual({ ...inventedSurvey('a'), version: 9 });
  });

  it.each([
    ['Dach über Łódź / Süd', 'dach-über-łódź-süd.json'],
    ['../../etc/passwd', 'etc-passwd.json'],
    ['???', 'survey.json'],
    ['x'.repeat(300), `${'x'.repeat(60)}.json`],
  ])('names the file after the title: %s', (title, fileName) => expect(fileNameOf(title)).toBe(fileName));
});

describe('duplicate', () => {
  it('stores a copy under a new id and title, and can be taken back', async () => {
    const services = await withSurvey();
    await duplicateSurvey(services, 'a');
    expect(await services.store.load('new-1')).toMatchObject({
      survey: { ...inventedSurvey('a'), id: 'new-1', title: 'Mill lane 4, Nowhere, copy' },
    });
    await services.state.notice.value?.undo?.();
    expect((await services.store.load('new-1'))?.deletedAt).not.toBeNull();
  });

  it('counts copies instead of stacking the word', () => {
    expect(copyTitle('House, copy', ['House', 'House, copy'])).toBe('House, copy 2');
    expect(copyTitle('House, copy 2', ['House, copy', 'House, copy 2'])).toBe('House, copy 3');
  });
});

describe('delete', () => {
  it('can be taken back', async () => {
    const services = await withSurvey();
    await deleteSurvey(services, { id: 'a', title: 'House' });
    expect(services.state.surveys.value?.[0].deletedAt).not.toBeNull();
    await services.state.notice.value?.undo?.();
    expect(services.state.surveys.value?.[0].deletedAt).toBeNull();
  });

  it('for good leaves no way back and no offer of one', async () => {
    const services = await withSurvey();
    await deleteSurvey(services, { id: 'a', title: 'House' });
    await eraseSurvey(services, 'a');
    expect(services.state.notice.value).toBeNull();
    expect(services.state.surveys.value).toEqual([]);
  });
});

describe('rename', () => {
  it('changes the title alone, on the open survey too, and can be taken back', async () => {
    const services = await withSurvey();
    await openSurvey(services, 'a');
    await renameSurvey(services, inventedSurvey('a'), '  New name ');
    expect(services.state.open.value?.stored).toMatchObject({
      survey: inventedSurvey('a', { title: 'New name' }),
    });
    await services.state.notice.value?.undo?.();
    expect(services.state.open.value?.stored).toMatchObject({ survey: inventedSurvey('a') });
  });

  it('leaves the title where the new one is empty', async () => {
    const services = await withSurvey();
    await renameSurvey(services, inventedSurvey('a'), '   ');
    expect(services.state.notice.value).toBeNull();
  });
});

describe('a sample', () => {
  const sample = { name: 's', title: 'S', text: () => Promise.resolve(JSON.stringify(inventedSurvey('s'))) };

  it('is stored once, kept as edited, and brought back when it was deleted', async () => {
    const services = plainServices();
    expect(await openSample(services, sample)).toBe('s');
    await services.store.applyChanges('s', [{ path: 'title', value: 'Mine now' }]);
    await services.store.remove('s');
    expect(await openSample(services, sample)).toBe('s');
    expect(await services.store.load('s')).toMatchObject({ deletedAt: null, survey: { title: 'Mine now' } });
  });

  it('that does not load is told', async () => {
    const services = plainServices();
    const broken = { ...sample, text: () => Promise.reject(new Error('offline')) };
    expect(await attempt(services.state, async () => void (await openSample(services, broken)))).toBe(false);
    expect(services.state.trouble.value).toEqual({ code: 'part-missing', detail: 'Error: offline' });
  });
});

describe('opening', () => {
  it('tells a survey that is not here', async () => {
    const services = plainServices();
    await openSurvey(services, 'nowhere');
    expect(services.state.open.value).toEqual({ id: 'nowhere', stored: 'missing' });
  });

  it('is not undone by an earlier one that was still reading', async () => {
    const services = await withSurvey('slow');
    await services.store.create(inventedSurvey('quick'));
    const slow = openSurvey(services, 'slow');
    await openSurvey(services, 'quick');
    await slow;
    expect(services.state.open.value?.id).toBe('quick');
    expect(services.state.open.value?.stored).toMatchObject({ survey: { id: 'quick' } });
  });

  it('marks in the list what cannot be read', async () => {
    const services = await withSurvey('good');
    await services.store.create(inventedSurvey('newer'));
    await services.store.applyChanges('newer', [{ path: 'version', value: 9 }]);
    await findUnreadable(services);
    expect([...services.state.unreadable.value.keys()]).toEqual(['newer']);
  });
});
