/**
 * A mission as the worker computes it, in stages that build on each other: history, light and events, ledger. Each
 * stage is a call of its own, so that what is there can be drawn while the next runs.
 */
import {
  type EffectsLedger,
  effectsLedger,
  type HistoryRequest,
  type LightRow,
  type LightSummary,
  lightHistory,
  localTimeHistory,
  type MissionEvents,
  type MissionHistory,
  missionEvents,
  missionHistory,
  steadyMean,
} from '../../core/index';
import { columnsOf, type ElementColumns } from './columns';

export interface MissionRequest extends Omit<HistoryRequest, 'sampleDays'> {
  /** Evenly spaced stretches between samples. */
  readonly stretches: number;
  /** Whether the mean elements are a design's averages, or came from a state and have yet to be steadied. */
  readonly isAverage: boolean;
  readonly node: 'ascending' | 'descending';
  /** Minutes to either side of the local time at the start. */
  readonly boxMinutes: number;
}

export interface HistoryPart extends Omit<MissionHistory, 'samples'> {
  /** Evenly spaced from the start to the end of the span or of the orbit. */
  readonly columns: ElementColumns;
  /** Mean local time, hours, running on without wrapping; null with the reason where there is none. */
  readonly localTimeH: Float64Array<ArrayBuffer> | null;
  readonly localTimeReason: string;
  readonly tookMs: number;
}

export type LightPart =
  | {
      readonly ok: true;
      /** At the samples of the history. */
      readonly betaRad: Float64Array<ArrayBuffer>;
      readonly umbraS: Float64Array<ArrayBuffer>;
      readonly penumbraS: Float64Array<ArrayBuffer>;
      readonly summary: LightSummary;
      readonly source: string;
    }
  | { readonly ok: false; readonly message: string };

export interface SkyPart {
  readonly light: LightPart;
  readonly events: MissionEvents;
  readonly tookMs: number;
}

/** Ends of the orbit in thin and in dense air. */
export interface DragSpread {
  readonly low: DragEnd;
  readonly high: DragEnd;
}

export interface DragEnd {
  readonly nodeChangeRad: number;
  readonly localTimeChangeH: number | null;
  readonly semiMajorAxisChangeKm: number;
  readonly endedBy: MissionHistory['endedBy'];
  readonly endJd: number;
}

export interface LedgerPart extends Omit<EffectsLedger, 'history'> {
  readonly dragSpread: DragSpread | null;
  readonly tookMs: number;
}

type OnShare = (share: number) => void;

/** The calls of one worker, which remembers the last history for what builds on it. */
export function createMissionCalls() {
  let kept: { readonly request: MissionRequest; readonly history: MissionHistory } | null = null;
  const needed = () => {
    if (!kept) throw new Error('A history must be computed before what builds on it');
    return kept;
  };
  return {
    history(asked: MissionRequest, onShare: OnShare): HistoryPart {
      const startMs = performance.now();
      const request = { ...asked, mean: averageOf(asked) };
      const history = evenHistory(request, onShare);
      kept = { request, history };
      return { ...partOf(request, history), tookMs: performance.now() - startMs };
    },
    sky(): SkyPart {
      const startMs = performance.now();
      const { request, history } = needed();
      return { ...skyOf(request, history), tookMs: performance.now() - startMs };
    },
    ledger(onShare: OnShare): LedgerPart {
      const startMs = performance.now();
      const { request, history } = needed();
      const onProgress = (share: number) => onShare(request.forces.drag ? share * 0.7 : share);
      const { history: _, ...ledger } = effectsLedger(coreRequest(request, request.spanDays), { history, onProgress });
      const dragSpread = dragSpreadOf(request, (share) => onShare(0.7 + 0.3 * share));
      return { ...ledger, dragSpread, tookMs: performance.now() - startMs };
    },
  };
}

/** The elements a history starts from: what came from a state holds some metres of a that the orbit does not keep. */
export function averageOf({ body, mean, isAverage, forces }: Omit<MissionRequest, 'stretches' | 'boxMinutes'>) {
  return isAverage || forces.zonalDegree < 2 ? mean : steadyMean(body, mean, forces.zonalDegree);
}

function coreRequest(request: MissionRequest, sampleDays: number): HistoryRequest {
  const { stretches: _stretches, node: _node, boxMinutes: _box, isAverage: _kind, ...rest } = request;
  return { ...rest, sampleDays };
}

/** Where the orbit ends early it is sampled again up to there, as finely as a whole span is. */
function evenHistory(request: MissionRequest, onProgress: OnShare): MissionHistory {
  const { stretches, spanDays } = request;
  const fine = (days: number) => days / (stretches * samplesPerStretch(days / stretches));
  const history = missionHistory(coreRequest(request, fine(spanDays)), { onProgress });
  if (history.endedBy === 'span' || history.endDays <= 0) return history;
  return missionHistory(coreRequest(request, fine(history.endDays)));
}

/** Events are found between samples: these lie at most two days apart, however far apart those drawn are. */
const samplesPerStretch = (stretchDays: number): number => Math.max(1, Math.ceil(stretchDays / 2 - 1e-9));

/** The samples that are drawn: one a stretch, and the last. */
function drawnOf<Sample>(samples: readonly Sample[], stretches: number): readonly Sample[] {
  const every = Math.max(1, Math.round((samples.length - 1) / stretches));
  return samples.filter((_, index) => index % every === 0);
}

function partOf(request: MissionRequest, history: MissionHistory): Omit<HistoryPart, 'tookMs'> {
  const { samples, ...rest } = history;
  const { body, epochJd, node, stretches } = request;
  const drawn = drawnOf(samples, stretches);
  const local = localTimeHistory({ body, epochJd, node, sun: 'mean', samples: drawn });
  const localTimeH = local.ok ? Float64Array.from(local.points, ({ hours }) => hours) : null;
  return { ...rest, columns: columnsOf(drawn), localTimeH, localTimeReason: local.ok ? '' : local.message };
}

function skyOf(request: MissionRequest, history: MissionHistory): Omit<SkyPart, 'tookMs'> {
  const { body, epochJd, node, boxMinutes } = request;
  const { samples, endedBy } = history;
  const drawn = drawnOf(samples, request.stretches);
  const stretch = (drawn[1]?.days ?? 1) - (drawn[0]?.days ?? 0);
  // Rows at most a day apart, so that no season is missed; the samples drawn are among them.
  const rowsPerStretch = Math.max(1, Math.ceil(stretch));
  const light = lightHistory({ body, epochJd, samples, stepDays: stretch / rowsPerStretch });
  const box = { node, allowedMinutes: boxMinutes };
  const events = missionEvents({ body, epochJd, samples, endedBy, box, light });
  if (!light.ok) return { light: { ok: false, message: light.message }, events };
  const { rows } = light;
  const at = (value: (row: LightRow) => number) =>
    Float64Array.from(drawn, (_, index) => {
      const row = rows[Math.min(index * rowsPerStretch, rows.length - 1)];
      return row ? value(row) : Number.NaN;
    });
  const columns = {
    betaRad: at(({ betaRad }) => betaRad),
    umbraS: at(({ umbraS }) => umbraS),
    penumbraS: at(({ penumbraS }) => penumbraS),
  };
  return { light: { ok: true, ...columns, summary: light.summary, source: light.source }, events };
}

/** The same orbit in air half and twice as dense, at its end; null without drag. */
function dragSpreadOf(request: MissionRequest, onShare: OnShare): DragSpread | null {
  const { drag } = request.forces;
  if (!drag || request.body.id !== 'earth') return null;
  const base = { low: 0.5, mean: 1, high: 2 };
  const factor = typeof drag.density === 'number' ? drag.density : base[drag.density];
  const end = (density: number): DragEnd => {
    const forces = { ...request.forces, drag: { ...drag, density } };
    const history = missionHistory(coreRequest({ ...request, forces }, request.spanDays));
    const { localTimeH, columns } = partOf(request, history);
    const change = (values: Float64Array) => (values.at(-1) ?? 0) - (values[0] ?? 0);
    return {
      nodeChangeRad: change(columns.nodeRad),
      localTimeChangeH: localTimeH && change(localTimeH),
      semiMajorAxisChangeKm: change(columns.semiMajorAxisKm),
      endedBy: history.endedBy,
      endJd: history.endJd,
    };
  };
  const low = end(factor / 2);
  onShare(0.5);
  return { low, high: end(factor * 2) };
}
