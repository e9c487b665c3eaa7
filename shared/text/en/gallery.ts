/** Invented figures of the demo scenario, to look at the primitives with. */
export const gallery = {
  head: 'Gallery',
  lead: 'Every primitive in its states, for those who build screens.',
  words: 'Words and figures',
  actions: 'Actions',
  tags: 'Tags',
  inputs: 'Fields',
  sheets: 'Sheets and bars',
  notices: 'Notices and states',
  chart: 'Curves',
  list: 'A list',
} as const;
