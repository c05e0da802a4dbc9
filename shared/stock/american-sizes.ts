/**
 * Finished sizes of US envelopes and of the cards made for them, long side first, in inches. Envelopes: outside sizes.
 * Two or more independent sources each (merchants' and craft tables, a public printing standard's media names) unless a
 * line says otherwise. Where the sources disagree about a card, the less common size carries the word that sets it apart.
 */
export const americanSizes: readonly (readonly [name: string, length: number, width: number])[] = [
  // Announcement series.
  ['us-a1-envelope', 5.125, 3.625],
  ['us-a1-card', 4.875, 3.5],
  ['us-a1-card-merchant-tight', 4.874, 3.475], // one merchant, who prints it so
  ['us-a2-envelope', 5.75, 4.375],
  ['us-a2-card', 5.5, 4.25],
  ['us-a4-envelope', 6.25, 4.25],
  ['us-a6-envelope', 6.5, 4.75],
  ['us-a6-card', 6.25, 4.5],
  ['us-a6-card-wide', 6.25, 4.625], // one maker
  ['us-a7-envelope', 7.25, 5.25],
  ['us-a7-card', 7, 5],
  ['us-a7-card-stationer', 7, 5.125],
  ['us-a8-envelope', 8.125, 5.5],
  ['us-a8-card', 7.875, 5.25], // one craft table
  ['us-a8-card-stationer', 7.875, 5.375], // one list
  ['us-a9-envelope', 8.75, 5.75],
  ['us-a9-card', 8.5, 5.5],
  ['us-a10-envelope', 9.5, 6],
  ['us-a10-card', 9.25, 5.75], // from memory: a quarter of an inch less than the envelope
  ['us-a-long-envelope', 8.875, 3.875], // one list
  // Baronial names.
  ['us-lee-envelope', 7.25, 5.25],
  ['us-lee-card', 7, 5.125],
  ['us-4-bar-envelope', 5.125, 3.625],
  ['us-4-bar-card', 4.875, 3.5],
  ['us-5-baronial-envelope', 5.4375, 4.125], // from memory
  ['us-5-baronial-card', 5.25, 4], // one list
  ['us-5-1-2-bar-envelope', 5.75, 4.375],
  ['us-5-1-2-bar-card', 5.5, 4.25],
  ['us-6-bar-envelope', 6.5, 4.75],
  ['us-6-bar-card', 6.25, 4.5],
  // Commercial.
  ['us-no-6-1-4-envelope', 6, 3.5],
  ['us-no-6-3-4-envelope', 6.5, 3.625],
  ['us-monarch-envelope', 7.5, 3.875],
  ['us-no-8-5-8-envelope', 8.625, 3.625],
  ['us-no-9-envelope', 8.875, 3.875],
  ['us-no-10-envelope', 9.5, 4.125],
  ['us-no-10-card', 9.25, 3.875],
  ['us-no-11-envelope', 10.375, 4.5],
  ['us-no-12-envelope', 11, 4.75],
  ['us-no-14-envelope', 11.5, 5],
  ['us-6x9-envelope', 9, 6],
  ['us-9x12-envelope', 12, 9],
  // Squares: the envelope's name, its card a quarter of an inch less; one merchant advises half an inch.
  ['us-square-3-1-4-envelope', 3.25, 3.25],
  ['us-square-3-1-4-card', 3, 3],
  ['us-square-6-envelope', 6, 6],
  ['us-square-6-card', 5.75, 5.75],
  ['us-square-6-card-advice', 5.5, 5.5],
  ['us-square-6-1-4-envelope', 6.25, 6.25],
  ['us-square-6-1-4-card', 6, 6],
]
