import type { Catalogue } from '../catalogue.ts';
import { ES_CAUTIONS } from './cautions.ts';
import { ES_CHANGE } from './change.ts';
import { ES_COMPARED } from './compared.ts';
import { ES_COMPASS } from './compass.ts';
import { ES_DONE } from './done.ts';
import { ES_EVIDENCE } from './evidence.ts';
import { ES_EXPECT } from './expect.ts';
import { ES_FRAME } from './frame.ts';
import { ES_GLANCE } from './glance.ts';
import { ES_MONTH_COLUMNS } from './month-columns.ts';
import { ES_PICTURE } from './picture.ts';
import { ES_SUN } from './sun.ts';
import { ES_SURE } from './sure.ts';

/** Spanish. Names are put where they need neither article nor agreement. */
export const ES: Catalogue = {
  ...ES_FRAME,
  ...ES_COMPASS,
  ...ES_PICTURE,
  ...ES_GLANCE,
  ...ES_SUN,
  ...ES_MONTH_COLUMNS,
  ...ES_DONE,
  ...ES_EXPECT,
  ...ES_CHANGE,
  ...ES_COMPARED,
  ...ES_SURE,
  ...ES_CAUTIONS,
  ...ES_EVIDENCE,
};
