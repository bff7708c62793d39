import type { ReactNode } from "react";

interface NoticeProps {
  children: ReactNode;
  className?: string;
}

/** A refusal that concerns the whole page; takes the focus so that it is read out. */
export function Notice({ children, className = "" }: NoticeProps) {
  return (
    <div
      role="alert"
      tabIndex={-1}
      className={`max-w-prose border-stop border-l-4 bg-stop-wash px-4 py-3 ${className}`}
    >
      {children}
    </div>
  );
}
