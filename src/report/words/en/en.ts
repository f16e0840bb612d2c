import { EN_COMPARED } from './compared.ts';
import { EN_COMPASS } from './compass.ts';
import { EN_EVIDENCE } from './evidence.ts';
import { EN_FRAME } from './frame.ts';
import { EN_GLANCE } from './glance.ts';

/** English. One file for each section, so that a section's words stand together. */
export const EN = { ...EN_FRAME, ...EN_COMPASS, ...EN_GLANCE, ...EN_COMPARED, ...EN_EVIDENCE };
