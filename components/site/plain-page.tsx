import type { ReactNode } from "react";
import { PageBody } from "./page-body";

/** A page that says one thing: what is missing, refused or broken, and where to go from there. */
export function PlainPage({
  code,
  title,
  children,
}: {
  code: string;
  title: string;
  children: ReactNode;
}) {
  return (
    <PageBody width="column">
      <p className="figures mb-1 text-sm text-faint">{code}</p>
      <h1 className="mb-4 text-3xl">{title}</h1>
      <div className="flex flex-col gap-4">{children}</div>
    </PageBody>
  );
}
