import { plainToInstance } from 'class-transformer';
import { validateSync } from 'class-validator';
import { toFieldErrors } from '../field-errors';
import { LIMITS } from '../limits';
import { Choice, Flag, QueryFlag } from './choice';
import { IdList, Nested, NestedList, NestedUnion, NestedUnionList, instanceOf } from './nested';
import { Quantity, QueryQuantity } from './quantity';
import { Currency, PlainDate, Text, Uuid } from './text';
import { addUnionSchemas, declareUnion } from './union';

class Inner {
  @Quantity('frequencyHz') readonly hz: number;
}

class Cat {
  @Choice(['cat']) readonly kind: 'cat';
  @Flag() readonly purrs: boolean;
}

class Dog {
  @Choice(['dog']) readonly kind: 'dog';
  @Quantity('channels', { optional: true }) readonly legs?: number;
}

const ANIMAL = declareUnion('SpecAnimal', 'kind', { cat: Cat, dog: Dog });

class Sample {
  @Quantity('frequencyHz', { optional: true }) readonly hz?: number;
  @Quantity('resistanceOhm', { optional: true, nullable: true }) readonly ohm?: number | null;
  @Quantity('quantity', { optional: true }) readonly pieces?: number;
  @QueryQuantity('page') readonly page?: number;
  @QueryFlag() readonly flag?: boolean;
  @Text({ maximum: 5, optional: true }) readonly word?: string;
  @Text({ maximum: 20, optional: true, multiline: true, empty: true }) readonly lines?: string;
  @Uuid({ optional: true }) readonly id?: string;
  @IdList({ maximum: 2, optional: true }) readonly ids?: readonly string[];
  @Currency({ optional: true }) readonly currency?: string;
  @PlainDate({ optional: true }) readonly day?: string;
  @Nested(() => Inner, { optional: true }) readonly inner?: Inner;
  @NestedList(() => Inner, { maximum: 2, optional: true }) readonly inners?: readonly Inner[];
  @NestedUnion(ANIMAL, { optional: true }) readonly animal?: Cat | Dog;
  @NestedUnionList(ANIMAL, { maximum: 2, optional: true }) readonly animals?: readonly (Cat | Dog)[];
}

const check = (plain: object) => {
  const instance = plainToInstance(Sample, plain);
  const errors = validateSync(instance, { whitelist: true, forbidNonWhitelisted: true, forbidUnknownValues: true });
  return { instance, errors: toFieldErrors(errors).map(({ path, code }) => `${path} ${code}`) };
};

const ID = '3f3c7a4e-58a9-4e0e-8f5e-6c1c5b1d2a10';

describe('field decorators', () => {
  it.each<[object, string[]]>([
    [{}, []],
    [{ hz: LIMITS.frequencyHz.minimum }, []],
    [{ hz: LIMITS.frequencyHz.maximum }, []],
    [{ hz: LIMITS.frequencyHz.maximum * 1.001 }, ['hz out_of_range']],
    [{ hz: 0 }, ['hz out_of_range']],
    [{ hz: '5 MHz' }, ['hz not_a_number']],
    [{ hz: null }, ['hz not_a_number']],
    [{ hz: NaN }, ['hz not_finite']],
    [{ hz: Infinity }, ['hz not_finite']],
    [{ hz: [1] }, ['hz not_a_number']],
    [{ ohm: null }, []],
    [{ ohm: 0 }, []],
    [{ pieces: 2.5 }, ['pieces not_an_integer']],
    [{ page: '3' }, []],
    [{ page: '' }, ['page not_a_number']],
    [{ page: '1e400' }, ['page not_finite']],
    [{ flag: 'false' }, []],
    [{ flag: '0' }, ['flag not_a_boolean']],
    [{ id: ID }, []],
    [{ id: `${ID}'` }, ['id not_an_id']],
    [{ ids: [ID, ID, ID] }, ['ids too_many']],
    [{ ids: [ID, 7] }, ['ids not_an_id']],
    [{ ids: ID }, ['ids not_a_list']],
    [{ currency: 'usd' }, ['currency not_a_currency']],
    [{ day: '2028-02-29' }, []],
    [{ day: '2027-02-29' }, ['day not_a_date']],
    [{ day: '2027-2-9' }, ['day not_a_date']],
    [{ inner: { hz: 1 } }, []],
    [{ inner: {} }, ['inner.hz required']],
    [{ inner: [{ hz: 1 }] }, ['inner not_an_object']],
    [{ inner: 'x' }, ['inner not_an_object']],
    [{ inner: { hz: 1, more: 2 } }, ['inner.more unknown_field']],
    [{ inners: [{ hz: 1 }, { hz: 0 }] }, ['inners.1.hz out_of_range']],
    [{ inners: { hz: 1 } }, ['inners not_a_list']],
    [{ animal: { kind: 'cat', purrs: true } }, []],
    [{ animal: { kind: 'dog', purrs: true } }, ['animal.purrs unknown_field']],
    [{ animal: { kind: 'cow', udder: 1 } }, ['animal.kind not_a_choice']],
    [{ animal: { kind: 'constructor' } }, ['animal.kind not_a_choice']],
    [{ animal: {} }, ['animal.kind required']],
    [{ animals: [{ kind: 'dog', legs: 0 }] }, ['animals.0.legs out_of_range']],
    [{ animals: [{ kind: 'dog' }, null] }, ['animals.1 required']],
  ])('%j → %j', (plain, expected) => {
    expect(check(plain).errors).toEqual(expected);
  });

  it('turn query texts into numbers and flags', () => {
    expect(check({ page: '3', flag: 'false' }).instance).toMatchObject({ page: 3, flag: false });
  });
});

describe('Text', () => {
  it.each([
    ['  abc ', 'abc'],
    // Composed: e + combining acute becomes one character.
    ['e\u0301', '\u00e9'],
    ['👩🏽‍🔬', '👩🏽‍🔬'],
    ['שלום', 'שלום'],
  ])('takes %j as %j', (given, kept) => {
    const { instance, errors } = check({ word: given });
    expect(errors).toEqual([]);
    expect(instance.word).toBe(kept);
  });

  it.each([
    ['', 'word required'],
    ['   ', 'word required'],
    ['abcdef', 'word too_long'],
    ['a\u0000', 'word control_character'],
    ['a\nb', 'word control_character'],
    ['a\u2028b', 'word control_character'],
    ['\ud800', 'word control_character'],
    ['a\u202eb', 'word control_character_bidi'],
    ['a\u2066b', 'word control_character_bidi'],
    [5, 'word not_text'],
    [null, 'word not_text'],
  ])('refuses %j with "%s"', (given, error) => {
    expect(check({ word: given }).errors).toEqual([error]);
  });

  it('keeps line breaks where they are allowed, as one sign each', () => {
    expect(check({ lines: 'one\r\ntwo\rthree' }).instance.lines).toBe('one\ntwo\nthree');
    expect(check({ lines: '' }).errors).toEqual([]);
    expect(check({ lines: 'a\u0007' }).errors).toEqual(['lines control_character']);
  });
});

describe('declareUnion', () => {
  it('gives the shape that the word names', () => {
    expect(instanceOf(ANIMAL, { kind: 'dog', legs: 4 })).toBeInstanceOf(Dog);
    expect(instanceOf(ANIMAL, 'dog')).toBe('dog');
    expect(instanceOf(ANIMAL, null)).toBeNull();
  });

  it('becomes a schema of its own with a discriminator', () => {
    const document = addUnionSchemas({ openapi: '3.0.0', info: { title: '', version: '' }, paths: {} });
    expect(document.components?.schemas?.SpecAnimal).toEqual({
      oneOf: [{ $ref: '#/components/schemas/Cat' }, { $ref: '#/components/schemas/Dog' }],
      discriminator: {
        propertyName: 'kind',
        mapping: { cat: '#/components/schemas/Cat', dog: '#/components/schemas/Dog' },
      },
    });
  });
});
