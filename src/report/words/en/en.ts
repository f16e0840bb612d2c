import { EN_FRAME } from './frame.ts';
import { EN_GLANCE } from './glance.ts';

/** English. One file for each section, so that a section's words stand together. */
export const EN = { ...EN_FRAME, ...EN_GLANCE };
