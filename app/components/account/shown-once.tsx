import { useEffect, useRef, useState } from "react";

interface ShownOnceProps {
  label: string;
  text: string;
}

/** A secret that is not shown again, with a button that copies it; takes the focus when it appears. */
export function ShownOnce({ label, text }: ShownOnceProps) {
  const box = useRef<HTMLTextAreaElement>(null);
  const [isCopied, setCopied] = useState(false);
  // biome-ignore lint/correctness/useExhaustiveDependencies: another secret takes the focus again.
  useEffect(() => box.current?.focus(), [text]);
  async function copy() {
    box.current?.select();
    try {
      await navigator.clipboard.writeText(text);
      setCopied(true);
    } catch {
      // Without leave to write there it stays selected, for the keys that copy.
    }
  }
  return (
    <div className="border-ink border-l-4 pl-4">
      <label className="block">
        <span className="font-bold">{label}</span>
        <span className="block text-soft">Shown only now. Keep it where others do not look.</span>
        <textarea
          ref={box}
          readOnly
          value={text}
          rows={Math.max(2, text.split("\n").length)}
          className="field figure mt-1 break-all"
        />
      </label>
      <button type="button" className="button mt-2" onClick={copy}>
        Copy
      </button>
      <span role="status" className="ml-3">
        {isCopied && "Copied."}
      </span>
    </div>
  );
}
