/** Which entries the list shows, and in which order. */
import type { Candidate } from '../../core/index';
import type { BookEntry } from '../store/readStored';
import { meanAltitudeKm, type OrbitSummary, type SummarisedOrbit } from './orbitSummary';

export interface ListedEntry {
  readonly id: string;
  readonly name: string;
  /** Null where the open orbit was never saved. */
  readonly saved: { readonly revision: number; readonly atIso: string } | null;
  readonly demo: boolean;
  readonly isOpen: boolean;
  readonly content:
    | { readonly kind: 'readable'; readonly candidate: Candidate; readonly summary: OrbitSummary }
    | { readonly kind: 'unreadable'; readonly message: string };
}

export const sortKeys = ['saved', 'name', 'altitude', 'inclination'] as const;
export type SortKey = (typeof sortKeys)[number];

export interface ListingParts {
  readonly entries: readonly BookEntry[];
  readonly summaryOf: (key: string, candidate: Candidate) => OrbitSummary;
  /** The orbit in the editor. Its content is asked for only where the book does not have it, since it changes at each key. */
  readonly openId: string;
  readonly open: () => { readonly candidate: Candidate; readonly summary: OrbitSummary };
}

/** The book's entries, with the open orbit in front of them where it is not among them. */
export function listedEntries({ entries, summaryOf, openId, open }: ListingParts): ListedEntry[] {
  const listed = entries.map((entry): ListedEntry => {
    const { id, revision, savedAtIso: atIso, demo } = entry;
    const facts = { id, name: entry.name, demo, saved: { revision, atIso }, isOpen: id === openId };
    if (entry.kind === 'unreadable') return { ...facts, content: { kind: 'unreadable', message: entry.message } };
    const { candidate } = entry;
    const summary = summaryOf(`${id}/${revision}/${atIso}`, candidate);
    return { ...facts, content: { kind: 'readable', candidate, summary } };
  });
  if (listed.some(({ isOpen }) => isOpen)) return listed;
  const { candidate, summary } = open();
  const content = { kind: 'readable', candidate, summary } as const;
  return [{ id: candidate.id, name: candidate.name, saved: null, demo: false, isOpen: true, content }, ...listed];
}

/** Letters that do not come apart into a base letter and a mark. */
const plainLetters: Readonly<Record<string, string>> = { ø: 'o', ł: 'l', đ: 'd', ß: 'ss', æ: 'ae', œ: 'oe', ı: 'i' };

/** Lower case without accents, so that "Ostsee Nr. 2" is found by "OSTSÉE". */
export function foldText(text: string): string {
  const bare = text
    .normalize('NFD')
    .replace(/\p{Diacritic}/gu, '')
    .toLowerCase();
  return bare.replace(/[øłđßæœı]/g, (letter) => plainLetters[letter] ?? letter);
}

/** True where every word of the query is in the name, the notes or the fingerprint. */
export function matches(entry: ListedEntry, query: string): boolean {
  const text = foldText(searchedText(entry));
  return foldText(query)
    .split(/\s+/)
    .every((word) => text.includes(word));
}

function searchedText({ name, content }: ListedEntry): string {
  if (content.kind === 'unreadable') return name;
  const letters = content.summary.kind === 'orbit' ? content.summary.fingerprint : '';
  return [name, content.candidate.notes, letters, letters.replace(' ', '')].join('\n');
}

const byName = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

type Order = (a: ListedEntry, b: ListedEntry) => number;
/** What was never saved comes first, as if it were saved now. */
const bySaved: Order = (a, b) => {
  const [first, second] = [a.saved?.atIso ?? '~', b.saved?.atIso ?? '~'];
  return first < second ? 1 : first > second ? -1 : 0;
};

/** Entries without an orbit have no such number and come last. */
function byNumber(numberOf: (orbit: SummarisedOrbit) => number): Order {
  const sortedBy = ({ content }: ListedEntry) =>
    content.kind === 'readable' && content.summary.kind === 'orbit'
      ? numberOf(content.summary)
      : Number.POSITIVE_INFINITY;
  return (a, b) => {
    const [first, second] = [sortedBy(a), sortedBy(b)];
    return first === second ? byName.compare(a.name, b.name) : first - second;
  };
}

const orders: Readonly<Record<SortKey, Order>> = {
  saved: bySaved,
  name: (a, b) => byName.compare(a.name, b.name) || bySaved(a, b),
  altitude: byNumber(meanAltitudeKm),
  inclination: byNumber((orbit) => orbit.inclinationRad),
};

export const sortEntries = (entries: readonly ListedEntry[], key: SortKey): ListedEntry[] =>
  [...entries].sort(orders[key]);
