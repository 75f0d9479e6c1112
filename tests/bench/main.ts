import { writeFileSync } from "node:fs";
import { measureBrowser } from "./browser";
import { measureEngine } from "./engine";
import { measureKills } from "./kills";
import { table } from "./report";
import { measureServer } from "./server";

/** `npm run bench`: every figure in one run on one machine, as a table and as JSON. */
const [base, version] = process.argv.slice(2);
if (!base || !version) throw new Error("usage: main.ts BASE_URL VERSION_PATH");

const measurements = [
  ...measureEngine(),
  ...(await measureServer(base)),
  ...(await measureBrowser(base, version)),
  ...(await measureKills()),
];
console.log(table(measurements));
writeFileSync("bench-results.json", `${JSON.stringify(measurements, null, 2)}\n`);
if (measurements.some(({ met }) => !met)) process.exitCode = 1;
