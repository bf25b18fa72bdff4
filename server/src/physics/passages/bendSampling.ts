import { randomStream } from '../numerics/random';

/** A bent round tube of radius 1: straight, turning, straight. With the radius 0 two straight tubes meet in a mitre. */
export interface BentTube {
  /** How far it turns, rad. */
  readonly angle: number;
  /** Of the centre line: 0, or at least 1. */
  readonly radius: number;
  /** The straight lengths before and after the turn; of a mitre, to where the centre lines meet. */
  readonly inlet: number;
  readonly outlet: number;
}

export interface Sampled {
  readonly value: number;
  /** One standard deviation of the mean. */
  readonly deviation: number;
}

/**
 * The free-molecular transmission probability of a bent tube with diffuse walls, by following molecules from wall to wall
 * (test-particle Monte Carlo, Davis 1960). The same seed gives the same value.
 */
export function sampleBend(tube: BentTube, molecules: number, seed: number): Sampled {
  const random = randomStream(seed);
  const surroundings = tube.radius === 0 ? mitre(tube) : smooth(tube);
  let through = 0;
  for (let molecule = 0; molecule < molecules; molecule++) if (passes(surroundings, random)) through++;
  const value = through / molecules;
  return { value, deviation: Math.sqrt((value * (1 - value)) / molecules) };
}

type Vector = readonly [number, number, number];

/** What surrounds a place in the tube. The centre line begins at the origin along x and turns towards y. */
interface Place {
  readonly place: 'inside' | 'before' | 'behind';
  /** How far one can go in any direction without leaving the tube or passing from one straight part of a mitre to the other. */
  readonly free: number;
  /** How far the wall is. */
  readonly wall: number;
  /** From the place towards the nearest point of the centre line. */
  readonly inwards: Vector;
}

type Surroundings = (at: Vector) => Place;

/** Starts evenly over the inlet and goes on until an end is passed. */
function passes(surroundings: Surroundings, random: () => number): boolean {
  const r = Math.sqrt(random());
  const turn = 2 * Math.PI * random();
  let at: Vector = [0, r * Math.cos(turn), r * Math.sin(turn)];
  let direction = diffuse([1, 0, 0], random);
  // No chord of the section is shorter than the cosine that it starts with, which leads off the wall.
  let here = surroundings(at);
  for (;;) {
    if (here.place !== 'inside') return here.place === 'behind';
    if (here.wall < TOUCHING) {
      direction = diffuse(here.inwards, random);
      const [x, y, z] = here.inwards;
      at = moved(at, direction, x * direction[0] + y * direction[1] + z * direction[2]);
    } else {
      at = moved(at, direction, here.free);
    }
    here = surroundings(at);
  }
}

/** In radii; a molecule so near the wall has met it. */
const TOUCHING = 1e-6;

/** A direction by Lambert’s cosine law about a normal. */
function diffuse([x, y, z]: Vector, random: () => number): Vector {
  const sine = Math.sqrt(random());
  const cosine = Math.sqrt(1 - sine * sine);
  const turn = 2 * Math.PI * random();
  const [a, b] = [sine * Math.cos(turn), sine * Math.sin(turn)];
  // Two directions across the normal (Duff et al. 2017).
  const sign = z < 0 ? -1 : 1;
  const p = -1 / (sign + z);
  const q = x * y * p;
  return [
    a * (1 + sign * x * x * p) + b * q + cosine * x,
    a * sign * q + b * (sign + y * y * p) + cosine * y,
    -a * sign * x - b * y + cosine * z,
  ];
}

function moved([x, y, z]: Vector, [dx, dy, dz]: Vector, by: number): Vector {
  return [x + dx * by, y + dy * by, z + dz * by];
}

/** The nearest of three pieces of the centre line counts; the straight ones go on beyond the ends, which only ends can see. */
function smooth({ angle, radius, inlet, outlet }: BentTube): Surroundings {
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  return ([x, y, z]) => {
    const [fromCentreX, fromCentreY] = [x - inlet, y - radius];
    const turned = Math.atan2(fromCentreX, -fromCentreY);
    // Within the turn, or on a straight part: of the two, the nearer one.
    if (turned >= 0 && turned <= angle) {
      const fromAxis = Math.hypot(fromCentreX, fromCentreY);
      const offset = (radius - fromAxis) / fromAxis;
      return within(fromCentreX * offset, fromCentreY * offset, -z, 'inside');
    }
    const first = Math.hypot(y, z);
    const [endX, endY] = [inlet + radius * sin, radius * (1 - cos)];
    const along = (x - endX) * cos + (y - endY) * sin;
    const across = (y - endY) * cos - (x - endX) * sin;
    if (x <= inlet && (along < 0 || first < Math.hypot(across, z))) {
      return within(0, -y, -z, x < 0 ? 'before' : 'inside');
    }
    return within(sin * across, -cos * across, -z, along > outlet ? 'behind' : 'inside');
  };
}

/** Two cylinders that meet in the plane that halves the angle between them. */
function mitre({ angle, inlet, outlet }: BentTube): Surroundings {
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  const [normalX, normalY] = [Math.cos(angle / 2), Math.sin(angle / 2)];
  return ([x, y, z]) => {
    const past = (x - inlet) * normalX + y * normalY;
    const along = (x - inlet) * cos + y * sin;
    const across = y * cos - (x - inlet) * sin;
    const here =
      past < 0
        ? within(0, -y, -z, x < 0 ? 'before' : 'inside')
        : within(sin * across, -cos * across, -z, along > outlet ? 'behind' : 'inside');
    return { ...here, free: Math.min(here.free, Math.abs(past) + TOUCHING) };
  };
}

function within(x: number, y: number, z: number, place: Place['place']): Place {
  const distance = Math.hypot(x, y, z);
  const wall = 1 - distance;
  return { place, wall, free: wall, inwards: distance === 0 ? [1, 0, 0] : [x / distance, y / distance, z / distance] };
}
