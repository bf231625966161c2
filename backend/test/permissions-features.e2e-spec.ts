import { canDeleteOption, canEditChain } from '../src/chains/chain.policy';
import type { Role } from '../src/common/role';
import {
  canCreateDevice,
  canDeleteDevice,
  canEditDevice,
  canEditQuote,
  canVerifyDevice,
} from '../src/devices/device.policy';
import {
  canCreateChain,
  canCreateProject,
  canDeleteProject,
  canEditProject,
  canSeeProject,
  canSetPolicy,
} from '../src/projects/project.policy';
import type { ProjectAccess } from '../src/projects/project.policy';
import { canSetQuote } from '../src/quotes/quote.policy';
import { TestApp } from './create-test-app';
import { readPermissions } from './permissions-table';

const ME = '3f3c7a4e-58a9-4e0e-8f5e-6c1c5b1d2a10';
const OTHER = '3f3c7a4e-58a9-4e0e-8f5e-6c1c5b1d2a11';

interface Person {
  readonly id: string;
  readonly roles: readonly Role[];
}

type Predicate = (person: Person) => boolean;

/** The four ways to stand to a project, under the names that the page uses. */
function byAccess(action: string, predicate: (person: Person, access: ProjectAccess) => boolean) {
  const rows: Record<string, Predicate> = {};
  for (const open of [true, false]) {
    for (const member of [true, false]) {
      const key = `project.${action}_${open ? 'open' : 'closed'} (${member ? 'member' : 'not a member'})`;
      rows[key] = (person) => predicate(person, { open, member });
    }
  }
  return rows;
}

const PROJECTS: Readonly<Record<string, Predicate>> = {
  'project.create': canCreateProject,
  ...byAccess('see', (_person, access) => canSeeProject(access)),
  ...byAccess('edit', canEditProject),
  ...byAccess('set_policy', canSetPolicy),
  ...byAccess('create_chain', canCreateChain),
  ...byAccess('delete_empty', (person, access) => canDeleteProject(person, access, 0)),
};

const CHAINS: Readonly<Record<string, Predicate>> = {
  'chain.read': () => true,
  'chain.edit': canEditChain,
  'option.delete': (person) => canDeleteOption(person, 2),
  'option.delete_last': (person) => canDeleteOption(person, 1),
};

const verify = (enteredById: string, valuesEditedById: string) => (person: Person) =>
  canVerifyDevice(person, { enteredById, valuesEditedById });

const DEVICES: Readonly<Record<string, Predicate>> = {
  'device.read': () => true,
  'device.create': canCreateDevice,
  'device.edit': canEditDevice,
  'device.delete': canDeleteDevice,
  'device.verify (entered by another)': verify(OTHER, OTHER),
  'device.verify (entered it)': verify(ME, OTHER),
  'device.verify (last edited it)': verify(OTHER, ME),
  'device.edit_quote': (person) => canEditQuote(person) && canSetQuote(person),
};

describe.each([
  ['projects', PROJECTS],
  ['chains', CHAINS],
  ['devices', DEVICES],
])('docs/permissions.md, %s', (feature, predicates) => {
  const cells = readPermissions(feature);

  it('names every action there is, and no other', () => {
    expect([...new Set(cells.map(({ action }) => action))].sort()).toEqual(Object.keys(predicates).sort());
  });

  it.each(cells)('$action, $column: $allowed', ({ action, column, allowed }) => {
    expect(predicates[action]?.({ id: ME, roles: [column as Role] })).toBe(allowed);
  });
});

describe('rights add up over the roles that a person holds', () => {
  it('and never fall below what one of them allows', () => {
    const both: Person = { id: ME, roles: ['buyer', 'lead'] };
    expect(canSetPolicy(both, { open: true, member: false })).toBe(true);
    expect(canEditQuote(both)).toBe(true);
    expect(canEditChain({ id: ME, roles: ['buyer', 'admin'] } as Person)).toBe(false);
  });

  it('and a project with chains is deleted by nobody', () => {
    const everything: Person = { id: ME, roles: ['designer', 'buyer', 'lead', 'admin'] };
    expect(canDeleteProject(everything, { open: true, member: true }, 1)).toBe(false);
  });
});

describe('the routes that everybody signed in may read', () => {
  let testApp: TestApp;

  beforeAll(async () => {
    testApp = await TestApp.create();
  });
  afterAll(() => testApp.close());

  it.each(['designer', 'buyer', 'lead', 'admin'] as const)('answer a %s', async (role) => {
    const { agent } = await testApp.signedIn(role);
    for (const path of ['/api/projects', '/api/devices', '/api/desk']) await agent.get(path).expect(200);
    // Readable but not calculable: refused for its content, not for the person.
    await agent.post('/api/calculations').send({}).expect(422);
    expect(readPermissions('calculations')).toContainEqual({ action: 'calculation.run', column: role, allowed: true });
  });
});
