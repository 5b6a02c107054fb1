/** What registers a set: a console of 1941 with its list price. */
export const SET = {
  kind: 'radio',
  maker: 'Halloway',
  model: '41-X console',
  description: 'Eleven tubes',
  chassis: '',
  serial: '41X-20877',
  year: 1941,
  ownerId: null,
  priceWhenNew: { amount: '169.95', currency: 'USD', period: '1941', source: 'Dealer sheet, 1941' },
  priceIsPublic: false,
  provenance: '',
  alterations: '',
  notes: '',
  hazards: [{ hazard: 'high-voltage', volts: 385, note: 'Field coil' }],
};
