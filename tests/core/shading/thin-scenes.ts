import type { TracedObstruction } from '../../../src/core/horizon/traced-obstruction.ts';
import { months, obstruction, points, trace } from '../horizon/made-up-traces.ts';

/** Made-up horizons that are hard for a map in half-degree columns. */
export const THIN_SCENES: { name: string; scene: TracedObstruction[] }[] = [
  {
    name: 'a wire of 0.1°',
    scene: [
      obstruction([trace('line', points([120, 24], [245, 31]), { straight: true, angularWidth: 0.1 })]),
    ],
  },
  {
    name: 'a mast of 0.5° off the columns',
    scene: [
      obstruction([trace('line', points([171.13, 0], [171.13, 55]), { straight: true, angularWidth: 0.5 })]),
    ],
  },
  {
    name: 'an upright edge at 140.25°',
    scene: [obstruction([trace('skyline', points([140.25, 40], [175, 40]), { straight: true })])],
  },
  {
    name: 'a ridge, a crown in front of it and a hill',
    scene: [
      obstruction(
        [trace('skyline', points([125.3, 12], [150.7, 33.2], [190.1, 30], [204.9, 9]), { straight: true })],
        months(0),
        'ridge',
      ),
      obstruction(
        [trace('outline', points([180, 18], [188, 12], [201, 14], [209, 27], [197, 44], [183, 38]))],
        [0.6, 0.6, 0.5, 0.4, 0.2, 0.15, 0.15, 0.15, 0.2, 0.35, 0.5, 0.6],
        'crown',
      ),
      obstruction(
        [trace('skyline', points([60, 4], [90, 11], [160, 6], [240, 12.5], [300, 3]))],
        months(0),
        'hill',
      ),
    ],
  },
];
