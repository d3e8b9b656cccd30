/**
 * The orbit integrated: equations of motion in Cartesian form, every force, Dormand and Prince 8(5,3). The second look that
 * judges the closed form and the averaged level.
 *
 * Frame: equator and equinox of the epoch, held inertial. Left out, as at the averaged level: tesserals, tides, radiation
 * pressure. At the default tolerance energy and polar angular momentum in a field of zonals keep to 1e-10 over 30 days.
 */
import type { Body } from '../bodies/body';
import { secondsPerDay, wrapPi } from '../numerics/angles';
import { eventInStep, type OdeStep, odeSteps } from '../numerics/ode';
import type { MeanElements, StateVector } from '../orbit/elements';
import { ConversionError, meanFromState, tryMeanFromState } from '../orbit/meanState';
import { secularRates } from '../orbit/secularRates';
import type { LeftOutForce } from './historyForces';
import { type HistoryForces, HistoryRequestError, historyProblems } from './historyRequest';
import { integratedForces } from './integratedForces';
import { decayHeightKm } from './missionHistory';
import { motionOf, motionScale, motionUnder, radialMotion, radiusKm, stateOf, twoBodyEnergy } from './motion';

export interface IntegrationRequest {
  readonly body: Body;
  /** At the epoch (km, km/s), inertial equatorial frame of the epoch. */
  readonly state: StateVector;
  /** Julian date, UTC. */
  readonly epochJd: number;
  readonly spanDays: number;
  readonly forces: HistoryForces;
  /** Days between samples. */
  readonly sampleDays: number;
  /** Of position and velocity, in one step. */
  readonly relativeTolerance?: number;
}

export interface IntegratedSample {
  readonly days: number;
  readonly state: StateVector;
  /** Node and perigee run on without wrapping. */
  readonly mean: MeanElements;
}

export interface IntegratedOrbit {
  /** `sampleDays` apart from the start on; the last one lies at the end, but not where the ellipse opened. */
  readonly samples: readonly IntegratedSample[];
  /** `decay`: met the surface, or with drag the height at which drag has won. `escape`: the ellipse opened. */
  readonly endedBy: 'span' | 'decay' | 'escape';
  readonly endDays: number;
  /** Forces that were asked for and do not act. */
  readonly leftOut: readonly LeftOutForce[];
}

export interface IntegrationOptions {
  /** Called with the share of the span that is done, 0 to 1. */
  readonly onProgress?: (share: number) => void;
}

/** The integrator gave up: it says where and why. */
export class IntegrationError extends Error {
  constructor(
    readonly reason: 'stepUnderflow' | 'tooManySteps' | 'notFinite',
    message: string,
  ) {
    super(message);
    this.name = 'IntegrationError';
  }
}

const defaultTolerance = 1e-13;
/** Nearer than this to the end, days, a sample is the end: a tenth of a second. */
const sameDays = 1e-6;
/** Calls of `onProgress` at most. */
const progressCalls = 200;

/**
 * The orbit from a state over a span, with its mean elements at each sample.
 *
 * @throws HistoryRequestError for what is out of range; ConversionError for a state without mean elements; Error for a
 * tolerance outside 1e-15 to 1e-6; IntegrationError where the tolerance cannot be met.
 */
export function integrateOrbit(request: IntegrationRequest, { onProgress }: IntegrationOptions = {}): IntegratedOrbit {
  const { body, state, epochJd, spanDays, forces: asked } = request;
  const first: IntegratedSample = { days: 0, state, mean: meanFromState(body, state) };
  checkRequest(request, first.mean);
  const { forces, leftOut } = integratedForces(body, asked, epochJd);
  const floorKm = body.equatorialRadiusKm + (forces.some(({ id }) => id === 'drag') ? decayHeightKm : 0);
  const samples = [first];
  const initial = motionOf(state);
  if (radiusKm(initial) <= floorKm) return { samples, endedBy: 'decay', endDays: 0, leftOut };
  const steps = odeSteps({
    derivative: motionUnder(body, forces, epochJd),
    initial,
    from: 0,
    to: spanDays * secondsPerDay,
    errorScale: motionScale(request.relativeTolerance ?? defaultTolerance),
  });
  const endOfStep = endFinder(body, floorKm);
  let reported = 0;
  for (;;) {
    const drawn = steps.next();
    if (drawn.done) {
      if (!drawn.value.ok) throw new IntegrationError(drawn.value.reason, drawn.value.message);
      return { samples, endedBy: 'span', endDays: spanDays, leftOut };
    }
    const end = endOfStep(drawn.value);
    takeSamples(request, drawn.value, end, samples);
    if (end) return { samples, endedBy: end.by, endDays: end.timeS / secondsPerDay, leftOut };
    const share = drawn.value.end / (spanDays * secondsPerDay);
    if (onProgress && share >= reported + 1 / progressCalls) {
      reported = share;
      onProgress(share);
    }
  }
}

function checkRequest(request: IntegrationRequest, mean: MeanElements): void {
  const problems = historyProblems({ ...request, mean });
  if (problems.length > 0) throw new HistoryRequestError(problems);
  const { relativeTolerance = defaultTolerance } = request;
  if (!(relativeTolerance >= 1e-15 && relativeTolerance <= 1e-6)) {
    throw new Error(`the relative tolerance must lie between 1e-15 and 1e-6, got ${relativeTolerance}`);
  }
}

interface End {
  readonly timeS: number;
  readonly by: 'decay' | 'escape';
}

/** The first moment of a step at which the orbit ends, or null. */
function endFinder({ muKm3PerS2: mu }: Body, floorKm: number): (step: OdeStep) => End | null {
  const motion = new Float64Array(6);
  const height = (values: Float64Array) => radiusKm(values) - floorKm;
  const energy = (values: Float64Array) => twoBodyEnergy(mu, values);
  return (step) => {
    if (energy(step.after) >= 0) {
      return { timeS: eventInStep(step, energy, motion) ?? step.end, by: 'escape' };
    }
    if (height(step.after) <= 0) return { timeS: eventInStep(step, height, motion) ?? step.end, by: 'decay' };
    // A perigee inside the step may lie below the floor with both ends above it.
    if (!(radialMotion(step.before) < 0 && radialMotion(step.after) > 0)) return null;
    const perigeeS = eventInStep(step, radialMotion, motion);
    if (perigeeS === null || height(motion) > 0) return null;
    const fall: OdeStep = { ...step, end: perigeeS, after: motion.slice() };
    return { timeS: eventInStep(fall, height, motion) ?? perigeeS, by: 'decay' };
  };
}

/** Adds the samples that lie in a step, up to the orbit's end if it has one there, and that end if it is still an ellipse. */
function takeSamples(request: IntegrationRequest, step: OdeStep, end: End | null, samples: IntegratedSample[]): void {
  const { spanDays, sampleDays } = request;
  const untilS = end?.timeS ?? step.end;
  for (;;) {
    const next = samples.length * sampleDays;
    const wanted = next < spanDays - sameDays ? next : spanDays;
    const last = samples[samples.length - 1] as IntegratedSample;
    if (wanted <= last.days || wanted * secondsPerDay > untilS) break;
    addSample(request.body, step, wanted, samples);
  }
  if (end?.by === 'decay') addSample(request.body, step, untilS / secondsPerDay, samples);
}

function addSample(body: Body, step: OdeStep, days: number, samples: IntegratedSample[]): void {
  const before = samples[samples.length - 1] as IntegratedSample;
  if (days <= before.days) return;
  const timeS = Math.min(step.end, days * secondsPerDay);
  const state = stateOf(timeS === step.end ? step.after : step.at(new Float64Array(6), timeS));
  const result = tryMeanFromState(body, state);
  if (!result.ok) throw new ConversionError(result.reason, `after ${days.toFixed(3)} days: ${result.message}`);
  samples.push({ days, state, mean: unwound(body, before, { days, mean: result.mean }) });
}

/** Node and perigee on the turn on which the closed form expects them after the sample before. */
function unwound(
  body: Body,
  before: IntegratedSample,
  { days, mean }: { readonly days: number; readonly mean: MeanElements },
): MeanElements {
  const rates = secularRates(body, before.mean, 'second');
  const timeS = (days - before.days) * secondsPerDay;
  const near = (angle: number, expected: number) => expected + wrapPi(angle - expected);
  return {
    ...mean,
    nodeRad: near(mean.nodeRad, before.mean.nodeRad + rates.nodeRadPerS * timeS),
    perigeeRad: near(mean.perigeeRad, before.mean.perigeeRad + rates.perigeeRadPerS * timeS),
  };
}
