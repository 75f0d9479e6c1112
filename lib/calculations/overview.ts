import { db } from "@/db";
import type { Draft } from "@/lib/schema";
import { type Actor, permit } from "./access";
import { isRefused, type Refusal } from "./refusal";
import { findLatestVersion, listVersions } from "./version-rows";

/** What everybody who may see a calculation may know of it, its draft aside. */
export type Overview = Pick<Draft, "id" | "role" | "visibility" | "versions"> & {
  owner: string;
  /** Of the latest version; empty while there is none. */
  title: string;
  abstract: string;
};

/** A calculation seen from outside: its versions, and the title of the latest. */
export async function readOverview(actor: Actor, id: string): Promise<Overview | Refusal> {
  const permitted = await permit(db(), actor, "read-version", id);
  if (isRefused(permitted)) return permitted;
  const { calculation, role } = permitted;
  const latest = await findLatestVersion(db(), id);
  return {
    id,
    role,
    visibility: calculation.visibility,
    owner: calculation.ownerName,
    title: latest?.file.title ?? "",
    abstract: latest?.file.abstract ?? "",
    versions: await listVersions(db(), id),
  };
}
