import account from './account';
import app from './app';
import commandErrors from './command-errors';
import errors from './errors';
import fileRefusals from './file-refusals';
import photos from './photos';
import desk from './desk';
import drawing from './drawing';
import entry from './entry';
import job from './job';
import jobs from './jobs';
import limits from './limits';
import packets from './packets';
import plan from './plan';
import planFaults from './plan-faults';
import points from './points';
import refusals from './refusals';
import settings from './settings';
import signature from './signature';

/** English, area by area: one import and one line for each, in the order of the alphabet. */
export default {
  account,
  app,
  errors: {
    ...errors,
    ...fileRefusals,
    command: commandErrors.command,
    field: { ...errors.field, ...commandErrors.field },
  },
  photos,
  desk,
  drawing,
  entry,
  job,
  jobs,
  limits,
  packets,
  plan,
  planFaults,
  points,
  refusals,
  settings,
  signature,
};
