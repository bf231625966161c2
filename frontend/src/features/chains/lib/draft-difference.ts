import { canonicalText } from './draft-key';
import type { Draft } from './draft';

/** What differs between two drafts, in short lines, for the choice after a conflict. */
export function draftDifferences(mine: Draft, theirs: Draft): string[] {
  return [
    ...(mine.name === theirs.name ? [] : [`Name: “${mine.name}” here, “${theirs.name}” saved`]),
    ...stageDifferences(mine, theirs),
    ...specificationDifferences(mine, theirs),
  ];
}

function stageDifferences(mine: Draft, theirs: Draft): string[] {
  const lines: string[] = [];
  const theirsById = new Map(theirs.stages.map((stage, index) => [stage.id, { stage, index }]));
  const mineIds = new Set(mine.stages.map((stage) => stage.id));
  mine.stages.forEach((stage, index) => {
    const other = theirsById.get(stage.id);
    const title = `S${index + 1} ${stage.name}`;
    if (!other) lines.push(`${title}: only in yours`);
    else {
      const fields = changedFields(stage, other.stage);
      if (fields.length > 0) lines.push(`${title}: ${fields.join(', ')} changed`);
    }
  });
  theirs.stages.forEach((stage, index) => {
    if (!mineIds.has(stage.id)) lines.push(`S${index + 1} ${stage.name}: only in the saved version`);
  });
  const order = (draft: Draft) => draft.stages.map((stage) => stage.id).join();
  if (lines.length === 0 && order(mine) !== order(theirs)) lines.push('The order of the stages differs');
  return lines;
}

function specificationDifferences(mine: Draft, theirs: Draft): string[] {
  const fields = changedFields(mine.specification, theirs.specification);
  return fields.length === 0 ? [] : [`Specification: ${fields.join(', ')} changed`];
}

const FIELD_NAMES: Readonly<Record<string, string>> = {
  deviceId: 'device',
  wantedGain: 'wanted gain',
  feedbackOhm: 'Rf',
  gainOhm: 'Rg',
  feedbackF: 'Cf',
  strayF: 'stray capacitance',
  terminationOhm: 'termination',
  couplingF: 'coupling',
  biasOhm: 'bias resistor',
  isolationOhm: 'isolation',
  gainBasis: 'gain basis',
  ambientK: 'ambient temperature',
  seriesOhm: 'series resistor',
  seriesF: 'series capacitor',
  shuntOhm: 'shunt resistor',
  shuntF: 'shunt capacitor',
};

function changedFields(a: object, b: object): string[] {
  const left = a as Record<string, unknown>;
  const right = b as Record<string, unknown>;
  return [...new Set([...Object.keys(left), ...Object.keys(right)])]
    .filter((key) => canonicalText(left[key]) !== canonicalText(right[key]))
    .map((key) => FIELD_NAMES[key] ?? key);
}
