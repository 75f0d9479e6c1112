import { expect, type Page, test } from "@playwright/test";
import { draftOf, fileOf, limitingLuminosity, start } from "./calculations";
import { cell, expectSaved, sourceLine } from "./folio-page";
import { signIn, signUp } from "./people";

/** One author at two browsers, both with the same draft open. */
async function twoBrowsers(page: Page): Promise<{ here: Page; there: Page; id: string }> {
  const author = await signUp(page.context());
  const id = await start(page.request, fileOf("A limit", limitingLuminosity));
  const browser = page.context().browser();
  if (!browser) throw new Error("The context has no browser.");
  const there = await (await browser.newContext()).newPage();
  await signIn(there.request, author);
  for (const one of [page, there]) {
    await one.goto(`/c/${id}`);
    await expectSaved(one);
  }
  return { here: page, there, id };
}

/** Change the value of a given in the margin. */
async function changeGiven(page: Page, symbol: string, value: string): Promise<void> {
  await page.getByLabel(`value of ${symbol}`).fill(value);
}

async function changeCheck(page: Page, line: string): Promise<void> {
  await cell(page, /check/).focus();
  await cell(page, /check/).press("Enter");
  await sourceLine(page, "check").fill(line);
  await sourceLine(page, "check").press("Enter");
}

async function cellsOf(page: Page, id: string): Promise<Record<string, object>> {
  const { file } = await draftOf(page.request, id);
  return Object.fromEntries(file.cells.map((one) => [one.id, one]));
}

test("Two browsers change different cells, and both changes are kept without a question", async ({
  page,
}) => {
  const { here, there, id } = await twoBrowsers(page);
  await changeGiven(there, "M", "12(1) Msun");
  await expectSaved(there);
  await changeCheck(here, "L_Edd > 2e38 erg/s");
  await expectSaved(here);

  await expect(here.getByLabel("value of M")).toHaveValue("12(1) Msun");
  await expect(here.getByRole("alert", { name: "Changes that meet" })).toBeHidden();
  expect(await cellsOf(page, id)).toMatchObject({
    mass: { value: 12, uncertainty: 1 },
    bright: { condition: "L_Edd > 2e38 erg/s" },
  });
});

for (const [side, kept] of [
  ["yours", 14],
  ["theirs", 12],
] as const) {
  test(`Two browsers change one cell: both texts stand side by side, and I keep ${side}`, async ({
    page,
  }) => {
    const { here, there, id } = await twoBrowsers(page);
    await changeGiven(there, "M", "12(1) Msun");
    await expectSaved(there);
    await changeGiven(here, "M", "14(1) Msun");

    const panel = here.getByRole("alert", { name: "Changes that meet" });
    await expect(panel).toContainText("M = 14(1) Msun");
    await expect(panel).toContainText("M = 12(1) Msun");
    await expect(here.getByText(/not yet saved: choose below/)).toBeVisible();
    expect(await cellsOf(page, id)).toMatchObject({ mass: { value: 12 } });

    await changeCheck(here, "L_Edd > 3e38 erg/s");
    await panel.getByRole("button", { name: `Keep ${side}` }).click();
    await expect(panel).toBeHidden();
    await expectSaved(here);
    expect(await cellsOf(page, id)).toMatchObject({
      mass: { value: kept, source: "orbit" },
      bright: { condition: "L_Edd > 3e38 erg/s" },
      limit: { symbol: "L_Edd" },
      intro: { kind: "text" },
    });
  });
}
