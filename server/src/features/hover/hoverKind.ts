import { coherentUnitText } from '../../quantities/dimension';
import { kindNamed } from '../../quantities/quantityKinds';
import { plainText } from './hoverMarkdown';

/** The dimension of a kind of quantity and the units it is usually told in. */
export function quantityKindNote(name: string): string {
  const kind = kindNamed(name);
  if (!kind) return '';
  const base = coherentUnitText(kind.dimension);
  const si = base === '1' ? 'without dimension' : base === kind.unit ? `in ${base}` : `in ${kind.unit} = ${base}`;
  const usual = kind.usual.filter((unit) => unit !== '1');
  const units = usual.length > 0 ? ` Usual units: ${usual.join(', ')}.` : '';
  return plainText(`${kind.title}, ${si}.${units}`);
}
