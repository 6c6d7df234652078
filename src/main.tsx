import '@fontsource-variable/atkinson-hyperlegible-next/wght.css'
import '@fontsource/jetbrains-mono/latin-400.css'
import '@fontsource/jetbrains-mono/latin-500.css'
import '@fontsource/jetbrains-mono/latin-700.css'
import '@/styles/main.css'
import { QueryClientProvider } from '@tanstack/react-query'
import { StrictMode } from 'react'
import { createRoot } from 'react-dom/client'
import { RouterProvider } from 'react-router-dom'
import { applyLanguage, applyTheme, deviceLanguage, deviceTheme } from '@/app/preferences'
import { createQueryClient } from '@/app/query-client'
import { createRouter } from '@/app/router'
import { startLocales } from '@/locales/index'

const root = document.getElementById('root')
if (!root) throw new Error('The page has no element with the id "root".')

applyTheme(deviceTheme())
await startLocales(deviceLanguage())
await applyLanguage(deviceLanguage())

createRoot(root).render(
  <StrictMode>
    <QueryClientProvider client={createQueryClient()}>
      <RouterProvider router={createRouter()} />
    </QueryClientProvider>
  </StrictMode>,
)
