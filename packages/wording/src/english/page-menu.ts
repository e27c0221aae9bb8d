/** The menu that leads to the other pages. */
export const pageMenuWords = {
  title: 'Pages',
  open: 'Open the list of pages',
  check: { name: 'Check a charge', does: 'Readings in, finding and next step out' },
  airflow: { name: 'Airflow', does: 'Measured, by temperature rise, by static pressure; capacity from the air' },
  weighIn: { name: 'Weigh in', does: 'The charge by the scale, line set and vacuum' },
  properties: { name: 'Properties', does: 'Saturation of a refrigerant, state of moist air' },
  examples: { name: 'Worked examples', does: 'To learn from, to print, each with its key' },
  sources: { name: 'Sources', does: 'Every figure, table and formula: where it is from' },
};
