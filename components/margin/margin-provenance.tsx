"use client";

import { useFolio } from "@/components/folio/folio-context";
import { CopyButton } from "@/components/ui/copy-button";
import { Time } from "@/components/ui/time";
import { editionTitle } from "@/lib/physics";

/** Where the numbers of the draft come from. */
export function MarginProvenance({ id }: { id: string }) {
  const { state, answer } = useFolio();
  const rows: readonly (readonly [string, React.ReactNode])[] = [
    ["calculation", id],
    [
      "draft",
      <span key="draft">
        revision {state.base.revision}, <Time iso={state.base.savedAt} />
      </span>,
    ],
    ["constants", editionTitle(answer.edition)],
    ["engine", answer.engine],
    [
      "content hash",
      <span key="hash">
        <code className="break-all">{answer.contentHash.slice(0, 19)}…</code>{" "}
        <CopyButton text={answer.contentHash} what="the content hash" />
      </span>,
    ],
  ];
  return (
    <section className="margin-part" aria-labelledby="margin-provenance">
      <h2 id="margin-provenance">Provenance</h2>
      <dl>
        {rows.map(([term, told]) => (
          <div key={term} className="grid grid-cols-[6.5rem_minmax(0,1fr)] gap-x-2">
            <dt className="text-faint">{term}</dt>
            <dd>{told}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
