import { spawn } from 'node:child_process';
import { constants } from 'node:os';
import { root } from './paths.mjs';

const running = new Set();

/** Ends the whole process group of a child, for children that were started detached. */
export function killGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch {
    child.kill(signal);
  }
}

export const killAll = (signal) => running.forEach((child) => killGroup(child, signal));

/**
 * Runs a command to its end in a process group of its own and collects what it prints.
 * Answers { code, output, timedOut }; never throws for a failing command.
 */
export function run(command, args, { env = process.env, cwd = root, timeoutMs = 0, echo = false } = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, {
      cwd,
      env: { ...env, NO_COLOR: '1', FORCE_COLOR: undefined },
      detached: true,
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    running.add(child);
    let output = '';
    let timedOut = false;
    const timer = timeoutMs && setTimeout(() => ((timedOut = true), killGroup(child, 'SIGKILL')), timeoutMs);
    const collect = (chunk) => {
      output += chunk;
      if (echo) process.stdout.write(chunk);
    };
    child.stdout.setEncoding('utf8').on('data', collect);
    child.stderr.setEncoding('utf8').on('data', collect);
    const finish = (code) => {
      clearTimeout(timer);
      running.delete(child);
      resolve({ code, output, timedOut });
    };
    child.on('error', (error) => {
      output += `${error.message}\n`;
      finish(127);
    });
    child.on('close', (code, signal) => finish(code ?? 128 + (constants.signals[signal] ?? 0)));
  });
}

/** npm as the one that started us where there is one, else the first in the path. */
export function npmCommand(args) {
  const script = process.env.npm_execpath;
  return script?.endsWith('.js') ? [process.execPath, [script, ...args]] : ['npm', args];
}
