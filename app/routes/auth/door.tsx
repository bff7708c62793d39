import type { ReactNode } from "react";
import { CotterPin } from "~/components/layout/cotter-pin";

interface DoorProps {
  heading: string;
  children: ReactNode;
}

/** The frame of pages outside the shell: signing in and setting up. */
export function Door({ heading, children }: DoorProps) {
  return (
    <div className="mx-auto flex min-h-dvh w-full max-w-5xl flex-col px-4 py-6 sm:px-10 sm:py-10">
      <p className="flex items-center gap-2 text-lg font-bold">
        <CotterPin seated className="h-6 w-3.5" />
        Cotterpin
      </p>
      <main id="page" className="flex-1 pt-10 sm:pt-16">
        <h1 className="max-w-2xl text-3xl leading-tight font-bold sm:text-4xl">{heading}</h1>
        {children}
      </main>
    </div>
  );
}
