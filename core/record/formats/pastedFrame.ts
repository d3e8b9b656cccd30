/** The axes that a paste names. */
import type { InputFrame } from '../candidate';

/**
 * True of date is none of these frames, and "ECI" leaves open which equator: both are for the user to say.
 * GCRF and ICRF lie within 0.03″ of J2000.
 */
const names: readonly (readonly [InputFrame, RegExp])[] = [
  [
    'earthFixed',
    /\b(?:ECEF|ECR|ECF|ITR[FS](?:[- ]?(?:19|20)?\d\d)?|earth[- ]?(?:centred|centered)?,? ?[- ]?fixed)\b/gi,
  ],
  ['j2000', /\b(?:(?:EME|J) ?[- ]?2000(?:\.0)?|GCR[FS]|ICRF)\b/gi],
  ['teme', /\bTEME\b/gi],
  ['meanOfDate', /\b(?:mean[- ](?:equator[- ](?:and[- ]equinox[- ])?)?of[- ]date|MOD)\b/gi],
];

/** Names with digits in them that say nothing about axes. */
const otherNames = /\bWGS[- ]?(?:72|84)\b/gi;

/** The frame, where one alone is named, and the text with all names taken out, digits and all. */
export function frameIn(text: string): { readonly frame: InputFrame | null; readonly rest: string } {
  const named = names.filter(([, pattern]) => text.search(pattern) >= 0);
  const rest = names.reduce((left, [, pattern]) => left.replace(pattern, ' '), text.replace(otherNames, ' '));
  return { frame: named.length === 1 ? (named[0]?.[0] ?? null) : null, rest };
}
