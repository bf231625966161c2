import { setTimeout as pause } from 'node:timers/promises';
import { calculate, type ChainInput, curves, type Device } from './calculator/engine';
import { benchChain, benchDevice, benchStages } from './bench-chain';

/** What was measured beside what it may take. */
export interface Measured {
  readonly name: string;
  readonly value: number;
  readonly limit: number;
  readonly unit: 'ms';
}

const sorted = (values: readonly number[]) => [...values].sort((a, b) => a - b);
const atFraction = (values: readonly number[], fraction: number): number =>
  sorted(values)[Math.min(values.length - 1, Math.floor(fraction * values.length))] ?? NaN;
export const median = (values: readonly number[]) => atFraction(values, 0.5);

async function durationsMs(count: number, action: (index: number) => unknown): Promise<number[]> {
  const durations: number[] = [];
  for (let index = 0; index < count; index += 1) {
    const startedAt = performance.now();
    await action(index);
    durations.push(performance.now() - startedAt);
  }
  return durations;
}

/** The engine alone: 8 stages, three cases, 401 frequencies of chain and stages; and the whole report beside it. */
export async function measureEngine(rounds = 40): Promise<Measured[]> {
  const input = benchChain(8);
  const sweep = () => curves(input, { fromHz: 1e5, toHz: 1e9, points: 401 });
  const report = () => calculate(input);
  await durationsMs(10, sweep);
  await durationsMs(10, report);
  return [
    {
      name: 'analysis of 8 stages, 3 cases, 401 points',
      value: median(await durationsMs(rounds, sweep)),
      limit: 5,
      unit: 'ms',
    },
    { name: 'report of 8 stages', value: median(await durationsMs(rounds, report)), limit: 50, unit: 'ms' },
  ];
}

interface Identified {
  readonly id: string;
  readonly version: number;
}

/** A signed-in client of a running server. */
export class BenchClient {
  private cookie = '';

  constructor(private readonly baseUrl: string) {}

  async send<T>(method: string, path: string, body?: unknown): Promise<T> {
    const response = await fetch(`${this.baseUrl}/api${path}`, {
      method,
      headers: { 'content-type': 'application/json', 'x-requested-with': 'bandledger', cookie: this.cookie },
      body: body === undefined ? undefined : JSON.stringify(body),
    });
    const text = await response.text();
    if (!response.ok) throw new Error(`${method} ${path}: ${response.status} ${text.slice(0, 400)}`);
    const [cookie] = response.headers.getSetCookie();
    if (cookie !== undefined) this.cookie = cookie.split(';')[0] ?? '';
    return (text === '' ? undefined : JSON.parse(text)) as T;
  }

  async signInAsDemoDesigner(): Promise<void> {
    const { demoAccounts } = await this.send<{ demoAccounts: { userId: string; roles: string[] }[] }>(
      'GET',
      '/session',
    );
    const designer = demoAccounts.find(({ roles }) => roles.includes('designer'));
    await this.send('POST', '/session/demo', { userId: designer?.userId });
  }
}

const CLIENTS = 10;
/** Sixty words a minute. Faster keys are gathered by the screen, which waits 120 ms for the next one before it asks. */
const KEYSTROKE_MS = 200;

/** The chain with one resistor changed, as between two keystrokes. */
function typed(input: ChainInput, step: number): ChainInput {
  const [first, ...rest] = input.stages;
  return first === undefined || !('feedbackOhm' in first)
    ? input
    : { ...input, stages: [{ ...first, feedbackOhm: first.feedbackOhm + step }, ...rest] };
}

/** Ten people typing at once: how long 95 of 100 live previews take at most. */
export async function measurePreview(client: BenchClient, keystrokes = 25): Promise<Measured> {
  const input = benchChain(8);
  const body = (step: number) => {
    const { specification, stages, devices, currency, buildQuantity } = typed(input, step);
    return { specification, stages, devices, currency, buildQuantity };
  };
  // A server that has been up for a moment, not the first seconds of its compiler.
  await durationsMs(150, (step) => client.send('POST', '/calculations', body(step)));
  const person = async (number: number): Promise<number[]> => {
    const durations: number[] = [];
    await pause((KEYSTROKE_MS / CLIENTS) * number);
    for (let step = 0; step < keystrokes; step += 1) {
      const next = pause(KEYSTROKE_MS);
      durations.push(...(await durationsMs(1, () => client.send('POST', '/calculations', body(100 * number + step)))));
      await next;
    }
    return durations;
  };
  const all = await Promise.all(Array.from({ length: CLIENTS }, (_, number) => person(number)));
  return {
    name: 'preview, 95th percentile of ten people typing',
    value: atFraction(all.flat(), 0.95),
    limit: 50,
    unit: 'ms',
  };
}

const asLibraryDevice = ({ id: _id, quote: _quote, ...fields }: Device) => fields;

/** Saving an option of 24 stages, each time changed. */
export async function measureSave(client: BenchClient, rounds = 15): Promise<Measured> {
  const device = await client.send<Identified>('POST', '/devices', asLibraryDevice(benchDevice('SAVE', 400e6)));
  const project = await client.send<Identified>('POST', '/projects', {
    code: 'BENCH',
    name: 'Measurement',
    open: true,
    currency: 'USD',
    buildQuantity: 250,
  });
  const { specification } = benchChain(1);
  const chain = await client.send<Identified & { options: Identified[] }>('POST', `/projects/${project.id}/chains`, {
    name: 'Measured chain',
    specification,
  });
  const stages = benchStages(24, device.id);
  let { id, version } = chain.options[0] ?? { id: '', version: 0 };
  const save = async (round: number) => {
    const changed = stages.map((stage) => ({ ...stage, name: `${stage.name}, ${round}` }));
    ({ id, version } = await client.send<Identified>('PUT', `/options/${id}`, {
      version,
      name: 'Baseline',
      stages: changed,
    }));
  };
  await durationsMs(3, save);
  return { name: 'save of 24 stages', value: median(await durationsMs(rounds, save)), limit: 100, unit: 'ms' };
}

/** Three hundred devices of the library, each tried in one stage of a chain of four. */
export async function measurePicker(client: BenchClient, rounds = 10): Promise<Measured> {
  const deviceIds: string[] = [];
  for (let index = 0; index < 300; index += 1) {
    const device = benchDevice(`PICK${index}`, 50e6 + 5e6 * index);
    deviceIds.push((await client.send<Identified>('POST', '/devices', asLibraryDevice(device))).id);
  }
  const { specification, devices, currency, buildQuantity } = benchChain(4);
  const stages = benchStages(4, 'amplifier');
  const body = { specification, stages, devices, currency, buildQuantity, stageId: stages[1]?.id, deviceIds };
  const tryAll = async () => {
    const { candidates } = await client.send<{ candidates: unknown[] }>('POST', '/calculations/candidates', body);
    if (candidates.length < 300) throw new Error(`only ${candidates.length} devices were tried`);
  };
  await durationsMs(2, tryAll);
  return {
    name: '300 devices tried in a stage',
    value: median(await durationsMs(rounds, tryAll)),
    limit: 150,
    unit: 'ms',
  };
}
