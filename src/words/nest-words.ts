import { commonWords } from './common-words.ts'

type Axis = keyof typeof commonWords.axes

/** Words of the drawing of pieces in one another. */
export const nestWords = {
  heading: 'The nest',
  none: 'No piece of this set goes into, over or around another, so there is nothing to draw in section.',
  explain:
    'Figures are clearances in all along an axis, as everywhere; half of it lies on each side. Solid: pieces claim the same place.',
  title: (kind: 'plan' | 'section', along: 'length' | 'width', id: string) =>
    kind === 'plan' ? `From above: ${id}` : `Cut along the ${along}`,
  factor: (kind: 'plan' | 'section', factor: number) =>
    factor === 1
      ? 'True proportion.'
      : kind === 'plan'
        ? `True proportion, gaps drawn ${String(factor)} times as wide.`
        : `True proportion, gaps and walls drawn ${String(factor)} times as wide.`,
  gap: (fit: string, axis: Axis, clearance: string, verdict: string) =>
    `${fit}, ${commonWords.axes[axis]}: clearance ${clearance}, ${verdict}. Go to the fit.`,
} as const
