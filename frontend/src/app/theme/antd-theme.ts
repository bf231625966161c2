import { theme as antdTheme, type ThemeConfig } from 'antd';

export type Appearance = 'light' | 'dark';

interface Palette {
  paper: string;
  raised: string;
  field: string;
  ink: string;
  inkSoft: string;
  rule: string;
  borderControl: string;
  clear: string;
  tight: string;
  over: string;
  onSolid: string;
  focus: string;
}

/** The same values as tokens.css: antd computes shades from them and cannot read CSS variables. */
export const PALETTES: Readonly<Record<Appearance, Palette>> = {
  light: {
    paper: '#faf8f4',
    raised: '#f1ede4',
    field: '#fffefb',
    ink: '#20262e',
    inkSoft: '#5a616b',
    rule: '#ddd7cc',
    borderControl: '#8c857a',
    clear: '#287270',
    tight: '#8c6304',
    over: '#b0382e',
    onSolid: '#faf8f4',
    focus: '#1f5f9e',
  },
  dark: {
    paper: '#171b20',
    raised: '#20262d',
    field: '#171b20',
    ink: '#e9e4da',
    inkSoft: '#a9afb8',
    rule: '#343b44',
    borderControl: '#7a838f',
    clear: '#5fb8b2',
    tight: '#d9a93a',
    over: '#f0857a',
    onSolid: '#171b20',
    focus: '#8fc1f2',
  },
};

function componentTokens(palette: Palette): ThemeConfig['components'] {
  const flat = { primaryShadow: 'none', defaultShadow: 'none', dangerShadow: 'none' };
  return {
    Button: { ...flat, primaryColor: palette.onSolid, defaultBg: 'transparent', fontWeight: 400 },
    Input: { activeShadow: 'none', hoverBorderColor: palette.ink, activeBorderColor: palette.ink },
    Select: { optionSelectedBg: palette.raised, optionActiveBg: palette.raised },
    Segmented: { itemSelectedBg: palette.ink, itemSelectedColor: palette.paper, trackBg: 'transparent' },
    Tooltip: { colorBgSpotlight: palette.ink, colorTextLightSolid: palette.paper },
    Form: { itemMarginBottom: 16, labelColor: palette.inkSoft },
    Drawer: { colorBgElevated: palette.paper },
    Modal: { contentBg: palette.paper, headerBg: palette.paper },
  };
}

export function antdThemeFor(appearance: Appearance): ThemeConfig {
  const palette = PALETTES[appearance];
  return {
    algorithm: appearance === 'dark' ? antdTheme.darkAlgorithm : antdTheme.defaultAlgorithm,
    token: {
      fontFamily: "'Source Sans 3', 'DejaVu Sans', system-ui, sans-serif",
      fontSize: 14,
      borderRadius: 3,
      borderRadiusLG: 4,
      borderRadiusSM: 2,
      controlHeight: 32,
      colorPrimary: palette.ink,
      colorInfo: palette.ink,
      colorLink: palette.ink,
      colorSuccess: palette.clear,
      colorWarning: palette.tight,
      colorError: palette.over,
      colorText: palette.ink,
      colorTextSecondary: palette.inkSoft,
      colorTextTertiary: palette.inkSoft,
      colorTextDescription: palette.inkSoft,
      colorTextPlaceholder: palette.inkSoft,
      colorTextDisabled: palette.inkSoft,
      colorBgContainerDisabled: palette.raised,
      colorBgBase: palette.paper,
      colorBgLayout: palette.paper,
      colorBgContainer: palette.field,
      colorBgElevated: palette.paper,
      colorBorder: palette.borderControl,
      colorBorderSecondary: palette.rule,
      colorSplit: palette.rule,
      colorTextLightSolid: palette.onSolid,
      controlOutline: 'transparent',
      boxShadowTertiary: 'none',
      motionDurationMid: '0.12s',
      motionDurationSlow: '0.18s',
    },
    components: componentTokens(palette),
  };
}
