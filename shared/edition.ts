/** Version of the engine: figures of two different engines are not compared with one another. */
export const engineVersion = '1.0.0'

/** Edition of the rules, the month they were last changed. */
export const rulesEdition = '2026-12'

/** Format number of `foldgauge.yaml` and of sets. */
export const formatNumber = 1
