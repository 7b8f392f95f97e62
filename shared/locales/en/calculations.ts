/** What a person is told when a typed quantity or a calculation is refused: what to type or measure instead. */
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
  'not-a-number': 'A number is missing here. Type the figure that was read.',
  'below-range': 'This number is too small to work with. Check it and type it again.',
  'above-range': 'This number is too large to work with. Check it and type it again.',
  'too-few-readings': 'More readings are needed. Take another one and type it in.',
  'wall-too-thick': 'The wall is too thick for this outside diameter. Check both numbers.',
  'bore-not-smaller': 'The fillet is too large for the bore. Check the leg and the diameter.',
  'reading-at-or-below-ambient': 'A reading is at or below the air temperature. Check both, then type them again.',
  'readings-at-one-time': 'The readings stand at one and the same time. Take the next one some minutes later.',
  'not-cooling': 'The readings do not fall. Take another one later.',
  'target-never-reached': 'The air is as warm as the temperature asked for, so the weld never gets there by itself.',
  'no-fit-for-ambient': 'The readings do not show the air temperature yet. Type it in, or take more readings.',
  'no-limit-given': 'No rating is known. Type the flange rating, the casing or the seal rating.',
  'flange-not-in-table':
    'The table has no flange of this size at this pressure. Check the nameplate and pick another class.',
  'casing-not-in-table': 'The table has no casing of this size, weight and grade. Type its wall and yield strength.',
  'grade-unknown': 'This grade is not known here. Type it as stencilled, such as J55, or type the yield strength.',
  'electrode-class-unknown':
    'This electrode class is not known here. Type it as stamped on the rod, such as E7018-1 H4R.',
  'site-limit-looser': 'A site may set a stricter gas limit, never a looser one. Type a limit on the safe side.',
  'date-not-understood': 'This is no date. Type year, month and day, such as 2026-08-31.',
  'edition-unknown': 'This rule or edition is not known here. Pick one from the list.',
  'gas-denser-than-equation': 'The gas is denser than the equation reaches. Check the pressure.',
  'casing-outside-stakes': 'The casing must stand between the two stakes. Check the distances.',
} as const;
