import Link from "next/link";
import { exampleFile, firstInputs } from "@/components/front/example-file";
import type { CalculationSummary } from "@/lib/schema";
import { NewCalculationButton } from "./new-calculation-button";

/** What somebody finds who has no calculation yet: two ways to begin. */
export function EmptyDesk({ demo }: { demo: CalculationSummary | undefined }) {
  return (
    <div className="mt-6 flex flex-col items-start gap-4 border-t border-rule pt-6">
      <p className="text-lg">You have no calculation yet.</p>
      <p>
        Begin with an empty page, or with a copy of the limiting luminosity from the front page, to
        see how givens, relations and checks are written.
        {demo && (
          <>
            {" "}
            To see a finished one, open{" "}
            <Link href={`/c/${demo.id}/v/${demo.latestVersion}`} className="link">
              {demo.title}
            </Link>{" "}
            by {demo.owner}.
          </>
        )}
      </p>
      <div className="flex flex-wrap gap-3">
        <NewCalculationButton />
        <NewCalculationButton look="plain" file={exampleFile(firstInputs)}>
          Begin with the example
        </NewCalculationButton>
      </div>
    </div>
  );
}
