/**
 * A small expression tree, so that one formula is evaluated, typeset and read out from one place.
 *
 * The tree knows no rendering: the screen walks it into MathML, the sheet into text. Angles are in
 * rad throughout; a symbol says in which unit its value is shown.
 */
export type Expr =
  | { readonly kind: 'num'; readonly value: number; readonly text: string }
  | { readonly kind: 'sym'; readonly id: string }
  | { readonly kind: 'add'; readonly terms: readonly Expr[] }
  | { readonly kind: 'mul'; readonly factors: readonly Expr[] }
  | { readonly kind: 'frac'; readonly over: Expr; readonly under: Expr }
  | { readonly kind: 'pow'; readonly base: Expr; readonly exponent: number }
  | { readonly kind: 'sqrt'; readonly of: Expr }
  | { readonly kind: 'neg'; readonly of: Expr }
  | { readonly kind: 'fn'; readonly name: 'cos' | 'sin' | 'acos'; readonly of: Expr }
  | { readonly kind: 'group'; readonly of: Expr };

export type Values = Readonly<Record<string, number>>;

/** Numbers and symbol names may be given bare: `mul(3, 'n')`. */
export type ExprLike = Expr | number | string;

export function expr(part: ExprLike): Expr {
  if (typeof part === 'string') return { kind: 'sym', id: part };
  if (typeof part === 'number') return num(part);
  return part;
}

export function num(value: number, text = String(value).replace('-', '−')): Expr {
  return { kind: 'num', value, text };
}
export const sym = (id: string): Expr => ({ kind: 'sym', id });
export const add = (...terms: ExprLike[]): Expr => ({ kind: 'add', terms: terms.map(expr) });
export const mul = (...factors: ExprLike[]): Expr => ({ kind: 'mul', factors: factors.map(expr) });
export const frac = (over: ExprLike, under: ExprLike): Expr => ({ kind: 'frac', over: expr(over), under: expr(under) });
export const pow = (base: ExprLike, exponent: number): Expr => ({ kind: 'pow', base: expr(base), exponent });
export const sqrt = (of: ExprLike): Expr => ({ kind: 'sqrt', of: expr(of) });
export const neg = (of: ExprLike): Expr => ({ kind: 'neg', of: expr(of) });
export const fn = (name: 'cos' | 'sin' | 'acos', of: ExprLike): Expr => ({ kind: 'fn', name, of: expr(of) });
/** A sum in brackets. */
export const group = (...terms: ExprLike[]): Expr => {
  const [only] = terms;
  return { kind: 'group', of: terms.length === 1 && only !== undefined ? expr(only) : add(...terms) };
};

/** Exact at right angles, where rounding of π leaves 1e-16. */
const zeroed = (value: number): number => (Math.abs(value) < 1e-15 ? 0 : value);
const functions = {
  cos: (rad: number) => zeroed(Math.cos(rad)),
  sin: (rad: number) => zeroed(Math.sin(rad)),
  acos: Math.acos,
} as const;

/** The value of the tree; an unknown symbol is a broken invariant. */
export function evaluate(tree: Expr, values: Values): number {
  switch (tree.kind) {
    case 'num':
      return tree.value;
    case 'sym': {
      const value = values[tree.id];
      if (value === undefined) throw new Error(`Expected a value for the symbol "${tree.id}", got none`);
      return value;
    }
    case 'add':
      return tree.terms.reduce((sum, term) => sum + evaluate(term, values), 0);
    case 'mul':
      return tree.factors.reduce((product, factor) => product * evaluate(factor, values), 1);
    case 'frac':
      return evaluate(tree.over, values) / evaluate(tree.under, values);
    case 'pow':
      return evaluate(tree.base, values) ** tree.exponent;
    case 'sqrt':
      return Math.sqrt(evaluate(tree.of, values));
    case 'neg':
      return -evaluate(tree.of, values);
    case 'fn':
      return functions[tree.name](evaluate(tree.of, values));
    case 'group':
      return evaluate(tree.of, values);
  }
}

/** The same tree with every symbol replaced through `replace`, such as by its number. */
export function mapSymbols(tree: Expr, replace: (id: string) => Expr): Expr {
  const inner = (part: Expr) => mapSymbols(part, replace);
  switch (tree.kind) {
    case 'num':
      return tree;
    case 'sym':
      return replace(tree.id);
    case 'add':
      return { kind: 'add', terms: tree.terms.map(inner) };
    case 'mul':
      return { kind: 'mul', factors: tree.factors.map(inner) };
    case 'frac':
      return { kind: 'frac', over: inner(tree.over), under: inner(tree.under) };
    case 'pow':
      return { kind: 'pow', base: inner(tree.base), exponent: tree.exponent };
    default:
      return { ...tree, of: inner(tree.of) };
  }
}

/** The identifiers of every symbol in the tree, each once. */
export function symbolsIn(tree: Expr): string[] {
  const found = new Set<string>();
  mapSymbols(tree, (id) => {
    found.add(id);
    return sym(id);
  });
  return [...found];
}
