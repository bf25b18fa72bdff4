import assert from 'node:assert/strict';
import { completion } from '../../server/src/features/completion/completion';
import { hover } from '../../server/src/features/hover/hover';
import { signatureHelp } from '../../server/src/features/signatureHelp';
import { analyse, cursor } from '../support/analyse';

const file = 'gas damp = H2O 1 % + air 99 %\nlet room = 20 °C\nlet p_w = ';

describe('a function of a gas', () => {
  it('is offered where its result fits', () => {
    assert.ok(labels('let a = <*>').includes('vapour_pressure'));
    assert.ok(labels('state s of H2O { pressure = <*> }').includes('vapour_pressure'));
    assert.ok(!labels('state s of H2O { temperature = <*> }').includes('vapour_pressure'));
  });

  it('is offered gases first, those of the file and the built-in ones, then temperatures', () => {
    const gases = labels(`${file}vapour_pressure(<*>`);
    for (const name of ['damp', 'H2O', 'water']) assert.ok(gases.includes(name), name);
    assert.ok(!gases.includes('room') && !gases.includes('sqrt'));
    assert.equal(labels(`${file}vapour_pressure(H2O, <*>)`)[0], 'room');
    assert.ok(labels(`${file}vapour_pressure(H2O, 20 <*>)`).includes('°C'));
    assert.ok(!labels(`${file}vapour_pressure(H2O, 20 <*>)`).includes('mbar'));
  });

  it('tells its parameters', () => {
    const { text, offset } = cursor(`${file}vapour_pressure(H2O, <*>`);
    const help = signatureHelp(analyse(text), offset);
    assert.equal(help?.usage, 'vapour_pressure(gas, temperature)');
    const active = help.parameters[help.active];
    assert.equal(help.usage.slice(active?.start, active?.end), 'temperature');
  });

  it('says what it is, what its gas is, and where its tolerance comes from', () => {
    assert.match(hovered(`${file}vapour<*>_pressure(H2O, room)`), /saturation pressure of a gas/);
    assert.match(hovered(`${file}vapour_pressure(H<*>2O, room)`), /water/);
    const whole = hovered(`${file.replace('p_w', 'p<*>_w')}vapour_pressure(H2O, room)`);
    assert.match(whole, /\*\*2\.339\d* ± .*kPa\*\*/);
    assert.match(whole, /stated error of the saturation pressure of H2O: 100 %/);
  });
});

function labels(marked: string): readonly string[] {
  const { text, offset } = cursor(marked);
  return completion(analyse(text), offset).map(({ label }) => label);
}

function hovered(marked: string): string {
  const { text, offset } = cursor(marked);
  return hover(analyse(text), offset, { detail: 'full' })?.markdown ?? '';
}
