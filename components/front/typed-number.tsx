"use client";

/** A number in the middle of a sentence, open to change: underlined as with a pencil. */
export function TypedNumber({
  label,
  value,
  onChange,
  wrong,
}: {
  label: string;
  value: string;
  onChange: (text: string) => void;
  wrong: boolean;
}) {
  return (
    <input
      aria-label={label}
      aria-invalid={wrong || undefined}
      inputMode="decimal"
      autoComplete="off"
      spellCheck={false}
      value={value}
      onChange={(event) => onChange(event.target.value)}
      style={{ width: `${Math.min(Math.max(value.length, 3), 14) + 1}ch` }}
      className={`figures border-b-2 border-dotted bg-transparent px-1 text-center text-[0.92em] ${wrong ? "border-halpha" : "border-calcium"}`}
    />
  );
}
