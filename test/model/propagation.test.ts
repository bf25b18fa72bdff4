import assert from 'node:assert/strict';
import type { Leans } from '../../server/src/model/tolerance';
import { halfWidth } from '../../server/src/model/tolerance';
import type { Quantity } from '../../server/src/model/values';
import { analyse } from '../support/analyse';
import { halfUnit } from '../support/reference';
import { quantityAt } from '../support/values';

/**
 * The examples of JCGM 100:2008, annex H. They state standard uncertainties, and so do these documents: linear propagation
 * carries either alike. The numbers are from memory.
 */
describe('examples of JCGM 100:2008', () => {
  const near = (value: number, printed: string) =>
    assert.ok(Math.abs(value - Number(printed)) <= halfUnit(printed), `${value} differs from ${printed}`);

  it('H.1, an end gauge (table H.1)', () => {
    const analysis = analyse(`
      let standard = 50.000623 mm ± 25e-6 mm
      let difference = 215e-6 mm ± 9.7e-6 mm
      let expansion = 11.5e-6 1/K ± 1.2e-6 1/K
      let deviation = (0 - 0.1) * (1 K ± 4.1 K)
      let expansions = 0 1/K ± (1e-6 1/K / sqrt(3))
      let temperatures = 0 K ± (0.05 K / sqrt(3))
      let length = standard + difference - standard * (expansions * deviation + expansion * temperatures)
    `);
    const length = quantityAt(analysis, 'length');
    near(length.si * 1e3, '50.000838');
    near(halfWidth(length.leans) * 1e9, '32');
    near(leanOf(length, '#standard') * 1e9, '25');
    near(leanOf(length, '#difference') * 1e9, '9.7');
    near(leanOf(length, '#temperatures') * 1e9, '16.6');
    near(leanOf(length, '#expansions') * 1e9, '2.9');
    assert.equal(leanOf(length, '#expansion'), 0);
    assert.equal(leanOf(length, '#deviation'), 0);
  });

  it('H.2, resistance and reactance measured at once, with correlated inputs (table H.4)', () => {
    const [V, I, phi] = OBSERVED;
    const [vi, vp, ip] = [r(V, I), r(V, phi), r(I, phi)];
    near(mean(V), '4.9990');
    near(uncertainty(I), '0.0095');
    near(vi, '-0.36');
    near(vp, '0.86');
    near(ip, '-0.65');
    // Three independent causes give the correlations of the observations.
    const second = Math.sqrt(1 - vi * vi);
    const mixed = (ip - vi * vp) / second;
    const third = Math.sqrt(1 - vp * vp - mixed * mixed);
    const analysis = analyse(`
      let z1 = 0 ± 1
      let z2 = 0 ± 1
      let z3 = 0 ± 1
      let V = ${mean(V)} V + ${uncertainty(V)} V * z1
      let I = ${mean(I)} mA + ${uncertainty(I)} mA * ((${vi}) * z1 + ${second} * z2)
      let phi = ${mean(phi)} + ${uncertainty(phi)} * (${vp} * z1 + (${mixed}) * z2 + ${third} * z3)
      let R = V / I * cos(phi)
      let X = V / I * sin(phi)
      let Z = V / I
      let again = sqrt(R ^ 2 + X ^ 2)
    `);
    const [R, X, Z, again] = ['R', 'X', 'Z', 'again'].map((name) => quantityAt(analysis, name));
    assert.ok(R && X && Z && again);
    near(R.si, '127.732');
    near(X.si, '219.847');
    near(Z.si, '254.260');
    near(halfWidth(R.leans), '0.071');
    // The observations give 0.2955 if the results are averaged, and 0.2956 by propagation; the table prints 0.295.
    assert.ok(Math.abs(halfWidth(X.leans) - 0.295) < 0.001);
    near(halfWidth(Z.leans), '0.236');
    near(correlation(R, X), '-0.588');
    near(correlation(R, Z), '-0.485');
    near(correlation(X, Z), '0.993');
    assert.ok(Math.abs(halfWidth(again.leans) - halfWidth(Z.leans)) < 1e-12);
  });
});

/** Table H.2: five observations of the voltage in V, the current in mA and the phase in rad. */
const OBSERVED = [
  [5.007, 4.994, 5.005, 4.99, 4.999],
  [19.663, 19.639, 19.64, 19.685, 19.678],
  [1.0456, 1.0438, 1.0468, 1.0428, 1.0433],
] as const;

type Observed = (typeof OBSERVED)[number];

function mean(values: Observed): number {
  return values.reduce((sum: number, value) => sum + value, 0) / values.length;
}

/** The standard uncertainty of the mean (4.2.3). */
function uncertainty(values: Observed): number {
  return Math.sqrt(covariance(values, values));
}

/** The correlation of two means (5.2.3, 5.2.2). */
function r(a: Observed, b: Observed): number {
  return covariance(a, b) / (uncertainty(a) * uncertainty(b));
}

function covariance(a: Observed, b: Observed): number {
  const sum = a.reduce((total: number, value, index) => total + (value - mean(a)) * ((b[index] ?? 0) - mean(b)), 0);
  return sum / (a.length * (a.length - 1));
}

function leanOf({ leans }: Quantity, ending: string): number {
  const found = [...leans].filter(([cause]) => cause.endsWith(ending));
  return found.reduce((sum, [, lean]) => sum + Math.abs(lean), 0);
}

function correlation(a: Quantity, b: Quantity): number {
  return product(a.leans, b.leans) / (halfWidth(a.leans) * halfWidth(b.leans));
}

function product(a: Leans, b: Leans): number {
  return [...a].reduce((sum, [cause, lean]) => sum + lean * (b.get(cause) ?? 0), 0);
}
