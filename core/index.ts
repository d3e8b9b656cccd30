/** Table of contents of all that is public. */

export {
  type AtmosphereLayer,
  airDensityKgPerM3,
  atmosphereLayers,
  type DensityLevel,
  densityFactor,
} from './bodies/atmosphere';
export { bodies } from './bodies/bodies';
export type { Body } from './bodies/body';
export { type CustomBodyInput, customBody } from './bodies/customBody';
export { gravitySets } from './bodies/earth';
export { isoFromJulianDate, type JulianDateResult, julianDateFromIso, seriesSpan } from './bodies/julianDate';
export { type MoonPosition, moonPosition } from './bodies/moonPosition';
export { type Matrix3, nodePrecessionRadPerS, precessionMatrix, transform } from './bodies/precession';
export { meanSiderealTimeRad } from './bodies/siderealTime';
export { equationOfTimeS, meanSunRightAscensionRad, type SunPosition, sunPosition } from './bodies/sun';
export { type SunAt, type SunModel, type SunSeen, sunSeenFrom } from './bodies/sunSeenFrom';
export { deltaTSeconds, terrestrialTimeJd } from './bodies/timeScales';
export { type ChartCondition, type ChartCurve, chartCurve } from './design/chartCurves';
export { type ChartLine, type ChartWindow, chartLine, distanceToLinePx } from './design/chartLines';
export { chartRepeats, type RepeatRoom } from './design/chartRepeats';
export {
  type ChartFloor,
  type ChartShape,
  chartFloor,
  chartShapeOf,
  eccentricityAt,
} from './design/chartShape';
export {
  type ChartPoint,
  type ChartScale,
  crossingNear,
  distancePx,
  footOn,
  type Snapped,
  type SnapRequest,
  snapPoint,
} from './design/chartSnap';
export type { Cycle } from './design/closingOrbit';
export type { OrbitCondition } from './design/conditions/registry';
export { type ConditionWorking, conditionWorkings, type WorkingsInput } from './design/conditionWorkings';
export { type FrozenOptions, frozenOrbit } from './design/frozen';
export type { FrozenInput } from './design/frozenChecks';
export type { FrozenOrbit, FrozenRefusal, FrozenResult, FrozenShape, NoFrozenOrbit } from './design/frozenResult';
export { type NearestRepeat, type NearestRequest, type NearestResult, nearestRepeats } from './design/nearestRepeats';
export { neighbourDays } from './design/neighbourDays';
export {
  longestCycleDays,
  type RepeatField,
  type RepeatProblem,
  type RepeatReason,
  type RepeatRequest,
  RepeatTracksError,
  type TrackInclination,
} from './design/repeatProblem';
export {
  type RepeatChunk,
  type RepeatSearch,
  type RepeatTrack,
  type RepeatTracksFound,
  repeatTrackSearch,
  repeatTracks,
  type SearchedBand,
  tryRepeatTracks,
} from './design/repeatTracks';
export type { NoOrbit, NoOrbitReason, ReasonKind, SolvedOrbit, SolveResult } from './design/solve/answer';
export type { FreeElement } from './design/solve/problem';
export { type SolveInput, solveOrbit } from './design/solveOrbit';
export { type CycleResult, readCycle } from './design/trackCycle';
export {
  type CrossingOptions,
  type EquatorCrossing,
  equatorCrossings,
  type Neighbour,
  type SubCycle,
  type TrackPattern,
  type TrackStep,
  trackPattern,
  trackStepOf,
} from './design/trackPattern';
export {
  closedFromLatitude,
  greatestLatitudeRad,
  type SwathFit,
  swathFit,
  type TrackGrid,
  type TrackSpacing,
  trackSpacingAt,
} from './design/trackSpacing';
export { ballisticKgPerM2, type DragInput, type DragOptions, type DragShape, dragForce } from './forces/drag';
export type { Force } from './forces/force';
export { moonPlace, type SkyPlace, smoothedPlace, sunPlace } from './forces/skyPlaces';
export { moonForce, sunForce, sunMuKm3PerS2, type ThirdBody, thirdBodyForce } from './forces/thirdBody';
export { highestZonalDegree, zonalForce } from './forces/zonal';
export { type AveragedModel, type AveragedRates, averagedRates } from './mission/averagedRates';
export { type CircularShadow, circularEclipseShare, eclipseFreeBetaRad } from './mission/circularEclipse';
export { type ClosedFormDrift, closedFormDrift, type DriftLines } from './mission/closedFormDrift';
export { elementsFromEquinoctial, equinoctialFromElements, type Sense, senseOf } from './mission/equinoctial';
export type {
  AltitudeLimit,
  EventKind,
  EventsRequest,
  EventValue,
  LocalTimeBox,
  MissionEvent,
  MissionEvents,
} from './mission/event';
export { missionEvents } from './mission/events';
export type { GroundLine } from './mission/groundLines';
export { type GroundTrack, type GroundTrackProblem, type GroundTrackRequest, groundTrack } from './mission/groundTrack';
export { type DatedMean, type HistoryCurve, historyCurve } from './mission/historyCurve';
export type { LeftOutForce } from './mission/historyForces';
export {
  type HistoryField,
  type HistoryForces,
  type HistoryMessage,
  type HistoryRequest,
  HistoryRequestError,
  historyCautions,
  historyProblems,
  longestSpanDays,
} from './mission/historyRequest';
export type { HistorySample } from './mission/historySamples';
export type { HistoryEnd } from './mission/historyTrack';
export {
  type IntegratedOrbit,
  type IntegratedSample,
  IntegrationError,
  type IntegrationOptions,
  type IntegrationRequest,
  integrateOrbit,
} from './mission/integrateOrbit';
export {
  type EffectChange,
  type EffectsLedger,
  effectsLedger,
  type LedgerRow,
} from './mission/ledger';
export type { LedgerEffect } from './mission/ledgerStages';
export type { LeftOutBound } from './mission/leftOutBounds';
export { betaRad, type EclipseTimes, eclipse, LightError } from './mission/light';
export {
  type LightHistory,
  type LightRequest,
  type LightRow,
  type LightSummary,
  lightHistory,
  type Season,
} from './mission/lightHistory';
export {
  type LocalTimeAt,
  type LocalTimeHistory,
  type LocalTimeModel,
  type LocalTimePoint,
  type LocalTimeRequest,
  localTimeHistory,
  localTimeModel,
} from './mission/localTimeHistory';
export { decayHeightKm, type HistoryOptions, type MissionHistory, missionHistory } from './mission/missionHistory';
export { meanOfSteady, steadyMean } from './mission/steadyMean';
export { degPerRad, radPerDeg, secondsPerDay, twoPi, wrapPi, wrapTwoPi } from './numerics/angles';
export { componentScale, type ErrorScale, type OdeEnd, type OdeProblem, type OdeStep, odeSteps } from './numerics/ode';
export type { KeplerianElements, MeanElements, OsculatingElements, StateVector, Theory } from './orbit/elements';
export {
  elementsFromMeanOfDate,
  elementsToMeanOfDate,
  type FrameAtEpoch,
  type InertialFrame,
  type StateFrame,
  stateFromMeanOfDate,
  stateToMeanOfDate,
} from './orbit/frames';
export { ellipsoidHeightKm, type HeightRange, heightsAlongOrbit } from './orbit/heights';
export { eccentricFromMean, eccentricFromTrue, meanFromTrue, trueFromEccentric, trueFromMean } from './orbit/kepler';
export { type LocalTimeOptions, localTimeDriftSPerS, localTimeOfNodeH, nodeFromLocalTimeRad } from './orbit/localTime';
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
export { apsidesAt, apsisName } from './record/bodyWords';
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
export { canonicalText } from './record/canonicalText';
export {
  type ConditionEntry,
  type ConditionField,
  type ConditionFieldWords,
  type ConditionWords,
  conditionFields,
  conditionWords,
  elementNames,
  type SettledElement,
  settledElements,
} from './record/conditions/kinds';
export {
  type ConditionErrors,
  conditionEntry,
  newCondition,
  type ReadCondition,
  readConditions,
} from './record/conditions/readConditions';
export { type Settlement, settleOrbit } from './record/conditions/settleOrbit';
export { driftHeadline, firstOrderSentence } from './record/driftHeadline';
export { kmPerLengthUnit } from './record/entry/shape';
export { type EntryTags, type EntryTexts, entryFromOrbit } from './record/entryFromOrbit';
export { fingerprint, fingerprintAlphabet, fingerprintLine } from './record/fingerprint';
export { readStateText, type StateTextResult } from './record/formats/stateText';
export { parseTle, type TwoLineElements, type TwoLineResult } from './record/formats/twoLine';
export { twoLineSetIn } from './record/formats/twoLineColumns';
export type { TwoLineError } from './record/formats/twoLineFields';
export { type Expr, evaluate, mapSymbols, symbolsIn, type Values } from './record/formula';
export { formulaText } from './record/formulaText';
export { type HeadlineSpan, headlineOf } from './record/headline';
export {
  knownLimits,
  type Limit,
  type LimitBound,
  type LimitEntry,
  type LimitMargin,
  limitMargins,
  marginLeft,
  type ReadLimit,
  readLimits,
} from './record/limits';
export { violatesAt } from './record/limitsAt';
export { convertedText, limitInUnit } from './record/limitUnits';
export { type LimitsJudged, limitsSentence, limitText, marginText } from './record/limitWords';
export { type Migration, migrateCandidate } from './record/migrate';
export { forcesText, localTimeClaim, type MissionOutcome, missionHeadline } from './record/missionHeadline';
export {
  changedPlans,
  type DensityChoice,
  type MissionChange,
  type MissionEntry,
  type MissionField,
  type MissionSettings,
  readMissionSettings,
} from './record/missionSettings';
export { type NumberReading, type NumberResult, readNumber } from './record/numberText';
export { type FieldReader, fieldReader } from './record/readFields';
export type { Doubt } from './record/readings/doubt';
export type {
  Alternate,
  Reading,
  ReadingId,
  ReadingLevel,
  ReadingMark,
  ReadingPoint,
  ReadingSpec,
  Sensitivities,
} from './record/readings/reading';
export { type AbsentReading, absentReadings, readingSpec, readingsOf } from './record/readings/readings';
export type { FieldError, FieldErrors, Notice, Resolution, ResolvedOrbit } from './record/resolved';
export { resolveOrbit } from './record/resolveOrbit';
export { storedLimitText } from './record/storedLimitText';
export { limitCrossings, pointAt, type Sweep, type SweepRequest, sweepReading } from './record/sweep';
export { placeText, type SweepWriting, shortText, sweepSentence } from './record/sweepHeadline';
export {
  type SweptElement,
  type SweptWords,
  startingRange,
  sweptChanges,
  sweptElements,
  sweptWords,
} from './record/sweptElements';
export {
  type DisplayUnit,
  displayUnits,
  formatClock,
  formatNumber,
  formatQuantity,
  formatSignificant,
  type Quantity,
  signedQuantities,
  unitOf,
} from './record/units';
export { tinyEccentricity, warningsOf } from './record/warnings';
export type { WorkingSymbol } from './record/workings/symbols';
export type { Working, WorkingConstant, WorkingLine, WorkingValue } from './record/workings/working';
export { workingDigits } from './record/workings/working';
export { workingOf } from './record/workings/workingOf';
