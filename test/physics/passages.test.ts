import assert from 'node:assert/strict';
import type { Outcome } from '../../server/src/physics/outcome';
import { annulusTransmission } from '../../server/src/physics/passages/annulus';
import { bendTransmission } from '../../server/src/physics/passages/bend';
import { sampleBend } from '../../server/src/physics/passages/bendSampling';
import { inParallel, inSeries } from '../../server/src/physics/passages/composite';
import { coneTransmission } from '../../server/src/physics/passages/cone';
import { ductTransmission } from '../../server/src/physics/passages/duct';
import { orificeTransmission } from '../../server/src/physics/passages/orifice';
import { plugTransmission } from '../../server/src/physics/passages/plug';
import { slitTransmission } from '../../server/src/physics/passages/slit';
import type { Transmission } from '../../server/src/physics/passages/transmission';
import { tubeTransmission } from '../../server/src/physics/passages/tube';
import type { ReferenceRow } from '../support/reference';
import { references } from '../support/reference';
import {
  annulus as sampledAnnulus,
  cone as sampledCone,
  duct as sampledDuct,
  sampledChance,
} from '../support/wallSampling';

const diffuse = { accommodation: 1 };
const tube = (l: number, accommodation = 1) => valueOf(tubeTransmission({ bore: 2, length: l, accommodation }));
const slit = (l: number, accommodation = 1) => valueOf(slitTransmission({ height: 1, length: l, accommodation }));
const duct = (width: number, l: number) => valueOf(ductTransmission({ width, height: 1, length: l, ...diffuse }));
const annulus = (inner: number, outer: number, length: number) =>
  valueOf(annulusTransmission({ inner, outer, length, ...diffuse }));
const cone = (inletBore: number, outletBore: number, length: number) =>
  valueOf(coneTransmission({ inletBore, outletBore, length, ...diffuse }));

const bounds = {
  tolerance: 2e-5,
  because: 'the source averages an upper and a lower bound, which part in long tubes; ours is converged to 1e-6',
};

references('the transmission of a tube', [
  ...rows('Clausing 1932', 'table of W over L/r; from memory', tube, {
    ...{ 0.1: '0.9524', 0.2: '0.9092', 0.3: '0.8699', 0.4: '0.8341', 0.5: '0.8013' },
    ...{ 0.6: '0.7711', 0.7: '0.7434', 0.9: '0.6940', 1: '0.6720' },
  }),
  ...rows(
    'Cole 1977',
    'table of W over L/r; from memory',
    tube,
    {
      ...{ 0.1: '0.952399', 0.5: '0.801271', 1: '0.671984', 2: '0.514231', 5: '0.310525', 10: '0.190941' },
      ...{ 20: '0.109304', 1000: '0.002646' },
    },
    bounds,
  ),
]);

references(
  'the transmission of a slit',
  rows('Clausing 1932', 'table of W over L/h; from memory', slit, { 0.1: '0.9525', 0.2: '0.9096', 0.4: '0.8362' }),
);

/** W = (16/3) K A/(P L) of long passages with the area A and the rim P of the section, for K = 1 the formula of Knudsen. */
const shapeFactor = {
  tolerance: 0.013,
  because: 'the source rounds shape factors from graphical integration, within 1 %',
};

references('long ducts and annuli', [
  ...rows(
    'Dushman 1962',
    'Scientific Foundations of Vacuum Technique, table of K over the ratio of the sides; from memory',
    (width) => (duct(width, 1e6) * 1e6 * 3 * 2 * (width + 1)) / (16 * width),
    { 1: '1.108', 1.5: '1.126', 2: '1.151', 3: '1.198', 5: '1.297', 8: '1.400', 10: '1.444' },
    shapeFactor,
  ),
  ...rows(
    'Dushman 1962',
    'table of K over the ratio of the diameters; from memory',
    (k) => (annulus(k, 1, 1e6) * 1e6 * 3) / (8 * ((1 - k) / 2)),
    { 0.259: '1.072', 0.5: '1.154', 0.707: '1.254', 0.866: '1.430', 0.966: '1.675' },
    shapeFactor,
  ),
]);

describe('passages against molecules that are followed', () => {
  const MOLECULES = 200_000;
  const cases: readonly (readonly [string, () => number, () => number])[] = [
    ['a tube', () => tube(6), () => sampledChance(sampledCone(1, 1, 6), MOLECULES)],
    ['a partly specular tube', () => tube(8, 0.3), () => sampledChance(sampledCone(1, 1, 8), MOLECULES, 0.3)],
    ['a partly specular slit', () => slit(5, 0.5), () => sampledChance(sampledDuct(1e6, 1, 5), MOLECULES, 0.5)],
    ['a widening cone', () => cone(2, 4, 3), () => sampledChance(sampledCone(1, 2, 3), MOLECULES)],
    ['a narrowing cone', () => cone(6, 2, 5), () => sampledChance(sampledCone(3, 1, 5), MOLECULES)],
    ['a wide annulus', () => annulus(3, 10, 20), () => sampledChance(sampledAnnulus(1.5, 5, 20), MOLECULES)],
    ['a narrow annulus', () => annulus(8, 10, 10), () => sampledChance(sampledAnnulus(4, 5, 10), MOLECULES)],
    ['a square duct', () => duct(1, 3), () => sampledChance(sampledDuct(1, 1, 3), MOLECULES)],
    ['a flat duct', () => duct(5, 10), () => sampledChance(sampledDuct(5, 1, 10), MOLECULES)],
  ];
  for (const [name, ours, sampled] of cases) {
    it(name, () => {
      const chance = ours();
      const deviation = Math.sqrt((chance * (1 - chance)) / MOLECULES);
      const found = sampled();
      assert.ok(Math.abs(found - chance) < 3 * deviation, `${chance}, but ${found} ± ${deviation} were followed`);
    }).timeout(60_000);
  }
});

describe('limits and seams of passages', () => {
  it('let everything through an opening, and 4d/3L through a long tube', () => {
    assert.equal(tube(0), 1);
    assert.ok(Math.abs(tube(1e-5) - (1 - 1e-5 / 2)) < 1e-8);
    assert.ok(Math.abs((tube(2e6) * 3 * 2e6) / 8 - 1) < 2e-5);
    assert.equal(valueOf(orificeTransmission({ bore: 1, thickness: 0, ...diffuse })), 1);
    assert.equal(valueOf(orificeTransmission({ bore: 2, thickness: 1, ...diffuse })), tube(1));
  });

  it('fall as the passage gets longer', () => {
    const chances = [
      tube,
      slit,
      (l: number) => duct(3, l),
      (l: number) => annulus(1, 3, l),
      (l: number) => cone(2, 3, l),
    ];
    for (const chance of chances) {
      let before = 1;
      // Nearer to an opening the steps are smaller than the error of the tables.
      for (let l = 0.1; l < 3e4; l *= 1.3) {
        const now = chance(l);
        assert.ok(now > 0 && now < before, `${now} at ${l} after ${before}`);
        before = now;
      }
    }
  });

  it('rise as the walls get smoother, by (2 − α)/α when long', () => {
    for (const chance of [tube, slit]) {
      const rising = [1, 0.8, 0.5, 0.2, 0.05, 0].map((accommodation) => chance(10, accommodation));
      assert.deepEqual([...rising].sort(), rising);
    }
    for (const alpha of [0.9, 0.5, 0.2]) {
      assert.ok(Math.abs((tube(1e6, alpha) / tube(1e6) / (2 - alpha)) * alpha - 1) < 1e-3);
    }
  });

  it('of a cone are those of a tube when it hardly widens, and the same from both ends by area', () => {
    for (const l of [0.1, 1, 10, 100, 1000]) {
      assert.ok(Math.abs(cone(2, 2.0001, l) / tube(l) - 1) < 5e-4);
      assert.ok(Math.abs((cone(2, 6, l) * 4) / (cone(6, 2, l) * 36) - 1) < 1e-12);
    }
  });

  it('of a flat duct and of a narrow annulus are those of a slit, of an annulus round a thin wire those of a tube', () => {
    for (const l of [0.3, 3, 30]) {
      assert.ok(Math.abs(duct(1000, l) / slit(l) - 1) < 5e-3);
      assert.ok(Math.abs(annulus(998, 1000, l) / slit(l) - 1) < 1e-2);
      assert.ok(Math.abs(annulus(1e-3, 2, l) / tube(l) - 1) < 2e-3);
    }
  });

  it('are the same for a duct on its side', () => {
    const upright = valueOf(ductTransmission({ width: 1, height: 3, length: 2, ...diffuse }));
    assert.equal(upright, duct(3, 2));
  });

  it('have no value where nothing is known of partly specular walls, and say so', () => {
    const smooth = { accommodation: 0.8 };
    for (const outcome of [
      ductTransmission({ width: 1, height: 1, length: 1, ...smooth }),
      annulusTransmission({ inner: 1, outer: 2, length: 1, ...smooth }),
      coneTransmission({ inletBore: 1, outletBore: 2, length: 1, ...smooth }),
      bendTransmission({ bore: 1, angle: 1, radius: 1, inletLength: 0, outletLength: 0, ...smooth }),
      tubeTransmission({ bore: 1, length: 1, accommodation: 0.01 }),
    ]) {
      assert.ok(!outcome.ok);
    }
  });
});

describe('bends', () => {
  const bend = (degrees: number, radius: number, straight: number) =>
    valueOf(
      bendTransmission({
        bore: 2,
        angle: (degrees * Math.PI) / 180,
        radius,
        inletLength: straight / 2,
        outletLength: straight / 2,
        ...diffuse,
      }),
    );

  it('let through nearly what a straight tube of the same centre line does (Davis 1960, his conclusion; from memory)', () => {
    for (const degrees of [30, 60, 90]) {
      for (const radius of [1, 2, 6, 20]) {
        const straight = tube(4 + radius * ((degrees * Math.PI) / 180));
        assert.ok(Math.abs(bend(degrees, radius, 4) / straight - 1) < 0.08);
      }
    }
  });

  it('are the tube when they do not turn', () => {
    assert.ok(Math.abs(bend(0, 3, 5) / tube(5) - 1) < 1e-9);
    const { value, deviation } = sampleBend({ angle: 1e-3, radius: 5, inlet: 2, outlet: 2 }, 100_000, 7);
    assert.ok(Math.abs(value - tube(4.005)) < 3 * deviation);
  });

  it('between the sampled ones keep within 2 % of molecules followed there', () => {
    const cases = [
      { degrees: 60, radius: 1.5, straight: 1 },
      { degrees: 120, radius: 3, straight: 0 },
      { degrees: 170, radius: 1.2, straight: 6 },
    ];
    for (const { degrees, radius, straight } of cases) {
      const angle = (degrees * Math.PI) / 180;
      const { value, deviation } = sampleBend({ angle, radius, inlet: straight / 2, outlet: straight / 2 }, 60_000, 11);
      assert.ok(Math.abs(bend(degrees, radius, straight) - value) < 0.02 * value + 3 * deviation);
    }
  }).timeout(60_000);

  it('know how the straight lengths are shared well enough', () => {
    const angle = Math.PI / 2;
    const { value, deviation } = sampleBend({ angle, radius: 1.5, inlet: 4, outlet: 0 }, 60_000, 13);
    assert.ok(Math.abs(bend(90, 1.5, 4) - value) < 0.02 * value + 3 * deviation);
  }).timeout(60_000);
});

describe('plugs and passages together', () => {
  it('of long capillaries let through what so many tubes do', () => {
    const [pore, thickness, share] = [1e-6, 3e-3, 0.3];
    const permeability = (share * pore * pore) / 32;
    const chance = valueOf(plugTransmission({ thickness, pore, permeability }));
    assert.ok(Math.abs(chance / (share * tube((2 * thickness) / pore)) - 1) < 1e-3);
  });

  it('of equal bore in series keep within the stated 5 % of the tube of both lengths (Oatley 1957)', () => {
    for (const l of [0.2, 1, 2, 5, 20, 100]) {
      const half = { inlet: 1, outlet: 1, through: tube(l) };
      const { through } = inSeries([half, half]);
      assert.ok(Math.abs(through / tube(2 * l) - 1) < 0.05, `${through} for ${tube(2 * l)} at ${l}`);
    }
  });

  it('do not depend on the direction, and add up side by side', () => {
    const wide = { inlet: 4, outlet: 4, through: 4 * tube(3) };
    const narrow = { inlet: 1, outlet: 1, through: tube(5) };
    const there = inSeries([wide, narrow, wide]).through;
    assert.ok(Math.abs(inSeries([narrow, wide]).through / inSeries([wide, narrow]).through - 1) < 1e-12);
    assert.ok(there < narrow.through);
    assert.equal(inParallel([wide, narrow]).through, wide.through + narrow.through);
    // An opening between wide chambers counts once.
    const opening = { inlet: 1, outlet: 1, through: 1 };
    assert.ok(Math.abs(inSeries([opening, opening]).through - 1) < 1e-12);
  });
});

function valueOf(outcome: Outcome<Transmission>): number {
  assert.ok(outcome.ok, JSON.stringify(outcome));
  return outcome.value.value;
}

function rows(
  source: string,
  where: string,
  ours: (x: number) => number,
  printed: Readonly<Record<number, string>>,
  within?: ReferenceRow['within'],
): readonly ReferenceRow[] {
  return Object.entries(printed).map(([x, value]) => ({
    printed: value,
    got: () => ours(Number(x)),
    source,
    where: `${where}, ${x}`,
    ...(within ? { within } : {}),
  }));
}
