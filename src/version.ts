/** Version of Ferrule, told in every dossier and report; the same as in package.json (checked by a test). */
export const version = '0.1.0';
