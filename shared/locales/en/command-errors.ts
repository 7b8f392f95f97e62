/** What is said of a command or a plan that was not recorded; the rules' own words stand under `refusals`. */
export default {
  command: {
    conflict: 'Somebody was faster, or the job has moved on since. Nothing was recorded.',
    blocked: 'Something stands in the way. Nothing was recorded.',
    forbidden: 'This is not yours to do on this job. Nothing was recorded.',
    'id-taken': 'This entry cannot be taken under its number. Try it again as new.',
    'id-reused': 'Another entry was already sent under the same number. Nothing was recorded. Try it again as new.',
    'text-broken': 'The text holds half a character and cannot be kept. Type it again.',
    'file-not-sent': 'The photo has not arrived here from you yet. Send it first.',
    'file-no-photo': 'This file is not a photo. A recorder’s file cannot stand in the place of one.',
    'instrument-unknown': 'There is no such instrument in the set-up, or it was retired.',
    'head-unknown': 'There is no such casing head in the set-up. Choose one from the list.',
    'person-unknown': 'There is no such person, or the account is closed. Choose somebody else.',
    'person-without-role': 'This person does not have that role. Choose somebody who does.',
    'person-on-both-sides':
      'This person stands on both sides: nobody is of the firm and a guest. Choose somebody else.',
  },
  field: {
    unknown: 'There is nothing of that name in the set-up.',
    'person-unknown': 'There is no such person, or the account is closed. Choose somebody else.',
    'person-without-role': 'This person does not have that role. Choose somebody who does.',
    'person-on-both-sides':
      'This person stands on both sides: nobody is of the firm and a guest. Choose somebody else.',
    'person-twice': 'This person is already on the job in that role.',
  },
};
