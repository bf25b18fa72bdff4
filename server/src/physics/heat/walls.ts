/** What the gas is between, in metres. */
export type HeatWalls =
  | { readonly kind: 'plates'; readonly spacing: number; readonly area: number }
  /** Radii. */
  | {
      readonly kind: 'cylinders';
      readonly inner: number;
      readonly outer: number;
      readonly length: number;
      readonly hot: 'inner' | 'outer';
    };

/** What of the walls the conduction of heat depends on. */
export interface HeatPath {
  /** Resistance of the gas times its conductivity, on the area where the flux counts, m. */
  readonly length: number;
  /** Where the flux counts: one plate, or the inner wall, m². */
  readonly area: number;
  /** Of the radii. */
  readonly logarithm: number;
  /** The area where the flux counts over the area of the wall. */
  readonly hotShare: number;
  readonly coldShare: number;
  /** The length that the Knudsen number is taken on, m. */
  readonly characteristic: number;
}

export function heatPath(walls: HeatWalls): HeatPath {
  if (walls.kind === 'plates') {
    const { spacing, area } = walls;
    return { length: spacing, area, logarithm: 0, hotShare: 1, coldShare: 1, characteristic: spacing };
  }
  const { inner, outer, length, hot } = walls;
  // Of radii nearly alike the logarithm itself would lose its digits.
  const logarithm = Math.log1p((outer - inner) / inner);
  const share = inner / outer;
  return {
    length: inner * logarithm,
    area: 2 * Math.PI * inner * length,
    logarithm,
    hotShare: hot === 'inner' ? 1 : share,
    coldShare: hot === 'inner' ? share : 1,
    characteristic: outer - inner,
  };
}
