const FNV_PRIME = 0x01000193;
const SEEDS: readonly number[] = [0x811c9dc5, 0x050c5d1f, 0x2f0b4a27, 0x6b43a9b5];

function fnv1a(text: string, seed: number): number {
  let hash = seed;
  for (let index = 0; index < text.length; index += 1) {
    hash = Math.imul(hash ^ text.charCodeAt(index), FNV_PRIME) >>> 0;
  }
  return hash;
}

/**
 * A stage id derived from another one: the same input gives the same id, so a remedy computed twice is the same remedy.
 * Not a secret and not a digest: 128 bits of FNV-1a in the form of a UUID.
 *
 * @param id id of the stage that is replaced
 * @param taken ids that the chain uses already
 * @returns a UUID (version 4 layout) that is none of `taken`
 */
export function derivedStageId(id: string, taken: ReadonlySet<string>): string {
  for (let attempt = 1; ; attempt += 1) {
    const candidate = uuidOf(`${id}/${attempt}`);
    if (!taken.has(candidate)) return candidate;
  }
}

function uuidOf(text: string): string {
  const hex = SEEDS.map((seed) => fnv1a(text, seed).toString(16).padStart(8, '0')).join('');
  const variant = ((parseInt(hex[16], 16) & 0x3) | 0x8).toString(16);
  const fields = [
    hex.slice(0, 8),
    hex.slice(8, 12),
    `4${hex.slice(13, 16)}`,
    variant + hex.slice(17, 20),
    hex.slice(20, 32),
  ];
  return fields.join('-');
}
