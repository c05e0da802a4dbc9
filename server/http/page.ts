import express, { type Express } from 'express'
import { existsSync } from 'node:fs'
import { join } from 'node:path'
import { notFound } from './refusal.ts'

/** Serves the built page: named assets for ever, the rest fresh, every other address the page itself. */
export function mountPage(app: Express, folder: string | undefined): void {
  app.use('/api', () => {
    throw notFound()
  })
  if (folder === undefined || !existsSync(join(folder, 'index.html'))) {
    app.get('/{*path}', (_request, response) => {
      response.status(404).type('text/plain').send('The page is not built here. The API answers under /api.\n')
    })
    return
  }
  app.use('/assets', express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', fallthrough: false }))
  app.use(
    express.static(folder, {
      index: false,
      cacheControl: false,
      setHeaders: (response) => response.setHeader('cache-control', 'no-cache'),
    }),
  )
  app.get('/{*path}', (_request, response) => {
    response.setHeader('cache-control', 'no-cache')
    response.sendFile('index.html', { root: folder })
  })
}
