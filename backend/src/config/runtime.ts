import type { AppConfig } from './environment';

/** What one running server knows beside its environment: secrets and the kind of data folder it was started on. */
export class Runtime {
  constructor(
    readonly config: AppConfig,
    readonly sessionSecret: string,
    readonly demo: boolean,
    /** Opens the first administrator's page once; null in a demo. */
    readonly setupToken: string | null,
  ) {}
}
