import assert from 'node:assert/strict';
import type { OutlineItem } from '../../server/src/features/outline';
import { outline } from '../../server/src/features/outline';
import { analyse } from '../support/analyse';

function check(text: string, expected: readonly string[]): void {
  assert.deepEqual(
    outline(analyse(text)).flatMap((item) => lines(item, '')),
    expected,
  );
}

function lines({ name, detail, kind, children }: OutlineItem, indent: string): readonly string[] {
  return [`${indent}${kind} ${name}: ${detail}`, ...children.flatMap((child) => lines(child, `${indent}  `))];
}

describe('outline', () => {
  it('lists declarations with their values, and what they are given', () => {
    check('let a = 2 * 3 mm', ['variable a: 6.000 mm']);
    check('tube t { bore = 40 mm, length = 1 m }', [
      'struct t: tube · V 1.257 L · A 12.57 cm²',
      '  field bore: 40 mm',
      '  field length: 1 m',
    ]);
    check('use "a.gas"\ndisplay pressure in mbar\nassume ambient_pressure = 1 bar', [
      'file a.gas: use',
      'property display: pressure in mbar',
      'constant ambient_pressure: 1.000 bar',
    ]);
    check('gas g = Ar 95 % + O2 5 %', ['class g: Ar 95.00 %, O2 5.000 %']);
    check('sweep s {\n  vary t.bore = 1 mm .. 2 mm in 5 steps\n  show a, b\n}', [
      'module s: sweep',
      '  field t.bore: 1 mm .. 2 mm in 5',
      '  field a, b: ',
    ]);
  });

  it('lists requirements by what they say, with their status', () => {
    check('require 2 mm > 1 mm', ['boolean 2 mm > 1 mm: holds, margin 100 %']);
    check('require 1 mm  > 2 mm', ['boolean 1 mm > 2 mm: fails, margin −50 %']);
    check('require x > 2 mm', ['boolean x > 2 mm: not evaluated']);
    const long = Array.from({ length: 9 }, () => '1 mm < 2 mm').join(' and ');
    check(`require ${long}`, [`boolean ${long.slice(0, 59)}…: holds, margin 50 %`]);
  });

  it('lists what is still being written', () => {
    check('tube', []);
    check(
      'tube {',
      ['object tube: tube'].map((line) => line.replace('object', 'struct')),
    );
    check(
      'let = 1',
      ['variable let: 1.000'].map((line) => line.replace('1.000', 'let')),
    );
    check('tube t {\n  bore = \n}', ['struct t: tube', '  field bore: ']);
  });
});
