import assert from 'node:assert/strict';
import { plain } from '../../server/src/report/text';
import { circumstances } from '../../server/src/verify/circumstances';
import { compare } from '../../server/src/verify/compare';
import { verifyJson } from '../../server/src/verify/json';
import type { ReferenceRow } from '../../server/src/verify/row';
import { verifyText } from '../../server/src/verify/text';

describe('the report of a comparison', () => {
  const right: ReferenceRow = {
    property: 'second_virial',
    gas: 'N2',
    temperature: 300,
    pressure: 1,
    printed: '-4.5',
    unit: 'cm³/mol',
    source: 'Dymond & Smith 1980',
    where: 'N2; from memory',
    within: { tolerance: 5, because: 'test' },
  };
  const wrong: ReferenceRow = { ...right, printed: '-40' };
  const none: ReferenceRow = { ...right, gas: 'unobtainium' };
  const ran = circumstances(['tenuity 1.2.3']);

  it('lists a value that is off, whether asked for or not, and one that there is none of', () => {
    const text = verifyText(ran, [right, wrong, none].map(compare), { rows: 'beyond', emphasis: plain });
    assert.match(text, /^beyond +second_virial +N2 +-40 cm³\/mol +-3\.\d+ +36 cm³\/mol +Dymond & Smith 1980, N2/m);
    assert.match(text, /^beyond +second_virial +unobtainium +-4\.5 cm³\/mol +– +– +Dymond/m);
    assert.match(text, /^3 published values, 2 beyond their tolerance$/m);
    assert.ok(!/^within +second_virial/m.test(text));
  });

  it('is JSON without numbers that are none', () => {
    const report = verifyJson(ran, [right, none].map(compare), { rows: 'beyond' });
    assert.equal(report.verdict, 'beyond');
    assert.deepEqual(
      report.rows.map(({ gas, ours }) => ({ gas, ours })),
      [{ gas: 'unobtainium', ours: null }],
    );
  });
});
