/** A passage or several, as molecules meet it: its openings, and the area from which every molecule gets through. */
export interface Stage {
  /** m² */
  readonly inlet: number;
  readonly outlet: number;
  /** Transmission probability times the area of the opening that it counts from; the same in both directions. */
  readonly through: number;
}

/** The expected error of each junction of stages in series, relative, 95 %, and the most that several bring. */
const junctionError = 0.05;
const mostError = 0.1;

/**
 * Stages in series by the addition of what holds molecules back (Oatley 1957), with the opening into the wider of two stages
 * counted once where their areas differ (Füstöss & Tóth 1972):
 *
 *   1/(A W) = Σ 1/(A W)ᵢ − Σ 1/max(Aᵢ, Aᵢ₊₁) .
 *
 * It takes the gas as mixed again at every junction, which beaming upsets by 5 to 10 %.
 */
export function inSeries(stages: readonly Stage[]): Stage {
  let resistance = 0;
  stages.forEach(({ inlet, through }, i) => {
    const before = stages[i - 1];
    resistance += 1 / through - (before ? 1 / Math.max(before.outlet, inlet) : 0);
  });
  return { inlet: stages[0]?.inlet ?? 0, outlet: stages.at(-1)?.outlet ?? 0, through: 1 / resistance };
}

/** Stages side by side. */
export function inParallel(stages: readonly Stage[]): Stage {
  const sum = (area: (stage: Stage) => number): number => stages.reduce((total, stage) => total + area(stage), 0);
  return {
    inlet: sum(({ inlet }) => inlet),
    outlet: sum(({ outlet }) => outlet),
    through: sum(({ through }) => through),
  };
}

export function seriesError(junctions: number): number {
  return Math.min(junctions * junctionError, mostError);
}
