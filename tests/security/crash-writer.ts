import { createCalculation, isRefused, pinVersion, saveDraft } from "@/lib/calculations";
import { contentHash, evaluatorIsWarm } from "@/lib/evaluator";
import type { CalculationFile } from "@/lib/schema";

/**
 * Saves and pins without end, and writes a line for each acknowledgement, until it is killed.
 * Called with the id of a user who exists.
 */
const [ownerId = ""] = process.argv.slice(2);
const actor = { id: ownerId };

/** What was acknowledged, one JSON object a line. */
const acknowledge = (what: object) => process.stdout.write(`${JSON.stringify(what)}\n`);

function content(step: number): CalculationFile {
  return {
    format: "leading-order/1",
    title: `Step ${step}`,
    edition: "codata-2022",
    cells: [
      { id: "g1", kind: "given", symbol: "M", value: step + 1, unit: "Msun" },
      { id: "r1", kind: "relation", symbol: "E", formula: "M c^2", unit: "erg" },
      // Some pages long, so that a torn write would show.
      { id: "t1", kind: "text", markdown: `${step} `.repeat(5_000) },
    ],
  };
}

// Otherwise the first pin would wait for its process, and few would be met by a kill.
await evaluatorIsWarm();
const saved = await createCalculation(actor, content(0));
let revision = saved.revision;
acknowledge({ save: saved.id, revision, hash: contentHash(content(0)) });

for (let step = 1; ; step += 1) {
  const file = content(step);
  const answer = await saveDraft(actor, saved.id, { file, revision });
  if (isRefused(answer)) throw new Error(`the save was refused: ${answer.refused}`);
  revision = answer.revision;
  acknowledge({ save: saved.id, revision, hash: contentHash(file) });
  if (step % 3 !== 0) continue;
  const pinned = await pinVersion(actor, saved.id, { summary: `Step ${step}` });
  if (isRefused(pinned)) throw new Error(`the pin was refused: ${pinned.refused}`);
  acknowledge({ pin: saved.id, version: pinned.version, hash: pinned.contentHash });
}
