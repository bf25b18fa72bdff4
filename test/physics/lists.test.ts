import assert from 'node:assert/strict';
import { heatSources } from '../../server/src/physics/heat/heatProvenance';
import { pure } from '../../server/src/physics/composition';
import { statedSpecies } from '../../server/src/physics/species/statedSpecies';
import { speciesByName, speciesList } from '../../server/src/physics/species/list';
import { dragSources } from '../../server/src/physics/particles/sphereDrag';
import { kineticSources } from '../../server/src/physics/rarefied/kineticCoefficients';
import { endSources } from '../../server/src/physics/rarefied/longConductance';
import { transmissionSources } from '../../server/src/physics/passages/transmission';
import { sources } from '../../server/src/physics/sources';
import { statePropertyNamed, stateProperties } from '../../server/src/physics/state/properties';
import { measuredVirial } from '../../server/src/physics/thermo/measuredVirial';
import { measuredDiffusionSource } from '../../server/src/physics/transport/measuredDiffusion';
import { everyFigure, figures, mixture, valueOf } from '../support/gases';

/** A molecule of a file, to see what its methods cite. */
const polar = {
  name: 'polar',
  molarMass: 0.03,
  lennardJones: { diameter: 3.5e-10, wellDepth: 300 },
  dipoleMoment: 5e-30,
};

describe('lists', () => {
  it('hold every output of a state, once', () => {
    const names = stateProperties.map(({ name }) => name);
    assert.equal(new Set(names).size, names.length);
    assert.equal(names.length, 40);
    for (const name of names) assert.equal(statePropertyNamed(name)?.name, name);
    for (const row of stateProperties) assert.equal(row.perSpecies, row.computeFor !== undefined, row.name);
  });

  it('know every gas by its formula and its names', () => {
    assert.equal(speciesList.length, 71);
    for (const species of speciesList) {
      for (const name of [species.formula, ...species.names]) assert.equal(speciesByName(name), species);
    }
    assert.equal(speciesByName('unobtainium'), undefined);
  });

  it('cite nothing in vain', () => {
    const data = JSON.stringify([speciesList, stateProperties, measuredDiffusionSource, measuredVirial('H2O')]);
    const methods = figures(mixture({ N2: 0.5, Ar: 0.5 }), 300, 1);
    const stated = figures(pure(statedSpecies(polar)), 300, 1);
    const cited = data + JSON.stringify([everyFigure(methods), everyFigure(stated)]);
    const elsewhere = JSON.stringify([kineticSources, endSources, dragSources, transmissionSources, heatSources]);
    for (const [id, { authors, year }] of Object.entries(sources)) {
      const surname = authors.split(/[,;]/)[0]!;
      const mentioned = new RegExp(`${surname}[^'"]{0,10}${year}`, 'u').test(cited);
      assert.ok((cited + elsewhere).includes(`"${id}"`) || mentioned, id);
    }
  });

  it('give every figure its method and sources', () => {
    const state = figures(mixture({ N2: 0.5, He: 0.5 }), 300, 1);
    for (const { name, outcome } of everyFigure(state)) {
      if (!outcome.ok) continue;
      assert.ok(outcome.value.method.length > 0, name);
    }
    assert.deepEqual(valueOf(state.species.get('N2')?.get('viscosity')).sources, ['Lemmon & Jacobsen 2004']);
    assert.deepEqual(valueOf(state.mixture.get('viscosity')).range, { quantity: 'temperature', low: 70, high: 2000 });
  });
});
