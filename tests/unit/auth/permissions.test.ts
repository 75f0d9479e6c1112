import { describe, expect, it } from "vitest";
import { type Action, type Actor, can, roleOf } from "@/lib/auth";
import type { Visibility } from "@/lib/schema";

const actors: Record<string, Actor> = {
  visitor: null,
  stranger: { id: "stranger" },
  author: { id: "author" },
};
const visibilities: readonly Visibility[] = ["private", "link", "public"];

/** One row an action: visitor, stranger, author, each while private, by link and public. */
const table: [Action, visitor: string, stranger: string, author: string][] = [
  ["read-version", "– yes yes", "– yes yes", "yes yes yes"],
  ["recompute", "– yes yes", "– yes yes", "yes yes yes"],
  ["read-draft", "– – –", "– – –", "yes yes yes"],
  ["edit", "– – –", "– – –", "yes yes yes"],
  ["pin", "– – –", "– – –", "yes yes yes"],
  ["withdraw", "– – –", "– – –", "yes yes yes"],
  ["change-visibility", "– – –", "– – –", "yes yes yes"],
];

const squares = table.flatMap(([action, ...columns]) =>
  columns.flatMap((column, actor) =>
    column.split(" ").map((answer, visibility) => ({
      action,
      who: Object.keys(actors)[actor] as string,
      visibility: visibilities[visibility] as Visibility,
      answer: answer === "yes",
    })),
  ),
);

describe("can", () => {
  it("has a square for every action, actor and visibility", () => {
    expect(squares).toHaveLength(7 * 3 * 3);
  });

  it.each(squares)("$who, $action, $visibility: $answer", ({ who, action, visibility, answer }) => {
    expect(can(actors[who] as Actor, action, { ownerId: "author", visibility })).toBe(answer);
  });
});

describe("roleOf", () => {
  it.each<[string, Visibility, string | undefined]>([
    ["author", "private", "author"],
    ["author", "public", "author"],
    ["stranger", "public", "public"],
    ["stranger", "link", "public"],
    ["visitor", "link", "public"],
    ["stranger", "private", undefined],
    ["visitor", "private", undefined],
  ])("is, for the %s while %s, %s", (who, visibility, role) => {
    expect(roleOf(actors[who] as Actor, { ownerId: "author", visibility })).toBe(role);
  });
});
