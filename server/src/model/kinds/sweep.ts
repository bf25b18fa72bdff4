import type { Kind } from './kind';

export const sweep: Kind = {
  word: 'sweep',
  title: 'a sweep',
  meaning: 'a study over one or two inputs',
  role: 'study',
  heads: [],
  keys: [],
  needs: [],
  hint: [],
  later: [],
  snippet:
    'sweep ${1:name} {\n  vary ${2:passage}.bore = ${3:16 mm} .. ${4:100 mm} in ${5:25} log steps\n  show ${6:result}\n}',
};
