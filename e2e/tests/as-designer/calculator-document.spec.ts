import { chmodSync, copyFileSync, mkdirSync } from 'node:fs';
import { delimiter, join, resolve } from 'node:path';
import { commandIn, runCommand } from '../../fixtures/document-commands';
import { expect, test } from '../../fixtures/test';
import { Api, newRequest } from '../../fixtures/api';
import { ADMINISTRATOR } from '../../testdata/people';

test.use({ role: null });

/** An own curl in front of the path only where the machine has none. */
function pathWithCurl(folder: string): string {
  const tools = join(folder, 'tools');
  mkdirSync(tools);
  copyFileSync(resolve(__dirname, '../../fixtures/curl-stand-in.mjs'), join(tools, 'curl'));
  chmodSync(join(tools, 'curl'), 0o755);
  return `${process.env.PATH}${delimiter}${tools}`;
}

test('the commands of docs/calculator.md run as they are printed', async ({ emptyServer }, testInfo) => {
  const request = await newRequest(emptyServer.url);
  const { token, name, email, password } = ADMINISTRATOR;
  await new Api(request).send('POST', '/setup', { token, name, email, password });
  await request.dispose();

  const folder = testInfo.outputPath('shell');
  mkdirSync(folder, { recursive: true });
  const env = { BANDLEDGER: emptyServer.url, EMAIL: email, PASSWORD: password, PATH: pathWithCurl(folder) };
  await runCommand(commandIn('calculator.md', 'sign-in'), folder, env);
  const answer: unknown = JSON.parse(await runCommand(commandIn('calculator.md', 'calculation'), folder, env));

  // By hand: 10 kΩ/(950 Ω + 50 Ω) = 10, that is 20 dB from the EMF; noise gain 1 + 10 kΩ/(950 Ω + 50 Ω) = 11; 75 MHz / (11 · 7 MHz) = 0.974026, one pole and no parasitics.
  const { report } = answer as {
    report: {
      stages: { verdict: { verdict: string }; cases: Record<string, { figures: Record<string, { value: number }> }> }[];
    };
  };
  const [stage] = report.stages;
  const figures = stage?.cases.minimum?.figures;
  expect(figures?.idealGain?.value).toBeCloseTo(20, 9);
  expect(figures?.noiseGain?.value).toBeCloseTo(11, 9);
  expect(figures?.headroom?.value).toBeCloseTo(75 / 77, 9);
  expect(stage?.verdict.verdict).toBe('over');
});
