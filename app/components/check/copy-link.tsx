import { useEffect, useState } from "react";

/** Copies the address of the page, so that a colleague sees the same. */
export function CopyLink() {
  const [said, setSaid] = useState("");
  useEffect(() => {
    if (said === "") return;
    const timer = setTimeout(() => setSaid(""), 4_000);
    return () => clearTimeout(timer);
  }, [said]);

  async function copy() {
    try {
      await navigator.clipboard.writeText(window.location.href);
      setSaid("Copied");
    } catch {
      setSaid("Copy it from the address bar");
    }
  }

  return (
    <button type="button" className="min-h-11 underline" onClick={copy}>
      <span aria-live="polite">{said || "Copy the link"}</span>
    </button>
  );
}
