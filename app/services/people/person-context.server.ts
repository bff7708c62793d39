import { createContext } from "react-router";
import type { CurrentPerson } from "./current-person";

/** Finds out who is asking, once a request; the first middleware sets it. */
export const personContext = createContext<() => Promise<CurrentPerson | null>>(async () => null);
