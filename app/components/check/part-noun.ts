/** `Bearing, fan hub, sealed` to `bearing`: what a sentence calls a part. `GRP panel, left` keeps its capitals. */
export function partNoun(description: string): string {
  const [name] = description.split(",");
  const plain = /^\p{Lu}\p{Ll}/u.test(name) && !/^\p{Lu}\p{Ll}+\s\p{Lu}/u.test(name);
  return plain ? name.charAt(0).toLowerCase() + name.slice(1) : name;
}

/** Several of what `partNoun` names: `bearing` to `bearings`, `assembly` to `assemblies`. */
export function pluralOf(noun: string): string {
  if (/[^aeiou]y$/.test(noun)) return `${noun.slice(0, -1)}ies`;
  return /(s|x|z|ch|sh)$/.test(noun) ? `${noun}es` : `${noun}s`;
}
