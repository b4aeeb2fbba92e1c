// The core door: needs no package.
export { mixAlbedo } from "./albedo/mixAlbedo.ts";
export { quadraticAlbedo } from "./albedo/quadraticAlbedo.ts";
export { rampAlbedo } from "./albedo/rampAlbedo.ts";
export { tanhAlbedo } from "./albedo/tanhAlbedo.ts";
export { parabolicCover } from "./biosphere/parabolicCover.ts";
export { steadyCover } from "./biosphere/steadyCover.ts";
export type {
  Brightening,
  SteadyBrightening,
  SunlikeBrightening,
  TabledBrightening,
} from "./branches/brightening.ts";
export type {
  Branch,
  BranchEnd,
  BranchPoint,
  Diagram,
  Fold,
  Gap,
  Jump,
  UndecidedStretch,
} from "./branches/diagram.ts";
export type { Cusp, FoldCurve, FoldCurveEnd, FoldDiagram, FoldPoint } from "./branches/foldDiagram.ts";
export { type FollowedState, type FollowStateOptions, followState } from "./branches/followState.ts";
export type { Margin, TippingMargins, TippingMarginsOptions } from "./branches/margins.ts";
export type { Solution, Solutions } from "./branches/solutions.ts";
export { type SolveForOptions, solveFor } from "./branches/solveFor.ts";
export { type StatesOnDiagram, statesOnDiagram } from "./branches/statesOnDiagram.ts";
export { tippingMargins } from "./branches/tippingMargins.ts";
export { type TraceBranchesOptions, traceBranches } from "./branches/traceBranches.ts";
export { type TraceFoldsOptions, traceFolds } from "./branches/traceFolds.ts";
export { type AnalyseFeedbacksOptions, analyseFeedbacks } from "./feedback/analyseFeedbacks.ts";
export { type AssessedNames, assessedLoop } from "./feedback/assessedLoop.ts";
export {
  type AssessedResponse,
  type AssessedResponseOptions,
  assessedResponse,
} from "./feedback/assessedResponse.ts";
export { AR6_FEEDBACKS, type Estimate, type FeedbackAssessment } from "./feedback/assessment.ts";
export { type CompareHeldOptions, compareHeld } from "./feedback/compareHeld.ts";
export type { FeedbackNote, FeedbackNoteCode } from "./feedback/feedbackNote.ts";
export type { DisturbanceTimes, FeedbackLoop, FeedbackPart, Feedbacks } from "./feedback/feedbacks.ts";
export type { BranchLoss, HeldComparison, HeldResponse, PathPlace } from "./feedback/heldComparison.ts";
export type { LawCard, ListPort, Port, Ports } from "./graph/card.ts";
export {
  add,
  div,
  exp,
  fourth,
  inUnit,
  log,
  max,
  min,
  mix,
  mul,
  neg,
  product,
  sqrt,
  square,
  sub,
  sum,
  tanh,
} from "./graph/operations.ts";
export type { Of, Quantity, Value } from "./graph/quantity.ts";
export { blackbodyFlux } from "./greenhouse/blackbodyFlux.ts";
export { blackbodyTemperature } from "./greenhouse/blackbodyTemperature.ts";
export {
  equilibriumTemperature,
  REDISTRIBUTION_DAYSIDE,
  REDISTRIBUTION_GLOBAL,
  REDISTRIBUTION_INSTANT,
  REDISTRIBUTION_SUBSTELLAR,
} from "./greenhouse/equilibriumTemperature.ts";
export { greyColumnEmission } from "./greenhouse/greyColumnEmission.ts";
export { greyEmission } from "./greenhouse/greyEmission.ts";
export { linearEmission } from "./greenhouse/linearEmission.ts";
export { opaqueLayers } from "./greenhouse/opaqueLayers.ts";
export * from "./ground/constants.ts";
export { CONSTANTS, type ConstantRecord } from "./ground/constantsTable.ts";
export { ERROR_CODES, type ErrorCode, ThermosteadError } from "./ground/errors.ts";
export type { Range } from "./ground/range.ts";
export { atmosphereCapacity } from "./heat/atmosphereCapacity.ts";
export { mixedLayerCapacity } from "./heat/mixedLayerCapacity.ts";
export { defineLaw } from "./law/defineLaw.ts";
export { type SampledLawSpec, sampledLaw } from "./law/sampledLaw.ts";
export { type Slopes, slopesOf } from "./law/slopesOf.ts";
export type { Body, Law, LawDemand, LawFacts, LawSpec, NumberBody, Wires } from "./law/types.ts";
export type { StateLike } from "./loop/checkBelongs.ts";
export { closeLoop } from "./loop/closeLoop.ts";
export { type FormulaOptions, formulaOf, type LoopFormula } from "./loop/formulaOf.ts";
export { holdFixed } from "./loop/holdFixed.ts";
export { type LawSource, sourcesOf } from "./loop/sourcesOf.ts";
export type { Budget, Couplings, Flow, Givens, Loop, Named, Tools, Variables } from "./loop/types.ts";
export { withGivens } from "./loop/withGivens.ts";
export { orbitMeanFlux } from "./orbit/orbitMeanFlux.ts";
export { semiMajorAxis } from "./orbit/semiMajorAxis.ts";
export { temperatureMeanFlux } from "./orbit/temperatureMeanFlux.ts";
export { absorbedFlux } from "./star/absorbedFlux.ts";
export { localAbsorbedFlux } from "./star/localAbsorbedFlux.ts";
export { stellarBrightening } from "./star/stellarBrightening.ts";
export { stellarFlux } from "./star/stellarFlux.ts";
export { stellarLuminosity } from "./star/stellarLuminosity.ts";
export { type FindStatesOptions, findStates } from "./states/findStates.ts";
export { type FindStatesForOptions, findStatesFor, type GivenColumns } from "./states/findStatesFor.ts";
export type { Note, NoteCode } from "./states/note.ts";
export { type CountTile, type ProveCountOptions, type ProvedCount, proveCount } from "./states/proveCount.ts";
export type { FoundStates, Ledger, State, Undecided } from "./states/state.ts";
export { ROW_STATUS, type StateColumns } from "./states/stateColumns.ts";
