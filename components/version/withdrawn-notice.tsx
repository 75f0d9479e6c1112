import { StatusWord } from "@/components/ui/status-word";
import { Time } from "@/components/ui/time";

/** The public notice above a version that was withdrawn. */
export function WithdrawnNotice({
  number,
  at,
  reason,
}: {
  number: number;
  at: string;
  reason: string;
}) {
  return (
    <aside aria-label="Withdrawn" className="mb-8 border-y-2 border-halpha py-3">
      <p className="font-sans">
        <StatusWord status="withdrawn" /> v{number} was withdrawn on <Time iso={at} />. It stays
        here so that what cites it can be read; do not rely on its numbers.
      </p>
      <p className="mt-2 whitespace-pre-line font-serif">{reason}</p>
    </aside>
  );
}
