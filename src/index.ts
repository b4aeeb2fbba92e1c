// The core door: needs no package.

export { bondAlbedo } from "./albedo/bondAlbedo.ts";
export { cloudShareAbsorbed } from "./albedo/cloudShareAbsorbed.ts";
export { cloudyAlbedo } from "./albedo/cloudyAlbedo.ts";
export { COVER_ALBEDOS, type CoverAlbedo } from "./albedo/coverAlbedos.ts";
export { iceShare } from "./albedo/iceShare.ts";
export { mixAlbedo } from "./albedo/mixAlbedo.ts";
export { quadraticAlbedo } from "./albedo/quadraticAlbedo.ts";
export { rampAlbedo } from "./albedo/rampAlbedo.ts";
export { stepAlbedo } from "./albedo/stepAlbedo.ts";
export { surfaceShareBelowCloud } from "./albedo/surfaceShareBelowCloud.ts";
export { tanhAlbedo } from "./albedo/tanhAlbedo.ts";
export { twoBandAlbedo } from "./albedo/twoBandAlbedo.ts";
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
  BranchCrossing,
  BranchEnd,
  BranchPoint,
  Diagram,
  Fold,
  Gap,
  GivenUnit,
  Jump,
  UndecidedStretch,
} from "./branches/diagram.ts";
export type {
  Cusp,
  FoldChange,
  FoldCurve,
  FoldCurveEnd,
  FoldDiagram,
  FoldMeeting,
  FoldPoint,
  FoldTouch,
  UndecidedFolds,
} from "./branches/foldDiagram.ts";
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
export { ch4AdjustedForcingEtminan } from "./forcing/ch4AdjustedForcingEtminan.ts";
export { ch4AdjustedForcingMeinshausen } from "./forcing/ch4AdjustedForcingMeinshausen.ts";
export { ch4AdjustedForcingMyhre } from "./forcing/ch4AdjustedForcingMyhre.ts";
export { ch4EffectiveForcingAr6 } from "./forcing/ch4EffectiveForcingAr6.ts";
export { co2AdjustedForcingEtminan } from "./forcing/co2AdjustedForcingEtminan.ts";
export { co2AdjustedForcingMeinshausen } from "./forcing/co2AdjustedForcingMeinshausen.ts";
export { co2AdjustedForcingMyhre } from "./forcing/co2AdjustedForcingMyhre.ts";
export { co2EffectiveForcingAr6 } from "./forcing/co2EffectiveForcingAr6.ts";
export { forcedEmission } from "./forcing/forcedEmission.ts";
export { n2oAdjustedForcingEtminan } from "./forcing/n2oAdjustedForcingEtminan.ts";
export { n2oAdjustedForcingMeinshausen } from "./forcing/n2oAdjustedForcingMeinshausen.ts";
export { n2oAdjustedForcingMyhre } from "./forcing/n2oAdjustedForcingMyhre.ts";
export { n2oEffectiveForcingAr6 } from "./forcing/n2oEffectiveForcingAr6.ts";
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
  step,
  sub,
  sum,
  tanh,
} from "./graph/operations.ts";
export type { Of, Quantity, Value } from "./graph/quantity.ts";
export { blackbodyFlux } from "./greenhouse/blackbodyFlux.ts";
export { blackbodyTemperature } from "./greenhouse/blackbodyTemperature.ts";
export { budykoEmission } from "./greenhouse/budykoEmission.ts";
export { ceilingEmission } from "./greenhouse/ceilingEmission.ts";
export { cloudyEmission } from "./greenhouse/cloudyEmission.ts";
export { daysideRedistribution } from "./greenhouse/daysideRedistribution.ts";
export { emissionHeight } from "./greenhouse/emissionHeight.ts";
export {
  equilibriumTemperature,
  REDISTRIBUTION_DAYSIDE,
  REDISTRIBUTION_GLOBAL,
  REDISTRIBUTION_INSTANT,
  REDISTRIBUTION_SUBSTELLAR,
} from "./greenhouse/equilibriumTemperature.ts";
export { greyColumnEmission } from "./greenhouse/greyColumnEmission.ts";
export { greyEmission } from "./greenhouse/greyEmission.ts";
export { greyGroundTemperature } from "./greenhouse/greyGroundTemperature.ts";
export { greySkinTemperature } from "./greenhouse/greySkinTemperature.ts";
export { groundBelowEmission } from "./greenhouse/groundBelowEmission.ts";
export { heightEmission } from "./greenhouse/heightEmission.ts";
export { kollCroninEmission } from "./greenhouse/kollCroninEmission.ts";
export { komabayashiIngersollLimit } from "./greenhouse/komabayashiIngersollLimit.ts";
export { layeredGroundTemperature } from "./greenhouse/layeredGroundTemperature.ts";
export { leakyStackEmission } from "./greenhouse/leakyStackEmission.ts";
export { linearEmission } from "./greenhouse/linearEmission.ts";
export { nightsideRedistribution } from "./greenhouse/nightsideRedistribution.ts";
export { northEmission } from "./greenhouse/northEmission.ts";
export { opaqueLayers } from "./greenhouse/opaqueLayers.ts";
export { pressureOpticalDepth } from "./greenhouse/pressureOpticalDepth.ts";
export { RUNAWAY_LIMITS, type RunawayLimit } from "./greenhouse/runawayLimits.ts";
export { simpsonNakajimaLimit } from "./greenhouse/simpsonNakajimaLimit.ts";
export { vapourOpticalDepth } from "./greenhouse/vapourOpticalDepth.ts";
export * from "./ground/constants.ts";
export { CONSTANTS, type ConstantRecord } from "./ground/constantsTable.ts";
export { ERROR_CODES, type ErrorCode, ThermosteadError } from "./ground/errors.ts";
export type { Range } from "./ground/range.ts";
export { HABITABLE_ZONE_FLUX_UNIT, type HabitableZoneCoefficients } from "./habitable/fluxPolynomial.ts";
export { habitableZoneDistance } from "./habitable/habitableZoneDistance.ts";
export { habitableZoneFlux } from "./habitable/habitableZoneFlux.ts";
export { HABITABLE_ZONE_LIMITS, type HabitableZoneLimit } from "./habitable/habitableZoneLimits.ts";
export { interpolatedRunawayFlux } from "./habitable/interpolatedRunawayFlux.ts";
export { atmosphereCapacity } from "./heat/atmosphereCapacity.ts";
export { mixedLayerCapacity } from "./heat/mixedLayerCapacity.ts";
export { defineLaw } from "./law/defineLaw.ts";
export type { SampledLawSpec } from "./law/functionLaw.ts";
export { type Slopes, slopesOf } from "./law/slopesOf.ts";
export type { Body, Law, LawDemand, LawFacts, LawSpec, NumberBody, Wires } from "./law/types.ts";
export type {
  LeakyLayer,
  LeakyStackLedger,
  LeakyStackOptions,
  StackLayerState,
} from "./ledger/leakyStack.ts";
export { leakyStackLedger } from "./ledger/leakyStackLedger.ts";
export type { LedgerNote, LedgerNoteCode } from "./ledger/ledgerNote.ts";
export type {
  PublishedBalance,
  PublishedBudget,
  PublishedFlow,
  PublishedLedger,
  PublishedValue,
} from "./ledger/published.ts";
export { publishedLedger } from "./ledger/publishedLedger.ts";
export { type StackSunlight, type StackSunlightOptions, stackSunlight } from "./ledger/stackSunlight.ts";
export type { StateLike } from "./loop/checkBelongs.ts";
export { closeLoop } from "./loop/closeLoop.ts";
export { type FormulaOptions, formulaOf, type LoopFormula } from "./loop/formulaOf.ts";
export { holdFixed } from "./loop/holdFixed.ts";
export { type LawSource, sourcesOf } from "./loop/sourcesOf.ts";
export type { Budget, Couplings, Flow, Givens, Loop, Named, Tools, Variables } from "./loop/types.ts";
export { withGivens } from "./loop/withGivens.ts";
export { apoastronFlux } from "./orbit/apoastronFlux.ts";
export { type FluxLimits, fluxTimeShare } from "./orbit/fluxTimeShare.ts";
export { orbitalPeriod } from "./orbit/orbitalPeriod.ts";
export { orbitMeanFlux } from "./orbit/orbitMeanFlux.ts";
export { orbitMeanTemperature } from "./orbit/orbitMeanTemperature.ts";
export { periastronFlux } from "./orbit/periastronFlux.ts";
export { semiMajorAxis } from "./orbit/semiMajorAxis.ts";
export { temperatureMeanFlux } from "./orbit/temperatureMeanFlux.ts";
export {
  INSTANT_FLUX_INERTIA,
  MEAN_FLUX_INERTIA,
  thermalInertiaRatio,
} from "./orbit/thermalInertiaRatio.ts";
export { absorbedFlux } from "./star/absorbedFlux.ts";
export { bandFraction } from "./star/bandFraction.ts";
export { combinedFlux } from "./star/combinedFlux.ts";
export { distanceInRadii } from "./star/distanceInRadii.ts";
export { fluxAtRadii } from "./star/fluxAtRadii.ts";
export { localAbsorbedFlux } from "./star/localAbsorbedFlux.ts";
export { MASS_LUMINOSITY_STEPS, massLuminosity } from "./star/massLuminosity.ts";
export { stellarBrightening } from "./star/stellarBrightening.ts";
export { stellarFlux } from "./star/stellarFlux.ts";
export { stellarLuminosity } from "./star/stellarLuminosity.ts";
export {
  type BudgetCurve,
  type BudgetCurveOptions,
  type BudgetPoint,
  budgetCurve,
} from "./states/budgetCurve.ts";
export { type FindStatesOptions, findStates } from "./states/findStates.ts";
export { type FindStatesForOptions, findStatesFor, type GivenColumns } from "./states/findStatesFor.ts";
export type { Note, NoteCode } from "./states/note.ts";
export { type CountTile, type ProveCountOptions, type ProvedCount, proveCount } from "./states/proveCount.ts";
export { sampledLaw } from "./states/sampledLaw.ts";
export type { FoundStates, Ledger, State, Undecided } from "./states/state.ts";
export { ROW_STATUS, type StateColumns } from "./states/stateColumns.ts";
export { co2FrostPoint } from "./water/co2FrostPoint.ts";
export { saturationPressureIce } from "./water/saturationPressureIce.ts";
export { saturationPressureLiquid } from "./water/saturationPressureLiquid.ts";
export { saturationTemperature } from "./water/saturationTemperature.ts";
