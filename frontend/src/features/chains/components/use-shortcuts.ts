import { useEffect, useRef } from 'react';

export interface Shortcuts {
  readonly save: () => void;
  readonly undo: () => void;
  readonly redo: () => void;
}

function shortcutOf(event: KeyboardEvent): keyof Shortcuts | null {
  if (!(event.ctrlKey || event.metaKey) || event.altKey) return null;
  const key = event.key.toLowerCase();
  if (key === 's' && !event.shiftKey) return 'save';
  if (key === 'z') return event.shiftKey ? 'redo' : 'undo';
  return key === 'y' ? 'redo' : null;
}

/** Shortcuts of the whole workspace; the rows have their own. Undo works in fields too: what is typed is the draft. */
export function useShortcuts(shortcuts: Shortcuts): void {
  const latest = useRef(shortcuts);
  useEffect(() => {
    latest.current = shortcuts;
  });
  useEffect(() => {
    const listen = (event: KeyboardEvent) => {
      const shortcut = shortcutOf(event);
      if (!shortcut) return;
      event.preventDefault();
      latest.current[shortcut]();
    };
    window.addEventListener('keydown', listen);
    return () => window.removeEventListener('keydown', listen);
  }, []);
}
