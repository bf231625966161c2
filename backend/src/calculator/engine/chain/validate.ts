import type { EngineIssue } from '../errors';
import { ChainInput, MAXIMUM_STAGES } from '../types';
import { IssueCollector } from './issue-collector';
import { validateDevice } from './validate-device';
import { validatePolicy, validateSpecification } from './validate-specification';
import { Front, validateStage } from './validate-stage';

/**
 * Everything that is wrong with an input; empty when it can be calculated. Never throws. No stages at all is allowed (the
 * source straight on the load).
 *
 * @example validateChain({ ...input, stages: 25 stages })[0].code // 'too_many_stages'
 */
export function validateChain(input: ChainInput): EngineIssue[] {
  const found = new IssueCollector();
  if (!hasShape(found, input)) return found.issues;
  validateSpecification(found, input.specification);
  validatePolicy(found, input.policy);
  found.required('buildQuantity', input.buildQuantity, 'count');
  input.devices.forEach((device, index) => {
    if (isThere(found, `devices.${index}`, device)) validateDevice(found, `devices.${index}`, device);
  });
  validateStages(found, input);
  return found.issues;
}

/** The parts that everything else looks into. */
function hasShape(found: IssueCollector, input: ChainInput): boolean {
  const needed: [string, unknown][] = [
    ['specification', input.specification],
    ['specification.source', input.specification?.source],
    ['specification.load', input.specification?.load],
    ['specification.band', input.specification?.band],
    ['specification.supply', input.specification?.supply],
    ['specification.requirements', input.specification?.requirements],
    ['policy', input.policy],
    ['stages', input.stages],
    ['devices', input.devices],
  ];
  for (const [path, value] of needed) {
    isThere(found, path, value);
  }
  return found.issues.length === 0;
}

function isThere(found: IssueCollector, path: string, value: unknown): boolean {
  if (typeof value === 'object' && value !== null) return true;
  found.add('required', path, 'This part of the input is missing.');
  return false;
}

function validateStages(found: IssueCollector, { stages, devices }: ChainInput): void {
  if (stages.length > MAXIMUM_STAGES) {
    found.add('too_many_stages', 'stages', `At most ${MAXIMUM_STAGES} stages; there are ${stages.length}.`);
    return;
  }
  const ids = new Set<string>();
  let front: Front = { ohm: 1, dcReturn: true };
  stages.forEach((stage, index) => {
    const path = `stages.${index}`;
    if (!isThere(found, path, stage)) return;
    if (ids.has(stage.id)) found.add('out_of_range', `${path}.id`, 'Two stages have the same id.');
    ids.add(stage.id);
    front = validateStage(found, path, stage, devices, front);
  });
}
