import type { Span } from '../../syntax/nodes';
import { divide, multiply } from '../arithmetic';
import { figure, figures } from '../figures';
import { plainNumber, quantity } from '../quantity';
import type { Scope } from '../scope';
import type { Members, Provenance, Quantity, Record } from '../values';
import { wrongType } from '../problems/wrongType';
import { regimeOf, regimes, regimesWithin } from '../regime';
import { halfWidth } from '../tolerance';
import { quantityOf } from './siteMembers';
import { particleMembers } from './siteParticle';
import { passageMembers } from './sitePassage';

/** The results that a site has or will have, for completion and for what is not computed yet. */
export const siteResults = {
  hint: ['knudsen', 'regime'],
  later: ['conductance', 'poiseuille_coefficient', 'thermal_creep_coefficient'],
} as const;

/** A gas at rest in a place: its Knudsen number on the place's characteristic length, and what follows from it. */
export function computeSite(state: Record, geometry: Record, span: Span, scope: Scope): Record | undefined {
  const path = state.members.get('mean_free_path');
  const size = quantityOf(geometry.members, 'characteristic_length');
  if (!size) {
    scope.report(
      wrongType.at(span, { subject: 'a site', wants: 'a place with a characteristic length', found: geometry.word }),
    );
    return undefined;
  }
  if (path?.kind !== 'figure' || path.value.kind !== 'quantity') {
    const why = path?.kind === 'absent' ? path.why : 'the state has no mean free path';
    const members: Members = new Map([
      ...contents(state, geometry),
      ['knudsen', { kind: 'absent', why }],
      ['regime', { kind: 'absent', why }],
    ]);
    return record(state, members);
  }
  const knudsen = divide(path.value, size);
  const limits = scope.regimeLimits();
  const provenance: Provenance = {
    ...path.provenance,
    method: `Kn = λ/ℓ on the ${sizeName(geometry)}; λ: ${path.provenance.method}`,
  };
  const kn = { ...quantity(knudsen.si, knudsen.dimension, knudsen.leans), quantityKind: 'number' };
  const delta = rarefaction(kn, geometry);
  const around = geometry.word === 'particle';
  const members: Members = new Map([
    ['knudsen', figure(kn, provenance)],
    ['rarefaction', figure(delta, { ...provenance, method: `δ = (√π/2)·a/λ, on the ${rarefactionSize(geometry)}` })],
    [
      'regime',
      figure(
        {
          kind: 'word',
          text: regimeOf(knudsen.si, limits),
          of: regimes,
          reached: regimesWithin(knudsen.si, halfWidth(knudsen.leans), limits),
        },
        {
          ...provenance,
          method: `by the Knudsen number: viscous < ${limits.slip} ≤ slip < ${limits.transitional} ≤ transitional < ${limits.molecular} ≤ molecular`,
        },
      ),
    ],
    ...(around ? particleMembers(state, geometry) : passageMembers(state, geometry, delta)),
    ...(around ? [] : contents(state, geometry)),
  ]);
  return record(state, members);
}

/** δ = (√π/2) a/λ, with the radius of a round thing or the gap between plates as a. */
function rarefaction(knudsen: Quantity, geometry: Record): Quantity {
  const half = isRound(geometry) ? 2 : 1;
  const delta = divide(plainNumber(Math.sqrt(Math.PI) / 2 / half), knudsen);
  return { ...quantity(delta.si, delta.dimension, delta.leans), quantityKind: 'number' };
}

function rarefactionSize(geometry: Record): string {
  return isRound(geometry) ? 'radius' : 'characteristic length';
}

function isRound({ word }: Record): boolean {
  return ['tube', 'orifice', 'cone', 'bend', 'particle'].includes(word);
}

/** N = nV and Ż = (n c̄/4) S */
function contents(state: Record, geometry: Record): Members {
  const number = quantityOf(state.members, 'number_density');
  const impingement = quantityOf(state.members, 'impingement_rate');
  const volume = quantityOf(geometry.members, 'volume');
  const wall = quantityOf(geometry.members, 'wall_area');
  return new Map([
    ...(number && volume ? figures('number density times volume', { molecules: multiply(number, volume) }) : []),
    ...(impingement && wall
      ? figures('impingement rate times wall area', { wall_collision_rate: multiply(impingement, wall) })
      : []),
  ]);
}

function record(state: Record, members: Members): Record {
  return {
    kind: 'record',
    word: 'site',
    members,
    species: new Map(),
    inputs: new Map(),
    ...(state.gas ? { gas: state.gas } : {}),
  };
}

function sizeName({ word }: Record): string {
  if (word === 'particle') return 'diameter';
  return word === 'tube' || word === 'orifice' ? 'bore' : 'characteristic length';
}
