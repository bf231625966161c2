import { availableParallelism } from 'node:os';
import path from 'node:path';
import { Injectable, Logger } from '@nestjs/common';
import type { OnApplicationBootstrap, OnApplicationShutdown } from '@nestjs/common';
import { Piscina } from 'piscina';
import { compareCandidates } from './engine';
import type { CandidatesReport } from './engine';
import { InvalidError, TooManyRequestsError } from '../common/errors';
import { runCalculation } from './calculation.worker';
import type {
  CalculationAnswer,
  CalculationTask,
  CandidatesAnswer,
  CandidatesTask,
  Refusal,
} from './calculation.worker';

/** Threads run compiled JavaScript; from the sources (unit tests) that is the build beside them. */
const COMPILED = path.resolve(__dirname, '../../dist/calculator');
const RUNS_FROM_SOURCES = __filename.endsWith('.ts');

const THREADS = Math.max(1, Math.min(4, availableParallelism()));
/** With more than this waiting the server is overrun; newer requests are refused and asked to come again. */
const MAX_WAITING = 256;

interface Tasks {
  readonly runCalculation: { readonly task: CalculationTask; readonly answer: CalculationAnswer };
  readonly runCandidates: { readonly task: CandidatesTask; readonly answer: CandidatesAnswer };
}

/**
 * The calculator's threads. They never open the database: all they need comes with the task. Live previews and tried devices
 * share them; many devices are tried in portions, so that a preview waits for one portion at most.
 */
@Injectable()
export class CalculatorThreads implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly logger = new Logger('CalculatorThreads');
  private pool: Piscina | null = null;

  onApplicationBootstrap(): void {
    if (!RUNS_FROM_SOURCES) this.start();
  }

  /** The answer as JSON text. */
  async calculate(task: CalculationTask): Promise<string> {
    return accepted(RUNS_FROM_SOURCES ? runCalculation(task) : await this.run('runCalculation', task));
  }

  /** The answer as JSON text. */
  async tryDevices(task: CandidatesTask): Promise<string> {
    const portions = portionsOf(task.candidates);
    const answers = await Promise.all(portions.map((candidates) => this.run('runCandidates', { ...task, candidates })));
    return merged(answers.map(accepted));
  }

  async onApplicationShutdown(): Promise<void> {
    await this.pool?.destroy();
  }

  private start(): Piscina {
    this.pool ??= this.create();
    return this.pool;
  }

  private async run<Name extends keyof Tasks>(name: Name, task: Tasks[Name]['task']): Promise<Tasks[Name]['answer']> {
    const pool = this.start();
    if (pool.queueSize >= MAX_WAITING) {
      throw new TooManyRequestsError('server_busy', 'The calculator is busy. Try again in a moment.', 1);
    }
    return pool.run(task, { name }) as Promise<Tasks[Name]['answer']>;
  }

  private create(): Piscina {
    const pool = new Piscina({
      filename: path.join(COMPILED, 'calculation.worker.js'),
      minThreads: THREADS,
      maxThreads: THREADS,
      maxQueue: 2 * MAX_WAITING,
    });
    // Nobody listening would end the server for a fault in one thread; the pool starts another one.
    pool.on('error', (error: Error) => this.logger.error(error.stack));
    return pool;
  }
}

/** Devices in one portion: a few hundredths of a second for one thread. */
const PORTION = 40;

/** The devices dealt out in turn, so that every portion has as many of each sort. */
function portionsOf<T>(all: readonly T[]): T[][] {
  const count = Math.max(1, Math.ceil(all.length / PORTION));
  return Array.from({ length: count }, (_, portion) => all.filter((_each, index) => index % count === portion));
}

/** The answers of several threads about one stage as one. */
function merged(answers: readonly string[]): string {
  if (answers.length === 1) return answers[0];
  const reports = answers.map((answer) => JSON.parse(answer) as CandidatesReport);
  const candidates = reports.flatMap((report) => report.candidates).sort(compareCandidates);
  return JSON.stringify({ ...reports[0], candidates });
}

/** What the calculator refuses is the request's fault: 422 with the fields that it names. */
function accepted(answer: { readonly json: string } | Refusal): string {
  if ('issues' in answer) throw new InvalidError(answer.issues);
  return answer.json;
}
