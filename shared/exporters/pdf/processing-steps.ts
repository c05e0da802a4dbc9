import type { LayerName } from '../../drawing/drawing.ts'

/** Group and type that ISO 19593-1:2018 gives an operation (published lists of its names; the standard itself was not read). */
export interface ProcessingStep {
  readonly group: 'Structural' | 'Positions' | 'Dimensions' | 'Legend'
  readonly type: string | null
}

export const processingSteps: Readonly<Record<LayerName, ProcessingStep>> = {
  cut: { group: 'Structural', type: 'Cutting' },
  valley: { group: 'Structural', type: 'Creasing' },
  mountain: { group: 'Structural', type: 'ReverseCreasing' },
  perforate: { group: 'Structural', type: 'Perforating' },
  glue: { group: 'Structural', type: 'Gluing' },
  position: { group: 'Positions', type: 'ContentArea' },
  dimension: { group: 'Dimensions', type: null },
  legend: { group: 'Legend', type: null },
}
