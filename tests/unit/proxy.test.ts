import { NextRequest } from "next/server";
import { afterEach, describe, expect, it, vi } from "vitest";
import { proxy } from "@/proxy";

afterEach(() => {
  vi.unstubAllEnvs();
});

const answer = (headers: Record<string, string> = {}) =>
  proxy(new NextRequest("http://localhost:3000/c/0123456789", { headers }));

/** The directives of the content policy by name. */
function policy(headers = answer().headers): Map<string, string> {
  const directives = (headers.get("content-security-policy") ?? "").split("; ");
  return new Map(
    directives.map((one) => [one.split(" ")[0] ?? "", one.split(" ").slice(1).join(" ")]),
  );
}

describe("the content policy", () => {
  it("lets only scripts with this answer's nonce run", () => {
    const script = policy().get("script-src");
    expect(script).toMatch(/^'self' 'nonce-[\w+/]{22}==' 'strict-dynamic'$/);
    expect(policy().get("script-src")).not.toBe(script);
  });

  it.each([
    ["default-src", "'self'"],
    ["img-src", "'self' data: blob:"],
    ["font-src", "'self'"],
    ["connect-src", "'self'"],
    ["object-src", "'none'"],
    ["base-uri", "'none'"],
    ["form-action", "'self'"],
    ["frame-ancestors", "'none'"],
  ])("%s is %s", (name, value) => {
    expect(policy().get(name)).toBe(value);
  });

  it("is loosened for the development server, and there alone", () => {
    vi.stubEnv("NODE_ENV", "production");
    expect(policy().get("script-src")).not.toContain("unsafe");
    vi.stubEnv("NODE_ENV", "development");
    expect(policy().get("script-src")).toContain("'unsafe-eval'");
  });

  it("gives the page its nonce, and not one that was sent", () => {
    const { headers } = answer({ "x-nonce": "chosen", "content-security-policy": "script-src *" });
    const nonce = headers.get("x-middleware-request-x-nonce");
    expect(policy(headers).get("script-src")).toContain(`'nonce-${nonce}'`);
    expect(nonce).not.toBe("chosen");
    expect(headers.get("x-middleware-request-content-security-policy")).toBe(
      headers.get("content-security-policy"),
    );
  });
});

describe("every answer", () => {
  it.each([
    ["x-content-type-options", "nosniff"],
    ["referrer-policy", "strict-origin-when-cross-origin"],
    ["cross-origin-opener-policy", "same-origin"],
  ])("has %s: %s", (name, value) => {
    expect(answer().headers.get(name)).toBe(value);
  });

  it("asks for no camera, place or microphone", () => {
    const policies = answer().headers.get("permissions-policy");
    for (const name of ["camera", "geolocation", "microphone"]) {
      expect(policies).toContain(`${name}=()`);
    }
  });

  it("insists on TLS behind TLS, and only there", () => {
    expect(answer().headers.get("strict-transport-security")).toBeNull();
    vi.stubEnv("APP_URL", "https://estimates.example");
    expect(answer().headers.get("strict-transport-security")).toMatch(/^max-age=31536000/);
  });
});
