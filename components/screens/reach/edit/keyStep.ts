/** What a key asks of the drawing: another point, or the chosen one moved, in the study's units. */
export type KeyStep =
  { kind: 'choose'; index: number } | { kind: 'move'; across: number; up: number };

interface Key {
  key: string;
  shiftKey: boolean;
  altKey: boolean;
  ctrlKey: boolean;
  metaKey: boolean;
}

/** Steps of the arrow keys: a decimetre across and a centimetre up; ten times as far with Shift. */
const ACROSS = 0.1;
const UP = 0.01;

/** null: the key is not for the drawing. */
export function keyStep(event: Key, chosen: number, count: number): KeyStep | null {
  if (event.altKey || event.ctrlKey || event.metaKey) return null;
  const far = event.shiftKey ? 10 : 1;
  const choose = (index: number): KeyStep => ({
    kind: 'choose',
    index: Math.min(Math.max(index, 0), count - 1),
  });
  const move = (across: number, up: number): KeyStep => ({
    kind: 'move',
    across: across * far,
    up: up * far,
  });
  switch (event.key) {
    case 'PageUp':
      return choose(chosen - 1);
    case 'PageDown':
      return choose(chosen + 1);
    case 'Home':
      return choose(0);
    case 'End':
      return choose(count - 1);
    case 'ArrowLeft':
      return move(-ACROSS, 0);
    case 'ArrowRight':
      return move(ACROSS, 0);
    case 'ArrowUp':
      return move(0, UP);
    case 'ArrowDown':
      return move(0, -UP);
    default:
      return null;
  }
}
