import Link from "next/link";
import type { Scope } from "./list-page";

const scopes: readonly { scope: Scope; label: string }[] = [
  { scope: "mine", label: "Mine" },
  { scope: "public", label: "Public" },
];

/** Which calculations are listed. */
export function ScopeLinks({ scope }: { scope: Scope }) {
  return (
    <nav aria-label="Which calculations" className="flex gap-x-6 font-sans text-sm">
      {scopes.map((each) => (
        <Link
          key={each.scope}
          href={`/desk?scope=${each.scope}`}
          aria-current={each.scope === scope ? "page" : undefined}
          className="border-b-2 border-transparent py-1.5 text-faint hover:text-calcium aria-[current=page]:border-ink aria-[current=page]:font-medium aria-[current=page]:text-ink"
        >
          {each.label}
        </Link>
      ))}
    </nav>
  );
}
