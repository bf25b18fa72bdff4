import { constantNamed } from '../quantities/constants';

/** The constants the engine needs, as plain SI numbers. Their sources stand in the table of constants. */

/** Boltzmann constant, J/K. */
export const k = constantNamed('k').value;

/** Avogadro constant, 1/mol. */
export const N_A = constantNamed('N_A').value;

/** Planck constant, J s. */
export const h = constantNamed('h').value;

/** Speed of light in vacuum, m/s. */
export const c = constantNamed('c').value;

/** Permittivity of vacuum, F/m. */
export const epsilon0 = constantNamed('eps_0').value;

/** Molar gas constant, J/(mol K). */
export const R = constantNamed('R').value;
