"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Message } from "@/components/ui/message";
import type { CalculationFile, Verdict } from "@/lib/schema";
import { editionTitles } from "./editions";
import { VerdictTable } from "./verdict-table";
import { type Asked, recompute } from "./version-api";

type Edition = CalculationFile["edition"];

/** Recompute: the verdict on a version, under its own constants or another edition's. */
export function RecomputePanel({
  id,
  number,
  edition,
}: {
  id: string;
  number: number;
  edition: Edition;
}) {
  const [chosen, choose] = useState<Edition>(edition);
  const [asking, setAsking] = useState(false);
  const [asked, setAsked] = useState<Asked<Verdict>>();
  const ask = async () => {
    setAsking(true);
    setAsked(await recompute(id, number, chosen));
    setAsking(false);
  };
  return (
    <div className="font-sans text-sm print:hidden">
      <div className="flex flex-wrap items-end gap-3">
        <label className="block max-w-full">
          <span className="block font-medium">constants</span>
          <select
            value={chosen}
            onChange={(event) => choose(event.target.value as Edition)}
            className="mt-1 min-h-9 max-w-full border border-ink bg-ground px-2 py-1 text-ink"
          >
            {Object.entries(editionTitles).map(([name, title]) => (
              <option key={name} value={name}>
                {name === edition ? `${title} (as pinned)` : title}
              </option>
            ))}
          </select>
        </label>
        <Button onClick={ask} disabled={asking}>
          recompute
        </Button>
      </div>
      <div aria-live="polite" className="mt-3 min-h-6">
        {asking && <p>recomputing…</p>}
        {!asking && asked && "answer" in asked && <VerdictTable verdict={asked.answer} />}
        {!asking && asked && "why" in asked && <Message tone="error">{asked.why}</Message>}
      </div>
    </div>
  );
}
