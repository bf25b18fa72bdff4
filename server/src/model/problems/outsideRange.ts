import { defineProblem, either } from './problem';

export const outsideRange = defineProblem<{
  /** With its article; several that share the range. */
  what: string | readonly string[];
  value: string;
  low: string;
  high: string;
}>({
  code: 'outside-range',
  severity: 'warning',
  title: 'A method outside its range',
  doc: 'The published range of the correlation or table does not cover this value. What is shown is an extrapolation and may be wrong by more than its tolerance says.',
  message: ({ what, value, low, high }) => {
    const several = typeof what !== 'string' && what.length > 1;
    const holds = `${typeof what === 'string' ? what : either(what, 'and')} ${several ? 'hold' : 'holds'}`;
    return `${holds} from ${low} to ${high}; at ${value} ${several ? 'they are' : 'it is'} extrapolated`;
  },
});
