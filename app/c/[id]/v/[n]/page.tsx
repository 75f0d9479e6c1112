import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { cache } from "react";
import { versionMetadata } from "@/components/version/version-metadata";
import { VersionPage } from "@/components/version/version-page";
import { currentPerson } from "@/lib/auth/current-person";
import { isRefused, maybeCalculationId, readVersion, versionPath } from "@/lib/calculations";
import { EvaluatorBusyError, evaluate } from "@/lib/evaluator";
import { calculationOf, type EvaluateAnswer, type VersionFile } from "@/lib/schema";
import { settings } from "@/lib/settings";

type Address = { params: Promise<{ id: string; n: string }> };

/** The version, read once for the page and its metadata; a 404 for those who may not read it. */
const requireVersion = cache(async (typedId: string, typedNumber: string) => {
  const id = maybeCalculationId(typedId);
  if (id === undefined || !/^[1-9]\d{0,8}$/.test(typedNumber)) notFound();
  const number = Number(typedNumber);
  const reading = await readVersion(await currentPerson(), id, number);
  if (isRefused(reading)) notFound();
  return { ...reading, url: new URL(versionPath(id, number), settings().appUrl).href };
});

/** How the cells are typeset. Reading goes on without it when no evaluator is free. */
async function presentationOf(file: VersionFile): Promise<EvaluateAnswer["presentation"]> {
  try {
    return (await evaluate(calculationOf(file), { present: true })).presentation;
  } catch (error) {
    if (error instanceof EvaluatorBusyError) return undefined;
    throw error;
  }
}

export async function generateMetadata({ params }: Address): Promise<Metadata> {
  const { id, n } = await params;
  const { file, withdrawn, visibility, url } = await requireVersion(id, n);
  return versionMetadata(file, withdrawn !== null, visibility, url);
}

export default async function Page({ params }: Address) {
  const { id, n } = await params;
  const { file, withdrawn, role, latest, url } = await requireVersion(id, n);
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
