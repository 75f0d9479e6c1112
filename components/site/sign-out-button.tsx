"use client";

import { useState } from "react";
import { postJson } from "./post-json";

/** Ends the session of this browser and goes to the front page. */
export function SignOutButton() {
  const [busy, setBusy] = useState(false);
  const signOut = async () => {
    setBusy(true);
    await postJson("/api/auth/sign-out");
    // A whole load: nothing of the session stays in the memory of the page.
    window.location.assign("/");
  };
  return (
    <button
      type="button"
      onClick={signOut}
      disabled={busy}
      className="py-1.5 underline-offset-[0.35em] hover:text-calcium hover:underline"
    >
      Sign out
    </button>
  );
}
