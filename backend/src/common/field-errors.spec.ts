import 'reflect-metadata';
import { plainToInstance, Type } from 'class-transformer';
import { ArrayMaxSize, IsNumber, IsString, Max, Min, validate, ValidateNested } from 'class-validator';
import { toFieldErrors } from './field-errors';

class Stage {
  @IsNumber()
  @Min(1)
  @Max(10)
  ohm: number;
}

class Body {
  @IsString()
  name: string;

  @ValidateNested({ each: true })
  @ArrayMaxSize(2, { context: { code: 'too_many_stages' } })
  @Type(() => Stage)
  stages: Stage[];
}

async function codes(body: unknown): Promise<[string, string][]> {
  const errors = await validate(plainToInstance(Body, body) as object, { whitelist: true, forbidNonWhitelisted: true });
  return toFieldErrors(errors).map(({ path, code }) => [path, code]);
}

describe('toFieldErrors(errors)', () => {
  it('writes nested paths with indexes', async () => {
    expect(await codes({ name: 'a', stages: [{ ohm: 5 }, { ohm: 11 }] })).toEqual([['stages.1.ohm', 'out_of_range']]);
  });

  it('gives one error a field, the one that explains the others', async () => {
    expect(await codes({ name: 'a', stages: [{ ohm: 'NaN' }] })).toEqual([['stages.0.ohm', 'not_a_number']]);
    expect(await codes({ name: 'a', stages: [{}] })).toEqual([['stages.0.ohm', 'required']]);
  });

  it('prefers a code that the rule itself carries', async () => {
    expect(await codes({ name: 'a', stages: [{ ohm: 1 }, { ohm: 1 }, { ohm: 1 }] })).toEqual([
      ['stages', 'too_many_stages'],
    ]);
  });

  it('names unknown fields where they are', async () => {
    expect(await codes({ name: 'a', stages: [{ ohm: 1, farad: 2 }], extra: 1 })).toEqual([
      ['extra', 'unknown_field'],
      ['stages.0.farad', 'unknown_field'],
    ]);
  });
});
