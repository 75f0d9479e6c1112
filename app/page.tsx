import Link from "next/link";
import type { ReactNode } from "react";
import { exampleFile, firstInputs } from "@/components/front/example-file";
import { LiveExample } from "@/components/front/live-example";
import { PinnedLately } from "@/components/front/pinned-lately";
import { PageBody } from "@/components/site/page-body";
import { Tex } from "@/components/typeset/tex";
import { ButtonLink } from "@/components/ui/button";
import { currentPerson } from "@/lib/auth/current-person";
import { listCalculations } from "@/lib/calculations";
import { evaluate } from "@/lib/evaluator";

const listed = 5;

/** A numbered section, as in a paper. */
function Section({
  number,
  title,
  children,
}: {
  number: number;
  title: string;
  children: ReactNode;
}) {
  return (
    <section className="mt-14" aria-labelledby={`section-${number}`}>
      <h2 id={`section-${number}`} className="mb-4 text-xl">
        <span className="mr-4">{number}</span>
        {title}
      </h2>
      {children}
    </section>
  );
}

function WayIn({ signedIn }: { signedIn: boolean }) {
  return (
    <p className="no-print mt-6 flex flex-wrap items-center gap-3">
      {signedIn ? (
        <ButtonLink href="/desk" look="primary">
          Go to the desk
        </ButtonLink>
      ) : (
        <>
          <ButtonLink href="/sign-up" look="primary">
            Sign up
          </ButtonLink>
          <ButtonLink href="/sign-in">Sign in</ButtonLink>
        </>
      )}
      <ButtonLink href="/help" look="quiet">
        How formulas are written
      </ButtonLink>
    </p>
  );
}

export default async function FrontPage() {
  const first = await evaluate(exampleFile(firstInputs), { present: true });
  const { items } = await listCalculations(null, { scope: "public" });
  const shown = first.presentation?.cells ?? {};
  const tex = (id: string, display = false) => <Tex tex={shown[id]?.tex ?? ""} display={display} />;
  return (
    <PageBody>
      <div className="max-w-folio">
        <h1 className="text-4xl sm:text-5xl">Estimates that keep their working</h1>
        <p className="mt-6 text-lg">
          <b>Abstract.</b> Leading Order is a shared calculator for theoretical astrophysics. You
          write an estimate in the order of thought; units and dimensions are checked as you type,
          constants come from a named, published edition, and the answer is set as a paper would
          print it. When it is done you pin it: that version gets a number and an address that never
          changes, and whoever reads your paper can open it, recompute it and follow every step,
          without an account.
        </p>
        <WayIn signedIn={(await currentPerson()) !== null} />
      </div>
      <Section number={1} title="A limiting luminosity">
        <LiveExample
          first={first}
          equations={{
            luminosity: tex("luminosity", true),
            rate: tex("rate", true),
            check: tex("scattering"),
          }}
        />
      </Section>
      <Section number={2} title="What stands behind a number">
        <div className="grid gap-x-12 gap-y-10 lg:grid-cols-[minmax(0,44rem)_minmax(0,1fr)]">
          <div className="flex flex-col gap-4">
            <p>
              <i>Dimensions.</i> Every formula has its dimension worked out before it is evaluated.
              A luminosity added to an energy is refused with a sentence that says by what they
              differ, and charges know whether they are Gaussian or SI.
            </p>
            <p>
              <i>Constants.</i> <i>G</i> and <i>c</i> above are those of{" "}
              <Link href="/constants" className="link">
                CODATA 2022
              </Link>
              . A calculation names its edition, and the numbers of an edition do not move.
            </p>
            <p>
              <i>Checks.</i> What must hold for the estimate to be valid is a part of it. Raise the
              opacity above: the result says that its check fails.
            </p>
            <p>
              <i>Versions.</i> A pinned version is immutable and carries its results, the edition,
              the release of the engine and a hash of it all. Recomputing says whether today’s
              engine reproduces it or differs. A version can be withdrawn, with a reason; it cannot
              vanish.
            </p>
          </div>
          {items.length > 0 && <PinnedLately items={items.slice(0, listed)} />}
        </div>
      </Section>
    </PageBody>
  );
}
