"use client";

import { PlainPage } from "@/components/site/plain-page";
import { Button } from "@/components/ui/button";

/** Shown in place of a page that failed. */
export default function ErrorPage({
  error,
  reset,
}: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  return (
    <PlainPage code="500" title="Something went wrong on our side">
      <p>
        What you had saved is saved, and what you were typing in a calculation is kept in this
        browser.
      </p>
      {error.digest && (
        <p>
          If it happens again, report the incident <code>{error.digest}</code>.
        </p>
      )}
      <p>
        <Button look="primary" onClick={reset}>
          Try again
        </Button>
      </p>
    </PlainPage>
  );
}
