import { Prose } from "@/components/typeset/prose";
import type { EvaluateAnswer, Role, VersionFile } from "@/lib/schema";
import { Byline } from "./byline";
import { Provenance } from "./provenance";
import { versionCells } from "./read-version";
import { Standing } from "./standing";
import { VersionActions } from "./version-actions";
import { VersionCell } from "./version-cell";
import { WithdrawnNotice } from "./withdrawn-notice";

export interface VersionPageProps {
  readonly file: VersionFile;
  readonly withdrawn: { readonly at: string; readonly reason: string } | null;
  readonly role: Role;
  /** The number of the latest version of the calculation. */
  readonly latest: number;
  /** The whole address of this version, as it is cited. */
  readonly url: string;
  readonly presentation: EvaluateAnswer["presentation"];
}

/** A version as a paper: what was pinned, where it comes from, and what can be done with it. */
export function VersionPage(props: VersionPageProps) {
  const { file, withdrawn, role, latest, url, presentation } = props;
  const { calculation: id, number } = file.version;
  const system = { edition: file.edition, em: file.em ?? "si" };
  return (
    <main id="main" className="mx-auto w-full max-w-folio px-4 py-8">
      {withdrawn && <WithdrawnNotice number={number} {...withdrawn} />}
      <header className="mb-8">
        <h1 className="break-words font-serif text-3xl font-semibold">
          {file.title || "Untitled calculation"}
        </h1>
        <Byline file={file} latest={latest} />
        {file.abstract && (
          <section aria-label="Abstract" className="mt-4">
            <Prose markdown={file.abstract} />
          </section>
        )}
      </header>
      <Standing file={file} />
      <section aria-label="The calculation">
        <ol className="m-0 list-none p-0">
          {versionCells(file, presentation).map((one) => (
            <VersionCell key={one.cell.id} {...one} system={system} />
          ))}
        </ol>
      </section>
      <section className="mt-10">
        <h2 id="provenance" className="mb-2 font-serif text-xl font-semibold">
          Provenance
        </h2>
        <Provenance file={file} url={url} />
      </section>
      <VersionActions
        id={id}
        number={number}
        edition={file.edition}
        url={url}
        mayEdit={role === "author"}
        mayWithdraw={role === "author" && withdrawn === null}
      />
    </main>
  );
}
