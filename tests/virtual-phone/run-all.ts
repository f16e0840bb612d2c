import { coverageOf, errorsOf, shareWithin } from './campaign.ts';
import { DOUBLED, HEAVY_TAILED, PLANNED } from './phone-noise.ts';
import { SCENES } from './scenes.ts';
import type { SceneLight } from './true-light.ts';
import { annualAccess, sceneLight } from './true-light.ts';
import { CAREFUL, ROUTINE, SHADOW_ONLY, UNCHECKED } from './virtual-survey.ts';

/**
 * All seeded surveys of all scenes, as tables: `npx tsx tests/virtual-phone/run-all.ts [surveys] [draws] [routine,shadow…]`.
 * Without names of routines only that of the app is held against its intervals; `-` leaves the intervals out.
 */
const surveys = Number(process.argv[2] ?? 500);
const draws = Number(process.argv[3] ?? 400);
const started = process.cpuUsage();
const percent = (share: number) => (100 * share).toFixed(1).padStart(5);
const lights = SCENES.map(sceneLight);
const routines = { none: UNCHECKED, shadow: SHADOW_ONLY, routine: ROUTINE, careful: CAREFUL };
const held = (process.argv[4] ?? 'routine').split(',').filter(isRoutine);
const noises = { planned: PLANNED, doubled: DOUBLED, 'heavy-tailed': HEAVY_TAILED };

print(
  `${surveys} surveys a scene. Share of surveys within 2 percentage points of the true annual access; the error that 95 % stay under; the mean error; surveys refused. none: no check; shadow: one heading check by shadow; routine: with it the phone turned over on a mark; careful: a second check by shadow.`,
);
print(
  `${'scene'.padEnd(52)} truth | ${Object.keys(routines)
    .map((name) => `${name}: in 2, 95 %, bias, ref`.padEnd(31))
    .join('| ')}`,
);
for (const light of lights) {
  const cells = Object.values(routines).map((routine) => {
    const { sizes, bias, refused } = errorsOf(light, { name: 'errors', noise: PLANNED, routine, surveys });
    const most = sizes[Math.min(sizes.length - 1, Math.floor(0.95 * sizes.length))];
    return `${percent(shareWithin({ sizes }, 2))} % ${most.toFixed(2).padStart(6)} ${bias.toFixed(2).padStart(6)} ${String(refused).padStart(3)}`.padEnd(
      31,
    );
  });
  print(`${titleOf(light)} ${percent(annualAccess(light.map, light.profile))} | ${cells.join('| ')}`);
}

print(`\nTruth inside the 95 % interval (${draws} draws), trees and year drawn; mean width in points`);
for (const routine of held)
  for (const [name, noise] of Object.entries(noises)) {
    let [inside, count] = [0, 0];
    for (const light of lights) {
      const trial = { name: 'coverage', noise, routine: routines[routine], surveys };
      const one = coverageOf(light, trial, draws);
      inside += one.inside;
      count += one.count;
      const [below, above] = [percent(one.below / one.count), percent(one.above / one.count)];
      print(
        `${routine} ${name.padEnd(13)} ${titleOf(light)} ${percent(one.inside / one.count)} %  below ${below}  above ${above}  width ${one.meanWidth.toFixed(2)}`,
      );
    }
    print(`${routine} ${name.padEnd(13)} ${'all'.padEnd(52)} ${percent(inside / count)} %\n`);
  }
const { user, system } = process.cpuUsage(started);
print(`${((user + system) / 1e6).toFixed(0)} s of processor time`);

function isRoutine(name: string): name is keyof typeof routines {
  return name in routines;
}

function titleOf({ scene }: SceneLight): string {
  return scene.name.padEnd(52);
}

function print(line: string): void {
  process.stdout.write(`${line}\n`);
}
