import type { CalculationFile } from "@/lib/schema";

/** The editions and conventions by the names that readers know. */
export const editionTitles: Readonly<Record<CalculationFile["edition"], string>> = {
  "codata-2018": "CODATA 2018 with IAU 2015",
  "codata-2022": "CODATA 2022 with IAU 2015",
};

export const conventionTitles: Readonly<Record<"si" | "gaussian", string>> = {
  si: "SI",
  gaussian: "Gaussian",
};
