import type { SourceId } from '../sources';

/** The chance of a molecule that enters a passage to come out at the other end, when molecules meet walls only. */
export interface Transmission {
  readonly value: number;
  readonly method: string;
  readonly sources: readonly SourceId[];
  /** The error of the method, relative, 95 %; its key is the cause that tolerances name. */
  readonly error: { readonly key: string; readonly relative: number };
}

/** The works that the methods rest on. */
export const transmissionSources = {
  integralEquation: ['Clausing 1932', 'Cole 1977'],
  duct: ['Clausing 1932', 'Cole 1979'],
  bend: ['Davis 1960', 'Clausing 1932'],
  plug: ['Mason & Malinauskas 1983'],
  series: ['Oatley 1957', 'Füstöss & Tóth 1972'],
} as const satisfies Readonly<Record<string, readonly SourceId[]>>;
