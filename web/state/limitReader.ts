/** Loaded with the first limit of any candidate: what reads limits and says what is left of them. */
export { limitMargins, limitsSentence, marginText, readLimits } from '../../core/index';
