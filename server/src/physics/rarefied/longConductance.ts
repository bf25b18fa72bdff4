import type { Outcome } from '../outcome';
import { success } from '../outcome';
import type { SourceId } from '../sources';
import type { Section } from './kineticSolution';
import { kineticCoefficients } from './kineticCoefficients';
import { viscousPart } from './tables/kineticTable';

/** Where the length that the ends seem to add at the viscous end comes from. */
export const endSources: { readonly [section in Section]: SourceId } = {
  tube: 'Dagan 1982',
  plates: 'Hasimoto 1958',
};

/** A tube or a slit with a gas in it. Lengths in m, speeds in m/s. */
export interface GasInPassage {
  readonly section: Section;
  /** a: the radius of the tube, or the gap of the slit. */
  readonly size: number;
  /** Of a slit: its width across the flow. */
  readonly width: number;
  readonly length: number;
  readonly accommodation: number;
  /** δ = a p/(η v₀) */
  readonly rarefaction: number;
  /** v₀ = √(2p/ρ), which belongs to the mean molar mass. */
  readonly thermalSpeed: number;
  /** c̄, the mean over molecules: of a mixture a little more than follows from v₀. */
  readonly meanSpeed: number;
  /** W: the free-molecular transmission probability of the passage with its ends, if it is known. */
  readonly transmission?: number;
}

export interface Conductance {
  /** m³/s, for small differences of pressure. */
  readonly conductance: number;
  /** The relative error, 95 %, by what is not known of the ends. */
  readonly endsError: number;
}

/**
 * The conductance q/Δp of a passage around one mean pressure. Far from the ends it follows from the mass flow
 * (area)(p/v₀) G_P (a/p) Δp/L and q = ṁ v₀²/2:
 *   tube  C = π a³ v₀ G_P/(2L),  which is π a⁴ p/(8 η L) at the viscous end and (2π/3)(a³/L) c̄ at the molecular one;
 *   slit  C = b a² v₀ G_P/(2L),  which is b a³ p/(12 η L) at the viscous end.
 * The viscous part of G_P counts with v₀, the rest with √π c̄/2, so that both ends of the range are right for a mixture too.
 * The ends of the passage lengthen it.
 */
export function longConductance(gas: GasInPassage): Outcome<Conductance> {
  const coefficients = kineticCoefficients(gas.section, gas.rarefaction, gas.accommodation);
  if (!coefficients.ok) return coefficients;
  const { beyondViscous } = coefficients.value;
  if (gas.transmission === undefined) return success(withoutEnds(gas, beyondViscous));
  const { transmission } = gas;
  return success(
    gas.section === 'tube' ? tube(gas, beyondViscous, transmission) : slit(gas, beyondViscous, transmission),
  );
}

function endless(gas: GasInPassage, beyondViscous: number): number {
  const { section, size, width, length, rarefaction, thermalSpeed, meanSpeed } = gas;
  const shape = section === 'tube' ? (Math.PI * size ** 3) / (2 * length) : (width * size ** 2) / (2 * length);
  const molecular = (Math.sqrt(Math.PI) / 2) * meanSpeed * beyondViscous;
  return shape * (thermalSpeed * viscousPart(section, rarefaction) + molecular);
}

/** The ends would add a length of some sizes at most: 8/3 of the radius for a long tube at the molecular end. */
function withoutEnds(gas: GasInPassage, beyondViscous: number): Conductance {
  const added = (8 / 3) * gas.size;
  return { conductance: endless(gas, beyondViscous), endsError: added / (gas.length + added) };
}

/**
 * The tube seems longer: at the molecular end by what makes the conductance W A c̄/4, at the viscous one by 3π/8 of the radius
 * (Z. Dagan, S. Weinbaum, R. Pfeffer, J. Fluid Mech. 115, 505 (1982)); between them by a mean, weighted by δ.
 */
function tube(gas: GasInPassage, beyondViscous: number, transmission: number): Conductance {
  const { size, length, meanSpeed, rarefaction, accommodation } = gas;
  const molecularFar = ((2 * Math.PI) / 3) * (size ** 3 / length) * meanSpeed * ((2 - accommodation) / accommodation);
  const molecular = (transmission * Math.PI * size * size * meanSpeed) / 4;
  const longer = length * (molecularFar / molecular - 1);
  const added = (longer + rarefaction * ((3 * Math.PI) / 8) * size) / (1 + rarefaction);
  return lengthened(endless(gas, beyondViscous), length / (length + added), rarefaction);
}

/**
 * Between endless plates molecules that fly almost along them get ever further the rarer the gas is; in a slit the ends stop
 * them as collisions would. So as many collisions are added to δ in the slip part as make the molecular conductance W A c̄/4.
 * At the viscous end the slit seems longer by 8/(3π) of its gap, as two halves of a slit in a thin wall resist
 * (H. Hasimoto, J. Phys. Soc. Jpn. 13, 633 (1958)).
 */
function slit(gas: GasInPassage, beyondViscous: number, transmission: number): Conductance {
  const { size, length, rarefaction, accommodation } = gas;
  const slip = (delta: number) => {
    const outcome = kineticCoefficients('plates', delta, accommodation);
    return outcome.ok ? outcome.value.beyondViscous : NaN;
  };
  const wanted = (transmission * length) / (Math.sqrt(Math.PI) * size);
  const stops = fallingRoot(slip, wanted, MOST_STOPS);
  // In a short slit no number of collisions is enough; what is left is a plain factor.
  const shared = slip(rarefaction + stops) * Math.min(1, wanted / slip(stops));
  const added = ((8 / (3 * Math.PI)) * size * rarefaction) / (1 + rarefaction);
  const far = endless(gas, beyondViscous);
  return lengthened(far, (endless(gas, shared) * length) / ((length + added) * far), rarefaction);
}

/** The stops at the ends count as so many collisions at most. */
const MOST_STOPS = 5;

/** What the ends are is known at both limits of δ, and interpolated between them. */
function lengthened(far: number, share: number, delta: number): Conductance {
  const between = delta / (1 + delta) ** 2;
  return { conductance: far * share, endsError: Math.abs(1 - share) * (between + 0.05 * (delta / (1 + delta))) };
}

/** Where a falling function of δ has a value, below a highest δ; by halving in ln δ. */
function fallingRoot(f: (delta: number) => number, value: number, highest: number): number {
  let [low, high] = [Math.log(1e-12), Math.log(highest)];
  for (let step = 0; step < 60; step += 1) {
    const middle = (low + high) / 2;
    if (f(Math.exp(middle)) > value) low = middle;
    else high = middle;
  }
  return Math.exp(high);
}
