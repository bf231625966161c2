import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildDevice, buildSession } from '../../testing/builders';
import { Refusal, standInForHttp, type StandInRequest } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';
import { fill, setupUser } from '../../testing/user';

const server = standInForHttp();
const use = {
  project: 'PW-5 Thickness receiver',
  chain: 'Receive chain',
  option: 'Baseline',
  stage: 'S2 Gain',
  projectId: 'p1',
  chainId: 'c1',
  optionId: 'o1',
};

function open(device = buildDevice()): ReturnType<typeof renderApp> {
  server.current
    .on('GET /session', buildSession())
    .on('GET /devices/device-1', device)
    .on('GET /devices/device-1/uses', { where: [use], hiddenCount: 2 });
  return renderApp('/devices/device-1');
}

describe('a device', () => {
  it('shows its values with page, what is not given, and where it is used', async () => {
    open();
    const row = await screen.findByRole('row', { name: /Gain-bandwidth product/ });
    expect(row).toHaveTextContent('75 MHz');
    expect(row).toHaveTextContent('100 MHz');
    expect(within(row).getByText('4')).toBeVisible();
    expect(screen.getByText('Slew and full-power bandwidth are unknown.')).toBeVisible();
    expect(await screen.findByRole('link', { name: 'PW-5 Thickness receiver, Receive chain, Baseline' })).toBeVisible();
    expect(screen.getByText(/in 2 stages of projects that you cannot see/)).toBeVisible();
  });

  it('takes a quote in exact millionths', async () => {
    const user = setupUser();
    open();
    server.current.on('PUT /devices/device-1/quote', buildDevice());
    await user.click(await screen.findByRole('button', { name: 'Enter a quote' }));
    await fill(user, screen.getByLabelText('Line 1, price of one'), '1.35');
    await user.click(screen.getByRole('button', { name: 'Add a break' }));
    await fill(user, screen.getByLabelText('Line 2, from pieces'), '250');
    await fill(user, screen.getByLabelText('Line 2, price of one'), '0.0042');
    await user.click(screen.getByRole('button', { name: 'Save the quote' }));
    await waitFor(() =>
      expect(server.current.sent('PUT', '/devices/device-1/quote')[0]?.body).toEqual({
        version: 0,
        currency: 'USD',
        breaks: [
          { quantity: 1, unitPriceMicros: 1_350_000 },
          { quantity: 250, unitPriceMicros: 4_200 },
        ],
      }),
    );
  });

  it('asks before a quote that somebody else saved meanwhile is replaced', async () => {
    const user = setupUser();
    const quoteOf = (unitPriceMicros: number) => ({ currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros }] });
    open(buildDevice({ quote: quoteOf(1_000_000), quoteVersion: 4 }));
    const current = buildDevice({ quote: quoteOf(2_000_000), quoteVersion: 5 });
    const stale = new Refusal(409, { code: 'stale_version', message: 'Changed meanwhile.', current });
    server.current.on('PUT /devices/device-1/quote', ({ body }: StandInRequest) =>
      (body as { version: number }).version === 5 ? current : stale,
    );
    await user.click(await screen.findByRole('button', { name: 'Edit the quote' }));
    await fill(user, screen.getByLabelText('Line 1, price of one'), '3');
    await user.click(screen.getByRole('button', { name: 'Save the quote' }));
    await user.click(await screen.findByRole('button', { name: 'Save mine over it' }));
    await waitFor(() =>
      expect(server.current.sent('PUT', '/devices/device-1/quote').map(({ body }) => body)).toEqual([
        { version: 4, ...quoteOf(3_000_000) },
        { version: 5, ...quoteOf(3_000_000) },
      ]),
    );
  });

  it('names where it is used when it cannot be deleted', async () => {
    const user = setupUser();
    const app = open();
    server.current.on(
      'DELETE /devices/device-1',
      new Refusal(409, { code: 'in_use', message: 'It is in use.', where: [use], hiddenCount: 3 }),
    );
    await user.click(await screen.findByRole('button', { name: 'Delete' }));
    await user.click(within(await screen.findByRole('dialog')).getByRole('button', { name: 'Delete' }));
    const refusal = await screen.findByText('MRWG-G072 was not deleted');
    const dialog = within(refusal.closest<HTMLElement>('[role="dialog"]')!);
    expect(dialog.getByText(/S2 Gain/)).toBeInTheDocument();
    expect(dialog.getByText(/And in 3 stages of projects that you cannot see/)).toBeInTheDocument();
    expect(app.address()).toBe('/devices/device-1');
  });
});
