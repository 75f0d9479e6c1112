import { execFileSync } from "node:child_process";
import { type BrowserContext, expect, type Page, test } from "@playwright/test";
import { cell, expectSaved, expectValue, lastLine, seen, sourceLine, write } from "./folio-page";
import { address, newcomer } from "./people";

const lines = [
  "M = 10 Msun",
  "L_Edd = 4 pi G M m_p c / sigma_T to erg/s",
  "L_Edd > 1e38 erg/s",
  "The limit holds for a *steady* sphere of ionised hydrogen.",
];
const limit = "1.26×1039ergs−1";

async function signUpByForm(page: Page): Promise<void> {
  const { name, email, password } = newcomer();
  await page.goto("/");
  await page.getByRole("main").getByRole("link", { name: "Sign up" }).click();
  await page.getByLabel("Name").fill(name);
  await page.getByLabel("E-mail address").fill(email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: "Sign up" }).click();
  await page.waitForURL("/desk");
}

async function startFromDesk(page: Page): Promise<void> {
  await expect(page.getByRole("heading", { name: "Desk" })).toBeVisible();
  await page.getByRole("button", { name: "New calculation" }).click();
  await page.waitForURL(/\/c\/[^/]+$/);
}

/** The estimate from the first line to the title, saved. */
async function writeEstimate(page: Page): Promise<void> {
  for (const line of lines) await write(page, line);
  await page.getByRole("combobox", { name: "Constants" }).selectOption("CODATA 2018");
  await page.getByLabel("Title").fill("Limiting luminosity of THX 14−2");
  await expectValue(cell(page, "relation (1) L_Edd"), limit);
  await expectSaved(page);
}

/** Open a signed-out browser of its own. */
async function visitor(context: BrowserContext): Promise<Page> {
  const browser = context.browser();
  if (!browser) throw new Error("The context has no browser.");
  return (await browser.newContext({ acceptDownloads: true })).newPage();
}

async function pinByHand(page: Page, summary: string): Promise<string> {
  await page.getByRole("button", { name: "pin a version" }).click();
  const dialog = page.getByRole("dialog");
  await dialog.getByLabel("Summary").fill(summary);
  await dialog.getByRole("button", { name: /^pin/ }).click();
  await expect(page.getByRole("heading", { name: "v1 is pinned" })).toBeVisible();
  await dialog.getByRole("button", { name: "copy link" }).click();
  await expect(dialog.getByRole("button", { name: "copied" })).toBeVisible();
  return page.evaluate(() => navigator.clipboard.readText());
}

async function openByLink(page: Page): Promise<void> {
  await page.getByLabel("Versions can be read").selectOption("by link");
  await page.getByRole("button", { name: "Open it" }).click();
  await expect(page.getByRole("button", { name: "Open it" })).toBeHidden();
  await expect(page.getByLabel("Versions can be read")).toHaveValue("link");
}

test.beforeEach(({ context }) =>
  context.grantPermissions(["clipboard-read", "clipboard-write"], { origin: address() }),
);

test("A theorist signs up, writes an estimate, mends a slip of units and sees it saved", async ({
  page,
}) => {
  await signUpByForm(page);
  await startFromDesk(page);
  await writeEstimate(page);

  await expect(cell(page, "given M").locator("math").first()).toBeAttached();
  await expect(cell(page, "relation (1) L_Edd").locator("math").first()).toBeAttached();
  await expect(cell(page, "check").getByText("holds")).toBeVisible();
  await expect(cell(page, "text").locator("em")).toHaveText("steady");

  await write(page, "E = L_Edd + 3 erg");
  const slip = cell(page, "relation (2) E");
  await expect(slip.getByText(/they differ by a time/)).toBeVisible();

  await slip.focus();
  await slip.press("Enter");
  await sourceLine(page, "relation").fill("E = L_Edd * 1 Myr to erg");
  await sourceLine(page, "relation").press("Enter");
  await expect(slip.getByText(/they differ by a time/)).toBeHidden();
  await expectValue(slip, "3.97×1052erg");
  await expectSaved(page);

  await page.reload();
  await expectValue(cell(page, "relation (1) L_Edd"), limit);
  await expect(page.getByLabel("Title")).toHaveValue("Limiting luminosity of THX 14−2");
  await expect(lastLine(page)).toHaveValue("");
});

test("A visitor recomputes a pinned version, takes its file along, and sees it withdrawn", async ({
  page,
  context,
}, info) => {
  await signUpByForm(page);
  await startFromDesk(page);
  await writeEstimate(page);
  await openByLink(page);
  const link = await pinByHand(page, "As cited in the first draft");
  expect(link).toMatch(/\/c\/[^/]+\/v\/1$/);

  const other = await visitor(context);
  await other.goto(link);
  await expect(other.getByRole("heading", { level: 1 })).toHaveText(
    "Limiting luminosity of THX 14−2",
  );
  expect(await seen(other.getByRole("main"))).toContain(limit);

  await other.getByRole("button", { name: "recompute" }).click();
  await expect(other.getByText(/reproduces/)).toBeVisible();
  await other.getByLabel("constants").selectOption("codata-2022");
  await other.getByRole("button", { name: "recompute" }).click();
  const moved = other.getByRole("region", { name: "What moved" });
  await expect(moved.getByRole("row", { name: /L_Edd/ }).first()).toContainText(/1 [+−] \d/);

  const downloading = other.waitForEvent("download");
  await other.getByRole("link", { name: "download version file" }).click();
  const file = info.outputPath("version.json");
  await (await downloading).saveAs(file);
  const told = execFileSync(process.execPath, ["--import", "tsx", "scripts/recompute.ts", file]);
  expect(JSON.parse(told.toString())).toMatchObject({ verdict: "reproduces", differences: [] });

  await page.goto(link);
  await page.getByRole("button", { name: "withdraw…" }).click();
  await page.getByLabel("Reason").fill("The mass of the hole was superseded.");
  await page.getByRole("button", { name: "withdraw v1" }).click();
  await expect(page.getByRole("complementary", { name: "Withdrawn" })).toBeVisible();
  await other.reload();
  const notice = other.getByRole("complementary", { name: "Withdrawn" });
  await expect(notice).toContainText("The mass of the hole was superseded.");
  expect(await seen(other.getByRole("main"))).toContain(limit);
});
