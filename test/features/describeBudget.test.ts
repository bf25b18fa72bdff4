import assert from 'node:assert/strict';
import { describeCause } from '../../server/src/features/describe/describeBudget';
import { speciesList } from '../../server/src/physics/species/list';
import { evaluateState } from '../../server/src/physics/state/evaluateState';
import { statedSpecies } from '../../server/src/physics/species/statedSpecies';
import { analyse } from '../support/analyse';
import { mixture, request } from '../support/gases';

const analysis = analyse('');

/** Every cause that the engine itself can bring into a state: of each gas alone, and of each in another, cold, warm and hot. */
const causes = new Set(
  speciesList.flatMap(({ formula }) => {
    const other = formula === 'N2' ? 'Ar' : 'N2';
    const own = statedSpecies({ name: 'own', molarMass: 0.05, diameter: 4e-10, vapourPressure: 100 });
    const compositions = [mixture({ [formula]: 1 }), mixture({ [formula]: 0.5, [other]: 0.5 })];
    const withOwn = { species: [...mixture({ [formula]: 1 }).species, own], moleFractions: [0.5, 0.5] };
    return [...compositions, withOwn].flatMap((composition) =>
      [40, 150, 300, 1000].flatMap((T) =>
        evaluateState(request(composition, T, 100)).modelErrors.map(({ key }) => key),
      ),
    );
  }),
);

describe('a cause of tolerance', () => {
  it('of each sort that the engine has is among those looked at', () => {
    const sorts = new Set([...causes].map((cause) => cause.split(':')[0]));
    assert.deepEqual([...sorts].sort(), [
      'conductivity',
      'eucken',
      'fuller_diffusion',
      'heat_capacity',
      'measured_diffusion',
      'mixture_conductivity',
      'mixture_viscosity',
      'monatomic_conductivity',
      'pair_diffusion',
      'saturation_pressure',
      'second_virial',
      'self_diffusion',
      'viscosity',
    ]);
  });

  it('is in plain words, without the name that the program has for it', () => {
    for (const cause of causes) {
      const words = describeCause(analysis, cause);
      assert.match(words, /^(stated |assumed )?error of the /, cause);
      assert.doesNotMatch(words, /_/, cause);
    }
  });

  it('tells an error that the source states from one that is assumed', () => {
    assert.equal(describeCause(analysis, 'saturation_pressure:H2O'), 'stated error of the saturation pressure of H2O');
    assert.equal(describeCause(analysis, 'viscosity:own'), 'assumed error of the viscosity of own');
  });
});
