const KEYS = [
  'minimum',
  'maximum',
  'exclusiveMinimum',
  'exclusiveMaximum',
  'minLength',
  'maxLength',
  'minItems',
  'maxItems',
];

function limitsOf(property) {
  const limits = {};
  for (const key of KEYS) if (typeof property[key] === 'number') limits[key] = property[key];
  if (typeof property['x-unit'] === 'string') limits.unit = property['x-unit'];
  return limits;
}

/** TypeScript source with the limits of every schema's properties, schemas and properties in alphabetical order. */
export function limitsSource(document) {
  const schemas = document.components?.schemas ?? {};
  const lines = [];
  for (const name of Object.keys(schemas).sort()) {
    const properties = Object.entries(schemas[name].properties ?? {})
      .map(([property, schema]) => [property, limitsOf(schema)])
      .filter(([, limits]) => Object.keys(limits).length > 0)
      .sort(([left], [right]) => (left < right ? -1 : 1));
    if (properties.length === 0) continue;
    lines.push(`  ${name}: {`);
    for (const [property, limits] of properties)
      lines.push(`    ${JSON.stringify(property)}: ${JSON.stringify(limits)},`);
    lines.push('  },');
  }
  return `// Generated from backend/openapi.json by \`npm run generate:api\`. Do not edit.\nexport const API_LIMITS = {\n${lines.join('\n')}\n} as const;\n`;
}
