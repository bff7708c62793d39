import { Link } from "react-router";
import { Door } from "./door";

/** A link that was used, withdrawn or too old: what to do instead. */
export function GoneLink({ kind }: { kind: "invitation" | "password" }) {
  return (
    <Door heading="This link does not work any more">
      <p className="mt-4 max-w-prose">
        It was used already, is too old, or a newer one took its place.{" "}
        {kind === "invitation"
          ? "Ask the manager to send you another."
          : "Ask for another; it comes at once."}
      </p>
      <p className="mt-8 flex flex-wrap gap-4">
        {kind === "password" && (
          <Link to="/forgotten" className="button button-main">
            Ask for another link
          </Link>
        )}
        <Link to="/sign-in" className="button">
          Sign in
        </Link>
      </p>
    </Door>
  );
}
