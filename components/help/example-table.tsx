import { CellFaults } from "@/components/typeset/cell-faults";
import { Prose } from "@/components/typeset/prose";
import { Tex } from "@/components/typeset/tex";
import { StatusWord } from "@/components/ui/status-word";
import type { Cell, EvaluateAnswer } from "@/lib/schema";
import { type Examples, examplesFile } from "./examples";

/** What the engine made of a line: its equation with the value, or its outcome. */
function Understood({ cell, answer }: { cell: Cell; answer: EvaluateAnswer }) {
  const shown = answer.presentation?.cells[cell.id];
  const result = answer.cells[cell.id];
  if (cell.kind === "text") return <Prose markdown={cell.markdown} />;
  const value = shown?.valueTex ? ` = ${shown.valueTex}` : "";
  return (
    <>
      {shown?.tex && <Tex tex={shown.tex + value} />}{" "}
      {result?.status === "ok" && "holds" in result && (
        <StatusWord status={result.holds ? "holds" : "fails"} />
      )}
      <CellFaults result={result} />
    </>
  );
}

/** Lines as they are typed, the kind of cell each makes, and what it is understood as. */
export function ExampleTable({ examples, answer }: { examples: Examples; answer: EvaluateAnswer }) {
  const cells = examplesFile(examples).cells.filter((cell) => cell.id.startsWith("e"));
  return (
    <table className="my-4 block w-full text-[0.95rem] sm:table">
      <thead className="hidden border-b border-ink font-sans text-sm sm:table-header-group">
        <tr>
          <th scope="col" className="py-1.5 pr-4 text-left font-medium">
            Typed
          </th>
          <th scope="col" className="w-24 py-1.5 pr-4 text-left font-medium whitespace-nowrap">
            Makes a
          </th>
          <th scope="col" className="py-1.5 text-left font-medium">
            Understood as
          </th>
        </tr>
      </thead>
      <tbody className="block sm:table-row-group">
        {cells.map((cell, index) => (
          <tr key={cell.id} className="block border-b border-rule py-2 align-baseline sm:table-row">
            <td className="block pr-4 sm:table-cell sm:w-[40%] sm:py-2">
              <code className="break-words">{examples.shown[index]}</code>
            </td>
            <td className="block pr-4 font-sans text-sm text-faint sm:table-cell">{cell.kind}</td>
            <td className="block overflow-x-auto sm:table-cell">
              <Understood cell={cell} answer={answer} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
