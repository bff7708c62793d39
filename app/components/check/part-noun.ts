/** `Bearing, fan hub, sealed` to `bearing`: what a sentence calls a part. `GRP panel, left` keeps its capitals. */
export function partNoun(description: string): string {
  const [name] = description.split(",");
  const plain = /^\p{Lu}\p{Ll}/u.test(name) && !/^\p{Lu}\p{Ll}+\s\p{Lu}/u.test(name);
  return plain ? name.charAt(0).toLowerCase() + name.slice(1) : name;
}
