"use client";

import { useRef, useState } from "react";
import { Prose } from "@/components/typeset/prose";
import { Button } from "@/components/ui/button";
import type { CalculationFile } from "@/lib/schema";
import { limits } from "@/lib/schema/limits";

const editions = [
  ["codata-2018", "CODATA 2018"],
  ["codata-2022", "CODATA 2022"],
] as const;

interface HeadProps {
  readonly file: CalculationFile;
  readonly edit: (file: CalculationFile, quiet?: boolean) => void;
}

/** One visit to a field is one step of undo: the first change is a step, those after join it. */
function useVisit() {
  const hasTyped = useRef(false);
  return {
    begin: () => {
      hasTyped.current = false;
    },
    isLater: () => {
      const later = hasTyped.current;
      hasTyped.current = true;
      return later;
    },
  };
}

/** Title, abstract, constants edition and electromagnetic convention of the draft. */
export function FolioHead({ file, edit }: HeadProps) {
  const visit = useVisit();
  return (
    <header className="folio-head">
      <h1 className="sr-only">{file.title || "Untitled calculation"}</h1>
      {/* A field that grows, since a title may be longer than a line. */}
      <textarea
        rows={1}
        aria-label="Title"
        className="folio-title"
        maxLength={limits.titleLength}
        placeholder="Title"
        value={file.title}
        onFocus={visit.begin}
        onKeyDown={(event) => event.key === "Enter" && event.preventDefault()}
        onChange={(event) =>
          edit({ ...file, title: event.target.value.replace(/\p{Cc}+/gu, " ") }, visit.isLater())
        }
      />
      <Abstract file={file} edit={edit} />
      <div className="flex flex-wrap gap-x-6 gap-y-1 font-sans text-sm">
        <label>
          Constants{" "}
          <select
            className="folio-select"
            value={file.edition}
            onChange={(event) =>
              edit({ ...file, edition: event.target.value as CalculationFile["edition"] })
            }
          >
            {editions.map(([name, title]) => (
              <option key={name} value={name}>
                {title}
              </option>
            ))}
          </select>
        </label>
        <label>
          Electromagnetic convention{" "}
          <select
            className="folio-select"
            value={file.em ?? "si"}
            onChange={(event) => edit({ ...file, em: event.target.value as "si" | "gaussian" })}
          >
            <option value="si">SI</option>
            <option value="gaussian">Gaussian</option>
          </select>
        </label>
      </div>
    </header>
  );
}

function Abstract({ file, edit }: HeadProps) {
  const [writing, setWriting] = useState(false);
  const visit = useVisit();
  const change = (text: string) => {
    const { abstract: _before, ...rest } = file;
    edit(text === "" ? rest : { ...rest, abstract: text }, visit.isLater());
  };
  if (!writing) {
    return (
      <div className="folio-abstract">
        {file.abstract && <Prose markdown={file.abstract} />}
        <Button
          look="quiet"
          onClick={() => {
            visit.begin();
            setWriting(true);
          }}
        >
          {file.abstract ? "edit the abstract" : "write an abstract"}
        </Button>
      </div>
    );
  }
  return (
    <textarea
      // biome-ignore lint/a11y/noAutofocus: the person has just asked to edit the abstract.
      autoFocus
      aria-label="Abstract, CommonMark with $…$"
      className="prose-editor"
      rows={4}
      value={file.abstract ?? ""}
      onChange={(event) => change(event.target.value)}
      onBlur={() => setWriting(false)}
      onKeyDown={(event) => event.key === "Escape" && setWriting(false)}
    />
  );
}
