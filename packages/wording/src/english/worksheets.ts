/** What the airflow and the weigh-in page have in common. */
export const worksheetWords = {
  loading: 'Opening your entries',
  forCheck: (name: string) => `For the check that is open: ${name}`,
  noCheck: 'No check is set up yet. What you type stays here, with the check you open.',
  fromCheck: 'from the check',
  toTheCheck: 'Back to the check',
  startOver: 'Empty this page',
  emptied: 'This page is empty again.',
  undo: 'Undo',
  result: 'Result',
  keepInMind: 'Keep in mind',
  showMath: 'Show the math',
  hideMath: 'Hide the math',
  plusMinus: (value: string) => `± ${value}`,
};
