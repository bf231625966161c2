import { screen, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

import { buildDevice, buildSession } from '../../testing/builders';
import { Refusal, standInForHttp } from '../../testing/http-stand-in';
import { renderApp } from '../../testing/render-app';
import { fill, setupUser } from '../../testing/user';

const server = standInForHttp();

function open(address = '/devices/new'): ReturnType<typeof renderApp> {
  server.current
    .on('GET /session', buildSession())
    .on('GET /devices/device-1', buildDevice())
    .on('GET /devices/device-1/uses', { where: [], hiddenCount: 0 });
  return renderApp(address);
}

const save = (): HTMLElement => screen.getByRole('button', { name: 'Save the device' });

describe('entering a device', () => {
  it('needs only part number and GBW, and sends nothing that was left out', async () => {
    const user = setupUser();
    const app = open();
    server.current.on('POST /devices', buildDevice());
    await fill(user, await screen.findByLabelText(/^Part number/), 'MRWG-G072');
    await fill(user, screen.getByLabelText('Gain-bandwidth product, minimum'), '75');
    await fill(user, screen.getByLabelText('Gain-bandwidth product, typical'), '0.1 GHz');
    await user.click(save());
    await waitFor(() => expect(app.address()).toBe('/devices/device-1'));
    expect(server.current.sent('POST', '/devices')[0]?.body).toEqual({
      kind: 'voltage-feedback',
      partNumber: 'MRWG-G072',
      grade: 'general-purpose',
      lifecycle: 'active',
      channels: 1,
      gainBandwidthHz: { min: 75e6, typ: 100e6 },
    });
  });

  it('asks before it sends', async () => {
    const user = setupUser();
    open();
    await screen.findByLabelText(/^Part number/);
    await user.click(save());
    expect(screen.getByText('The exact orderable part number is needed.')).toBeVisible();
    expect(screen.getByText(/at least one of min, typ, max is needed/)).toBeVisible();
    expect(server.current.sent('POST', '/devices')).toHaveLength(0);
  });

  it('keeps what cannot be read and does not send the form with it', async () => {
    const user = setupUser();
    open();
    await fill(user, await screen.findByLabelText(/^Part number/), 'MRWG-G072');
    const typical = screen.getByLabelText('Gain-bandwidth product, typical');
    await fill(user, screen.getByLabelText('Gain-bandwidth product, minimum'), '75');
    await fill(user, typical, '100 mHz');
    await user.click(save());
    expect(typical).toHaveValue('100 mHz');
    expect(screen.getByText(/“m” does not fit a frequency/)).toBeVisible();
    expect(server.current.sent('POST', '/devices')).toHaveLength(0);
  });

  it('puts a refusal of the server under its field', async () => {
    const user = setupUser();
    open();
    const fieldErrors = [{ path: 'partNumber', code: 'already_exists', message: 'This part number is there already.' }];
    server.current.on('POST /devices', new Refusal(409, { code: 'already_exists', message: 'No.', fieldErrors }));
    await fill(user, await screen.findByLabelText(/^Part number/), 'MRWG-G072');
    await fill(user, screen.getByLabelText('Gain-bandwidth product, typical'), '100');
    await user.click(save());
    expect(await screen.findByText('This part number is there already.')).toBeVisible();
    expect(screen.getByLabelText('Gain-bandwidth product, typical')).toHaveValue('100');
  });

  it('keeps the values of a kind while another is looked at', async () => {
    const user = setupUser();
    open();
    await fill(user, await screen.findByLabelText('Gain-bandwidth product, minimum'), '75');
    await user.selectOptions(screen.getByLabelText('Kind'), 'Current feedback');
    expect(screen.queryByLabelText('Gain-bandwidth product, minimum')).not.toBeInTheDocument();
    await user.selectOptions(screen.getByLabelText('Kind'), 'Voltage feedback');
    expect(screen.getByLabelText('Gain-bandwidth product, minimum')).toHaveValue('75');
  });

  it('says what a missing value leaves unknown, until it is there', async () => {
    const user = setupUser();
    open();
    const hint = await screen.findByText('Slew and full-power bandwidth are unknown.');
    await fill(user, screen.getByLabelText('Slew rate, typical'), '55');
    expect(hint).not.toBeInTheDocument();
  });

  it('starts from another device where one is duplicated', async () => {
    open('/devices/new?from=device-1');
    expect(await screen.findByLabelText(/^Part number/)).toHaveValue('MRWG-G072 copy');
    expect(screen.getByLabelText('Gain-bandwidth product, minimum')).toHaveValue('75');
  });
});
