import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildProject, buildSession, buildSummary } from '../../testing/builders';
import { Refusal, standInForHttp } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';

const server = standInForHttp();

describe('a project', () => {
  it('shows each option with verdict, worst headroom and cost against its limit', async () => {
    server.current
      .on('GET /session', buildSession())
      .on('GET /projects/project-1', buildProject())
      .on('GET /projects/project-1/chains', [
        {
          id: 'c1',
          name: 'Receive chain',
          version: 1,
          updatedAt: '2026-01-05T10:00:00.000Z',
          specificationText: '3–7 MHz',
          summary: buildSummary(),
          options: [{ id: 'o1', name: 'Baseline', summary: buildSummary() }],
        },
      ]);
    renderApp('/projects/project-1');
    const row = await screen.findByRole('row', { name: /Baseline/ });
    expect(within(row).getByText('over')).toBeVisible();
    expect(within(row).getByText('×0.974')).toBeVisible();
    expect(within(row).getByText('S2 Gain')).toBeVisible();
    expect(within(row).getByText('8.12 USD')).toBeVisible();
    expect(within(row).getByText('9.00 USD')).toBeVisible();
  });

  it('says what to do when it has no chain', async () => {
    server.current
      .on('GET /session', buildSession())
      .on('GET /projects/project-1', buildProject())
      .on('GET /projects/project-1/chains', []);
    renderApp('/projects/project-1');
    expect(await screen.findByRole('link', { name: 'New chain' })).toHaveAttribute(
      'href',
      '/projects/project-1/chains/new',
    );
  });

  it('that is hidden looks like one that does not exist', async () => {
    server.current
      .on('GET /session', buildSession())
      .on('GET /projects/secret', new Refusal(404, { code: 'not_found', message: 'Not found.' }));
    renderApp('/projects/secret');
    expect(await screen.findByText('There is nothing at this address')).toBeVisible();
  });
});
