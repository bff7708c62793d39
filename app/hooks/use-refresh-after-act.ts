import { useQueryClient } from "@tanstack/react-query";
import { useEffect, useRef } from "react";
import { useNavigation } from "react-router";

/** Asks all shown answers again once a form has been sent and answered. */
export function useRefreshAfterAct() {
  const client = useQueryClient();
  const { state, formMethod } = useNavigation();
  const acting = useRef(false);
  useEffect(() => {
    if (formMethod && formMethod !== "GET") acting.current = true;
    if (state === "idle" && acting.current) {
      acting.current = false;
      void client.invalidateQueries();
    }
  }, [client, state, formMethod]);
}
