"use client";

import { type ReactNode, useEffect, useState } from "react";
import { ProblemMessage } from "@/components/site/problem-message";
import { StatusWord } from "@/components/ui/status-word";
import type { EvaluateAnswer } from "@/lib/schema";
import { firstInputs } from "./example-file";
import { ExampleResult, exampleValue } from "./example-result";
import { LogSlider } from "./log-slider";
import { TypedNumber } from "./typed-number";
import { useExample } from "./use-example";

/** Milliseconds after which a changed result is said aloud, once. */
const announceMs = 1_000;

/** What was typed as a number above zero; undefined for anything else. */
function maybePositive(text: string): number | undefined {
  const value = Number(text.trim().replace("−", "-"));
  return text.trim() !== "" && Number.isFinite(value) && value > 0 ? value : undefined;
}

function useAnnouncement(text: string): string {
  const [said, setSaid] = useState("");
  useEffect(() => {
    const timer = setTimeout(() => setSaid(text), announceMs);
    return () => clearTimeout(timer);
  }, [text]);
  return said;
}

/** Written as short as a slider needs: three significant figures. */
const written = (value: number) => String(Number(value.toPrecision(3)));

/** The example as a piece of a paper: two numbers of its text can be changed, and the rest follows. */
export function LiveExample({
  first,
  equations,
}: {
  first: EvaluateAnswer;
  equations: { luminosity: ReactNode; rate: ReactNode; check: ReactNode };
}) {
  const [mass, setMass] = useState(String(firstInputs.mass));
  const [opacity, setOpacity] = useState(String(firstInputs.opacity));
  const [massValue, opacityValue] = [maybePositive(mass), maybePositive(opacity)];
  const readable = massValue !== undefined && opacityValue !== undefined;
  const inputs = readable ? { mass: massValue, opacity: opacityValue } : undefined;
  const { answer, problem, behind } = useExample(inputs, first);
  const said = useAnnouncement(exampleValue(answer, "luminosity") ?? "");
  const check = answer.cells.scattering;
  const holds = check?.status === "ok" && "holds" in check && check.holds;
  return (
    <div className="grid gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,44rem)_minmax(0,1fr)]">
      <div className="flex flex-col gap-5" aria-busy={behind}>
        <p>
          Radiation pushes ionised gas away while gravity pulls it in. Around a mass <i>M</i>
          &nbsp;=&nbsp;
          <TypedNumber
            label="Mass in solar masses"
            value={mass}
            onChange={setMass}
            wrong={massValue === undefined}
          />
          &nbsp;M<sub>⊙</sub>, in gas of opacity <i>κ</i>&nbsp;=&nbsp;
          <TypedNumber
            label="Opacity in square centimetres per gram"
            value={opacity}
            onChange={setOpacity}
            wrong={opacityValue === undefined}
          />
          &nbsp;cm<sup>2</sup>&nbsp;g<sup>−1</sup>, the two balance at the luminosity
        </p>
        <ExampleResult answer={answer} id="luminosity" behind={behind}>
          {equations.luminosity}
        </ExampleResult>
        <p>Accretion that turns a tenth of its rest energy into light reaches it with</p>
        <ExampleResult answer={answer} id="rate" behind={behind}>
          {equations.rate}
        </ExampleResult>
        <p>
          The estimate is valid while {equations.check}, since free electrons scatter no more than
          this, even in pure hydrogen: here the check{" "}
          <StatusWord status={holds ? "holds" : "fails"} />.
        </p>
        {!readable && (
          <p className="font-sans text-sm text-halpha">
            Type a number above zero, such as 10 or 4.3e6. What is shown belongs to the last one.
          </p>
        )}
        <ProblemMessage problem={problem} />
        <p role="status" className="sr-only">
          {said && `Limiting luminosity ${said}`}
        </p>
      </div>
      <div className="no-print flex flex-col gap-6 self-start font-sans text-sm lg:border-l lg:border-rule lg:pl-8">
        <LogSlider
          label="Mass"
          shown={
            <>
              {mass} M<sub>⊙</sub>
            </>
          }
          spoken={`${mass} solar masses`}
          from={0.1}
          to={1e10}
          value={massValue ?? firstInputs.mass}
          onChange={(value) => setMass(written(value))}
        />
        <LogSlider
          label="Opacity"
          shown={
            <>
              {opacity} cm<sup>2</sup> g<sup>−1</sup>
            </>
          }
          spoken={`${opacity} square centimetres per gram`}
          from={0.02}
          to={20}
          value={opacityValue ?? firstInputs.opacity}
          onChange={(value) => setOpacity(written(value))}
        />
      </div>
    </div>
  );
}
