import workerpool from "workerpool";

/**
 * An evaluator process that does what no formula should be able to: it spins, hoards memory, exits,
 * or throws, as the title of its calculation says. For tests of the pool alone.
 */
function hoard(): never {
  const heap: unknown[] = [];
  for (;;) heap.push(new Array(10_000).fill({}));
}

function spin(): never {
  for (;;) Math.random();
}

workerpool.worker({
  ping: () => "ready",
  evaluate: ({ file }: { file: { title: string } }) => {
    workerpool.workerEmit({ startedBy: process.pid });
    if (file.title === "spin") spin();
    if (file.title === "hoard") hoard();
    if (file.title === "exit") process.exit(7);
    if (file.title === "throw") throw new RangeError("as asked");
    if (file.title === "pid") return process.pid;
    if (file.title === "environment") return Object.keys(process.env);
    return file.title;
  },
});
