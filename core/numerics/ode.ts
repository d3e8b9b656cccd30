/**
 * Ordinary differential equations dy/dt = f(t, y), not stiff: steps of their own choice, one at a time.
 *
 * The caller draws steps from an iterator and stops when it likes: to show progress, to give way, or because something has
 * happened within a step. Step control: Hairer, Nørsett and Wanner, Solving Ordinary Differential Equations I, 2nd
 * edition (1993), section II.4, with the factors of the authors' code DOP853.
 */
import { rootInBracket } from './bracket';
import { type Derivative, dop853, type Stepper } from './dop853';

/** Fills the error that each component may make in a step from `before` to `after`. */
export type ErrorScale = (scale: Float64Array, before: Float64Array, after: Float64Array) => void;

export interface OdeProblem {
  readonly derivative: Derivative;
  readonly initial: Float64Array;
  readonly from: number;
  /** May lie before `from`. */
  readonly to: number;
  readonly errorScale: ErrorScale;
  /** Chosen from the derivative where left out. */
  readonly firstStep?: number | undefined;
  readonly longestStep?: number | undefined;
  readonly mostSteps?: number | undefined;
}

/** One step taken. It is good until the next one is drawn. */
export interface OdeStep {
  readonly start: number;
  readonly end: number;
  /** At the start and at the end of the step; not to be changed. */
  readonly before: Float64Array;
  readonly after: Float64Array;
  /** Fills `out` with the values at a time within the step: dense output of order 7. */
  readonly at: (out: Float64Array, t: number) => Float64Array;
}

export type OdeEnd =
  | { readonly ok: true; readonly steps: number; readonly refused: number }
  | {
      readonly ok: false;
      readonly reason: 'stepUnderflow' | 'tooManySteps' | 'notFinite';
      readonly at: number;
      readonly message: string;
    };

/** `relative` of the larger size at both ends of the step, and `absolute` beside it. */
export function componentScale(relative: number, absolute: number): ErrorScale {
  return (scale, before, after) => {
    for (let index = 0; index < scale.length; index += 1) {
      const size = Math.max(Math.abs(before[index] as number), Math.abs(after[index] as number));
      scale[index] = absolute + relative * size;
    }
  };
}

const defaultMostSteps = 10_000_000;
const safety = 0.9;
const [leastFactor, greatestFactor] = [0.333, 6];

/** The steps from `from` to `to`, the last one ending there; what the iterator returns says how it went. */
export function* odeSteps(problem: OdeProblem): Generator<OdeStep, OdeEnd, void> {
  const { from, to, initial, mostSteps = defaultMostSteps, longestStep = Math.abs(to - from) } = problem;
  if (from === to) return { ok: true, steps: 0, refused: 0 };
  const sense = Math.sign(to - from);
  const stepper = dop853(problem.derivative, initial.length);
  const scale = new Float64Array(initial.length);
  stepper.begin(from, initial);
  let t = from;
  let h = sense * Math.min(longestStep, problem.firstStep ?? firstStep(problem, stepper, scale));
  let refused = 0;
  let refusedLast = false;
  for (let steps = 0; steps + refused < mostSteps; ) {
    const last = (t + 1.01 * h - to) * sense >= 0;
    if (last) h = to - t;
    if (!(Math.abs(h) > 4 * Number.EPSILON * Math.abs(t))) return underflow(t, h);
    stepper.attempt(t, h);
    problem.errorScale(scale, stepper.values, stepper.next);
    const size = stepper.errorSize(h, scale);
    if (!Number.isFinite(size) && Math.abs(h) < 1e-9 * Math.abs(to - from)) return notFinite(t);
    const factor = factorFor(size, refusedLast);
    refusedLast = !(size <= 1);
    if (refusedLast) refused += 1;
    else {
      stepper.finish(t, h);
      steps += 1;
      yield stepOf(stepper, t, h, last ? to : t + h);
      stepper.accept();
      if (last) return { ok: true, steps, refused };
      t += h;
    }
    h = sense * Math.min(longestStep, Math.abs(h) * factor);
  }
  return failure('tooManySteps', t, `not finished after ${mostSteps} steps`);
}

/** How the step changes; not a number shrinks it, and right after a refusal it does not grow. */
function factorFor(size: number, refusedLast: boolean): number {
  if (!Number.isFinite(size)) return 0.1;
  const wanted = size === 0 ? greatestFactor : safety * size ** -0.125;
  return Math.min(refusedLast ? 1 : greatestFactor, Math.max(leastFactor, wanted));
}

function stepOf(stepper: Stepper, t: number, h: number, end: number): OdeStep {
  let prepared = false;
  return {
    start: t,
    end,
    before: stepper.values,
    after: stepper.next,
    at: (out, time) => {
      if (!prepared) stepper.prepareDense(t, h);
      prepared = true;
      stepper.dense(out, (time - t) / h);
      return out;
    },
  };
}

/** Section II.4, "Starting step size". */
function firstStep({ derivative, from, to, errorScale }: OdeProblem, stepper: Stepper, scale: Float64Array): number {
  const { values, rates } = stepper;
  errorScale(scale, values, values);
  const span = Math.abs(to - from);
  const [size, speed] = [scaledNorm(values, scale), scaledNorm(rates, scale)];
  const guess = Math.min(span, size < 1e-5 || speed < 1e-5 ? 1e-6 : (0.01 * size) / speed);
  const h = Math.sign(to - from) * guess;
  const ahead = values.map((value, index) => value + h * (rates[index] as number));
  const later = new Float64Array(values.length);
  derivative(later, from + h, ahead);
  const bend = scaledNorm(
    later.map((rate, index) => rate - (rates[index] as number)),
    scale,
  );
  const sharpest = Math.max(speed, bend / guess);
  const wanted = sharpest <= 1e-15 ? Math.max(1e-6, guess * 1e-3) : (0.01 / sharpest) ** 0.125;
  return Math.min(100 * guess, wanted, span);
}

function scaledNorm(values: Float64Array, scale: Float64Array): number {
  let sum = 0;
  for (let index = 0; index < values.length; index += 1) {
    sum += ((values[index] as number) / (scale[index] as number)) ** 2;
  }
  return Math.sqrt(sum / values.length);
}

function underflow(t: number, h: number): OdeEnd {
  return failure('stepUnderflow', t, `the step fell to ${h} at ${t}: the tolerance cannot be met there`);
}

function notFinite(t: number): OdeEnd {
  return failure('notFinite', t, `the derivative is not finite beyond ${t}`);
}

function failure(reason: 'stepUnderflow' | 'tooManySteps' | 'notFinite', at: number, message: string): OdeEnd {
  return { ok: false, reason, at, message };
}

/**
 * The time within a step at which an event function of the values changes sign, `values` then holding the values there;
 * null where its signs at both ends are the same.
 */
export function eventInStep(
  step: OdeStep,
  event: (values: Float64Array, t: number) => number,
  values: Float64Array,
): number | null {
  const atLow = event(step.before, step.start);
  const atHigh = event(step.after, step.end);
  if (!(atLow * atHigh < 0)) return null;
  const found = rootInBracket((t) => event(step.at(values, t), t), {
    low: step.start,
    high: step.end,
    atLow,
    atHigh,
  });
  if (!found.ok) throw new Error(`an event between ${step.start} and ${step.end} was expected, got ${found.reason}`);
  step.at(values, found.x);
  return found.x;
}
