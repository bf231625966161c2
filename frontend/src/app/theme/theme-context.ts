import { createContext, useContext } from 'react';

import type { Appearance } from './antd-theme';

export type ThemeChoice = 'system' | Appearance;

export interface ThemeState {
  choice: ThemeChoice;
  appearance: Appearance;
  setChoice: (choice: ThemeChoice) => void;
}

export const ThemeContext = createContext<ThemeState | null>(null);

export function useTheme(): ThemeState {
  const state = useContext(ThemeContext);
  if (!state) throw new Error('useTheme needs a ThemeProvider above it');
  return state;
}
