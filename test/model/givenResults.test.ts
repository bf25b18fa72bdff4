import assert from 'node:assert/strict';
import { halfWidth } from '../../server/src/model/tolerance';
import { analyse } from '../support/analyse';
import { quantityAt } from '../support/values';

describe('a result that is an input', () => {
  it('is exactly that input, with exactly its tolerance', () => {
    const analysis = analyse(`
      state a of N2 { pressure = 100 Pa ± 10 %, temperature = 300 K ± 0.7 K }
      state b of N2 { number_density = 3e19 1/m³ ± 7 %, temperature = 300 K }
      state c of N2 { density = 1.3e-4 kg/m³ ± 3e-7 kg/m³, pressure = 10 Pa }
      state d from a { temperature = 310 K ± 0.1 K }
    `);
    const exactly = (path: string, si: number, width: number) => {
      const value = quantityAt(analysis, path);
      assert.equal(value.si, si, path);
      assert.equal(halfWidth(value.leans), width, path);
    };
    exactly('a.pressure', 100, 10);
    exactly('a.temperature', 300, 0.7);
    exactly('b.number_density', 3e19, 0.07 * 3e19);
    exactly('c.density', 1.3e-4, 3e-7);
    exactly('d.pressure', 100, 10);
    exactly('d.temperature', 310, 0.1);
    assert.ok(halfWidth(quantityAt(analysis, 'a.number_density').leans) > 0);
  });
});
