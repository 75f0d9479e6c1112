import type { ReactNode } from "react";

export interface Word {
  readonly key: string;
  readonly term: ReactNode;
  readonly meaning: ReactNode;
}

/** Terms with what they mean, one below the other, the terms in a column of their own. */
export function WordList({ words }: { words: readonly Word[] }) {
  return (
    <dl className="my-4 border-t border-rule text-[0.95rem]">
      {words.map(({ key, term, meaning }) => (
        <div
          key={key}
          className="grid gap-x-4 border-b border-rule py-1.5 sm:grid-cols-[minmax(0,2fr)_minmax(0,3fr)]"
        >
          <dt className="min-w-0">{term}</dt>
          <dd className="min-w-0">{meaning}</dd>
        </div>
      ))}
    </dl>
  );
}
