const FIELDS = "input, textarea, select, [contenteditable='true'], [role='grid'], dialog";

/** Whether what is typed there is meant for a field of its own. */
export function isField(target: EventTarget | null): boolean {
  return target instanceof Element && target.closest(FIELDS) !== null;
}
