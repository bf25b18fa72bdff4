/** A strongly connected component: one node, or several that all lead to one another. */
export interface Component<Node> {
  readonly members: readonly Node[];
  /** Whether a member leads to itself, directly or through others. */
  readonly circular: boolean;
}

/** Strongly connected components, dependencies first (Tarjan 1972), without recursion: a file may be one long chain. */
export function components<Node>(
  nodes: Iterable<Node>,
  successors: (node: Node) => readonly Node[],
): readonly Component<Node>[] {
  const found: Component<Node>[] = [];
  const visits = new Map<Node, Visit<Node>>();
  const stack: Visit<Node>[] = [];

  for (const root of nodes) {
    if (visits.has(root)) continue;
    const path = [enter(root, visits, stack, successors)];
    for (let visit = path.at(-1); visit; visit = path.at(-1)) {
      const next = visit.successors[visit.next];
      if (next === undefined) {
        path.pop();
        const parent = path.at(-1);
        if (parent) parent.low = Math.min(parent.low, visit.low);
        if (visit.low === visit.order) found.push(take(visit, stack));
        continue;
      }
      visit.next += 1;
      const other = visits.get(next);
      if (!other) path.push(enter(next, visits, stack, successors));
      else if (other.open) visit.low = Math.min(visit.low, other.order);
    }
  }
  return found;
}

interface Visit<Node> {
  readonly node: Node;
  readonly order: number;
  readonly successors: readonly Node[];
  next: number;
  low: number;
  /** Whether it still waits for its component to be complete. */
  open: boolean;
}

function enter<Node>(
  node: Node,
  visits: Map<Node, Visit<Node>>,
  stack: Visit<Node>[],
  successors: (node: Node) => readonly Node[],
): Visit<Node> {
  const order = visits.size;
  const visit = { node, order, successors: successors(node), next: 0, low: order, open: true };
  visits.set(node, visit);
  stack.push(visit);
  return visit;
}

function take<Node>(root: Visit<Node>, stack: Visit<Node>[]): Component<Node> {
  const visits = stack.splice(stack.indexOf(root));
  for (const visit of visits) visit.open = false;
  return {
    members: visits.map(({ node }) => node),
    circular: visits.length > 1 || root.successors.includes(root.node),
  };
}
