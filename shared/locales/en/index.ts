import account from './account';
import app from './app';

/** English, area by area: one import and one line for each, in the order of the alphabet. */
export default {
  account,
  app,
};
