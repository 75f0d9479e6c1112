import type { ComponentType } from "react";
import { StatusWord } from "@/components/ui/status-word";
import type {
  Cell,
  CellPresentation,
  CellResult,
  CheckCell,
  GivenCell,
  RelationCell,
  TextCell,
} from "@/lib/schema";
import { Prose } from "./prose";
import { Tex } from "./tex";

/** A cell with its result and how the engine says to show it. */
export interface CellProps<C extends Cell = Cell> {
  readonly cell: C;
  readonly result: CellResult | undefined;
  readonly shown: CellPresentation | undefined;
}

/** What the author wrote beside a cell. */
function Note({ markdown }: { markdown: string | undefined }) {
  if (!markdown) return null;
  return (
    <div className="font-serif text-sm text-faint">
      <Prose markdown={markdown} />
    </div>
  );
}

/** Where a formula cannot be typeset yet, its line is shown as typed. */
function Typed({ line }: { line: string }) {
  return <code className="font-mono text-sm">{line}</code>;
}

function TextBody({ cell }: CellProps<TextCell>) {
  return cell.markdown.trim() === "" ? (
    <p className="font-serif italic text-faint">Empty text</p>
  ) : (
    <Prose markdown={cell.markdown} />
  );
}

function GivenBody({ cell, result, shown }: CellProps<GivenCell>) {
  return (
    <div className="flex flex-wrap items-baseline gap-x-3">
      <p>
        {shown?.tex && shown.valueTex ? (
          <Tex tex={`${shown.tex} = ${shown.valueTex}`} />
        ) : (
          <Typed line={shown?.line ?? cell.symbol} />
        )}
      </p>
      <Note markdown={cell.note} />
      {cell.source && (
        <p className="font-sans text-xs text-faint">
          <span className="sr-only">source: </span>[{cell.source}]
        </p>
      )}
      {result?.status === "ok" && !cell.source && (
        <p className="font-sans text-xs text-sodium">no source</p>
      )}
    </div>
  );
}

function RelationBody({ cell, result, shown }: CellProps<RelationCell>) {
  return (
    <div>
      <div className="equation">
        <div className="equation-body">
          {/* What could not be parsed has no right-hand side to set. */}
          {shown?.tex?.includes("=") ? (
            <Tex tex={shown.tex} display />
          ) : (
            <Typed line={shown?.line ?? cell.formula} />
          )}
        </div>
        {shown?.number !== undefined && (
          <span className="equation-number">
            <span className="sr-only">relation </span>({shown.number})
          </span>
        )}
      </div>
      {result?.status === "ok" && shown?.valueTex && (
        <p className="value-line">
          <Tex tex={`= ${shown.valueTex}`} />
        </p>
      )}
      {result?.status === "ok" && shown?.normalisedTex && (
        <p className="normalised-line">
          <Tex tex={shown.normalisedTex} />
          {shown.normalisedLocal && <span className="ml-2 font-sans text-xs">local</span>}
        </p>
      )}
      {result?.status === "ok" && "parameters" in result && (
        <p className="value-line font-sans text-sm text-faint">
          a function of {result.parameters.join(", ")}
        </p>
      )}
      <div className="text-center">
        <Note markdown={cell.note} />
      </div>
    </div>
  );
}

/** How far a condition is from its edge. */
function ratioText(ratio: number): string {
  const size = Math.abs(ratio);
  const digits =
    size !== 0 && (size >= 1e4 || size < 1e-3)
      ? ratio.toExponential(2)
      : String(Number(ratio.toPrecision(3)));
  return `left is ${digits.replace("-", "−")} times right`;
}

function CheckBody({ cell, result, shown }: CellProps<CheckCell>) {
  return (
    <div>
      <div className="flex flex-wrap items-baseline gap-x-4">
        <span>{shown?.tex ? <Tex tex={shown.tex} /> : <Typed line={cell.condition} />}</span>
        {result?.status === "ok" && "holds" in result && (
          <>
            <StatusWord status={result.holds ? "holds" : "fails"} />
            {result.ratio !== null && (
              <span className="font-sans text-sm text-faint">{ratioText(result.ratio)}</span>
            )}
          </>
        )}
      </div>
      <Note markdown={cell.because} />
    </div>
  );
}

/** The body of each kind of cell, as the folio and the version page show it. */
const bodies: Partial<Record<Cell["kind"], ComponentType<CellProps<never>>>> = {
  text: TextBody,
  given: GivenBody,
  relation: RelationBody,
  check: CheckBody,
};

export const kindNames: Record<Cell["kind"], string> = {
  text: "text",
  given: "given",
  relation: "relation",
  check: "check",
  sweep: "sweep",
  solve: "solve",
};

/** A cell as it is read. */
export function CellBody(props: CellProps) {
  const Body = bodies[props.cell.kind] as ComponentType<CellProps> | undefined;
  return Body ? <Body {...props} /> : null;
}
