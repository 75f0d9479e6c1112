import Link from "next/link";
import { Prose } from "@/components/typeset/prose";
import { Time } from "@/components/ui/time";
import type { CalculationSummary, Visibility } from "@/lib/schema";
import type { Scope } from "./list-page";

const visibilityWords: Record<Visibility, string> = {
  private: "private",
  link: "open by link",
  public: "public",
};

/** Own calculations open as drafts, other people's as their latest version. */
function addressOf({ id, latestVersion }: CalculationSummary, scope: Scope): string {
  return scope === "mine" || latestVersion === null ? `/c/${id}` : `/c/${id}/v/${latestVersion}`;
}

/** One calculation of a list: its title, what it is about, and how it stands. */
export function CalculationItem({ item, scope }: { item: CalculationSummary; scope: Scope }) {
  return (
    <li className="border-b border-rule py-4">
      <h2 className="text-lg leading-snug">
        <Link href={addressOf(item, scope)} className="hover:text-calcium hover:underline">
          {item.title || <i className="font-normal">Untitled</i>}
        </Link>
      </h2>
      {item.abstract && (
        <div className="mt-1 line-clamp-2 text-[0.95rem] leading-snug">
          <Prose markdown={item.abstract} />
        </div>
      )}
      <p className="mt-1.5 flex flex-wrap gap-x-4 font-sans text-sm text-faint">
        {scope === "public" && <span>{item.owner}</span>}
        <span>
          {scope === "mine" ? "saved " : "pinned "}
          <Time iso={item.updatedAt} />
        </span>
        {scope === "mine" && <span>revision {item.revision}</span>}
        <span>
          {item.latestVersion === null ? "no version yet" : `version ${item.latestVersion}`}
        </span>
        {scope === "mine" && <span>{visibilityWords[item.visibility]}</span>}
      </p>
    </li>
  );
}
