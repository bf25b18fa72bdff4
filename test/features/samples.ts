import { readdirSync, readFileSync } from 'node:fs';

/** A text with every form of the language, invented. */
export const everyForm = `use "shop-gases.gas"
display pressure in mbar, throughput in mbar·L/s
assume standard_temperature = 0 °C

let room = 21 °C ± 2 K
let twice = 2 * (max(room, 280 K) - 3 K)   # of nothing
let power = 2^-1 + 5 % in ppm

species custom { molar_mass = 30 g/mol, hazards = toxic }
gas purge = Ar 95 % + O2 5 %
gas bottle = He 250 ppm + N2 balance   # nearly

## Gas left in the lock
## when the valve closes.
state residual of N2 {
  pressure    = 3e-3 mbar ± 10 %
  temperature = room
}
state warm from residual { temperature = 350 K }

tube foreline {
  bore = 40 mm
  length = 1.8 m
}
bend elbow { bore = 40 mm, angle = 90°, radius = 60 mm }
line roughing = foreline -> (elbow & foreline)

site in_foreline = residual in foreline
require in_foreline.regime is molecular because "particles must not be carried back"
prefer residual.mean_free_path > 1 cm or not (residual.N2.mole_fraction between 0 and 1)

flow bleed through roughing {
  upstream = residual
  downstream = 1e-3 mbar
  regime = molecular
}
chamber lock { volume = 14 L, wall_area = 1.1 m², outgassing = [H2O: 2e-8 mbar·L/(s·cm²), N2: 1e-9 mbar·L/(s·cm²)] }
pump dry {
  speed = [
    1e-2 mbar: 2 L/s,  # low
    1000 mbar: 9 L/s,  # high
  ]
}
inlet leak of air { throughput = 1e-6 mbar·L/s }
system lock_line {
  leak -> lock
  lock -> roughing -> dry
}
pumpdown evacuate of lock_line { chamber = lock, from = 1 atm, to = 5e-2 mbar }
require lock_line.lock.pressure < 1 mbar
let thermal = const.k * room

sweep bore_choice {
  vary foreline.bore = 16 mm .. 100 mm in 25 log steps
  show evacuate.time, bleed.conductance
}
`;

function fromFolder(folder: string): readonly (readonly [string, string])[] {
  return readdirSync(folder)
    .filter((name) => name.endsWith('.gas'))
    .map((name) => [name, readFileSync(`${folder}/${name}`, 'utf8')] as const);
}

/** Texts that users would write, by their name. */
export const samples: readonly (readonly [string, string])[] = [
  ['every form', everyForm],
  ...fromFolder('client/starters'),
  ...fromFolder('test/editor/workspace'),
];
