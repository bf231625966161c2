// `npm start`: checks, installs and builds what is missing, then serves everything on one port until Ctrl-C.
import { spawn } from 'node:child_process';
import { portProblem } from './lib/checks.mjs';
import { launch, LaunchError } from './lib/launch-error.mjs';
import { fromRoot, root } from './lib/paths.mjs';
import { buildAll, checkFolders, checkNode, install } from './lib/prepare.mjs';
import { killAll, killGroup } from './lib/process.mjs';
import { readSettings } from './lib/settings.mjs';

const say = (text) => console.log(`Bandledger: ${text} …`);

/** Ctrl-C comes from the terminal and once more from npm; only a repeated one, seconds later, is meant as "at once". */
const IMPATIENT_AFTER_MS = 2000;

/** The server runs in a process group of its own and hears of Ctrl-C once, from here. */
function serve() {
  return new Promise((resolve) => {
    const server = spawn(process.execPath, [fromRoot('backend/dist/main.js')], {
      cwd: root,
      detached: true,
      stdio: 'inherit',
    });
    let askedAt = null;
    const stop = () => {
      if (askedAt === null) killGroup(server, 'SIGINT');
      else if (Date.now() - askedAt > IMPATIENT_AFTER_MS) killGroup(server, 'SIGKILL');
      askedAt ??= Date.now();
    };
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, stop);
    server.on('exit', (code) => resolve(askedAt === null ? (code ?? 1) : 0));
  });
}

function stopWhilePreparing() {
  killAll('SIGTERM');
  process.exit(130);
}

await launch(async () => {
  process.on('SIGINT', stopWhilePreparing);
  process.on('SIGTERM', stopWhilePreparing);
  checkNode();
  const settings = readSettings();
  const busy = settings.port === 0 ? null : await portProblem(settings.port, settings.host);
  if (busy) throw new LaunchError(busy);
  checkFolders(settings.dataFolder);
  await install(say);
  await buildAll(say);
  process.off('SIGINT', stopWhilePreparing);
  process.off('SIGTERM', stopWhilePreparing);
  return serve();
});
