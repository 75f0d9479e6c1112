import type { ReactNode } from "react";
import { Superscripts } from "@/components/ui/superscripts";
import type { EvaluateAnswer } from "@/lib/schema";

/** “1.47 × 10³⁹ erg s⁻¹”, where the cell has a value. */
export function exampleValue(answer: EvaluateAnswer, id: string): string | undefined {
  return answer.presentation?.cells[id]?.valueText;
}

/** A relation of the example: its equation and number, and the value below. */
export function ExampleResult({
  answer,
  id,
  behind,
  children,
}: {
  answer: EvaluateAnswer;
  id: string;
  behind: boolean;
  children: ReactNode;
}) {
  const result = answer.cells[id];
  const value = exampleValue(answer, id);
  const number = answer.presentation?.cells[id]?.number;
  return (
    <div>
      <div className="equation">
        <div className="equation-body">{children}</div>
        {number !== undefined && <span className="equation-number">({number})</span>}
      </div>
      <p
        className={`value-line text-lg transition-opacity motion-reduce:transition-none ${behind ? "opacity-50" : ""}`}
      >
        {result?.status === "error" ? (
          <span className="font-sans text-sm text-halpha">{result.error.message}</span>
        ) : (
          value && <Superscripts text={`= ${value}`} />
        )}
      </p>
    </div>
  );
}
