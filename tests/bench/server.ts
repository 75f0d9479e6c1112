import { hundredRelations } from "./hundred-relations";
import { type Measurement, quantile } from "./report";

const warmUp = 50;
const samples = 400;

async function timeMs(request: () => Promise<Response>): Promise<number> {
  const start = performance.now();
  const response = await request();
  await response.arrayBuffer();
  if (!response.ok) throw new Error(`${response.url} answered ${response.status}`);
  return performance.now() - start;
}

/** `POST /api/evaluate` with the hundred relations, one given new in each, beside an empty route. */
export async function measureServer(base: string): Promise<Measurement[]> {
  const evaluate = (round: number) => () =>
    fetch(`${base}/api/evaluate`, {
      method: "POST",
      headers: { "content-type": "application/json", origin: base },
      body: JSON.stringify({ file: hundredRelations((i) => (i === 0 ? 1 + round * 1e-7 : 1)) }),
    });
  const empty = () => fetch(`${base}/api/ping`);
  const ours: number[] = [];
  const reference: number[] = [];
  for (let i = 0; i < warmUp + samples; i++) {
    // Turn by turn, so that whatever else the machine does meets both alike.
    const [a, b] = [await timeMs(empty), await timeMs(evaluate(i))];
    if (i >= warmUp) {
      reference.push(a);
      ours.push(b);
    }
  }
  const [p95, p95Empty] = [quantile(ours, 0.95), quantile(reference, 0.95)];
  const shared = { ours: p95, reference: p95Empty, unit: "ms", referenceName: "empty route" };
  return [
    {
      what: "POST /api/evaluate with it, warm server, p95, against an empty route",
      ...shared,
      figure: p95 / p95Empty,
      target: "≤ 10",
      met: p95 / p95Empty <= 10,
    },
    { what: "the same in milliseconds", ...shared, figure: p95, target: "< 30 ms", met: p95 < 30 },
  ];
}
