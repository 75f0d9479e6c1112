import type { Metadata } from "next";
import {
  type Examples,
  examplesFile,
  formulaExamples,
  givenExamples,
  lineExamples,
  nameExamples,
} from "@/components/help/examples";
import { HelpContents } from "@/components/help/help-section";
import {
  FormulasPart,
  GivensPart,
  LinesPart,
  NamesPart,
  ResultsPart,
} from "@/components/help/language-parts";
import {
  ConventionsPart,
  ErrorsPart,
  KeysPart,
  LimitsPart,
  VersionsPart,
} from "@/components/help/product-parts";
import { ConstantsPart, FunctionsPart, UnitsPart } from "@/components/help/shelf-parts";
import { PageBody } from "@/components/site/page-body";
import { evaluate } from "@/lib/evaluator";

export const metadata: Metadata = {
  title: "Help",
  description: "How formulas are written, what the errors mean, and how versions work.",
};

const answerOf = (examples: Examples) => evaluate(examplesFile(examples), { present: true });

export default async function HelpPage() {
  const lines = await answerOf(lineExamples);
  const givens = await answerOf(givenExamples);
  const formulas = await answerOf(formulaExamples);
  const names = await answerOf(nameExamples);
  return (
    <PageBody>
      <h1 className="mb-8 text-3xl">Help</h1>
      <div className="grid gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,44rem)_minmax(0,1fr)]">
        <HelpContents />
        <div className="lg:col-start-1 lg:row-start-1">
          <LinesPart answer={lines} />
          <GivensPart answer={givens} />
          <FormulasPart answer={formulas} />
          <ResultsPart />
          <NamesPart answer={names} />
          <UnitsPart />
          <ConstantsPart />
          <FunctionsPart />
          <ConventionsPart />
          <ErrorsPart />
          <LimitsPart />
          <KeysPart />
          <VersionsPart />
        </div>
      </div>
    </PageBody>
  );
}
