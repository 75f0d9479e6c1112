import { Message } from "@/components/ui/message";
import type { Problem } from "@/lib/schema";

/** Where to sign in again, and come back to this page. */
function signInHere(): string {
  const { pathname, search } = window.location;
  return `/sign-in?return=${encodeURIComponent(pathname + search)}`;
}

/** A problem in a sentence; nothing for one that is told beside its fields. */
export function ProblemMessage({ problem }: { problem: Problem | undefined }) {
  if (!problem || problem.errors?.length) return null;
  if (problem.type === "/problems/signed-out") {
    return (
      <Message tone="error">
        Your session has ended.{" "}
        <a href={signInHere()} className="link">
          Sign in again
        </a>{" "}
        and you come back here.
      </Message>
    );
  }
  return (
    <Message tone="error">
      {problem.title}.{problem.detail && problem.detail !== problem.title && ` ${problem.detail}`}
    </Message>
  );
}
