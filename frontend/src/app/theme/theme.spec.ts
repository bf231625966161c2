import { readFileSync } from 'node:fs';
import path from 'node:path';

import { describe, expect, it } from 'vitest';

import { PALETTES, type Appearance } from './antd-theme';

const css = readFileSync(path.join(import.meta.dirname, 'tokens.css'), 'utf8');

function tokensOf(appearance: Appearance): Readonly<Record<string, string>> {
  const block = new RegExp(`\\[data-theme='${appearance}'\\] \\{([^}]*)\\}`).exec(css)?.[1] ?? '';
  return Object.fromEntries([...block.matchAll(/--([\w-]+):\s*(#[0-9a-f]{6})/g)].map((match) => [match[1], match[2]]));
}

/** Relative luminance and contrast ratio, WCAG 2.2, definitions of the glossary. */
function luminance(hex: string): number {
  const channel = (start: number): number => {
    const value = Number.parseInt(hex.slice(start, start + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}

function contrast(one: string, other: string): number {
  const [darker = 0, lighter = 0] = [luminance(one), luminance(other)].sort((left, right) => left - right);
  return (lighter + 0.05) / (darker + 0.05);
}

const TEXT = ['ink', 'ink-soft', 'clear', 'tight', 'over', 'unknown', 'copper'];

describe.each<Appearance>(['light', 'dark'])('colours, %s', (appearance) => {
  const tokens = tokensOf(appearance);

  it.each(TEXT)('text in %s reaches AA on paper', (name) => {
    expect(contrast(tokens[name]!, tokens['paper']!)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(TEXT)('text in %s reaches AA on raised surfaces', (name) => {
    expect(contrast(tokens[name]!, tokens['raised']!)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(['clear', 'tight', 'over', 'unknown'])('text in %s reaches AA on its own wash', (name) => {
    expect(contrast(tokens[name]!, tokens[`${name}-wash`]!)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(['border-control', 'focus'])('%s is seen (3:1) on paper', (name) => {
    expect(contrast(tokens[name]!, tokens['paper']!)).toBeGreaterThanOrEqual(3);
  });

  it('the component library is given the same colours', () => {
    const { inkSoft, borderControl, onSolid, ...rest } = PALETTES[appearance];
    expect(tokens).toMatchObject({
      ...rest,
      'ink-soft': inkSoft,
      'border-control': borderControl,
      'on-solid': onSolid,
    });
  });
});
