"use client";

import { useFolio } from "@/components/folio/folio-context";
import { systemOf } from "@/components/folio/line-edit";
import { Tex } from "@/components/typeset/tex";
import { nameTex } from "@/lib/expr/tex-names";
import { findConstant, unitTex } from "@/lib/physics";

/** The constants this calculation rests on, in the edition in force. */
export function MarginConstants() {
  const { state, answer } = useFolio();
  const system = systemOf(state.file);
  const names = new Set(
    Object.values(answer.presentation?.cells ?? {}).flatMap((cell) => cell.constants),
  );
  if (names.size === 0) return null;
  return (
    <section className="margin-part" aria-labelledby="margin-constants">
      <h2 id="margin-constants">Constants in use</h2>
      <ul>
        {[...names].map((name) => {
          const constant = findConstant(name, system);
          if (!constant) return null;
          const [digits = "", power] = constant.text.split("e");
          const value = power === undefined ? digits : `${digits} \\times 10^{${Number(power)}}`;
          return (
            <li
              key={name}
              title={`${constant.name}. ${constant.source}`}
              className="py-0.5 text-sm"
            >
              <Tex tex={`${nameTex(name)} = ${value}\\,${unitTex(constant.unit, system)}`} />
            </li>
          );
        })}
      </ul>
    </section>
  );
}
