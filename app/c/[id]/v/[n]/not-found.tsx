import type { Metadata } from "next";
import Link from "next/link";

export const metadata: Metadata = { title: "No such version" };

/** There is no such version, or its existence is private: nobody learns which. */
export default function NotFound() {
  return (
    <div className="mx-auto w-full max-w-[44rem] px-4 py-16">
      <h1 className="font-serif text-3xl font-semibold">There is no version here</h1>
      <p className="mt-4 font-serif">
        The address may be mistyped, or its authors keep the calculation to themselves. Whoever gave
        you the link can tell. If it is yours, <Link href="/sign-in">sign in</Link> and open it
        again.
      </p>
    </div>
  );
}
