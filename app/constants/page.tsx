import type { Metadata } from "next";
import { Shelf, type ShelfSection } from "@/components/constants/shelf";
import {
  constantEntries,
  gaussianEntries,
  isNominal,
  unitEntries,
} from "@/components/constants/shelf-rows";
import { PageBody } from "@/components/site/page-body";

export const metadata: Metadata = {
  title: "Constants",
  description: "CODATA 2018 and CODATA 2022 side by side, IAU nominal values, and the units.",
};

function sections(): ShelfSection[] {
  const all = constantEntries("si");
  return [
    {
      id: "fundamental",
      title: "Fundamental constants",
      about: <p>As CODATA recommends them, edition by edition.</p>,
      constants: all.filter((entry) => !isNominal(entry)),
    },
    {
      id: "nominal",
      title: "Nominal values of the IAU",
      about: (
        <p>
          Conversion constants, exact by resolution and the same in every edition. The masses are
          the nominal <i>GM</i> over the edition’s <i>G</i> and carry its uncertainty; in{" "}
          <code>G * M</code> it cancels.
        </p>
      ),
      constants: all.filter(isNominal),
    },
    {
      id: "gaussian",
      title: "In the Gaussian convention",
      about: <p>Constants that have another value and dimension there.</p>,
      constants: gaussianEntries(),
    },
    {
      id: "units",
      title: "Units",
      about: (
        <p>
          What a unit field reads, with the value of one in coherent SI. Prefixes stand right before
          the symbol: <code>kpc</code>, <code>mJy</code>.
        </p>
      ),
      units: unitEntries("si"),
    },
    {
      id: "gaussian-units",
      title: "Units of the Gaussian convention",
      about: <p>Read only where a calculation is Gaussian; values in half powers of kg and m.</p>,
      units: unitEntries("gaussian"),
    },
  ];
}

export default function ConstantsPage() {
  return (
    <PageBody>
      <h1 className="mb-2 text-3xl">Constants and units</h1>
      <p className="max-w-folio">
        A calculation names its edition. The numbers of an edition do not move; a new publication is
        a new edition. Figures in brackets are one standard uncertainty in the last digits.
      </p>
      <Shelf sections={sections()} />
    </PageBody>
  );
}
