/** A limit of a range in words: `273.2 K`, and `70 K` rather than `70.00 K`, since it is a round number and no measurement. */
export function kelvins(value: number): string {
  return `${rounded(value)} K`;
}

/** `70 to 2000 K` */
export function kelvinRange({ low, high }: { readonly low: number; readonly high: number }): string {
  return `${rounded(low)} to ${kelvins(high)}`;
}

function rounded(value: number): string {
  return String(Number(value.toPrecision(4)));
}
