import { EN_CAUTIONS } from './cautions.ts';
import { EN_CHANGE } from './change.ts';
import { EN_COMPARED } from './compared.ts';
import { EN_COMPASS } from './compass.ts';
import { EN_DONE } from './done.ts';
import { EN_EVIDENCE } from './evidence.ts';
import { EN_EXPECT } from './expect.ts';
import { EN_FRAME } from './frame.ts';
import { EN_GLANCE } from './glance.ts';
import { EN_MONTH_COLUMNS } from './month-columns.ts';
import { EN_PICTURE } from './picture.ts';
import { EN_SUN } from './sun.ts';
import { EN_SURE } from './sure.ts';

/** English. One file for each section, so that a section's words stand together. */
export const EN = {
  ...EN_FRAME,
  ...EN_COMPASS,
  ...EN_PICTURE,
  ...EN_GLANCE,
  ...EN_SUN,
  ...EN_MONTH_COLUMNS,
  ...EN_DONE,
  ...EN_EXPECT,
  ...EN_CHANGE,
  ...EN_COMPARED,
  ...EN_SURE,
  ...EN_CAUTIONS,
  ...EN_EVIDENCE,
};
