/** Something that is fetched while the page already stands, and is then there at once. */
interface Fetched<T> {
  /** Null until it has come. */
  readonly now: () => T | null;
  /** Settles when it has come or cannot; never rejects. */
  readonly settled: Promise<void>;
}

export function fetched<T>(load: () => Promise<T>): Fetched<T> {
  let known: T | null = null;
  const settled = load().then(
    (value) => {
      known = value;
    },
    // Without a network, and not cached yet: whoever asks is told to load the page again.
    () => {},
  );
  return { now: () => known, settled };
}
