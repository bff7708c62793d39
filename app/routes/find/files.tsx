import { FilesPage } from "~/components/files/files-page";
import { FindPlaces } from "~/components/find/find-places";
import { getFileKinds } from "~/services/imports/get-file-kinds.server";
import { guardedLoader } from "~/services/people/guard.server";
import type { Route } from "./+types/files";

export const meta: Route.MetaFunction = () => [{ title: "Files in and out · Cotterpin" }];

export const loader = guardedLoader("look", (_args: Route.LoaderArgs, person) => getFileKinds(person));

export default function Files({ loaderData }: Route.ComponentProps) {
  return (
    <>
      <FindPlaces />
      <FilesPage kinds={loaderData} />
    </>
  );
}
