import type { ReactNode } from 'react';
import { Logo } from '@/components/ui/logo';
import { Pond } from './pond';

/** The doors of the house (sign in, invitation, reset): the pond at one side, the form at the other. */
export function DoorLayout({
  title,
  lead,
  children,
}: {
  title: string;
  lead?: ReactNode;
  children: ReactNode;
}) {
  return (
    <div className="flex min-h-screen flex-col lg:grid lg:grid-cols-[minmax(0,1fr)_27rem]">
      <div className="flex flex-col justify-between gap-8 border-b px-6 py-6 lg:border-r lg:border-b-0 lg:px-12 lg:py-10">
        <p className="flex items-center gap-3 font-bold">
          <Logo />
          Millpond
        </p>
        <Pond className="hidden w-full max-w-[60rem] self-center lg:block" />
        <div className="max-w-[52rem]">
          <p className="text-large font-semibold">
            A millpond is a small local reservoir with a flat, quiet surface.
          </p>
          <p className="mt-2 text-stone">
            That is what a decoupling bank is for a supply rail. Millpond plans the capacitors of a board:
            target impedance, the smallest bank that holds it, revisions and the placement list.
          </p>
        </div>
      </div>
      <main className="flex flex-col justify-center gap-6 px-6 py-8 lg:px-10">
        <div>
          <h1 className="text-large font-semibold">{title}</h1>
          {lead && <div className="mt-1 text-stone">{lead}</div>}
        </div>
        {children}
      </main>
    </div>
  );
}
