import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import type { Page } from "@playwright/test";

/** The page that another origin serves: it writes in every way that browsers allow without asking. */
function attackPage(target: string, id: string): string {
  const file = { format: "leading-order/1", title: "Theirs", edition: "codata-2022", cells: [] };
  const calls = [
    ["POST", "/api/auth/sign-out", ""],
    ["POST", "/api/calculations", JSON.stringify({ file })],
    ["PUT", `/api/calculations/${id}`, JSON.stringify({ file })],
    ["PATCH", `/api/calculations/${id}`, JSON.stringify({ visibility: "public" })],
    ["DELETE", `/api/calculations/${id}`, ""],
  ];
  return `<!doctype html><meta charset="utf-8"><title>Elsewhere</title>
    <form method="post" action="${target}/api/auth/sign-out"><button>Send</button></form>
    <script>
      const calls = ${JSON.stringify(calls)};
      const send = ([method, path, body]) => fetch("${target}" + path, {
        method, body: body || undefined, credentials: "include",
        mode: method === "POST" ? "no-cors" : "cors",
        headers: method === "POST" ? { "content-type": "text/plain" }
          : { "content-type": "application/json", "if-match": '"1"' },
      }).catch(() => undefined);
      window.done = Promise.all(calls.map(send));
    </script>`;
}

async function listen(server: Server): Promise<number> {
  await new Promise<void>((ready) => server.listen(0, "127.0.0.1", ready));
  return (server.address() as AddressInfo).port;
}

/** Put each page in a frame; the addresses of those that let themselves be framed. */
async function frameAll(page: Page, target: string, paths: readonly string[]): Promise<string[]> {
  await page.evaluate(
    (addresses) =>
      Promise.all(
        addresses.map((src) => {
          const frame = Object.assign(document.createElement("iframe"), { src });
          const loaded = new Promise((done) => frame.addEventListener("load", done));
          document.body.append(frame);
          return loaded;
        }),
      ),
    paths.map((path) => target + path),
  );
  return page
    .frames()
    .map((frame) => frame.url())
    .filter((url) => url.startsWith(target));
}

/**
 * Visit a page of another origin that writes with the visitor's cookies, sends a form, and frames
 * the pages of the product. Answers which pages it could frame and how many writes were sent.
 */
export async function attackFrom(
  page: Page,
  host: string,
  target: string,
  id: string,
): Promise<{ framed: string[]; sent: number }> {
  const server = createServer((_, response) => {
    response.writeHead(200, { "content-type": "text/html" }).end(attackPage(target, id));
  });
  const port = await listen(server);
  let sent = 0;
  page.on("request", (request) => {
    if (request.method() !== "GET" && request.url().startsWith(target)) sent += 1;
  });
  try {
    await page.goto(`http://${host}:${port}/`);
    await page.evaluate(() => (window as unknown as { done: Promise<unknown> }).done);
    const paths = ["/", "/sign-in", "/desk", "/settings", "/mail", `/c/${id}`, "/nowhere"];
    const framed = await frameAll(page, target, paths);
    await page.getByRole("button", { name: "Send" }).click();
    await page.waitForURL(`${target}/**`);
    return { framed, sent };
  } finally {
    server.close();
    server.closeAllConnections();
  }
}
