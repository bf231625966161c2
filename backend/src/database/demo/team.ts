import type { DemoAccount } from '../../users/accounts.service';

/** The invented team; every name is made up. */
export const ILSE: DemoAccount = {
  id: '5b0a1c52-0f0e-4b7e-9f4a-1f5d3c6a7e01',
  name: 'Ilse Varga',
  email: 'ilse.varga@pellworth.example',
  roles: ['designer'],
  title: 'Analog designer',
};

export const TEO: DemoAccount = {
  id: '5b0a1c52-0f0e-4b7e-9f4a-1f5d3c6a7e02',
  name: 'Teo Marsh',
  email: 'teo.marsh@pellworth.example',
  roles: ['designer'],
  title: 'Analog designer, second pair of eyes',
};

export const ANOUK: DemoAccount = {
  id: '5b0a1c52-0f0e-4b7e-9f4a-1f5d3c6a7e03',
  name: 'Anouk Deles',
  email: 'anouk.deles@pellworth.example',
  roles: ['buyer'],
  title: 'Purchasing',
};

export const RAFE: DemoAccount = {
  id: '5b0a1c52-0f0e-4b7e-9f4a-1f5d3c6a7e04',
  name: 'Rafe Okonjo',
  email: 'rafe.okonjo@pellworth.example',
  roles: ['lead'],
  title: 'Hardware lead',
};

export const MIREL: DemoAccount = {
  id: '5b0a1c52-0f0e-4b7e-9f4a-1f5d3c6a7e05',
  name: 'Mirel Sandqvist',
  email: 'mirel.sandqvist@pellworth.example',
  roles: ['admin'],
  title: 'Administration',
};

export const TEAM: readonly DemoAccount[] = [ILSE, TEO, ANOUK, RAFE, MIREL];
