"use client";

import { useEffect, useState } from "react";
import { VisibilityChoice } from "@/components/folio/visibility-choice";
import type { Draft, Visibility } from "@/lib/schema";
import { MarginConstants } from "./margin-constants";
import { MarginGivens } from "./margin-givens";
import { MarginProvenance } from "./margin-provenance";
import { MarginVersions } from "./margin-versions";

/** Where the margin stands beside the column; below that width it is a drawer under it. */
const beside = "(min-width: 64.01rem)";

interface MarginProps {
  readonly id: string;
  readonly versions: Draft["versions"];
  readonly visibility: Visibility;
  readonly onVisibility: (next: Visibility) => void;
}

/** The column beside the folio: givens, constants, versions, readers, provenance. */
export function Margin({ id, versions, visibility, onVisibility }: MarginProps) {
  const [isOpen, setOpen] = useState(true);
  useEffect(() => {
    const query = matchMedia(beside);
    const follow = () => setOpen(query.matches);
    follow();
    query.addEventListener("change", follow);
    return () => query.removeEventListener("change", follow);
  }, []);
  return (
    <aside className="margin" aria-label="Margin">
      <details open={isOpen} onToggle={(event) => setOpen(event.currentTarget.open)}>
        <summary>Givens, constants, versions, readers</summary>
        <MarginGivens />
        <MarginConstants />
        <MarginVersions id={id} versions={versions} />
        <section className="margin-part" aria-labelledby="margin-readers">
          <h2 id="margin-readers">Readers</h2>
          <VisibilityChoice id={id} visibility={visibility} onChange={onVisibility} />
        </section>
        <MarginProvenance id={id} />
      </details>
    </aside>
  );
}
