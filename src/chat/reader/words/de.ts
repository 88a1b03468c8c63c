import type { Words } from './words.ts';

/** What people write in German: so far only what makes an emergency. */
export const de: Words = {
  language: 'de',
  groups: '.',
  says: {},
  danger: {
    unwell: ['schwindlig', 'schwindelig', 'schwindel', 'ubel', 'ubelkeit', 'erbricht', 'hustet', 'hustet nur noch', 'dampfe'],
    mixed: ['gemischt', 'zusammengeschuttet', 'verschuttet', 'vermischt'],
    reactive: ['chlor', 'chlorreiniger', 'bleiche', 'javelwasser', 'saure'],
    smell: ['riecht', 'gestank', 'stinkt', 'geruch'],
    place: ['keller', 'raum', 'halle', 'uberall', 'nicht auszuhalten'],
    skin: ['auf den handen', 'auf der hand', 'auf die hande', 'auf die hand', 'auf dem arm', 'auf der haut'],
    down: [
      'zusammengebrochen', 'zusammengeklappt', 'bewusstlos', 'ohnmachtig', 'in ohnmacht', 'umgekippt',
      'umgefallen', 'ohne bewusstsein', 'bewegt sich nicht', 'bewegt sich nicht mehr', 'wacht nicht auf',
      'liegt am boden', 'liegt auf dem boden', 'krampft', 'kollabiert', 'nicht ansprechbar', 'bricht zusammen',
      'liegt reglos', 'weggetreten', 'regt sich nicht', 'kippt um', 'ist umgekippt',
    ],
    breathless: [
      'atmet nicht', 'atmet nicht mehr', 'kann nicht atmen', 'kann nicht mehr atmen', 'bekommt keine luft',
      'kriegt keine luft', 'krieg keine luft', 'kriege keine luft', 'bekomme keine luft', 'keine luft',
      'erstickt', 'ringt nach luft', 'asthmaanfall', 'atemnot', 'schwer atmen', 'nicht atmen', 'atmet kaum',
      'atmet schwer',
    ],
    person: [
      'jemand', 'kollege', 'kollegin', 'mann', 'frau', 'er', 'sie', 'arbeiter', 'arbeiterin', 'chef', 'sohn',
      'bruder', 'vater', 'person', 'praktikant', 'lehrling', 'azubi', 'freund', 'kind', 'mitarbeiter',
      'kellermeister', 'helfer', 'aushilfe',
    ],
    thing: [
      'schaum', 'tresterhut', 'tank', 'pumpe', 'schlauch', 'regal', 'preis', 'preise', 'markt', 'kiste',
      'kisten', 'wand', 'dach', 'fass', 'garung', 'wein', 'ph', 'hefe', 'filter', 'palette', 'presse',
      'stapel', 'flasche', 'hut', 'leiter', 'stimmung', 'glas', 'flaschen', 'eimer',
    ],
    fell: ['in den tank gefallen', 'reingefallen', 'hineingefallen', 'gefallen', 'gesturzt', 'hineingesturzt'],
    beside: ['neben', 'vor', 'hinter', 'bei', 'in', 'an', 'auf', 'beim', 'am', 'im', 'unter'],
    silent: [
      'antwortet nicht', 'antwortet nicht mehr', 'reagiert nicht', 'reagiert nicht mehr', 'meldet sich nicht',
      'meldet sich nicht mehr', 'kommt nicht raus', 'kommt nicht heraus', 'kommt nicht mehr raus',
      'keine antwort', 'gibt keine antwort', 'eingeklemmt', 'sagt nichts mehr', 'nicht wieder herausgekommen',
      'kommt nicht wieder', 'gibt keinen laut', 'kommt nicht mehr heraus',
    ],
    'went-in': [
      'in den tank', 'in den behalter', 'in die presse', 'in den tank gestiegen', 'im tank',
      'in den tank gefallen', 'ist im tank', 'in der presse', 'im behalter', 'hineingefallen', 'reingefallen',
      'in tank', 'in das fass', 'ins fass', 'in die butte', 'im gartank', 'hineingestiegen', 'reingestiegen',
      'in den keller gegangen', 'in den garkeller',
    ],
    'hurt-eye': [
      'in die augen', 'ins auge', 'in den augen', 'im auge', 'ins gesicht', 'augen brennen', 'augen brennt',
      'in beide augen', 'brennt in den augen', 'brennt im auge', 'brennen die augen', 'in meine augen',
      'auge brennt', 'in die auge',
    ],
    swallowed: ['verschluckt', 'geschluckt', 'hat verschluckt', 'runtergeschluckt', 'heruntergeschluckt'],
    drank: ['getrunken', 'trank', 'gegessen'],
    vessel: ['tank', 'behalter', 'presse', 'butte', 'fass', 'gartank', 'garbehalter', 'bottich', 'zisterne'],
    chemical: [
      'kaliumdisulfit', 'disulfit', 'kds', 'kaliumpyrosulfit', 'so2', 'kmbs', 'sulfit', 'schwefel', 'saure',
      'lauge', 'schweflige', 'losung', 'metabisulfit', 'schwefeldioxid', 'pulver',
    ],
    gas: [
      'gas', 'so2', 'schwefeldioxid', 'gasflasche', 'so2 flasche', 'schwefel', 'co2', 'gase', 'dampfe',
      'flasche so2', 'gargas', 'kohlensaure',
    ],
    leak: [
      'leck', 'undicht', 'tritt aus', 'stromt aus', 'entweicht', 'zischt', 'ausgetreten', 'leckt', 'austritt',
      'gasaustritt', 'stromt', 'lauft aus', 'ausgestromt', 'ausstromt',
    ],
    burnt: ['verbrannt', 'veratzt', 'auf der haut', 'auf die haut'],
    alarm: [
      'gasleck', 'gasleckage', 'krankenwagen', 'notfall', 'hilfe', 'rettungswagen', 'notarzt', 'ruf die 112',
      'ruft die 112', '112 rufen', 'vergiftet', 'eingeatmet', 'gasvergiftung', 'hat so2 eingeatmet',
      'vergiftung', 'gasaustritt',
    ],
    elsewhere: [
      'telefon', 'handy', 'nachricht', 'mail', 'kunde', 'lieferant', 'ausgang', 'licht', 'labor', 'anruf',
      'tur', 'ubung', 'hilfe bei', 'lieferung', 'bitte um hilfe', 'email',
    ],
  },
};
