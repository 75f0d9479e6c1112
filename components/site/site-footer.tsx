/** What must be said once on every page. */
export function SiteFooter() {
  return (
    <footer className="mx-auto mt-auto w-full max-w-page px-4 pt-16 pb-8 font-sans text-sm text-faint sm:px-8">
      <p className="max-w-[46rem] border-t border-rule pt-4">
        Results here are estimates for research. They are not design or safety calculations: where a
        number could be used to build something or to hurt somebody, local codes and licensed
        practice decide.
      </p>
    </footer>
  );
}
