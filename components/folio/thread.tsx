"use client";

import { type RefObject, useLayoutEffect, useState } from "react";

interface Line {
  readonly id: string;
  readonly from: number;
  readonly to: number;
  readonly uses: boolean;
}

const width = 28;

function middleOf(column: HTMLElement, id: string): number | undefined {
  const cell = column.querySelector<HTMLElement>(`#cell-${CSS.escape(id)}`);
  return cell ? cell.offsetTop + Math.min(cell.offsetHeight / 2, 28) : undefined;
}

function linesOf(
  column: HTMLElement,
  current: string,
  uses: readonly string[],
  usedBy: readonly string[],
): Line[] {
  const from = middleOf(column, current);
  if (from === undefined) return [];
  const toLine = (id: string, isUsed: boolean): Line[] => {
    const to = middleOf(column, id);
    return to === undefined ? [] : [{ id, from, to, uses: isUsed }];
  };
  return [...uses.flatMap((id) => toLine(id, true)), ...usedBy.flatMap((id) => toLine(id, false))];
}

/** Thin lines from the cell in hand to those it uses, and to those that use it. */
export function Thread({
  column,
  current,
  uses,
  usedBy,
}: {
  column: RefObject<HTMLElement | null>;
  current: string | null;
  uses: readonly string[];
  usedBy: readonly string[];
}) {
  const [lines, setLines] = useState<readonly Line[]>([]);
  useLayoutEffect(() => {
    const { current: element } = column;
    if (!element || current === null) return setLines([]);
    const draw = () => setLines(linesOf(element, current, uses, usedBy));
    draw();
    const observer = new ResizeObserver(draw);
    observer.observe(element);
    return () => observer.disconnect();
  }, [column, current, uses, usedBy]);
  return (
    <svg className="thread" width={width} aria-hidden="true">
      {lines.map((line) => {
        const reach = Math.max(4, width - 6 - Math.min(18, Math.abs(line.to - line.from) / 40));
        const d = `M ${width} ${line.from} C ${width - reach} ${line.from}, ${width - reach} ${line.to}, ${width} ${line.to}`;
        return (
          <path key={line.id} d={d} className={line.uses ? "thread-uses" : "thread-used-by"} />
        );
      })}
    </svg>
  );
}
