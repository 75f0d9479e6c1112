import type { ReactNode } from "react";

/** The parts of the help, in their order. */
export const helpParts = [
  ["lines", "A line makes a cell"],
  ["givens", "Givens and their uncertainty"],
  ["formulas", "Formulas"],
  ["results", "Results, their uncertainty and scaling"],
  ["names", "Names"],
  ["units", "Units"],
  ["constants", "Constants"],
  ["functions", "Functions"],
  ["conventions", "Gaussian and SI"],
  ["errors", "Errors"],
  ["limits", "Limits"],
  ["keys", "Keys"],
  ["versions", "Versions and recomputing"],
] as const;

export type HelpPart = (typeof helpParts)[number][0];

/** One part of the help under its title. */
export function HelpSection({ part, children }: { part: HelpPart; children: ReactNode }) {
  const title = helpParts.find(([id]) => id === part)?.[1];
  return (
    <section aria-labelledby={part} className="mt-12 first:mt-0">
      <h2 id={part} className="mb-3 scroll-mt-4 text-xl">
        {title}
      </h2>
      <div className="flex flex-col gap-3">{children}</div>
    </section>
  );
}

/** The way to each part, in the margin. */
export function HelpContents() {
  return (
    <nav
      aria-label="Contents of the help"
      className="self-start font-sans text-sm lg:sticky lg:top-6 lg:col-start-2 lg:row-start-1 lg:border-l lg:border-rule lg:pl-8"
    >
      <ul className="flex flex-wrap gap-x-5 gap-y-0.5 lg:flex-col">
        {helpParts.map(([id, title]) => (
          <li key={id}>
            <a href={`#${id}`} className="inline-block py-1 hover:text-calcium hover:underline">
              {title}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}
