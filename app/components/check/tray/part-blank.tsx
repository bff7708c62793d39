import { useQuery } from "@tanstack/react-query";
import { useDeferredValue, useId, useState } from "react";
import { partNamesQuery } from "~/hooks/queries/part-names";
import { TrayBlank } from "./tray-blank";

/** A part number, with the parts that match what is typed. */
export function PartBlank() {
  const [typed, setTyped] = useState("");
  const asked = useDeferredValue(typed.trim());
  const { data = [] } = useQuery(partNamesQuery(asked));
  const id = useId();
  return (
    <>
      <TrayBlank
        label="Part number"
        name="part"
        list={id}
        maxLength={120}
        value={typed}
        onChange={(event) => setTyped(event.target.value)}
      />
      <datalist id={id}>
        {data.map(({ partNumber, description }) => (
          <option key={partNumber} value={partNumber}>
            {description}
          </option>
        ))}
      </datalist>
    </>
  );
}
