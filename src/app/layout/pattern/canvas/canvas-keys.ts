/** What a key means on the canvas. */
export type CanvasKey =
  | { readonly kind: 'walk'; readonly staves: number; readonly courses: number }
  /** The window moves over the sheet, in steps. */
  | { readonly kind: 'pan'; readonly x: number; readonly y: number }
  | { readonly kind: 'zoom'; readonly direction: 'in' | 'out' }
  | { readonly kind: 'space' }
  | { readonly kind: 'mark' }
  | { readonly kind: 'stop' }
  | { readonly kind: 'whole' };

const ARROWS: Partial<Record<string, { readonly x: number; readonly y: number }>> = {
  ArrowLeft: { x: -1, y: 0 },
  ArrowRight: { x: 1, y: 0 },
  ArrowUp: { x: 0, y: -1 },
  ArrowDown: { x: 0, y: 1 },
};

const OTHERS: Partial<Record<string, CanvasKey>> = {
  ' ': { kind: 'space' },
  p: { kind: 'mark' },
  P: { kind: 'mark' },
  Escape: { kind: 'stop' },
  '+': { kind: 'zoom', direction: 'in' },
  '=': { kind: 'zoom', direction: 'in' },
  '-': { kind: 'zoom', direction: 'out' },
  _: { kind: 'zoom', direction: 'out' },
  Home: { kind: 'whole' },
};

type Pressed = Pick<KeyboardEvent, 'key' | 'shiftKey' | 'ctrlKey' | 'metaKey' | 'altKey'>;

/** The meaning of a pressed key, or null; keys with Ctrl, Alt or the command key are the browser's. */
export function canvasKey({ key, shiftKey, ctrlKey, metaKey, altKey }: Pressed): CanvasKey | null {
  if (ctrlKey || metaKey || altKey) return null;
  const arrow = ARROWS[key];
  if (!arrow) return OTHERS[key] ?? null;
  if (shiftKey) return { kind: 'pan', ...arrow };
  return { kind: 'walk', staves: arrow.x, courses: 0 - arrow.y };
}
