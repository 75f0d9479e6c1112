import { Time } from "@/components/ui/time";
import type { VersionFile } from "@/lib/schema";
import { conventionTitles, editionTitles } from "./editions";

/** Under the title: who, when, and on which constants; the whole provenance stands below. */
export function Byline({ file, latest }: { file: VersionFile; latest: number }) {
  const { version } = file;
  const { calculation: id, number } = version;
  return (
    <div className="mt-2 font-sans text-sm">
      <p>
        {version.authors.join(", ")} · v{number}, pinned <Time iso={version.pinnedAt} />
        {latest > number && (
          <>
            {" · "}
            <a className="link" href={`/c/${id}/v/${latest}`}>
              v{latest} is the latest
            </a>
          </>
        )}
      </p>
      <p className="text-faint">
        {editionTitles[file.edition]} · {conventionTitles[file.em ?? "si"]} · engine{" "}
        {version.engine} · <code>{version.contentHash.slice(0, 19)}…</code>
        <span className="no-print">
          {" · "}
          <a className="link" href="#provenance">
            provenance
          </a>
          {" · "}
          <a className="link" href="#check">
            recompute
          </a>
        </span>
      </p>
    </div>
  );
}
