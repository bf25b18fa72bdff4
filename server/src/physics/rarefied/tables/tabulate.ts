import type { Section } from '../kineticSolution';
import { solveKinetic } from '../kineticSolution';
import type { KineticTable } from './kineticTable';
import { accommodationRoots, rarefactionAt, rarefactionGrid, viscousPart } from './kineticTable';

/** The whole table of a section, to seven decimals. */
export function tabulate(section: Section): KineticTable {
  const entries = accommodationRoots.map((_, row) =>
    Array.from({ length: rarefactionGrid.count }, (__, column) => tableEntry(section, row, column)),
  );
  return {
    slip: entries.map((row) => row.map(({ slip }) => rounded(slip))),
    creep: entries.map((row) => row.map(({ creep }) => rounded(creep))),
  };
}

/** One entry of the table, solved afresh. */
export function tableEntry(section: Section, row: number, column: number): { slip: number; creep: number } {
  const rarefaction = rarefactionAt(column);
  const accommodation = (accommodationRoots[row] ?? NaN) ** 4;
  const order = orderFor(section, rarefaction);
  const solution = solveKinetic({ section, model: 'shakhov', rarefaction, accommodation, order });
  const beyond = solution.poiseuille - viscousPart(section, rarefaction);
  const mirrored = (2 - accommodation) / accommodation;
  return { slip: beyond / mirrored, creep: Math.log(solution.thermalCreep / mirrored) };
}

/** The rarer the gas, the smoother its profiles. */
function orderFor(section: Section, delta: number): number {
  if (delta < 1) return 12;
  if (delta < 15) return 18;
  return section === 'tube' ? 32 : 48;
}

function rounded(value: number): number {
  return Number(value.toFixed(7));
}
