import { readFileSync } from 'node:fs';
import { decodeWorldGrid } from '../../../src/core/irradiance/world-grid.ts';

const file = readFileSync(new URL('../../../public/world-climate.bin', import.meta.url));

/** The world climate that ships with the app. */
export const worldBytes: ArrayBuffer = new Uint8Array(file).buffer;

const decoded = decodeWorldGrid(worldBytes);
if (!decoded.ok) throw new Error(decoded.problems[0].message);
export const worldGrid = decoded.value;
