export function median(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
}

/** Processor time of a piece of work, ms: what else runs on the machine doesn't count. */
export async function timeOf(work: () => unknown): Promise<number> {
  const start = process.cpuUsage();
  await work();
  const { user, system } = process.cpuUsage(start);
  return (user + system) / 1000;
}

/** Processor time of each of several turns, ms. */
export async function timesOf(turns: number, work: () => unknown): Promise<number[]> {
  const times: number[] = [];
  for (let turn = 0; turn < turns; turn += 1) times.push(await timeOf(work));
  return times;
}
