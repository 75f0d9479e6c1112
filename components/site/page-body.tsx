import type { ReactNode } from "react";

const widths = { column: "max-w-folio", page: "max-w-page", narrow: "max-w-[30rem]" } as const;

/** The main part of a page: what the skip link leads to. */
export function PageBody({
  width = "page",
  children,
}: {
  width?: keyof typeof widths;
  children: ReactNode;
}) {
  return (
    <main
      id="main"
      tabIndex={-1}
      className="mx-auto w-full max-w-page px-4 pt-8 outline-none sm:px-8 sm:pt-12"
    >
      <div className={widths[width]}>{children}</div>
    </main>
  );
}
