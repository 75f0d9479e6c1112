"use client";

import { useRouter } from "next/navigation";
import { sendJson } from "@/components/site/post-json";
import { ProblemMessage } from "@/components/site/problem-message";
import { Button } from "@/components/ui/button";
import { Time } from "@/components/ui/time";
import type { SessionInfo } from "@/lib/schema";
import { browserName } from "./browser-name";
import { useSending } from "./use-sending";

/** One's open sessions; any but this one can be ended here. */
export function SessionList({ sessions }: { sessions: readonly SessionInfo[] }) {
  const sending = useSending();
  const router = useRouter();
  const end = async (id: string) => {
    const path = `/api/me/sessions/${encodeURIComponent(id)}`;
    if (await sending.send(() => sendJson("DELETE", path))) router.refresh();
  };
  return (
    <>
      <ProblemMessage problem={sending.problem} />
      <ul className="divide-y divide-rule border-y border-rule font-sans text-sm">
        {sessions.map((session) => (
          <li key={session.id} className="py-2.5">
            <div className="flex items-baseline justify-between gap-4">
              <span className="font-medium">{browserName(session.userAgent)}</span>
              {session.current ? (
                <span>this one</span>
              ) : (
                <Button look="quiet" disabled={sending.busy} onClick={() => end(session.id)}>
                  end
                  <span className="sr-only"> the session of {browserName(session.userAgent)}</span>
                </Button>
              )}
            </div>
            <p className="text-faint">
              last seen <Time iso={session.lastSeenAt} />, signed in{" "}
              <Time iso={session.createdAt} withTime={false} />
            </p>
          </li>
        ))}
      </ul>
    </>
  );
}
