import type { Transposition } from './transposition.ts';

/** All sky light spread evenly over the dome. Ref: Liu and Jordan (1963), Solar Energy 7, 53-74. */
export const isotropic: Transposition = {
  id: 'isotropic',
  name: 'Isotropic sky',
  reference: 'Liu and Jordan (1963)',
  split(sky, parts) {
    parts.circumsolarNormal = 0;
    parts.dome = sky.dhi;
    parts.band = 0;
  },
};
