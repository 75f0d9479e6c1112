import type { Dimension } from "../dimension";

/** A constant as it stands in a table: decimal strings, as published. */
export interface ConstantRow {
  readonly symbol: string;
  readonly name: string;
  readonly value: string;
  /** Standard uncertainty in the same unit; null when exact. */
  readonly uncertainty: string | null;
  /** In the unit language; empty for a pure number. */
  readonly unit: string;
  readonly source: string;
  /** How the figures came here: read, computed, or known and checked. */
  readonly sourceStatus: string;
  /** The nominal GM in m³ s⁻², for a mass that is GM over the edition's G. */
  readonly massParameter?: string;
}

/** A constant of an edition, ready for use. */
export interface Constant {
  readonly symbol: string;
  readonly name: string;
  /** The value as published, a decimal string, and as a number, both in `unit`. */
  readonly text: string;
  readonly value: number;
  /** Standard uncertainty in `unit`; 0 when exact. */
  readonly uncertainty: number;
  readonly uncertaintyText: string | null;
  readonly unit: string;
  readonly siValue: number;
  readonly siUncertainty: number;
  readonly dimension: Dimension;
  readonly exact: boolean;
  readonly source: string;
  readonly sourceStatus: string;
  readonly nominalGM?: number;
}
