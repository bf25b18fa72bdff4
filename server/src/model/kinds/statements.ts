/** The declarations that the grammar knows by their word, for hovers and completion. The kinds with a block are in list.ts. */
export interface Statement {
  readonly word: string;
  readonly meaning: string;
  readonly snippet: string;
}

export const statements: readonly Statement[] = [
  { word: 'let', meaning: 'names a value', snippet: 'let ${1:name} = ${2:1 mbar}' },
  { word: 'use', meaning: 'brings in all names of another file', snippet: 'use "${1:file.gas}"' },
  {
    word: 'display',
    meaning: 'says in which units this file shows its results',
    snippet: 'display ${1:pressure} in ${2:mbar}',
  },
  {
    word: 'assume',
    meaning: 'sets a reference condition',
    snippet: 'assume ${1:ambient_temperature} = ${2:20 °C}',
  },
  {
    word: 'gas',
    meaning: 'names a mixture by fractions, partial pressures, flows or masses',
    snippet: 'gas ${1:name} = ${2:Ar} ${3:95 %} + ${4:O2} balance',
  },
  {
    word: 'line',
    meaning: 'passages in series (->) and in parallel (&)',
    snippet: 'line ${1:name} = ${2:a} -> ${3:b}',
  },
  { word: 'site', meaning: 'a gas at rest in a place', snippet: 'site ${1:name} = ${2:state} in ${3:geometry}' },
  {
    word: 'require',
    meaning: 'what the design must satisfy',
    snippet: 'require ${1:a} >= ${2:b} because "${3:reason}"',
  },
  {
    word: 'prefer',
    meaning: 'what the design should satisfy',
    snippet: 'prefer ${1:a} >= ${2:b} because "${3:reason}"',
  },
];
