import Link from "next/link";
import type { ComponentProps } from "react";

type Look = "primary" | "plain" | "danger" | "quiet";

const looks: Record<Look, string> = {
  primary: "px-3 border-ink bg-ink text-ground hover:bg-calcium hover:border-calcium",
  plain: "px-3 border-ink text-ink hover:border-calcium hover:text-calcium",
  danger: "px-3 border-halpha text-halpha hover:bg-halpha hover:text-ground",
  quiet: "border-transparent text-calcium underline underline-offset-4 decoration-1 px-0.5",
};

const shape =
  "inline-flex items-center justify-center min-h-9 border py-1.5 font-sans text-sm leading-tight cursor-pointer disabled:cursor-default disabled:opacity-60 transition-colors motion-reduce:transition-none";

/** A button; `look` says how much it matters. */
export function Button({
  look = "plain",
  className = "",
  type = "button",
  ...rest
}: ComponentProps<"button"> & { look?: Look }) {
  return <button type={type} className={`${shape} ${looks[look]} ${className}`} {...rest} />;
}

/** A link that looks like a button. */
export function ButtonLink({
  look = "plain",
  className = "",
  ...rest
}: ComponentProps<typeof Link> & { look?: Look }) {
  return <Link className={`${shape} no-underline ${looks[look]} ${className}`} {...rest} />;
}
