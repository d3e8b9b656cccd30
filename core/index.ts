/** Table of contents of all that is public. */
export type { Body } from './bodies/body';
export { type KeplerianElements, type MeanElements, type OsculatingElements, type StateVector, type Theory } from './orbit/elements';
export { eccentricFromMean, eccentricFromTrue, meanFromTrue, trueFromEccentric, trueFromMean } from './orbit/kepler';
export { ellipsoidHeightKm, type HeightRange, heightsAlongOrbit } from './orbit/heights';
export {
  ConversionError,
  type ConversionProblem,
  type MeanResult,
  meanFromState,
  stateFromMean,
  tryMeanFromOsculating,
  tryMeanFromState,
} from './orbit/meanState';
export { type Periods, periods } from './orbit/periods';
export { type SecularRates, secularRates } from './orbit/secularRates';
export { elementsFromState, stateFromElements } from './orbit/state';
export { blankCandidate, fieldTexts } from './record/blankCandidate';
export {
  type BodyId,
  bodyIds,
  type Candidate,
  candidateSchema,
  type EntryForm,
  entryForms,
  type FieldId,
  fieldIds,
  type GravitySetId,
  gravitySetIds,
  type InputFrame,
  inputFrames,
  type NodeForm,
  nodeForms,
  type OrbitEntry,
} from './record/candidate';
export { type CandidateError, lengthCaps, type ParsedCandidate, parseCandidate } from './record/candidateSchema';
