import { fc, test } from '@fast-check/vitest';
import { describe, expect } from 'vitest';
import { isStanding } from '../../../src/core/sync-protocol/reading-state.ts';
import { MOST_VERSIONS, lostVersions, versionsOf } from '../../../src/core/sync-protocol/field-versions.ts';
import { stateIn } from '../../../src/core/sync-protocol/changes-since.ts';
import type { FieldRow, ReadingRow } from '../../../src/core/sync-protocol/rows.ts';
import { SURVEY, World, nameIn, type Device } from './five-devices.ts';

// The long run: SYNC_STEPS=10000 npx vitest run --project unit tests/core/sync-protocol
const STEPS = Number(process.env.SYNC_STEPS ?? 300);
const HOUR = 3_600_000;

// Enough of them that the bound on a field's versions is seldom reached.
const PATHS = Array.from({ length: Math.ceil(STEPS / 50) }, (_, i) => `planes/p${i}/surfaceTilt`);

/** Chance that a seed gives again: mulberry32, a public-domain generator. */
function chanceFrom(seed: number): (below: number) => number {
  let state = seed;
  return (below) => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return Math.floor((((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32) * below);
  };
}

/** The world after steps, each some minutes after the last. */
function lived(seed: number, setsClocks: boolean): World {
  const chance = chanceFrom(seed);
  const clockError = () => [0, 26, -26, 1.5, 0][chance(5)] * HOUR + chance(5000);
  const world = new World(Array.from({ length: 5 }, clockError));
  const { devices, letters } = world;
  for (let step = 0; step < STEPS; step++) {
    world.trueMs += 120_000 + chance(120_000);
    const device = devices[chance(5)];
    const act = chance(24);
    if (act < 6) edit(world, device, `${device.id}-${step}`, chance);
    else if (act < 8) read(world, device, step, chance);
    else if (act < 12) world.contact(device);
    else if (act === 12 && setsClocks) device.clockErrorMs = (chance(53) - 26) * HOUR + chance(5000);
    else if (letters.length > 0 && act === 13) letters.splice(chance(letters.length), 1);
    else if (letters.length > 0) world.deliver(chance(letters.length), act === 14);
  }
  world.settle();
  world.settle();
  return world;
}

type Chance = ReturnType<typeof chanceFrom>;

function edit(world: World, device: Device, value: string, chance: Chance): void {
  world.write(device, [{ path: PATHS[chance(PATHS.length)], value: chance(6) === 0 ? undefined : value }]);
}

/** Takes a raw reading, or one out, or puts one back. */
function read(world: World, device: Device, step: number, chance: Chance): void {
  const known = [...world.stateOn(device).values()].filter((row) => row.kind === 'reading');
  const row = known[chance(known.length * 3)];
  if (!row) world.write(device, [{ path: `readings/r${step}`, value: { alpha: step } }]);
  else world.write(device, [{ path: row.key, value: isStanding(row) ? undefined : row.reading }]);
}

function expectEqualEverywhere(world: World): void {
  const office = stateIn(world.server, SURVEY);
  for (const one of world.devices) expect(world.stateOn(one)).toEqual(office);
}

/** Everything written whose value nobody saw and wrote over is the value that counts, or shown as replaced. */
function expectNothingLost(world: World, isTimeTrue: boolean): void {
  const office = stateIn(world.server, SURVEY);
  for (const [key, alpha] of world.readings)
    expect((office.get(`reading ${key}`) as ReadingRow).reading).toEqual({ alpha });
  const seen = new Set([...world.writes.values()].map(({ saw }) => saw));
  for (const path of PATHS) {
    const unseen = [...world.writes].filter(([name, write]) => write.path === path && !seen.has(name));
    if (unseen.length === 0) continue;
    const row = office.get(`field ${path}`) as FieldRow;
    const counts = unseen.find(([name]) => name === nameIn(row));
    expect(counts, 'the value that counts was never written over').toBeDefined();
    const shown = [row.value, ...lostVersions(row).map(({ value }) => value)];
    const values = unseen.map(([, { value }]) => value).filter((value) => value !== undefined);
    if (versionsOf(row).length < MOST_VERSIONS) expect(shown).toEqual(expect.arrayContaining(values));
    if (isTimeTrue)
      for (const [, { trueMs }] of unseen) expect(counts![1].trueMs).toBeGreaterThanOrEqual(trueMs);
  }
}

const seed = fc.integer();
const options = { numRuns: STEPS > 1000 ? 1 : 25, endOnFailure: true };
const timeoutMs = STEPS > 1000 ? 1_800_000 : 60_000;

describe('five devices with bad signal, after it came back', () => {
  test.prop([seed], options)(
    'are equal, nothing is lost, and the later wins in true time whatever their clocks show',
    (from) => {
      const world = lived(from, false);
      expectEqualEverywhere(world);
      expectNothingLost(world, true);
    },
    timeoutMs,
  );

  test.prop([seed], options)(
    'are equal and nothing is lost while clocks are set and set',
    (from) => {
      const world = lived(from, true);
      expectEqualEverywhere(world);
      expectNothingLost(world, false);
    },
    timeoutMs,
  );
});
