import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';

/** The repository: relative paths in the environment count from here, whatever the working directory is. */
const REPOSITORY_ROOT = path.resolve(__dirname, '../../..');
const BACKEND_ROOT = path.resolve(__dirname, '../..');

export type LogLevel = 'error' | 'warn' | 'info' | 'debug';
export type DemoChoice = 'auto' | 'on' | 'off';

/** Everything the server takes from its environment, checked and with its units in the names. */
export interface AppConfig {
  readonly host: string;
  readonly port: number;
  readonly dataDir: string;
  readonly publicUrl: string;
  readonly demo: DemoChoice;
  readonly sessionSecret: string | null;
  readonly setupToken: string | null;
  readonly logLevel: LogLevel;
  /** log2 of scrypt's N. */
  readonly scryptCost: number;
  readonly sessionIdleHours: number;
  readonly linkValidHours: number;
  readonly trustProxyHops: number;
  readonly rateGeneralPerMinute: number;
  readonly rateCalculationsPerMinute: number;
  readonly signInWindowMinutes: number;
  readonly signInFailuresPerAccount: number;
  readonly signInFailuresPerAddress: number;
  readonly frontendDir: string;
  readonly version: string;
}

/** A setting that cannot be used; the message is one line that names the variable. */
export class ConfigError extends Error {}

type Environment = Readonly<Record<string, string | undefined>>;

const LOOPBACK = /^(localhost|127(\.\d{1,3}){3}|::1|\[::1\])$/i;

/** Whether only this machine itself can reach the address. */
export function isLoopback(host: string): boolean {
  return LOOPBACK.test(host);
}

/** `http://host:port` with the brackets that an IPv6 address needs. */
export function httpAddress(host: string, port: number): string {
  return `http://${host.includes(':') ? `[${host}]` : host}:${port}`;
}

function text(env: Environment, name: string): string | null {
  const value = env[name]?.trim();
  return value === undefined || value === '' ? null : value;
}

function integer(env: Environment, name: string, fallback: number, minimum: number, maximum: number): number {
  const value = text(env, name);
  if (value === null) return fallback;
  const number = Number(value);
  if (!/^\d+$/.test(value) || number < minimum || number > maximum) {
    throw new ConfigError(`${name} must be a whole number from ${minimum} to ${maximum}, not "${value}".`);
  }
  return number;
}

function choice<T extends string>(env: Environment, name: string, fallback: T, allowed: readonly T[]): T {
  const value = text(env, name);
  if (value === null) return fallback;
  const found = allowed.find((candidate) => candidate === value.toLowerCase());
  if (found === undefined) throw new ConfigError(`${name} must be one of ${allowed.join(', ')}, not "${value}".`);
  return found;
}

function secret(env: Environment, name: string, minimumLength: number): string | null {
  const value = text(env, name);
  if (value !== null && value.length < minimumLength) {
    throw new ConfigError(`${name} must have at least ${minimumLength} characters; it has ${value.length}.`);
  }
  return value;
}

function publicUrl(env: Environment, host: string, port: number): string {
  const value = text(env, 'PUBLIC_URL');
  if (value === null) return httpAddress(host === '0.0.0.0' || host === '::' ? 'localhost' : host, port);
  const url = URL.canParse(value) ? new URL(value) : null;
  if (url === null || !['http:', 'https:'].includes(url.protocol) || url.pathname !== '/' || url.search !== '') {
    throw new ConfigError(`PUBLIC_URL must look like https://budget.example.org without a path, not "${value}".`);
  }
  return url.origin;
}

function hostName(env: Environment): string {
  const value = text(env, 'HOST') ?? '127.0.0.1';
  if (!/^[\w.:-]+$/.test(value)) throw new ConfigError(`HOST must be an address or a host name, not "${value}".`);
  return value;
}

/** What demo mode demands of the address: anybody who reaches it may sign in as anybody. */
export function demoRefusal(config: Pick<AppConfig, 'host' | 'publicUrl'>): string | null {
  const reason = 'its sign-ins need no password, so it may only be reached from this machine';
  if (!isLoopback(config.host)) {
    return `Demo mode refuses HOST=${config.host}: ${reason}. Set DEMO=off or HOST=127.0.0.1.`;
  }
  if (!isLoopback(new URL(config.publicUrl).hostname)) {
    return `Demo mode refuses PUBLIC_URL=${config.publicUrl}: ${reason}. Set DEMO=off or leave PUBLIC_URL out.`;
  }
  return null;
}

function backendVersion(): string {
  const manifest = JSON.parse(readFileSync(path.join(BACKEND_ROOT, 'package.json'), 'utf8')) as { version: string };
  return manifest.version;
}

/** Checks an environment and returns the configuration; throws {@link ConfigError} at the first wrong value. */
export function readEnvironment(env: Environment): AppConfig {
  const host = hostName(env);
  const port = integer(env, 'PORT', 4180, 0, 65535);
  const config: AppConfig = {
    host,
    port,
    dataDir: path.resolve(REPOSITORY_ROOT, text(env, 'DATA_DIR') ?? 'data'),
    publicUrl: publicUrl(env, host, port),
    demo: choice<DemoChoice>(env, 'DEMO', 'auto', ['auto', 'on', 'off']),
    sessionSecret: secret(env, 'SESSION_SECRET', 32),
    setupToken: secret(env, 'SETUP_TOKEN', 16),
    logLevel: choice<LogLevel>(env, 'LOG_LEVEL', 'warn', ['error', 'warn', 'info', 'debug']),
    scryptCost: integer(env, 'SCRYPT_COST', 16, 10, 20),
    sessionIdleHours: integer(env, 'SESSION_IDLE_HOURS', 12, 1, 720),
    linkValidHours: integer(env, 'LINK_VALID_HOURS', 72, 1, 720),
    trustProxyHops: integer(env, 'TRUST_PROXY_HOPS', 0, 0, 10),
    rateGeneralPerMinute: integer(env, 'RATE_GENERAL_PER_MINUTE', 1200, 1, 1_000_000),
    rateCalculationsPerMinute: integer(env, 'RATE_CALCULATIONS_PER_MINUTE', 6000, 1, 1_000_000),
    signInWindowMinutes: integer(env, 'SIGN_IN_WINDOW_MINUTES', 15, 1, 1440),
    signInFailuresPerAccount: integer(env, 'SIGN_IN_FAILURES_PER_ACCOUNT', 10, 1, 10_000),
    signInFailuresPerAddress: integer(env, 'SIGN_IN_FAILURES_PER_ADDRESS', 50, 1, 10_000),
    frontendDir: path.resolve(REPOSITORY_ROOT, text(env, 'FRONTEND_DIR') ?? 'frontend/dist'),
    version: backendVersion(),
  };
  const refusal = config.demo === 'on' ? demoRefusal(config) : null;
  if (refusal !== null) throw new ConfigError(refusal);
  return config;
}

/** The process's own environment, with a `.env` beside package.json filled in where a variable is not set. */
export function readProcessEnvironment(): AppConfig {
  const envFile = path.join(REPOSITORY_ROOT, '.env');
  if (existsSync(envFile)) process.loadEnvFile(envFile);
  return readEnvironment(process.env);
}
