import { deflateSync } from 'node:zlib'
import { judgeSet } from '../../../shared/assembly/judge-set.ts'
import { checkSet } from '../../../shared/check-template.ts'
import { readPageSize } from '../../../shared/drawing/page-size.ts'
import { exportDrawings } from '../../../shared/exporters/export-drawings.ts'
import { exportPdf } from '../../../shared/exporters/export-pdf.ts'
import { exportSet } from '../../../shared/exporters/export-set.ts'
import { exportSteps } from '../../../shared/exporters/export-steps.ts'
import type { ExportedFile } from '../../../shared/exporters/exported-file.ts'
import { planSteps } from '../../../shared/exporters/steps/plan-steps.ts'
import { templateDocument } from '../../../shared/exporters/template-document.ts'
import { readSet } from '../../../shared/template/read-set.ts'
import type { Workspace } from '../../../shared/template/template-model.ts'
import type { Judging } from '../versions/judge.ts'
import { readDocumentFonts } from './document-fonts.ts'

const printedOn = ['a4', 'letter'] as const
const margin = 5

/** What a publication offers: printable pages for both paper worlds, steps, and files for cutters. */
export async function exportFiles(
  text: string,
  file: string,
  workspace: Workspace,
  judging: Judging & { readonly label: string },
): Promise<readonly ExportedFile[]> {
  const { set } = readSet(text, file, workspace)
  if (set === null) throw new Error(`${file} cannot be read any more`)
  const options = {
    file,
    asOf: judging.asOf,
    ...(judging.workmanship === null ? {} : { workmanship: judging.workmanship }),
    ...(judging.paper === null ? {} : { paper: judging.paper }),
    ...(judging.scale === 1 ? {} : { scale: judging.scale }),
  }
  const made = exportSet(judgeSet(set, options), checkSet(set, options), `version ${judging.label}`)
  const steps = planSteps(made)
  const fonts = await readDocumentFonts(`${text}${workspace.title ?? ''}`)
  const files: ExportedFile[] = [...exportSteps(made, steps, false)]
  for (const sheet of printedOn) {
    const size = readPageSize(sheet)
    if (!size.ok) throw new Error(size.fact)
    const pages = templateDocument(made, steps, {
      size: size.value,
      margin,
      isTiled: true,
      isLargePrint: false,
      pieces: null,
    })
    files.push(
      ...(await exportPdf(pages, {
        name: `${made.name}-${sheet}`,
        title: made.title,
        author: workspace.title ?? 'Foldgauge',
        digest: made.digest,
        fonts,
        deflate: (data) => deflateSync(data, { level: 6 }),
        isSeparate: false,
      })),
    )
  }
  for (const format of ['svg', 'dxf'] as const)
    files.push(...exportDrawings(made, { format, isSeparate: false, areDashesDrawn: false, pieces: null }))
  return files
}
