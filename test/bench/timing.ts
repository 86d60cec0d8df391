/** Median of the times of one kind of work [ms], after warming up. */
export function median(work: () => unknown, repeats: number): number {
  for (let i = 0; i < 3; i++) work();
  const times = Array.from({ length: repeats }, () => {
    const start = process.hrtime.bigint();
    work();
    return Number(process.hrtime.bigint() - start) / 1e6;
  });
  times.sort((a, b) => a - b);
  return times[Math.floor(times.length / 2)] ?? NaN;
}
