import { type CalculationFile, calculationSchema, type Visibility } from "@/lib/schema";
import limitingLuminosity from "./demo/limiting-luminosity.json";
import outburstEnergy from "./demo/outburst-energy.json";
import synchrotronField from "./demo/synchrotron-field.json";
import tidalDisruption from "./demo/tidal-disruption.json";
import type { DemoEmail } from "./people";

/** A version to pin: how it differs from the file, what is said of it, why it was withdrawn. */
export type DemoVersion = {
  given?: [cell: string, value: number];
  summary: string;
  withdrawn?: string;
};

export type DemoCalculation = {
  owner: DemoEmail;
  file: CalculationFile;
  visibility: Visibility;
  versions: readonly DemoVersion[];
};

/** What the demo group works on: three calculations with versions, and a draft with a slip in it. */
export const demoCalculations: readonly DemoCalculation[] = [
  {
    owner: "ilse.wray@tarn-hollow.example",
    file: calculationSchema.parse(limitingLuminosity),
    visibility: "public",
    versions: [
      { given: ["g-mass", 9.4], summary: "With the mass of the first orbit solution" },
      { summary: "As cited in the THX 14−2 paper: mass of the full orbit solution" },
    ],
  },
  {
    owner: "tomasz.oduya@tarn-hollow.example",
    file: calculationSchema.parse(tidalDisruption),
    visibility: "public",
    versions: [
      {
        given: ["g-hole", 30_000_000],
        summary: "First estimate",
        withdrawn:
          "The mass of the hole was a factor of ten too large, a slip in the bulge relation. Use version 2.",
      },
      { summary: "With the mass from the corrected bulge relation" },
    ],
  },
  {
    owner: "maren.lindqvist-sarr@tarn-hollow.example",
    file: calculationSchema.parse(synchrotronField),
    visibility: "link",
    versions: [{ summary: "For the referee of the nebula paper" }],
  },
  {
    owner: "ilse.wray@tarn-hollow.example",
    file: calculationSchema.parse(outburstEnergy),
    visibility: "private",
    versions: [],
  },
];
