import { useEffect, useRef, useState } from "react";
import { Form, Link, useNavigation } from "react-router";
import { Field } from "~/components/forms/field";
import { EffectLine } from "~/components/ui/effect-line";
import { Notice } from "~/components/ui/notice";
import type { OrderableKit } from "~/schemas/kit-orders/presented-kit-order";
import { KitOptions } from "./kit-options";
import { kitOrderChange } from "./kit-order-change";
import { draftFromForm, type KitOrderDraft } from "./kit-order-draft";

interface KitOrderFormProps {
  kits: OrderableKit[];
  draft: KitOrderDraft;
  /** The version being changed; a new order has none. */
  version?: number;
  errors?: Record<string, string>;
  /** What is wrong with the whole. */
  problem?: string;
}

/** Enter and edit share this form. One kit order is one kit. */
export function KitOrderForm({ kits, draft, version, errors = {}, problem }: KitOrderFormProps) {
  const [kit, setKit] = useState(draft.kit);
  const [typed, setTyped] = useState(draft);
  const form = useRef<HTMLFormElement>(null);
  const isBusy = useNavigation().state !== "idle";
  const options = kits.find((one) => one.partNumber === kit)?.options ?? [];
  const isNew = version === undefined;

  // biome-ignore lint/correctness/useExhaustiveDependencies: each refused form comes with errors of its own.
  useEffect(() => {
    form.current?.querySelector<HTMLElement>("[aria-invalid=true], [role=alert]")?.focus();
  }, [errors, problem]);

  // biome-ignore lint/correctness/useExhaustiveDependencies: another kit brings other options to tick.
  useEffect(() => {
    if (form.current) setTyped(draftFromForm(new FormData(form.current)));
  }, [kit]);

  return (
    <Form
      ref={form}
      method="post"
      noValidate
      onChange={(event) => setTyped(draftFromForm(new FormData(event.currentTarget)))}
      aria-label="Kit order"
      className="mt-6 grid max-w-3xl gap-x-8 gap-y-6 sm:grid-cols-2"
    >
      {version !== undefined && <input type="hidden" name="version" value={version} />}
      {problem && <Notice className="sm:col-span-2">{problem}</Notice>}
      <Field label="Kit" name="kit" error={errors.kit}>
        {(attributes) => (
          <select
            {...attributes}
            className="field"
            value={kit}
            onChange={(event) => setKit(event.target.value)}
          >
            {!kits.some((one) => one.partNumber === kit) && <option value="">Choose a kit</option>}
            {kits.map((one) => (
              <option key={one.partNumber} value={one.partNumber}>
                {one.partNumber}, {one.description}
              </option>
            ))}
          </select>
        )}
      </Field>
      <Field label="Customer" name="customer" error={errors.customer}>
        {(attributes) => (
          <input
            {...attributes}
            className="field"
            defaultValue={draft.customer}
            maxLength={190}
            autoComplete="off"
          />
        )}
      </Field>
      <KitOptions key={kit} options={options} chosen={draft.options} error={errors.options} />
      <Field
        label="Wanted on"
        name="wantedOn"
        hint="Leave empty for as soon as it can go."
        error={errors.wantedOn}
      >
        {(attributes) => (
          <input {...attributes} type="date" className="field figure" defaultValue={draft.wantedOn} />
        )}
      </Field>
      <Field
        label="Priority"
        name="priority"
        hint="1 is served first. Equal ones go by the wanted date."
        error={errors.priority}
      >
        {(attributes) => (
          <input
            {...attributes}
            className="field figure"
            inputMode="numeric"
            defaultValue={draft.priority}
            autoComplete="off"
          />
        )}
      </Field>
      <Field
        label="Serial"
        name="serial"
        hint="Some parts belong to a run of serials. Leave empty while it is not fixed."
        error={errors.serial}
      >
        {(attributes) => (
          <input
            {...attributes}
            className="field figure"
            defaultValue={draft.serial}
            maxLength={60}
            autoComplete="off"
          />
        )}
      </Field>
      {isNew && (
        <Field
          label="Order number"
          name="number"
          hint="Leave empty and the next one is given."
          error={errors.number}
        >
          {(attributes) => (
            <input
              {...attributes}
              className="field figure"
              defaultValue={draft.number}
              maxLength={60}
              autoComplete="off"
            />
          )}
        </Field>
      )}
      <div className="sm:col-span-2">
        <Field label="Note" name="note" error={errors.note}>
          {(attributes) => (
            <textarea {...attributes} className="field" rows={3} defaultValue={draft.note} maxLength={1000} />
          )}
        </Field>
      </div>
      <EffectLine
        change={kitOrderChange(typed, kits, isNew ? null : draft.number)}
        waiting="Choose a kit and give a priority, and this line says what the order does."
        className="sm:col-span-2"
      />
      <div className="flex flex-wrap items-center gap-4 sm:col-span-2">
        <button type="submit" className="button button-main min-h-12" aria-disabled={isBusy}>
          {isNew ? "Enter the order" : "Save the changes"}
        </button>
        <Link to="/pack/kit-orders" className="px-2 py-3 underline">
          Back without saving
        </Link>
      </div>
    </Form>
  );
}
