import { onBothSides, type Role } from '../permissions/roles';
import { accept, event, jobContentMoved, refuse, signature, type Decider } from './decision';
import type { SettingName, Terms } from './plan';
import { settingNames } from './plan';
import { planRefused } from './plan-refused';
import { withTrueSources } from './settings';
import type { JobState } from './state';
import { onlyStricter, releasedBy } from './terms-in-use';

/** Any time before the head is lifted; after that turning it rolls the seal. */
export const decideNameDirection: Decider<'name-direction'> = (input) => {
  if (input.state.headSet) return refuse('head-already-set');
  const { direction, words } = input.command.body;
  if (direction === 'other' && words === null) return refuse('direction-without-words');
  return accept(event(input, 'direction-named', input.command.body));
};

export const decideProposeDirection: Decider<'propose-direction'> = (input) => {
  if (input.state.headSet) return refuse('head-already-set');
  return accept(event(input, 'direction-proposed', input.command.body));
};

export const decideHandOver: Decider<'hand-over'> = (input) =>
  accept(event(input, 'shift-handed-over', input.command.body));

const changedSettings = (a: Terms, b: Terms): SettingName[] =>
  settingNames.filter((name) => a.settings[name].value !== b.settings[name].value);

/** Names of terms that a released point was judged by and that this change would move. */
const inUse = (state: JobState, terms: Terms): string[] => {
  const old = state.plan.terms;
  const moved = [
    ...(['datum', 'targetHeightIn', 'standOffIn'] as const).filter((name) => old[name] !== terms[name]),
    ...(JSON.stringify(old.test) === JSON.stringify(terms.test) ? [] : ['test' as const]),
  ];
  return [...moved, ...changedSettings(old, terms).filter((name) => !onlyStricter(name, old, terms))].filter(
    (name) => releasedBy(state, name).length > 0,
  );
};

/** Before point 1 is released the coordinator may still mend the plan; after that it takes the representative's signature. */
export const decideChangeTerms: Decider<'change-terms'> = (input) => {
  const { state, command, actor, at } = input;
  const { reason } = command.body;
  const terms = withTrueSources(command.body.terms);
  const begun = state.points.some((point) => point.status === 'released');
  const isRep = actor.roles.includes('company_rep');
  if (begun && !isRep) return refuse('terms-need-signature');
  const used = inUse(state, terms);
  if (used.length > 0) return refuse('terms-in-use', { missing: used.map((name) => `term:${name}`) });
  const unworkable = planRefused({ ...state.plan, terms, people: state.people }, at);
  if (unworkable) return unworkable;
  const moved = jobContentMoved(input, command.body);
  if (moved) return moved;
  const signed = isRep ? signature(input, 'change-terms', command.body) : null;
  return accept(event(input, 'terms-changed', { terms, reason, signature: signed }));
};

export const decideAssignPerson: Decider<'assign-person'> = (input) => {
  const { person } = input.command.body;
  const held = input.state.people.some((one) => one.accountId === person.accountId && one.role === person.role);
  if (held) return refuse('role-already-held', { params: { name: person.name } });
  const roles = input.state.people.filter((one) => one.accountId === person.accountId).map((one) => one.role);
  if (onBothSides([...roles, person.role])) return refuse('roles-not-together', { params: { name: person.name } });
  return accept(event(input, 'person-assigned', { person }));
};

/** Without one of these roles on it a job cannot go on. */
const needed: readonly Role[] = ['welder', 'company_rep', 'tool_pusher'];

export const decideRemovePerson: Decider<'remove-person'> = (input) => {
  const { accountId, role, reason } = input.command.body;
  const { people } = input.state;
  const person = people.find((one) => one.accountId === accountId && one.role === role);
  if (!person) return refuse('person-not-on-job');
  const others = people.filter((one) => one.role === role && one.accountId !== accountId);
  if (needed.includes(role) && others.length === 0) return refuse('last-of-role');
  return accept(event(input, 'person-removed', { accountId, name: person.name, role, reason }));
};
