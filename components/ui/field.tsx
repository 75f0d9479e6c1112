import { type ComponentProps, useId } from "react";

type FieldProps = Omit<ComponentProps<"input">, "id"> & {
  label: string;
  hint?: string | undefined;
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
        className={`mt-1 block min-h-10 w-full border bg-transparent px-2.5 py-1.5 ${error ? "border-halpha" : "border-edge"}`}
        {...rest}
      />
      {hint && (
        <p id={`${id}-hint`} className="mt-1 text-sm text-faint">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="mt-1 text-sm font-medium text-halpha">
          {error}
        </p>
      )}
    </div>
  );
}
