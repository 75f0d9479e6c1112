const statuses = {
  holds: { colour: "text-oiii", shape: "●" },
  fails: { colour: "text-halpha", shape: "✕" },
  error: { colour: "text-halpha", shape: "✕" },
  draft: { colour: "text-sodium", shape: "◌" },
  notice: { colour: "text-sodium", shape: "◆" },
  reproduces: { colour: "text-oiii", shape: "●" },
  differs: { colour: "text-halpha", shape: "≠" },
  withdrawn: { colour: "text-halpha", shape: "✕" },
} as const;

export type Status = keyof typeof statuses;

/** A status in a word and with a shape, so that colour only repeats it. */
export function StatusWord({ status, children }: { status: Status; children?: string }) {
  const { colour, shape } = statuses[status];
  return (
    <span className={`whitespace-nowrap font-sans font-medium ${colour}`}>
      <span aria-hidden="true">{shape} </span>
      {children ?? status}
    </span>
  );
}
