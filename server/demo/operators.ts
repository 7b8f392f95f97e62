/** The operators of the invented scenario with their rigs. */
export const demoOperators = [
  {
    id: '01940000-0000-7000-8000-000000000101',
    name: 'Marrow Creek Resources',
    rigs: [{ id: '01940000-0000-7000-8000-000000000201', name: 'Pronghorn 7', zone: 'America/Chicago' }],
  },
  {
    id: '01940000-0000-7000-8000-000000000102',
    name: 'Quillback Ridge Operating',
    rigs: [{ id: '01940000-0000-7000-8000-000000000202', name: 'Burdock 3', zone: 'America/Denver' }],
  },
] as const;
