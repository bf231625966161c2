import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildSession, buildUser } from '../../testing/builders';
import { Refusal, standInForHttp } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';
import { setupUser } from '../../testing/user';

const server = standInForHttp();
const signedOut = buildSession({ user: null });

describe('signing in', () => {
  it('sends whoever is signed out to the form and back to where they wanted to go', async () => {
    const user = setupUser();
    let session = signedOut;
    server.current
      .on('GET /session', () => session)
      .on('POST /session', () => {
        session = buildSession();
        return { user: buildUser() };
      })
      .on('GET /projects', []);
    const app = renderApp('/projects');
    await user.type(await screen.findByLabelText('E-mail address'), ' ilse@example.test ');
    expect(app.address()).toBe('/sign-in?from=%2Fprojects');
    await user.type(screen.getByLabelText('Password'), 'secret words');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));

    expect(await screen.findByText('No project yet')).toBeVisible();
    expect(app.address()).toBe('/projects');
    expect(server.current.sent('POST', '/session')[0]).toMatchObject({
      body: { email: 'ilse@example.test', password: 'secret words' },
      headers: { 'X-Requested-With': 'bandledger' },
    });
  });

  it('says the same for every wrong pair and keeps the address', async () => {
    const user = setupUser();
    server.current
      .on('GET /session', signedOut)
      .on('POST /session', new Refusal(401, { code: 'invalid_credentials', message: 'No.' }));
    renderApp('/sign-in');
    await user.type(await screen.findByLabelText('E-mail address'), 'ilse@example.test');
    await user.type(screen.getByLabelText('Password'), 'wrong');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));

    expect(await screen.findByRole('alert')).toHaveTextContent('do not match an active account');
    expect(screen.getByLabelText('E-mail address')).toHaveValue('ilse@example.test');
  });

  it('offers the demo people only in the demo', async () => {
    const demoAccounts = [{ userId: 'user-1', name: 'Ilse Varga', roles: ['designer'], title: 'plans the receiver' }];
    server.current.on('GET /session', { ...signedOut, demo: true, demoAccounts });
    renderApp('/sign-in');
    expect(await screen.findByRole('button', { name: /Ilse Varga/ })).toBeVisible();
  });

  it('never follows an address of another site', async () => {
    server.current
      .on('GET /session', buildSession())
      .on('GET /desk', { overChains: [], waiting: [], counts: { projects: 0, chains: 0, devices: 0 } });
    const app = renderApp('/sign-in?from=//elsewhere.test/page');
    expect(await screen.findByRole('heading', { name: 'Desk' })).toBeVisible();
    expect(app.address()).toBe('/');
  });
});
