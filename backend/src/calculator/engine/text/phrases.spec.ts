import {
  asSentence,
  atLeastText,
  atMostText,
  because,
  cannotBeJudged,
  deviceHas,
  gainText,
  listText,
  roundAway,
} from './phrases';

describe('deviceHas(part, used, unit)', () => {
  it('calls only a plain datasheet minimum guaranteed', () => {
    const minimum = { value: 75e6, basis: 'min', text: 'minimum', page: '4' } as const;
    expect(deviceHas('MRWG-G072', minimum, 'Hz')).toBe('MRWG-G072 guarantees 75.0 MHz (minimum, p. 4)');
  });

  it.each([
    [{ value: 100e6, basis: 'typ', text: 'typical', page: '4' }, 'typically has 100 MHz (typical, p. 4)'],
    [{ value: 70e6, basis: 'typ-derated', text: 'typical × 0.7' }, 'is taken at 70.0 MHz (typical × 0.7, assumed)'],
    [{ value: 60e6, basis: 'min', text: 'minimum × 0.8 (hot)' }, 'is taken at 60.0 MHz (minimum × 0.8 (hot))'],
    [
      { value: 1e6, basis: 'assumed', text: 'not entered, 1 MHz assumed' },
      'is taken at 1.00 MHz (not entered, 1 MHz assumed)',
    ],
  ] as const)('claims no more than the data: %j', (used, words) => {
    expect(deviceHas('MRWG-G072', used, 'Hz')).toBe(`MRWG-G072 ${words}`);
  });
});

it('atLeastText rounds up and atMostText down, so that the printed number suffices', () => {
  expect(atLeastText(231.2e6, 'Hz')).toBe('232 MHz');
  expect(atLeastText(231e6, 'Hz')).toBe('231 MHz');
  expect(atMostText(2.5714, 'V')).toBe('2.57 V');
  expect(roundAway(-2.5714, Math.floor)).toBe(-2.57);
  expect(roundAway(0, Math.ceil)).toBe(0);
});

it('gainText writes a gain that turns the polarity without a cross', () => {
  expect(gainText(-10)).toBe('−10');
  expect(gainText(5)).toBe('×5');
  expect(gainText(-Math.sqrt(10))).toBe('−3.162');
});

it('reasons end sentences and stand as sentences', () => {
  expect(because('Slew rate of MRWG-G072 is not entered.')).toBe('slew rate of MRWG-G072 is not entered');
  expect(because('MRWG-G072 is obsolete.')).toBe('MRWG-G072 is obsolete');
  expect(asSentence('no rate from EUR to USD')).toBe('No rate from EUR to USD.');
  expect(listText(['a', 'b', 'c'])).toBe('a, b and c');
  expect(listText([])).toBe('');
});

it('cannotBeJudged names where the missing value is entered', () => {
  expect(cannotBeJudged('the slew rate', 'Slew rate of MRWG-G072 is not entered.')).toBe(
    'The slew rate cannot be judged: slew rate of MRWG-G072 is not entered. Enter it on the device page.',
  );
  expect(cannotBeJudged('the slew rate', 'The largest input level is not entered.')).toBe(
    'The slew rate cannot be judged: the largest input level is not entered. Enter it in the specification.',
  );
});
