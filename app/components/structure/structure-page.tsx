import { Form, Link, useSubmit } from "react-router";
import { Cautions } from "~/components/check/cautions";
import { FindPlaces } from "~/components/find/find-places";
import type { StructurePlan } from "~/schemas/parts/structure-plan";
import { StructureTree } from "./structure-tree";

/** What a part is made of, for so many of it. */
export function StructurePage({ plan, problem }: { plan: StructurePlan; problem: string | null }) {
  const submit = useSubmit();
  return (
    <>
      <FindPlaces />
      <h1 className="text-2xl sm:text-[2rem]">
        What <span className="figure">{plan.partNumber}</span> is made of
      </h1>
      <p className="mt-1 text-soft">
        {plan.description}.{" "}
        <Link to={`/find/parts/${encodeURIComponent(plan.partNumber)}`} className="underline">
          The part
        </Link>
      </p>
      <Form
        method="get"
        className="mt-4 flex flex-wrap items-end gap-x-4 gap-y-2 print:hidden"
        onChange={(event) =>
          event.currentTarget.checkValidity() && submit(event.currentTarget, { replace: true })
        }
      >
        <label>
          <span className="block font-bold">For how many</span>
          <input
            key={plan.kits}
            name="kits"
            type="number"
            min={1}
            max={1000}
            required
            defaultValue={plan.kits}
            className="field figure mt-1 w-28"
          />
        </label>
        {plan.offered.length > 0 && (
          <label>
            <span className="block font-bold">With options, joined by commas</span>
            <input
              name="options"
              placeholder={plan.offered.join(",")}
              defaultValue={plan.options.join(",")}
              className="field figure mt-1 w-64 max-w-full"
            />
          </label>
        )}
        <noscript>
          <button type="submit" className="button">
            Show
          </button>
        </noscript>
      </Form>
      {problem && (
        <p role="alert" className="mt-3 max-w-prose border-stop border-l-4 pl-3">
          {problem}
        </p>
      )}
      <p className="mt-3 max-w-prose text-[0.9375rem] text-soft">
        Counted with what is here today, for {plan.kits} of {plan.partNumber}. Needed is what a line asks for;
        the other figures are the part's own, in all of the tree.
      </p>
      <StructureTree key={`${plan.partNumber} ${plan.options}`} plan={plan} />
      <div className="mt-6">
        <Cautions />
      </div>
    </>
  );
}
