import { describe, expect, it } from "vitest";
import { UnitFault, UnitReader } from "@/lib/physics/unit-reader";

const si = { edition: "codata-2018", em: "si" } as const;

/** Factors as `symbol exponent`, in the order of the text. */
function factors(text: string): string[] {
  const read = new UnitReader(text, si).read();
  return read.map(({ symbol, exponent }) => `${symbol} ${exponent.toFraction()}`);
}

function faultOf(text: string): unknown {
  try {
    new UnitReader(text, si).read();
  } catch (fault) {
    if (fault instanceof UnitFault) return fault.failure;
    throw fault;
  }
  return undefined;
}

describe("UnitReader", () => {
  it.each([
    ["erg", ["erg 1"]],
    ["erg/s/cm^2", ["erg 1", "s -1", "cm -2"]],
    ["erg s^-1 cm^-2", ["erg 1", "s -1", "cm -2"]],
    ["erg/s cm", ["erg 1", "s -1", "cm -1"]],
    ["erg/s*cm", ["erg 1", "s -1", "cm 1"]],
    ["erg/(s cm^2)", ["erg 1", "s -1", "cm -2"]],
    ["(km/s)^2", ["km 2", "s -2"]],
    ["((km/s)^2)^(1/2)", ["km 1", "s -1"]],
    ["g^(1/2) cm^(-3/2)", ["g 1/2", "cm -3/2"]],
    ["g^0.5", ["g 1/2"]],
    ["1/s", ["s -1"]],
    ["m² s⁻¹", ["m 2", "s -1"]],
    ["m¹ᐟ²", ["m 1/2"]],
    ["um um", ["µm 1", "µm 1"]],
    ["  km   s^-1  ", ["km 1", "s -1"]],
  ])("reads “%s”", (text, read) => {
    expect(factors(text)).toEqual(read);
  });

  it("throws its fault with the place as typed and what may be meant", () => {
    expect(faultOf(" erg/sec")).toMatchObject({ code: "unit", from: 5, to: 8, name: "sec" });
    expect(faultOf("kms^-1")).toMatchObject({ code: "unit", from: 0, to: 3 });
    expect(faultOf("(erg")).toMatchObject({ code: "syntax", from: 0, to: 1, suggestions: [] });
    expect(faultOf("Msol/yr")).toMatchObject({ suggestions: expect.arrayContaining(["Msun"]) });
  });

  it("reads sixty brackets and refuses more, and five hundred characters and refuses more", () => {
    const nested = (depth: number) => `${"(".repeat(depth)}m${")".repeat(depth)}`;
    expect(factors(nested(60))).toEqual(["m 1"]);
    expect(faultOf(nested(61))).toMatchObject({ code: "syntax" });
    expect(factors("m ".repeat(250))).toHaveLength(250);
    expect(faultOf("m ".repeat(251))).toMatchObject({ code: "syntax", from: 0 });
  });
});
