import { Prose } from "@/components/typeset/prose";
import { StatusWord } from "@/components/ui/status-word";
import { Time } from "@/components/ui/time";
import type { Draft } from "@/lib/schema";

interface VersionListProps {
  readonly id: string;
  readonly title: string;
  readonly abstract: string;
  readonly owner: string;
  readonly versions: Draft["versions"];
}

/** A calculation for those who may not see its draft: its versions, the latest first. */
export function VersionList({ id, title, abstract, owner, versions }: VersionListProps) {
  return (
    <main id="main" className="mx-auto w-full max-w-folio px-4 py-8">
      <h1 className="font-serif text-3xl font-semibold">{title || "Untitled calculation"}</h1>
      <p className="mt-1 font-sans text-sm text-faint">{owner}</p>
      {abstract && (
        <div className="mt-4">
          <Prose markdown={abstract} />
        </div>
      )}
      <h2 className="mt-8 font-serif text-xl font-semibold">Versions</h2>
      <ol className="mt-2 list-none">
        {[...versions].reverse().map((version) => (
          <li key={version.number} className="border-t border-rule py-2">
            <a className="link" href={`/c/${id}/v/${version.number}`}>
              v{version.number}
            </a>{" "}
            {version.summary}{" "}
            <span className="font-sans text-sm text-faint">
              <Time iso={version.pinnedAt} withTime={false} />
            </span>{" "}
            {version.withdrawn && <StatusWord status="withdrawn" />}
          </li>
        ))}
      </ol>
    </main>
  );
}
