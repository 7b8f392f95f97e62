import account from './account';
import app from './app';
import photos from './photos';

/** English, area by area: one import and one line for each, in the order of the alphabet. */
export default {
  account,
  app,
  photos,
};
