import assert from 'node:assert/strict';
import { writeFileSync } from 'node:fs';
import type { ChebyshevTable } from '../../server/src/physics/numerics/chebyshevTable';
import { gridOf, lookUp } from '../../server/src/physics/numerics/chebyshevTable';
import type { TableMaker } from '../../server/src/physics/passages/makeTables';
import { makeTable, tableMakers } from '../../server/src/physics/passages/makeTables';
import { annulusTable } from '../../server/src/physics/tables/annulusTable';
import { bendTable } from '../../server/src/physics/tables/bendTable';
import { coneTable } from '../../server/src/physics/tables/coneTable';
import { ductTable } from '../../server/src/physics/tables/ductTable';
import { mitreTable } from '../../server/src/physics/tables/mitreTable';
import { slitTable } from '../../server/src/physics/tables/slitTable';
import { tubeTable } from '../../server/src/physics/tables/tubeTable';

const tables: Readonly<Record<string, ChebyshevTable>> = {
  annulusTable,
  bendTable,
  coneTable,
  ductTable,
  mitreTable,
  slitTable,
  tubeTable,
};

/** UPDATE=1 makes the tables anew, or with ONLY=tubeTable one of them; it takes about half an hour. */
if (process.env['UPDATE'] === '1') {
  for (const maker of tableMakers) if ((process.env['ONLY'] ?? maker.name) === maker.name) write(maker);
}

describe('the tables of passages', () => {
  for (const maker of tableMakers) {
    const table = tables[maker.name];

    it(`${maker.name} has the shape of its maker`, () => {
      assert.deepEqual(table?.axes, maker.axes);
      assert.equal(table.values.length, gridOf(maker.axes).length);
    });

    it(`${maker.name} comes out again`, () => {
      const grid = gridOf(maker.axes);
      for (const index of someOf(grid.length, CHECKED[maker.name] ?? 5)) {
        const again = Number(maker.entry(...(grid[index] ?? [])).toPrecision(maker.digits));
        const kept = table?.values[index] ?? NaN;
        // Libraries of elementary functions differ in the last bits, which moves a sampled path or a rounded digit.
        const tolerance = maker.digits < 5 ? 0.01 : 2e-6;
        assert.ok(Math.abs(again - kept) <= tolerance, `entry ${index}: ${again}, kept as ${kept}`);
      }
    }).timeout(120_000);
  }

  /** The exact integral equations once more where the tables have no entry; the errors stated in passages/*.ts must cover it. */
  const stated: Readonly<Record<string, number>> = {
    tubeTable: 3e-4,
    slitTable: 3e-4,
    annulusTable: 1e-4,
    ductTable: 2e-4,
    coneTable: 3e-4,
  };
  for (const maker of tableMakers.filter(({ name }) => name in stated)) {
    it(`${maker.name} interpolates within its stated error`, () => {
      for (const [a, b] of BETWEEN) {
        const point = maker.axes.map(({ low, high }, i) => low + (high - low) * (i === 0 ? a : b));
        const exact = maker.entry(...point);
        const found = lookUp(tables[maker.name] ?? { axes: [], values: [] }, ...point);
        assert.ok(
          Math.abs(found / exact - 1) < (stated[maker.name] ?? 0),
          `${point.join(', ')}: ${found}, not ${exact}`,
        );
      }
    }).timeout(120_000);
  }
});

/** Where between the ends of the two axes. */
const BETWEEN = [
  [0.05, 0.97],
  [0.13, 0.61],
  [0.27, 0.33],
  [0.41, 0.88],
  [0.62, 0.13],
  [0.83, 0.47],
] as const;

/** How many entries are made again; sampled ones take seconds each. */
const CHECKED: Readonly<Record<string, number>> = { bendTable: 1, mitreTable: 1, ductTable: 2 };

/** Indices spread over the table, the same every time. */
function someOf(length: number, count: number): readonly number[] {
  return Array.from({ length: count }, (_, i) => Math.floor(((i + 0.5) * length) / count));
}

function write(maker: TableMaker): void {
  const { axes, values } = makeTable(maker);
  const type = `import type { ChebyshevTable } from '../numerics/chebyshevTable';`;
  const note =
    '/** Made by passages/makeTables.ts; `UPDATE=1` with test/physics/passageTables.test.ts makes it anew. */';
  const rows = axes.map(({ low, high, count }) => `    { low: ${low}, high: ${high}, count: ${count} },`).join('\n');
  const lines = inLines(values.map(String), 110);
  writeFileSync(
    `server/src/physics/tables/${maker.name}.ts`,
    `${type}\n\n${note}\nexport const ${maker.name}: ChebyshevTable = {\n  axes: [\n${rows}\n  ],\n  // prettier-ignore\n  values: [\n${lines}\n  ],\n};\n`,
  );
}

function inLines(words: readonly string[], width: number): string {
  const lines: string[] = [];
  for (const word of words) {
    const last = lines.at(-1);
    if (last !== undefined && last.length + word.length + 2 <= width) lines[lines.length - 1] = `${last} ${word},`;
    else lines.push(`    ${word},`);
  }
  return lines.join('\n');
}
