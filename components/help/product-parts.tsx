import { folioKeys } from "@/components/folio/keys";
import { errorCodes, limits } from "@/lib/schema";
import { errorMeanings } from "./error-meanings";
import { HelpSection } from "./help-section";
import { WordList } from "./word-list";

/** What the electromagnetic convention of a calculation decides. */
export function ConventionsPart() {
  return (
    <HelpSection part="conventions">
      <p>
        A calculation is written in SI or in the Gaussian convention, as its heading says. In SI,{" "}
        <code>gauss</code> is 10<sup>−4</sup> T and charges are in coulombs. In the Gaussian
        convention <code>gauss</code>, <code>esu</code> and <code>statV</code> have dimensions of
        mass, length and time, and <code>q_esu</code> is the elementary charge. The two do not mix:{" "}
        <code>to_gaussian(x)</code> and <code>to_si(x)</code> convert.
      </p>
    </HelpSection>
  );
}

/** What each error code means. */
export function ErrorsPart() {
  const words = errorCodes.map((code) => ({
    key: code,
    term: <code>{code}</code>,
    meaning: errorMeanings[code],
  }));
  return (
    <HelpSection part="errors">
      <p>
        A cell with an error does not stop the others; those that need it say which cell they wait
        for.
      </p>
      <WordList words={words} />
    </HelpSection>
  );
}

const number = (value: number) => value.toLocaleString("en").replaceAll(",", "\u2009");

const limitWords: readonly (readonly [term: string, meaning: string])[] = [
  ["A formula", `${number(limits.formulaLength)} characters, ${limits.formulaDepth} levels deep`],
  ["A calculation", `${limits.cells} cells, ${number(limits.fileBytes)} bytes`],
  ["A sweep", `${number(limits.sweepPoints)} points times relations`],
  [
    "An evaluation",
    `${limits.evaluationMs / 1000} seconds, ${limits.evaluationMegabytes} megabytes`,
  ],
];

/** How much is too much. */
export function LimitsPart() {
  const words = limitWords.map(([term, meaning]) => ({ key: term, term, meaning }));
  return (
    <HelpSection part="limits">
      <WordList words={words} />
    </HelpSection>
  );
}

/** The keys of a calculation. */
export function KeysPart() {
  const words = folioKeys.map(({ keys, does }) => ({
    key: does,
    term: keys.map((name, index) => (
      <span key={name}>
        {index > 0 && ", "}
        <kbd>{name}</kbd>
      </span>
    )),
    meaning: does,
  }));
  return (
    <HelpSection part="keys">
      <p>Everything in a calculation can be done from the keyboard.</p>
      <WordList words={words} />
    </HelpSection>
  );
}

/** How versions are made, cited and recomputed. */
export function VersionsPart() {
  return (
    <HelpSection part="versions">
      <p>
        What you type is a <i>draft</i>. It is saved as you go, each save a numbered revision.{" "}
        <i>Pinning</i> makes a <i>version</i> of it, v1, v2 and so on, with a summary. A version
        never changes: it holds the cells, the results as they were, the constants edition, the
        release of the engine, and a hash of its content. Its address is the one to cite.
      </p>
      <p>
        A calculation is private, open to those who have the link, or public. That concerns its
        versions; the draft is its author’s alone.
      </p>
      <p>
        Anybody who may read a version may <i>recompute</i> it: today’s engine evaluates the same
        cells, and the verdict is <i>reproduces</i> or <i>differs</i>, cell by cell with the ratio.
        Values reproduce when they are equal to within 10<sup>−12</sup>. Recomputed under another
        edition, a version shows how each result moves with the constants.
      </p>
      <p>
        A version that proved wrong is <i>withdrawn</i>, with a reason: it stays readable at its
        address, under a notice.
      </p>
    </HelpSection>
  );
}
