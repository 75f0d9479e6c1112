import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import { afterEach, describe, expect, it, vi } from "vitest";

afterEach(() => {
  vi.unstubAllEnvs();
  vi.resetModules();
});

async function addressOf(forwardedFor: string | undefined, proxies = "0"): Promise<string> {
  vi.stubEnv("PROXIES", proxies);
  vi.resetModules();
  const module = await import("@/lib/http/peer-address");
  const headers = forwardedFor === undefined ? {} : { "x-forwarded-for": forwardedFor };
  return module.addressOf(new Request("http://localhost", { headers }));
}

describe("addressOf", () => {
  it("believes the connection, not the sender", async () => {
    expect(await addressOf("198.51.100.7, 203.0.113.9")).toBe("203.0.113.9");
  });

  it("believes as many proxies as there are", async () => {
    const header = "6.6.6.6, 198.51.100.7, 10.0.0.2, 10.0.0.1";
    expect(await addressOf(header, "1")).toBe("10.0.0.2");
    expect(await addressOf(header, "2")).toBe("198.51.100.7");
  });

  it("has a name for nobody, and no long ones", async () => {
    expect(await addressOf(undefined)).toBe("unknown");
    expect((await addressOf("x".repeat(8000))).length).toBeLessThanOrEqual(64);
  });
});

describe("notePeerAddresses", () => {
  it("appends where each connection comes from", async () => {
    const { notePeerAddresses } = await import("@/lib/http/peer-address");
    notePeerAddresses();
    const server = createServer((request, response) => {
      response.end(String(request.headers["x-forwarded-for"]));
    });
    await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
    const { port } = server.address() as AddressInfo;
    const ask = async (headers: Record<string, string>) =>
      (await fetch(`http://127.0.0.1:${port}`, { headers })).text();
    expect(await ask({})).toBe("127.0.0.1");
    expect(await ask({ "x-forwarded-for": "6.6.6.6" })).toBe("6.6.6.6, 127.0.0.1");
    server.closeAllConnections();
    server.close();
  });
});
