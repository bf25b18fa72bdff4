import type { Outcome } from '../outcome';
import { success } from '../outcome';
import type { Transmission } from './transmission';
import { transmissionSources } from './transmission';

export interface Plug {
  /** m */
  readonly thickness: number;
  readonly pore: number;
  /** Viscous, m². */
  readonly permeability: number;
}

/**
 * A porous plug as a bundle of long capillaries of the pore’s diameter d, of which the viscous permeability B = (ε/τ) d²/32 fixes
 * how many there are and how they wind. The Knudsen diffusivity (ε/τ) d c̄/3 then gives, per area of the whole face,
 * W = 128 B/(3 d L).
 */
export function plugTransmission({ thickness, pore, permeability }: Plug): Outcome<Transmission> {
  return success({
    // In series with its own face, so that a very thin plug lets no more through than its openings.
    value: 1 / (1 / openShare({ pore, permeability }) + (3 * pore * thickness) / (128 * permeability)),
    method: 'a bundle of capillaries of the pore’s diameter that has the given permeability',
    sources: transmissionSources.plug,
    error: { key: 'transmission:plug', relative: 0.3 },
  });
}

/** ε/τ, the share of straight open pores that would conduct alike. */
export function openShare({ pore, permeability }: Pick<Plug, 'pore' | 'permeability'>): number {
  return (32 * permeability) / (pore * pore);
}
