/** The book's sentences: the headline, and the platform's answers in plain words. */
import type { PersistenceAnswer, StorageEstimateBytes } from '../store/persistence';

const words = [
  'No',
  'One',
  'Two',
  'Three',
  'Four',
  'Five',
  'Six',
  'Seven',
  'Eight',
  'Nine',
  'Ten',
  'Eleven',
  'Twelve',
] as const;

/** Such as `Six orbits` or `1 orbit`: a word up to twelve where it opens the sentence. */
export function countText(count: number, noun: string): string {
  return `${words[count] ?? count} ${count === 1 ? noun : plural(noun)}`;
}

const plural = (noun: string) => (noun.endsWith('ch') ? `${noun}es` : `${noun}s`);

export interface HeadlineParts {
  readonly count: string;
  readonly name: string;
  readonly state: string;
}

export interface OpenOrbit {
  readonly name: string;
  readonly inBook: boolean;
  readonly changed: boolean;
}

/** In three parts, since the name in the middle is set in bold. */
export function headlineParts(count: number, open: OpenOrbit): HeadlineParts {
  return {
    count: count === 0 ? 'This book is empty; ' : `${countText(count, 'orbit')} in this book; `,
    name: open.name.trim() || 'An orbit without a name',
    state: openState(open),
  };
}

function openState({ inBook, changed }: OpenOrbit): string {
  if (!inBook) return ' is open and not saved yet.';
  return changed ? ' is open and has unsaved changes.' : ' is open, as saved.';
}

export const persistenceTexts: Readonly<Record<PersistenceAnswer, string>> = {
  granted: 'This browser has agreed to keep the book, even when the device runs short of space.',
  refused:
    'This browser has not promised to keep the book: it may clear it when space runs short. Adding Driftbook to the home screen usually changes that.',
  unsupported:
    'This browser cannot be asked to keep the book. It may clear it after weeks without a visit, unless Driftbook is on the home screen.',
  notAsked: 'Not asked yet. The browser is asked to keep the book at your first save.',
};

const bytesPerMB = 1e6;

/** Such as `0.4 MB used, 980 MB free.` */
export function estimateText({ usedBytes, availableBytes }: StorageEstimateBytes): string {
  return `${sizeText(usedBytes)} used, about ${sizeText(Math.max(0, availableBytes))} free.`;
}

function sizeText(bytes: number): string {
  const megabytes = bytes / bytesPerMB;
  if (megabytes >= 1000) return `${(megabytes / 1000).toFixed(1)} GB`;
  return megabytes >= 10 ? `${Math.round(megabytes)} MB` : `${megabytes.toFixed(1)} MB`;
}
