import { expect, type Locator, type Page, test } from "@playwright/test";
import { draftOf, fileOf, limitingLuminosity, start } from "./calculations";
import { cell, expectSaved, expectValue, lastLine } from "./folio-page";
import { signUp } from "./people";

const mostStops = 80;

/** Press Tab until the focus is on the element, as somebody without a mouse does. */
async function tabTo(page: Page, target: Locator, key = "Tab"): Promise<void> {
  for (let stop = 0; stop < mostStops; stop++) {
    await page.keyboard.press(key);
    if (await target.evaluate((element) => element === document.activeElement)) return;
  }
  throw new Error(`The element was not reached within ${mostStops} stops.`);
}

async function typeLine(page: Page, line: string): Promise<void> {
  await page.keyboard.type(line);
  await page.keyboard.press("Enter");
  await expect(lastLine(page)).toHaveValue("");
}

/** The names of the cells in reading order, without their places. */
async function order(page: Page): Promise<string[]> {
  const names = await page
    .getByRole("article")
    .evaluateAll((cells) => cells.map((one) => one.getAttribute("aria-label") ?? ""));
  return names.map((name) => name.replace(/^cell \d+, /, ""));
}

/** The list of names and units that go with what is typed. */
function completions(page: Page): Locator {
  return page.getByRole("listbox");
}

test("I write a given, a relation and a check, and pin them, without a mouse", async ({
  page,
  context,
}) => {
  await signUp(context);
  await page.goto("/desk");
  await tabTo(page, page.getByRole("button", { name: "New calculation" }));
  await page.keyboard.press("Enter");
  await page.waitForURL(/\/c\/[^/]+$/);

  await tabTo(page, page.getByLabel("Title"));
  await page.keyboard.type("A limit");
  await tabTo(page, lastLine(page));
  await typeLine(page, "M = 10 Msun");
  await typeLine(page, "L_Edd = 4 pi G M m_p c / sigma_T to erg/s");
  await typeLine(page, "L_Edd > 1e38 erg/s");
  await expect(cell(page, "check").getByText("holds")).toBeVisible();
  await page.keyboard.press("Escape");
  await expect(cell(page, "check")).toBeFocused();

  await tabTo(page, page.getByRole("button", { name: "pin a version" }), "Shift+Tab");
  await page.keyboard.press("Enter");
  await expect(page.getByRole("dialog").getByLabel("Summary")).toBeFocused();
  await page.keyboard.type("Written by keyboard");
  await page.keyboard.press("Enter");
  await expect(page.getByRole("heading", { name: "v1 is pinned" })).toBeVisible();
  await page.keyboard.press("Escape");
  await expect(page.getByRole("dialog")).toBeHidden();
  await expect(page.getByRole("complementary", { name: "Margin" })).toContainText(
    "Written by keyboard",
  );
});

test("I move, copy, delete and bring back cells, and edit one, without a mouse", async ({
  page,
  context,
}) => {
  await signUp(context);
  const id = await start(page.request, fileOf("A limit", limitingLuminosity.slice(1)));
  await page.goto(`/c/${id}`);
  const [given, relation, check] = ["given M", "relation (1) L_Edd", "check"];
  await tabTo(page, cell(page, "given M"));
  await expect.poll(() => order(page)).toEqual([given, relation, check]);

  await page.keyboard.press("d");
  await expect.poll(() => order(page)).toEqual([relation, given, check]);
  await expect(cell(page, "given M")).toBeFocused();
  await page.keyboard.press("u");
  await expect.poll(() => order(page)).toEqual([given, relation, check]);

  await page.keyboard.press("c");
  await expect.poll(() => order(page)).toEqual([given, "given M_2", relation, check]);
  await expect(cell(page, "given M_2")).toBeFocused();
  await page.keyboard.press("Delete");
  await expect.poll(() => order(page)).toEqual([given, relation, check]);
  await page.keyboard.press("Control+z");
  await expect.poll(() => order(page)).toEqual([given, "given M_2", relation, check]);
  await page.keyboard.press("Control+z");
  await expect.poll(() => order(page)).toEqual([given, relation, check]);
  await page.keyboard.press("Control+Shift+Z");
  await expect.poll(() => order(page)).toEqual([given, "given M_2", relation, check]);
  await expectSaved(page);
  expect((await draftOf(page.request, id)).file.cells).toHaveLength(4);
});

test("I open a source line, change it, write below it and close it, without a mouse", async ({
  page,
  context,
}) => {
  await signUp(context);
  const id = await start(page.request, fileOf("A limit", limitingLuminosity.slice(1)));
  await page.goto(`/c/${id}`);
  await tabTo(page, cell(page, "given M"));
  await page.keyboard.press("Enter");
  await expect(page.getByLabel("source of this given")).toBeFocused();
  await page.keyboard.press("Control+a");
  await page.keyboard.type("M = 20 Msun");
  await expect(completions(page)).toBeVisible();
  await page.keyboard.press("Escape");
  await expect(completions(page)).toBeHidden();
  await page.keyboard.press("Escape");
  await expect(cell(page, "given M")).toBeFocused();
  await expectValue(cell(page, "relation (1) L_Edd"), "2.51×1039ergs−1");

  await page.keyboard.press("w");
  await expect(page.getByLabel("New cell here")).toBeFocused();
  await page.keyboard.type("kappa = 0.34 cm^2/g");
  await page.keyboard.press("Enter");
  await expect(cell(page, "given kappa")).toBeFocused();
  await page.keyboard.press("ArrowDown");
  await expect(cell(page, "relation (1) L_Edd")).toBeFocused();
  await page.keyboard.press("ArrowUp");
  await page.keyboard.press("l");
  await expect(lastLine(page)).toBeFocused();
});

test("Enter takes a name of the list only after I chose it with an arrow", async ({
  page,
  context,
}) => {
  await signUp(context);
  const id = await start(page.request, fileOf("A limit", limitingLuminosity.slice(1)));
  const openCheck = async (line: string) => {
    await page.keyboard.press("Enter");
    await expect(page.getByLabel("source of this check")).toBeFocused();
    await page.keyboard.press("Control+a");
    await page.keyboard.type(line);
    await expect(completions(page)).toBeVisible();
  };
  const condition = async () => {
    const { file } = await draftOf(page.request, id);
    return file.cells.find((one) => one.id === "bright");
  };
  await page.goto(`/c/${id}`);
  await tabTo(page, cell(page, "check"));
  await openCheck("3 < L_Ed");
  await page.keyboard.press("Enter");
  await expect(cell(page, "check")).toBeFocused();
  await expect.poll(condition).toMatchObject({ condition: "3 < L_Ed" });

  await openCheck("1e38 erg/s < L_Ed");
  await page.keyboard.press("ArrowDown");
  await page.keyboard.press("Enter");
  await page.keyboard.press("Enter");
  await expect(cell(page, "check")).toBeFocused();
  await expect.poll(condition).toMatchObject({ condition: "1e38 erg/s < L_Edd" });
});

test("The question mark shows the keys, and Escape leads back to the cell in hand", async ({
  page,
  context,
}) => {
  await signUp(context);
  const id = await start(page.request, fileOf("A limit", limitingLuminosity));
  await page.goto(`/c/${id}`);
  await tabTo(page, cell(page, "given M"));
  await page.keyboard.press("?");
  await expect(page.getByRole("dialog", { name: "Keys" })).toContainText("move the cell up");
  await page.keyboard.press("Escape");
  await expect(page.getByRole("dialog")).toBeHidden();
  await expect(cell(page, "given M")).toBeFocused();
});
