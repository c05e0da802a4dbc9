/**
 * What is customary to say where work can hurt someone (custom, from memory); it defers to the makers of tools and
 * papers and to local rules.
 */
export const cautions: readonly string[] = [
  'Cut on a mat, along a steel rule, with a fresh blade. Keep the other hand behind the blade and cut away from it.',
  'Keep the guard of a trimmer down and fingers off its edge. Cap knives when you lay them down and wrap old blades before throwing them away.',
  'Scoring tools are blunt but pointed. Hot glue and its nozzle burn; use spray and solvent adhesives with windows open. Some envelope gums contain latex.',
  'Keep ribbon, brads, beads and other small parts away from babies and small children. Cutting is for adults or with an adult.',
  'The instructions that come with your tools, papers and adhesives, and the rules where you live, go before these pages.',
]

export const tools: readonly string[] = [
  'ruler or trimmer',
  'scoring board or blunt stylus',
  'craft knife and cutting mat',
  'bone folder',
  'pencil',
  'paper glue or double-sided tape',
]
