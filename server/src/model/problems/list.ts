import { absoluteZero } from './absoluteZero';
import { ambiguousTemperature } from './ambiguousTemperature';
import { associating } from './associating';
import { circularDefinition } from './circularDefinition';
import { condensing } from './condensing';
import { contradictoryInput } from './contradictoryInput';
import { decimalComma } from './decimalComma';
import { duplicateKey } from './duplicateKey';
import { duplicateName } from './duplicateName';
import { fileNotFound } from './fileNotFound';
import { fractionsSum } from './fractionsSum';
import { gaugePressure } from './gaugePressure';
import { hazard } from './hazard';
import { missingInput } from './missingInput';
import { missingUnit } from './missingUnit';
import { mixedParts } from './mixedParts';
import { noData } from './noData';
import { noValue } from './noValue';
import { notComputedYet } from './notComputedYet';
import { notIdeal } from './notIdeal';
import { outOfBounds } from './outOfBounds';
import { outsideRange } from './outsideRange';
import { requirementFails } from './requirementFails';
import { requirementUndecided } from './requirementUndecided';
import { surplusInput } from './surplusInput';
import { syntaxError } from './syntaxError';
import { tooCold } from './tooCold';
import { tooDense } from './tooDense';
import { unitMismatch } from './unitMismatch';
import { unknownKey } from './unknownKey';
import { unknownKind } from './unknownKind';
import { unknownName } from './unknownName';
import { unknownProperty } from './unknownProperty';
import { unknownUnit } from './unknownUnit';
import { unusedDeclaration } from './unusedDeclaration';
import { wrongArguments } from './wrongArguments';
import { wrongType } from './wrongType';
import type { ProblemDefinition } from './problem';

/** Every problem there is, for the pages of the codes and for `explain`. */
export const problemKinds: readonly Omit<ProblemDefinition<never>, 'message' | 'fixes'>[] = [
  absoluteZero,
  ambiguousTemperature,
  associating,
  circularDefinition,
  condensing,
  contradictoryInput,
  decimalComma,
  duplicateKey,
  duplicateName,
  fileNotFound,
  fractionsSum,
  gaugePressure,
  hazard,
  missingInput,
  missingUnit,
  mixedParts,
  noData,
  noValue,
  notComputedYet,
  notIdeal,
  outOfBounds,
  outsideRange,
  requirementFails,
  requirementUndecided,
  surplusInput,
  syntaxError,
  tooCold,
  tooDense,
  unitMismatch,
  unknownKey,
  unknownKind,
  unknownName,
  unknownProperty,
  unknownUnit,
  unusedDeclaration,
  wrongArguments,
  wrongType,
];

export function problemCoded(code: string): (typeof problemKinds)[number] | undefined {
  return problemKinds.find((kind) => kind.code === code);
}
