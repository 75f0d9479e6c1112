import { StatusWord } from "@/components/ui/status-word";
import type { VersionFile } from "@/lib/schema";
import { countFaults } from "./read-version";

const counted = (count: number, one: string, many: string) =>
  `${count} ${count === 1 ? one : many}`;

/** What a reader must know before using a number: cells with errors, checks that fail. */
export function Standing({ file }: { file: VersionFile }) {
  const { errors, failing } = countFaults(file);
  if (errors === 0 && failing === 0) return null;
  return (
    <ul className="mb-6 list-none border-l-4 border-halpha py-1 pl-3 font-sans text-sm">
      {errors > 0 && (
        <li>
          <StatusWord status="error" /> pinned with{" "}
          {counted(errors, "cell that has an error", "cells that have errors")}
        </li>
      )}
      {failing > 0 && (
        <li>
          <StatusWord status="fails" /> {counted(failing, "check fails", "checks fail")}: the
          estimate is outside its stated validity
        </li>
      )}
    </ul>
  );
}
