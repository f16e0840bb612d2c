import type { Catalogue } from '../catalogue.ts';
import { DE_CAUTIONS } from './cautions.ts';
import { DE_CHANGE } from './change.ts';
import { DE_COMPARED } from './compared.ts';
import { DE_COMPASS } from './compass.ts';
import { DE_DONE } from './done.ts';
import { DE_EVIDENCE } from './evidence.ts';
import { DE_EXPECT } from './expect.ts';
import { DE_FRAME } from './frame.ts';
import { DE_GLANCE } from './glance.ts';
import { DE_MONTH_COLUMNS } from './month-columns.ts';
import { DE_PICTURE } from './picture.ts';
import { DE_SUN } from './sun.ts';
import { DE_SURE } from './sure.ts';

/** German. Names are put where no case is asked of them: beside a colon, in brackets, in quotation marks. */
export const DE: Catalogue = {
  ...DE_FRAME,
  ...DE_COMPASS,
  ...DE_PICTURE,
  ...DE_GLANCE,
  ...DE_SUN,
  ...DE_MONTH_COLUMNS,
  ...DE_DONE,
  ...DE_EXPECT,
  ...DE_CHANGE,
  ...DE_COMPARED,
  ...DE_SURE,
  ...DE_CAUTIONS,
  ...DE_EVIDENCE,
};
