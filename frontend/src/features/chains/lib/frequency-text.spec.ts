import { describe, expect, it } from 'vitest';

import { bandText, frequencyText } from './frequency-text';

const plain = (text: string) => text.replace(/[\u00a0\u202f]/g, ' ');

describe('frequency texts', () => {
  it('keeps the digits that a frequency has', () => {
    expect(plain(frequencyText(5e6))).toBe('5 MHz');
    expect(plain(frequencyText(433.92e6))).toBe('433.92 MHz');
    expect(plain(frequencyText(10.7e6))).toBe('10.7 MHz');
    expect(plain(frequencyText(100e3))).toBe('100 kHz');
  });

  it('gives the unit of a band once where both edges share it', () => {
    expect(plain(bandText({ lowHz: 3e6, highHz: 7e6 }))).toBe('3 – 7 MHz');
    expect(plain(bandText({ lowHz: 100e3, highHz: 2e6 }))).toBe('100 kHz – 2 MHz');
  });
});
