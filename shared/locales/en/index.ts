import account from './account';
import app from './app';
import errors from './errors';
import fileRefusals from './file-refusals';
import calculations from './calculations';
import photos from './photos';

/** English, area by area: one import and one line for each, in the order of the alphabet. */
export default {
  account,
  app,
  errors: { ...errors, ...fileRefusals },
  calculations,
  photos,
};
