import Link from "next/link";
import { Superscripts } from "@/components/ui/superscripts";
import { functionEntries } from "@/lib/expr/functions";
import { listConstants, listUnits } from "@/lib/physics";
import { dimensionRule } from "./dimension-rules";
import { HelpSection } from "./help-section";
import { WordList } from "./word-list";

const system = { edition: "codata-2022", em: "si" } as const;

/** How units are written, and which there are. */
export function UnitsPart() {
  return (
    <HelpSection part="units">
      <p>
        A unit is written with spaces, <code>*</code>, <code>/</code>, brackets and rational powers:{" "}
        <code>erg/s/cm^2</code> and <code>erg s^-1 cm^-2</code> are one unit. A relation without a
        unit chooses a readable one itself. The year is the Julian year.{" "}
        <Link href="/constants#units" className="link">
          All units with their values and prefixes
        </Link>
        .
      </p>
      <ul className="flex flex-wrap gap-x-5 gap-y-1 text-[0.95rem]">
        {listUnits(system).map(({ symbol, name }) => (
          <li key={symbol}>
            <code>{symbol}</code> <span className="text-faint">{name}</span>
          </li>
        ))}
      </ul>
    </HelpSection>
  );
}

/** The constants by their symbols. */
export function ConstantsPart() {
  return (
    <HelpSection part="constants">
      <p>
        Every constant has its value from the edition of the calculation; a symbol that you define
        yourself goes before it, and the cell says so. <code>pi</code> is π and <code>e</code> is no
        constant: write <code>exp(x)</code> for powers of it.
      </p>
      <ul className="flex flex-wrap gap-x-5 gap-y-1 text-[0.95rem]">
        {listConstants(system).map(({ symbol, name }) => (
          <li key={symbol}>
            <Link href={`/constants#${symbol}`} className="link">
              <code>{symbol}</code>
            </Link>{" "}
            <span className="text-faint">{name}</span>
          </li>
        ))}
      </ul>
    </HelpSection>
  );
}

/** The functions of the language. */
export function FunctionsPart() {
  const words = functionEntries.map((entry) => ({
    key: entry.name,
    term: <code className="break-words">{entry.signature}</code>,
    meaning: (
      <>
        <Superscripts text={entry.meaning} />
        <span className="block font-sans text-sm text-faint">
          <Superscripts text={dimensionRule(entry)} />
        </span>
      </>
    ),
  }));
  return (
    <HelpSection part="functions">
      <p>A name that is no function multiplies what stands in brackets behind it.</p>
      <WordList words={words} />
    </HelpSection>
  );
}
