import { H2 } from './H2';
import { D2 } from './D2';
import { He } from './He';
import { Ne } from './Ne';
import { Ar } from './Ar';
import { Kr } from './Kr';
import { Xe } from './Xe';
import { N2 } from './N2';
import { O2 } from './O2';
import { air } from './air';
import { CO } from './CO';
import { CO2 } from './CO2';
import { H2O } from './H2O';
import { CH4 } from './CH4';
import { NH3 } from './NH3';
import { SF6 } from './SF6';
import type { Species } from './species';

/** Every gas the program knows by itself. A new one needs its file, its line here, and its reference rows. */
export const speciesList: readonly Species[] = [H2, D2, He, Ne, Ar, Kr, Xe, N2, O2, air, CO, CO2, H2O, CH4, NH3, SF6];

/** A gas by its formula or by one of its common names. */
export function speciesByName(name: string): Species | undefined {
  return byName.get(name);
}

const byName: ReadonlyMap<string, Species> = new Map(
  speciesList.flatMap((species) => [species.formula, ...species.names].map((name) => [name, species])),
);
