"use client";

import { useEffect, useState } from "react";

/** A moment in the reader's own zone, with UTC on hover; in UTC until scripts run. */
export function Time({ iso, withTime = true }: { iso: string; withTime?: boolean }) {
  const utc = `${iso.slice(0, 10)}${withTime ? ` ${iso.slice(11, 16)} UTC` : ""}`;
  const [shown, setShown] = useState(utc);
  useEffect(() => {
    const style = withTime
      ? ({ dateStyle: "medium", timeStyle: "short" } as const)
      : ({ dateStyle: "medium" } as const);
    setShown(new Intl.DateTimeFormat("en-GB", style).format(new Date(iso)));
  }, [iso, withTime]);
  return (
    <time dateTime={iso} title={`${iso.slice(0, 19).replace("T", " ")} UTC`}>
      {shown}
    </time>
  );
}
