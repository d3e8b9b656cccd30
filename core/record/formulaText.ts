/** A formula as one line of text: for the sheet, for a screen reader, for a copy into a mail. */
import type { Expr } from './formula';

/** `glyphOf` gives what stands for a symbol: its glyph, or its number and unit. */
export function formulaText(tree: Expr, glyphOf: (id: string) => string): string {
  const inner = (part: Expr) => formulaText(part, glyphOf);
  switch (tree.kind) {
    case 'num':
      return tree.text;
    case 'sym':
      return glyphOf(tree.id);
    case 'add':
      return tree.terms.map((term, index) => signed(term, index, inner)).join('');
    case 'mul':
      return tree.factors.map((factor) => factorText(factor, inner)).join(' · ');
    case 'frac':
      return `${operand(tree.over, inner)} / ${operand(tree.under, inner)}`;
    case 'pow':
      return `${operand(tree.base, inner)}^${tree.exponent}`;
    case 'sqrt':
      return `√(${inner(tree.of)})`;
    case 'neg':
      return `−${factorText(tree.of, inner)}`;
    case 'fn':
      return `${tree.name}(${inner(tree.of)})`;
    case 'group':
      return `(${inner(tree.of)})`;
  }
}

function signed(term: Expr, index: number, inner: (part: Expr) => string): string {
  if (index === 0) return inner(term);
  if (term.kind === 'neg') return ` − ${factorText(term.of, inner)}`;
  const text = inner(term);
  return text.startsWith('−') ? ` − ${text.slice(1)}` : ` + ${text}`;
}

/** A sum or a fraction inside a product needs brackets on one line. */
function factorText(part: Expr, inner: (part: Expr) => string): string {
  return part.kind === 'add' || part.kind === 'frac' ? `(${inner(part)})` : inner(part);
}

/** On one line everything but an atom is bracketed beside a stroke or under an exponent. */
function operand(part: Expr, inner: (part: Expr) => string): string {
  const text = inner(part);
  const atom = part.kind === 'num' || part.kind === 'sym' || part.kind === 'group' || part.kind === 'fn';
  return atom && !text.includes(' ') ? text : part.kind === 'group' ? text : `(${text})`;
}
