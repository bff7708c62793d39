import { publicLoader } from "~/services/people/guard.server";

export const loader = publicLoader(() => null);

export default function Page() {
  return <main id="page" />;
}
