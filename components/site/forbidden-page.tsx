import Link from "next/link";
import { PlainPage } from "./plain-page";

/** What stands at an address whose existence may be known, but which is not for this reader. */
export function ForbiddenPage({ what = "This page" }: { what?: string }) {
  return (
    <PlainPage code="403" title={`${what} is for its authors`}>
      <p>You may know that it is there, and its public versions are open to you, but not this.</p>
      <p>
        <Link href="/sign-in" className="link">
          Sign in as somebody else
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
