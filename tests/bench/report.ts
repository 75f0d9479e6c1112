/** One line of the benchmark's table. */
export interface Measurement {
  readonly what: string;
  readonly ours: number;
  readonly reference: number;
  readonly unit: string;
  readonly referenceName: string;
  /** What is compared with the target: a ratio, or the figure itself. */
  readonly figure: number;
  readonly target: string;
  readonly met: boolean;
}

const round = (x: number) => Number(x.toPrecision(3));

/** The measurements as a table in Markdown. */
export function table(measurements: readonly Measurement[]): string {
  const head =
    "| what | ours | reference | figure | target | met |\n| --- | --- | --- | --- | --- | --- |";
  const rows = measurements.map(
    (m) =>
      `| ${m.what} | ${round(m.ours)} ${m.unit} | ${m.referenceName}: ${round(m.reference)} ${m.unit} | ${round(m.figure)} | ${m.target} | ${m.met ? "yes" : "no"} |`,
  );
  return [head, ...rows].join("\n");
}

/** The value below which the given share of the samples lies. */
export function quantile(samples: readonly number[], share: number): number {
  const sorted = [...samples].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? Number.NaN;
}
