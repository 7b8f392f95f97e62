/** What the planning form says about a plan while it is typed, with the numbers and what can be done. */
export default {
  'pressure-over-flange':
    'The test pressure {target} is {by} over the flange’s rated working pressure {limit}. Lower the test pressure or choose a head with a higher rating.',
  'pressure-over-collapse':
    'The test pressure {target} is {by} over the casing’s collapse rating {limit}: the void presses on the casing from outside. Lower the test pressure.',
  'pressure-over-collapse-share':
    'The test pressure {target} is {by} over {limit}, the share of the casing’s collapse rating that this job allows. It will need a concession; a lower test pressure does not.',
  'pressure-over-seal':
    'The test pressure {target} is {by} over the seal’s own rating {limit}. It will need a concession; a lower test pressure does not.',
  'head-for-other-casing': 'This head is made for {head} casing and the job has {casing}. Choose the head that fits.',
  'socket-tight':
    'The socket is bored {bore}; casing at the upper end of its tolerance may measure {largest}. Measure the casing before the head is lifted.',
  'seals-miscounted':
    'The head’s drawing names {seals} seals and not as many places for them. Mend the head in set-up.',
  'flange-unknown': 'No flange of size {size} at {rating} stands in the table; it lists {known}. Check the nameplate.',
  'inside-pass-without-weld':
    'The procedure has an inside pass and the head is welded outside only. Choose the other procedure or head.',
  'inside-weld-without-pass':
    'The head is welded outside and inside and the procedure has no inside pass. Choose the other procedure or head.',
  'on-both-sides':
    '{name} stands on both sides: a welder or coordinator is never a guest’s representative too. Choose somebody else for one of them.',
  'nobody-is-welder': 'No welder is on this job. Add one: the welder records.',
  'nobody-is-company-rep': 'No company representative is on this job. Add one: he releases.',
  'nobody-is-tool-pusher': 'No tool pusher is on this job. Add one: he names the valve’s direction and confirms it.',
  'nobody-qualified':
    'No welder of this crew has used {process} within the last six months. Add one who has, or bring the record up to date.',
  'instrument-out-of-date':
    '{name} ran out of calibration on {until}. Its readings will need a concession; a gas meter out of date is not used at all.',
  'no-gas-meter': 'No gas meter is on this job. Add one: nothing is lit without a reading.',
  'no-gauge': 'No gauge or recorder is on this job. Add one for the pressure test.',
  'setting-out-of-range': '{name} must lie between {min} and {max}.',
  nitrogen:
    'Nitrogen stores far more energy than oil. The test needs an exclusion zone, and nobody inside it while pressure is on.',
};
