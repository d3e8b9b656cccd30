/**
 * A working: the formula of a reading line by line, each line's value worked out from the lines
 * above it as they are shown, so that a pocket calculator can follow, differences of near-equal numbers included.
 */
import { type Expr, evaluate, type Values } from '../formula';
import { type SymbolId, type WorkingSymbol, workingSymbol } from './symbols';

/** Significant digits of every number shown: those of a pocket calculator. */
export const workingDigits = 10;

export interface WorkingValue {
  readonly symbol: WorkingSymbol;
  /** In core units; times `symbol.perCore` in the symbol's unit. */
  readonly value: number;
}
export interface WorkingConstant extends WorkingValue {
  readonly source: string;
}
export interface WorkingLine extends WorkingValue {
  readonly expr: Expr;
}

export interface Working {
  readonly inputs: readonly WorkingValue[];
  readonly constants: readonly WorkingConstant[];
  /** First order, or the only lines where the reading has no order. Empty where there is no formula: see `note`. */
  readonly lines: readonly WorkingLine[];
  /** The full second order; empty where the reading has no order. */
  readonly secondLines: readonly WorkingLine[];
  /** The symbol of the line that is the reading; lines below it say it in people's units. */
  readonly result: string | null;
  /** The reading itself, without the rounding of the lines. */
  readonly firstOrder: number;
  /** Null where the reading has no order. */
  readonly secondOrder: number | null;
  /** What is assumed, and where the formula comes from. */
  readonly note: string;
}

/** One line before it has a value. */
export type LineSpec = readonly [SymbolId, Expr];

export interface WorkingParts {
  readonly inputs: Partial<Record<SymbolId, number>>;
  readonly constants: Partial<Record<SymbolId, { readonly value: number; readonly source: string }>>;
  readonly first: readonly LineSpec[];
  readonly second?: readonly LineSpec[];
  readonly result: SymbolId;
  readonly note: string;
}

/** Puts the numbers in, line by line. */
export function buildWorking(parts: WorkingParts): Working {
  const { result, note, second } = parts;
  const inputs = keyed(parts.inputs).map(([id, value]) => ({ symbol: workingSymbol(id), value }));
  const constants = keyed(parts.constants).map(([id, given]) => ({ symbol: workingSymbol(id), ...given }));
  const given = Object.fromEntries([...inputs, ...constants].map(({ symbol, value }) => [symbol.id, value]));
  const lines = evaluatedLines(parts.first, given);
  const secondLines = second === undefined ? [] : evaluatedLines(second, given);
  return {
    inputs,
    constants,
    lines,
    secondLines,
    result,
    firstOrder: exactResult(parts.first, given, result),
    secondOrder: second === undefined ? null : exactResult(second, given, result),
    note,
  };
}

/** A reading without a formula of its own: a typed element, or a search along the orbit. */
export function noteOnly(value: number, note: string): Working {
  return {
    inputs: [],
    constants: [],
    lines: [],
    secondLines: [],
    result: null,
    firstOrder: value,
    secondOrder: null,
    note,
  };
}

function keyed<T>(record: Partial<Record<SymbolId, T>>): [SymbolId, T][] {
  return Object.entries(record) as [SymbolId, T][];
}

function evaluatedLines(specs: readonly LineSpec[], given: Values): WorkingLine[] {
  const shown: Record<string, number> = {};
  for (const [id, value] of Object.entries(given)) shown[id] = asShown(workingSymbol(id as SymbolId), value);
  return specs.map(([id, expr]) => {
    const symbol = workingSymbol(id);
    const value = evaluate(expr, shown);
    shown[id] = asShown(symbol, value);
    return { symbol, expr, value };
  });
}

/** The value of the digits on screen. */
function asShown({ perCore }: WorkingSymbol, value: number): number {
  return Number.isFinite(value) ? Number((value * perCore).toPrecision(workingDigits)) / perCore : value;
}

function exactResult(specs: readonly LineSpec[], given: Values, result: SymbolId): number {
  const values: Record<string, number> = { ...given };
  for (const [id, expr] of specs) values[id] = evaluate(expr, values);
  const value = values[result];
  if (value === undefined) throw new Error(`Expected a line for "${result}" in the working, got none`);
  return value;
}
