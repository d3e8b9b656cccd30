/** Workings of the readings that rest on secular rates, and of those that are geometry alone. */
import type { Body } from '../../bodies/body';
import type { MeanElements } from '../../orbit/elements';
import { type Expr, mul, num } from '../formula';
import { firstOrderLines, type RateId, rateConstants, secondOrderLines } from './rates';
import type { SymbolId } from './symbols';
import { buildWorking, type LineSpec, type Working, type WorkingParts } from './working';

export interface WorkingOrbit {
  readonly body: Body;
  readonly mean: MeanElements;
}

export const twoPiExpr: Expr = mul(2, num(Math.PI, 'π'));

const rateSource =
  'First order: Kozai, Astron. J. 64, 367 (1959). Second order: Brouwer, Astron. J. 64, 378 (1959), J2, J2² and J4; it lacks J6 and above. Elements are Brouwer mean elements.';

/** The rates, first and second order, then the same closing lines under both. */
export function rateWorking(
  { body, mean }: WorkingOrbit,
  options: {
    readonly rates: readonly RateId[];
    readonly closing?: readonly LineSpec[];
    readonly result: SymbolId;
    readonly constants?: readonly SymbolId[];
    readonly note?: string;
  },
): Working {
  const closing = options.closing ?? [];
  return buildWorking({
    inputs: { a: mean.semiMajorAxisKm, e: mean.eccentricity, i: mean.inclinationRad },
    constants: constantsOf(body, [...rateConstants, ...(options.constants ?? [])]),
    first: [...firstOrderLines(options.rates), ...closing],
    second: [...secondOrderLines(options.rates), ...closing],
    result: options.result,
    note: options.note === undefined ? rateSource : `${options.note} ${rateSource}`,
  });
}

/** A working of one formula without orders. */
export function plainWorking(
  { body }: WorkingOrbit,
  parts: Pick<WorkingParts, 'inputs' | 'result' | 'note'> & {
    readonly constants?: readonly SymbolId[];
    readonly lines: readonly LineSpec[];
  },
): Working {
  const { inputs, result, note, lines } = parts;
  return buildWorking({ inputs, result, note, first: lines, constants: constantsOf(body, parts.constants ?? []) });
}

/** Constants by symbol, each with its source. */
function constantsOf(body: Body, ids: readonly SymbolId[]): WorkingParts['constants'] {
  return Object.fromEntries(ids.map((id) => [id, constantOf(body, id)]));
}

/** The name of the set leads, once. */
function sourceOf({ gravitySet, source }: Body): string {
  const isNamed = source.replaceAll(' ', '').includes(gravitySet) || gravitySet === 'user';
  return isNamed ? source : `${gravitySet}: ${source}`;
}

function constantOf(body: Body, id: SymbolId): { value: number; source: string } {
  const ofSet = (value: number) => ({ value, source: sourceOf(body) });
  const ofBody = (value: number | null) => {
    if (value === null) throw new Error(`Expected ${body.name} to have "${id}", got none`);
    return { value, source: sourceOf(body) };
  };
  switch (id) {
    case 'mu':
      return ofSet(body.muKm3PerS2);
    case 'R':
      return ofSet(body.radiusKm);
    case 'J2':
      return ofSet(body.zonals[2] ?? 0);
    case 'J4':
      return ofSet(body.zonals[4] ?? 0);
    case 'Req':
      return ofBody(body.equatorialRadiusKm);
    case 'bodyRate':
      return ofBody(body.rotationRadPerS);
    case 'year':
      return ofBody(body.yearDays === null ? null : body.yearDays * 86_400);
    case 'day':
      return { value: 86_400, source: 'By definition.' };
    default:
      throw new Error(`Expected a constant of the body, got "${id}"`);
  }
}
