"use client";

import { type ReactNode, useId, useState } from "react";
import { ConstantTable } from "./constant-table";
import { matches } from "./matches";
import type { ConstantEntry, UnitEntry } from "./shelf-rows";
import { UnitTable } from "./unit-table";

export interface ShelfSection {
  readonly id: string;
  readonly title: string;
  readonly about: ReactNode;
  readonly constants?: readonly ConstantEntry[];
  readonly units?: readonly UnitEntry[];
}

const found = {
  constants: (search: string, entries: readonly ConstantEntry[]) =>
    entries.filter((e) => matches(search, [e.symbol, e.name, e.unit, ...e.sources])),
  units: (search: string, entries: readonly UnitEntry[]) =>
    entries.filter((e) => matches(search, [e.symbol, e.shown, e.name, e.aliases, e.dimension])),
};

function SectionPart({ section, search }: { section: ShelfSection; search: string }) {
  const constants = found.constants(search, section.constants ?? []);
  const units = found.units(search, section.units ?? []);
  if (constants.length + units.length === 0) return null;
  return (
    <section aria-labelledby={section.id} className="mt-12">
      <h2 id={section.id} className="text-xl">
        {section.title}
      </h2>
      <div className="mt-1 mb-4 max-w-folio">{section.about}</div>
      {constants.length > 0 && <ConstantTable caption={section.title} entries={constants} />}
      {units.length > 0 && <UnitTable caption={section.title} entries={units} />}
    </section>
  );
}

function count(sections: readonly ShelfSection[], search: string): number {
  return sections
    .map(
      ({ constants, units }) =>
        found.constants(search, constants ?? []).length + found.units(search, units ?? []).length,
    )
    .reduce((a, b) => a + b, 0);
}

/** Everything on the shelf, narrowed by a search; whole where scripts are off. */
export function Shelf({ sections }: { sections: readonly ShelfSection[] }) {
  const [search, setSearch] = useState("");
  const id = useId();
  const left = count(sections, search.trim());
  return (
    <>
      <div className="no-print mt-6 max-w-[30rem] font-sans text-sm">
        <label htmlFor={id} className="block font-medium">
          Search names, symbols and units
        </label>
        <input
          id={id}
          type="search"
          value={search}
          onChange={(event) => setSearch(event.target.value)}
          className="mt-1 min-h-10 w-full border border-edge bg-transparent px-2.5"
        />
        <p role="status" className="mt-1 min-h-5 text-faint">
          {search.trim() !== "" &&
            (left === 0
              ? "Nothing on the shelf has these words."
              : `${left} ${left === 1 ? "entry" : "entries"}`)}
        </p>
      </div>
      {sections.map((section) => (
        <SectionPart key={section.id} section={section} search={search.trim()} />
      ))}
    </>
  );
}
