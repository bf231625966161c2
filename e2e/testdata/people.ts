import { SETUP_TOKEN } from '../fixtures/server';

export const ADMINISTRATOR = {
  token: SETUP_TOKEN,
  name: 'Runa Oakes',
  email: 'runa@example.org',
  password: 'a long enough password',
};

export const DESIGNER = { name: 'Teo Marsh', email: 'teo@example.org', password: 'another long password' };
