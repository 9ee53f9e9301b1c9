/** Fields of a player that a column can hold, apart from sizes. */
export const playerFields = ['name', 'firstName', 'lastName', 'nameOnBack', 'number', 'role'] as const;
export type PlayerField = (typeof playerFields)[number];

/** Fields of a team that a column can hold. */
export const teamFields = [
  'team',
  'division',
  'homeColour',
  'homeNumber',
  'awayColour',
  'awayNumber',
  'manager',
] as const;
export type TeamField = (typeof teamFields)[number];

/**
 * A heading in the form in which headings are compared: lower case, without accents, brackets and punctuation (the
 * number sign stays), one space between words. Empty for a heading without letters.
 */
export function normaliseHeading(heading: string): string {
  return heading
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/\([^)]*\)|\[[^\]]*\]/g, ' ')
    .replace(/['’`]/g, '')
    .replace(/[^\p{L}\p{N}#]+/gu, ' ')
    .trim();
}

const list = (words: string): string[] => words.split(',').map((word) => normaliseHeading(word));

/** Headings people write over these columns, in several languages. Common practice, no source. */
const playerWords: Record<PlayerField, string[]> = {
  name: list(
    'name,names,player,players,player name,full name,athlete,athlete name,child name,childs name,' +
      'nom complet,nom et prénom,joueur,nombre completo,nombre y apellidos,jugador,jugadora,spieler,spielerin,' +
      'spielername,vollständiger name,naam,speler,spelare,spiller,giocatore,zawodnik,imię i nazwisko,jogador',
  ),
  firstName: list(
    'first name,first,given name,given names,forename,forenames,player first name,vorname,prénom,nombre,voornaam,förnamn,fornavn,' +
      'imię,nome,fornafn,jméno,firstname',
  ),
  lastName: list(
    'last name,last,surname,family name,player last name,nachname,familienname,nom,nom de famille,apellido,apellidos,' +
      'achternaam,efternamn,etternavn,efternavn,cognome,nazwisko,sobrenome,příjmení,lastname',
  ),
  nameOnBack: list(
    'name on back,back name,name on shirt,name on jersey,shirt name,jersey name,printed name,print name,' +
      'name to print,name printed,nom au dos,nombre en la espalda,rückenname,name auf dem rücken,naam op rug',
  ),
  number: list(
    '#,no,number,num,nr,nº,n,№,player number,player no,shirt number,shirt no,shirt #,jersey number,jersey no,jersey #,' +
      'uniform number,squad number,kit number,number on back,numéro,numero,número,dorsal,maillot,nummer,rückennummer,' +
      'trikotnummer,rugnummer,tröjnummer,draktnummer,numer',
  ),
  role: list(
    'role,position,pos,playing position,rolle,poste,posición,posicion,posizione,positie,pozycja,função',
  ),
};

const teamWords: Record<TeamField, string[]> = {
  team: list(
    'team,team name,name,club,club name,side,equipo,équipe,mannschaft,verein,ploeg,squadra,lag,drużyna',
  ),
  division: list(
    'division,age group,age band,group,league division,grade,flight,división,liga,klasse,divisie,altersklasse',
  ),
  homeColour: list(
    'home colour,home color,home kit,home shirt,home shirt colour,home shirt color,home jersey,home,colour,color,team colour,' +
      'team color,heimfarbe,couleur domicile,color local',
  ),
  homeNumber: list(
    'home number,home number colour,home number color,number colour,number color,home numbers,number colour home',
  ),
  awayColour: list(
    'away colour,away color,away kit,away shirt,away shirt colour,away shirt color,away jersey,away,second colour,second color,' +
      'change colour,auswärtsfarbe,couleur extérieur,color visitante',
  ),
  awayNumber: list('away number,away number colour,away number color,away numbers,number colour away'),
  manager: list(
    'manager,manager email,manager e mail,email,e mail,e mail address,email address,contact,contact email,mail,coach email,correo',
  ),
};

const index = <Field extends string>(words: Record<Field, string[]>): Map<string, Field> =>
  new Map(
    (Object.keys(words) as Field[]).flatMap((field) => words[field].map((word) => [word, field] as const)),
  );

const playerIndex = index(playerWords);
const teamIndex = index(teamWords);

/** The field of a player that a heading names, or null: the whole heading must be a known one. */
export const findPlayerField = (heading: string): PlayerField | null =>
  playerIndex.get(normaliseHeading(heading)) ?? null;

/** The field of a team that a heading names, or null: the whole heading must be a known one. */
export const findTeamField = (heading: string): TeamField | null =>
  teamIndex.get(normaliseHeading(heading)) ?? null;

const sizeWords = new Set(
  list('size,sizes,sz,größe,grösse,groesse,taille,talla,maat,storlek,størrelse,taglia,rozmiar,tamanho'),
);

/** The words of a heading, those that only say "size" taken out; `size` tells whether there were any. */
export function readSizeHeading(heading: string): { size: boolean; words: string[] } {
  const words = normaliseHeading(heading).split(' ').filter(Boolean);
  const others = words.filter((word) => !sizeWords.has(word));
  return { size: others.length < words.length, words: others };
}

/** Whether a heading names any column of a list of players or teams, or a size. */
export const isKnownHeading = (heading: string): boolean =>
  findPlayerField(heading) !== null || findTeamField(heading) !== null || readSizeHeading(heading).size;
