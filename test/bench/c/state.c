/*
 * The formulas of a gas state in plain C, to measure ours against: see ../againstC.ts.
 * `state pure COUNT` works out the figures of nitrogen, `state mixture COUNT` the viscosity of five gases, at COUNT states.
 * Prints the seconds of the processor, then the sum of each figure over all states.
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

static const double pi = 3.14159265358979323846;
static const double k = 1.380649e-23, NA = 6.02214076e23, R = 8.31446261815324, h = 6.62607015e-34;
static const double site_density = 1e19;

static double temperature(long i) { return 280 + 1700 * (double)(i * 7919 % 100003) / 100003; }
static double pressure(long i) { return 1 + (double)(i % 1000); }

/* C √T / exp Σ bᵢ (ln T/θ)ⁱ */
typedef struct {
  double prefactor, theta, b[5];
} Correlation;

#define LEMMON(M, sigma, theta) \
  { 1e-6 * 0.0266958 * (M) / ((sigma) * (sigma)), theta, {0.431, -0.4623, 0.08406, 0.005341, -0.00331} }

/* The square roots of the molar masses are constants of the correlations. */
static const Correlation nitrogen = LEMMON(5.292776209136374, 0.3656, 98.94);
static const Correlation oxygen = LEMMON(5.656748182480815, 0.3428, 118.5);
static const Correlation argon = LEMMON(6.320443022447082, 0.335, 143.2);
static const Correlation xenon = {
    1e-6 * 0.0266958 * 11.458315757562278 / (0.3885 * 0.3885), 274, {0.46649, -0.57015, 0.19164, -0.03708, 0.00241}};

static double correlated(const Correlation *c, double T) {
  double x = log(T / c->theta);
  return c->prefactor * sqrt(T) / exp(c->b[0] + x * (c->b[1] + x * (c->b[2] + x * (c->b[3] + x * c->b[4]))));
}

static double krypton(double T) {
  if (T <= 1000) return 1e-7 * exp(0.58597795 * log(T) + (-129.24832 + 4749.5759 / T) / T + 2.579365);
  return 1e-7 * exp(0.68985845 * log(T) + (56.296306 - 36082.6 / T) / T + 1.7170715);
}

static double heat_capacity(double T) {
  static const double cold[7] = {22103.71497,    -381.846182,    6.08273836,    -0.00853091441,
                                 1.384646189e-5, -9.62579362e-9, 2.519705809e-12};
  static const double warm[7] = {587712.406,     -2239.249073,     6.06694922,    -0.00061396855,
                                 1.491806679e-7, -1.923105485e-11, 1.061954386e-15};
  const double *a = T <= 1000 ? cold : warm;
  return R * ((a[0] / T + a[1]) / T + a[2] + T * (a[3] + T * (a[4] + T * (a[5] + T * a[6]))));
}

enum { FIGURES = 19 };

static void pure_state(double T, double p, double *sums) {
  const double M = 28.014e-3, m = M / NA;
  double n = p / (k * T), rho = n * m;
  double speed = sqrt(8 * k * T / (pi * m));
  double eta = correlated(&nitrogen, T);
  double d = sqrt(0.3125 * sqrt(m * k * T) / (sqrt(pi) * eta));
  double path = 1 / (n * pi * d * d * sqrt(2.0));
  double hits = n * speed / 4;
  double cp = heat_capacity(T), gamma = cp / (cp - R);
  const double figures[FIGURES] = {
      n,
      rho,
      speed,
      sqrt(3 * k * T / m),
      sqrt(2 * k * T / m),
      1.5 * k * T,
      eta / p * sqrt(pi * R * T / (2 * M)),
      path,
      d,
      speed / path,
      1 / cbrt(n),
      hits,
      m * hits,
      site_density / hits,
      h / sqrt(2 * pi * m * k * T),
      eta,
      cp,
      gamma,
      sqrt(gamma * R * T / M),
  };
  for (int i = 0; i < FIGURES; i++) sums[i] += figures[i];
}

enum { SPECIES = 5 };

static const double molar_mass[SPECIES] = {28.014e-3, 31.998e-3, 39.95e-3, 83.798e-3, 131.293e-3};
static const double sigma[SPECIES] = {3.798e-10, 3.467e-10, 3.542e-10, 3.655e-10, 4.047e-10};
static const double depth[SPECIES] = {71.4, 106.7, 93.3, 178.9, 231.0};
static const double x[SPECIES] = {0.4, 0.3, 0.1, 0.1, 0.1};

static double omega22(double t) {
  return 1.16145 * pow(t, -0.14874) + 0.52487 * exp(-0.7732 * t) + 2.16178 * exp(-2.43787 * t);
}

static double omega11(double t) {
  return 1.06036 * pow(t, -0.1561) + 0.193 * exp(-0.47635 * t) + 1.03587 * exp(-1.52996 * t) +
         1.76474 * exp(-3.89411 * t);
}

static double potential_viscosity(double diameter, double well, double M, double T) {
  return 0.3125 * sqrt(M / NA * k * T) / (sqrt(pi) * diameter * diameter) / omega22(T / well);
}

static double mixture_viscosity(double T) {
  double own[SPECIES] = {correlated(&nitrogen, T), correlated(&oxygen, T), correlated(&argon, T), krypton(T),
                         correlated(&xenon, T)};
  double scale[SPECIES], pair[SPECIES][SPECIES], a_star[SPECIES][SPECIES], rows[SPECIES][SPECIES + 1];
  for (int i = 0; i < SPECIES; i++) scale[i] = own[i] / potential_viscosity(sigma[i], depth[i], molar_mass[i], T);
  for (int i = 0; i < SPECIES; i++) {
    for (int j = 0; j < i; j++) {
      double well = sqrt(depth[i] * depth[j]), diameter = (sigma[i] + sigma[j]) / 2;
      double reduced = molar_mass[i] * molar_mass[j] / (molar_mass[i] + molar_mass[j]);
      a_star[i][j] = a_star[j][i] = omega22(T / well) / omega11(T / well);
      pair[i][j] = pair[j][i] = sqrt(scale[i] * scale[j]) * potential_viscosity(diameter, well, 2 * reduced, T);
    }
  }
  for (int i = 0; i < SPECIES; i++) {
    double diagonal = x[i] / own[i];
    for (int j = 0; j < SPECIES; j++) {
      if (j == i) continue;
      double mi = molar_mass[i], mj = molar_mass[j];
      double weight = 2 * x[j] / pair[i][j] * (mi * mj / ((mi + mj) * (mi + mj)));
      double exchange = 5 / (3 * a_star[i][j]);
      diagonal += weight * (exchange + mj / mi);
      rows[i][j] = -weight * (exchange - 1);
    }
    rows[i][i] = diagonal;
    rows[i][SPECIES] = 1;
  }
  for (int pivot = 0; pivot < SPECIES; pivot++) {
    double inverse = 1 / rows[pivot][pivot];
    for (int column = pivot; column <= SPECIES; column++) rows[pivot][column] *= inverse;
    for (int row = 0; row < SPECIES; row++) {
      if (row == pivot) continue;
      double factor = rows[row][pivot];
      for (int column = pivot; column <= SPECIES; column++) rows[row][column] -= factor * rows[pivot][column];
    }
  }
  double viscosity = 0;
  for (int i = 0; i < SPECIES; i++) viscosity += x[i] * rows[i][SPECIES];
  return viscosity;
}

int main(int argc, char **argv) {
  if (argc != 3) return 2;
  int pure = strcmp(argv[1], "pure") == 0;
  long count = atol(argv[2]);
  double sums[FIGURES] = {0};
  clock_t start = clock();
  for (long i = 0; i < count; i++) {
    if (pure)
      pure_state(temperature(i), pressure(i), sums);
    else
      sums[0] += mixture_viscosity(temperature(i));
  }
  printf("%.17g\n", (double)(clock() - start) / CLOCKS_PER_SEC);
  for (int i = 0; i < (pure ? FIGURES : 1); i++) printf("%.17g\n", sums[i]);
  return 0;
}
