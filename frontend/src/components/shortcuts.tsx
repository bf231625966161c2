import { createContext, useContext, useEffect, useId, useMemo, useState, type ReactNode } from 'react';

export interface Shortcut {
  /** As printed, e.g. "Alt + ↑". */
  readonly keys: string;
  readonly does: string;
}

export interface ShortcutGroup {
  readonly title: string;
  readonly shortcuts: readonly Shortcut[];
}

interface ShortcutRegistry {
  readonly groups: readonly ShortcutGroup[];
  readonly add: (id: string, group: ShortcutGroup) => void;
  readonly remove: (id: string) => void;
}

const ShortcutContext = createContext<ShortcutRegistry | null>(null);

export function ShortcutProvider({ children }: { children: ReactNode }) {
  const [byId, setById] = useState<ReadonlyMap<string, ShortcutGroup>>(new Map());
  const registry = useMemo<ShortcutRegistry>(
    () => ({
      groups: [...byId.values()],
      add: (id, group) => setById((map) => new Map(map).set(id, group)),
      remove: (id) => setById((map) => new Map([...map].filter(([key]) => key !== id))),
    }),
    [byId],
  );
  return <ShortcutContext value={registry}>{children}</ShortcutContext>;
}

export function useShortcutGroups(): readonly ShortcutGroup[] {
  return useContext(ShortcutContext)?.groups ?? [];
}

/** Lists a page's shortcuts in the help while the page is open. `group` must be a constant outside the component. */
export function useShortcutHelp(group: ShortcutGroup): void {
  const id = useId();
  const registry = useContext(ShortcutContext);
  const add = registry?.add;
  const remove = registry?.remove;
  useEffect(() => {
    add?.(id, group);
    return () => remove?.(id);
    // The registry's functions change with every entry; only the group matters.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [id, group]);
}

/** True while somebody types: single-key shortcuts stay out of the way. */
export function isTyping(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  return target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName);
}
