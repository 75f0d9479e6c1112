import type { Metadata } from "next";
import Link from "next/link";
import { PlainPage } from "@/components/site/plain-page";

export const metadata: Metadata = { title: "Not found" };

export default function NotFound() {
  return (
    <PlainPage code="404" title="There is nothing at this address">
      <p>
        The address may be mistyped, or what stands here is private and you are not signed in as one
        of its readers. Versions are never removed: the address of a version that was cited from a
        paper ends in <code>/v/</code> and a number.
      </p>
      <p>
        <Link href="/sign-in" className="link">
          Sign in
        </Link>
        {", or go to the "}
        <Link href="/" className="link">
          front page
        </Link>
        .
      </p>
    </PlainPage>
  );
}
