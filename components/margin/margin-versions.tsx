import Link from "next/link";
import { StatusWord } from "@/components/ui/status-word";
import { Time } from "@/components/ui/time";
import type { Draft } from "@/lib/schema";

/** The versions pinned so far, the latest first. */
export function MarginVersions({ id, versions }: { id: string; versions: Draft["versions"] }) {
  return (
    <section className="margin-part" aria-labelledby="margin-versions">
      <h2 id="margin-versions">Versions</h2>
      {versions.length === 0 && <p className="text-faint">None pinned yet.</p>}
      <ol>
        {[...versions].reverse().map((version) => (
          <li key={version.number} className="py-0.5">
            <Link className="link" href={`/c/${id}/v/${version.number}`}>
              v{version.number}
            </Link>{" "}
            {version.summary}{" "}
            <span className="text-faint">
              <Time iso={version.pinnedAt} withTime={false} />
            </span>{" "}
            {version.withdrawn && <StatusWord status="withdrawn" />}
          </li>
        ))}
      </ol>
    </section>
  );
}
