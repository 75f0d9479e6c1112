"use client";

import { useEffect, useId, useState } from "react";
import { ProblemMessage } from "@/components/site/problem-message";
import { Button } from "@/components/ui/button";
import type { CalculationPage, CalculationSummary } from "@/lib/schema";
import { CalculationItem } from "./calculation-item";
import type { Scope } from "./list-page";
import { useList } from "./use-list";

/** Milliseconds without typing before the list is searched. */
const restMs = 250;

type Order = "changed" | "title";

const inOrder: Record<Order, (items: readonly CalculationSummary[]) => CalculationSummary[]> = {
  changed: (items) => [...items],
  title: (items) => [...items].sort((a, b) => a.title.localeCompare(b.title, "en")),
};

/** The search once typing rests; the address of the page follows, so that it can be kept. */
function useRestedSearch(scope: Scope, q: string): string {
  const [rested, setRested] = useState(q);
  useEffect(() => {
    if (q === rested) return;
    const timer = setTimeout(() => {
      setRested(q);
      const query = new URLSearchParams({ scope, ...(q === "" ? {} : { q }) });
      window.history.replaceState(null, "", `/desk?${query}`);
    }, restMs);
    return () => clearTimeout(timer);
  }, [scope, q, rested]);
  return rested;
}

function SearchFields({
  scope,
  typed,
  onType,
  order,
  onOrder,
}: {
  scope: Scope;
  typed: string;
  onType: (q: string) => void;
  order: Order;
  onOrder: (order: Order) => void;
}) {
  const id = useId();
  return (
    <form
      action="/desk"
      onSubmit={(event) => event.preventDefault()}
      className="mt-4 flex flex-wrap items-end gap-x-6 gap-y-3 font-sans text-sm"
    >
      <input type="hidden" name="scope" value={scope} />
      <div className="min-w-48 flex-1">
        <label htmlFor={`${id}-q`} className="block font-medium">
          Search titles, abstracts and names
        </label>
        <input
          id={`${id}-q`}
          type="search"
          name="q"
          value={typed}
          maxLength={200}
          onChange={(event) => onType(event.target.value)}
          className="mt-1 min-h-10 w-full border border-edge bg-transparent px-2.5"
        />
      </div>
      <div>
        <label htmlFor={`${id}-order`} className="block font-medium">
          Order of what is shown
        </label>
        <select
          id={`${id}-order`}
          value={order}
          onChange={(event) => onOrder(event.target.value as Order)}
          className="mt-1 min-h-10 w-full border border-edge bg-ground px-2.5"
        >
          <option value="changed">latest first</option>
          <option value="title">by title</option>
        </select>
      </div>
    </form>
  );
}

/** The calculations of a scope: searched as one types, a page at a time. */
export function CalculationList({
  scope,
  q,
  page,
}: {
  scope: Scope;
  q: string;
  page: CalculationPage;
}) {
  const [typed, setTyped] = useState(q);
  const [order, setOrder] = useState<Order>("changed");
  const rested = useRestedSearch(scope, typed);
  const { items, more, busy, problem, showMore } = useList(
    { scope, q: rested },
    { scope, q, page },
  );
  const nothing = items.length === 0 && !busy && !problem;
  return (
    <>
      <SearchFields {...{ scope, typed, order }} onType={setTyped} onOrder={setOrder} />
      <div className="mt-4">
        <ProblemMessage problem={problem} />
      </div>
      <ul aria-busy={busy} aria-label="Calculations" className="border-t border-rule">
        {inOrder[order](items).map((item) => (
          <CalculationItem key={item.id} item={item} scope={scope} />
        ))}
      </ul>
      <p role="status" className="mt-4 text-faint italic">
        {nothing && (rested === "" ? "Nothing here yet." : `Nothing has the words “${rested}”.`)}
      </p>
      {more && (
        <Button onClick={showMore} disabled={busy}>
          Show more
        </Button>
      )}
    </>
  );
}
