/** Why a photo or a recorder file is not taken, by the code of the refusal; merged into the area `errors`. */
export default {
  photo: {
    empty: 'The file is empty. Take the photo again.',
    unreadable: 'The file could not be read from this device. Take the photo again.',
    'too-large': 'The photo is larger than 15 MB. Set the camera to a smaller size and take it again.',
    'not-an-image': 'The file is not a photo. JPEG, PNG, WebP and HEIC are taken.',
    truncated: 'The photo is cut off or damaged. Take it again.',
    'no-size': 'The photo has no width or no height. Take it again.',
    'too-many-pixels': 'The photo has more than 60 megapixels. Set the camera to a smaller size and take it again.',
    polyglot:
      'The file carries something else beside the photo, so it is not taken. Send the photo as the camera made it.',
  },
  recorder: {
    empty: 'The recorder file is empty. Export it again.',
    'too-large': 'The recorder file is larger than 5 MB. Export the test alone.',
    'not-text': 'The recorder file is not plain text. Export it as CSV in UTF-8.',
    'not-a-table': 'The recorder file holds no table. Export it as CSV with one sample on each line.',
  },
  file: {
    'hash-mismatch': 'The file changed on its way. It is sent again from this device.',
    incomplete: 'The file did not arrive whole. It is sent again from this device.',
    'too-often': 'Too many files at once. They are sent again in {seconds} seconds.',
  },
} as const;
