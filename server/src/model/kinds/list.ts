import { annulus } from './annulus';
import { bend } from './bend';
import { bundle } from './bundle';
import { chamber } from './chamber';
import { conduction } from './conduction';
import { cone } from './cone';
import { duct } from './duct';
import { flow } from './flow';
import { gap } from './gap';
import { inlet } from './inlet';
import { jacket } from './jacket';
import { orifice } from './orifice';
import { particle } from './particle';
import { plug } from './plug';
import { pump } from './pump';
import { pumpdown } from './pumpdown';
import { slit } from './slit';
import { species } from './species';
import { state } from './state';
import { sweep } from './sweep';
import { system } from './system';
import { tube } from './tube';
import type { Kind } from './kind';
import { siteResults } from './site';

/** Every kind of declaration with a block, in the order of the format's own table. A new one needs its file and its line here. */
export const kinds: readonly Kind[] = [
  species,
  state,
  orifice,
  tube,
  duct,
  slit,
  annulus,
  cone,
  bend,
  bundle,
  plug,
  gap,
  jacket,
  chamber,
  particle,
  flow,
  conduction,
  pump,
  inlet,
  system,
  pumpdown,
  sweep,
];

const byWord: ReadonlyMap<string, Kind> = new Map(kinds.map((kind) => [kind.word, kind]));

export function kindOfWord(word: string): Kind | undefined {
  return byWord.get(word);
}

/** The results of a kind that a later version computes. */
export function laterResults(word: string): readonly string[] {
  return word === 'site' ? siteResults.later : (byWord.get(word)?.later ?? []);
}

/** The results that the hint of a declaration shows unless a setting says otherwise. */
export function hintResults(word: string): readonly string[] {
  if (word === 'site') return siteResults.hint;
  if (word === 'line') return ['transmission_probability', 'volume'];
  return word === 'gas' ? ['molar_mass'] : (byWord.get(word)?.hint ?? []);
}
