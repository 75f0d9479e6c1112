"use client";

import "./globals.css";
import { PlainPage } from "@/components/site/plain-page";
import { Button } from "@/components/ui/button";

/** Shown when even the frame of the pages failed. */
export default function GlobalError({ reset }: { reset: () => void }) {
  return (
    <html lang="en-GB">
      <body>
        <title>Something went wrong · Leading Order</title>
        <div className="spectrum" aria-hidden="true" />
        <PlainPage code="500" title="Something went wrong on our side">
          <p>What you had saved is saved. Try again in a moment.</p>
          <p>
            <Button look="primary" onClick={reset}>
              Try again
            </Button>
          </p>
        </PlainPage>
      </body>
    </html>
  );
}
