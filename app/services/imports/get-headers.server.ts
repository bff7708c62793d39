import { Setting } from "~/db/models/system/setting";
import type { ImportKindName } from "~/schemas/imports/import-kind-name";
import type { HeaderMap } from "~/utils/csv/map-headers";

export function settingName(kind: ImportKindName): string {
  return `import-headers-${kind}`;
}

/** How headers of this kind of file were matched by hand before; empty where they never were. */
export async function getHeaders(kind: ImportKindName): Promise<HeaderMap> {
  const setting = await Setting.findByPk(settingName(kind));
  return (setting?.value as HeaderMap | undefined) ?? {};
}
