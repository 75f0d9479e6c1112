import type { ConstantRow } from "./constant";

/**
 * Constants that have another value and dimension in the Gaussian convention. Charges convert by the
 * exact number 10 c; magnetons by 1 J/T = 10³ erg/gauss.
 */
export const gaussianOnly: ConstantRow = {
  symbol: "q_esu",
  name: "elementary charge, Gaussian",
  value: "4.80320471257026372e-10",
  uncertainty: null,
  unit: "esu",
  source: "exact: q_e in coulomb times 2997924580",
  sourceStatus: "computed from the exact constants",
};

/** Rows whose figures are those of the SI edition times a power of ten, in a Gaussian unit. */
export const gaussianForms: Readonly<Record<string, { unit: string; shift: number }>> = {
  mu_B: { unit: "erg gauss^-1", shift: 3 },
  mu_N: { unit: "erg gauss^-1", shift: 3 },
};
