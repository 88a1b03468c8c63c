import type { Words } from './words.ts';

/** What people write in Spanish: so far only what makes an emergency. */
export const es: Words = {
  language: 'es',
  groups: '.',
  says: {},
  danger: {
    unwell: ['mareado', 'mareada', 'mareo', 'me mareo', 'vomitando', 'nauseas', 'tosiendo', 'no para de toser', 'humos', 'echa humo'],
    mixed: ['mezclado', 'mezclada', 'mezcle', 'mezclamos', 'ha mezclado', 'derramado', 'se derramo'],
    reactive: ['lejia', 'cloro', 'hipoclorito', 'acido'],
    smell: ['olor', 'huele', 'huelen', 'apesta'],
    place: ['bodega', 'sala', 'nave', 'por todas partes', 'no se puede estar', 'no se puede entrar'],
    skin: ['en las manos', 'en la mano', 'en el brazo', 'en la piel', 'por encima'],
    down: [
      'se desmayo', 'se ha desmayado', 'desmayado', 'desmayada', 'se desplomo', 'se ha desplomado',
      'inconsciente', 'sin conocimiento', 'perdio el conocimiento', 'ha perdido el conocimiento',
      'no despierta', 'no se mueve', 'se cayo redondo', 'tirado en el suelo', 'tirada en el suelo',
      'se ha caido redondo', 'convulsiones', 'se desvanecio', 'se ha desvanecido', 'no reacciona', 'sin pulso',
      'colapso', 'ha colapsado', 'desplomado', 'caido en el suelo', 'se desmaya', 'perdido el conocimiento',
      'se mareo y cayo', 'ha caido redondo', 'se ha mareado y',
    ],
    breathless: [
      'no puede respirar', 'no puedo respirar', 'no respira', 'le cuesta respirar', 'me cuesta respirar',
      'se ahoga', 'me ahogo', 'se esta ahogando', 'se asfixia', 'se esta asfixiando', 'ataque de asma',
      'no podemos respirar', 'sin respirar', 'falta el aire', 'asfixiandose', 'dejo de respirar',
      'ha dejado de respirar', 'no pueden respirar', 'respira mal', 'apenas respira', 'crisis de asma',
    ],
    person: [
      'alguien', 'companero', 'companera', 'chico', 'chica', 'hombre', 'mujer', 'ella', 'operario', 'peon',
      'jefe', 'hijo', 'hermano', 'padre', 'trabajador', 'trabajadora', 'persona', 'becario', 'nino', 'nina',
      'amigo', 'bodeguero', 'encargado', 'nuevo',
    ],
    thing: [
      'espuma', 'sombrero', 'tanque', 'deposito', 'bomba', 'manguera', 'estante', 'precio', 'mercado', 'caja',
      'pared', 'techo', 'barrica', 'fermentacion', 'ph', 'vino', 'aroma', 'levadura', 'pila', 'palet',
      'filtro', 'prensa', 'valvula', 'aplicacion', 'estanteria',
    ],
    fell: [
      'cayo en el', 'cayo al', 'se cayo en', 'se cayo al', 'se ha caido en', 'se ha caido al', 'cayo dentro',
      'se cayo dentro', 'se ha caido dentro', 'caido en el', 'caido al', 'se ha caido a', 'se cayo a',
    ],
    beside: ['junto', 'lado', 'en', 'dentro', 'cerca', 'detras', 'del', 'al', 'de'],
    silent: [
      'no contesta', 'no responde', 'no sale', 'no ha salido', 'no contestan', 'no responden',
      'ya no contesta', 'ya no responde', 'atrapado', 'atrapada', 'no dice nada', 'no vuelve', 'sin contestar',
      'sin responder', 'no habla', 'no me contesta', 'no nos contesta', 'no da respuesta',
    ],
    'went-in': [
      'entro en el', 'entro al', 'ha entrado en', 'ha entrado al', 'se metio en', 'se ha metido en',
      'se metio dentro', 'se ha metido dentro', 'cayo en el', 'cayo al', 'se cayo en', 'se cayo al',
      'se ha caido en', 'se ha caido al', 'cayo dentro', 'dentro del deposito', 'dentro del tanque',
      'dentro de la cuba', 'esta dentro', 'bajo al deposito', 'bajo al tanque', 'en el deposito',
      'en el tanque', 'entro a', 'entro en', 'se metio al', 'ha bajado al', 'se ha caido dentro',
      'se cayo dentro', 'en la cuba', 'dentro de la prensa', 'en la prensa', 'ha entrado', 'dentro del',
    ],
    'hurt-eye': [
      'en los ojos', 'en el ojo', 'a los ojos', 'al ojo', 'en la cara', 'me arden los ojos',
      'le arden los ojos', 'me queman los ojos', 'le queman los ojos', 'me escuecen los ojos',
      'le escuecen los ojos', 'en un ojo', 'en ojos', 'los ojos me arden', 'los ojos me queman',
      'quemo los ojos', 'me pican los ojos', 'le pican los ojos',
    ],
    swallowed: [
      'se trago', 'se ha tragado', 'trago', 'ha tragado', 'ingirio', 'ha ingerido', 'me trague',
      'me he tragado', 'he tragado', 'trague',
    ],
    drank: ['bebio', 'ha bebido', 'se bebio', 'se ha bebido', 'comio', 'he bebido', 'bebi'],
    vessel: ['deposito', 'tanque', 'cuba', 'tina', 'pileta', 'prensa', 'lagar', 'tolva', 'foso'],
    chemical: [
      'metabisulfito', 'meta', 'bisulfito', 'sulfuroso', 'so2', 'kmbs', 'sulfito', 'sosa', 'acido', 'solucion',
      'azufre', 'producto',
    ],
    gas: [
      'gas', 'so2', 'sulfuroso', 'botella de so2', 'bombona', 'anhidrido', 'gases', 'dioxido de azufre', 'co2',
    ],
    leak: [
      'fuga', 'fugas', 'escape', 'se escapa', 'esta escapando', 'escapando', 'pierde', 'perdiendo', 'se sale',
      'saliendo', 'hay una fuga', 'escapa', 'silba',
    ],
    burnt: ['se quemo', 'me queme', 'se ha quemado', 'quemadura', 'en la piel'],
    alarm: [
      'ambulancia', 'emergencia', 'socorro', 'auxilio', 'llama al 112', 'llamad al 112', 'intoxicado',
      'intoxicada', 'gaseado', 'inhalado', 'ha respirado so2', 'ha respirado gas', 'inhalo', 'respiro so2',
      'envenenado', 'intoxicacion', 'respirado so2',
    ],
    elsewhere: [
      'telefono', 'movil', 'mensaje', 'correo', 'cliente', 'proveedor', 'salida', 'luz', 'whatsapp',
      'laboratorio', 'llamada', 'puerta', 'luces', 'cubata', 'simulacro',
    ],
  },
};
