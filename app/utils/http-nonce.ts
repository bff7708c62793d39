import { createContext, useContext } from "react";

const NonceContext = createContext<string | undefined>(undefined);

export const NonceProvider = NonceContext.Provider;

/** The nonce of this answer's scripts and styles; undefined in the browser, which hides it. */
export function useNonce(): string | undefined {
  return useContext(NonceContext);
}
