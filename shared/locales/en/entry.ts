/** Why an answer was not understood, and how to type it. */
export default {
  'quantity-empty': 'Nothing is typed yet. Type a number, such as 14 3/8.',
  'quantity-not-understood':
    'This is not read as a measurement. Type it as the tape says it: 14 3/8, 1\' 2-3/8" or 365 mm.',
  'quantity-not-finite': 'This is no number. Type the figures that were read.',
  'quantity-exponent': 'Write the number out in full, without an exponent: 1000 in place of 1e3.',
  'quantity-many-commas': 'Use one decimal mark only, a point or a comma: 12.5.',
  'quantity-comma-ambiguous':
    'The comma could mean thousands or decimals. Type 1250 for twelve hundred and fifty, 1.25 for one and a quarter.',
  'quantity-zero-denominator': 'A fraction cannot end in zero. Type the mark on the tape, such as 3/8 or 3/16.',
  'quantity-fraction-not-on-tape': 'A tape has halves, quarters, eighths, 16ths, 32nds and 64ths. Use one of those.',
  'quantity-fraction-not-proper':
    'The fraction is one inch or more. Put a space between inches and fraction: 14 3/8, not 143/8.',
  'quantity-fraction-needs-inches': 'Fractions are read in inches only. Add in behind it, or type a decimal number.',
  'quantity-fraction-with-decimal': 'Use a decimal or a fraction, not both: 14.375 or 14 3/8.',
  'quantity-inches-reach-a-foot': 'After feet, the inches must be under 12. Type 6\' 2" in place of 5\' 14".',
  'quantity-feet-not-whole': 'Feet must be a whole number when inches follow. Type 5\' 9" in place of 5.5\' 3".',
  'quantity-unit-unknown':
    'This unit is not known here. Use in, ft, mm, psi, bar, kPa, MPa, °F, °C, %, ppm, V, A, min, h or s.',
  'quantity-unit-of-another-kind': 'This unit measures something else. Type the reading in a unit that fits the field.',
  'quantity-too-many-digits':
    'That is more digits than an instrument shows. Use up to nine before the point and six behind it.',
  'answer-empty': 'Nothing is typed yet. Type or choose an answer.',
  'count-not-whole': 'This is counted in whole numbers. Type one like 12.',
  'check-yes-or-no': 'This is answered with yes or no.',
  'choice-not-offered': 'This answer is not among those offered. Choose one of them.',
  'time-not-understood': 'This is not read as a time. Set date and time, or use Now.',
};
