import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { CalculationList } from "@/components/desk/calculation-list";
import { EmptyDesk } from "@/components/desk/empty-desk";
import { Lately } from "@/components/desk/lately";
import { NewCalculationButton } from "@/components/desk/new-calculation-button";
import { ScopeLinks } from "@/components/desk/scope-links";
import { Waiting } from "@/components/desk/waiting";
import { PageBody } from "@/components/site/page-body";
import { currentPerson } from "@/lib/auth/current-person";
import { listCalculations } from "@/lib/calculations";

export const metadata: Metadata = { title: "Desk" };

const longestSearch = 200;

type DeskProps = { searchParams: Promise<{ scope?: string | string[]; q?: string | string[] }> };

/** What the address of the page asks for. */
async function readSearch({ searchParams }: DeskProps) {
  const { scope, q } = await searchParams;
  return {
    scope: scope === "public" ? ("public" as const) : ("mine" as const),
    q: typeof q === "string" ? q.slice(0, longestSearch) : "",
  };
}

export default async function DeskPage(props: DeskProps) {
  const person = await currentPerson();
  const { scope, q } = await readSearch(props);
  if (!person) {
    const here = `/desk?${new URLSearchParams({ scope, ...(q === "" ? {} : { q }) })}`;
    redirect(`/sign-in?return=${encodeURIComponent(here)}`);
  }
  const [own, shared, page] = await Promise.all([
    listCalculations(person, { scope: "mine" }),
    listCalculations(person, { scope: "public" }),
    listCalculations(person, { scope, q }),
  ]);
  const empty = scope === "mine" && own.items.length === 0;
  return (
    <PageBody>
      <div className="grid gap-x-12 gap-y-12 lg:grid-cols-[minmax(0,44rem)_minmax(0,1fr)]">
        <div>
          <div className="mb-6 flex flex-wrap items-center justify-between gap-x-6 gap-y-3">
            <h1 className="text-3xl">Desk</h1>
            {!empty && <NewCalculationButton />}
          </div>
          <Waiting email={person.email} confirmed={person.emailConfirmed} />
          <ScopeLinks scope={scope} />
          {empty ? (
            <EmptyDesk demo={shared.items[0]} />
          ) : (
            <CalculationList key={scope} scope={scope} q={q} page={page} />
          )}
        </div>
        <aside
          aria-label="Margin"
          className="flex flex-col gap-10 self-start lg:border-l lg:border-rule lg:pl-8"
        >
          <Lately own={own.items} shared={shared.items} />
        </aside>
      </div>
    </PageBody>
  );
}
