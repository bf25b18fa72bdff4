import type { Dimension } from './dimension';
import { dimensionless, multiplyDimensions, powerDimension } from './dimension';
import type { Prefix } from './prefixes';
import type { Ratio } from './ratio';
import { multiplyRatios, one, powerRatio, ratio, ratioToNumber } from './ratio';
import { standardAmountPerVolume, standardReference } from './standardReference';
import { superscript } from './superscript';
import type { UnitKind, UnitRow } from './units';

/** One factor of a unit as written: `cm²` in `W/cm²`. */
export interface UnitPart {
  readonly row: UnitRow;
  readonly prefix: Prefix | undefined;
  /** The exponent it counts with: −2 in `W/cm²`. */
  readonly power: number;
  /** Where the author put it. */
  readonly side: 'above' | 'below';
  readonly start: number;
  readonly end: number;
}

export interface Unit {
  /** The canonical spelling: `mbar·L/s`, `W/(m·K)`, `s⁻¹`. It reads back as the same unit. */
  readonly text: string;
  /** The number of coherent SI units in this unit; of a standard flow, at the default reference. */
  readonly factor: number;
  readonly dimension: Dimension;
  readonly kind: UnitKind;
  /** Kelvin at the zero of an offset unit. */
  readonly zero?: number;
  readonly parts: readonly UnitPart[];
  /** SI = (value · times + plus) / over, in whole numbers wherever doubles hold them, so that 5 mm is exactly 0.005 m. */
  readonly scale: { readonly times: number; readonly plus: number; readonly over: number };
  /** How often standard conditions enter: 1 for sccm, −1 for mol/sccm. */
  readonly standardPower: number;
}

export function makeUnit(parts: readonly UnitPart[]): Unit {
  const { row, power } = parts[0] ?? { row: undefined, power: 0 };
  const single = parts.length === 1 && power === 1;
  const zero = single && row?.zero !== undefined ? ratio(row.zero) : undefined;
  const standardPower = sum(parts.map((part) => (part.row.kind === 'standard-flow' ? part.power : 0)));
  const scale = scaleOf(parts, zero);
  return {
    text: unitText(parts),
    factor: (scale.times / scale.over) * standardAmountPerVolume(standardReference) ** standardPower,
    dimension: parts.reduce(
      (product, part) => multiplyDimensions(product, powerDimension(part.row.dimension, part.power)),
      dimensionless,
    ),
    kind: single && row ? row.kind : standardPower === 0 ? 'plain' : 'standard-flow',
    ...(zero ? { zero: ratioToNumber(zero) } : {}),
    parts,
    scale,
    standardPower,
  };
}

function scaleOf(parts: readonly UnitPart[], zero: Ratio | undefined): Unit['scale'] {
  if (!parts.every((part) => Number.isInteger(part.power))) {
    const factor = parts.reduce((product, part) => product * ratioToNumber(partRatio(part)) ** part.power, 1);
    return { times: factor, plus: 0, over: 1 };
  }
  const factor = parts.reduce((product, part) => multiplyRatios(product, powerRatio(partRatio(part), part.power)), one);
  if (zero) {
    // Over a common denominator: v · p/q + r/s = (v · p·s + r·q) / (q·s).
    const times = Number(factor.num * zero.den);
    const plus = Number(zero.num * factor.den);
    return { times, plus, over: Number(factor.den * zero.den) };
  }
  if (isDouble(factor.num) && isDouble(factor.den))
    return { times: Number(factor.num), plus: 0, over: Number(factor.den) };
  return { times: ratioToNumber(factor), plus: 0, over: 1 };
}

function partRatio({ row, prefix }: UnitPart): Ratio {
  return multiplyRatios(ratio(row.factor), prefix?.factor ?? one);
}

function isDouble(n: bigint): boolean {
  return Number.isFinite(Number(n)) && BigInt(Number(n)) === n;
}

function unitText(parts: readonly UnitPart[]): string {
  const above = parts.filter((part) => part.side === 'above').map((part) => partText(part, part.power));
  const below = parts.filter((part) => part.side === 'below').map((part) => partText(part, -part.power));
  const top = above.join('·') || '1';
  if (below.length === 0) return top;
  return below.length === 1 ? `${top}/${below.join('')}` : `${top}/(${below.join('·')})`;
}

function partText({ row, prefix }: UnitPart, power: number): string {
  return (prefix?.symbol ?? '') + row.symbol + superscript(power);
}

function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, n) => total + n, 0);
}
