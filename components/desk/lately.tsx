import Link from "next/link";
import { Time } from "@/components/ui/time";
import type { CalculationSummary } from "@/lib/schema";

const listed = 6;

interface Event {
  readonly at: string;
  readonly href: string;
  readonly title: string;
  readonly what: string;
}

const saved = (item: CalculationSummary): Event => ({
  at: item.updatedAt,
  href: `/c/${item.id}`,
  title: item.title,
  what: `You saved revision ${item.revision}`,
});

const pinned = (item: CalculationSummary, mine: boolean): Event => ({
  at: item.updatedAt,
  href: `/c/${item.id}/v/${item.latestVersion}`,
  title: item.title,
  what: `${mine ? "You" : item.owner} pinned version ${item.latestVersion}`,
});

/** What was saved and pinned lately, the latest first. */
export function Lately({
  own,
  shared,
}: {
  own: readonly CalculationSummary[];
  shared: readonly CalculationSummary[];
}) {
  const mine = new Set(own.map(({ id }) => id));
  const events = [...own.map(saved), ...shared.map((item) => pinned(item, mine.has(item.id)))]
    .sort((a, b) => b.at.localeCompare(a.at))
    .slice(0, listed);
  if (events.length === 0) return null;
  return (
    <section aria-labelledby="lately">
      <h2 id="lately" className="mb-3 font-sans text-sm font-medium">
        Lately
      </h2>
      <ol className="flex flex-col gap-3 text-[0.95rem] leading-snug">
        {events.map((event) => (
          <li key={event.what + event.href}>
            <Link href={event.href} className="link">
              {event.title || "Untitled"}
            </Link>
            <span className="block font-sans text-sm text-faint">
              {event.what}, <Time iso={event.at} />
            </span>
          </li>
        ))}
      </ol>
    </section>
  );
}
