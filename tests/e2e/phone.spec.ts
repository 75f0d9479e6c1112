import { expect, type Page, test } from "@playwright/test";
import { fileOf, limitingLuminosity, pin, start } from "./calculations";
import { cell, expectSaved, expectValue, write } from "./folio-page";
import { signUp } from "./people";

/** How far the page is wider than the window, in CSS pixels. */
function overflow(page: Page): Promise<number> {
  return page.evaluate(() => {
    const { scrollWidth, clientWidth } = document.documentElement;
    return scrollWidth - clientWidth;
  });
}

/** Lines that are longer than a phone is wide. */
const long = fileOf("The limiting luminosity of a very massive and rapidly accreting object", [
  ...limitingLuminosity,
  {
    id: "long",
    kind: "relation",
    symbol: "R_out",
    formula: "(3 L_Edd / (4 pi sigma_SB (2.725 K)^4))^(1/2) + (G M / c^2) + (G M / (4 c^2))^(1/1)",
    unit: "pc",
  },
  { id: "slip", kind: "relation", symbol: "E", formula: "L_Edd + 3 erg" },
]);

for (const width of [360, 320]) {
  test.describe(`at ${width} pixels`, () => {
    test.use({ viewport: { width, height: 740 }, hasTouch: true, isMobile: true });

    test("No screen has to be scrolled sideways", async ({ page, context }) => {
      for (const path of ["/", "/sign-up", "/sign-in", "/reset", "/constants", "/help", "/404"]) {
        await page.goto(path);
        expect(await overflow(page), path).toBeLessThanOrEqual(0);
      }
      await signUp(context);
      const id = await start(page.request, long);
      await pin(page.request, id);
      for (const path of ["/desk", "/settings", "/mail", `/c/${id}`, `/c/${id}/v/1`]) {
        await page.goto(path);
        expect(await overflow(page), path).toBeLessThanOrEqual(0);
      }
    });

    test("I write an estimate, and the margin is a drawer below it", async ({ page, context }) => {
      await signUp(context);
      const id = await start(page.request, fileOf("", []));
      await page.goto(`/c/${id}`);
      await write(page, "M = 10 Msun");
      await write(page, "L_Edd = 4 pi G M m_p c / sigma_T to erg/s");
      await expectValue(cell(page, "relation (1) L_Edd"), "1.26×1039ergs−1");
      await expectSaved(page);

      const value = page.getByLabel("value of M");
      await expect(value).toBeHidden();
      const drawer = page.getByText("Givens, constants, versions, readers");
      await drawer.tap();
      await value.fill("20 Msun");
      await expectValue(cell(page, "relation (1) L_Edd"), "2.51×1039ergs−1");
      expect(await overflow(page)).toBeLessThanOrEqual(0);
      await drawer.tap();
      await expect(value).toBeHidden();
      await expectSaved(page);
    });
  });
}
