import type { Metadata } from "next";
import { notFound, redirect } from "next/navigation";
import { Folio } from "@/components/folio/folio";
import { currentPerson } from "@/lib/auth/current-person";
import {
  isRefused,
  maybeCalculationId,
  readDraft,
  readOverview,
  versionPath,
} from "@/lib/calculations";
import { evaluate } from "@/lib/evaluator";
import "@/components/folio/folio.css";

type Address = { params: Promise<{ id: string }> };

/** The draft for its author; everybody else is taken to the latest version they may read. */
async function requireDraft({ params }: Address) {
  const id = maybeCalculationId((await params).id);
  if (id === undefined) notFound();
  const person = await currentPerson();
  const draft = await readDraft(person, id);
  if (!isRefused(draft)) return draft;
  const overview = await readOverview(person, id);
  const latest = isRefused(overview) ? undefined : overview.versions.at(-1);
  if (latest) redirect(versionPath(id, latest.number));
  return notFound();
}

export async function generateMetadata(address: Address): Promise<Metadata> {
  const { file } = await requireDraft(address);
  return { title: file.title || "Untitled calculation", robots: { index: false } };
}

export default async function Page(address: Address) {
  const draft = await requireDraft(address);
  const first = await evaluate(draft.file, { present: true });
  return (
    <main id="main">
      <Folio draft={draft} first={first} />
    </main>
  );
}
