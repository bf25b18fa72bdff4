import type { Note } from '../../physics/outcome';
import { dimension } from '../../quantities/dimension';
import { formatNumber } from '../../quantities/format';
import { quantityInput } from '../inputs';
import { condensing } from '../problems/condensing';
import { notIdeal } from '../problems/notIdeal';
import { tooCold } from '../problems/tooCold';
import { tooDense } from '../problems/tooDense';
import { quantity, show } from '../quantity';
import type { Scope } from '../scope';
import type { Given } from './kind';
import { reportOutsideRange } from './reportOutsideRange';

/** What the engine remarks on a state, as a problem at the input that it comes from. */
export function reportStateNote(note: Note, given: Given, scope: Scope): void {
  switch (note.kind) {
    case 'outside-range':
      reportOutsideRange([note], given, scope);
      return;
    case 'quantum':
      scope.report(
        tooCold.at(given.place('temperature'), { species: note.species, degeneracy: formatNumber(note.degeneracy, 2) }),
      );
      return;
    case 'dense': {
      const nanometres = (value: number) => `${formatNumber(value * 1e9, 3)} nm`;
      scope.report(
        tooDense.at(given.place('pressure'), {
          spacing: nanometres(note.spacing),
          diameter: nanometres(note.diameter),
        }),
      );
      return;
    }
    case 'condensing':
      reportCondensing(note, given, scope);
      return;
    case 'not-ideal':
      scope.report(
        notIdeal.at(given.place('pressure'), {
          compressibility: formatNumber(1 + note.departure, 3),
          departure: `${formatNumber(100 * Math.abs(note.departure), 2)} %`,
        }),
      );
      return;
    default:
      note satisfies never;
  }
}

function reportCondensing(note: Extract<Note, { kind: 'condensing' }>, given: Given, scope: Scope): void {
  const unit = quantityInput(given.inputs, 'pressure')?.unit;
  const pressures = (si: number) =>
    show({ ...quantity(si, pressureDimension), quantityKind: 'pressure' }, { digits: 3, ...(unit ? { unit } : {}) });
  scope.report(
    condensing.at(given.place('temperature'), {
      species: note.species,
      phase: note.phase,
      pressure: pressures(note.pressure),
      ...(note.saturation === undefined ? {} : { saturation: pressures(note.saturation) }),
    }),
  );
}

const pressureDimension = dimension({ mass: 1, length: -1, time: -2 });
