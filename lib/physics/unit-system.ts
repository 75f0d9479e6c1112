/** The electromagnetic convention of a calculation. */
export type EmConvention = "si" | "gaussian";

/** The published set of constants in force. */
export type EditionName = "codata-2018" | "codata-2022";

/** What decides the meaning of units and constants. */
export interface UnitSystem {
  readonly edition: EditionName;
  readonly em: EmConvention;
}
