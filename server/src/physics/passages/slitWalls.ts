import type { StraightWalls } from './straightPassage';
import { partlySpecular } from './partlySpecular';

/** The two plates of a wide slit with the accommodation α, together; lengths in heights. */
export function slitWalls(accommodation = 1): StraightWalls {
  return { strips: 1, exchange: partlySpecular((z) => (1 + z * z) ** -1.5, accommodation) };
}
