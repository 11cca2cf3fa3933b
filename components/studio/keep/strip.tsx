import type { ReactNode } from 'react';

export const Strip = ({ children }: { children: ReactNode }) => (
  <div className="-my-1 flex flex-wrap items-center gap-x-4 gap-y-1 text-sm">{children}</div>
);
