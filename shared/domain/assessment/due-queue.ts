/** Something that falls due on a day; of one day the smaller sequence comes first. */
export interface Due {
  readonly dueDay: number;
  readonly sequence: number;
}

const before = (a: Due, b: Due) => a.dueDay < b.dueDay || (a.dueDay === b.dueDay && a.sequence < b.sequence);

/**
 * A binary heap by due day. Layers under different terms do not fall due in the order in which they opened,
 * and asking each of them every day would make the work grow with layers × days.
 */
export class DueQueue<Item extends Due> {
  private readonly heap: Item[] = [];

  first(): Item | undefined {
    return this.heap[0];
  }

  add(item: Item): void {
    const { heap } = this;
    let at = heap.length;
    heap.push(item);
    while (at > 0) {
      const parentAt = (at - 1) >> 1;
      const parent = heap[parentAt];
      if (!parent || !before(item, parent)) break;
      heap[at] = parent;
      at = parentAt;
    }
    heap[at] = item;
  }

  /** Takes the first item away. */
  removeFirst(): void {
    const last = this.heap.pop();
    if (last === undefined || this.heap.length === 0) return;
    this.sink(last);
  }

  private sink(item: Item): void {
    const { heap } = this;
    let at = 0;
    for (;;) {
      const child = this.smallerChild(at);
      const childItem = heap[child];
      if (!childItem || !before(childItem, item)) break;
      heap[at] = childItem;
      at = child;
    }
    heap[at] = item;
  }

  private smallerChild(at: number): number {
    const left = this.heap[2 * at + 1];
    const right = this.heap[2 * at + 2];
    return left && right && before(right, left) ? 2 * at + 2 : 2 * at + 1;
  }
}
