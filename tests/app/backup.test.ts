import { unzipSync, zipSync } from 'fflate';
import { beforeEach, describe, expect, it } from 'vitest';
import { restoreBackup } from '../../src/app/actions/restore-backup.ts';
import { appState } from '../../src/app/app-state.ts';
import { makeBackup } from '../../src/app/backup/make-backup.ts';
import { changesBetween } from '../../src/core/survey/field-changes.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { emptyBrowser, tab } from '../storage/memory-database.ts';
import { inventedSurvey, rawReading } from './invented-survey.ts';

beforeEach(emptyBrowser);

const ID = 'invented-1';
const PICTURE = Uint8Array.from({ length: 5000 }, (_, i) => (i * 37) % 251);

function device() {
  const { surveys, photos, backup, hash, now, setClock } = tab();
  const keepStorage = () => Promise.resolve();
  return { state: appState(), store: surveys, photos, backup, hash, now, setClock, keepStorage };
}
type Device = ReturnType<typeof device>;

/** A survey with a photo on a device. */
async function filled(at: Device): Promise<Survey> {
  const sha256 = await at.photos.keep({ type: 'image/jpeg', contents: PICTURE.slice().buffer });
  const survey = inventedSurvey(ID, {
    photos: [
      {
        id: 'p1',
        of: { kind: 'plane', id: 'south' },
        takenAt: '2026-05-14T09:30:00Z',
        width: 100,
        height: 50,
        bytes: PICTURE.length,
        sha256,
      },
    ],
  });
  await at.store.create(survey);
  return survey;
}

async function packed(at: Device, ids = [ID]): Promise<Uint8Array> {
  const pieces: Uint8Array[] = [];
  await makeBackup(at, ids, (piece) => pieces.push(piece.slice()));
  return Uint8Array.from(pieces.flatMap((piece) => [...piece]));
}

async function restore(at: Device, archive: Uint8Array) {
  const file = {
    name: 'backup.zip',
    size: archive.length,
    arrayBuffer: () => Promise.resolve(archive.slice().buffer),
  };
  await restoreBackup(at, [file]);
  return at.state.restores.value[0];
}

async function survey(at: Device, id = ID): Promise<Survey> {
  const stored = await at.store.load(id);
  if (stored?.state !== 'readable') throw new Error('not readable');
  return stored.survey;
}

const edit = async (at: Device, change: Partial<Survey>) => {
  const before = await survey(at);
  await at.store.applyChanges(ID, changesBetween(before, { ...before, ...change }));
};

/** The device loses everything. */
function another(at: Device): Device {
  emptyBrowser();
  const fresh = device();
  fresh.setClock(at.now());
  return fresh;
}

describe('a backup', () => {
  it('brings surveys and photos to an empty device, equal', async () => {
    const first = device();
    const before = await filled(first);
    await first.store.create(inventedSurvey('second', { title: 'Second' }));
    const archive = await packed(first, [ID, 'second']);
    const second = another(first);
    expect(await restore(second, archive)).toEqual({
      file: 'backup.zip',
      outcome: 'restored',
      photos: 1,
      surveys: [
        { id: ID, title: before.title, outcome: 'added', isDeleted: false },
        { id: 'second', title: 'Second', outcome: 'added', isDeleted: false },
      ],
    });
    expect(await survey(second)).toEqual(before);
    const picture = await second.photos.picture(before.photos![0].sha256);
    expect(new Uint8Array(picture!.contents)).toEqual(PICTURE);
  });

  it('is an open archive: the survey as a survey file, photos as files, a list with hashes', async () => {
    const first = device();
    const before = await filled(first);
    const files = unzipSync(await packed(first));
    const text = (path: string) => new TextDecoder().decode(files[path]);
    const folder = 'surveys/1-mill-lane-4-nowhere';
    const { sha256 } = before.photos![0];
    expect(Object.keys(files).sort()).toEqual(
      [
        `${folder}/survey.json`,
        `${folder}/rows.json`,
        `photos/${sha256}.jpg`,
        'manifest.json',
        'manifest.sha256',
      ].sort(),
    );
    expect(JSON.parse(text(`${folder}/survey.json`))).toEqual(before);
    expect(files[`photos/${sha256}.jpg`]).toEqual(PICTURE);
    expect(JSON.parse(text('manifest.json'))).toMatchObject({ format: 'noonmark-backup', version: 1 });
  });

  it('is merged: of each field the later one stays, readings are joined', async () => {
    const first = device();
    await filled(first);
    await edit(first, { notes: 'Backed up', readings: [...inventedSurvey().readings, rawReading('raw-22')] });
    const archive = await packed(first);
    // The same device, later: one field is newer, one reading more.
    await edit(first, {
      title: 'Newer title',
      readings: [...(await survey(first)).readings, rawReading('raw-333')],
    });
    await edit(first, { planes: [{ ...inventedSurvey().planes[0], surfaceTilt: 41 }] });
    const newest = await survey(first);
    expect(await restore(first, archive)).toMatchObject({ surveys: [{ outcome: 'same' }] });
    expect(await survey(first)).toEqual(newest);
  });

  it('fills in what another copy lacks, and leaves what is newer there', async () => {
    const first = device();
    await filled(first);
    const old = await packed(first);
    await edit(first, { notes: 'Two dogs', planes: [{ ...inventedSurvey().planes[0], surfaceTilt: 41 }] });
    const newer = await packed(first);
    const second = another(first);
    await restore(second, old);
    await edit(second, { title: 'Changed here' });
    expect(await restore(second, newer)).toMatchObject({ surveys: [{ outcome: 'merged' }] });
    expect(await survey(second)).toMatchObject({
      title: 'Changed here',
      notes: 'Two dogs',
      planes: [{ surfaceTilt: 41 }],
    });
    // What this device does next is later than all that came in.
    second.setClock(0);
    await edit(second, { notes: 'Three dogs' });
    await restore(second, newer);
    expect((await survey(second)).notes).toBe('Three dogs');
  });

  it('does not bring back what was deleted later, and says so', async () => {
    const first = device();
    await filled(first);
    const archive = await packed(first);
    await first.store.remove(ID);
    expect(await restore(first, archive)).toMatchObject({ surveys: [{ outcome: 'same', isDeleted: true }] });
  });

  it('brings back what was erased', async () => {
    const first = device();
    const before = await filled(first);
    const archive = await packed(first);
    await first.store.erase(ID);
    expect(await restore(first, archive)).toMatchObject({
      surveys: [{ outcome: 'added', isDeleted: false }],
    });
    expect(await survey(first)).toEqual(before);
  });

  it('refuses a survey whose raw reading differs from the one stored, and leaves it whole', async () => {
    const first = device();
    await filled(first);
    const archive = await packed(first);
    const second = another(first);
    await second.store.create(inventedSurvey(ID, { readings: [rawReading('raw-1', 99)] }));
    const before = await survey(second);
    expect(await restore(second, archive)).toMatchObject({
      surveys: [{ outcome: 'refused', code: 'reading-conflict' }],
    });
    expect(await survey(second)).toEqual(before);
  });
});

describe('a damaged archive', () => {
  /** The archive with one of its files changed. */
  async function bent(change: (files: Record<string, Uint8Array>) => void): Promise<[Device, Uint8Array]> {
    const first = device();
    await filled(first);
    const files = unzipSync(await packed(first));
    change(files);
    return [another(first), zipSync(files)];
  }
  const rowsPath = 'surveys/1-mill-lane-4-nowhere/rows.json';
  const photoPath = (files: Record<string, Uint8Array>) =>
    Object.keys(files).find((path) => path.startsWith('photos'))!;

  it.each<[string, (files: Record<string, Uint8Array>) => void, RegExp, RegExp]>([
    ['a flipped bit in a photo', (files) => (files[photoPath(files)][17] ^= 4), /photos\/.*jpg/, /damaged/],
    ['a photo cut short', (files) => (files[photoPath(files)] = PICTURE.slice(0, 100)), /photos/, /damaged/],
    ['a missing photo', (files) => delete files[photoPath(files)], /photos/, /missing/],
    ['a flipped bit in the rows', (files) => (files[rowsPath][40] ^= 1), /rows\.json/, /damaged/],
    ['a flipped bit in the list', (files) => (files['manifest.json'][60] ^= 1), /manifest/, /damaged/],
    ['no list', (files) => delete files['manifest.json'], /manifest/, /no backup/],
  ])('with %s is refused with what and where, and nothing is stored', async (_, change, path, message) => {
    const [second, archive] = await bent(change);
    expect(await restore(second, archive)).toMatchObject({
      outcome: 'damaged',
      problems: [
        { path: expect.stringMatching(path) as string, message: expect.stringMatching(message) as string },
      ],
    });
    expect(await second.store.list()).toEqual([]);
    second.setClock(Date.UTC(2030, 0));
    expect((await second.photos.unused()).count).toBe(0);
  });

  it('cut short anywhere is refused', async () => {
    const first = device();
    await filled(first);
    const archive = await packed(first);
    const second = another(first);
    for (let length = 0; length < archive.length; length += Math.ceil(archive.length / 25))
      expect(await restore(second, archive.slice(0, length))).toMatchObject({ outcome: 'damaged' });
    expect(await second.store.list()).toEqual([]);
  });

  it('that is no archive is refused', async () => {
    const text = new TextEncoder().encode(JSON.stringify(inventedSurvey()));
    expect(await restore(device(), text)).toMatchObject({ outcome: 'damaged' });
  });

  it('with rows that no device wrote is refused', async () => {
    const [second, archive] = await bent(() => undefined);
    const files = unzipSync(archive);
    const rows = JSON.parse(new TextDecoder().decode(files[rowsPath])) as { fields: { stamp: string }[] };
    rows.fields[3].stamp = 'yesterday';
    files[rowsPath] = new TextEncoder().encode(JSON.stringify(rows));
    const manifest = JSON.parse(new TextDecoder().decode(files['manifest.json'])) as {
      files: { path: string; bytes: number; sha256: string }[];
    };
    for (const file of manifest.files) {
      file.bytes = files[file.path].length;
      file.sha256 = await second.hash(files[file.path]);
    }
    files['manifest.json'] = new TextEncoder().encode(JSON.stringify(manifest));
    files['manifest.sha256'] = new TextEncoder().encode(await second.hash(files['manifest.json']));
    expect(await restore(second, zipSync(files))).toMatchObject({
      outcome: 'damaged',
      problems: [{ path: expect.stringContaining('fields[3]') as string }],
    });
  });
});

describe('pictures', () => {
  it('that no survey shows any more are counted and erased, those of deleted surveys are not', async () => {
    const at = device();
    const before = await filled(at);
    await at.photos.keep({ type: 'image/png', contents: new Uint8Array([1, 2, 3]).buffer });
    at.setClock(Date.UTC(2027, 0));
    await at.store.remove(ID);
    expect(await at.photos.unused()).toEqual({ count: 1, bytes: 3 });
    await at.photos.eraseUnused();
    expect(await at.photos.unused()).toEqual({ count: 0, bytes: 0 });
    expect(await at.photos.picture(before.photos![0].sha256)).not.toBeNull();
    await at.store.erase(ID);
    expect((await at.photos.unused()).count).toBe(1);
  });
});
