import { type APIRequestContext, expect } from "@playwright/test";
import type { CalculationFile, Cell } from "@/lib/schema";
import { fromHere } from "./people";

type Visibility = "private" | "link" | "public";

/** The limiting luminosity of ten solar masses, as cells. */
export const limitingLuminosity: readonly Cell[] = [
  { id: "intro", kind: "text", markdown: "The luminosity at which radiation balances gravity." },
  {
    id: "mass",
    kind: "given",
    symbol: "M",
    value: 10,
    uncertainty: 0.5,
    unit: "Msun",
    source: "orbit",
  },
  {
    id: "limit",
    kind: "relation",
    symbol: "L_Edd",
    formula: "4 pi G M m_p c / sigma_T",
    unit: "erg/s",
  },
  { id: "bright", kind: "check", condition: "L_Edd > 1e38 erg/s" },
];

/** A calculation file of the cells. */
export function fileOf(title: string, cells: readonly Cell[]): CalculationFile {
  return { format: "leading-order/1", title, edition: "codata-2018", cells: [...cells] };
}

/** Start a calculation for whoever is signed in; its id. */
export async function start(request: APIRequestContext, file: CalculationFile): Promise<string> {
  const answer = await request.post("/api/calculations", { data: { file }, headers: fromHere() });
  expect(answer.status()).toBe(201);
  return ((await answer.json()) as { id: string }).id;
}

/** Pin the draft, errors and all; the number of the version. */
export async function pin(
  request: APIRequestContext,
  id: string,
  summary = "First estimate",
): Promise<number> {
  const answer = await request.post(`/api/calculations/${id}/versions`, {
    data: { summary, acceptErrors: true },
    headers: fromHere(),
  });
  expect(answer.status()).toBe(201);
  return ((await answer.json()) as { version: number }).version;
}

/** Say who may read the versions. */
export async function openTo(
  request: APIRequestContext,
  id: string,
  visibility: Visibility,
): Promise<void> {
  const data = { visibility };
  const answer = await request.patch(`/api/calculations/${id}`, { data, headers: fromHere() });
  expect(answer.ok()).toBe(true);
}

/** Withdraw a version for good. */
export async function withdraw(
  request: APIRequestContext,
  id: string,
  number: number,
  reason: string,
): Promise<void> {
  const path = `/api/calculations/${id}/versions/${number}/withdraw`;
  const answer = await request.post(path, { data: { reason }, headers: fromHere() });
  expect(answer.ok()).toBe(true);
}

/** The draft as the server has it. */
export async function draftOf(
  request: APIRequestContext,
  id: string,
): Promise<{ file: CalculationFile; revision: number }> {
  return (await request.get(`/api/calculations/${id}`)).json();
}
