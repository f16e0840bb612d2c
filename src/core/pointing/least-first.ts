/** A queue from which the item of the least key comes first: a binary heap. */
export class LeastFirst<T> {
  private readonly heap: { key: number; item: T }[] = [];

  push(key: number, item: T): void {
    let at = this.heap.push({ key, item }) - 1;
    while (at > 0) {
      const above = (at - 1) >> 1;
      if (this.heap[above].key <= this.heap[at].key) return;
      this.swap(at, above);
      at = above;
    }
  }

  /** Takes out the item of the least key; null where the queue is empty. */
  pop(): { key: number; item: T } | null {
    if (this.heap.length === 0) return null;
    this.swap(0, this.heap.length - 1);
    const least = this.heap.pop()!;
    for (let at = 0; ;) {
      const [left, right] = [2 * at + 1, 2 * at + 2];
      let next = at;
      if (left < this.heap.length && this.heap[left].key < this.heap[next].key) next = left;
      if (right < this.heap.length && this.heap[right].key < this.heap[next].key) next = right;
      if (next === at) return least;
      this.swap(at, next);
      at = next;
    }
  }

  private swap(a: number, b: number): void {
    [this.heap[a], this.heap[b]] = [this.heap[b], this.heap[a]];
  }
}
