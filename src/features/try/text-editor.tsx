import { defaultKeymap, history, historyKeymap } from '@codemirror/commands'
import { yaml } from '@codemirror/lang-yaml'
import { HighlightStyle, syntaxHighlighting } from '@codemirror/language'
import { lintGutter, lintKeymap, setDiagnostics, type Diagnostic } from '@codemirror/lint'
import { EditorState } from '@codemirror/state'
import { EditorView, highlightActiveLine, keymap, lineNumbers } from '@codemirror/view'
import { tags } from '@lezer/highlight'
import { useEffect, useRef, type JSX } from 'react'
import type { Report } from '../../../shared/report/report.ts'

const look = EditorView.theme({
  '&': { fontSize: '0.86rem', backgroundColor: 'var(--sheet)', color: 'var(--ink)', height: '100%' },
  '&.cm-focused': { outline: '2px solid var(--ink)', outlineOffset: '-2px' },
  '.cm-scroller': {
    fontFamily: "'JetBrains Mono', ui-monospace, monospace",
    lineHeight: '1.6',
    fontFeatureSettings: "'calt' 0",
  },
  '.cm-content': { caretColor: 'var(--ink)' },
  '.cm-cursor': { borderLeftColor: 'var(--ink)', borderLeftWidth: '2px' },
  '.cm-gutters': {
    backgroundColor: 'var(--sheet)',
    color: 'var(--soft)',
    border: 'none',
    borderRight: '1px solid var(--hair)',
  },
  '.cm-activeLine': { backgroundColor: 'color-mix(in srgb, var(--shade) 55%, transparent)' },
  '.cm-selectionBackground, &.cm-focused .cm-selectionBackground': { backgroundColor: 'var(--info-wash) !important' },
  '.cm-tooltip': {
    backgroundColor: 'var(--sheet)',
    color: 'var(--ink)',
    border: '1px solid var(--ink)',
    maxWidth: '34rem',
  },
  '.cm-diagnostic': { fontFamily: 'ui-sans-serif, system-ui, sans-serif', fontSize: '0.86rem' },
  '.cm-lintRange-error': { backgroundImage: 'none', borderBottom: '2px solid var(--fail)' },
  '.cm-lintRange-warning': { backgroundImage: 'none', borderBottom: '2px dashed var(--warn)' },
  '.cm-panel': { backgroundColor: 'var(--shade)', color: 'var(--ink)' },
})

const colours = HighlightStyle.define([
  { tag: tags.comment, color: 'var(--soft)', fontStyle: 'italic' },
  { tag: [tags.propertyName, tags.definition(tags.propertyName)], color: 'var(--link)' },
  { tag: [tags.string, tags.number, tags.bool], color: 'var(--ink)' },
  { tag: [tags.punctuation, tags.separator, tags.bracket], color: 'var(--soft)' },
])

function diagnosticsOf(report: Report, state: EditorState): readonly Diagnostic[] {
  const at = (line: number, column: number): number => {
    const own = state.doc.line(Math.min(Math.max(line, 1), state.doc.lines))
    return Math.min(own.from + Math.max(column - 1, 0), own.to)
  }
  const span = (place: Report['errors'][number]['at']): { readonly from: number; readonly to: number } => {
    const from = at(place.line, place.column)
    return { from, to: Math.max(at(place.endLine, place.endColumn), from) }
  }
  const errors = report.errors
    .filter(({ at: place }) => place.file === report.file)
    .map((problem): Diagnostic => ({
      ...span(problem.at),
      severity: 'error',
      message: `${problem.message} ${problem.hint}`,
    }))
  const verdicts = report.verdicts
    .filter(
      ({ status, at: place }) =>
        (status === 'fail' || status === 'warn' || status === 'crashed') && place.file === report.file,
    )
    .map((verdict): Diagnostic => ({
      ...span(verdict.at),
      severity: verdict.status === 'warn' ? 'warning' : 'error',
      message: verdict.message,
    }))
  return [...errors, ...verdicts].toSorted((a, b) => a.from - b.from)
}

/** A text editor with verdicts at their lines. Tab leaves it, so that the keyboard is never caught. */
export function TextEditor({
  initial,
  label,
  report,
  onChange,
}: {
  readonly initial: string
  readonly label: string
  readonly report: Report
  readonly onChange: (text: string) => void
}): JSX.Element {
  const host = useRef<HTMLDivElement>(null)
  const view = useRef<EditorView | null>(null)
  const changed = useRef(onChange)
  useEffect(() => {
    changed.current = onChange
  }, [onChange])
  useEffect(() => {
    const element = host.current
    if (element === null) return undefined
    // In a shadow tree its styles are adopted sheets, which a strict content policy lets be.
    const root = element.shadowRoot ?? element.attachShadow({ mode: 'open' })
    const editor = new EditorView({
      root,
      parent: root,
      state: EditorState.create({
        doc: initial,
        extensions: [
          lineNumbers(),
          lintGutter(),
          history(),
          highlightActiveLine(),
          keymap.of([...defaultKeymap, ...historyKeymap, ...lintKeymap]),
          yaml(),
          syntaxHighlighting(colours),
          look,
          EditorView.lineWrapping,
          EditorView.contentAttributes.of({ 'aria-label': label, tabindex: '0' }),
          EditorView.updateListener.of((update) => {
            if (update.docChanged) changed.current(update.state.doc.toString())
          }),
        ],
      }),
    })
    view.current = editor
    return () => editor.destroy()
  }, [initial, label])
  useEffect(() => {
    const editor = view.current
    if (editor !== null) editor.dispatch(setDiagnostics(editor.state, diagnosticsOf(report, editor.state)))
  }, [report])
  return <div ref={host} className="h-[34rem] max-h-[80vh] overflow-hidden border border-stroke [&>*]:h-full" />
}
