import { MOST_PROBLEMS } from './limits.ts';
import type { Problem } from './problem.ts';

/** Gathers problems, keeping the first hundred and counting the rest. */
export class ProblemList {
  private readonly kept: Problem[] = [];
  private count = 0;

  add(path: string, message: string): void {
    this.count++;
    if (this.kept.length < MOST_PROBLEMS) this.kept.push({ path, message });
  }

  get isEmpty(): boolean {
    return this.count === 0;
  }

  /** The problems, and one more that counts those left out. */
  list(): Problem[] {
    const more = this.count - this.kept.length;
    if (more === 0) return [...this.kept];
    return [
      ...this.kept,
      { path: 'file', message: `and ${more} more. Correct these first, then check again.` },
    ];
  }
}
