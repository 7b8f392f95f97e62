/** What a signature means, in words: it stands beside the printed name and the time on every form of the record. */
export default {
  release: 'I have looked at this hold point’s evidence and release it.',
  concede: 'I permit the use of what is outside its limit, for the reasons given.',
  reopen: 'I reopen this hold point; its release no longer counts and the points after it are shut.',
  'set-again': 'The head is set again; the job starts over from point 1 with this head and height.',
  'resume-work': 'The work may go on.',
  'change-terms': 'I change the job’s terms, for the reason given.',
  'call-off': 'I call this job off, for the reason given.',
  seal: 'Everything is released. I seal this job; its record changes no more.',
  'open-repair-round': 'I open a repair round, for the reason given.',
};
