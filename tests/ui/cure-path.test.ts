import { describe, expect, it } from 'vitest';
import type { Cure, OpenPointKindId } from '../../src/core/completeness/open-point.ts';
import type { CureId } from '../../src/core/uncertainty/interval-source.ts';
import { placeOf } from '../../src/ui/routes.ts';
import { curePath } from '../../src/ui/screens/climb-down/cure-path.ts';

const path = (kind: OpenPointKindId, cure: Cure, shrunkBy?: CureId) =>
  curePath('my survey', { kind, cure, shrunkBy });
const RUN: Cure = { at: 'run', run: 'r', station: 'A', words: 'There' };
const SIGHT: Cure = { at: 'station', station: 'A', act: 'sight', words: 'There' };

describe('the way to a cure', () => {
  it.each<[OpenPointKindId, Cure, string]>([
    ['no-heading-check', RUN, '/stations/at/A/capture/check'],
    ['disturbed-compass', RUN, '/stations/at/A/capture/check'],
    ['undirected-sightings', RUN, '/stations/at/A/capture/check'],
    ['doubtful-check', SIGHT, '/stations/at/A/capture/check'],
    ['no-closure', RUN, '/stations/at/A/capture/mark'],
    ['large-closure', RUN, '/stations/at/A/capture'],
    ['unseen-sky', SIGHT, '/stations/at/A/capture'],
    ['station-without-place', { ...SIGHT, act: 'edit' }, '/stations/at/A/edit'],
    ['broken-trace', { ...SIGHT, act: 'book' }, '/stations/at/A'],
    ['plane-without-station', { at: 'new-station', plane: 'shed', words: 'There' }, '/stations/new/shed'],
    ['no-plane', { at: 'roof', words: 'There' }, '/roof'],
    ['wide-interval', { at: 'site', words: 'There' }, ''],
  ])('of %s is a screen of its own', (kind, cure, end) => {
    const to = path(kind, cure);
    expect(to).toBe(`/survey/my%20survey${end}`);
    expect(placeOf(to)).toMatchObject({ screen: 'survey', id: 'my survey' });
  });

  it('of what makes an interval wide is what shrinks it', () => {
    const start = (shrunkBy: CureId) => path('wide-interval', SIGHT, shrunkBy).split('/').at(-1);
    expect(start('two-face-check')).toBe('faces');
    expect(start('second-heading-check')).toBe('check');
    expect(start('known-bearing')).toBe('check');
    expect(start('more-sightings')).toBe('capture');
  });
});
