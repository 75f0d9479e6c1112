import { expect, test } from "@playwright/test";
import { fileOf, limitingLuminosity, openTo, pin, start } from "./calculations";
import { signUp } from "./people";

const nothingHere = "There is nothing at this address";

test("An address that leads nowhere says so in words, with a way on", async ({ page }) => {
  const answer = await page.goto("/no/such/page");
  expect(answer?.status()).toBe(404);
  await expect(page.getByRole("heading", { name: nothingHere })).toBeVisible();
  await page.getByRole("main").getByRole("link", { name: "front page" }).click();
  await page.waitForURL("/");
});

test("A version that does not exist is a 404 page, for its author too", async ({
  page,
  context,
}) => {
  await signUp(context);
  const id = await start(page.request, fileOf("A limit", limitingLuminosity));
  await pin(page.request, id);
  for (const address of [`/c/${id}/v/2`, `/c/${id}/v/0`, `/c/${id}/v/one`, "/c/nothing/v/1"]) {
    const answer = await page.goto(address);
    expect(answer?.status(), address).toBe(404);
    await expect(page.getByRole("heading", { name: nothingHere })).toBeVisible();
  }
});

test("A private version is a 404 for visitors and can be read by its author", async ({
  page,
  context,
  browser,
}) => {
  await signUp(context);
  const id = await start(page.request, fileOf("A private limit", limitingLuminosity));
  await pin(page.request, id);
  const own = await page.goto(`/c/${id}/v/1`);
  expect(own?.status()).toBe(200);
  await expect(page.getByRole("heading", { name: "A private limit" })).toBeVisible();

  const visitor = await (await browser.newContext()).newPage();
  for (const address of [`/c/${id}/v/1`, `/c/${id}`]) {
    const answer = await visitor.goto(address);
    expect(answer?.status(), address).toBe(404);
    await expect(visitor.getByRole("heading", { name: nothingHere })).toBeVisible();
    expect(await visitor.content()).not.toContain("A private limit");
  }
});

test("A version stays as it was when the draft goes on, and points to the latest", async ({
  page,
  context,
}) => {
  await signUp(context);
  const id = await start(page.request, fileOf("A limit", limitingLuminosity));
  await pin(page.request, id, "First estimate");
  await openTo(page.request, id, "link");
  await page.goto(`/c/${id}/v/1`);
  const before = await page.getByRole("region", { name: "The calculation" }).textContent();

  await page.goto(`/c/${id}`);
  await page.getByLabel("value of M").fill("20(1) Msun");
  await page.getByRole("button", { name: "pin a version" }).click();
  await page.getByRole("dialog").getByLabel("Summary").fill("Twice the mass");
  await page.getByRole("dialog").getByRole("button", { name: /^pin/ }).click();
  await expect(page.getByRole("heading", { name: "v2 is pinned" })).toBeVisible();

  await page.goto(`/c/${id}/v/1`);
  expect(await page.getByRole("region", { name: "The calculation" }).textContent()).toBe(before);
  await page.getByRole("link", { name: "v2 is the latest" }).click();
  await page.waitForURL(`/c/${id}/v/2`);
  await expect(page.getByText("Twice the mass")).toBeVisible();
});
