import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { db } from "@/db";
import {
  changeVisibility,
  checkChain,
  createCalculation,
  deleteDraft,
  isRefused,
  listCalculations,
  pinVersion,
  readDraft,
  readOverview,
  readVersion,
  recomputeVersion,
  saveDraft,
  verifyCalculation,
  withdrawVersion,
} from "@/lib/calculations";
import { closeEvaluators, contentHash, editionHash, versionHash } from "@/lib/evaluator";
import type { CalculationFile } from "@/lib/schema";
import { dropTemporaryDatabase, openTemporaryDatabase, person } from "./temporary-database";

type Somebody = { id: string; name: string };
let author: Somebody;
let other: Somebody;

beforeAll(async () => {
  await openTemporaryDatabase();
  author = await person("ilse", "Ilse Wray");
  other = await person("tomasz", "Tomasz Oduya");
});
afterAll(async () => {
  await closeEvaluators();
  await dropTemporaryDatabase();
});

const content = (title: string, formula = "M c^2"): CalculationFile => ({
  format: "leading-order/1",
  title,
  abstract: `About ${title}.`,
  edition: "codata-2022",
  cells: [
    { id: "g1", kind: "given", symbol: "M", value: 10, unit: "Msun" },
    { id: "r1", kind: "relation", symbol: "E", formula, unit: "erg" },
  ],
});

/** The answer, which must not be a refusal. */
function got<Answer extends object>(answer: Answer): Exclude<Answer, { refused: string }> {
  if (isRefused(answer)) throw new Error(`refused: ${JSON.stringify(answer)}`);
  return answer as Exclude<Answer, { refused: string }>;
}

const start = async (title = "Rest energy") => (await createCalculation(author, content(title))).id;
const save = (id: string, revision: number, file: CalculationFile, actor = author) =>
  saveDraft(actor, id, { file, revision });
const pin = (id: string, summary = "as it is") => pinVersion(author, id, { summary });

/** A calculation with two versions. */
async function pinnedTwice() {
  const id = await start();
  got(await pin(id));
  got(await save(id, 1, content("Rest energy, doubled", "2 M c^2")));
  got(await pin(id));
  return id;
}

describe("drafts", () => {
  it("are private, whole, and numbered from 1", async () => {
    const saved = await createCalculation(author, content("New"));
    expect(saved).toMatchObject({ revision: 1, id: expect.stringMatching(/^[0-9a-z]{10}$/) });
    expect(await readDraft(author, saved.id)).toEqual({
      id: saved.id,
      file: content("New"),
      revision: 1,
      role: "author",
      visibility: "private",
      savedAt: saved.savedAt,
      versions: [],
    });
  });

  it("take a save from the revision it was made of, and refuse any other with theirs", async () => {
    const id = await start();
    expect(await save(id, 1, content("Second"))).toMatchObject({ revision: 2 });
    expect(await save(id, 1, content("Too late"))).toMatchObject({
      refused: "stale",
      current: { revision: 2, file: { title: "Second" } },
    });
    expect(await save(id, 7, content("From nowhere"))).toMatchObject({ refused: "stale" });
  });

  it("acknowledge a save that is repeated, without a new revision", async () => {
    const id = await start();
    const first = await save(id, 1, content("Second"));
    expect(await save(id, 1, content("Second"))).toEqual(first);
  });

  it("let one of two savers at once through", async () => {
    const id = await start();
    const answers = await Promise.all([
      save(id, 1, content("Mine")),
      save(id, 1, content("Theirs")),
    ]);
    expect(answers.filter((answer) => !isRefused(answer))).toHaveLength(1);
  });

  it("keep the last two hundred revisions and thin out the rest", async () => {
    const id = await start();
    for (let revision = 1; revision < 231; revision += 1)
      got(await save(id, revision, content(`Revision ${revision + 1}`)));
    const numbers = await db()("revisions").where({ calculation_id: id }).pluck("number");
    expect(numbers).toHaveLength(203);
    expect(numbers).toEqual(expect.arrayContaining([10, 20, 30, 32, 33, 231]));
    expect(numbers).not.toContain(31);
    expect(await readDraft(author, id)).toMatchObject({ file: { title: "Revision 231" } });
  });

  it("can be thrown away until something is pinned", async () => {
    const id = await start();
    expect(await deleteDraft(author, id)).toEqual({ deleted: true });
    expect(await readDraft(author, id)).toEqual({ refused: "missing" });
    expect(await deleteDraft(author, await pinnedTwice())).toEqual({ refused: "has-versions" });
  });
});

describe("who may do what", () => {
  const acts = {
    "read the draft": (actor: Somebody | null, id: string) => readDraft(actor, id),
    save: (actor: Somebody | null, id: string) =>
      saveDraft(actor, id, { file: content("x"), revision: 2 }),
    pin: (actor: Somebody | null, id: string) => pinVersion(actor, id, { summary: "x" }),
    open: (actor: Somebody | null, id: string) => changeVisibility(actor, id, "public"),
    withdraw: (actor: Somebody | null, id: string) => withdrawVersion(actor, id, 1, "x"),
    delete: (actor: Somebody | null, id: string) => deleteDraft(actor, id),
    "read a version": (actor: Somebody | null, id: string) => readVersion(actor, id, 1),
    recompute: (actor: Somebody | null, id: string) => recomputeVersion(actor, id, 1),
    overview: (actor: Somebody | null, id: string) => readOverview(actor, id),
  };
  const forAll = new Set(["read a version", "recompute", "overview"]);

  it.each(["private", "link", "public"] as const)(
    "is kept for others when %s",
    async (visibility) => {
      const id = await pinnedTwice();
      got(await changeVisibility(author, id, visibility));
      for (const actor of [other, null])
        for (const [name, act] of Object.entries(acts)) {
          const answer = await act(actor, id);
          if (visibility === "private") expect(answer, name).toEqual({ refused: "missing" });
          else if (forAll.has(name)) expect(answer, name).not.toHaveProperty("refused");
          else expect(answer, name).toEqual({ refused: "forbidden" });
        }
    },
  );

  it("is missing for what does not exist", async () => {
    for (const act of Object.values(acts))
      expect(await act(author, "0000000000")).toEqual({ refused: "missing" });
  });
});

describe("versions", () => {
  it("hold content, results and provenance, and read back the same", async () => {
    const id = await start();
    const pinned = got(await pin(id, "first try"));
    const hash = contentHash(content("Rest energy"));
    expect(pinned).toEqual({ version: 1, contentHash: hash, url: `/c/${id}/v/1` });
    const { file, withdrawn, latest } = got(await readVersion(author, id, 1));
    expect(file).toMatchObject({
      ...content("Rest energy"),
      version: {
        calculation: id,
        number: 1,
        summary: "first try",
        authors: ["Ilse Wray"],
        lineage: [],
        editionHash: editionHash("codata-2022"),
        contentHash: hash,
        previousHash: null,
      },
      results: { contentHash: hash, cells: { r1: { status: "ok", unit: "erg" } } },
    });
    expect([withdrawn, latest]).toEqual([null, 1]);
  });

  it("are chained by the hash of the whole version before", async () => {
    const id = await pinnedTwice();
    const [first, second] = [
      got(await readVersion(author, id, 1)).file,
      got(await readVersion(author, id, 2)).file,
    ];
    expect(second.version.previousHash).toBe(versionHash(first));
    expect(checkChain([first, second])).toEqual([]);
  });

  it("are not made twice of one content, nor of errors without saying so", async () => {
    const id = await start();
    got(await pin(id));
    expect(await pin(id)).toEqual({ refused: "same", version: 1 });
    got(await save(id, 1, content("Slip", "M + c")));
    expect(await pin(id)).toMatchObject({
      refused: "errors",
      cells: [{ cell: "r1", code: "dimension" }],
    });
    expect(await pinVersion(author, id, { summary: "anyway", acceptErrors: true })).toMatchObject({
      version: 2,
    });
  });

  it("are numbered without doubles when pinned at once", async () => {
    const id = await start();
    const answers = await Promise.all([pin(id), pin(id), pin(id)]);
    expect(answers.filter((answer) => !isRefused(answer))).toHaveLength(1);
    expect(answers).toContainEqual({ refused: "same", version: 1 });
  });

  it("are not made of a draft that moved on unseen", async () => {
    const id = await start();
    got(await save(id, 1, content("Second")));
    expect(await pinVersion(author, id, { summary: "x", revision: 1 })).toMatchObject({
      refused: "stale",
      current: { revision: 2 },
    });
  });

  it("cannot be changed, replaced or deleted, not even behind our back", async () => {
    const id = await pinnedTwice();
    const one = () => db()("versions").where({ calculation_id: id, number: 1 });
    for (const column of [
      "body",
      "results",
      "content_hash",
      "pinned_at",
      "summary",
      "previous_hash",
    ])
      await expect(one().update({ [column]: "forged" }), column).rejects.toThrow(
        /cannot be changed/,
      );
    await expect(one().delete()).rejects.toThrow(/cannot be deleted/);
    await expect(db()("calculations").where({ id }).delete()).rejects.toThrow();
    expect(await verifyCalculation(db(), id)).toEqual([]);
  });

  it("reproduce, and tell how another edition moves them", async () => {
    const id = await pinnedTwice();
    expect(await recomputeVersion(author, id, 1)).toMatchObject({
      verdict: "reproduces",
      differences: [],
    });
    expect(await recomputeVersion(author, id, 1, "codata-2018")).toMatchObject({
      results: { edition: "codata-2018" },
    });
  });

  it("are withdrawn once, with a reason, and stay readable", async () => {
    const id = await pinnedTwice();
    const withdrawn = got(await withdrawVersion(author, id, 1, "The mass was wrong."));
    expect(await withdrawVersion(author, id, 1, "Again.")).toEqual({ refused: "withdrawn" });
    expect(await withdrawVersion(author, id, 9, "Which?")).toEqual({ refused: "missing" });
    const reading = got(await readVersion(author, id, 1));
    expect(reading.withdrawn).toEqual({ at: withdrawn.withdrawnAt, reason: "The mass was wrong." });
    expect(got(await readDraft(author, id)).versions.map((version) => version.withdrawn)).toEqual([
      true,
      false,
    ]);
    expect(await verifyCalculation(db(), id)).toEqual([]);
  });
});

describe("verify", () => {
  const forge = async (table: string, where: object, change: object) => {
    const trigger = { type: "trigger", name: "versions_are_immutable" };
    const guard = await db()("sqlite_master").where(trigger).first<{ sql: string }>("sql");
    await db().raw("DROP TRIGGER versions_are_immutable");
    await db()(table).where(where).update(change);
    await db().raw(guard.sql);
  };
  const findings = async (id: string) =>
    (await verifyCalculation(db(), id)).map(({ where, what }) => `${where}: ${what}`);

  it("names a version whose content was forged, and the chain that broke", async () => {
    const id = await pinnedTwice();
    const body = JSON.stringify(content("Forged"));
    await forge("versions", { calculation_id: id, number: 1 }, { body });
    expect(await findings(id)).toEqual([
      expect.stringMatching(/^version 1: hash does not match/),
      expect.stringMatching(/^version 1: hash does not match/),
      expect.stringMatching(/^version 2: hash does not match/),
    ]);
    expect(await recomputeVersion(author, id, 1)).toEqual({ refused: "hash" });
    expect(await recomputeVersion(author, id, 2)).toMatchObject({ verdict: "reproduces" });
  });

  it("names a version whose results were forged, by the chain", async () => {
    const id = await pinnedTwice();
    const results = JSON.stringify(got(await readVersion(author, id, 1)).file.results);
    await forge(
      "versions",
      { calculation_id: id, number: 1 },
      { results: results.replace("10", "11") },
    );
    expect(await findings(id)).toEqual([expect.stringMatching(/^version 2: hash does not match/)]);
  });

  it("names what cannot be read any more", async () => {
    const id = await pinnedTwice();
    await forge("versions", { calculation_id: id, number: 2 }, { body: '{"format": "leadi' });
    expect(await findings(id)).toEqual([expect.stringMatching(/^version 2: cannot be read/)]);
  });

  it("names a draft that was changed or lost", async () => {
    const id = await start();
    got(await save(id, 1, content("Second")));
    await db()("revisions")
      .where({ calculation_id: id, number: 1 })
      .update({ body: JSON.stringify(content("?")) });
    await db()("revisions").where({ calculation_id: id, number: 2 }).delete();
    expect(await findings(id)).toEqual([
      "revision 2: is missing",
      expect.stringMatching(/^revision 1: hash does not match/),
    ]);
  });
});

describe("lists", () => {
  const titles = async (actor: Somebody | null, scope: "mine" | "public", q?: string) =>
    (await listCalculations(actor, { scope, q })).items.map((item) => item.title);

  it("show one's own drafts, the latest first, and find words", async () => {
    const lister = await person("lister");
    const saved = await createCalculation(lister, content("Alpha beta"));
    await new Promise((resolve) => setTimeout(resolve, 5));
    await createCalculation(lister, content("Gamma 100%"));
    expect(await titles(lister, "mine")).toEqual(["Gamma 100%", "Alpha beta"]);
    expect(await titles(lister, "mine", "BETA alpha")).toEqual(["Alpha beta"]);
    expect(await titles(lister, "mine", "0%")).toEqual(["Gamma 100%"]);
    expect(await titles(lister, "mine", "_")).toEqual([]);
    expect(await titles(other, "mine", "alpha")).toEqual([]);
    expect(await titles(null, "mine")).toEqual([]);
    expect((await listCalculations(lister, { scope: "mine", q: "alpha" })).items[0]).toEqual({
      id: saved.id,
      title: "Alpha beta",
      abstract: "About Alpha beta.",
      visibility: "private",
      owner: "lister",
      revision: 1,
      latestVersion: null,
      updatedAt: saved.savedAt,
    });
  });

  it("show the public what was pinned, never the draft", async () => {
    const id = await start("Unicorn one");
    got(await changeVisibility(author, id, "public"));
    expect(await titles(null, "public", "unicorn")).toEqual([]);
    got(await pin(id));
    got(await save(id, 1, content("Unicorn secret")));
    expect(await titles(null, "public", "unicorn")).toEqual(["Unicorn one"]);
    expect(await titles(null, "public", "secret")).toEqual([]);
    got(await pin(id));
    expect(await titles(null, "public", "unicorn")).toEqual(["Unicorn secret"]);
    got(await withdrawVersion(author, id, 2, "Too early."));
    expect(await titles(null, "public", "unicorn")).toEqual(["Unicorn one"]);
    got(await changeVisibility(author, id, "link"));
    expect(await titles(null, "public", "unicorn")).toEqual([]);
  });

  it("come in pages that neither repeat nor lose one", async () => {
    const writer = await person("writer");
    for (let number = 0; number < 65; number += 1)
      await createCalculation(writer, content(`N${number}`));
    const seen: string[] = [];
    let cursor: string | undefined;
    let pages = 0;
    do {
      const page = await listCalculations(writer, { scope: "mine", cursor });
      seen.push(...page.items.map((item) => item.id));
      cursor = page.nextCursor ?? undefined;
      pages += 1;
    } while (cursor);
    expect(pages).toBe(3);
    expect(new Set(seen).size).toBe(65);
    await expect(listCalculations(writer, { scope: "mine", cursor: "nonsense" })).rejects.toThrow();
  });
});
