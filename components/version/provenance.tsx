import type { ReactNode } from "react";
import { Time } from "@/components/ui/time";
import type { VersionFile } from "@/lib/schema";
import { conventionTitles, editionTitles } from "./editions";

function Row({ term, children }: { term: string; children: ReactNode }) {
  return (
    <div className="grid grid-cols-[7.5rem_minmax(0,1fr)] gap-x-3 py-0.5">
      <dt className="text-faint">{term}</dt>
      <dd className="break-words">{children}</dd>
    </div>
  );
}

/** Where a version comes from: everything one needs to cite it and to check it. */
export function Provenance({ file, url }: { file: VersionFile; url: string }) {
  const { version } = file;
  const forkedFrom = version.lineage[0];
  return (
    <dl className="border-y border-rule py-3 font-sans text-sm">
      <Row term="authors">{version.authors.join(", ")}</Row>
      <Row term="pinned">
        <Time iso={version.pinnedAt} />
      </Row>
      <Row term="summary">{version.summary}</Row>
      <Row term="constants">
        {editionTitles[file.edition]}{" "}
        <span className="break-all font-mono text-xs text-faint">{version.editionHash}</span>
      </Row>
      <Row term="convention">{conventionTitles[file.em ?? "si"]}</Row>
      <Row term="engine">{version.engine}</Row>
      <Row term="content hash">
        <span className="break-all font-mono text-xs">{version.contentHash}</span>
      </Row>
      {forkedFrom && (
        <Row term="forked from">
          <a className="link" href={`/c/${forkedFrom.calculation}/v/${forkedFrom.number}`}>
            {forkedFrom.calculation} v{forkedFrom.number}
          </a>
        </Row>
      )}
      <Row term="link">
        <a href={url} className="link break-all">
          {url}
        </a>
      </Row>
    </dl>
  );
}
