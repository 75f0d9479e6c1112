"use client";

import { Button } from "@/components/ui/button";
import type { CellActs } from "./use-cell-acts";

/** The acts on the cell in hand as buttons; the keyboard has the same. */
export function CellTools({ id, isOpen, acts }: { id: string; isOpen: boolean; acts: CellActs }) {
  const tools: readonly (readonly [string, () => void])[] = [
    [isOpen ? "close" : "edit", () => (isOpen ? acts.close(id) : acts.open(id))],
    ["up", () => acts.move(id, -1)],
    ["down", () => acts.move(id, 1)],
    ["write below", () => acts.writeBelow(id)],
    ["duplicate", () => acts.duplicate(id)],
    ["delete", () => acts.remove(id)],
  ];
  return (
    // biome-ignore lint/a11y/useSemanticElements: a fieldset would be a form within a list item.
    <div className="cell-tools" role="group" aria-label="this cell">
      {tools.map(([word, act]) => (
        <Button key={word} look="quiet" onClick={act}>
          {word}
        </Button>
      ))}
    </div>
  );
}
