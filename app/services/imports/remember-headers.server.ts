import { Setting } from "~/db/models/system/setting";
import type { ImportKindName } from "~/schemas/imports/import-kind-name";
import type { HeaderMap } from "~/utils/csv/map-headers";
import { getHeaders, settingName } from "./get-headers.server";

/** Keeps how the headers of a kind of file were matched, for the next file like it. */
export async function rememberHeaders(kind: ImportKindName, headers: HeaderMap): Promise<void> {
  const known = await getHeaders(kind);
  await Setting.upsert({ name: settingName(kind), value: { ...known, ...headers } });
}
