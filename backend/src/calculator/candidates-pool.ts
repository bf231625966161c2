import path from 'node:path';
import { Injectable } from '@nestjs/common';
import type { OnApplicationShutdown } from '@nestjs/common';
import { Piscina } from 'piscina';
import { InvalidError } from '../common/errors';
import type { CandidatesAnswer, CandidatesTask } from './candidates.worker';
import type { CandidatesReport } from './engine';

/** Worker threads run compiled JavaScript; from the sources (tests) that is the build beside them. */
const WORKER_FILE = path.resolve(__dirname, '../../dist/calculator/candidates.worker.js');

const WORKERS = 2;
/** More than this waiting means that the server is overrun; newer requests are then refused. */
const MAX_WAITING = 64;

/** The worker threads that try devices. They never open the database: all they need comes with the task. */
@Injectable()
export class CandidatesPool implements OnApplicationShutdown {
  private pool: Piscina<CandidatesTask, CandidatesAnswer> | null = null;

  async tryDevices(task: CandidatesTask): Promise<CandidatesReport> {
    this.pool ??= new Piscina({ filename: WORKER_FILE, minThreads: 1, maxThreads: WORKERS, maxQueue: MAX_WAITING });
    const answer = await this.pool.run(task);
    if ('issues' in answer) throw new InvalidError(answer.issues);
    return answer.report;
  }

  async onApplicationShutdown(): Promise<void> {
    await this.pool?.destroy();
  }
}
