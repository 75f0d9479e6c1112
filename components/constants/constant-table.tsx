import { CopyButton } from "@/components/ui/copy-button";
import { Superscripts } from "@/components/ui/superscripts";
import type { ConstantEntry, EditionValue } from "./shelf-rows";

/** On a narrow page every cell stands under its own heading. */
const cell =
  "block py-0.5 align-baseline xl:table-cell xl:py-2.5 xl:pr-5 before:font-sans before:text-xs before:text-faint before:content-[attr(data-label)] before:block xl:before:hidden";
const head = "py-2 pr-5 text-left align-bottom font-medium";

function ValueCell({
  value,
  symbol,
  same,
}: {
  value: EditionValue;
  symbol: string;
  same: boolean;
}) {
  return (
    <td className={cell} data-label={value.edition}>
      <span className={`figures whitespace-nowrap ${same ? "text-faint" : ""}`}>
        <Superscripts text={value.notation} />
      </span>
      <span className="flex items-center gap-x-3 font-sans text-xs text-faint">
        {value.exact && "exact"}
        <CopyButton text={value.typed} what={`${symbol}, ${value.edition}`} />
      </span>
    </td>
  );
}

function ConstantRow({ entry }: { entry: ConstantEntry }) {
  const [first] = entry.values;
  return (
    <tr id={entry.symbol} className="block border-b border-rule py-3 target:bg-well xl:table-row">
      <th scope="row" className={`${cell} text-left font-normal`}>
        <a href={`#${entry.symbol}`} className="figures font-semibold hover:underline">
          {entry.symbol}
        </a>
        <span className="block text-[0.95rem] leading-snug">{entry.name}</span>
      </th>
      {entry.values.map((value) => (
        <ValueCell
          key={value.edition}
          value={value}
          symbol={entry.symbol}
          same={value !== first && value.notation === first?.notation}
        />
      ))}
      <td className={cell} data-label="Unit">
        <span className="figures whitespace-nowrap">
          <Superscripts text={entry.unit || "1"} />
        </span>
      </td>
      <td className={`${cell} font-sans text-sm`} data-label="What changed">
        <Superscripts text={entry.change} />
      </td>
      <td className={`${cell} font-sans text-sm text-faint`} data-label="Source">
        {entry.sources.join("; ")}
      </td>
    </tr>
  );
}

/** Constants, one a row, the editions side by side. */
export function ConstantTable({
  caption,
  entries,
}: {
  caption: string;
  entries: readonly ConstantEntry[];
}) {
  const editions = entries[0]?.values.map((value) => value.edition) ?? [];
  return (
    <table className="block w-full text-sm xl:table">
      <caption className="sr-only">{caption}</caption>
      <thead className="hidden border-b border-ink font-sans xl:table-header-group">
        <tr>
          {["Constant", ...editions, "Unit", "What changed", "Source"].map((label) => (
            <th key={label} scope="col" className={head}>
              {label}
            </th>
          ))}
        </tr>
      </thead>
      <tbody className="block xl:table-row-group">
        {entries.map((entry) => (
          <ConstantRow key={entry.symbol} entry={entry} />
        ))}
      </tbody>
    </table>
  );
}
