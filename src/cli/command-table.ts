import type { Command } from './command.ts';
import { assess } from './commands/assess.ts';
import { check } from './commands/check.ts';
import { climate } from './commands/climate.ts';
import { declination } from './commands/declination.ts';
import { report } from './commands/report.ts';
import { selfCheck } from './commands/self-check.ts';
import { sun } from './commands/sun.ts';
import { weather } from './commands/weather.ts';

export const commands: readonly Command[] = [
  assess,
  report,
  check,
  climate,
  weather,
  sun,
  declination,
  selfCheck,
];
