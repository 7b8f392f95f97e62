/** What is said when the server does not do what it was asked, by code of the problem. */
export default {
  request: {
    malformed: 'The request could not be read.',
    invalid: 'Some of what was sent could not be understood. The fields are named.',
    'too-large': 'That is more than 256 kB, which is more than any request of this kind needs.',
    'too-deep': 'What was sent is nested too deep.',
    'wrong-type': 'This address takes JSON.',
    'wrong-method': 'This address exists, but not for that kind of request.',
    'unknown-route': 'There is nothing at this address.',
    'cross-site': 'The request came from another site and was refused.',
    'wrong-host': 'This server is not known under that name.',
  },
  field: {
    missing: 'This is missing.',
    'invalid-type': 'This has the wrong type.',
    'invalid-format': 'This does not have the form that is expected.',
    'invalid-value': 'This is none of the values that are known.',
    'invalid-union': 'This fits none of the forms that are known.',
    'too-small': 'This is shorter or smaller than allowed.',
    'too-big': 'This is longer or larger than allowed.',
    'unrecognized-keys': 'This holds a name that is not known here.',
    'not-multiple-of': 'This does not fall on the step that is expected.',
    custom: 'This cannot be right.',
  },
  session: {
    needed: 'Sign in first. What you have entered is kept.',
  },
  'sign-in': {
    refused: 'E-mail and password do not match. Type both again.',
    locked: 'Too many attempts. The next one is possible in {seconds} seconds.',
  },
  permission: {
    'not-found': 'There is no such thing, or it is not yours to see.',
    forbidden: 'This is not open to your role.',
  },
  signing: {
    'pin-wrong': 'That is not the right PIN, or not the right password. Nothing was signed.',
    'password-needed': 'The password was last given more than 12 hours ago. Sign with password and PIN.',
    'no-pin': 'This account has no signing PIN yet. Set one on the account page.',
    locked: 'Too many attempts. The next one is possible in {seconds} seconds.',
  },
  password: {
    wrong: 'That is not your password. Type it again.',
    'too-short': 'A password needs 15 characters or more.',
    'too-long': 'A password may have 200 characters at most.',
    common: 'This password is on the list of those that are guessed first. Choose another.',
    'too-simple': 'This password is a run or a repetition. Use a few words that do not belong together.',
    'contains-you': 'This password holds a part of your name or e-mail address. Choose another.',
  },
  pin: {
    'not-digits': 'A PIN has digits only.',
    'too-short': 'A PIN needs 6 digits or more.',
    'too-long': 'A PIN may have 12 digits at most.',
    repeats: 'This PIN repeats itself. Choose one that does not.',
    sequence: 'This PIN is a sequence. Mix the digits.',
  },
  server: {
    failed: 'The server made a mistake. It is written down, and nothing was changed.',
    unavailable: 'The server cannot reach its data now. Try again in a moment.',
  },
};
