/** State of the list of repeat tracks, kept while the app is open, and what is computed from it. */
import { computed, effect, type ReadonlySignal, type Signal, signal } from '@preact/signals';
import {
  kmPerLengthUnit,
  type RepeatRequest,
  type ResolvedOrbit,
  readNumber,
  secondsPerDay,
  secularRates,
  twoPi,
} from '../../../core/index';
import type { AppState } from '../../state/appState';
import { createWork } from '../../work/work';
import { type AnswerSpan, answerOf } from './answer';
import { acrossTracks, kept, type SortOrder, sorted, type Tracks, withoutGap } from './listing';
import { createTrackSearch, keyOf, type TrackSearch } from './trackSearch';
import {
  fieldOf,
  readWishes,
  type TrackErrors,
  type TrackField,
  type TrackFilter,
  type TrackInclinationKind,
  type TrackTexts,
  type TrackWishes,
} from './wishes';

export interface TracksModel {
  readonly texts: Signal<TrackTexts>;
  readonly inclination: Signal<TrackInclinationKind>;
  /** Whether tracks that leave gaps are listed too. */
  readonly show: Signal<'withoutGap' | 'all'>;
  readonly sort: Signal<SortOrder>;
  readonly search: TrackSearch;
  readonly wishes: ReadonlySignal<TrackWishes>;
  readonly errors: ReadonlySignal<TrackErrors>;
  /** What keeps any search of this body or orbit from being answered, where no field is to blame. */
  readonly trouble: ReadonlySignal<string | null>;
  readonly listing: ReadonlySignal<Listing | null>;
}

export interface Listing {
  readonly tracks: Tracks;
  readonly order: Uint32Array;
  readonly answer: readonly AnswerSpan[];
  readonly swathKm: number | null;
  /** Why this is not what the fields say now; null where it is. */
  readonly staleBecause: string | null;
}

const models = new WeakMap<AppState, TracksModel>();

/** The one model of an app. */
export function tracksModelOf(app: AppState, orbit: ResolvedOrbit): TracksModel {
  const known = models.get(app);
  if (known) return known;
  const model = createTracksModel(app, orbit);
  models.set(app, model);
  return model;
}

function createTracksModel(app: AppState, orbit: ResolvedOrbit): TracksModel {
  const unit = computed(() => app.preferences.values.value.lengthUnit);
  const texts = signal(startingTexts(orbit, unit.peek()));
  const inclination = signal<TrackInclinationKind>(isSunSynchronous(orbit) ? 'sunSynchronous' : 'fixed');
  const show = signal<'withoutGap' | 'all'>('withoutGap');
  const sort = signal<SortOrder>({ column: 'cycle', falls: false });
  const search = createTrackSearch(createWork());
  followUnit(unit, texts);
  followOrbit({ texts, unit, orbit: app.document.orbit, first: orbit });
  const wishes = computed(() => {
    const { body, mean } = app.document.orbit.value ?? orbit;
    const { eccentricity, inclinationRad } = mean;
    const kmPerUnit = kmPerLengthUnit({ lengthUnit: unit.value });
    const kind = inclination.value;
    return readWishes({ texts: texts.value, inclination: kind, kmPerUnit, body, eccentricity, inclinationRad });
  });
  const problem = computed(() => {
    const { request } = wishes.value;
    const refused = search.refused.value;
    return request && refused?.key === keyOf(request) ? refused.problem : null;
  });
  const errors = computed(() => {
    const field = problem.value && fieldOf(problem.value);
    return field && problem.value
      ? { [field]: { message: problem.value.message }, ...wishes.value.errors }
      : wishes.value.errors;
  });
  const trouble = computed(() => (problem.value && !fieldOf(problem.value) ? problem.value.message : null));
  const listing = createListing({ search, wishes, show, sort, unit });
  return { texts, inclination, show, sort, search, wishes, errors, trouble, listing };
}

type ListingParts = Pick<TracksModel, 'search' | 'wishes' | 'show' | 'sort'> & {
  readonly unit: ReadonlySignal<'km' | 'NM'>;
};

/** In steps, so that a change of order measures no spacing again. */
function createListing({ search, wishes, show, sort, unit }: ListingParts): ReadonlySignal<Listing | null> {
  const filter = lastReadable(wishes);
  const latitudeRad = computed(() => filter.value?.latitudeRad ?? 0);
  const tracks = computed((): Tracks | null => {
    const found = search.found.value;
    if (!found) return null;
    const { columns } = found.answer;
    const { body } = found.request;
    return { body, columns, acrossKm: acrossTracks(columns, body, latitudeRad.value) };
  });
  const listed = computed(() => (tracks.value && filter.value ? kept(tracks.value, filter.value) : null));
  const order = computed(() => {
    if (!tracks.value || !listed.value || !filter.value) return null;
    const shown = show.value === 'all' ? listed.value : withoutGap(tracks.value, listed.value, filter.value);
    return sorted(tracks.value, shown, sort.value);
  });
  return computed(() => {
    const request = search.found.value?.request;
    if (isOfOtherBody(request, wishes.value)) return null;
    if (!request || !tracks.value || !listed.value || !filter.value || !order.value) return null;
    const answer = answerOf({
      tracks: tracks.value,
      request,
      filter: filter.value,
      listed: listed.value,
      lengthUnit: unit.value,
    });
    const staleBecause = staleness(search, wishes.value);
    return { tracks: tracks.value, order: order.value, answer, swathKm: filter.value.swathKm, staleBecause };
  });
}

/** Tracks around another body are no older answer to this question: they are none. */
function isOfOtherBody(found: RepeatRequest | undefined, { request }: TrackWishes): boolean {
  if (!found || !request || found.body === request.body) return false;
  return JSON.stringify(found.body) !== JSON.stringify(request.body);
}

function staleness(search: TrackSearch, { request, filter }: TrackWishes): string | null {
  const found = search.found.value;
  if (!request || !filter) return 'Listed for the last good fields: one of them cannot be read yet.';
  if (found?.key === keyOf(request)) return null;
  const running = search.running.value;
  if (running) return running.isNoticed ? 'Listed for the search before; the new one is under way.' : null;
  const stopped = search.stopped.value;
  return `${stopped ? `${stopped.text} ` : ''}Listed for the search before.`;
}

/**
 * The filter as last readable, so that a half-typed width does not empty the list; the same object as long as it says the
 * same, so that a change elsewhere does not take the list back to its top.
 */
function lastReadable(wishes: ReadonlySignal<TrackWishes>): ReadonlySignal<TrackFilter | null> {
  let last: TrackFilter | null = null;
  return computed(() => {
    const { filter } = wishes.value;
    if (filter && JSON.stringify(filter) !== JSON.stringify(last)) last = filter;
    return last;
  });
}

type Band = Pick<TrackTexts, 'lowest' | 'highest'>;

function bandAround(orbit: ResolvedOrbit, lengthUnit: 'km' | 'NM'): Band {
  const around = (offsetKm: number) => {
    const km = Math.max(0, Math.round((altitudeKmOf(orbit) + offsetKm) / 50) * 50);
    return convertedText(String(km), 1 / kmPerLengthUnit({ lengthUnit }));
  };
  return { lowest: around(-100), highest: around(100) };
}

/** 100 km to either side, rounded to 50. */
const bandReachKm = 125;

const altitudeKmOf = ({ body, mean }: ResolvedOrbit): number => mean.semiMajorAxisKm - body.equatorialRadiusKm;

interface FollowParts {
  readonly texts: Signal<TrackTexts>;
  readonly unit: ReadonlySignal<'km' | 'NM'>;
  readonly orbit: ReadonlySignal<ResolvedOrbit | null>;
  readonly first: ResolvedOrbit;
}

/**
 * Around another body the band starts anew. Around the same one it moves once the orbit has left it, unless the band was
 * typed: a track taken from the list lies in the band and leaves the list in place.
 */
function followOrbit({ texts, unit, orbit, first }: FollowParts): void {
  let bandOf = first;
  effect(() => {
    const now = orbit.value;
    if (!now) return;
    const { lowest, highest } = texts.peek();
    const given = bandAround(bandOf, unit.peek());
    const isTyped = lowest !== given.lowest || highest !== given.highest;
    const isOtherBody = now.body !== bandOf.body && JSON.stringify(now.body) !== JSON.stringify(bandOf.body);
    const isWithin = Math.abs(altitudeKmOf(now) - altitudeKmOf(bandOf)) <= bandReachKm;
    if (!isOtherBody && (isTyped || isWithin)) return;
    bandOf = now;
    texts.value = { ...texts.peek(), ...bandAround(now, unit.peek()) };
  });
}

function startingTexts(orbit: ResolvedOrbit, lengthUnit: 'km' | 'NM'): TrackTexts {
  return {
    ...bandAround(orbit, lengthUnit),
    longest: '12',
    swath: '',
    latitude: '0',
    shortest: '',
    narrowest: '',
    widest: '',
    cycle: '',
  };
}

/** Within a tenth of the Sun's own rate. */
function isSunSynchronous({ body, mean }: ResolvedOrbit): boolean {
  if (!body.yearDays) return false;
  const sunRadPerS = twoPi / (body.yearDays * secondsPerDay);
  return Math.abs(secularRates(body, mean, 'second').nodeRadPerS / sunRadPerS - 1) < 0.1;
}

const lengthFields: readonly TrackField[] = ['lowest', 'highest', 'swath', 'narrowest', 'widest'];

/** What was typed in the other unit is written in the new one. */
function followUnit(unit: ReadonlySignal<'km' | 'NM'>, texts: Signal<TrackTexts>): void {
  let before = unit.peek();
  unit.subscribe((next) => {
    if (next === before) return;
    const factor = kmPerLengthUnit({ lengthUnit: before }) / kmPerLengthUnit({ lengthUnit: next });
    before = next;
    const changed = lengthFields.map((field) => [field, convertedText(texts.peek()[field], factor)]);
    texts.value = { ...texts.peek(), ...Object.fromEntries(changed) };
  });
}

function convertedText(text: string, factor: number): string {
  const number = readNumber(text);
  return number.ok ? String(Number((number.value * factor).toFixed(3))) : text;
}
