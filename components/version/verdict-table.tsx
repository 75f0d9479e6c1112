import { StatusWord } from "@/components/ui/status-word";
import type { Difference, Verdict } from "@/lib/schema";
import { editionTitles } from "./editions";
import { ratioText, tellValue } from "./tell-difference";

function Row({ difference }: { difference: Difference }) {
  return (
    <tr className="border-t border-rule align-baseline">
      <th scope="row" className="py-1 pr-4 text-left font-normal">
        <a className="link" href={`#cell-${difference.cell}`}>
          {difference.symbol ?? difference.cell}
        </a>
      </th>
      <td className="py-1 pr-4">{difference.what}</td>
      <td className="py-1 pr-4 font-mono">{tellValue(difference.recorded)}</td>
      <td className="py-1 pr-4 font-mono">{tellValue(difference.recomputed)}</td>
      <td className="py-1 font-mono">{ratioText(difference.ratio)}</td>
    </tr>
  );
}

/** What a recomputation found: the verdict in a word, and everything that moved. */
export function VerdictTable({ verdict }: { verdict: Verdict }) {
  const { edition, engine } = verdict.results;
  const under = `under ${editionTitles[edition]}, engine ${engine}`;
  if (verdict.verdict === "reproduces") {
    return (
      <p>
        <StatusWord status="reproduces" /> Every recorded result comes out again {under}.
      </p>
    );
  }
  return (
    <>
      <p>
        <StatusWord status="differs" /> {verdict.differences.length}{" "}
        {verdict.differences.length === 1 ? "result differs" : "results differ"} {under}.
      </p>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: a wide table is scrolled by keyboard. */}
      <section className="overflow-x-auto" aria-label="What moved" tabIndex={0}>
        <table className="mt-2 w-full text-sm tabular-nums">
          <caption className="sr-only">What moved between the record and today</caption>
          <thead>
            <tr className="text-left">
              {["cell", "what", "recorded", "recomputed", "ratio"].map((head) => (
                <th key={head} scope="col" className="py-1 pr-4 font-medium">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {verdict.differences.map((one) => (
              <Row key={`${one.cell} ${one.what}`} difference={one} />
            ))}
          </tbody>
        </table>
      </section>
    </>
  );
}
