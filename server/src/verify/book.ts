import { atmospherePages } from './book/atmosphere';
import { conductivityPages } from './book/conductivity';
import { diffusionPages } from './book/diffusion';
import { heatCapacityPages } from './book/heatCapacity';
import { kineticPages } from './book/kinetic';
import { meanFreePathPages } from './book/meanFreePath';
import { saturationPages } from './book/saturation';
import { virialPages } from './book/virial';
import { viscosityPages } from './book/viscosity';
import type { Page } from './row';

/** Every published value that a figure of a gas is compared with, here and in the tests. */
export const book: readonly Page[] = [
  ...viscosityPages,
  ...conductivityPages,
  ...diffusionPages,
  ...heatCapacityPages,
  ...saturationPages,
  ...virialPages,
  ...kineticPages,
  ...meanFreePathPages,
  ...atmospherePages,
];
