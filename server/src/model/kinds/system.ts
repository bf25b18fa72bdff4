import type { Kind } from './kind';

export const system: Kind = {
  word: 'system',
  title: 'a system',
  meaning: 'a network of inlets, chambers, lines and pumps',
  role: 'study',
  heads: [],
  keys: [],
  needs: [],
  hint: [],
  later: [],
  snippet: 'system ${1:name} {\n  ${2:inlet} -> ${3:chamber}\n  ${3:chamber} -> ${4:line} -> ${5:pump}\n}',
};
