import { availableParallelism } from 'node:os';
import path from 'node:path';
import { Injectable, Logger } from '@nestjs/common';
import type { OnApplicationBootstrap, OnApplicationShutdown } from '@nestjs/common';
import { Piscina } from 'piscina';
import { compareCandidates } from './engine';
import type { CandidatesReport } from './engine';
import { InvalidError, TooManyRequestsError } from '../common/errors';
import runCalculation from './calculation.worker';
import type { CalculationAnswer, CalculationTask, Refusal } from './calculation.worker';
import type { CandidatesAnswer, CandidatesTask } from './candidates.worker';

/** Threads run compiled JavaScript; from the sources (unit tests) that is the build beside them. */
const COMPILED = path.resolve(__dirname, '../../dist/calculator');
const RUNS_FROM_SOURCES = __filename.endsWith('.ts');

const THREADS = Math.max(1, Math.min(4, availableParallelism()));
/** With more than this waiting the server is overrun; newer requests are refused and asked to come again. */
const MAX_WAITING = 256;

/** A pool whose threads are started, and kept, from the first moment that they may be needed. */
class LazyPool<Task, Answer> {
  private readonly logger = new Logger('CalculatorThreads');
  private pool: Piscina<Task, Answer> | null = null;

  constructor(
    private readonly file: string,
    private readonly threads: number,
  ) {}

  start(): Piscina<Task, Answer> {
    this.pool ??= this.create();
    return this.pool;
  }

  async run(task: Task): Promise<Answer> {
    const pool = this.start();
    if (pool.queueSize >= MAX_WAITING) {
      throw new TooManyRequestsError('server_busy', 'The calculator is busy. Try again in a moment.', 1);
    }
    return pool.run(task);
  }

  async destroy(): Promise<void> {
    await this.pool?.destroy();
  }

  private create(): Piscina<Task, Answer> {
    const pool = new Piscina<Task, Answer>({
      filename: path.join(COMPILED, this.file),
      minThreads: this.threads,
      maxThreads: this.threads,
      maxQueue: MAX_WAITING,
    });
    // Nobody listening would end the server for a fault in one thread; the pool starts another one.
    pool.on('error', (error: Error) => this.logger.error(error.stack));
    return pool;
  }
}

/**
 * The calculator's threads. They never open the database: all they need comes with the task. Trying devices takes long,
 * so it has a pool of its own and live previews never queue behind it.
 */
@Injectable()
export class CalculatorThreads implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly previews = new LazyPool<CalculationTask, CalculationAnswer>('calculation.worker.js', THREADS);
  private readonly trials = new LazyPool<CandidatesTask, CandidatesAnswer>('candidates.worker.js', THREADS);

  onApplicationBootstrap(): void {
    if (!RUNS_FROM_SOURCES) this.previews.start();
  }

  /** The answer as JSON text. */
  async calculate(task: CalculationTask): Promise<string> {
    // Whoever looks at a chain will soon try devices in it.
    if (!RUNS_FROM_SOURCES) this.trials.start();
    return accepted(RUNS_FROM_SOURCES ? runCalculation(task) : await this.previews.run(task));
  }

  /** The answer as JSON text. */
  async tryDevices(task: CandidatesTask): Promise<string> {
    const parts = partsOf(task.candidates, THREADS);
    const answers = await Promise.all(parts.map((candidates) => this.trials.run({ ...task, candidates })));
    return merged(answers.map(accepted));
  }

  async onApplicationShutdown(): Promise<void> {
    await Promise.all([this.previews.destroy(), this.trials.destroy()]);
  }
}

/** Fewer devices than this in one thread are done before another thread has been asked. */
const WORTH_A_THREAD = 40;

/** The devices dealt out in turn, so that every thread gets as many of each sort. */
function partsOf<T>(all: readonly T[], most: number): T[][] {
  const count = Math.max(1, Math.min(most, Math.ceil(all.length / WORTH_A_THREAD)));
  return Array.from({ length: count }, (_, part) => all.filter((_each, index) => index % count === part));
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
