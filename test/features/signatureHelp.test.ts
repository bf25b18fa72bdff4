import assert from 'node:assert/strict';
import { describe, it } from 'mocha';
import { signatureHelp } from '../../server/src/features/signatureHelp';
import { functions } from '../../server/src/model/functions';
import { analyse, cursor } from '../support/analyse';
import { samples } from './samples';

describe('signature help', () => {
  it('tells usage, meaning and the parameter that is being written', () => {
    check('let a = sqrt(<*>', 'sqrt(x)', 'x');
    check('let a = round(3 mm, <*>', 'round(x, step)', 'step');
    check('let a = round(3 mm<*>, 1 mm)', 'round(x, step)', 'x');
    const help = at('let a = sqrt(<*>4 mm²)');
    assert.equal(help?.meaning, functions.find(({ name }) => name === 'sqrt')?.meaning);
  });

  it('lets the last parameter repeat', () => {
    check('let a = max(1 mm, <*>', 'max(a, b, …)', 'b');
    check('let a = max(1 mm, 2 mm, 3 mm, 4 mm, <*>', 'max(a, b, …)', '…');
  });

  it('is about the innermost call', () => {
    check('let a = max(1, sqrt(<*>', 'sqrt(x)', 'x');
    check('let a = max(1, sqrt(4)<*>', 'max(a, b, …)', 'b');
    check('let a = max((1 + 2<*>) * 3, 4)', 'max(a, b, …)', 'a');
    check('let a = max(1,\n  2,<*>\n)', 'max(a, b, …)', '…');
  });

  it('counts no commas in tables, texts and comments', () => {
    check('let a = max([1: 2, 3: 4]<*>', 'max(a, b, …)', 'a');
    check('let a = round(3 mm # to this, or that\n <*>', 'round(x, step)', 'x');
  });

  it('reads tables like functions', () => {
    const curve = 'let speed = [1 mbar: 2 L/s, 10 mbar: 8 L/s]\n';
    check(`${curve}let a = speed(<*>`, 'speed(x)', 'x');
    assert.equal(at(`${curve}let a = speed(<*>`)?.meaning, 'a table: a volume flow at a pressure');
  });

  it('has nothing to say elsewhere', () => {
    for (const marked of [
      '<*>',
      'let a<*> = 3',
      'let a = (3 + <*>',
      'let a = sqrt(4)<*>',
      'let a = nothing(<*>',
      'tube t { <*>',
    ])
      assert.equal(at(marked), undefined, marked);
    assert.equal(at('let a = sqrt( # of <*>'), undefined);
    assert.equal(at('let a = sqrt(4\nlet b = 3 <*>'), undefined);
  });

  it('has an answer at every place of a text and of all its beginnings', function () {
    this.timeout(60_000);
    for (const [, text] of samples) {
      const whole = analyse(text);
      for (let offset = 0; offset <= text.length; offset += 1) {
        const help = signatureHelp(whole, offset);
        assert.ok(!help || help.parameters[help.active]);
      }
      for (let end = 0; end <= text.length; end += 5) signatureHelp(analyse(text.slice(0, end)), end);
    }
  });
});

function check(marked: string, usage: string, parameter: string): void {
  const help = at(marked);
  assert.equal(help?.usage, usage, marked);
  const place = help.parameters[help.active];
  assert.equal(usage.slice(place?.start, place?.end), parameter, marked);
}

function at(marked: string): ReturnType<typeof signatureHelp> {
  const { text, offset } = cursor(marked);
  return signatureHelp(analyse(text), offset);
}
