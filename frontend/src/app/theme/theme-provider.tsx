import { App as AntdApp, ConfigProvider } from 'antd';
import { useEffect, useMemo, useState, useSyncExternalStore, type ReactNode } from 'react';

import { antdThemeFor } from './antd-theme';
import { ThemeContext, type ThemeChoice, type ThemeState } from './theme-context';

const STORAGE_KEY = 'bandledger.theme';
const DARK_QUERY = '(prefers-color-scheme: dark)';

/** Storage may be forbidden (private windows): then the choice lasts as long as the page. */
export function readThemeChoice(): ThemeChoice {
  try {
    const stored = window.localStorage.getItem(STORAGE_KEY);
    return stored === 'light' || stored === 'dark' ? stored : 'system';
  } catch {
    return 'system';
  }
}

function storeThemeChoice(choice: ThemeChoice): void {
  try {
    window.localStorage.setItem(STORAGE_KEY, choice);
  } catch {
    // See readThemeChoice.
  }
}

function subscribeToSystem(onChange: () => void): () => void {
  const query = window.matchMedia(DARK_QUERY);
  query.addEventListener('change', onChange);
  return () => query.removeEventListener('change', onChange);
}

const systemIsDark = (): boolean => window.matchMedia(DARK_QUERY).matches;

export function ThemeProvider({ children }: { children: ReactNode }) {
  const [choice, setChoice] = useState<ThemeChoice>(readThemeChoice);
  const dark = useSyncExternalStore(subscribeToSystem, systemIsDark);
  const appearance = choice === 'system' ? (dark ? 'dark' : 'light') : choice;

  useEffect(() => {
    document.documentElement.dataset['theme'] = appearance;
  }, [appearance]);

  const state = useMemo<ThemeState>(
    () => ({
      choice,
      appearance,
      setChoice: (next) => {
        storeThemeChoice(next);
        setChoice(next);
      },
    }),
    [choice, appearance],
  );

  return (
    <ThemeContext value={state}>
      <ConfigProvider theme={antdThemeFor(appearance)}>
        <AntdApp component={false}>{children}</AntdApp>
      </ConfigProvider>
    </ThemeContext>
  );
}
