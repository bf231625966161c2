// `npm run dev`: the backend recompiles and restarts, the frontend reloads, both until Ctrl-C.
import { spawn } from 'node:child_process';
import { launch } from './lib/launch-error.mjs';
import { fromRoot, root } from './lib/paths.mjs';
import { checkFolders, checkNode, install } from './lib/prepare.mjs';
import { readSettings } from './lib/settings.mjs';

await launch(async () => {
  checkNode();
  const { port, dataFolder } = readSettings();
  checkFolders(dataFolder);
  await install((text) => console.log(`Bandledger: ${text} …`));
  const child = spawn(
    process.execPath,
    [
      fromRoot('node_modules/concurrently/dist/bin/concurrently.js'),
      '--kill-others',
      '--names',
      'backend,frontend',
      'npm run dev -w backend',
      'npm run dev -w frontend',
    ],
    // Vite hands /api on to wherever the backend listens.
    { cwd: root, stdio: 'inherit', env: { ...process.env, BACKEND_URL: `http://127.0.0.1:${port}` } },
  );
  // Ctrl-C reaches the children by themselves: wait for them.
  process.on('SIGINT', () => {});
  process.on('SIGTERM', () => child.kill('SIGTERM'));
  await new Promise((resolve) => child.on('exit', resolve));
  return 0;
});
