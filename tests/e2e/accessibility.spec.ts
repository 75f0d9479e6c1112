import AxeBuilder from "@axe-core/playwright";
import { expect, type Page, test } from "@playwright/test";
import { fileOf, limitingLuminosity, pin, start, withdraw } from "./calculations";
import { cell, expectSaved, sourceLine, write } from "./folio-page";
import { signUp } from "./people";

const tags = ["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa"];

/** What axe finds on the page as it stands, as one line for each element. */
async function findings(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).withTags(tags).analyze();
  return violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary }) => `${id}: ${target.join(" ")} — ${failureSummary}`),
  );
}

async function expectAccessible(page: Page, where: string): Promise<void> {
  await expect(page.getByRole("main")).toBeVisible();
  expect(await findings(page), where).toEqual([]);
}

/** A calculation with a slip of units and a check that fails. */
const faulty = fileOf("With errors", [
  ...limitingLuminosity,
  { id: "slip", kind: "relation", symbol: "E", formula: "L_Edd + 3 erg" },
  { id: "faint", kind: "check", condition: "L_Edd < 1e30 erg/s", because: "or it would be seen" },
]);

const forVisitors = ["/", "/sign-up", "/sign-in", "/reset", "/constants", "/help", "/mail", "/404"];

for (const colorScheme of ["light", "dark"] as const) {
  test.describe(`by ${colorScheme === "light" ? "day" : "night"}`, () => {
    test.use({ colorScheme, reducedMotion: "reduce" });

    for (const path of forVisitors) {
      test(`I meet no barrier at ${path} before I have an account`, async ({ page }) => {
        await page.goto(path);
        // All rows of the long table are alike; a few of them are looked at.
        if (path === "/constants") await page.getByRole("searchbox").fill("electron");
        await expectAccessible(page, path);
      });
    }

    test("I meet no barrier at the desk, in Settings, and on a version", async ({
      page,
      context,
    }) => {
      await signUp(context);
      await page.goto("/desk");
      await expectAccessible(page, "empty desk");
      await page.goto("/settings");
      await expectAccessible(page, "settings");

      const id = await start(page.request, faulty);
      await pin(page.request, id);
      await page.goto("/desk");
      await expectAccessible(page, "desk");
      await page.goto(`/c/${id}/v/1`);
      await page.getByLabel("constants").selectOption("codata-2022");
      await page.getByRole("button", { name: "recompute" }).click();
      await expect(page.getByRole("region", { name: "What moved" })).toBeVisible();
      await expectAccessible(page, "version");
      await withdraw(page.request, id, 1, "The mass was superseded.");
      await page.reload();
      await expectAccessible(page, "withdrawn version");
    });

    test("I meet no barrier while I write, with errors, and while I pin", async ({
      page,
      context,
    }) => {
      await signUp(context);
      const id = await start(page.request, faulty);
      await page.goto(`/c/${id}`);
      await expectSaved(page);
      await expectAccessible(page, "calculation");
      await write(page, "t = 3 Myr");
      await cell(page, "relation (2) E").focus();
      await cell(page, "relation (2) E").press("Enter");
      await expect(sourceLine(page, "relation")).toBeFocused();
      await expectAccessible(page, "open source line");
      await page.getByRole("button", { name: "pin a version" }).click();
      await expect(page.getByRole("dialog").getByLabel("Summary")).toBeFocused();
      await expectAccessible(page, "pinning");
    });
  });
}
