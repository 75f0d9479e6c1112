import Database from "better-sqlite3";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { withDatabase } from "../support/database";

/** What somebody with the database file and an SQL prompt can do to a version: nothing. */
const { file } = withDatabase();
let sql: Database.Database;

const at = "2026-01-01T00:00:00.000Z";
const versionOf = (number: number) => `
  INSERT INTO versions VALUES ('c000000001', ${number}, '{}', '{}', 'sha256:1', 'codata-2022', 'sha256:2', '1',
    'u1', '[]', 'first', '[]', NULL, '${at}', NULL, NULL)`;

beforeAll(() => {
  sql = new Database(file);
  // As at the prompt of the command line, where foreign keys are not enforced.
  sql.pragma("foreign_keys = OFF");
  sql.exec(`
    INSERT INTO users VALUES ('u1', 'a@tarn-hollow.example', 'a@tarn-hollow.example', 'A', 'x', NULL, '${at}');
    INSERT INTO calculations (id, owner_id, created_at, updated_at) VALUES ('c000000001', 'u1', '${at}', '${at}');
    INSERT INTO calculations (id, owner_id, created_at, updated_at) VALUES ('c000000002', 'u1', '${at}', '${at}');
    ${versionOf(1)};
    ${versionOf(2)};`);
});
afterAll(() => {
  sql.close();
});

const refusal = (statement: string) => () => sql.exec(statement);

describe("a version, by SQL", () => {
  const columns: [column: string, value: string][] = [
    ["calculation_id", "'c000000002'"],
    ["number", "9"],
    ["body", `'{"title":"other"}'`],
    ["results", `'{"cells":{}}'`],
    ["content_hash", "'sha256:9'"],
    ["edition", "'codata-2018'"],
    ["edition_hash", "'sha256:9'"],
    ["engine", "'2'"],
    ["author_id", "'u2'"],
    ["authors", `'["Somebody"]'`],
    ["summary", "'other'"],
    ["lineage", `'["x"]'`],
    ["previous_hash", "'sha256:9'"],
    ["pinned_at", "'2020-01-01T00:00:00.000Z'"],
  ];

  it("has every column of its table tried below", () => {
    const named = (sql.pragma("table_info(versions)") as { name: string }[]).map((row) => row.name);
    const tried = columns.map(([column]) => column);
    expect([...tried, "withdrawn_at", "withdrawn_reason"].sort()).toEqual(named.sort());
  });

  it.each(columns)("keeps its %s", (column, value) => {
    expect(refusal(`UPDATE versions SET ${column} = ${value} WHERE number = 1`)).toThrow(
      "a version cannot be changed",
    );
  });

  it("keeps its body when it is withdrawn in the same breath", () => {
    expect(
      refusal(
        `UPDATE versions SET body = '{"a":1}', withdrawn_at = '${at}', withdrawn_reason = 'x'`,
      ),
    ).toThrow("a version cannot be changed");
  });

  it.each([
    ["deleted", "DELETE FROM versions WHERE number = 1"],
    ["deleted with all others", "DELETE FROM versions"],
  ])("cannot be %s", (_how, statement) => {
    expect(refusal(statement)).toThrow("a version cannot be deleted");
  });

  it.each([
    ["replaced", versionOf(1).replace("INSERT", "REPLACE")],
    ["replaced by OR REPLACE", versionOf(1).replace("INSERT", "INSERT OR REPLACE")],
    ["updated on conflict", `${versionOf(1)} ON CONFLICT DO UPDATE SET body = '{}'`],
  ])("cannot be %s", (_how, statement) => {
    expect(refusal(statement)).toThrow("a version cannot be replaced");
  });

  it("keeps its calculation", () => {
    expect(refusal("DELETE FROM calculations WHERE id = 'c000000001'")).toThrow(
      "a calculation with versions cannot be deleted",
    );
    expect(refusal("UPDATE calculations SET id = 'c000000009' WHERE id = 'c000000001'")).toThrow(
      "a calculation keeps its id",
    );
    expect(sql.prepare("DELETE FROM calculations WHERE id = 'c000000002'").run().changes).toBe(1);
  });
});

describe("a withdrawal, by SQL", () => {
  const withdraw = (set: string) => `UPDATE versions SET ${set} WHERE number = 2`;

  it("has a time and a reason, entered together", () => {
    expect(refusal(withdraw(`withdrawn_at = '${at}'`))).toThrow("a time and a reason");
    expect(refusal(withdraw("withdrawn_reason = 'Wrong mass.'"))).toThrow("a time and a reason");
  });

  it("is entered once, and never taken back or changed", () => {
    sql.exec(withdraw(`withdrawn_at = '${at}', withdrawn_reason = 'Wrong mass.'`));
    for (const set of [
      "withdrawn_at = NULL, withdrawn_reason = NULL",
      "withdrawn_reason = 'Nothing.'",
      "withdrawn_at = '2027-01-01T00:00:00.000Z'",
    ]) {
      expect(refusal(withdraw(set))).toThrow("a withdrawal cannot be changed");
    }
    expect(
      sql.prepare("SELECT withdrawn_at, withdrawn_reason FROM versions WHERE number = 2").get(),
    ).toEqual({ withdrawn_at: at, withdrawn_reason: "Wrong mass." });
  });

  it("is not brought in with a new version unless whole", () => {
    expect(refusal("UPDATE versions SET withdrawn_reason = '' WHERE number = 1")).toThrow();
  });
});
