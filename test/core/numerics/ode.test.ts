import { describe, expect, it } from 'vitest';
import { dop853 } from '../../../core/numerics/dop853';
import { fifthOrderError, stageShares, stageWeights, thirdOrderError } from '../../../core/numerics/dop853Coefficients';
import { componentScale, eventInStep, type OdeEnd, type OdeProblem, odeSteps } from '../../../core/numerics/ode';

const total = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0);

/** Runs to the end and returns the last values with how it ended. */
function run(problem: OdeProblem): { values: Float64Array; end: OdeEnd } {
  const steps = odeSteps(problem);
  let values = problem.initial;
  for (;;) {
    const drawn = steps.next();
    if (drawn.done) return { values, end: drawn.value };
    values = Float64Array.from(drawn.value.after);
  }
}

describe('coefficients', () => {
  it('of each stage add up to its time, those of the step meet the conditions of a quadrature of order 8', () => {
    stageWeights.forEach((weights, stage) => {
      expect(total(weights)).toBeCloseTo(stageShares[stage] ?? Number.NaN, 13);
    });
    const final = stageWeights[12] ?? [];
    for (let power = 0; power < 8; power += 1) {
      const sum = total(final.map((weight, stage) => weight * (stageShares[stage] ?? Number.NaN) ** power));
      expect(sum).toBeCloseTo(1 / (power + 1), 13);
    }
  });

  it('of the error estimates vanish for what orders 5 and 3 integrate exactly', () => {
    const moment = (weights: readonly number[], power: number) =>
      total(weights.map((weight, stage) => weight * (stageShares[stage] ?? Number.NaN) ** power));
    for (let power = 0; power < 5; power += 1) expect(Math.abs(moment(fifthOrderError, power))).toBeLessThan(1e-13);
    for (let power = 0; power < 3; power += 1) expect(Math.abs(moment(thirdOrderError, power))).toBeLessThan(1e-13);
    expect(Math.abs(moment(thirdOrderError, 3))).toBeGreaterThan(1e-4);
  });
});

describe('one step', () => {
  // y' = −y² + cos t: not linear, and time stands in it openly.
  const derivative = (rates: Float64Array, t: number, values: Float64Array) => {
    rates[0] = Math.cos(t) - (values[0] as number) ** 2;
  };
  const truth = run({
    derivative,
    initial: Float64Array.of(0.5),
    from: 0,
    to: 2,
    errorScale: componentScale(1e-15, 1e-15),
  }).values[0] as number;

  function fixed(steps: number): { end: number; middle: number } {
    const stepper = dop853(derivative, 1);
    const out = new Float64Array(1);
    const h = 2 / steps;
    let middle = 0;
    stepper.begin(0, Float64Array.of(0.5));
    for (let step = 0; step < steps; step += 1) {
      stepper.attempt(step * h, h);
      stepper.finish(step * h, h);
      if (step === 0) {
        stepper.prepareDense(0, h);
        stepper.dense(out, 0.4);
        middle = out[0] as number;
      }
      stepper.accept();
    }
    return { end: stepper.values[0] as number, middle };
  }

  it('has order 8: half the step leaves a 256th of the error', () => {
    const errors = [2, 4, 8].map((steps) => Math.abs(fixed(steps).end - truth));
    const orders = [0, 1].map((index) => Math.log2((errors[index] ?? 0) / (errors[index + 1] ?? 1)));
    console.log(`orders ${orders.map((order) => order.toFixed(2)).join(', ')}`);
    for (const order of orders) expect(order).toBeGreaterThan(7.4);
  });

  it('has dense output of order 7: within a step its error falls as the eighth power of the step', () => {
    const middleError = (steps: number) => {
      const to = 0.8 / steps;
      const exact = run({
        derivative,
        initial: Float64Array.of(0.5),
        from: 0,
        to,
        errorScale: componentScale(1e-15, 1e-15),
      });
      return Math.abs(fixed(steps).middle - (exact.values[0] as number));
    };
    const order = Math.log2(middleError(2) / middleError(4));
    console.log(`dense output, local order ${order.toFixed(2)}`);
    expect(order).toBeGreaterThan(7);
  });
});

const circle: OdeProblem = {
  derivative: (rates, _, values) => {
    rates[0] = values[1] as number;
    rates[1] = -(values[0] as number);
  },
  initial: Float64Array.of(1, 0),
  from: 0,
  to: 10,
  errorScale: componentScale(1e-12, 1e-12),
};

describe('steps', () => {
  it('give values anywhere between their ends, joined smoothly', () => {
    const out = new Float64Array(2);
    let reached = 0;
    for (const step of odeSteps(circle)) {
      expect(step.start).toBe(reached);
      reached = step.end;
      for (const share of [0, 0.1, 0.5, 0.9, 1]) {
        const t = step.start + share * (step.end - step.start);
        step.at(out, t);
        expect(Math.abs((out[0] as number) - Math.cos(t))).toBeLessThan(2e-10);
      }
    }
    expect(reached).toBe(10);
  });

  it('find where an event function turns its sign', () => {
    const out = new Float64Array(2);
    const found: number[] = [];
    for (const step of odeSteps(circle)) {
      const t = eventInStep(step, (values) => values[0] as number, out);
      if (t !== null) found.push(t);
    }
    expect(found).toHaveLength(3);
    found.forEach((t, index) => {
      expect(t).toBeCloseTo((index + 0.5) * Math.PI, 9);
    });
  });

  it('go backwards as well, and back to the start', () => {
    const there = run(circle).values;
    const back = run({ ...circle, initial: there, from: 10, to: 0 }).values;
    expect(back[0]).toBeCloseTo(1, 10);
    expect(back[1]).toBeCloseTo(0, 10);
  });

  it('stop being made when no more are drawn', () => {
    let calls = 0;
    const counted: OdeProblem = {
      ...circle,
      to: 1e9,
      derivative: (rates, t, values) => {
        calls += 1;
        circle.derivative(rates, t, values);
      },
    };
    for (const step of odeSteps(counted)) if (step.end > 1) break;
    expect(calls).toBeLessThan(200);
  });

  it('say why they end early: no steps left, a pole, a derivative that is no number', () => {
    expect(run({ ...circle, mostSteps: 3 }).end).toMatchObject({ ok: false, reason: 'tooManySteps' });
    const pole = run({
      ...circle,
      initial: Float64Array.of(1),
      derivative: (rates, _, values) => {
        rates[0] = (values[0] as number) ** 2;
      },
    });
    expect(pole.end).toMatchObject({ ok: false, reason: 'stepUnderflow' });
    expect(pole.end.ok || pole.end.at).toBeCloseTo(1, 6);
    const lost = run({
      ...circle,
      derivative: (rates, t) => rates.fill(t > 3 ? Number.NaN : 1),
    });
    expect(lost.end).toMatchObject({ ok: false, reason: 'notFinite' });
  });

  it('are none at all over no time', () => {
    expect(run({ ...circle, to: 0 })).toEqual({ values: circle.initial, end: { ok: true, steps: 0, refused: 0 } });
  });
});
