import type { Metadata } from "next";
import type { VersionFile, Visibility } from "@/lib/schema";
import { countFaults } from "./read-version";

const longestDescription = 200;

/** The first words of a text, without its marks, cut between words. */
function firstWords(markdown: string): string {
  const plain = markdown
    .replace(/[$*_`#>[\]]/g, "")
    .replace(/\s+/g, " ")
    .trim();
  if (plain.length <= longestDescription) return plain;
  return `${plain.slice(0, longestDescription).replace(/\s+\S*$/, "")}…`;
}

function standing(file: VersionFile, withdrawn: boolean): string {
  if (withdrawn) return "Withdrawn. ";
  const { errors, failing } = countFaults(file);
  if (errors > 0) return "Some cells have errors. ";
  return failing > 0 ? "A check fails. " : "";
}

/** Title and preview of a shared link. Only a public calculation is offered to search engines. */
export function versionMetadata(
  file: VersionFile,
  withdrawn: boolean,
  visibility: Visibility,
  url: string,
): Metadata {
  const title = `${file.title || "Untitled calculation"}, v${file.version.number}`;
  const told = firstWords(file.abstract || file.version.summary);
  const description = `${standing(file, withdrawn)}${told}`;
  const authors = file.version.authors;
  return {
    title,
    description,
    authors: authors.map((name) => ({ name })),
    alternates: { canonical: url },
    openGraph: {
      type: "article",
      siteName: "Leading Order",
      title,
      description,
      url,
      publishedTime: file.version.pinnedAt,
      authors,
    },
    twitter: { card: "summary", title, description },
    robots: visibility === "public" ? undefined : { index: false },
  };
}
