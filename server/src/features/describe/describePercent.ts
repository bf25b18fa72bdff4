import { plainNumber, show } from '../../model/quantity';
import { unitOf } from '../../quantities/parseUnit';

/** A share as `31 %`, with a true minus sign. */
export function describePercent(share: number, digits = 2): string {
  return show(plainNumber(share), { unit: unitOf('%'), digits }).replace(/^-/, '−');
}
