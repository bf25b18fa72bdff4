/**
 * What two rings of wall exchange when the walls reflect a share α of the molecules diffusely and the rest like a mirror
 * (Maxwell). Along the axis of a tube, or between two plates, every flight between mirror reflections goes equally far, so that
 * the n-th wall it meets lies n times as far as the first. A molecule counts where it is next reflected diffusely.
 */
export function partlySpecular(diffuse: (z: number) => number, accommodation: number): (z: number) => [number] {
  if (accommodation === 1) return (z) => [diffuse(z)];
  return (z) => [meanOverFlights(accommodation, (flights) => diffuse(z / flights) / (flights * flights))];
}

/**
 * Σ α² n (1 − α)^(n−1) f(n): the mean over the number n of flights from one diffuse reflection to the next, counted by the
 * molecules that cross a section, of which there are n times as many.
 */
export function meanOverFlights(accommodation: number, f: (flights: number) => number): number {
  let sum = 0;
  let share = accommodation * accommodation;
  for (let n = 1; share * n > NEGLIGIBLE; n++, share *= 1 - accommodation) sum += share * n * f(n);
  return sum;
}

const NEGLIGIBLE = 1e-13;
