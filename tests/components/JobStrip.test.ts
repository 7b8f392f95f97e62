import { describe, expect, it } from 'vitest';
import JobStrip from '../../src/components/job/JobStrip.vue';
import { mountWithWords } from './mount-with-words';

const points = [
  { id: 'hot-work-clearance', status: 'released', label: 'Hot work clearance' },
  { id: 'height-takeoff', status: 'presented', label: 'Height takeoff' },
  { id: 'final-cut', status: 'shut', label: 'Final cut' },
];

describe('the job strip', () => {
  it('is heard as a named list of hold points with their states', () => {
    const strip = mountWithWords(JobStrip, { points });
    expect(strip.attributes('aria-label')).toBe('Hold points of this job');
    expect(strip.findAll('li').map((point) => point.text())).toEqual([
      'Hot work clearance: Released',
      'Height takeoff: Presented',
      'Final cut: Shut',
    ]);
  });

  it('marks the one being worked on', () => {
    const strip = mountWithWords(JobStrip, { points, current: 'height-takeoff' });
    expect(strip.findAll('li').map((point) => point.attributes('aria-current'))).toEqual([
      undefined,
      'step',
      undefined,
    ]);
  });

  it('shows the state by an icon as well, never by colour alone', () => {
    const drawn = mountWithWords(JobStrip, { points })
      .findAll('svg')
      .map((icon) => icon.html());
    expect(new Set(drawn).size).toBe(3);
  });
});
