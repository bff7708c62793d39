import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { type ReactNode, useState } from "react";
import { FindBox } from "~/components/find/box/find-box";
import { FindIconLink } from "~/components/find/box/find-icon-link";
import { ScannerEar } from "~/components/find/box/scanner-ear";
import { CotterPin } from "./cotter-pin";
import { NameMenu, type NameMenuProps } from "./name-menu";
import { ShipLine } from "./ship-line";
import { VerbBar } from "./verb-bar";

interface ShellProps {
  person: NameMenuProps["person"];
  children: ReactNode;
}

/** What stands around every page of a person who has signed in: verbs, name, page, ship line. */
export function Shell({ person, children }: ShellProps) {
  const [queryClient] = useState(() => new QueryClient());
  return (
    <QueryClientProvider client={queryClient}>
      <div className="flex min-h-dvh flex-col">
        <a
          href="#page"
          className="absolute left-4 -top-20 z-30 bg-ink px-4 py-3 font-bold text-paper focus:top-2"
        >
          Skip to the page
        </a>
        <header className="mx-auto flex w-full max-w-[112rem] items-center gap-4 px-4 sm:gap-8 sm:px-10 print:hidden">
          <span className="flex items-center gap-2 text-lg font-bold">
            <CotterPin seated className="h-6 w-3.5" />
            <span className="sr-only sm:not-sr-only">Cotterpin</span>
          </span>
          <VerbBar />
          <FindBox />
          <FindIconLink />
          <NameMenu person={person} />
        </header>
        <main
          id="page"
          tabIndex={-1}
          className="mx-auto w-full max-w-[112rem] flex-1 px-4 pt-6 pb-12 outline-none sm:px-10"
        >
          {children}
        </main>
        <ShipLine />
      </div>
      <ScannerEar />
    </QueryClientProvider>
  );
}
