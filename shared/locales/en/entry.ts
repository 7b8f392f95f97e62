import calculations from './calculations';

/** A number that cannot be read is explained in one place: the entry says the same. */
const quantities = Object.fromEntries(
  Object.entries(calculations).filter(([reason]) => reason.startsWith('quantity-')),
);

/** Why an answer was not understood, and how to type it. */
export default {
  ...quantities,
  'answer-empty': 'Nothing is typed yet. Type or choose an answer.',
  'count-not-whole': 'This is counted in whole numbers. Type one like 12.',
  'check-yes-or-no': 'This is answered with yes or no.',
  'choice-not-offered': 'This answer is not among those offered. Choose one of them.',
  'time-not-understood': 'This is not read as a time. Set date and time, or use Now.',
};
