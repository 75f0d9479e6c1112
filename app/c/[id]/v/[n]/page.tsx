import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { versionMetadata } from "@/components/version/version-metadata";
import { VersionPage } from "@/components/version/version-page";
import { currentPerson } from "@/lib/auth/current-person";
import { isRefused, maybeCalculationId, readVersion, versionPath } from "@/lib/calculations";
import { EvaluatorBusyError, evaluate } from "@/lib/evaluator";
import { calculationOf, type EvaluateAnswer, type VersionFile } from "@/lib/schema";
import { settings } from "@/lib/settings";
import "katex/dist/katex.min.css";

type Address = { params: Promise<{ id: string; n: string }> };

async function requireVersion({ params }: Address) {
  const typed = await params;
  const id = maybeCalculationId(typed.id);
  if (id === undefined || !/^[1-9]\d{0,8}$/.test(typed.n)) notFound();
  const reading = await readVersion(await currentPerson(), id, Number(typed.n));
  if (isRefused(reading)) notFound();
  const url = new URL(versionPath(id, Number(typed.n)), settings().appUrl).href;
  return { ...reading, url };
}

/** How the cells are typeset. Reading goes on without it when no evaluator is free. */
async function presentationOf(file: VersionFile): Promise<EvaluateAnswer["presentation"]> {
  try {
    return (await evaluate(calculationOf(file), { present: true })).presentation;
  } catch (error) {
    if (error instanceof EvaluatorBusyError) return undefined;
    throw error;
  }
}

export async function generateMetadata(address: Address): Promise<Metadata> {
  const { file, withdrawn, visibility, url } = await requireVersion(address);
  return versionMetadata(file, withdrawn !== null, visibility, url);
}

export default async function Page(address: Address) {
  const { file, withdrawn, role, latest, url } = await requireVersion(address);
  return (
    <VersionPage
      file={file}
      withdrawn={withdrawn}
      role={role}
      latest={latest}
      url={url}
      presentation={await presentationOf(file)}
    />
  );
}
