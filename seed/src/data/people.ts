/** The demo accounts: role addresses only, one a role. Their password is printed in README.md and on the sign-in page. */
export const DEMO_PASSWORD = 'stageyard-demo';

export const DEMO_PEOPLE = [
  { email: 'admin@brackenbay.example', name: 'Bracken Bay admin', roles: ['admin'] },
  { email: 'designer@brackenbay.example', name: 'Bracken Bay designer', roles: ['designer'] },
  { email: 'librarian@brackenbay.example', name: 'Bracken Bay librarian', roles: ['librarian'] },
  { email: 'purchaser@brackenbay.example', name: 'Bracken Bay purchaser', roles: ['purchaser'] },
  { email: 'viewer@brackenbay.example', name: 'Bracken Bay viewer', roles: ['viewer'] },
] as const;
