import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildProject, buildSession, buildUser } from '../../testing/builders';
import { Refusal, standInForHttp } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';
import { fill, setupUser } from '../../testing/user';

const server = standInForHttp();

describe('the layout', () => {
  it('asks to sign in again over the page when the session has ended, and loses nothing', async () => {
    const user = setupUser();
    server.current
      .on('GET /session', buildSession())
      .on('GET /users', [])
      .on('POST /projects', new Refusal(401, { code: 'not_signed_in', message: 'Please sign in.' }))
      .on('POST /session', { user: buildUser() });
    const app = renderApp('/projects/new');
    await fill(user, await screen.findByLabelText(/^Code/), 'PW-5');
    await fill(user, screen.getByLabelText(/^Name/), 'Thickness receiver');
    await user.click(screen.getByRole('button', { name: /Create the project/ }));

    const dialog = within(await screen.findByRole('dialog', { name: 'Your session has ended' }));
    expect(dialog.getByLabelText('E-mail address')).toHaveValue('ilse@example.test');
    await fill(user, dialog.getByLabelText('Password'), 'secret words');
    await user.click(dialog.getByRole('button', { name: 'Sign in' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(screen.getByLabelText(/^Code/)).toHaveValue('PW-5');

    server.current
      .on('POST /projects', buildProject())
      .on('GET /projects/project-1', buildProject())
      .on('GET /projects/project-1/chains', []);
    await user.click(screen.getByRole('button', { name: /Create the project/ }));
    await waitFor(() => expect(app.address()).toBe('/projects/project-1'));
  });

  it('warns before unsaved work is left', async () => {
    const user = setupUser();
    server.current.on('GET /session', buildSession()).on('GET /users', []).on('GET /devices', { items: [], total: 0 });
    const app = renderApp('/projects/new');
    await fill(user, await screen.findByLabelText(/^Code/), 'PW-5');
    await user.click(within(screen.getByRole('navigation', { name: 'Main' })).getByRole('link', { name: 'Devices' }));
    await user.click(await screen.findByRole('button', { name: 'Stay' }));
    expect(app.address()).toBe('/projects/new');
    expect(screen.getByLabelText(/^Code/)).toHaveValue('PW-5');
  });

  it('lists the shortcuts on ?, but not while somebody types', async () => {
    const user = setupUser();
    server.current.on('GET /session', buildSession()).on('GET /users', []);
    renderApp('/projects/new');
    await user.type(await screen.findByLabelText(/^Code/), '?');
    expect(screen.queryByText('This list')).not.toBeInTheDocument();
    await user.click(document.body);
    await user.keyboard('?');
    expect(await screen.findByText('This list')).toBeInTheDocument();
  });

  it('offers administration to administrators only', async () => {
    server.current
      .on('GET /session', buildSession({ user: buildUser({ roles: ['designer', 'admin'] }) }))
      .on('GET /projects', []);
    renderApp('/projects');
    const navigation = within(await screen.findByRole('navigation', { name: 'Main' }));
    expect(navigation.getAllByRole('link').map((link) => link.textContent)).toEqual([
      'Desk',
      'Projects',
      'Devices',
      'Administration',
    ]);
  });
});
