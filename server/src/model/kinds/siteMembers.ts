import type { Members, Quantity } from '../values';

/** A member that is a quantity and has a value. */
export function quantityOf(members: Members, name: string): Quantity | undefined {
  const found = members.get(name);
  return found?.kind === 'figure' && found.value.kind === 'quantity' ? found.value : undefined;
}
