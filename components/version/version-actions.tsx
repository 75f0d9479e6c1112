import type { CalculationFile } from "@/lib/schema";
import { CopyLink } from "./copy-link";
import { RecomputePanel } from "./recompute-panel";
import { WithdrawButton } from "./withdraw-button";

/** What can be done with a version: check it, take it along, and for authors go on or withdraw it. */
export function VersionActions({
  id,
  number,
  edition,
  url,
  mayEdit,
  mayWithdraw,
}: {
  id: string;
  number: number;
  edition: CalculationFile["edition"];
  url: string;
  mayEdit: boolean;
  mayWithdraw: boolean;
}) {
  return (
    <section id="check" className="mt-8 print:hidden">
      <h2 className="mb-2 font-serif text-xl font-semibold">Check and use</h2>
      <RecomputePanel id={id} number={number} edition={edition} />
      <noscript>
        <p className="font-sans text-sm">
          Recomputing here needs scripts. The version file, given to the command-line{" "}
          <code className="font-mono">recompute</code>, is checked without them.
        </p>
      </noscript>
      <div className="mt-4 flex flex-wrap items-baseline gap-x-5 gap-y-2 font-sans text-sm">
        <a className="link" href={`/api/calculations/${id}/versions/${number}?download=1`}>
          download version file
        </a>
        <CopyLink url={url} number={number} />
        {mayEdit && (
          <a className="link" href={`/c/${id}`}>
            open the draft
          </a>
        )}
        {mayWithdraw && <WithdrawButton id={id} number={number} />}
      </div>
    </section>
  );
}
