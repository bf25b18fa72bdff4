import { dimensionless } from '../../quantities/dimension';
import type { QuantityKind } from '../../quantities/quantityKinds';

/** Kinds of quantity with the plain numbers last: a length is meant more often than a share. */
export function measuredFirst(kinds: readonly QuantityKind[]): readonly QuantityKind[] {
  const plain = ({ dimension }: QuantityKind) => dimension === dimensionless;
  return [...kinds.filter((kind) => !plain(kind)), ...kinds.filter(plain)];
}
