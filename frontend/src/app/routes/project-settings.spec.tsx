import { screen, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildProject, buildSession, buildUser } from '../../testing/builders';
import { Refusal, standInForHttp } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';
import { fill, setupUser } from '../../testing/user';

const server = standInForHttp();

function open(project = buildProject()): ReturnType<typeof renderApp> {
  server.current
    .on('GET /session', buildSession({ user: buildUser({ roles: ['lead'] }) }))
    .on('GET /projects/project-1', project)
    .on('GET /projects/project-1/chains', [])
    .on('GET /users', []);
  return renderApp('/projects/project-1/settings');
}

describe('project settings', () => {
  it('saves with the version that was read and goes back to the project', async () => {
    const user = setupUser();
    const app = open();
    server.current.on('PATCH /projects/project-1', buildProject({ version: 2, name: 'Receiver' }));
    const name = await screen.findByLabelText(/^Name/);
    await user.clear(name);
    await fill(user, name, 'Receiver');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(app.address()).toBe('/projects/project-1'));
    const sent = server.current.sent('PATCH', '/projects/project-1')[0]?.body;
    expect(sent).toMatchObject({ version: 1, name: 'Receiver' });
    expect(sent).not.toHaveProperty('policy');
  });

  it('lets the person choose when somebody else saved meanwhile', async () => {
    const user = setupUser();
    open();
    const current = buildProject({ version: 5, name: 'Theirs' });
    server.current.on(
      'PATCH /projects/project-1',
      new Refusal(409, { code: 'stale_version', message: 'Changed meanwhile.', current }),
    );
    await user.type(await screen.findByLabelText(/^Name/), ' mine');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await screen.findByText('This project was changed meanwhile');
    server.current.on('PATCH /projects/project-1', buildProject({ version: 6 }));
    await user.click(screen.getByRole('button', { name: 'Save mine over it' }));
    await waitFor(() => expect(server.current.sent('PATCH', '/projects/project-1')).toHaveLength(2));
    expect(server.current.sent('PATCH', '/projects/project-1')[1]?.body).toMatchObject({
      version: 5,
      name: 'Thickness receiver mine',
    });
  });

  it('shows a refused field under that field and keeps what was typed', async () => {
    const user = setupUser();
    open();
    const fieldErrors = [{ path: 'code', code: 'already_exists', message: 'Another project has this code.' }];
    server.current.on(
      'PATCH /projects/project-1',
      new Refusal(409, { code: 'already_exists', message: 'x', fieldErrors }),
    );
    const code = await screen.findByLabelText(/^Code/);
    await user.clear(code);
    await fill(user, code, 'CT-1');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() => expect(code).toHaveAccessibleDescription('Another project has this code.'));
    expect(code).toHaveValue('CT-1');
  });

  it('sets margins for leads within their limits only', async () => {
    const user = setupUser();
    open(buildProject({ can: { edit: true, setPolicy: true, createChain: true, delete: false } }));
    server.current.on('PATCH /projects/project-1', buildProject({ version: 2 }));
    const margin = await screen.findByLabelText('Noise density, power, cost');
    await user.clear(margin);
    await fill(user, margin, '120');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    expect(margin).toHaveAccessibleDescription('Must be at most 99 %.');
    expect(server.current.sent('PATCH', '/projects/project-1')).toHaveLength(0);
    await user.clear(margin);
    await fill(user, margin, '25 %');
    await user.click(screen.getByRole('button', { name: 'Save' }));
    await waitFor(() =>
      expect(server.current.sent('PATCH', '/projects/project-1')[0]?.body).toMatchObject({
        policy: { budgetMargin: 0.25, headroomTarget: 3 },
      }),
    );
  });
});
