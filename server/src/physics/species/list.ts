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
import { O3 } from './O3';
import { D2O } from './D2O';
import { C2H2 } from './C2H2';
import { C2H4 } from './C2H4';
import { C2H6 } from './C2H6';
import { C3H6 } from './C3H6';
import { C3H8 } from './C3H8';
import { nC4H10 } from './nC4H10';
import { iC4H10 } from './iC4H10';
import { C6H6 } from './C6H6';
import { CH3OH } from './CH3OH';
import { C2H5OH } from './C2H5OH';
import { CH3COCH3 } from './CH3COCH3';
import { CH3Cl } from './CH3Cl';
import { CH2Cl2 } from './CH2Cl2';
import { CHCl3 } from './CHCl3';
import { NO } from './NO';
import { N2O } from './N2O';
import { NO2 } from './NO2';
import { SO2 } from './SO2';
import { H2S } from './H2S';
import { CF4 } from './CF4';
import { CHF3 } from './CHF3';
import { CH2F2 } from './CH2F2';
import { CH3F } from './CH3F';
import { COS } from './COS';
import { HCl } from './HCl';
import { HF } from './HF';
import { HI } from './HI';
import { HCN } from './HCN';
import { F2 } from './F2';
import { I2 } from './I2';
import { Hg } from './Hg';
import { BF3 } from './BF3';
import { AsH3 } from './AsH3';
import { HBr } from './HBr';
import { Cl2 } from './Cl2';
import { Br2 } from './Br2';
import { BCl3 } from './BCl3';
import { NF3 } from './NF3';
import { SiH4 } from './SiH4';
import { SiF4 } from './SiF4';
import { SiCl4 } from './SiCl4';
import { SiH2Cl2 } from './SiH2Cl2';
import { PH3 } from './PH3';
import { GeH4 } from './GeH4';
import { B2H6 } from './B2H6';
import { WF6 } from './WF6';
import { AlC3H9 } from './AlC3H9';
import { C2F6 } from './C2F6';
import { cC4F8 } from './cC4F8';
import { CCl4 } from './CCl4';
import { C7H8 } from './C7H8';
import { iC3H7OH } from './iC3H7OH';
import { CH3OCH3 } from './CH3OCH3';
import type { Species } from './species';

/** Every gas the program knows by itself. A new one needs its file, its line here, and its reference rows. */
export const speciesList: readonly Species[] = [
  H2,
  D2,
  He,
  Ne,
  Ar,
  Kr,
  Xe,
  N2,
  O2,
  air,
  CO,
  CO2,
  H2O,
  CH4,
  NH3,
  SF6,
  O3,
  D2O,
  C2H2,
  C2H4,
  C2H6,
  C3H6,
  C3H8,
  nC4H10,
  iC4H10,
  C6H6,
  CH3OH,
  C2H5OH,
  CH3COCH3,
  CH3Cl,
  CH2Cl2,
  CHCl3,
  NO,
  N2O,
  NO2,
  SO2,
  H2S,
  CF4,
  CHF3,
  CH2F2,
  CH3F,
  COS,
  HCl,
  HF,
  HI,
  HCN,
  F2,
  I2,
  Hg,
  BF3,
  AsH3,
  HBr,
  Cl2,
  Br2,
  BCl3,
  NF3,
  SiH4,
  SiF4,
  SiCl4,
  SiH2Cl2,
  PH3,
  GeH4,
  B2H6,
  WF6,
  AlC3H9,
  C2F6,
  cC4F8,
  CCl4,
  C7H8,
  iC3H7OH,
  CH3OCH3,
];

/** A gas by its formula or by one of its common names. */
export function speciesByName(name: string): Species | undefined {
  return byName.get(name);
}

const byName: ReadonlyMap<string, Species> = new Map(
  speciesList.flatMap((species) => [species.formula, ...species.names].map((name) => [name, species])),
);
