"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { Message } from "@/components/ui/message";
import type { Visibility } from "@/lib/schema";
import { changeVisibility, tellProblem } from "./folio-api";

const choices: readonly (readonly [Visibility, string, string])[] = [
  ["private", "private", "Only you."],
  ["link", "by link", "Whoever has a version's link can read and recompute it."],
  ["public", "public", "Everybody can find, read and recompute its versions."],
];

/** Who may read the pinned versions. Opening them is confirmed, since it cannot be unread. */
export function VisibilityChoice({
  id,
  visibility,
  onChange,
}: {
  id: string;
  visibility: Visibility;
  onChange: (next: Visibility) => void;
}) {
  const [asked, setAsked] = useState<Visibility>();
  const [trouble, setTrouble] = useState<string>();
  const apply = async (next: Visibility) => {
    const sent = await changeVisibility(id, next);
    if (!sent.ok) return setTrouble(tellProblem(sent.problem));
    setAsked(undefined);
    setTrouble(undefined);
    onChange(next);
  };
  return (
    <div className="font-sans text-sm">
      <label>
        Versions can be read{" "}
        <select
          className="folio-select"
          value={visibility}
          onChange={(event) => {
            const next = event.target.value as Visibility;
            if (next === "private") void apply(next);
            else setAsked(next);
          }}
        >
          {choices.map(([value, word]) => (
            <option key={value} value={value}>
              {word}
            </option>
          ))}
        </select>
      </label>
      <p className="text-faint">
        {choices.find(([value]) => value === visibility)?.[2]} The draft stays yours alone.
      </p>
      <Dialog
        title="Open this calculation to others?"
        open={asked !== undefined}
        onClose={() => setAsked(undefined)}
      >
        <p className="mb-4 font-sans text-sm">
          {choices.find(([value]) => value === asked)?.[2]} This holds for the versions there are
          and those to come.
        </p>
        {trouble && <Message tone="error">{trouble}</Message>}
        <Button look="primary" onClick={() => asked && void apply(asked)}>
          Open it
        </Button>
      </Dialog>
      {trouble && asked === undefined && <Message tone="error">{trouble}</Message>}
    </div>
  );
}
