import Link from "next/link";
import type { CalculationSummary } from "@/lib/schema";

/** Public calculations by their latest version, as a list of references in the margin. */
export function PinnedLately({ items }: { items: readonly CalculationSummary[] }) {
  return (
    <div className="self-start lg:border-l lg:border-rule lg:pl-8">
      <h3 className="mb-3 font-sans text-sm font-medium">Pinned lately</h3>
      <ol className="flex flex-col gap-3 text-[0.95rem] leading-snug">
        {items.map((item, index) => (
          <li key={item.id} className="grid grid-cols-[2rem_minmax(0,1fr)]">
            <span className="text-faint" aria-hidden="true">
              [{index + 1}]
            </span>
            <span>
              {item.owner} {item.updatedAt.slice(0, 4)},{" "}
              <Link href={`/c/${item.id}/v/${item.latestVersion}`} className="link">
                {item.title}
              </Link>
              , version {item.latestVersion}
            </span>
          </li>
        ))}
      </ol>
    </div>
  );
}
