import type { Words } from './words.ts';

/** What people write in Italian: so far only what makes an emergency. */
export const it: Words = {
  language: 'it',
  groups: '.',
  says: {},
  danger: {
    unwell: ['vertigini', 'gira la testa', 'nausea', 'vomita', 'vomitando', 'tossisce', 'non smette di tossire', 'fumi'],
    mixed: ['mescolato', 'mescolata', 'ho mescolato', 'rovesciato', 'versato'],
    reactive: ['candeggina', 'cloro', 'ipoclorito', 'acido'],
    smell: ['odore', 'puzza'],
    place: ['cantina', 'stanza', 'sala', 'dappertutto', 'ovunque', 'non si puo stare'],
    skin: ['sulle mani', 'sulla mano', 'sul braccio', 'sulla pelle'],
    down: [
      'e svenuto', 'e svenuta', 'svenuto', 'svenuta', 'incosciente', 'privo di sensi', 'priva di sensi',
      'ha perso i sensi', 'perso i sensi', 'ha perso conoscenza', 'perso conoscenza', 'e crollato',
      'e crollata', 'si e accasciato', 'accasciato', 'non si muove', 'non si sveglia', 'a terra',
      'e collassato', 'collassato', 'collassata', 'convulsioni', 'e caduto a terra', 'non si rialza',
      'ha avuto un malore', 'malore', 'sviene', 'non si muove piu', 'stramazzato',
    ],
    breathless: [
      'non respira', 'non riesce a respirare', 'non riesco a respirare', 'non puo respirare',
      'fatica a respirare', 'soffoca', 'sta soffocando', 'soffocando', "attacco d'asma", 'attacco di asma',
      'gli manca il respiro', 'manca il respiro', "manca l'aria", 'non respira piu', 'respira a fatica',
      'respira male', 'asfissia', "crisi d'asma",
    ],
    person: [
      'qualcuno', 'collega', 'ragazzo', 'ragazza', 'uomo', 'donna', 'lui', 'lei', 'operaio', 'operaia', 'capo',
      'figlio', 'fratello', 'padre', 'persona', 'stagista', 'amico', 'bambino', 'bambina', 'cantiniere',
      'apprendista', 'tizio', 'dipendente',
    ],
    thing: [
      'schiuma', 'cappello', 'vasca', 'serbatoio', 'pompa', 'tubo', 'scaffale', 'prezzo', 'mercato', 'scatola',
      'muro', 'tetto', 'botte', 'fermentazione', 'vino', 'ph', 'lievito', 'filtro', 'pressa', 'pedana',
      'torchio', 'bancale', 'barrique', 'prezzi',
    ],
    fell: [
      'e caduto nella', 'e caduto nel', 'e caduto dentro', 'caduto nella', 'caduto nel', 'caduta nella',
      'caduto dentro', 'caduto in',
    ],
    beside: ['accanto', 'vicino', 'nella', 'nel', 'alla', 'al', 'in', 'davanti', 'dietro', 'dentro'],
    silent: [
      'non risponde', 'non risponde piu', 'non esce', 'non e uscito', 'non rispondono', 'intrappolato',
      'intrappolata', 'non parla', 'non da segni', 'non esce piu', 'nessuna risposta', 'non e piu uscito',
      'non torna su', 'non e uscita',
    ],
    'went-in': [
      'e entrato', 'e entrata', 'e caduto nella', 'e caduto nel', 'e caduto dentro', 'e sceso nella',
      'e sceso nel', 'caduto nella', 'nella vasca', 'nel serbatoio', 'dentro la vasca', 'dentro al serbatoio',
      'e dentro', 'nella botte', 'nella pressa', 'entrato nella', 'entrato nel', 'caduta nella', 'sceso in',
      'caduto dentro', 'dentro il serbatoio', 'e caduto in', 'caduto in vasca',
    ],
    'hurt-eye': [
      'negli occhi', "nell'occhio", 'nel occhio', 'in faccia', 'sul viso', 'mi bruciano gli occhi',
      'gli bruciano gli occhi', 'le bruciano gli occhi', 'bruciano gli occhi', 'occhi che bruciano',
      'in un occhio', 'gli occhi bruciano', 'occhi bruciano', 'agli occhi',
    ],
    swallowed: [
      'ha ingoiato', 'ingoiato', 'ha ingerito', 'ingerito', 'ho ingoiato', 'ho ingerito', 'ha inghiottito',
      'inghiottito',
    ],
    drank: ['ha bevuto', 'bevuto', 'ho bevuto', 'ha mangiato'],
    vessel: ['vasca', 'serbatoio', 'botte', 'pressa', 'autoclave', 'tino', 'cisterna', 'torchio'],
    chemical: [
      'metabisolfito', 'meta', 'bisolfito', 'so2', 'kmbs', 'solfito', 'solforosa', 'soda', 'acido',
      'soluzione', 'zolfo', 'prodotto',
    ],
    gas: ['gas', 'so2', 'solforosa', 'bombola', 'anidride', 'bombola di so2', 'biossido di zolfo', 'co2'],
    leak: [
      'perdita', 'fuga', 'perde', 'sta perdendo', 'fuoriesce', 'sta uscendo', 'fischia', 'fughe', 'perdite',
      'fuoriuscita', 'esce',
    ],
    burnt: ['si e bruciato', 'ustione', 'sulla pelle', 'ustionato'],
    alarm: [
      'ambulanza', 'emergenza', 'aiuto', 'chiama il 118', 'chiama il 112', 'chiamate il 118',
      'chiamate il 112', 'intossicato', 'intossicata', 'ha inalato', 'ha respirato so2', 'avvelenato',
      'inalato', 'respirato so2', 'intossicazione', 'pronto soccorso',
    ],
    elsewhere: [
      'telefono', 'cellulare', 'messaggio', 'mail', 'cliente', 'fornitore', 'uscita', 'luce', 'laboratorio',
      'chiamata', 'porta', 'etichetta', 'prova', 'luci', 'con',
    ],
  },
};
