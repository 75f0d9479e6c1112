import type { CalculationFile } from "@/lib/schema";

/** What a reader of the front page may change. */
export interface ExampleInputs {
  readonly mass: number;
  readonly opacity: number;
}

export const firstInputs: ExampleInputs = { mass: 10, opacity: 0.34 };

/** The calculation on the front page, with the reader's inputs. */
export function exampleFile({ mass, opacity }: ExampleInputs): CalculationFile {
  return {
    format: "leading-order/1",
    title: "Limiting luminosity",
    abstract:
      "The luminosity at which radiation balances gravity, and the accretion that feeds it.",
    edition: "codata-2022",
    cells: [
      {
        id: "about",
        kind: "text",
        markdown:
          "Radiation pushes ionised gas away while gravity pulls it in. The two balance at a luminosity that depends on the mass and the opacity alone.",
      },
      { id: "mass", kind: "given", symbol: "M", value: mass, unit: "Msun" },
      {
        id: "opacity",
        kind: "given",
        symbol: "kappa",
        value: opacity,
        unit: "cm^2/g",
        note: "scattering on free electrons, gas of solar composition",
      },
      {
        id: "luminosity",
        kind: "relation",
        symbol: "L_lim",
        formula: "4 pi G M c / kappa",
        unit: "erg/s",
      },
      {
        id: "rate",
        kind: "relation",
        symbol: "Mdot",
        formula: "L_lim / (0.1 c^2)",
        unit: "Msun/yr",
        note: "accretion that turns a tenth of its rest energy into light",
      },
      {
        id: "scattering",
        kind: "check",
        condition: "kappa <= 0.4 cm^2/g",
        because: "Free electrons scatter no more than this, even in pure hydrogen.",
      },
    ],
  };
}
