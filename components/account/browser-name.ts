const browsers: readonly (readonly [RegExp, string])[] = [
  [/Edg\//, "Edge"],
  [/OPR\//, "Opera"],
  [/Firefox\//, "Firefox"],
  [/Chrom(e|ium)\//, "Chrome or Chromium"],
  [/Safari\//, "Safari"],
];

const systems: readonly (readonly [RegExp, string])[] = [
  [/Android/, "Android"],
  [/iPhone|iPad/, "iOS"],
  [/Windows/, "Windows"],
  [/Mac OS X/, "macOS"],
  [/Linux|X11/, "Linux"],
];

/** “Firefox on Linux”, from what a browser says of itself; enough to know one's own by. */
export function browserName(userAgent: string): string {
  const browser = browsers.find(([pattern]) => pattern.test(userAgent))?.[1];
  const system = systems.find(([pattern]) => pattern.test(userAgent))?.[1];
  if (!browser) return userAgent.slice(0, 60) || "An unnamed client";
  return system ? `${browser} on ${system}` : browser;
}
