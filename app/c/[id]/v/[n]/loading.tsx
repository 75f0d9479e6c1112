/** Keeps the place of a version while it is read. */
export default function Loading() {
  return (
    <div className="mx-auto min-h-[70vh] w-full max-w-[44rem] px-4 py-8 font-sans text-sm text-faint">
      <p role="status">Reading the version…</p>
    </div>
  );
}
