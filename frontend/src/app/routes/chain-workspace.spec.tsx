import { screen, waitFor, within } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';

import type { CalculationRequest, OptionDto } from '../../api/types';
import { buildSession } from '../../testing/builders';
import { buildChain, buildOption, buildReport, buildStage } from '../../testing/chain-builders';
import { Refusal, standInForHttp, type StandInRequest } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';
import { fill, setupUser } from '../../testing/user';

const server = standInForHttp();
const ADDRESS = '/projects/project-1/chains/chain-1';

const calculate = ({ body }: StandInRequest) => ({
  report: buildReport((body as CalculationRequest).stages),
  curves: null,
  working: null,
});

function serve(option: OptionDto = buildOption()): void {
  server.current
    .on('GET /session', buildSession())
    .on('GET /chains/chain-1', buildChain())
    .on('GET /options/option-1', option)
    .on('POST /calculations', calculate)
    .on('POST /calculations/candidates', { stageId: 'stage-1', needs: [], candidates: [] });
}

const rowNames = () => screen.getAllByRole('row', { name: /^S\d/ }).map((row) => row.getAttribute('aria-label'));
const openLedger = async () => {
  renderApp(ADDRESS);
  return screen.findByRole('table', { name: 'Ledger' });
};

describe('chain workspace', () => {
  beforeEach(() => {
    localStorage.clear();
    Element.prototype.scrollIntoView = vi.fn();
  });

  it('says what breaks first and which stage it is', async () => {
    serve();
    await openLedger();
    expect(rowNames()).toEqual(['S1 Gain, over', 'S2 Driver, clear']);
    const verdict = screen.getByRole('region', { name: 'Verdict: over' });
    expect(verdict).toHaveTextContent('S1 spends more than it has.');
  });

  it('offers another try when the chain does not arrive', async () => {
    const user = setupUser();
    serve();
    server.current.on('GET /chains/chain-1', new Refusal(500, { code: 'internal', message: 'Out of order.' }));
    renderApp(ADDRESS);
    expect(await screen.findByText('Out of order.')).toBeInTheDocument();
    server.current.on('GET /chains/chain-1', buildChain());
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('table', { name: 'Ledger' })).toBeInTheDocument();
  });

  it('leads from an empty option to its first stage', async () => {
    const user = setupUser();
    serve(buildOption({ stages: [] }));
    renderApp(ADDRESS);
    await user.click(await screen.findByRole('button', { name: 'Add the first stage' }));
    await user.click(await screen.findByRole('radio', { name: /^RC section/ }));
    await user.click(screen.getByRole('button', { name: 'Add' }));
    expect(await screen.findByRole('row', { name: /^S1 RC section/ })).toBeInTheDocument();
    expect(screen.getByText('unsaved changes')).toBeInTheDocument();
  });

  it('works the resistors out of a typed gain, undoes it in one step and saves it', async () => {
    const user = setupUser();
    serve();
    const table = await openLedger();
    await user.click(within(table).getByRole('rowheader', { name: /^S1 Gain/ }));
    await fill(user, await screen.findByRole('textbox', { name: 'Wanted gain' }), '-5');
    expect(screen.getByRole('textbox', { name: 'Feedback resistor Rf' })).toHaveValue('1k');
    await user.keyboard('{Control>}z{/Control}');
    expect(screen.getByRole('textbox', { name: 'Feedback resistor Rf' })).toHaveValue('2k');
    await user.keyboard('{Control>}{Shift>}z{/Shift}{/Control}');
    server.current.on('PUT /options/option-1', ({ body }: StandInRequest) =>
      buildOption({ ...(body as OptionDto), version: 2 }),
    );
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(server.current.sent('PUT', '/options/option-1')).toHaveLength(1));
    expect(server.current.sent('PUT', '/options/option-1')[0]?.body).toMatchObject({
      version: 1,
      stages: [{ wantedGain: -5, feedbackOhm: 1000, gainOhm: 200 }, { id: 'stage-2' }],
    });
    await waitFor(() => expect(screen.queryByText('unsaved changes')).not.toBeInTheDocument());
  });

  it('keeps the last figures and says at the field what was refused', async () => {
    const user = setupUser();
    serve();
    const table = await openLedger();
    await user.click(within(table).getByRole('rowheader', { name: /^S1 Gain/ }));
    const message = 'A feedback resistor is needed.';
    server.current.on(
      'POST /calculations',
      new Refusal(422, {
        code: 'invalid',
        message: 'Some fields cannot be accepted.',
        fieldErrors: [{ path: 'stages.0.feedbackOhm', code: 'feedback_resistor_missing', message }],
      }),
    );
    await fill(user, await screen.findByRole('textbox', { name: 'Feedback resistor Rf' }), '0');
    await waitFor(() => expect(screen.getByRole('textbox', { name: 'Feedback resistor Rf' })).toBeInvalid());
    expect(screen.getByRole('textbox', { name: 'Feedback resistor Rf' })).toHaveAccessibleDescription(message);
    expect(rowNames()).toEqual(['S1 Gain, over', 'S2 Driver, clear']);
  });

  it('walks, moves and removes by keyboard', async () => {
    const user = setupUser();
    serve();
    await openLedger();
    screen.getByRole('row', { name: /^S1 Gain/ }).focus();
    await user.keyboard('{ArrowDown}');
    expect(screen.getByRole('row', { name: /^S2 Driver/ })).toHaveFocus();
    await user.keyboard('{Alt>}{ArrowUp}{/Alt}');
    await waitFor(() => expect(screen.getByRole('row', { name: /^S1 Driver/ })).toHaveFocus());
    await user.keyboard('{Delete}');
    expect(await screen.findByText(/^S1 Driver is removed/)).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Put it back' }));
    expect(await screen.findByRole('row', { name: /^S1 Driver/ })).toBeInTheDocument();
  });

  it('brings unsaved changes back after a reload, and discards them when told to', async () => {
    const user = setupUser();
    serve();
    const first = renderApp(ADDRESS);
    screen.getByRole('status', { name: 'Loading' });
    (await screen.findByRole('row', { name: /^S1 Gain/ })).focus();
    await user.keyboard('{Delete}');
    await waitFor(() => expect(localStorage).toHaveLength(1));
    first.unmount();
    renderApp(ADDRESS);
    expect(await screen.findByText(/^Your unsaved changes of .* are back/)).toBeInTheDocument();
    expect(await screen.findByRole('row', { name: /^S1 Driver/ })).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Discard' }));
    expect(await screen.findByRole('row', { name: /^S1 Gain/ })).toBeInTheDocument();
    expect(localStorage).toHaveLength(0);
  });

  it('lets the person choose when somebody else saved in between', async () => {
    const user = setupUser();
    serve();
    await openLedger();
    screen.getByRole('row', { name: /^S2 Driver/ }).focus();
    await user.keyboard('{Delete}');
    const theirs = buildOption({ version: 4, stages: [buildStage({ name: 'Theirs' })] });
    server.current.on('PUT /options/option-1', ({ body }: StandInRequest) =>
      (body as OptionDto).version === 4
        ? buildOption({ ...(body as OptionDto), version: 5 })
        : new Refusal(409, { code: 'stale_version', message: 'Changed meanwhile.', current: theirs }),
    );
    await user.keyboard('{Control>}s{/Control}');
    const dialog = await screen.findByRole('dialog');
    expect(within(dialog).getByText('S1 Gain: name changed')).toBeInTheDocument();
    await user.click(within(dialog).getByRole('button', { name: 'Save mine over it' }));
    await waitFor(() => expect(server.current.sent('PUT', '/options/option-1')).toHaveLength(2));
    expect(server.current.sent('PUT', '/options/option-1')[1]?.body).toMatchObject({
      version: 4,
      stages: [{ name: 'Gain' }],
    });
    await waitFor(() => expect(screen.queryByText('unsaved changes')).not.toBeInTheDocument());
  });

  it('only shows to those who may not edit', async () => {
    const user = setupUser();
    serve(buildOption({ can: { edit: false, delete: false } }));
    const table = await openLedger();
    expect(screen.queryByRole('button', { name: 'Save' })).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Add a stage' })).not.toBeInTheDocument();
    await user.click(within(table).getByRole('rowheader', { name: /^S1 Gain/ }));
    expect(await screen.findByRole('textbox', { name: 'Wanted gain' })).toBeDisabled();
  });
});
