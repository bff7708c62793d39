import { useQuery } from "@tanstack/react-query";
import { type FormEvent, type KeyboardEvent, useId, useRef, useState } from "react";
import { Form, useNavigate } from "react-router";
import { findQuery } from "~/hooks/queries/find";
import { useSettled } from "~/hooks/use-settled";
import { useSlashKey } from "~/hooks/use-slash-key";
import { findAddress } from "./find-address";
import { firstFound } from "./first-found";
import { FoundList } from "./found-list";

const SETTLES_IN = 120;

/** The search box in the head of every page: type or scan, arrow keys through what is found, Enter goes. */
export function FindBox() {
  const [typed, setTyped] = useState("");
  const [isOpen, setIsOpen] = useState(false);
  const [active, setActive] = useState(-1);
  const box = useRef<HTMLInputElement>(null);
  const listId = useId();
  const navigate = useNavigate();
  useSlashKey(box);
  const asked = useSettled(typed, SETTLES_IN);
  const { data } = useQuery(findQuery(asked));
  const found = data === undefined || typed.trim().length < 2 ? [] : firstFound(data);
  const isShown = isOpen && found.length > 0;

  function go(address: string) {
    setTyped("");
    setIsOpen(false);
    setActive(-1);
    box.current?.blur();
    navigate(address);
  }
  function onSubmit(event: FormEvent) {
    event.preventDefault();
    const chosen = isShown ? found[active] : undefined;
    if (chosen !== undefined) go(chosen.to);
    else if (typed.trim() !== "") go(findAddress(typed));
  }
  function onKeyDown(event: KeyboardEvent) {
    if (event.key === "Escape" && isShown) {
      event.preventDefault();
      setIsOpen(false);
      setActive(-1);
      return;
    }
    const step = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    if (step === undefined || found.length === 0) return;
    event.preventDefault();
    setIsOpen(true);
    // One place more than there are things found: back in the box, with nothing chosen.
    const places = found.length + 1;
    setActive((now) => ((now + 1 + step + places) % places) - 1);
  }

  return (
    <Form
      action="/find"
      role="search"
      aria-label="Find anything"
      className="relative hidden w-52 shrink-0 md:block lg:w-72"
      onSubmit={onSubmit}
    >
      <input
        ref={box}
        type="text"
        name="q"
        role="combobox"
        aria-label="Find by number or words"
        aria-expanded={isShown}
        aria-controls={listId}
        aria-autocomplete="list"
        aria-activedescendant={isShown && active >= 0 ? `${listId}-${active}` : undefined}
        aria-keyshortcuts="/"
        autoComplete="off"
        autoCapitalize="off"
        spellCheck={false}
        maxLength={200}
        placeholder="Number or words  ( / )"
        value={typed}
        className="field"
        onChange={(event) => {
          setTyped(event.target.value);
          setIsOpen(true);
          setActive(-1);
        }}
        onKeyDown={onKeyDown}
        onBlur={() => setIsOpen(false)}
      />
      <FoundList id={listId} found={isShown ? found : []} active={active} onChoose={go} />
    </Form>
  );
}
