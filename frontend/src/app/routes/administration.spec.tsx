import { screen, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildSession, buildUser } from '../../testing/builders';
import { Refusal, standInForHttp } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';
import { fill, setupUser } from '../../testing/user';

const server = standInForHttp();
const teo = {
  id: 'user-2',
  name: 'Teo Marsh',
  email: 'teo@example.test',
  roles: ['designer'],
  active: true,
  hasPassword: true,
  version: 4,
  can: { edit: true },
};

function open(): void {
  server.current.on('GET /session', buildSession({ user: buildUser({ roles: ['admin'] }) })).on('GET /users', [teo]);
  renderApp('/administration');
}

describe('administration of people', () => {
  it('creates a person and shows the one-time link once', async () => {
    const user = setupUser();
    open();
    server.current.on('POST /users', {
      user: { ...teo, id: 'user-3', name: 'Anouk Deles' },
      link: { path: '/welcome/abc', expiresAt: '2026-01-08T10:00:00.000Z' },
    });
    await user.click(await screen.findByRole('button', { name: 'Invite a person' }));
    await fill(user, screen.getByLabelText(/^Name/), 'Anouk Deles');
    await fill(user, screen.getByLabelText(/^E-mail address/), 'anouk@example.test');
    await user.click(screen.getByRole('checkbox', { name: /^designer/ }));
    await user.click(screen.getByRole('checkbox', { name: /^buyer/ }));
    await user.click(screen.getByRole('button', { name: 'Create and show the one-time link' }));
    expect(await screen.findByLabelText('One-time link')).toHaveValue(`${window.location.origin}/welcome/abc`);
    expect(server.current.sent('POST', '/users')[0]?.body).toEqual({
      name: 'Anouk Deles',
      email: 'anouk@example.test',
      roles: ['buyer'],
    });
  });

  it('says why the last administrator stays', async () => {
    const user = setupUser();
    open();
    server.current.on(
      'PATCH /users/user-2',
      new Refusal(409, { code: 'last_admin', message: 'Somebody has to administrate.' }),
    );
    await user.click(await screen.findByRole('button', { name: 'Deactivate Teo Marsh' }));
    await user.click(await screen.findByRole('button', { name: 'Deactivate' }));
    expect(await screen.findByText('Somebody has to administrate.')).toBeInTheDocument();
    await waitFor(() =>
      expect(server.current.sent('PATCH', '/users/user-2')[0]?.body).toEqual({ version: 4, active: false }),
    );
  });

  it('is closed to others', async () => {
    server.current.on('GET /session', buildSession());
    renderApp('/administration');
    expect(await screen.findByText('Only administrators manage people')).toBeVisible();
    expect(server.current.sent('GET', '/users')).toHaveLength(0);
  });
});
