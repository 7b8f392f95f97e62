import type { Role } from '../../shared/permissions';

/** A person of the invented scenario. Passwords and PINs are public: these accounts sign in in demo mode alone. */
export interface DemoPerson {
  id: string;
  name: string;
  email: string;
  password: string;
  pin: string;
  roles: readonly Role[];
  /** names of the operators whose sealed packets may be read */
  grants: readonly string[];
  /** processes with the days since they were last used */
  qualifications: readonly { process: string; usedDaysAgo: number }[];
}

const idOf = (number: number) => `01940000-0000-7000-8000-0000000000${String(number).padStart(2, '0')}`;

const person = (
  number: number,
  name: string,
  email: string,
  [password, pin]: [password: string, pin: string],
  roles: readonly Role[],
  more: Partial<Pick<DemoPerson, 'grants' | 'qualifications'>> = {},
): DemoPerson => ({
  id: idOf(number),
  name,
  email: `${email}@headfast.example`,
  password,
  pin,
  roles,
  grants: more.grants ?? [],
  qualifications: more.qualifications ?? [],
});

const smaw = [{ process: 'SMAW', usedDaysAgo: 21 }];

/** Everybody by the key that tests and the terminal use. */
export const demoPeopleByKey = {
  coordinator: person(1, 'R. Sollers', 'sollers', ['three heads on one truck', '730461'], ['coordinator']),
  welder: person(2, 'W. Calder', 'calder', ['dry rods from a hot oven', '402917'], ['welder'], {
    qualifications: smaw,
  }),
  secondWelder: person(3, 'L. Amaro', 'amaro', ['string line over two stakes', '581306'], ['welder'], {
    qualifications: smaw,
  }),
  companyRep: person(4, 'O. Brandt', 'brandt', ['trailer light at midnight', '269053'], ['company_rep']),
  secondCompanyRep: person(5, 'N. Ekberg', 'ekberg', ['coffee before the safety talk', '918472'], ['company_rep']),
  toolPusher: person(6, 'T. Rhule', 'rhule', ['valve toward the pipe racks', '347160'], ['tool_pusher']),
  secondToolPusher: person(7, 'B. Oduya', 'oduya', ['crew change on a windy day', '605829'], ['tool_pusher']),
  auditor: person(8, 'I. Vann', 'vann', ['paper that still reads later', '174938'], ['auditor'], {
    grants: ['Marrow Creek Resources'],
  }),
  oneManFirm: person(9, 'J. Tamblyn', 'tamblyn', ['one truck and one notebook', '836205'], ['welder', 'coordinator'], {
    qualifications: [{ process: 'SMAW', usedDaysAgo: 60 }],
  }),
} as const satisfies Record<string, DemoPerson>;

export type DemoKey = keyof typeof demoPeopleByKey;

/** Everybody, in the order in which the terminal lists them. */
export const demoPeople: readonly DemoPerson[] = Object.values(demoPeopleByKey);
