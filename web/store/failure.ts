/** Why something could not be kept, in plain words. Nothing in memory is lost by any of these. */

export type FailureReason =
  /** No storage at all: a private window, or switched off by the user. */
  | 'refused'
  /** The browser did not open its storage in reasonable time. */
  | 'noAnswer'
  /** Another tab with an older version holds the storage. */
  | 'blocked'
  /** The stored book was written by a newer version. */
  | 'newer'
  /** A newer version in another tab has taken the storage over. */
  | 'superseded'
  /** Another tab holds the editor. */
  | 'elsewhere'
  | 'full'
  | 'failed';

export interface StoreFailure {
  readonly ok: false;
  readonly reason: FailureReason;
  readonly message: string;
}

const messages: Readonly<Record<FailureReason, string>> = {
  refused:
    'This browser does not let Driftbook keep anything here, as in a private window. You can work, but what you type is gone when this tab closes.',
  noAnswer:
    'This browser did not open its storage in time. You can work, but what you type is gone when this tab closes; load the page again to try once more.',
  blocked:
    'Another tab with an older Driftbook holds the book. Close the other Driftbook tabs, then open this one again.',
  newer: 'The book on this device was written by a newer Driftbook. Load the newer version to open it.',
  superseded: 'A newer Driftbook was opened in another tab. Load this tab again to go on saving.',
  elsewhere: 'This book is being edited in another tab. Take over editing here to go on.',
  full: 'The storage of this device is full. Nothing you typed is lost yet: free some space, then save again.',
  failed: 'The device could not write to its storage. Nothing you typed is lost yet: try to save again.',
};

export const failure = (reason: FailureReason): StoreFailure => ({ ok: false, reason, message: messages[reason] });

const reasonsByErrorName: Readonly<Record<string, FailureReason>> = {
  QuotaExceededError: 'full',
  VersionError: 'newer',
  SecurityError: 'refused',
};

/** Turns what the platform throws into a failure. Anything else is a fault of this program and is thrown on. */
export function failureFrom(error: unknown): StoreFailure {
  if (!(error instanceof DOMException) || error.name === 'DataCloneError') throw error;
  return failure(reasonsByErrorName[error.name] ?? 'failed');
}
