import { type BrowserContext, expect, type Page, test } from "@playwright/test";
import { draftOf, fileOf, limitingLuminosity, start } from "./calculations";
import { cell, expectSaved, lastLine, write } from "./folio-page";
import { fromHere, signInByForm, signUp } from "./people";

const unsaved = /^kept in this browser, not yet saved/;

async function openDraft(page: Page): Promise<string> {
  const id = await start(page.request, fileOf("A limit", limitingLuminosity));
  await page.goto(`/c/${id}`);
  await expectSaved(page);
  return id;
}

async function symbols(page: Page, id: string): Promise<string[]> {
  const { file } = await draftOf(page.request, id);
  return file.cells.flatMap((one) => ("symbol" in one ? [one.symbol] : []));
}

/** End the only session of the person, as Settings in another browser would. */
async function endSession({ request }: BrowserContext): Promise<void> {
  const { items } = await (await request.get("/api/me/sessions")).json();
  const path = `/api/me/sessions/${encodeURIComponent(items[0].id)}`;
  expect((await request.delete(path, { headers: fromHere() })).ok()).toBe(true);
}

test("The network goes away while I type: the work is kept, and saved when it is back", async ({
  page,
  context,
}) => {
  await signUp(context);
  const id = await openDraft(page);
  await context.setOffline(true);
  await write(page, "t = 3 Myr");
  await expect(page.getByText(/the server cannot be reached/).first()).toBeVisible();
  await expect(page.getByText(unsaved)).toBeVisible();
  await expect(cell(page, "given t")).toBeVisible();

  await context.setOffline(false);
  await expectSaved(page);
  expect(await symbols(page, id)).toEqual(["M", "L_Edd", "t"]);
});

test("The page is reloaded before anything was saved: the work and an unfinished line come back", async ({
  page,
  context,
}) => {
  await signUp(context);
  const id = await openDraft(page);
  const saves = `**/api/calculations/${id}`;
  await page.route(saves, (route) =>
    route.request().method() === "PUT" ? route.abort() : route.continue(),
  );
  await write(page, "t = 3 Myr");
  await lastLine(page).fill("E = L_Edd");
  await expect(page.getByText(unsaved)).toBeVisible();

  await page.unroute(saves);
  await page.reload();
  await expect(page.getByText(/Work that was kept in this browser was brought back/)).toBeVisible();
  await expect(lastLine(page)).toHaveValue("E = L_Edd");
  await expectSaved(page);
  await expect(page.getByText("an unfinished line is kept in this browser")).toBeVisible();
  expect(await symbols(page, id)).toEqual(["M", "L_Edd", "t"]);
});

test("My session ends in mid-edit: I am told, sign in in a new tab, and everything is saved", async ({
  page,
  context,
}) => {
  const { email, password } = await signUp(context);
  const id = await openDraft(page);
  await endSession(context);

  await write(page, "t = 3 Myr");
  await expect(page.getByText(/you are signed out/)).toBeVisible();
  const opening = context.waitForEvent("page");
  await page.getByRole("link", { name: "Sign in (in a new tab)" }).click();
  const tab = await opening;
  await signInByForm(tab, email, password);
  await tab.waitForURL(`/c/${id}`);
  await tab.close();

  await page.bringToFront();
  await page.evaluate(() => window.dispatchEvent(new Event("focus")));
  await expectSaved(page);
  expect(await symbols(page, id)).toEqual(["M", "L_Edd", "t"]);
});
