import assert from 'node:assert/strict';
import { definition, highlights, references } from '../../server/src/features/navigation';
import { analyse, cursor } from '../support/analyse';
import { sightOf, told } from './sight';

function checkDefinition(files: Readonly<Record<string, string>> | string, expected: string | undefined): void {
  const { sight, uri, offset } = sightOf(typeof files === 'string' ? { 'main.gas': files } : files);
  const found = definition(
    sight.analyses.find((analysis) => analysis.uri === uri)!,
    offset,
  );
  assert.equal(found && told(sight, found), expected);
}

function checkReferences(files: Readonly<Record<string, string>>, expected: readonly string[]): void {
  const { sight, uri, offset } = sightOf(files);
  const found = references(sight, uri, offset).map((location) => told(sight, location));
  assert.deepEqual(found, expected);
  const others = references(sight, uri, offset, { declaration: 'left out' });
  assert.equal(others.length, Math.max(0, found.length - 1));
}

function checkHighlights(marked: string, expected: readonly string[]): void {
  const { text, offset } = cursor(marked);
  const found = highlights(analyse(text), offset);
  assert.deepEqual(
    found.map(({ start, end, kind }) => `${start} ${text.slice(start, end)} ${kind}`),
    expected,
  );
}

describe('navigation', () => {
  it('leads to the declaration of a name', () => {
    checkDefinition('let a = 1\nlet b = 2 * <*>a', 'main.gas:1 a');
    checkDefinition('let <*>a = 1', 'main.gas:1 a');
    checkDefinition('let a = 1\nlet b = a<*>', 'main.gas:1 a');
    checkDefinition('tube t { bore = 1 mm }\nrequire <*>t.bore > 1 mm', 'main.gas:1 t');
    checkDefinition('tube t { bore = 1 mm }\nrequire t.<*>bore > 1 mm', 'main.gas:1 bore');
    checkDefinition('tube t { bore = 1 mm }\nline l = t -> <*>t', 'main.gas:1 t');
    checkDefinition('gas g = Ar 95 % + O2 5 %\nstate s of <*>g { pressure = 1 Pa }', 'main.gas:1 g');
    checkDefinition('chamber c { volume = 1 L }\nsystem y { c -> c }\nrequire y.<*>c.pressure > 1 Pa', 'main.gas:1 c');
    checkDefinition('species Q { molar_mass = 2 g/mol }\nrequire r.<*>Q.partial_pressure > 1 Pa', 'main.gas:1 Q');
  });

  it('leads nowhere from what no file declares', () => {
    checkDefinition('state s of <*>N2 { pressure = 1 Pa }', undefined);
    checkDefinition('let a = <*>b', undefined);
    checkDefinition('let a = 5<*> mm', undefined);
    checkDefinition('tube t { <*>bore = 1 mm }', undefined);
    checkDefinition('let molecular = 1\nflow f through t { regime = <*>molecular }', undefined);
    checkDefinition('tube t { bore = 1 mm }\nrequire t.<*>area > 1 mm²', undefined);
  });

  it('crosses files', () => {
    const other = 'let room = 20 °C';
    checkDefinition({ 'main.gas': 'use "o.gas"\nlet a = <*>room', 'o.gas': other }, 'o.gas:1 room');
    checkDefinition({ 'main.gas': 'use "<*>o.gas"', 'o.gas': other }, 'o.gas:1');
    checkDefinition({ 'main.gas': 'let a = <*>room', 'o.gas': other }, undefined);
    checkDefinition({ 'main.gas': 'use "o.gas"\nlet room = 1 K\nlet a = <*>room', 'o.gas': other }, 'main.gas:2 room');
  });

  it('finds what means the same, in every file', () => {
    const files = {
      'o.gas': 'let <*>room = 20 °C\nlet twice = 2 * room',
      'a.gas': 'use "o.gas"\nstate s of N2 { temperature = room, pressure = 1 Pa }',
      'b.gas': 'use "o.gas"\nlet room = 1 K\nlet c = room',
      'c.gas': 'let d = room',
    };
    checkReferences(files, ['o.gas:1 room', 'o.gas:2 room', 'a.gas:2 room']);
    checkReferences({ 'a.gas': 'state s of <*>N2 { pressure = 1 Pa }' }, []);
  });

  it('marks where a name is declared and where it is read', () => {
    checkHighlights('let a = 1\nlet b = <*>a + a', ['4 a write', '18 a read', '22 a read']);
    checkHighlights('state s of <*>N2 {}\nstate t of N2 {}', ['11 N2 read', '28 N2 read']);
    checkHighlights('tube t { <*>bore = 1 mm }', []);
  });
});
