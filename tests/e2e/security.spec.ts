import { expect, test } from "@playwright/test";
import { fileOf, limitingLuminosity, openTo, pin, start, withdraw } from "./calculations";
import { everything, hostileFile, image, quote, script, smuggled, watch } from "./hostile";
import { attackFrom } from "./other-origin";
import { address, fromHere, newcomer, signIn, signUp } from "./people";

test("Hostile markup is shown as text wherever a calculation has room for words", async ({
  page,
  context,
}) => {
  const { happened } = await watch(page, address());
  await signUp(context, newcomer(`javascript:alert(13) ${quote}`));
  const id = await start(page.request, hostileFile);
  await pin(page.request, id, `${script} ${image}`);
  await openTo(page.request, id, "link");

  await page.goto(`/c/${id}`);
  await expect(page.getByLabel("Title")).toHaveValue(hostileFile.title);
  await expect(page.getByRole("article")).toHaveCount(hostileFile.cells.length);
  for (const cell of await page.getByRole("article").all()) {
    await cell.focus();
    await cell.press("Enter");
    await expect(cell.getByRole("button", { name: "close" })).toBeVisible();
    expect(await smuggled(page)).toEqual([]);
  }
  await withdraw(page.request, id, 1, everything);
  for (const path of [`/c/${id}/v/1`, "/desk", "/settings"]) {
    await page.goto(path);
    await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
    expect(await smuggled(page)).toEqual([]);
  }
  await page.goto(`/c/${id}/v/1`);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(hostileFile.title);
  await expect(page.getByRole("complementary", { name: "Withdrawn" })).toContainText(script);

  await context.clearCookies();
  await page.goto(`/c/${id}`);
  await expect(page.getByRole("heading", { level: 1 })).toHaveText(hostileFile.title);
  expect(await smuggled(page)).toEqual([]);
  expect(happened).toEqual([]);
});

test("A name with angle brackets is refused in words", async ({ page }) => {
  const { email, password } = newcomer();
  await page.goto("/sign-up");
  await page.getByLabel("Name").fill(image);
  await page.getByLabel("E-mail address").fill(email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: "Sign up" }).click();
  await expect(page.getByText(/without control characters or angle brackets/)).toBeVisible();
});

test("A script that hostile text did smuggle in would be stopped by the page's policy", async ({
  page,
}) => {
  const { happened } = await watch(page, address());
  await page.goto("/sign-in");
  await page.evaluate((markup) => {
    document.querySelector("main")?.insertAdjacentHTML("beforeend", markup);
  }, image);
  await expect.poll(() => happened.join("\n")).toContain("script-src");
  expect(await page.evaluate(() => "reached" in window)).toBe(false);
});

// Another port of one host is the same site, so that browsers send the cookies along.
for (const host of ["127.0.0.1", "localhost"]) {
  test(`A page at another port of ${host} can neither write with my cookies nor frame a page`, async ({
    page,
    context,
  }) => {
    await signUp(context);
    const id = await start(page.request, fileOf("Mine", limitingLuminosity));
    const { framed, sent } = await attackFrom(page, host, address(), id);
    expect(sent).toBeGreaterThan(0);
    expect(framed).toEqual([]);

    expect((await page.request.get("/api/me")).ok()).toBe(true);
    const { items } = await (await page.request.get("/api/calculations")).json();
    expect(items).toMatchObject([{ id, title: "Mine", visibility: "private" }]);
  });
}

test("Somebody else's private calculation is nothing to me: 404 for its page and for every act", async ({
  page,
  context,
  browser,
}) => {
  await signUp(context);
  const id = await start(page.request, fileOf("A private limit", limitingLuminosity));
  await pin(page.request, id);
  const stranger = await browser.newContext();
  await signIn(stranger.request, await signUp(stranger));
  const draft = `/api/calculations/${id}`;
  const act = (method: string, path: string, data?: object) =>
    stranger.request.fetch(path, {
      method,
      headers: { ...fromHere(), "if-match": '"1"' },
      ...(data ? { data } : {}),
    });
  const answers = await Promise.all([
    act("GET", `/c/${id}`),
    act("GET", `/c/${id}/v/1`),
    act("GET", draft),
    act("PUT", draft, { file: fileOf("Theirs", []) }),
    act("PATCH", draft, { visibility: "public" }),
    act("DELETE", draft),
    act("POST", `${draft}/versions`, { summary: "Theirs" }),
    act("GET", `${draft}/versions/1`),
    act("POST", `${draft}/versions/1/recompute`, {}),
    act("POST", `${draft}/versions/1/withdraw`, { reason: "Theirs" }),
  ]);
  expect(answers.map((answer) => answer.status())).toEqual(answers.map(() => 404));
  for (const answer of answers) expect(await answer.text()).not.toContain("A private limit");
});
