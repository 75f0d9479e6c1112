import { type Browser, chromium, type Page } from "@playwright/test";
import type { CalculationFile, Cell } from "../../lib/schema";
import { type Measurement, quantile } from "./report";

const launch = {
  executablePath: "/usr/bin/chromium",
  args: ["--no-sandbox", "--disable-gpu", "--disable-background-networking"],
};

/** The pause after a keystroke that the folio waits, which the target leaves out. */
const debounceMs = 150;
const keystrokes = 40;
/** Time for scripts that a page asks for after it has loaded. */
const settleMs = 2_000;

function hundredCells(): CalculationFile {
  const cells: Cell[] = Array.from({ length: 100 }, (_, i): Cell => {
    if (i === 0) return { id: "g0", kind: "given", symbol: "M", value: 10, unit: "Msun" };
    if (i % 4 === 0) return { id: `t${i}`, kind: "text", markdown: `Step ${i}, with $x_{${i}}$.` };
    return {
      id: `r${i}`,
      kind: "relation",
      symbol: `L_${i}`,
      formula: `${i} pi G M m_p c / sigma_T`,
    };
  });
  return { format: "leading-order/1", title: "A hundred cells", edition: "codata-2018", cells };
}

async function signUp(page: Page, base: string): Promise<void> {
  const data = {
    email: `bench-${Date.now()}@bench.example`,
    name: "Bench",
    password: "a long enough password",
  };
  await page.request.post(`${base}/api/auth/sign-up`, { data, headers: { origin: base } });
}

/** From a keystroke in a given's field to its dependants repainted, in a folio of a hundred cells. */
async function keystrokeMs(browser: Browser, base: string): Promise<number[]> {
  const page = await browser.newPage();
  await signUp(page, base);
  const made = await page.request.post(`${base}/api/calculations`, {
    data: { file: hundredCells() },
    headers: { origin: base },
  });
  const { id } = await made.json();
  await page.goto(`${base}/c/${id}`);
  const field = page.getByLabel("value of M");
  await field.fill("10 Msun");
  await page.waitForTimeout(1_500);
  const times: number[] = [];
  for (let i = 0; i < keystrokes; i++) {
    await page.evaluate(() => performance.clearMarks());
    await field.fill(`1${i % 10}.5 Msun`);
    await page.waitForFunction(() => performance.getEntriesByName("lo:painted").length > 0);
    const marks = await page.evaluate(() =>
      performance.getEntriesByType("mark").map((mark) => ({ name: mark.name, at: mark.startTime })),
    );
    const [typed, painted] = ["lo:keystroke", "lo:painted"].map(
      (name) => marks.findLast((mark) => mark.name === name)?.at,
    );
    times.push((painted ?? Number.NaN) - (typed ?? Number.NaN));
    await page.waitForTimeout(50);
  }
  await page.close();
  return times.map((ms) => ms - debounceMs);
}

/** Bytes of script as they cross the wire, for one first load of a page. */
async function scriptBytes(browser: Browser, url: string): Promise<number> {
  const context = await browser.newContext();
  const page = await context.newPage();
  const session = await context.newCDPSession(page);
  await session.send("Network.enable");
  const scripts = new Map<string, boolean>();
  let bytes = 0;
  session.on("Network.responseReceived", (event) =>
    scripts.set(event.requestId, event.type === "Script"),
  );
  session.on("Network.loadingFinished", (event) => {
    if (scripts.get(event.requestId)) bytes += event.encodedDataLength;
  });
  await page.goto(url, { waitUntil: "load" });
  await page.waitForTimeout(settleMs);
  await context.close();
  return bytes;
}

/** What a person at a browser waits for, and what the version page sends. */
export async function measureBrowser(base: string, version: string): Promise<Measurement[]> {
  const browser = await chromium.launch(launch);
  try {
    const times = await keystrokeMs(browser, base);
    const p95 = quantile(times, 0.95);
    const empty = await scriptBytes(browser, `${base}/there-is-no-such-page`);
    const full = await scriptBytes(browser, base + version);
    return [
      {
        what: "keystroke to repainted value, folio of 100 cells, debounce excluded, p95",
        ours: p95,
        reference: quantile(times, 0.5),
        unit: "ms",
        referenceName: "median",
        figure: p95,
        target: "< 100 ms",
        met: p95 < 100,
      },
      {
        what: "script of a version page above an empty page, gzip",
        ours: full / 1000,
        reference: empty / 1000,
        unit: "kB",
        referenceName: "page that is not there",
        figure: (full - empty) / 1000,
        target: "≤ 60 kB",
        met: full - empty <= 60_000,
      },
    ];
  } finally {
    await browser.close();
  }
}
