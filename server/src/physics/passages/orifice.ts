import type { Outcome } from '../outcome';
import { map, success } from '../outcome';
import type { Transmission } from './transmission';
import { transmissionSources } from './transmission';
import { tubeTransmission } from './tube';

export interface Orifice {
  /** m */
  readonly bore: number;
  readonly thickness: number;
  readonly accommodation: number;
}

/** A hole in a thin wall lets everything through; in a thick one it is a short tube. */
export function orificeTransmission({ bore, thickness, accommodation }: Orifice): Outcome<Transmission> {
  if (thickness > 0) {
    return map(tubeTransmission({ bore, length: thickness, accommodation }), (tube) => ({
      ...tube,
      method: `a hole as a short tube: ${tube.method}`,
    }));
  }
  return success({
    value: 1,
    method: 'a thin hole lets every molecule through',
    sources: transmissionSources.integralEquation,
    error: { key: 'transmission:tube', relative: 0 },
  });
}
