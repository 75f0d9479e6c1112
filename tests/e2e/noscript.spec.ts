import { expect, test } from "@playwright/test";
import { fileOf, limitingLuminosity, openTo, pin, start } from "./calculations";
import { seen } from "./folio-page";
import { signUp } from "./people";

test.use({ javaScriptEnabled: false });

test("A version is readable without scripts: equations, numbers, checks and provenance", async ({
  page,
  context,
}) => {
  await signUp(context);
  const id = await start(page.request, fileOf("A limit", limitingLuminosity));
  await pin(page.request, id, "As first cited");
  await openTo(page.request, id, "link");
  await context.clearCookies();

  await page.goto(`/c/${id}/v/1`);
  const calculation = page.getByRole("region", { name: "The calculation" });
  await expect(page.getByRole("heading", { name: "A limit" })).toBeVisible();
  expect(await seen(calculation)).toMatch(/=1\.2\d*(\(\d+\))?×1039ergs−1/);
  expect(await calculation.locator("math").count()).toBeGreaterThanOrEqual(3);
  await expect(calculation.getByText("holds")).toBeVisible();
  await expect(page.getByText("As first cited")).toBeVisible();
  expect(await page.locator("noscript").textContent()).toContain("Recomputing here needs scripts.");
});

test("The constants are readable without scripts, with their editions side by side", async ({
  page,
}) => {
  await page.goto("/constants");
  const main = page.getByRole("main");
  await expect(main.getByRole("heading", { level: 1 })).toBeVisible();
  await expect(main).toContainText("CODATA 2018");
  await expect(main).toContainText("CODATA 2022");
  await expect(main).toContainText(/6\.674\s?30/);
});
