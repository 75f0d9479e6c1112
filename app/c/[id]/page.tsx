import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { cache } from "react";
import { Folio } from "@/components/folio/folio";
import { VersionList } from "@/components/version/version-list";
import { currentPerson } from "@/lib/auth/current-person";
import { isRefused, maybeCalculationId, readDraft, readOverview } from "@/lib/calculations";
import { EvaluatorBusyError, evaluate } from "@/lib/evaluator";
import type { CalculationFile, Draft, EvaluateAnswer } from "@/lib/schema";
import "@/components/folio/folio.css";

type Address = { params: Promise<{ id: string }> };

/** The draft for its author; for everybody else the versions they may read, if there are any. */
const requireCalculation = cache(async (typed: string) => {
  const id = maybeCalculationId(typed);
  if (id === undefined) notFound();
  const person = await currentPerson();
  const draft = await readDraft(person, id);
  if (!isRefused(draft)) return { draft };
  const overview = await readOverview(person, id);
  if (isRefused(overview) || overview.versions.length === 0) notFound();
  return { overview };
});

/** The first results; without them the folio opens all the same and asks again by itself. */
async function firstAnswer(file: CalculationFile): Promise<EvaluateAnswer | undefined> {
  try {
    return await evaluate(file, { present: true });
  } catch (error) {
    if (error instanceof EvaluatorBusyError) return undefined;
    throw error;
  }
}

async function FolioPage({ draft }: { draft: Draft }) {
  return (
    <main id="main">
      <Folio draft={draft} first={await firstAnswer(draft.file)} />
    </main>
  );
}

export async function generateMetadata({ params }: Address): Promise<Metadata> {
  const { draft, overview } = await requireCalculation((await params).id);
  const title = draft?.file.title || overview?.title || "Untitled calculation";
  return overview?.visibility === "public" ? { title } : { title, robots: { index: false } };
}

export default async function Page({ params }: Address) {
  const { draft, overview } = await requireCalculation((await params).id);
  return draft ? <FolioPage draft={draft} /> : <VersionList {...overview} />;
}
