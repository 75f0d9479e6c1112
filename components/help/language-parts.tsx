import type { EvaluateAnswer } from "@/lib/schema";
import { ExampleTable } from "./example-table";
import { formulaExamples, givenExamples, lineExamples, nameExamples } from "./examples";
import { HelpSection } from "./help-section";

interface WithAnswer {
  answer: EvaluateAnswer;
}

/** How a typed line becomes a cell. */
export function LinesPart({ answer }: WithAnswer) {
  return (
    <HelpSection part="lines">
      <p>
        Type into the empty last line of a calculation. A number with a unit makes a given, a
        formula with names a relation, a comparison a check, and anything else text. The kind can be
        changed afterwards.
      </p>
      <ExampleTable examples={lineExamples} answer={answer} />
    </HelpSection>
  );
}

/** How givens state their uncertainty. */
export function GivensPart({ answer }: WithAnswer) {
  return (
    <HelpSection part="givens">
      <p>
        A given is exact, or it has one standard deviation (<code>±</code>, or figures in brackets
        that count in the last digits), a factor or a <code>dex</code> either way (log-normal), or
        two ends between which every value is as likely. <code>+-</code> works for <code>±</code>.
      </p>
      <ExampleTable examples={givenExamples} answer={answer} />
      <p>Say where a given comes from; one without a source is marked.</p>
    </HelpSection>
  );
}

/** What a relation's result says beside its value. */
export function ResultsPart() {
  return (
    <HelpSection part="results">
      <p>
        The uncertainty of a relation is propagated to first order from its givens and constants.
        What two inputs share is counted once: <code>x - x</code> is exact, and <code>G</code>{" "}
        cancels in <code>G M</code> where the mass is stated in solar masses. Where a given is
        uncertain by a good part of itself, first order is rough.
      </p>
      <p>
        A value with an uncertain given is shown to the second figure of its uncertainty, 1.257(63)
        × 10³⁹; any other to three figures, though results and version files keep all of them.
      </p>
      <p>
        Under it stands the form for a paper, 1.26 × 10³⁹ (M / 10 M⊙) erg s⁻¹: the value at the
        fiducials, which are the values unless a given states others, times powers of each given.
        Where an exponent is not that of a true power law, the line says <em>local</em>.
      </p>
    </HelpSection>
  );
}

/** What a formula may hold and how it binds. */
export function FormulasPart({ answer }: WithAnswer) {
  return (
    <HelpSection part="formulas">
      <p>
        Numbers, names, <code>+ - * / ^</code>, brackets, products without a sign, <code>!</code>,{" "}
        <code>%</code> as percent, function calls, comparisons, <code>and or not</code> and{" "}
        <code>a ? b : c</code>. <code>… to unit</code> at the end chooses the unit to show. The
        signs of print are read too: <code>×</code> <code>·</code> <code>−</code> <code>÷</code>{" "}
        <code>√</code> <code>≤</code> <code>²</code> <code>M⊙</code>.
      </p>
      <p>
        A product without a sign binds tighter than a division: <code>a/b c</code> is a over b c.
        Only behind a plain fraction of numbers it does not: <code>1/2 x</code> is half of x. Since
        people disagree on this, what was understood is always shown typeset. <code>log</code> is
        the natural logarithm; angles are in radians.
      </p>
      <p>
        The examples below stand in a calculation that has a radius <code>r</code>, a mass{" "}
        <code>M</code> and a luminosity <code>L</code>. The last two are wrong on purpose.
      </p>
      <ExampleTable examples={formulaExamples} answer={answer} />
    </HelpSection>
  );
}

/** How names are written and set. */
export function NamesPart({ answer }: WithAnswer) {
  return (
    <HelpSection part="names">
      <p>
        A name has letters, digits and <code>_</code>; what follows the first <code>_</code> is its
        subscript. Greek letters are typed or spelled: <code>σ_T</code> and <code>sigma_T</code> are
        one name. A name is looked up first among the symbols of the calculation, then among the
        constants of its edition, then among the units. The order of cells is the order of reading,
        not of evaluation.
      </p>
      <ExampleTable examples={nameExamples} answer={answer} />
    </HelpSection>
  );
}
