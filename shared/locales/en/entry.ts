import app from './app';

/** Why an answer was not understood, and how to type it. */
export default {
  ...app.quantity,
  'answer-empty': 'Nothing is typed yet. Type or choose an answer.',
  'count-not-whole': 'This is counted in whole numbers. Type one like 12.',
  'check-yes-or-no': 'This is answered with yes or no.',
  'choice-not-offered': 'This answer is not among those offered. Choose one of them.',
  'time-not-understood': 'This is not read as a time. Set date and time, or use Now.',
};
