/** Limits that stand at more than one hold point: air, permit, clock, calibration. */
export default {
  'gas-oxygen': {
    within: 'Oxygen is between {min} and {max}.',
    outside:
      'Oxygen reads {measured}, outside {min} to {max} by {by}. Keep out, air the place, find the cause and read again.',
  },
  'gas-flammable': {
    within: 'Flammable gas is at or below {max} of the lower explosive limit.',
    outside:
      'Flammable gas reads {measured} of the lower explosive limit, over {max} by {by}. No flame. Find and stop the source, air the place and read again.',
  },
  'gas-h2s': {
    within: 'H2S is below {max}.',
    outside: 'H2S reads {measured}; it must be below {max}. Leave upwind, follow the site’s H2S plan, then read again.',
  },
  'gas-co': {
    within: 'Carbon monoxide is below {max}.',
    outside:
      'Carbon monoxide reads {measured}; it must be below {max}. Stop engines near the cellar, air the place and read again.',
  },
  'gas-zeroed': {
    within: 'The meter reads no less than nothing.',
    outside:
      'The meter reads {measured}, less than nothing: it is not zeroed. Zero it in clean air, bump-test it and read again.',
  },
  'gas-bump-tested': {
    within: 'The meter was bump-tested today.',
    outside: 'The meter has not been bump-tested today. Test it, or take one that has been.',
  },
  'gas-monitor': {
    within: 'A continuous monitor is in place.',
    outside: 'No continuous monitor is in place. Put one in the cellar before any flame.',
  },
  'gas-clock': {
    within: 'The times of the gas readings are sure.',
    outside:
      'This device’s clock could not be checked when the air was read, so the age of the readings is not known. Read the air again once the clock has been checked.',
  },
  'gas-fresh': {
    within: 'The air was read {measured} ago; it stands for {max}.',
    outside:
      'The air was read {measured} ago, {by} more than the {max} allowed. Read it again at all three places before lighting anything.',
  },
  'gas-missing': {
    within: 'The air has been read at all three places.',
    outside: 'The air has not been read at all three places. Read cellar, bore and annulus before lighting anything.',
  },
  'permit-in-force': {
    within: 'The permit is in force until {expires}.',
    outside: 'The hot work permit is not in force (it ran to {expires}). Have it renewed and enter the new expiry.',
  },
  'permit-missing': {
    within: 'A hot work permit is entered.',
    outside: 'No hot work permit is entered. Enter its number, issuer and expiry before lighting anything.',
  },
  'clock-doubt': {
    within: 'The times of these readings are sure.',
    outside:
      'The clock of the device that recorded this was not checked, or is in doubt by more than two minutes. Connect, let it check the clock, and read again; or let the company representative concede it.',
  },
  'act-clock': {
    within: 'The time of this act is sure.',
    outside:
      'The clock of this device was not checked, or is in doubt by more than two minutes: how old the readings are cannot be told. Connect, let it check the clock, then begin.',
  },
  'act-times': {
    within: 'The times of this act are sure.',
    outside:
      '{act}: its times are not sure, because a clock was not checked or two clocks contradict each other. Let the company representative concede it.',
  },
  'time-ahead': {
    within: 'The time had come when it was typed.',
    outside: '{time} lies ahead of when it was typed. Type the time that the watch showed.',
  },
  'instrument-listed': {
    within: '{name} is on the job’s list.',
    outside: '{name} is not on this job’s list for such a reading. Choose one that is.',
  },
  calibration: {
    within: '{name} is in calibration until {until}.',
    outside:
      '{name} ran out of calibration on {until}. Use one that is in date, or let the company representative concede it.',
  },
  'calibration-gas-meter': {
    within: '{name} is in calibration until {until}.',
    outside: '{name} ran out of calibration on {until}. A gas meter out of date is not used: take one that is in date.',
  },
  'resume-preheat': {
    within: 'The joint is {measured}, not below {min}.',
    outside:
      'The joint is {measured}, {by} under the preheat minimum of {min}. Heat it again all round and read it again.',
  },
  'resume-preheat-unread': {
    within: 'The joint has been read since the stop.',
    outside: 'The joint’s temperature has not been read since the stop, or nobody can be sure when. Read it now.',
  },
  'resume-cracks': {
    within: 'No crack was seen since the stop.',
    outside:
      'A crack was found in the joint. Nothing goes over it: take it out by the procedure, look again and record it.',
  },
  'resume-cracks-unread': {
    within: 'The joint has been looked at since the stop.',
    outside:
      'The joint has not been looked at for cracks since the stop, or nobody can be sure when. Look now and record it.',
  },
};
