'use client'
import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { useState, type ReactNode } from 'react'
import { Toaster } from 'sonner'
import { initStyleNonce } from './style-nonce'

interface ProvidersProps {
  nonce: string | undefined
  children: ReactNode
}

/** What every page stands in: questions to the server, short messages, the nonce of injected styles. */
export function Providers({ nonce, children }: ProvidersProps) {
  const [client] = useState(() => {
    initStyleNonce(nonce)
    return new QueryClient({ defaultOptions: { queries: { staleTime: 30_000, retry: 1, refetchOnWindowFocus: false } } })
  })
  return (
    <QueryClientProvider client={client}>
      {children}
      <Toaster position="bottom-center" containerAriaLabel="Messages" toastOptions={{ classNames: { toast: 'border! border-ink! bg-sheet! text-ink! text-base! rounded-sm! font-text!' } }} />
    </QueryClientProvider>
  )
}
