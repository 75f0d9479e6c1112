export {
  type Constant,
  editionNames,
  editionText,
  editionTitle,
  findConstant,
  listConstants,
} from "./constants";
export {
  angularDiameterDistance,
  comovingDistance,
  defaultCosmology,
  hubble,
  hubbleSlope,
  lookbackTime,
  luminosityDistance,
} from "./cosmology";
export {
  type BaseQuantity,
  baseQuantities,
  type Dimension,
  dimension,
  dimensionless,
  dimensionToJson,
  divideDimensions,
  formatDimension,
  multiplyDimensions,
  powerDimension,
} from "./dimension";
export { customaryUnit, describeDimension, dimensionName } from "./dimension-names";
export {
  findUnit,
  type ListedUnit,
  listUnits,
  type Unit,
  unitOfOtherConvention,
} from "./find-unit";
export { formatUnit, unitTex } from "./format-unit";
export { type Conversion, toGaussian, toSi } from "./gaussian";
export { type NominalMassExponent, type ParsedUnit, parseUnit } from "./parse-unit";
export { planckLambda, planckNu } from "./radiation";
export { readableUnit } from "./readable-unit";
export type { UnitFactor, UnitFailure } from "./unit-reader";
export type { EditionName, EmConvention, UnitSystem } from "./unit-system";
