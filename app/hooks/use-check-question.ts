import { useEffect, useState } from "react";
import { useNavigate, useNavigation, useSearchParams } from "react-router";
import { checkSearch } from "~/components/check/check-search";
import { readQuestion } from "~/components/check/read-question";
import type { CheckQuestion } from "~/schemas/planning/check-answer";

/**
 * The question that the address asks. A new one counts at once; the address follows in place of the last one,
 * a moment later, and then is the only place where it stands.
 */
export function useCheckQuestion(first: CheckQuestion) {
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const isIdle = useNavigation().state === "idle";
  const [asked, setAsked] = useState<CheckQuestion | null>(null);
  const address = search.toString();

  useEffect(() => {
    setAsked((waiting) => {
      const isThere = waiting === null || sameSearch(checkSearch(waiting), address);
      return isThere || isIdle ? null : waiting;
    });
  }, [address, isIdle]);

  return {
    question: asked ?? readQuestion(search, first),
    ask(next: CheckQuestion) {
      setAsked(next);
      void navigate(`?${checkSearch(next)}`, { replace: true, preventScrollReset: true });
    },
  };
}

function sameSearch(one: string, other: string): boolean {
  return new URLSearchParams(one).toString() === new URLSearchParams(other).toString();
}
