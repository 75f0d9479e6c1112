import { StatusWord } from "@/components/ui/status-word";
import type { CellResult } from "@/lib/schema";

/** What is wrong with a cell, and what is worth saying of it. */
export function CellFaults({
  result,
  onAccept,
}: {
  result: CellResult | undefined;
  onAccept?: ((suggestion: string) => void) | undefined;
}) {
  if (!result) return null;
  const error = result.status === "error" ? result.error : undefined;
  return (
    <>
      {error && (
        <p className="cell-fault">
          <StatusWord status="error" /> {error.message}{" "}
          {error.suggestion !== undefined && onAccept && (
            <button
              type="button"
              className="text-calcium underline underline-offset-4"
              onClick={() => onAccept(error.suggestion ?? "")}
            >
              Use {error.suggestion}
            </button>
          )}
        </p>
      )}
      {result.notices?.map((notice) => (
        <p key={notice.code + notice.message} className="cell-fault">
          <StatusWord status="notice">{notice.level}</StatusWord> {notice.message}
        </p>
      ))}
    </>
  );
}
