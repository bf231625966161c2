import type { Stage } from '../calculator/engine';
import { STAGE_SCHEMA_VERSION } from './models/stage.model';
import type { StageParameters, StageRow } from './models/stage.model';

export interface StageColumns {
  readonly optionId: string;
  readonly id: string;
  readonly position: number;
  readonly kind: Stage['kind'];
  readonly name: string;
  readonly deviceId: string | null;
  readonly parameters: StageParameters;
}

/** A stage as its row: what every kind has in columns, the parts in `parameters`. */
export function stageColumns(optionId: string, stage: Stage, position: number): StageColumns {
  const { id, name, kind, ...rest } = stage;
  const { deviceId = null, ...parts } = rest as { deviceId?: string };
  const parameters = { ...parts, schemaVersion: STAGE_SCHEMA_VERSION } as StageParameters;
  return { optionId, id, position, kind, name, deviceId, parameters };
}

/** The stage of a row as the calculator takes it. */
export function stageOf(row: Pick<StageRow, 'id' | 'kind' | 'name' | 'deviceId' | 'parameters'>): Stage {
  const { schemaVersion, ...parts } = row.parameters;
  if (schemaVersion !== STAGE_SCHEMA_VERSION)
    throw new Error(`Stage ${row.id} has an unknown schema ${schemaVersion}.`);
  const device = row.deviceId === null ? {} : { deviceId: row.deviceId };
  return { id: row.id, kind: row.kind, name: row.name, ...device, ...parts } as unknown as Stage;
}

export function deviceIdsOf(stages: readonly Stage[]): string[] {
  return [...new Set(stages.flatMap((stage) => ('deviceId' in stage ? [stage.deviceId] : [])))];
}
