import assert from 'node:assert/strict';
import fc from 'fast-check';
import { nearestNames } from '../../server/src/quantities/nearestNames';

describe('nearest names', () => {
  const names = ['pressure', 'temperature', 'upstream', 'downstream', 'bore', 'length', 'Ar', 'He', 'N2', 'O2', 'H2'];
  const check = (name: string, ...expected: string[]) => assert.deepEqual(nearestNames(name, names), expected);

  it('forgive slips in proportion to the length', () => {
    check('presure', 'pressure');
    check('pressrue', 'pressure');
    check('temprature', 'temperature');
    check('lenght', 'length');
    check('boer', 'bore');
    check('downstrem', 'downstream');
    check('colour');
    check('x');
  });

  it('put what differs in case only first', () => {
    check('PRESSURE', 'pressure');
    check('AR', 'Ar');
    check('n2', 'N2', 'O2', 'H2');
  });

  it('keep the order of equals, and the number asked for', () => {
    assert.deepEqual(nearestNames('B2', names), ['N2', 'O2', 'H2']);
    assert.deepEqual(nearestNames('B2', names, 1), ['N2']);
  });

  it('never offer the name itself, nor anything twice', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 8 }), fc.array(fc.string({ maxLength: 8 })), (name, candidates) => {
        const near = nearestNames(name, candidates);
        assert.ok(near.length <= 3 && !near.includes(name));
        assert.equal(new Set(near).size, near.length);
      }),
    );
  });
});
