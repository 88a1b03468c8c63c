import type { Words } from './words.ts';

/** What people write in Portuguese: so far only what makes an emergency. */
export const pt: Words = {
  language: 'pt',
  groups: '.',
  says: {},
  danger: {
    unwell: ['tonto', 'tonta', 'tonturas', 'tontura', 'nauseas', 'a vomitar', 'vomitando', 'a tossir', 'tossindo', 'fumos'],
    mixed: ['misturei', 'misturou', 'misturado', 'misturada', 'derramado', 'entornou'],
    reactive: ['lixivia', 'agua sanitaria', 'cloro', 'hipoclorito', 'acido'],
    smell: ['cheiro', 'cheira', 'fede'],
    place: ['adega', 'sala', 'por todo o lado', 'em todo o lado', 'nao se pode estar'],
    skin: ['nas maos', 'na mao', 'no braco', 'na pele'],
    down: [
      'desmaiou', 'desmaiado', 'desmaiada', 'inconsciente', 'perdeu os sentidos', 'sem sentidos',
      'perdeu a consciencia', 'desfaleceu', 'caiu no chao', 'nao se mexe', 'nao acorda', 'esta no chao',
      'caido no chao', 'colapsou', 'convulsoes', 'desacordado', 'desacordada', 'apagou', 'esta caido',
      'tombou', 'perdeu os sentido', 'caida no chao', 'sem consciencia',
    ],
    breathless: [
      'nao consegue respirar', 'nao consigo respirar', 'nao respira', 'nao esta a respirar',
      'nao esta respirando', 'sem respirar', 'esta a sufocar', 'sufocando', 'falta de ar', 'com falta de ar',
      'ataque de asma', 'engasgado', 'dificuldade em respirar', 'dificuldade para respirar', 'asfixia',
      'mal consegue respirar', 'sem ar', 'parou de respirar', 'respira mal', 'crise de asma',
      'nao conseguem respirar',
    ],
    person: [
      'alguem', 'colega', 'rapaz', 'rapariga', 'homem', 'mulher', 'ele', 'ela', 'operario', 'trabalhador',
      'chefe', 'filho', 'irmao', 'pai', 'pessoa', 'estagiario', 'amigo', 'crianca', 'funcionario', 'moco',
      'adegueiro', 'ajudante', 'empregado',
    ],
    thing: [
      'espuma', 'chapeu', 'tanque', 'cuba', 'bomba', 'mangueira', 'prateleira', 'preco', 'precos', 'mercado',
      'caixa', 'parede', 'telhado', 'barrica', 'fermentacao', 'vinho', 'ph', 'levedura', 'filtro', 'prensa',
      'palete', 'manta', 'aplicacao', 'luz', 'vela',
    ],
    fell: ['caiu na', 'caiu no', 'caiu dentro', 'caiu a', 'caiu ao', 'caiu para'],
    beside: ['lado', 'perto', 'na', 'no', 'junto', 'dentro', 'da', 'do', 'em'],
    silent: [
      'nao responde', 'nao atende', 'nao sai', 'nao saiu', 'nao respondem', 'preso', 'presa', 'nao fala',
      'deixou de responder', 'nao da sinal', 'ja nao responde', 'sem resposta', 'nao voltou',
      'parou de responder', 'nao da resposta',
    ],
    'went-in': [
      'entrou na', 'entrou no', 'caiu na', 'caiu no', 'caiu dentro', 'desceu a', 'desceu para', 'desceu na',
      'desceu ao', 'esta dentro', 'dentro da cuba', 'dentro do tanque', 'na cuba', 'no tanque',
      'dentro do deposito', 'na prensa', 'no deposito', 'entrou dentro', 'no lagar', 'dentro da prensa',
      'entrou em',
    ],
    'hurt-eye': [
      'nos olhos', 'no olho', 'na cara', 'no rosto', 'os olhos ardem', 'olhos a arder', 'olhos ardendo',
      'arder os olhos', 'ardem os olhos', 'ardem me os olhos', 'para os olhos', 'queimou os olhos', 'num olho',
      'olhos ardem', 'olho a arder', 'aos olhos', 'olhos queimando',
    ],
    swallowed: ['engoliu', 'ingeriu', 'engoli', 'ingeri', 'engolido'],
    drank: ['bebeu', 'bebi', 'comeu', 'tomou'],
    vessel: ['cuba', 'tanque', 'deposito', 'prensa', 'lagar', 'balseiro', 'cisterna'],
    chemical: [
      'metabissulfito', 'meta', 'bissulfito', 'so2', 'kmbs', 'sulfito', 'sulfuroso', 'soda', 'acido',
      'solucao', 'enxofre', 'produto', 'sulfurosa',
    ],
    gas: [
      'gas', 'so2', 'sulfuroso', 'garrafa de so2', 'botija', 'anidrido', 'cilindro', 'dioxido de enxofre',
      'co2', 'gases', 'garrafa de gas',
    ],
    leak: [
      'fuga', 'vazamento', 'vazando', 'vaza', 'a vazar', 'escapar', 'escapando', 'a escapar', 'a verter',
      'fugas', 'vazou', 'a sair',
    ],
    burnt: ['queimou se', 'queimadura', 'na pele', 'se queimou'],
    alarm: [
      'ambulancia', 'emergencia', 'socorro', 'ligar 112', 'liguem 112', 'chama o 112', 'liga 112',
      'intoxicado', 'intoxicada', 'inalou', 'respirou so2', 'envenenado', 'intoxicacao', 'samu',
      'chama o inem', 'inem', 'respirou gas',
    ],
    elsewhere: [
      'telefone', 'telemovel', 'celular', 'mensagem', 'email', 'cliente', 'fornecedor', 'saida', 'luz',
      'laboratorio', 'chamada', 'porta', 'simulacro', 'luzes', 'mail',
    ],
  },
};
