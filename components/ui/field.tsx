import { type ComponentProps, useId } from "react";

type FieldProps = Omit<ComponentProps<"input">, "id"> & {
  label: string;
  hint?: string;
  error?: string | undefined;
};

/** A labelled input with a hint and, after a try that failed, what is wrong with it. */
export function Field({ label, hint, error, className = "", ...rest }: FieldProps) {
  const id = useId();
  const described = [hint ? `${id}-hint` : "", error ? `${id}-error` : ""]
    .filter(Boolean)
    .join(" ");
  return (
    <div className={`font-sans ${className}`}>
      <label htmlFor={id} className="block text-sm font-medium">
        {label}
      </label>
      <input
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={described || undefined}
        className={`mt-1 block w-full border-b bg-transparent px-1 py-1.5 ${error ? "border-halpha" : "border-ink"}`}
        {...rest}
      />
      {hint && (
        <p id={`${id}-hint`} className="mt-1 text-sm text-faint">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="mt-1 text-sm text-halpha">
          {error}
        </p>
      )}
    </div>
  );
}
