"use client";

import { useState } from "react";
import useSWRInfinite from "swr/infinite";
import type { CalculationPage, CalculationSummary, Problem } from "@/lib/schema";
import { fetchPage, ListProblem, listPath, type Scope } from "./list-page";

export interface List {
  readonly items: readonly CalculationSummary[];
  readonly more: boolean;
  readonly busy: boolean;
  readonly problem: Problem | undefined;
  showMore(): void;
}

/** The list for a scope and a search, page after page; the page from the server to begin with. */
export function useList(
  asked: { scope: Scope; q: string },
  first: { scope: Scope; q: string; page: CalculationPage },
): List {
  const { scope, q } = asked;
  // The server's page stands for the search it was made for, and for no other.
  const [server] = useState(first);
  const known = server.scope === scope && server.q === q;
  const { data, error, isValidating, setSize } = useSWRInfinite<CalculationPage>(
    (_: number, previous: CalculationPage | null) =>
      previous && previous.nextCursor === null
        ? null
        : listPath(scope, q, previous?.nextCursor ?? null),
    fetchPage,
    { ...(known ? { fallbackData: [server.page] } : {}), keepPreviousData: true },
  );
  return {
    items: data?.flatMap((page) => page.items) ?? [],
    more: (data?.at(-1)?.nextCursor ?? null) !== null,
    busy: isValidating,
    problem: error instanceof ListProblem ? error.problem : undefined,
    showMore: () => void setSize((size) => size + 1),
  };
}
