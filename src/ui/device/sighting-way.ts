import { signal } from '@preact/signals';
import type { SightingAxis } from '../../core/survey/survey.ts';

const KEY = 'noonmark-sighting-way';

function stored(): SightingAxis {
  try {
    return localStorage.getItem(KEY) === 'top-edge' ? 'top-edge' : 'camera';
  } catch {
    // Storage is refused: the camera stands.
    return 'camera';
  }
}

/** What things are sighted with on this device: what was chosen last. */
export const sightingWay = signal<SightingAxis>(stored());

export function chooseSightingWay(way: SightingAxis): void {
  sightingWay.value = way;
  try {
    localStorage.setItem(KEY, way);
  } catch {
    // Not kept for the next time; it holds for this one.
  }
}
