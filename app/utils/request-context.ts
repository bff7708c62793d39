import { createContext } from "react-router";

/** What every request carries from the first middleware on. */
export interface RequestFacts {
  /** Names the request in answers and in the log. */
  id: string;
  /** Allows the scripts and styles of this one answer. */
  nonce: string;
}

export const requestFactsContext = createContext<RequestFacts>({ id: "none", nonce: "" });
