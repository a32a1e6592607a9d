import { Theme } from '@radix-ui/themes';
import { type QueryClient, QueryClientProvider } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useAppearance } from './theme-choice';

export function Providers({ client, children }: { client: QueryClient; children: ReactNode }) {
  return (
    <QueryClientProvider client={client}>
      <Theme accentColor="plum" grayColor="slate" radius="medium" appearance={useAppearance()}>
        {children}
      </Theme>
    </QueryClientProvider>
  );
}
