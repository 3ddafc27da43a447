import type { Panel } from '../types';

export const panels: Panel[] = [
  {
    id: 'complaints',
    station: 'vehicle-and-history',
    title: 'Complaints',
    prompt: 'What were you told?',
    checks: [
      'complaint-oil',
      'complaint-slow-air',
      'complaint-no-air',
      'complaint-cycling',
      'complaint-noise',
      'complaint-heat',
      'complaint-engine-oil-use',
    ],
  },
  {
    id: 'changed-with-it',
    station: 'vehicle-and-history',
    title: 'Changed with it',
    prompt: 'What was changed or done when this compressor was fitted?',
    checks: [
      'discharge-line-changed',
      'governor-changed',
      'feed-line-changed',
      'intake-hose-changed',
      'dryer-cartridge-changed',
      'system-cleaned',
    ],
  },
  {
    id: 'work-before',
    station: 'vehicle-and-history',
    title: 'Work shortly before',
    prompt: 'What was done to the vehicle in the days before it began?',
    checks: ['work-oil-service', 'work-turbo-breather-intake', 'work-cooling'],
  },
  {
    id: 'where-oil-is-found',
    station: 'tanks-and-system',
    title: 'Where oil is found',
    prompt: 'At which of these places do you find oil?',
    checks: ['oil-at-purge', 'oil-at-dryer-inlet', 'oil-in-wet-tank', 'oil-in-service-tanks', 'oil-at-valves'],
  },
  {
    id: 'coolant-traces',
    station: 'cylinder-and-head',
    title: 'Coolant traces',
    prompt: 'Which of these do you see?',
    checks: ['coolant-in-wet-tank', 'coolant-level-falling', 'coolant-bubbles'],
  },
  {
    id: 'inside-the-intake',
    station: 'intake',
    title: 'Inside the intake',
    prompt: 'With the intake hose off, which of these do you see?',
    checks: ['oil-in-intake-hose', 'dirt-past-filter', 'intake-joint-leaks'],
  },
  {
    id: 'safety-valves',
    station: 'unloader-and-governor',
    title: 'Safety valves',
    prompt: 'Which safety valve has lifted or is wet?',
    checks: ['head-safety-valve', 'wet-tank-safety-valve'],
  },
];
