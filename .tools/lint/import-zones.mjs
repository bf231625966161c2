// Who may import whom, as zones for import-x/no-restricted-paths. The list of features is read from the folders, so
// that a new feature is covered from its first file on.
import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

/** A backend feature may use those before it in this list. One entry may hold several features of equal rank. */
export const BACKEND_FEATURE_ORDER = [
  ['audit'],
  ['mail'],
  ['settings'],
  ['jobs'],
  ['users'],
  ['auth'],
  ['projects'],
  ['files'],
  ['devices'],
  ['quotes'],
  ['calculator'],
  ['chains'],
  ['studies', 'reviews'],
  ['desk', 'reports'],
  ['health'],
];

const BACKEND_SHARED = ['common', 'config', 'database'];
const ENGINE = 'backend/src/calculator/engine';
/** What any controller or module needs from signing in: decorators and the type of the signed-in user. */
const AUTH_DECORATORS = ['**/auth/decorators/**', '**/auth/*.decorator.ts'];

const foldersIn = (root, folder) =>
  existsSync(join(root, folder))
    ? readdirSync(join(root, folder), { withFileTypes: true })
        .filter((entry) => entry.isDirectory())
        .map((entry) => entry.name)
        .sort()
    : [];

export const backendFeatures = (root) =>
  foldersIn(root, 'backend/src').filter((name) => !BACKEND_SHARED.includes(name));

export const frontendFeatures = (root) => foldersIn(root, 'frontend/src/features');

/** Rank in the order; a folder that nobody has placed yet comes last, so nothing may use it. */
const rankOf = (feature) => {
  const rank = BACKEND_FEATURE_ORDER.findIndex((entry) => entry.includes(feature));
  return rank < 0 ? BACKEND_FEATURE_ORDER.length : rank;
};

function orderZones(features) {
  return features.flatMap((feature) => {
    const later = features.filter((other) => other !== feature && rankOf(other) >= rankOf(feature));
    const zones = [];
    const blocked = later.filter((other) => other !== 'calculator');
    if (blocked.length > 0)
      zones.push({
        target: `backend/src/${feature}`,
        from: blocked.map((other) => `backend/src/${other}/**/*`),
        except: AUTH_DECORATORS,
        message: `${feature} may use only the features before it (backend feature order).`,
      });
    // The calculator's Nest face has a place in the order; the engine below it has its own zone.
    if (later.includes('calculator'))
      zones.push({
        target: `backend/src/${feature}`,
        from: ['backend/src/calculator/*', 'backend/src/calculator/!(engine)/**/*'],
        message: `${feature} may use only the features before it (backend feature order).`,
      });
    return zones;
  });
}

function kindZones(features) {
  return features.flatMap((feature) => {
    const own = `backend/src/${feature}`;
    const others = features.filter((other) => other !== feature);
    const inOthers = (pattern) => others.map((other) => `backend/src/${other}/${pattern}`);
    const zones = [
      {
        target: `${own}/**/*.controller.ts`,
        from: [`${own}/**/models/**/*`, 'backend/src/*/models/**/*', `${ENGINE}/**/*`, ...inOthers('**/*.service.ts')],
        message: 'A controller uses its own service and DTOs, common and the sign-in decorators.',
      },
      {
        target: [`${own}/**/*.policy.ts`, `${own}/**/*.presenter.ts`],
        from: ['backend/src/**/*.service.ts', 'backend/src/**/*.controller.ts', 'backend/src/**/*.module.ts'],
        message: 'Policies and presenters are pure: no injectables.',
      },
    ];
    if (others.length > 0) {
      zones.push({
        target: `${own}/**/*.service.ts`,
        from: [...inOthers('**/models/**/*'), ...inOthers('**/dto/**/*')],
        message: "A service reaches another feature through that feature's service, not its models or DTOs.",
      });
    }
    return zones;
  });
}

export function backendZones(root) {
  const features = backendFeatures(root);
  return [
    {
      target: ENGINE,
      from: ['backend/src/!(calculator)', 'backend/src/!(calculator)/**/*', 'backend/src/calculator/!(engine)'],
      message: 'The engine imports nothing outside itself.',
    },
    {
      target: [
        'backend/src/*.ts',
        'backend/test',
        'backend/src/!(calculator)/**/*',
        'backend/src/calculator/!(engine)',
        'backend/src/calculator/!(engine)/**/*',
      ],
      from: [`${ENGINE}/**/*`],
      except: ['**/calculator/engine/index.ts'],
      message: "index.ts is the engine's only door.",
    },
    {
      target: [
        'backend/src/common',
        'backend/src/config',
        'backend/src/database/!(demo)',
        'backend/src/database/!(demo)/**/*',
      ],
      from: features.map((feature) => `backend/src/${feature}/**/*`),
      except: AUTH_DECORATORS,
      message: 'common, config and database know no feature.',
    },
    {
      target: 'backend/src/config',
      from: ['backend/src/common/**/*', 'backend/src/database/**/*'],
      message: 'config stands below everything.',
    },
    ...orderZones(features),
    ...kindZones(features),
  ].filter((zone) => zone.from.length > 0);
}

export function frontendZones(root) {
  const features = frontendFeatures(root);
  const src = 'frontend/src';
  return [
    {
      target: [`${src}/components`, `${src}/lib`, `${src}/api`],
      from: [`${src}/features`, `${src}/app`],
      message: 'Shared code knows neither features nor the app.',
    },
    { target: `${src}/lib`, from: `${src}/components`, message: 'lib holds pure helpers and stands lowest.' },
    {
      target: `${src}/lib`,
      from: `${src}/api`,
      except: ['./types.ts', './types', './schema.d.ts'],
      message: 'lib knows the shapes of the API, not its client.',
    },
    { target: `${src}/api`, from: `${src}/components`, message: 'api stands below components.' },
    { target: `${src}/components`, from: `${src}/api/client.ts`, message: 'Shared components fetch nothing.' },
    { target: `${src}/features`, from: `${src}/app`, message: 'A feature does not know the app that mounts it.' },
    ...features
      .filter(() => features.length > 1)
      .map((feature) => ({
        target: `${src}/features/${feature}`,
        from: features.filter((other) => other !== feature).map((other) => `${src}/features/${other}`),
        message: 'A feature does not import another; share through components, lib or api.',
      })),
  ];
}

/** Product code of the one side never reaches the other; browser tests never reach product code. */
export const borderZones = [
  { target: 'backend', from: ['frontend', 'e2e'], message: 'The backend imports nothing of the frontend or e2e.' },
  { target: 'frontend', from: ['backend', 'e2e'], message: 'The frontend knows the API only by openapi.json.' },
  { target: 'e2e', from: ['backend', 'frontend'], message: 'Browser tests act through the screen and the API only.' },
  { target: 'e2e/pages', from: ['e2e/tests', 'e2e/fixtures'], message: 'Page models stand below fixtures and tests.' },
];

export const importZones = (root) => [...backendZones(root), ...frontendZones(root), ...borderZones];
