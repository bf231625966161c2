import { screen, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildDevice, buildSession } from '../../testing/builders';
import { standInForHttp } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';
import { setupUser } from '../../testing/user';

const server = standInForHttp();

describe('the device list', () => {
  it('says how to begin when the library is empty', async () => {
    server.current.on('GET /session', buildSession()).on('GET /devices', { items: [], total: 0 });
    renderApp('/devices');
    expect(await screen.findByText('The library is empty')).toBeVisible();
    expect(screen.getByRole('link', { name: 'Enter a device' })).toHaveAttribute('href', '/devices/new');
  });

  it('keeps its filters in the address and asks the server for them', async () => {
    const user = setupUser();
    server.current.on('GET /session', buildSession()).on('GET /devices', { items: [buildDevice()], total: 1 });
    const app = renderApp('/devices?grade=rf');
    await user.type(await screen.findByLabelText('GBW at least'), '231');
    await waitFor(() => expect(app.address()).toBe('/devices?grade=rf&minimumGbwHz=231000000'));
    await user.click(screen.getByRole('button', { name: /Lowest price/ }));
    await waitFor(() =>
      expect(server.current.sent('GET', '/devices').at(-1)?.params).toMatchObject({
        grade: 'rf',
        minimumGbwHz: '231000000',
        sort: 'price',
        order: 'asc',
      }),
    );
    expect(screen.getByRole('columnheader', { name: /Lowest price/ })).toHaveAttribute('aria-sort', 'ascending');
  });

  it('offers to take the filters off when nothing matches', async () => {
    const user = setupUser();
    server.current.on('GET /session', buildSession()).on('GET /devices', { items: [], total: 0 });
    const app = renderApp('/devices?search=none');
    await screen.findByText('No device matches these filters');
    await user.click(screen.getAllByRole('button', { name: 'Clear filters' })[0]!);
    await waitFor(() => expect(app.address()).toBe('/devices'));
  });

  it('finds by part number a moment after typing', async () => {
    const user = setupUser();
    server.current.on('GET /session', buildSession()).on('GET /devices', { items: [buildDevice()], total: 1 });
    const app = renderApp('/devices');
    await user.type(await screen.findByLabelText('Part number or maker'), 'G07');
    await waitFor(() => expect(app.address()).toBe('/devices?search=G07'));
  });
});
