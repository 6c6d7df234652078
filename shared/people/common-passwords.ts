/**
 * Passwords that are tried first. The list is our own: plain words of every day, as people choose
 * them, with the tails they add, and walks over the keyboard. From memory, no list was copied.
 */
const WORDS = [
  ...['password', 'passwort', 'contrasena', 'contraseña', 'letmein', 'welcome', 'bienvenido'],
  ...['iloveyou', 'teamo', 'teamomucho', 'princess', 'princesa', 'sunshine', 'football', 'futbol'],
  ...['baseball', 'dragon', 'monkey', 'shadow', 'master', 'superman', 'batman', 'summer', 'verano'],
  ...['winter', 'invierno', 'spring', 'autumn', 'freedom', 'whatever', 'trustno', 'starwars'],
  ...['computer', 'internet', 'secret', 'secreto', 'admin', 'administrator', 'manager', 'login'],
  ...['qwerty', 'qwertyuiop', 'asdfgh', 'zxcvbn', 'abcdef', 'abc', 'test', 'guest', 'changeme'],
  ...['hello', 'hola', 'amor', 'familia', 'family', 'mexico', 'america', 'chocolate', 'cookie'],
  ...['pokemon', 'naruto', 'liverpool', 'barcelona', 'realmadrid', 'roofing', 'roofer', 'metal'],
  ...['techos', 'lamina', 'sheetmetal', 'foldyard', 'flashing', 'company', 'empresa', 'business'],
]

const TAILS = [
  ...['', '1', '12', '123', '1234', '12345', '123456', '!', '1!', '123!', '01', '007', '11', '69'],
  ...['2023', '2024', '2025', '2026', '99', '00', '.', '*', '#1', '_1', '@123'],
]

const WALKS = [
  ...[
    '1q2w3e4r',
    '1qaz2wsx',
    'qazwsxedc',
    'q1w2e3r4',
    'zaq12wsx',
    'qwerasdf',
    'asdfjkl;',
    'qwer1234',
  ],
  ...[
    '1234qwer',
    'abcd1234',
    '1234abcd',
    'abc12345',
    'a1b2c3d4',
    '12345678',
    '123456789',
    '87654321',
  ],
  ...[
    '11223344',
    '12341234',
    '00000000',
    '123123123',
    '147258369',
    '159753456',
    '741852963',
    'asdasdasd',
  ],
  ...[
    'p@ssw0rd',
    'p@ssword',
    'passw0rd',
    'pa55word',
    'pa$$word',
    'passw0rd1',
    'p@ssw0rd1',
    'l3tm31n!',
  ],
]

/** In small letters. */
export const COMMON_PASSWORDS: ReadonlySet<string> = new Set([
  ...WORDS.flatMap((word) => TAILS.map((tail) => word + tail)),
  ...WALKS,
])
