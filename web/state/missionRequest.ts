/** What a mission is computed from, as the document and its settings have it now. Pure. */
import {
  type Candidate,
  type HistoryMessage,
  historyProblems,
  type MissionSettings,
  type ResolvedOrbit,
} from '../../core/index';
import type { MissionRequest } from '../work/missionCalls';

export type Wanted =
  | { readonly kind: 'request'; readonly key: string; readonly request: MissionRequest; readonly orbit: ResolvedOrbit }
  /** Nothing can be computed: no orbit, no epoch, a setting in error, or out of range with messages. */
  | { readonly kind: 'needsOrbit' | 'needsEpoch' | 'needsSettings' }
  | { readonly kind: 'refused'; readonly problems: readonly HistoryMessage[] };

export interface WantedParts {
  readonly orbit: ResolvedOrbit | null;
  readonly nodeForm: Candidate['entry']['nodeForm'];
  readonly spanDays: number;
  readonly settings: MissionSettings;
}

export function wantedOf({ orbit, nodeForm, spanDays, settings }: WantedParts): Wanted {
  const { forces, boxMinutes } = settings;
  if (!orbit) return { kind: 'needsOrbit' };
  if (orbit.epochJd === null) return { kind: 'needsEpoch' };
  if (forces === null || boxMinutes === null) return { kind: 'needsSettings' };
  const { body, mean, epochJd } = orbit;
  const node = nodeForm === 'ltdn' ? 'descending' : 'ascending';
  const request = {
    body,
    mean,
    epochJd,
    spanDays,
    forces,
    stretches: stretchesOf(spanDays),
    isAverage: orbit.typedAs === 'mean',
    node,
    boxMinutes,
  } as const;
  const problems = historyProblems({ body, mean, epochJd, spanDays, forces, sampleDays: spanDays / request.stretches });
  return problems.length > 0
    ? { kind: 'refused', problems }
    : { kind: 'request', key: JSON.stringify(request), request, orbit };
}

/** Enough that a line looks drawn, and that the months of the Moon show over a year. */
function stretchesOf(spanDays: number): number {
  if (spanDays >= 1000) return 900;
  return spanDays >= 200 ? 400 : 240;
}
