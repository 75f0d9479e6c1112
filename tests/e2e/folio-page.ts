import { expect, type Locator, type Page } from "@playwright/test";

/** The empty line at the end of the calculation. */
export function lastLine(page: Page): Locator {
  return page.getByLabel("New cell at the end");
}

/** A cell by a part of its name, such as `relation (1) L_Edd`. */
export function cell(page: Page, name: string | RegExp): Locator {
  return page.getByRole("article", { name });
}

/** Type a line into the empty last line and finish it. */
export async function write(page: Page, line: string): Promise<void> {
  await lastLine(page).fill(line);
  await lastLine(page).press("Enter");
  await expect(lastLine(page)).toHaveValue("");
}

/** The open source line of a cell. */
export function sourceLine(page: Page, kind: string): Locator {
  return page.getByLabel(`source of this ${kind}`);
}

/** Wait until the page says that everything is on the server. */
export async function expectSaved(page: Page): Promise<void> {
  await expect(page.getByText(/^saved \d\d:\d\d:\d\d, revision \d+$/)).toBeVisible();
}

/** What a reader sees of typeset mathematics, without what is there for screen readers. */
export async function seen(mathematics: Locator): Promise<string> {
  const parts = await mathematics.locator(".katex-html").allInnerTexts();
  return parts.join(" ").replace(/[\u200b\s]+/gu, "");
}

/** Wait until the typeset mathematics of a cell shows a value; digits of powers stand beside it. */
export async function expectValue(mathematics: Locator, value: string): Promise<void> {
  await expect.poll(() => seen(mathematics)).toContain(value);
}
