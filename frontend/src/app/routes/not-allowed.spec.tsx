import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildProject, buildSession, buildUser } from '../../testing/builders';
import { standInForHttp } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';

const server = standInForHttp();
const READ_ONLY = { edit: false, setPolicy: false, createChain: false, delete: false };

function openAsBuyer(address: string): void {
  server.current
    .on('GET /session', buildSession({ user: { ...buildUser(), roles: ['buyer'] } }))
    .on('GET /users', [])
    .on('GET /projects/project-1', buildProject({ can: READ_ONLY }));
  renderApp(address);
}

describe('a form that a buyer could not save', () => {
  it.each([
    ['/devices/new', 'You may not enter devices', /^Part number/],
    ['/projects/new', 'You may not create projects', /^Code/],
    ['/projects/project-1/chains/new', 'You may not add chains to this project', /^Name of the chain/],
  ])('is not offered at %s, saying so', async (address, title, field) => {
    openAsBuyer(address);
    expect(await screen.findByText(title)).toBeVisible();
    expect(screen.queryByLabelText(field)).not.toBeInTheDocument();
  });

  it('shows the settings of a project for information only', async () => {
    openAsBuyer('/projects/project-1/settings');
    expect(await screen.findByLabelText(/^Code/)).toBeDisabled();
    expect(screen.getByLabelText(/^Currency/)).toBeDisabled();
    for (const choice of screen.getAllByRole('radio')) expect(choice).toBeDisabled();
    expect(screen.getByText(/designers and leads change it/)).toBeVisible();
  });
});
