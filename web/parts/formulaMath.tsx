/** A formula as MathML, from the same tree that is evaluated. */
import type { Expr } from '../../core/index';

/** `symbolOf` draws a symbol: its glyph, or its number. */
export type SymbolDrawing = (id: string) => preact.JSX.Element;

export function FormulaMath({ tree, symbolOf }: { readonly tree: Expr; readonly symbolOf: SymbolDrawing }) {
  const inner = (part: Expr) => <FormulaMath tree={part} symbolOf={symbolOf} />;
  switch (tree.kind) {
    case 'num':
      return <mn>{tree.text}</mn>;
    case 'sym':
      return symbolOf(tree.id);
    case 'add':
      return <mrow>{tree.terms.map((term, index) => signedTerm(term, index, inner))}</mrow>;
    case 'mul':
      return <mrow>{tree.factors.map((factor, index) => product(factor, index, inner))}</mrow>;
    case 'frac':
      return (
        <mfrac>
          {inner(tree.over)}
          {inner(tree.under)}
        </mfrac>
      );
    case 'pow':
      return (
        <msup>
          {baseOf(tree.base, inner)}
          <mn>{tree.exponent}</mn>
        </msup>
      );
    case 'sqrt':
      return <msqrt>{inner(tree.of)}</msqrt>;
    case 'neg':
      return (
        <mrow>
          <mo>−</mo>
          {inner(tree.of)}
        </mrow>
      );
    case 'fn':
      return (
        <mrow>
          <mi>{tree.name}</mi>
          <mo>&#x2061;</mo>
          {bracketed(inner(tree.of))}
        </mrow>
      );
    case 'group':
      return bracketed(inner(tree.of));
  }
}

type Inner = (part: Expr) => preact.JSX.Element;

function bracketed(content: preact.JSX.Element) {
  return (
    <mrow>
      <mo>(</mo>
      {content}
      <mo>)</mo>
    </mrow>
  );
}

/** A sum or product under an exponent needs brackets; a fraction too. */
function baseOf(base: Expr, inner: Inner) {
  const isAtom = base.kind === 'sym' || base.kind === 'num' || base.kind === 'group';
  return isAtom ? inner(base) : bracketed(inner(base));
}

function signedTerm(term: Expr, index: number, inner: Inner) {
  if (index === 0) return inner(term);
  const isNegative = term.kind === 'neg';
  return (
    <>
      <mo>{isNegative ? '−' : '+'}</mo>
      {inner(isNegative ? term.of : term)}
    </>
  );
}

function product(factor: Expr, index: number, inner: Inner) {
  const content = factor.kind === 'add' ? bracketed(inner(factor)) : inner(factor);
  if (index === 0) return content;
  return (
    <>
      <mo>·</mo>
      {content}
    </>
  );
}
