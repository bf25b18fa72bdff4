/**
 * The tree of a gas-state file. A node stores syntax only: no resolved names, no values.
 * Spans count UTF-16 units from the start of the declaration, so that a tree survives edits elsewhere in the file.
 */

export interface Span {
  readonly start: number;
  readonly end: number;
}

interface At {
  readonly span: Span;
}

// --- Leaves -----------------------------------------------------------------------------------------------------

export interface Name extends At {
  readonly kind: 'name';
  readonly text: string;
}

/** What should stand here and does not. Its span has no width. */
export interface Hole extends At {
  readonly kind: 'hole';
  /** A phrase with its article, as in "expected a name". */
  readonly expected: string;
}

/** Text that fits nowhere; never empty. */
export interface Junk extends At {
  readonly kind: 'junk';
  readonly text: string;
}

export interface TextLiteral extends At {
  readonly kind: 'text';
  readonly text: string;
  /** False when the closing quote is missing. */
  readonly closed: boolean;
}

export interface UnitText extends At {
  readonly kind: 'unit';
  readonly text: string;
}

export interface NumberLiteral extends At {
  readonly kind: 'number';
  readonly value: number;
  /** The digits as written, without the unit. */
  readonly text: string;
  readonly digits: Span;
  readonly unit?: UnitText;
  /** The decimal sign was a comma. */
  readonly comma: boolean;
}

// --- Expressions ------------------------------------------------------------------------------------------------

export interface Member extends At {
  readonly kind: 'member';
  readonly object: Expression;
  readonly property: Name | Hole;
}

export interface Call extends At {
  readonly kind: 'call';
  readonly callee: Name;
  readonly arguments: readonly Expression[];
  readonly closed: boolean;
}

export interface Group extends At {
  readonly kind: 'group';
  readonly inner: Expression;
  readonly closed: boolean;
}

export type UnaryOperator = '-' | '+' | 'not';
export interface Unary extends At {
  readonly kind: 'unary';
  readonly operator: UnaryOperator;
  readonly operand: Expression;
}

export type ArithmeticOperator = '+' | '-' | '*' | '/' | '^';
export type ComparisonOperator = '<' | '<=' | '>' | '>=' | '==' | '!=';
export type LogicOperator = 'and' | 'or';

export interface Arithmetic extends At {
  readonly kind: 'arithmetic';
  readonly operator: ArithmeticOperator;
  readonly left: Expression;
  readonly right: Expression;
}

export interface Comparison extends At {
  readonly kind: 'comparison';
  readonly operator: ComparisonOperator;
  readonly left: Expression;
  readonly right: Expression;
}

export interface Logic extends At {
  readonly kind: 'logic';
  readonly operator: LogicOperator;
  readonly left: Expression;
  readonly right: Expression;
}

/** `value ± halfWidth` */
export interface Tolerance extends At {
  readonly kind: 'tolerance';
  readonly value: Expression;
  readonly halfWidth: Expression;
}

/** `value in UNIT` */
export interface Conversion extends At {
  readonly kind: 'conversion';
  readonly value: Expression;
  readonly unit: UnitText | Hole;
}

/** `left is word` */
export interface Is extends At {
  readonly kind: 'is';
  readonly left: Expression;
  readonly negated: boolean;
  readonly right: Name | Hole;
}

/** `value within halfWidth of target` */
export interface Within extends At {
  readonly kind: 'within';
  readonly value: Expression;
  readonly halfWidth: Expression;
  readonly target: Expression;
}

/** `value between low and high` */
export interface Between extends At {
  readonly kind: 'between';
  readonly value: Expression;
  readonly low: Expression;
  readonly high: Expression;
}

export interface TableRow extends At {
  readonly kind: 'row';
  readonly at: Expression;
  readonly value: Expression;
}

/** `[x: y, …]` */
export interface Table extends At {
  readonly kind: 'table';
  readonly rows: readonly TableRow[];
  readonly closed: boolean;
}

/** One species or gas with its share; without an amount it stands alone. */
export interface MixturePart extends At {
  readonly kind: 'part';
  readonly name: Name | Hole;
  readonly amount?: Expression | Balance;
}

export interface Balance extends At {
  readonly kind: 'balance';
}

/** `Ar 95 % + O2 5 %`, or a single name. */
export interface Mixture extends At {
  readonly kind: 'mixture';
  readonly parts: readonly MixturePart[];
}

export type Expression =
  | NumberLiteral
  | TextLiteral
  | Name
  | Member
  | Call
  | Group
  | Unary
  | Arithmetic
  | Comparison
  | Logic
  | Tolerance
  | Conversion
  | Is
  | Within
  | Between
  | Table
  | Hole;

// --- Routes: passages in series and in parallel -----------------------------------------------------------------

export interface Series extends At {
  readonly kind: 'series';
  readonly stages: readonly Route[];
}

export interface Parallel extends At {
  readonly kind: 'parallel';
  readonly branches: readonly Route[];
}

export type Route = Name | Series | Parallel | Hole;

// --- Blocks -----------------------------------------------------------------------------------------------------

/** `key = value` */
export interface Entry extends At {
  readonly kind: 'entry';
  readonly key: Name;
  readonly value: Expression | Mixture;
  readonly rest?: Junk;
}

/** `a -> b` in a system. */
export interface Connection extends At {
  readonly kind: 'connection';
  readonly route: Route;
  readonly rest?: Junk;
}

/** `vary path = from .. to in 25 log steps` */
export interface Vary extends At {
  readonly kind: 'vary';
  readonly target: Expression;
  readonly from: Expression;
  readonly to: Expression;
  readonly count: NumberLiteral | Hole;
  readonly spacing: 'linear' | 'log';
  readonly rest?: Junk;
}

/** `show a, b` */
export interface Show extends At {
  readonly kind: 'show';
  readonly figures: readonly Expression[];
  readonly rest?: Junk;
}

export type BlockItem = Entry | Connection | Vary | Show | Junk;

export interface Block extends At {
  readonly kind: 'block';
  readonly items: readonly BlockItem[];
  readonly closed: boolean;
}

// --- Declarations -----------------------------------------------------------------------------------------------

interface Declared extends At {
  /** The word that opens the declaration. */
  readonly word: Name;
  /** What follows the declaration on its line and belongs to nothing. */
  readonly rest?: Junk;
}

export interface LetDeclaration extends Declared {
  readonly kind: 'let';
  readonly name: Name | Hole;
  readonly value: Expression;
}

export interface UseDeclaration extends Declared {
  readonly kind: 'use';
  readonly path: TextLiteral | Hole;
}

export interface DisplayItem extends At {
  readonly kind: 'display-item';
  readonly quantity: Name | Hole;
  readonly unit: UnitText | Hole;
}

export interface DisplayDeclaration extends Declared {
  readonly kind: 'display';
  readonly items: readonly DisplayItem[];
}

export interface AssumeDeclaration extends Declared {
  readonly kind: 'assume';
  readonly name: Name | Hole;
  readonly value: Expression;
}

export interface GasDeclaration extends Declared {
  readonly kind: 'gas';
  readonly name: Name | Hole;
  readonly mixture: Mixture | Hole;
}

export interface RequireDeclaration extends Declared {
  readonly kind: 'require';
  readonly strength: 'require' | 'prefer';
  readonly condition: Expression;
  readonly because?: TextLiteral | Hole;
}

export interface LineDeclaration extends Declared {
  readonly kind: 'line';
  readonly name: Name | Hole;
  readonly route: Route;
}

export interface SiteDeclaration extends Declared {
  readonly kind: 'site';
  readonly name: Name | Hole;
  readonly state: Expression;
  readonly relation: Name | Hole;
  readonly geometry: Expression;
}

/** `of MIXTURE`, `from STATE`, `through LINE`, `across GEOMETRY` */
export interface Head extends At {
  readonly kind: 'head';
  readonly relation: Name;
  readonly target: Mixture | Route;
}

/** Any declaration of the form `kind NAME … { … }`; which kinds there are is not the syntax's business. */
export interface ThingDeclaration extends Declared {
  readonly kind: 'thing';
  readonly name: Name | Hole;
  readonly head?: Head;
  readonly block?: Block;
}

/** A line that opens no declaration. */
export interface StrayDeclaration extends Declared {
  readonly kind: 'stray';
}

export type Declaration =
  | LetDeclaration
  | UseDeclaration
  | DisplayDeclaration
  | AssumeDeclaration
  | GasDeclaration
  | RequireDeclaration
  | LineDeclaration
  | SiteDeclaration
  | ThingDeclaration
  | StrayDeclaration;

/** A declaration at its place in the file. */
export interface Item {
  /** Where the declaration starts in the file. */
  readonly offset: number;
  /** The declaration's own text: with its tree the whole content of the declaration. */
  readonly text: string;
  readonly declaration: Declaration;
  /** The `##` lines directly above, without their marks. */
  readonly doc?: string;
}

export interface File {
  readonly text: string;
  readonly items: readonly Item[];
}

/** Every node that can stand in a path from the file to a position. */
export type Node =
  | Declaration
  | Block
  | BlockItem
  | Expression
  | Mixture
  | MixturePart
  | Balance
  | Route
  | Head
  | DisplayItem
  | TableRow
  | UnitText;
