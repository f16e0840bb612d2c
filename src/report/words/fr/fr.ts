import type { Catalogue } from '../catalogue.ts';
import { FR_CAUTIONS } from './cautions.ts';
import { FR_CHANGE } from './change.ts';
import { FR_COMPARED } from './compared.ts';
import { FR_COMPASS } from './compass.ts';
import { FR_DONE } from './done.ts';
import { FR_EVIDENCE } from './evidence.ts';
import { FR_EXPECT } from './expect.ts';
import { FR_FRAME } from './frame.ts';
import { FR_GLANCE } from './glance.ts';
import { FR_MONTH_COLUMNS } from './month-columns.ts';
import { FR_PICTURE } from './picture.ts';
import { FR_SUN } from './sun.ts';
import { FR_SURE } from './sure.ts';

/** French. Names stand beside a colon, in brackets or in quotation marks, so that nothing elides before them. */
export const FR: Catalogue = {
  ...FR_FRAME,
  ...FR_COMPASS,
  ...FR_PICTURE,
  ...FR_GLANCE,
  ...FR_SUN,
  ...FR_MONTH_COLUMNS,
  ...FR_DONE,
  ...FR_EXPECT,
  ...FR_CHANGE,
  ...FR_COMPARED,
  ...FR_SURE,
  ...FR_CAUTIONS,
  ...FR_EVIDENCE,
};
