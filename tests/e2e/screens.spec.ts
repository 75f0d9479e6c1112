import { expect, type Page, test } from "@playwright/test";
import { cell, expectSaved, sourceLine, write } from "./folio-page";
import { signIn, signUp } from "./people";

/** An author of the demo. */
const author = {
  name: "Ilse Wray",
  email: "ilse.wray@tarn-hollow.example",
  password: "limiting luminosity",
};

const folder = "test-results/screens";

const looks = [
  { name: "day", colorScheme: "light", viewport: { width: 1360, height: 900 } },
  { name: "night", colorScheme: "dark", viewport: { width: 1360, height: 900 } },
  { name: "phone", colorScheme: "light", viewport: { width: 360, height: 740 } },
] as const;

interface Calculation {
  readonly id: string;
  readonly latestVersion: number | null;
}

async function demoCalculations(page: Page): Promise<readonly Calculation[]> {
  const { items } = await (await page.request.get("/api/calculations")).json();
  return items;
}

for (const { name, ...look } of looks) {
  test.describe(name, () => {
    test.use({ ...look, reducedMotion: "reduce" });

    const picture = async (page: Page, what: string) => {
      await page.evaluate(() => document.fonts.ready);
      const path = `${folder}/${what}-${name}.png`;
      // The tables of these two are as long as ten screens.
      const isLong = what === "constants" || what === "help";
      const taken = await page.screenshot({ path, fullPage: !isLong });
      expect(taken.length).toBeGreaterThan(5_000);
    };

    test("The screens of a visitor are shown as they are", async ({ page }) => {
      for (const path of ["front", "sign-up", "sign-in", "reset", "constants", "help", "nowhere"]) {
        await page.goto(path === "front" ? "/" : `/${path}`);
        await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
        await picture(page, path);
      }
    });

    test("The screens of an author are shown as they are", async ({ page }) => {
      await signIn(page.request, author);
      for (const path of ["desk", "settings", "mail"]) {
        await page.goto(`/${path}`);
        await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
        await picture(page, path);
      }
      const calculations = await demoCalculations(page);
      const pinned = calculations.find((one) => one.latestVersion !== null);
      await page.goto(`/c/${pinned?.id}`);
      await expectSaved(page);
      await picture(page, "folio");
      await page.goto(`/c/${pinned?.id}/v/${pinned?.latestVersion}`);
      await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
      await picture(page, "version");
    });

    test("The screens of somebody at work are shown as they are", async ({ page, context }) => {
      await signUp(context);
      await page.goto("/desk");
      await picture(page, "desk-empty");
      await page.getByRole("button", { name: "New calculation" }).click();
      await page.waitForURL(/\/c\/[^/]+$/);
      await picture(page, "folio-empty");
      for (const line of ["M = 10 Msun", "L_Edd = 4 pi G M m_p c / sigma_T", "E = L_Edd + 3 erg"]) {
        await write(page, line);
      }
      await cell(page, "relation (2) E").focus();
      await cell(page, "relation (2) E").press("Enter");
      await expect(sourceLine(page, "relation")).toBeFocused();
      await picture(page, "folio-error");
      await page.getByRole("button", { name: "pin a version" }).click();
      await expect(page.getByRole("dialog").getByLabel("Summary")).toBeFocused();
      await picture(page, "pinning");
    });
  });
}
