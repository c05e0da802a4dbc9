import { Publication } from '../features/publication/publication.entity.ts'
import { PublishedFile } from '../features/publication/published-file.entity.ts'
import { exportFiles } from '../features/publication/export-files.ts'
import { readTokens } from '../features/versions/judge.ts'
import { textsOf } from '../features/versions/version.repository.ts'
import { Version } from '../features/versions/version.entity.ts'
import type { JobData } from './job-kinds.ts'
import type { WorkContext } from './job-handler.ts'

const types: Readonly<Record<string, string>> = {
  pdf: 'application/pdf',
  svg: 'image/svg+xml',
  dxf: 'image/vnd.dxf',
  html: 'text/html; charset=utf-8',
  md: 'text/markdown; charset=utf-8',
  txt: 'text/plain; charset=utf-8',
}

const typeOf = (name: string): string => types[name.slice(name.lastIndexOf('.') + 1)] ?? 'application/octet-stream'

/** Renders and keeps what a publication offers for printing and cutting. A repeated job writes the same files again. */
export async function renderExports(context: WorkContext, { publicationId }: JobData['render-exports']): Promise<void> {
  const { manager } = context.database
  const publication = await manager.findOneBy(Publication, { id: publicationId })
  if (publication === null || publication.exports === 'ready') return
  const version = await manager.findOneBy(Version, { id: publication.versionId })
  if (version === null) return
  const { text, workspace, content } = await textsOf(manager, version.id)
  const { workmanship, paper, scale } = content
  const files = await exportFiles(text, version.file, readTokens(workspace), {
    asOf: version.asOf,
    workmanship,
    paper,
    scale,
    label: publication.label,
  }).catch(async (error: unknown) => {
    await manager.update(Publication, { id: publication.id }, { exports: 'failed' })
    throw error
  })
  for (const file of files) {
    const bytes = typeof file.content === 'string' ? Buffer.from(file.content) : file.content
    const key = `teams/${version.teamId}/published/${publication.id}/${file.name}`
    const type = typeOf(file.name)
    await context.objects.put(key, type, bytes)
    const row = { publicationId: publication.id, name: file.name, type, bytes: bytes.length, key }
    await manager.upsert(PublishedFile, row, ['publicationId', 'name'])
  }
  await manager.update(Publication, { id: publication.id }, { exports: 'ready' })
}
