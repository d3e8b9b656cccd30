/** What the chart shows, computed from the document and three things of its own: what it holds, its part in view, a drag going on. */
import { computed, type ReadonlySignal, type Signal, signal } from '@preact/signals';
import {
  type Body,
  type ChartPoint,
  type ChartShape,
  type ChartWindow,
  chartFloor,
  chartShapeOf,
  type ResolvedOrbit,
  violatesAt,
} from '../../../core/index';
import type { AppState } from '../../state/appState';
import { type ShownCurve, shownCurves } from './chartCurvesShown';
import { isWithin, wholeWindow } from './chartWindow';
import type { LimitGround, LimitMark } from './drawLimits';
import { type Held, heldBy } from './heldCurves';
import { curvesUnder } from './nearText';
import { type ChartSize, type Mapping, mappingOf, plotBoxOf } from './plotBox';

export interface Chart {
  readonly app: AppState;
  /** What is the same over the chart: the eccentricity, or the altitude of perigee. */
  readonly holds: Signal<ChartShape['kind']>;
  /** Null before the canvas has been laid out. */
  readonly size: Signal<ChartSize | null>;
  /** Null for the whole chart. */
  readonly zoom: Signal<ChartWindow | null>;
  /** While the mark is dragged the chart under it stays as it is. */
  readonly isDragging: Signal<boolean>;
  readonly body: ReadonlySignal<Body | null>;
  readonly shape: ReadonlySignal<ChartShape | null>;
  readonly mapping: ReadonlySignal<Mapping | null>;
  readonly held: ReadonlySignal<Held>;
  readonly curves: ReadonlySignal<readonly ShownCurve[]>;
  /** What the limits are judged with; null where there are none. */
  readonly limits: ReadonlySignal<LimitGround | null>;
  /** The orbit as the limits judge it, once it has come to rest; null where there are none. */
  readonly mark: ReadonlySignal<LimitMark | null>;
  /** Where the orbit stands. */
  readonly point: ReadonlySignal<ChartPoint | null>;
  /** The curves it lies on. */
  readonly under: ReadonlySignal<readonly ShownCurve[]>;
}

export function createChart(app: AppState): Chart {
  const { orbit } = app.document;
  const holds = signal<ChartShape['kind']>('eccentricity');
  const size = signal<ChartSize | null>(null);
  const zoom = signal<ChartWindow | null>(null);
  const isDragging = signal(false);

  const body = steady<Body | null>(() => orbit.value?.body ?? null, sameBody);
  const shape = steady<ChartShape | null>(
    () => (orbit.value ? chartShapeOf(orbit.value.body, orbit.value.mean, holds.value) : null),
    (before, now) => sameShape(before, now) || (isDragging.value && before?.kind === now?.kind),
  );
  const point = computed(() => pointOf(orbit.value));
  const whole = steady<Whole | null>(
    () => wholeOf(body.value, shape.value, point.value),
    (before, now) => isDragging.value || stillFits(before, now, point.value),
  );
  const mapping = computed(() => {
    const window = zoom.value ?? whole.value?.window;
    return size.value && window ? mappingOf(plotBoxOf(size.value), window) : null;
  });
  const held = heldIn(app, point);
  const curves = computed(() => curvesOf(app, { body, shape, mapping, size, held }));
  const under = computed(() =>
    point.value && mapping.value ? curvesUnder(point.value, curves.value, mapping.value.scale) : [],
  );
  const limits = limitsIn(app);
  const mark = markIn({ app, limits, point, isDragging });
  return { app, holds, size, zoom, isDragging, body, shape, mapping, held, curves, limits, mark, point, under };
}

/** The angles of the orbit count too, but a drag on the chart changes none of them. */
function limitsIn({ document }: AppState): ReadonlySignal<LimitGround | null> {
  return steady<LimitGround | null>(
    () => {
      const limits = document.limits.read.value.flatMap((each) => (each.ok ? [each.limit] : []));
      const orbit = limits.length > 0 ? document.orbit.value : null;
      if (!orbit) return null;
      const { nodeRad, perigeeRad } = orbit.mean;
      return { limits, angles: { nodeRad, perigeeRad, meanAnomalyRad: 0 }, epochJd: orbit.epochJd };
    },
    (before, now) => JSON.stringify(before) === JSON.stringify(now),
  );
}

/** While it is dragged, it stays the mark of before: the layer below is not drawn anew in every frame. */
function markIn({ app, limits, point, isDragging }: Pick<Chart, 'app' | 'limits' | 'point' | 'isDragging'>) {
  let last: LimitMark | null = null;
  return computed((): LimitMark | null => {
    if (isDragging.value) return last;
    const orbit = app.document.orbit.value;
    const ground = limits.value;
    const keeps = orbit && ground && !violatesAt(orbit.body, orbit.mean, ground.epochJd, ground.limits);
    last = keeps && point.value ? { point: point.value } : null;
    return last;
  });
}

/** Read when the conditions change, or 90° is passed, rather than in every frame of a drag. */
function heldIn({ document }: AppState, point: ReadonlySignal<ChartPoint | null>): ReadonlySignal<Held> {
  const conditions = computed(() => document.draft.value.conditions);
  const isForward = computed(() => (point.value?.inclinationRad ?? 0) <= Math.PI / 2);
  return computed(() => (conditions.value.length > 0 ? heldBy(document.draft.peek(), isForward.value) : nothingHeld));
}

const nothingHeld: Held = { conditions: [], settled: new Set() };

type CurveParts = Pick<Chart, 'body' | 'shape' | 'mapping' | 'size' | 'held'>;

function curvesOf(app: AppState, chart: CurveParts): readonly ShownCurve[] {
  const { rateUnit } = app.preferences.values.value;
  const [body, shape, mapping, size] = [chart.body.value, chart.shape.value, chart.mapping.value, chart.size.value];
  if (!body || !shape || !mapping || !size) return [];
  return shownCurves({ body, shape, mapping, fontPx: size.fontPx, held: chart.held.value.conditions, rateUnit });
}

/** A computed value that stays the very same object while it is as good as the one before. */
function steady<Value>(compute: () => Value, isSame: (before: Value, now: Value) => boolean): ReadonlySignal<Value> {
  let before: { readonly value: Value } | null = null;
  return computed(() => {
    const value = compute();
    if (before && value !== null && before.value !== null && isSame(before.value, value)) return before.value;
    before = { value };
    return value;
  });
}

function sameBody(before: Body | null, now: Body | null): boolean {
  return before === now || JSON.stringify(before) === JSON.stringify(now);
}

/** What fields of altitudes round e and perigee to makes no new chart. */
function sameShape(before: ChartShape | null, now: ChartShape | null): boolean {
  if (before?.kind === 'eccentricity' && now?.kind === 'eccentricity') {
    return Math.abs(before.eccentricity - now.eccentricity) < 5e-8;
  }
  if (before?.kind === 'perigeeAltitude' && now?.kind === 'perigeeAltitude') return Math.abs(before.km - now.km) < 5e-4;
  return before === now;
}

function pointOf(orbit: ResolvedOrbit | null): ChartPoint | null {
  if (!orbit) return null;
  const { body, mean } = orbit;
  return { inclinationRad: mean.inclinationRad, altitudeKm: mean.semiMajorAxisKm - body.equatorialRadiusKm };
}

interface Whole {
  readonly body: Body;
  readonly floorKm: number;
  readonly window: ChartWindow;
}

function wholeOf(body: Body | null, shape: ChartShape | null, point: ChartPoint | null): Whole | null {
  if (!body || !shape || !point) return null;
  const floorKm = chartFloor(body, shape).altitudeKm;
  return { body, floorKm, window: wholeWindow(body, shape, point.altitudeKm) };
}

/** A step of the altitude must not pull the chart away from under the eye. */
function stillFits(before: Whole | null, now: Whole | null, point: ChartPoint | null): boolean {
  if (!before || !now || !point || before.body !== now.body) return false;
  const spanKm = before.window.toKm - before.window.fromKm;
  const sameFloor = before.floorKm === now.floorKm || Math.abs(before.floorKm - now.floorKm) < 0.002 * spanKm;
  const nowSpanKm = now.window.toKm - now.window.fromKm;
  return sameFloor && isWithin(before.window, point.altitudeKm) && nowSpanKm > spanKm / 3;
}
