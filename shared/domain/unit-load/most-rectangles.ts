interface Sides {
  length: number;
  width: number;
}

// Above so many pieces the pinwheels are left out of the search: with 130 pieces they took seconds to find
// one more; containers of the trade seldom stand so many to a layer.
const MOST_WITH_PINWHEELS = 50;

/** One search: the piece, how much of each length pieces can use, and what is known of boards so far. */
interface Search {
  piece: Sides;
  used: Int32Array;
  known: Map<number, number>;
}

/**
 * The most equal rectangles, along or across, that lie in a larger one. Splits the larger one in two by
 * every straight cut, and in five around a middle block (a pinwheel), at the places where edges of pieces can
 * lie; each part is split again. The recursive five-block scheme of Morabito and Morales, Journal of the
 * Operational Research Society 49, 1998 (reference from memory).
 */
export function mostRectangles(piece: Sides, whole: Sides): number {
  const used = usedOf(piece, Math.max(whole.length, whole.width));
  return mostOn({ piece, used, known: new Map() }, whole);
}

function mostOn(search: Search, { length, width }: Sides): number {
  const [a, b] = [search.used[length] ?? 0, search.used[width] ?? 0];
  const board = a < b ? { length: b, width: a } : { length: a, width: b };
  const key = board.length * search.used.length + board.width;
  let found = search.known.get(key);
  if (found === undefined) {
    found = bestSplit(search, board);
    search.known.set(key, found);
  }
  return found;
}

function bestSplit(search: Search, board: Sides): number {
  const { piece, used } = search;
  const limit = mostByArea(search, board);
  let best = Math.max(rows(piece, board), rows(piece, { length: board.width, width: board.length }));
  const splits = limit <= MOST_WITH_PINWHEELS ? [straightCuts, pinwheels] : [straightCuts];
  for (const split of splits) {
    if (best === limit) return best;
    for (const parts of split(board, used)) {
      if (total(parts, (part) => mostByArea(search, part)) <= best) continue;
      best = Math.max(
        best,
        total(parts, (part) => mostOn(search, part)),
      );
      if (best === limit) return best;
    }
  }
  return best;
}

function mostByArea({ piece, used }: Search, { length, width }: Sides): number {
  return Math.floor(((used[length] ?? 0) * (used[width] ?? 0)) / (piece.length * piece.width));
}

function total(parts: readonly Sides[], count: (part: Sides) => number): number {
  let sum = 0;
  for (const part of parts) sum += count(part);
  return sum;
}

function rows(piece: Sides, { length, width }: Sides): number {
  return Math.floor(length / piece.length) * Math.floor(width / piece.width);
}

/** For each length up to `end`, how much of it pieces laid end to end, along or across, can use. */
function usedOf(piece: Sides, end: number): Int32Array {
  const used = new Int32Array(end + 1);
  for (let length = 1; length <= end; length += 1) {
    const after = (side: number): number => (length < side ? 0 : side + (used[length - side] ?? 0));
    used[length] = Math.max(after(piece.length), after(piece.width));
  }
  return used;
}

/** Where an edge can lie once every piece is pushed to one side: every length that pieces use in full. */
function edges(used: Int32Array, end: number): number[] {
  const at: number[] = [];
  for (let length = 1; length < end; length += 1) if (used[length] === length) at.push(length);
  return at;
}

function* straightCuts({ length, width }: Sides, used: Int32Array): Generator<Sides[]> {
  for (const at of edges(used, length)) {
    yield [
      { length: at, width },
      { length: length - at, width },
    ];
  }
  for (const at of edges(used, width)) {
    yield [
      { length, width: at },
      { length, width: width - at },
    ];
  }
}

function* pinwheels({ length, width }: Sides, used: Int32Array): Generator<Sides[]> {
  const upTo = edges(used, width);
  const pairs = upTo.flatMap((low) => upTo.filter((high) => high > low).map((high) => ({ low, high })));
  for (const left of edges(used, length)) {
    for (const right of edges(used, length)) {
      // A pinwheel turned by half a turn is one again, so half of them are enough.
      if (right <= left || left + right > length) continue;
      for (const { low, high } of pairs) {
        yield [
          { length: left, width: width - low },
          { length: length - left, width: width - high },
          { length: right - left, width: high - low },
          { length: right, width: low },
          { length: length - right, width: high },
        ];
      }
    }
  }
}
