import type { Verdict } from '../../model/values';
import { describePercent } from './describePercent';

/** `holds, margin 31 %`, `fails, margin −12 %`, `undecided`: in words, not in colours or marks. */
export function describeStatus({ status, margin }: Verdict): string {
  return status === 'undecided' || margin === undefined ? status : `${status}, margin ${describePercent(margin)}`;
}
