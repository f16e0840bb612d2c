import { describe, expect, it } from 'vitest';
import { changedProfile } from '../../../src/core/shading/what-if.ts';
import { solarPosition } from '../../../src/core/solar-position/solar-position.ts';
import { readoutAt } from '../../../src/ui/screens/shade/readout.ts';
import { sampleShade } from '../../report/sample-shades.ts';

const { survey, shade } = await sampleShade('suburban-maple-and-gable.json');
const names = new Map(survey.obstructions.map(({ id, name }) => [id, name]));
const context = { site: survey.site, shade, names, year: 2026 };
const { latitude, longitude, altitude } = survey.site;

describe('the read-out of a direction', () => {
  it('names the day and the clock time at which the sun stands there', () => {
    // The clocks of this site stand an hour ahead of standard time in June; half past nine there is 13:30 UTC.
    const sun = solarPosition(Date.UTC(2026, 4, 5, 13, 30), latitude, longitude, altitude);
    const { when, direction } = readoutAt(
      { azimuth: sun.solarAzimuth, elevation: sun.apparentElevation },
      context,
    );
    expect(survey.site.timeZone).toBe('America/New_York');
    expect(when).toMatch(/5 May at 9:(29|30|31)\b/);
    expect(when).toContain('August');
    expect(when).toContain('clock time');
    expect(direction).toMatch(/^East|^South-east/);
  });

  it('says where the sun never stands, and that no direct light comes from there', () => {
    const readout = readoutAt({ azimuth: 0, elevation: 60 }, context);
    expect(readout.when).toBe('The sun never stands there.');
    expect(readout.light).toBe('No direct light comes from around there.');
  });

  it('names what is in the way and how much passes in those months', () => {
    const place = shade.profile.obstructionIds.indexOf('maple');
    const slice = shade.profile.sliceColumn.findIndex(
      (_, i) => shade.profile.intervalObstruction[shade.profile.intervalFirst[i]] === place,
    );
    const azimuth = shade.profile.sliceFrom[slice + 20];
    const { inTheWay } = readoutAt({ azimuth, elevation: 15 }, context);
    expect(inTheWay).toContain(names.get('maple'));
    expect(inTheWay).toMatch(/lets (through )?\d+\s%/);
    const imaginedProfile = changedProfile(shade.profile, [{ obstruction: 'maple', kind: 'gone' }]);
    const imagined = { ...context, shade: { ...shade, imaginedProfile } };
    expect(inTheWay).not.toContain('imagined');
    expect(readoutAt({ azimuth, elevation: 15 }, imagined).inTheWay).toContain('imagined away');
  });

  it('tells open sky from sky that nobody looked at', () => {
    const open = readoutAt(
      { azimuth: 180, elevation: 85 },
      { ...context, shade: { ...shade, observed: [[0, 360]] } },
    );
    expect(open.inTheWay).toBe('Nothing is in the way.');
    const unseen = readoutAt(
      { azimuth: 180, elevation: 85 },
      { ...context, shade: { ...shade, observed: [] } },
    );
    expect(unseen.inTheWay).toContain('Nobody looked there');
  });

  it('gives shares of light that add up to the direct light of the year', () => {
    let sum = 0;
    for (let azimuth = 5; azimuth < 360; azimuth += 10)
      for (let elevation = 5; elevation < 90; elevation += 10) {
        const found = /come ([\d.]+) kWh/.exec(readoutAt({ azimuth, elevation }, context).light);
        sum += found ? Number(found[1]) : 0;
      }
    const direct = shade.density.irradiation.reduce((total, light) => total + light, 0);
    expect(Math.abs(sum / direct - 1)).toBeLessThan(0.02);
  });
});
