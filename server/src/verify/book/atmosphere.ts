import type { Page, ReferenceRow } from '../row';
import { rounded } from '../row';

const source = 'U.S. Standard Atmosphere 1976';

const oldConstants =
  'the standard has the constants of 1969 (k is 2e-5 smaller), and prints temperature and pressure to five digits';

/** Geometric altitude in km, T in K, p in Pa, n in 1/m³, mean speed in m/s, collision frequency in 1/s, mean free path in m. */
const standardAtmosphere: readonly (readonly [number, number, number, string, string, string, string, string])[] = [
  [0, 288.15, 101325, '2.5470e25', '458.94', '6.9189e9', '6.6332e-8', 'table II'],
  [20, 216.65, 5.5293e3, '1.8486e24', '397.95', '4.3543e8', '9.1393e-7', 'table II; from memory'],
  [50, 270.65, 79.779, '2.1351e22', '444.79', '5.6211e6', '7.9130e-5', 'table II; from memory'],
];

const profilePage: Page = {
  title: 'U.S. Standard Atmosphere',
  rows: standardAtmosphere.flatMap(([altitude, T, p, density, speed, frequency, path, place]) =>
    [
      { property: 'number_density', printed: density, unit: '1/m³' },
      { property: 'mean_speed', printed: speed, unit: 'm/s' },
      { property: 'collision_frequency', printed: frequency, unit: '1/s' },
      { property: 'mean_free_path_hard_sphere', printed: path, unit: 'm' },
    ].map((row): ReferenceRow => ({
      ...air(T, p),
      ...row,
      where: `${place}, ${altitude} km`,
      within: rounded(row.printed, 6e-5, oldConstants),
    })),
  ),
};

const groundPage: Page = {
  title: 'U.S. Standard Atmosphere, whole gas',
  rows: [
    {
      ...air(288.15, 101325),
      property: 'sound_speed',
      printed: '340.29',
      unit: 'm/s',
      where: 'table III, 0 km',
      within: { tolerance: 0.1, because: 'the standard takes γ = 1.4; the heat capacity of air makes it 1.4004' },
    },
    {
      ...air(288.15, 101325),
      property: 'density',
      printed: '1.2250',
      unit: 'kg/m³',
      where: 'table I, 0 km',
    },
    {
      ...air(288.15, 101325),
      property: 'viscosity',
      printed: '1.7894e-5',
      unit: 'Pa·s',
      where: 'table III, 0 km, by Sutherland’s formula',
      within: { tolerance: 1.8e-7, because: 'an older formula; the viscosity of air states 1 %' },
    },
    {
      ...air(288.15, 101325),
      property: 'thermal_conductivity',
      printed: '2.5326e-2',
      unit: 'W/(m·K)',
      where: 'table III, 0 km; from memory',
      within: { tolerance: 5e-4, because: 'an older formula; the conductivity of air states 2 %' },
    },
  ],
};

export const atmospherePages: readonly Page[] = [profilePage, groundPage];

/** The standard reckons with one molecule of 28.9644 g/mol and 3.65 Å. */
function air(temperature: number, pressure: number) {
  const reckonedWith = { molarMass: 28.9644e-3, collisionDiameter: 3.65e-10 };
  return { gas: 'air', temperature, pressure, reckonedWith, source };
}
