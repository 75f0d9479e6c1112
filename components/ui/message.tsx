import type { ReactNode } from "react";

type Tone = "notice" | "error" | "good";

const tones: Record<Tone, { rule: string; word: string }> = {
  notice: { rule: "border-sodium", word: "Notice" },
  error: { rule: "border-halpha", word: "Error" },
  good: { rule: "border-oiii", word: "Done" },
};

/** A message with its tone in a word and a rule, never by colour alone. */
export function Message({ tone = "notice", children }: { tone?: Tone; children: ReactNode }) {
  const { rule, word } = tones[tone];
  return (
    <div
      role={tone === "error" ? "alert" : "status"}
      className={`border-l-4 ${rule} py-1 pl-3 font-sans text-sm`}
    >
      <span className="sr-only">{word}: </span>
      {children}
    </div>
  );
}
