import assert from 'node:assert/strict';
import type { ConstantName } from '../../server/src/quantities/constants';
import { constantNamed, constants } from '../../server/src/quantities/constants';
import { standardAmountPerVolume, standardReference } from '../../server/src/quantities/standardReference';
import { unitFactor } from '../../server/src/quantities/conversion';
import { unitOf } from '../../server/src/quantities/parseUnit';

const valueOf = (name: ConstantName) => constantNamed(name).value;
const close = (a: number, b: number, relative: number) =>
  assert.ok(Math.abs(a - b) <= relative * Math.abs(b), `${a} and ${b}`);

describe('physical constants', () => {
  it('have the values that CODATA 2018 prints', () => {
    const check = (name: ConstantName, printed: string) => {
      const digits = printed.split('e')[0]!.replace(/[^\d]/g, '').length;
      // "…" in the list means truncated, not rounded.
      close(valueOf(name), Number(printed), 10 ** (1 - digits));
    };
    check('k', '1.380649e-23');
    check('N_A', '6.02214076e23');
    check('R', '8.314462618');
    check('h', '6.62607015e-34');
    check('e', '1.602176634e-19');
    check('c', '299792458');
    check('u', '1.66053906660e-27');
    check('eps_0', '8.8541878128e-12');
    check('sigma', '5.670374419e-8');
    check('n_0', '2.686780111e25');
    check('g_n', '9.80665');
  });

  it('agree among each other', () => {
    const [k, h, c] = [valueOf('k'), valueOf('h'), valueOf('c')];
    close(valueOf('R'), valueOf('N_A') * k, 1e-15);
    close(valueOf('sigma'), (2 * Math.PI ** 5 * k ** 4) / (15 * h ** 3 * c ** 2), 2e-15);
    close(valueOf('n_0'), 101325 / (k * 273.15), 1e-15);
    close(standardAmountPerVolume(standardReference) * valueOf('N_A'), valueOf('n_0'), 1e-15);
    // CODATA 2018: the molar mass constant differs from 1 g/mol by −3.5e-10 (uncertainty 3.0e-10), from memory.
    close(valueOf('u') * valueOf('N_A'), 1e-3, 1e-9);
    assert.equal(unitFactor(unitOf('u')), valueOf('u'));
    assert.equal(unitFactor(unitOf('eV')), valueOf('e'));
  });

  it('are told in coherent units, with a source', () => {
    for (const { name, unit, source } of constants) {
      assert.equal(unitFactor(unitOf(unit)), 1, name);
      assert.equal(unitOf(unit).text, unit, name);
      assert.ok(source.length > 10);
    }
  });

  it('are found by name', () => {
    assert.equal(constantNamed('k').title, 'Boltzmann constant');
    assert.equal(constantNamed('K' as string), undefined);
  });
});
