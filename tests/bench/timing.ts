/** Median of several runs of each piece of work, in turns so that a busy moment hits all alike, ms. */
export function medians(work: Record<string, () => unknown>, rounds: number): Record<string, number> {
  const times: Record<string, number[]> = Object.fromEntries(Object.keys(work).map((name) => [name, []]));
  for (let round = 0; round < rounds; round++)
    for (const [name, run] of Object.entries(work)) {
      const start = performance.now();
      run();
      times[name].push(performance.now() - start);
    }
  return Object.fromEntries(Object.entries(times).map(([name, list]) => [name, median(list)]));
}

const median = (values: number[]) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)];
