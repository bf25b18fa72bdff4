/** The flow regimes in order of rising Knudsen number. */
export const regimes = ['viscous', 'slip', 'transitional', 'molecular'] as const;
export type Regime = (typeof regimes)[number];

/** The Knudsen numbers from which on each regime but the first holds. Authors differ, so a file may assume its own. */
export type RegimeLimits = Readonly<{ [regime in Exclude<Regime, 'viscous'>]: number }>;

export function regimeOf(knudsen: number, { slip, transitional, molecular }: RegimeLimits): Regime {
  if (knudsen < slip) return 'viscous';
  if (knudsen < transitional) return 'slip';
  return knudsen < molecular ? 'transitional' : 'molecular';
}

/** The regimes that a Knudsen number with its half-width reaches. */
export function regimesWithin(knudsen: number, halfWidth: number, limits: RegimeLimits): readonly Regime[] {
  const first = regimes.indexOf(regimeOf(knudsen - halfWidth, limits));
  const last = regimes.indexOf(regimeOf(knudsen + halfWidth, limits));
  return regimes.slice(first, last + 1);
}

/** Set otherwise by `assume regime_limits = [slip: 0.01, transitional: 0.1, molecular: 10]`. */
export const standardRegimeLimits: RegimeLimits = { slip: 0.01, transitional: 0.1, molecular: 10 };
