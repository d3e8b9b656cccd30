/** What the typed entry comes to: one orbit in mean elements, or a message at each field that is in the way. */
import type { Body } from '../bodies/body';
import type { MeanElements } from '../orbit/elements';
import type { EntryForm, FieldId } from './candidate';

export interface ResolvedOrbit {
  readonly body: Body;
  /** Brouwer mean elements (SGP4's for two-line elements), mean equator and equinox of the epoch. */
  readonly mean: MeanElements;
  /** UTC Julian date, null where none was typed and none is needed. */
  readonly epochJd: number | null;
  readonly theory: 'Brouwer' | 'SGP4';
  readonly origin: EntryForm;
  readonly typedAs: 'mean' | 'osculating';
  /** Where eccentricity and perigee are those that the odd zonals hold still. */
  readonly frozen?: true;
}

export interface FieldError {
  readonly message: string;
  /** Where a number reads two ways: each reading as a text that reads one way only. */
  readonly choices?: readonly { readonly text: string; readonly label: string }[];
}
export type FieldErrors = Partial<Record<FieldId, FieldError>>;

export interface Notice {
  readonly id: string;
  readonly severity: 'note' | 'caution';
  readonly field?: FieldId;
  readonly text: string;
}

export type Resolution =
  | { readonly ok: true; readonly orbit: ResolvedOrbit; readonly notices: readonly Notice[] }
  | { readonly ok: false; readonly errors: FieldErrors; readonly notices: readonly Notice[] };
