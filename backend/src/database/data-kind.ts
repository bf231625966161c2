import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { type AppConfig, demoRefusal, isLoopback } from '../config/environment';
import { sqliteOptions } from './sqlite';
import { StartError } from './start-error';

export type DataKind = 'demo' | 'team';

const KEY = 'data_kind';

async function storedKind(sequelize: Sequelize): Promise<DataKind | null> {
  const [row] = await sequelize.query<{ demo: number }>(
    `SELECT value = json_quote('demo') AS demo FROM settings WHERE key = $key`,
    { bind: { key: KEY }, type: QueryTypes.SELECT },
  );
  if (row === undefined) return null;
  return row.demo === 1 ? 'demo' : 'team';
}

/** What an empty data folder becomes. */
function chosenKind(config: AppConfig): DataKind {
  if (config.demo !== 'auto') return config.demo === 'on' ? 'demo' : 'team';
  const reachableFromOutside = !isLoopback(config.host) || !isLoopback(new URL(config.publicUrl).hostname);
  return config.setupToken !== null || reachableFromOutside ? 'team' : 'demo';
}

function assertAgrees(config: AppConfig, stored: DataKind): void {
  if (config.demo === 'on' && stored === 'team') {
    throw new StartError(`The data folder ${config.dataDir} belongs to a real team; DEMO=on needs another DATA_DIR.`);
  }
  if (config.demo === 'off' && stored === 'demo') {
    throw new StartError(`The data folder ${config.dataDir} holds the demo; DEMO=off needs another DATA_DIR.`);
  }
  const refusal = stored === 'demo' ? demoRefusal(config) : null;
  if (refusal !== null) throw new StartError(refusal);
}

/** Demo or team: decided on the first start and remembered in the data folder from then on. */
export async function settleDataKind(file: string, config: AppConfig): Promise<DataKind> {
  const sequelize = new Sequelize(sqliteOptions(file));
  try {
    const stored = await storedKind(sequelize);
    const kind = stored ?? chosenKind(config);
    assertAgrees(config, kind);
    if (stored === null) {
      await sequelize.query(
        `INSERT INTO settings (key, value, created_at, updated_at)
         VALUES ($key, $value, datetime('now'), datetime('now'))`,
        { bind: { key: KEY, value: JSON.stringify(kind) } },
      );
    }
    return kind;
  } finally {
    await sequelize.close();
  }
}
