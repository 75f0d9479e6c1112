import { execFile } from "node:child_process";
import path from "node:path";

const python = "/usr/bin/python3";
const needed = "apt-get install python3-astropy python3-scipy python3-uncertainties";

/**
 * What a Python program of this folder answers to a question: JSON in, JSON out. Rejects with what
 * to install where Python or one of its libraries is missing, else with what Python said.
 */
export function askPython<Answer>(script: string, question: unknown): Promise<Answer> {
  return new Promise((resolve, reject) => {
    const file = path.join(import.meta.dirname, script);
    const options = { timeout: 60_000, maxBuffer: 32 * 1024 * 1024 };
    const child = execFile(python, [file], options, (error, out, said) => {
      if (error) reject(new Error(explain(error, said)));
      else resolve(JSON.parse(out) as Answer);
    });
    // A program that could not be started has told so already.
    child.stdin?.on("error", () => undefined);
    child.stdin?.end(JSON.stringify(question));
  });
}

function explain(error: Error & { code?: unknown }, said: string): string {
  const missing = error.code === "ENOENT" || said.includes("ModuleNotFoundError");
  return missing
    ? `Python 3 with Astropy, SciPy and uncertainties is needed: ${needed}\n${said}`
    : `${error.message}\n${said}`;
}
