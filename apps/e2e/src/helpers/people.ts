/** Who plays a role in the tests, by the demo's sign-ins. */
export interface Person {
  readonly name: string;
  readonly email: string;
  readonly application: 'storefront' | 'admin';
}

const PASSWORD = 'cut along the seam';

const buyer = (name: string, email: string): Person => ({ name, email, application: 'storefront' });
const staff = (name: string, email: string): Person => ({ name, email, application: 'admin' });

export const NORA = buyer('Nora Quillam', 'nora@ladle.example');
export const LUCIAN = buyer('Lucian Amberley', 'lucian@brackenholme.example');
export const ADA = staff('Ada Thornquist', 'ada@withenbeck.example');
export const RUBEN = staff('Ruben Castellane', 'ruben@withenbeck.example');
export const TAMSIN = staff('Tamsin Okafor-Reed', 'tamsin@withenbeck.example');
export const PETRA = staff('Petra Lindqvist-Mole', 'petra@withenbeck.example');
export const FEMI = staff('Femi Adeyinka-Holt', 'femi@withenbeck.example');
export const ANNEKE = staff('Anneke Brandsma', 'anneke@withenbeck.example');

/** The demo's one password. */
export const passwordOf = (_person: Person): string => PASSWORD;
