import { Superscripts } from "@/components/ui/superscripts";
import type { UnitEntry } from "./shelf-rows";

const cell =
  "block py-0.5 align-baseline lg:table-cell lg:py-2 lg:pr-5 before:font-sans before:text-xs before:text-faint before:content-[attr(data-label)] before:block lg:before:hidden";
const head = "py-2 pr-5 text-left align-bottom font-medium";

function UnitRow({ entry }: { entry: UnitEntry }) {
  return (
    <tr
      id={`unit-${entry.symbol}`}
      className="block border-b border-rule py-3 target:bg-well lg:table-row"
    >
      <th scope="row" className={`${cell} text-left font-normal`}>
        <span className="figures font-semibold">{entry.symbol}</span>
        {entry.aliases && (
          <span className="block font-sans text-xs text-faint">also {entry.aliases}</span>
        )}
      </th>
      <td className={cell} data-label="Name">
        {entry.name}
      </td>
      <td className={cell} data-label="Kind">
        <Superscripts text={entry.dimension} />
      </td>
      <td className={cell} data-label="In coherent SI">
        <span className="figures">
          <Superscripts text={entry.factor} />
        </span>
      </td>
      <td className={`${cell} figures text-faint`} data-label="Prefixes">
        {entry.prefixes || "none"}
      </td>
      <td className={`${cell} font-sans text-faint`} data-label="Source">
        {entry.source}
      </td>
    </tr>
  );
}

/** Units, one a row, with the prefixes they take. */
export function UnitTable({
  caption,
  entries,
}: {
  caption: string;
  entries: readonly UnitEntry[];
}) {
  const heads = ["Unit", "Name", "Kind", "In coherent SI", "Prefixes", "Source"];
  return (
    <table className="block w-full text-sm lg:table">
      <caption className="sr-only">{caption}</caption>
      <thead className="hidden border-b border-ink font-sans lg:table-header-group">
        <tr>
          {heads.map((label) => (
            <th key={label} scope="col" className={head}>
              {label}
            </th>
          ))}
        </tr>
      </thead>
      <tbody className="block lg:table-row-group">
        {entries.map((entry) => (
          <UnitRow key={entry.symbol} entry={entry} />
        ))}
      </tbody>
    </table>
  );
}
