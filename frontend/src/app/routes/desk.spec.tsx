import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildSession, buildUser, ratio } from '../../testing/builders';
import { PENDING, Refusal, standInForHttp } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';
import { setupUser } from '../../testing/user';

const server = standInForHttp();
const counts = { projects: 0, chains: 0, devices: 0 };

describe('the desk', () => {
  it('leads in one click to the chain that is over', async () => {
    server.current.on('GET /session', buildSession()).on('GET /desk', {
      overChains: [
        {
          projectId: 'p1',
          projectCode: 'PW-5',
          chainId: 'c1',
          chainName: 'Receive chain',
          optionId: 'o1',
          optionName: 'Baseline',
          lead: 'S2 spends more than it has.',
          text: 'At 7 MHz it uses 77.0 MHz.',
          worstHeadroom: ratio(0.974),
          stage: 'S2 Gain',
        },
      ],
      waiting: [],
      counts: { projects: 1, chains: 1, devices: 4 },
    });
    renderApp('/');
    const link = await screen.findByRole('link', { name: 'PW-5 · Receive chain' });
    expect(link).toHaveAttribute('href', '/projects/p1/chains/c1?option=o1');
    expect(screen.getByText('×0.974')).toBeVisible();
    expect(screen.getByText('S2 spends more than it has.')).toBeVisible();
  });

  it.each([
    [{ ...counts }, 'Start with a device', 'Enter a device'],
    [{ ...counts, devices: 2 }, 'Make a project', 'New project'],
    [{ projects: 1, chains: 0, devices: 2 }, 'Build a chain', 'Choose a project'],
  ])('says with %o what to do next: %s', async (having, title, action) => {
    server.current.on('GET /session', buildSession()).on('GET /desk', { overChains: [], waiting: [], counts: having });
    renderApp('/');
    expect(await screen.findByRole('heading', { name: title })).toBeVisible();
    expect(screen.getByRole('link', { name: action })).toBeVisible();
  });

  it('offers a buyer nothing that only designers may do', async () => {
    server.current
      .on('GET /session', buildSession({ user: buildUser({ roles: ['buyer'] }) }))
      .on('GET /desk', { overChains: [], waiting: [], counts });
    renderApp('/');
    expect(await screen.findByText('Nothing waits for you')).toBeVisible();
    expect(screen.queryByRole('link', { name: 'Enter a device' })).not.toBeInTheDocument();
  });

  it('sends an administrator without a library to the people', async () => {
    server.current
      .on('GET /session', buildSession({ user: buildUser({ roles: ['admin'] }) }))
      .on('GET /desk', { overChains: [], waiting: [], counts });
    renderApp('/');
    const invite = await screen.findByRole('link', { name: 'Invite people' });
    expect(invite).toHaveAttribute('href', '/administration');
  });

  it('shows that it is loading', async () => {
    server.current.on('GET /session', buildSession()).on('GET /desk', () => PENDING);
    renderApp('/');
    expect(await screen.findByRole('status', { name: 'Loading' })).toBeVisible();
  });

  it('keeps the bar and offers another try when the server fails', async () => {
    const user = setupUser();
    server.current.on('GET /session', buildSession()).on('GET /desk', new Refusal(500, { message: 'It failed.' }));
    renderApp('/');
    expect(await screen.findByRole('alert')).toHaveTextContent('The desk could not be loaded. It failed.');
    expect(screen.getByRole('navigation', { name: 'Main' })).toBeVisible();
    server.current.on('GET /desk', { overChains: [], waiting: [], counts });
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Start with a device')).toBeVisible();
  });
});
