// `npm start`: checks, installs and builds what is missing, then serves everything on one port until Ctrl-C.
import { spawn } from 'node:child_process';
import { portProblem } from './lib/checks.mjs';
import { launch, LaunchError } from './lib/launch-error.mjs';
import { fromRoot, root } from './lib/paths.mjs';
import { buildAll, checkFolders, checkNode, install } from './lib/prepare.mjs';
import { killAll, killGroup } from './lib/process.mjs';
import { readSettings } from './lib/settings.mjs';

const say = (text) => console.log(`Bandledger: ${text} …`);

/** Ctrl-C reaches npm and us; the server runs in its own group and hears of it once, from us. */
function serve() {
  return new Promise((resolve) => {
    const server = spawn(process.execPath, [fromRoot('backend/dist/main.js')], {
      cwd: root,
      detached: true,
      stdio: 'inherit',
    });
    let asked = 0;
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
      process.on(signal, () => {
        asked += 1;
        killGroup(server, asked > 1 ? 'SIGKILL' : signal === 'SIGHUP' ? 'SIGTERM' : signal);
      });
    }
    server.on('exit', (code) => resolve(asked > 0 ? 0 : (code ?? 1)));
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
