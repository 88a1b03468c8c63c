import type { Words } from './words.ts';

/** What people write in French: so far only what makes an emergency. */
export const fr: Words = {
  language: 'fr',
  groups: '',
  says: {},
  danger: {
    unwell: ['vertige', 'vertiges', 'tete qui tourne', 'nausee', 'nausees', 'vomit', 'vomir', 'tousse', "n'arrete pas de tousser", 'fumees'],
    mixed: ['melange', 'melangee', 'a melange', 'renverse'],
    reactive: ['javel', 'eau de javel', 'chlore', 'hypochlorite', 'acide'],
    smell: ['odeur', 'sent', 'pue'],
    place: ['chai', 'cave', 'cuverie', 'salle', 'partout', 'intenable', 'on ne peut pas rester'],
    skin: ['sur les mains', 'sur la main', 'sur le bras', 'sur la peau'],
    down: [
      "s'est evanoui", "s'est evanouie", 'evanoui', 'evanouie', 'inconscient', 'inconsciente',
      "s'est effondre", "s'est effondree", 'a perdu connaissance', 'perdu connaissance', 'sans connaissance',
      'ne bouge plus', 'ne se reveille pas', 'par terre', 'est tombe dans les pommes', 'a fait un malaise',
      'fait un malaise', 'malaise', 'convulse', 'convulsions', 'bouge plus', "s'ecroule", "s'est ecroule",
      'ne se releve pas', 'ne se releve plus', 'tombe dans les pommes', 'est a terre', 'git au sol',
    ],
    breathless: [
      'ne respire plus', 'respire plus', 'ne peut plus respirer', 'ne peut pas respirer', 'peux plus respirer',
      "n'arrive plus a respirer", "n'arrive pas a respirer", 'etouffe', "s'etouffe", 'suffoque',
      "crise d'asthme", 'du mal a respirer', 'asphyxie', 'arrive plus a respirer', 'arrive pas a respirer',
      "je m'etouffe", 'suffoquer', 'peut plus respirer', 'respire mal', 'peine a respirer', 'respire a peine',
    ],
    person: [
      "quelqu'un", 'collegue', 'gars', 'homme', 'femme', 'il', 'elle', 'ouvrier', 'ouvriere', 'stagiaire',
      'chef', 'patron', 'fils', 'frere', 'pere', 'personne', 'copain', 'salarie', 'enfant', 'ami', 'caviste',
      'apprenti', 'type', 'mec', 'saisonnier',
    ],
    thing: [
      'mousse', 'chapeau', 'cuve', 'pompe', 'tuyau', 'etagere', 'prix', 'marche', 'carton', 'mur', 'toit',
      'fut', 'barrique', 'fermentation', 'vin', 'ph', 'levure', 'filtre', 'palette', 'pressoir', 'marc',
      'etiquette', 'la fa', 'capsule', 'bouchon',
    ],
    fell: ['est tombe dans', 'tombe dans', 'est tombee dans', 'tombe dedans', 'tombee dans'],
    beside: ['pres', 'devant', 'dans', 'sur', 'derriere', 'de', 'du', 'cote', 'sous'],
    silent: [
      'ne repond plus', 'ne repond pas', 'repond plus', 'repond pas', "n'est pas ressorti",
      "n'est pas remonte", 'ne ressort pas', 'ne remonte pas', 'pas de reponse', 'ne dit plus rien', 'coince',
      'ne donne plus signe', 'ressort pas', 'plus de reponse', 'ne repondent plus', 'est pas ressorti',
      'aucune reponse',
    ],
    'went-in': [
      'est entre dans', 'entre dans la cuve', 'est tombe dans', 'tombe dans la cuve', 'est descendu dans',
      'descendu dans', 'dans la cuve', 'dans une cuve', 'est rentre dans', 'rentre dans la cuve',
      'dans le pressoir', 'est dans la', 'descendu dans la', 'tombe dedans', 'est entree dans',
      'est tombee dans', 'dans la cuverie', 'entre dans', 'tombe dans',
    ],
    'hurt-eye': [
      'dans les yeux', "dans l'oeil", 'dans le yeux', 'dans le visage', 'au visage', 'les yeux qui brulent',
      'yeux qui brulent', 'les yeux me brulent', 'me brule les yeux', 'brule les yeux', 'yeux brulent',
      'plein les yeux', 'yeux piquent', 'yeux qui piquent', 'brulure aux yeux', 'dans un oeil',
      'les yeux brulent', 'dans mes yeux', 'dans ses yeux',
    ],
    swallowed: ['a avale', 'avale', "j'ai avale", 'ingere', 'a ingere'],
    drank: ['a bu', "j'ai bu", 'a mange', 'bu'],
    vessel: ['cuve', 'cuves', 'pressoir', 'foudre', 'tonneau', 'citerne', 'conquet', 'fosse'],
    chemical: [
      'metabisulfite', 'meta', 'bisulfite', 'so2', 'kmbs', 'sulfite', 'soude', 'acide', 'solution', 'soufre',
      'produit',
    ],
    gas: [
      'gaz', 'so2', 'bouteille de so2', 'anhydride', 'dioxyde de soufre', 'co2', 'bombonne', 'bonbonne',
      'soufre', 'vapeurs',
    ],
    leak: [
      'fuite', 'fuit', 'fuites', 'fuyait', "s'echappe", "s'echappent", 'siffle', 'echappe', 'echappement',
      'se repand',
    ],
    burnt: ["s'est brule", 'brule la peau', 'brulure', 'sur la peau'],
    alarm: [
      'ambulance', 'urgence', 'au secours', 'pompiers', 'samu', 'appelle le 15', 'appelez le 15',
      'appelle le 18', 'appelez le 112', 'intoxique', 'intoxiquee', 'gaze', 'a inhale', 'a respire du so2',
      'inhale', 'empoisonne', 'respire du so2', 'respire du gaz', 'intoxication',
    ],
    elsewhere: [
      'telephone', 'portable', 'message', 'mail', 'client', 'fournisseur', 'sortie', 'lumiere', 'texto',
      'laboratoire', 'labo', 'appel', 'exercice', 'porte', 'commande', 'mails',
    ],
  },
};
