/** The woods of a layout changed: each answer is the changes of one edit, to be applied together in order. */
import { fieldChange, relayChange, type Change } from './patch';
import { BOUNDS, type Layout, type Wood } from './schema';

/** What a person says of a wood; its key follows from the name. */
export type WoodWords = Omit<Wood, 'key'>;

/** True while another wood can be added. */
export function hasRoomForWood(layout: Pick<Layout, 'woods'>): boolean {
  return layout.woods.length < BOUNDS.woods.most;
}

/** The changes that add a wood after the others; none when there is no room. */
export function addWood(layout: Layout, words: WoodWords): Change[] {
  if (!hasRoomForWood(layout)) return [];
  const key = freeKey(words.name, new Set(layout.woods.map((wood) => wood.key)));
  return present(fieldChange(layout, 'woods', [...layout.woods, { key, ...words }]));
}

/** The changes that give the wood at an index other words; its key and its tiles stay. */
export function editWood(layout: Layout, index: number, words: WoodWords): Change[] {
  const woods = layout.woods.map((wood, i) => (i === index ? { key: wood.key, ...words } : wood));
  return present(fieldChange(layout, 'woods', woods));
}

/**
 * The changes that take the wood at an index out; its tiles get the wood at `heir` (an index before the
 * removal). None when it is the only wood or its own heir.
 */
export function removeWood(layout: Layout, index: number, heir: number): Change[] {
  if (layout.woods.length < 2 || heir === index || !layout.woods[heir]) return [];
  const after = (wood: number): number => {
    const kept = wood === index ? heir : wood;
    return kept > index ? kept - 1 : kept;
  };
  const woods = layout.woods.filter((_, i) => i !== index);
  const relaid = relayChange(layout.cells, layout.cells.map(after));
  return present(relaid, fieldChange(layout, 'woods', woods));
}

/** A key from a name: its letters and digits, with a number when taken. */
function freeKey(name: string, taken: ReadonlySet<string>): string {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, BOUNDS.woodKeyLength.most - 4);
  const base = plain === '' ? 'wood' : plain;
  let key = base;
  for (let n = 2; taken.has(key); n++) key = `${base}-${n}`;
  return key;
}

function present(...changes: (Change | null)[]): Change[] {
  return changes.filter((change) => change !== null);
}
