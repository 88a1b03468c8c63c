### Lo que decimos, en español: de tú, como entre compañeros de bodega. Las cifras llegan ya escritas.
### Una línea es una cosa; un teléfono muestra unas 45 letras de ella por fila.

## Piezas que usan otras frases

list-separator = {", "}
barrel-name = barrica
cautions-separator = {" "}
dose-in-all-separator = {" y "}
cautions-of-separator = {" "}
assumed-separator = {"; "}

additive =
    { $additive ->
        [potassium-metabisulfite] metabisulfito potásico (E 224)
        [sodium-metabisulfite] metabisulfito sódico (E 223)
        [potassium-metabisulfite-solution] solución de metabisulfito potásico
        [sodium-metabisulfite-solution] solución de metabisulfito sódico
        [potassium-bisulfite-solution] solución de bisulfito potásico (E 228)
        [ammonium-bisulfite-solution] solución de bisulfito amónico
        [sulfur-dioxide-solution] solución sulfurosa (SO2 en agua)
        [sulfur-dioxide-gas] SO2 gas (E 220)
        [tablet] pastillas efervescentes
       *[other] aditivo
    }
stage-now =
    { $stage ->
        [must] mosto
        [fermenting] todavía fermentando
        [malolactic] maloláctica por hacer
        [base] vino base
        [bottled] embotellado
       *[finished] fermentaciones acabadas
    }
weigh =
    { $vessel ->
        [none] Pesa
       *[other] { $vessel }: pesa
    }
measure =
    { $vessel ->
        [none] Mide
       *[other] { $vessel }: mide
    }
take =
    { $vessel ->
        [none] Toma
       *[other] { $vessel }: toma
    }
at =
    { $vessel ->
        [none] {""}
       *[other] { $vessel }:{" "}
    }
for-each =
    { $count ->
        [one] {""}
       *[other] {" "}para cada uno
    }
target =
    { $kind ->
        [molecular] { $value } molecular
        [free] { $value } de libre
       *[add] + { $value }
    }

## La primera línea: una dosis

tablet-word =
    { $unit ->
        [tablet] pastilla
       *[tablets] pastillas
    }
tablets-of =
    { $additive ->
        [tablet] { $amount } { $unit ->
            [tablet] pastilla efervescente
           *[tablets] pastillas efervescentes
        } (de { $size } g de SO2)
       *[other] { $amount } { tablet-word } de { $size } g de { additive }
    }
measured =
    { $unit ->
        [tablet] { tablets-of }{ for-each }
        [tablets] { tablets-of }{ for-each }
        [solution] { $amount } de { additive } al { $strength } %{ for-each }
       *[other] { $amount } de { additive }{ for-each }
    }
bare-amount =
    { $unit ->
        [tablet] { $amount } { tablet-word }{ for-each }
        [tablets] { $amount } { tablet-word }{ for-each }
       *[other] { $amount }{ for-each }
    }
dose-weigh = { weigh } { measured }
dose-measure = { measure } { measured }
dose-tablets = { take } { measured }
dose-gas = { weigh } { $amount } de SO2 gas{ for-each }: solo personal formado, con equipo de respiración a mano, y siempre por peso
dose-in-all = Para los { $count }: { $list }.
in-all-stock = { $amount } de la solución al { $strength } %
dose-tablet-too-large = { at }media pastilla{ for-each } ya es demasiado.
dose-tablets-give = Las pastillas solas dan { $gives } de { $wanted } { $unit }.
dose-stock = O bien { $amount } de una solución al { $strength } %{ for-each }.
dose-only-stock = { measure } { $amount } de { additive } al { $strength } %{ for-each }
dose-rest-as-stock = El resto: { $amount } de { additive } al { $strength } %{ for-each }.
dose-negligible = { at }no vale la pena añadir nada (faltan { $short }).
dose-too-fine = { at }demasiado poco para pesarlo o medirlo (faltan { $short }): prepara una solución más floja.
dose-gas-too-little = { at }{ $amount } es demasiado poco para gas: usa una solución.
dose-bottled = { at }embotellado: para añadir hay que abrir cada botella. Pregunta antes.
refused-ammonium = { at }el bisulfito amónico es solo para uva y mosto (OIV): no para este vino; pregunta antes.
refused-ammonium-must =
    { $stage ->
        [assumed] Lo tomo por vino con las fermentaciones acabadas. ¿Es mosto? Escríbelo entero, con la palabra mosto.
       *[said] ¿Es mosto? Escríbelo entero, con la palabra mosto.
    }
dose-nothing = { at }no hay que añadir nada.
dose-rate = { at }{ $dose } de SO2 por añadir, o sea { measured } por { $per }
dose-rate-bare = { at }{ $dose } de SO2 por añadir
dose-need = { at }con pH { $ph }, { $molecular } molecular pide { $free } de libre
dose-now = { at }{ $molecular } molecular ahora (pH { $ph }, { $free } de libre)

## La ley

law-of =
    { $region ->
        [oiv] código internacional
        [eu] UE
        [uk] Reino Unido
        [us] EE. UU.
        [ca] Canadá
        [ca-qc] Quebec
        [au] Australia
        [nz] Nueva Zelanda
        [za] Sudáfrica
        [ar] Argentina
        [cl] Chile
        [br] Brasil
        [jp] Japón
        [kr] Corea
        [cn] China
        [codex] Codex
        [ch] Suiza
        [ge] Georgia
        [hk] Hong Kong
        [eaeu] Unión Euroasiática
        [uy] Uruguay
        [in] India
        [md] Moldavia
       *[mercosur] Mercosur
    }
law-decides =
    { $region ->
        [oiv] ; decide la ley de tu país
       *[other] {""}
    }
rule-sugar =
    { $band ->
        [under] {" "}con menos de { $high } g/L de azúcar
        [to] {" "}hasta { $high } g/L de azúcar
        [from] {" "}desde { $low } g/L de azúcar
        [above] {" "}con más de { $low } g/L de azúcar
        [between] {" "}de { $low } a { $high } g/L de azúcar
       *[none] {""}
    }
rule-class =
    { $class ->
        [sweet-300] , dulce con denominación
        [sweet-350] , dulce con denominación
        [sweet-400] , dulce con denominación
        [national-pdo] , DOP
        [national-pdo-dry] , DOP seco
        [national-pdo-other] , DOP no seco
        [dry] , seco
        [sweet] , dulce
        [bulk-export] , granel para exportación
        [made-with-organic] , hecho con uva ecológica
       *[none] {""}
    }
rule-what =
    { $what ->
        [red] tinto
        [pale] blanco o rosado
        [white] blanco
        [quality-sparkling] espumoso de calidad
        [other-sparkling] otro espumoso
        [fortified] vino de licor
        [cider] sidra
        [mead] hidromiel
        [fruit-wine] vino de frutas
        [alcohol-free] vino sin alcohol
       *[wine] vino
    }{ $organic ->
        [yes] { $what ->
            [cider] {" "}ecológica
           *[other] {" "}ecológico
        }
       *[no] {""}
    }{ rule-sugar }{ rule-class }
rule-short = { law-of }, { rule-what }
dose-capped =
    { $of ->
        [free] { $list }, no más: libre luego hasta { $after }, límite { $limit } { $unit } de libre ({ rule-short }).
       *[total] { $list }, no más: total luego { $least ->
            [yes] al menos{" "}
           *[no] {""}
        }{ $after }, límite { $limit } { $unit } ({ rule-short }).
    }
round-capped =
    { $of ->
        [free] { at }libre luego hasta { $after }, límite { $limit } { $unit } de libre ({ rule-short }).
       *[total] { at }total luego { $least ->
            [yes] al menos{" "}
           *[no] {""}
        }{ $after }, límite { $limit } { $unit } ({ rule-short }).
    }
dose-at-limit =
    { $least ->
        [yes] { at }mide el total antes de nada: ahora es al menos { $now }, y esto pasaría el límite de { $limit } { $unit } ({ rule-short }).
       *[no] { at }ahora nada de sulfuroso, { $standing ->
            [over] ya pasa del límite
           *[at] está en el límite
        }: { $of ->
            [free] libre { $now }, límite { $limit } { $unit } de libre ({ rule-short }).
           *[total] total { $now }, límite { $limit } { $unit } ({ rule-short }).
        }
    }
dose-over-already = Así no se puede vender según esa ley{ law-decides }: pregunta a quien responde de este vino.
law-assumed = Sin dato, se toma el límite más estricto: { $list }.
law-unknown =
    { $code ->
        [colour-assumed] color
        [sugar-assumed] azúcar
        [sparkling-class-assumed] clase de espumoso
       *[density-assumed] densidad
    }
dose-capped-kept =
    { $reserve ->
        [none] Se guardan { $kept } { $unit } por debajo, pues un { $of ->
            [free] libre
           *[total] total
        } medido puede errar tanto. Tu objetivo lo superaría.
       *[some] Se guardan { $kept } { $unit } por debajo: { $error } porque un { $of ->
            [free] libre
           *[total] total
        } medido puede errar tanto, { $reserve } para el embotellado. Tu objetivo lo superaría.
    }
full-dose-asks =
    { $of ->
        [free] { at }el libre podría llegar a { $after }, sobre el límite de { $limit } { $unit } de libre ({ rule-short }). ¿Doy las cifras de todos modos?
       *[total] { at }el total sería { $least ->
            [yes] al menos{" "}
           *[no] {""}
        }{ $after }, sobre el límite de { $limit } { $unit } ({ rule-short }). ¿Doy las cifras de todos modos?
    }
full-dose-care = Así el vino quizá no se pueda vender según esa ley. En el registro queda que se sabía. No es consejo legal: confírmalo para tu mercado.
full-dose-left = Dejado: vale la dosis menor.
full-dose-none = No hay arriba ninguna dosis que pase un límite.
button-full-dose = Dosis completa
button-all-the-same = Sí, de todos modos
over-rule-noted = ⚠ Pasa el límite ({ rule-short }): eso queda en el registro.
over-rule = sobre el límite ({ rule-short })
total-sum = total { $total } ({ $measured } medido { $day } + { $since } añadido desde entonces)
limit-is =
    { at }{ $operator ->
        [below] menos de
       *[at-most] como mucho
    } { $limit } { $unit } de SO2 { $of ->
        [free] libre
       *[total] total
    }: { rule-short }{ $written ->
        [same] {""}
       *[other] , escrito { $value } { $law_unit }
    }{ $density ->
        [none] {""}
       *[other] {" "}(con densidad { $density })
    }{ $uplift ->
        [none] {""}
       *[other] , de ello { $uplift } por el año declarado
    }.
limit-room =
    { $standing ->
        [over] Ahora { $of ->
            [free] libre
           *[total] total
        } { $now }: lo pasa en { $room } { $unit }.
       *[room] Ahora { $of ->
            [free] libre
           *[total] total
        } { $now }: quedan { $room } { $unit }; { $left } guardando { $kept } por debajo.
    }
limit-amount = { $left } mg/L en { $volume }: { bare-amount } de { additive }.
limit-text =
    { $text }{ $provision ->
        [none] {""}
       *[other] , { $provision }
    }{ $version ->
        [none] {""}
       *[other] {" "}({ $version })
    }: { $checked ->
        [law-text] leído en el texto de la ley
        [law-copy] leído en una copia de la ley
        [agency] leído en la página del organismo
        [foreign-agency] leído en la página de un organismo de otro país
        [trade-guide] leído en una guía del sector
        [secondary] leído en una fuente secundaria
       *[memory] de memoria, sin confirmar: no rebaja ninguna dosis
    }.
limit-none =
    { at }sin límite en mis datos: { law-of }, { $product ->
        [still] vino
        [sparkling] espumoso
        [quality-sparkling] espumoso de calidad
        [other-sparkling] espumoso
        [fortified] vino de licor
        [fruit-wine] vino de frutas
        [alcohol-free] vino sin alcohol
        [cider] sidra
        [mead] hidromiel
       *[other] { $product }
    }{ $reason ->
        [not-found] {" "}(buscado, no encontrado)
       *[other] {""}
    }. No adivino: consúltalo para tu mercado.
limit-notes = Nota: { $list }.
limit-notes-separator = {"; "}
law-note =
    { $code ->
        [recommends-only] el código recomienda, decide la ley de tu país
        [other-value-told] en otra parte se da otra cifra
        [boundary-open] el texto deja abierto justo este azúcar, se tomó el lado más estricto
        [boundary-told-otherwise] la página leída pone este límite al otro lado
        [dry-undefined] seco y dulce se dan sin cifra
        [band-misprinted] la hoja imprime el tramo al revés
        [by-reference] por remisión al texto de la UE
        [derived] dos cifras leídas, restadas
        [combined-as-total] el texto dice combinado, tomado como total
        [from-seven-percent] para vino de 7 % o más
        [bulk-has-less] el granel para exportación tiene un límite menor
        [stacks-on-general] el límite general vale además
        [sugar-assumed] azúcar sin dato, tomado por lo más estricto
        [colour-assumed] color sin dato, tomado por lo más estricto
        [sparkling-class-assumed] clase de espumoso sin dato, tomada la más estricta
        [density-assumed] densidad sin dato, tomada 0,990 (di: densidad 0,995)
        [designation-not-on-file] sin dato para esa denominación
        [no-uplift] aquí no hay más en año declarado
        [organic-not-on-file] sin límite ecológico en mis datos, se tomó el general
        [repealed] { $value } { $unit } está derogado y no se usa
        [other-unit-told] otra fuente da { $value } { $unit }
       *[second-value-told] { $value } { $unit } se da en otra parte, de memoria
    }
limit-care = No es consejo legal: confírmalo para tu mercado.
designation-asked = ¿Vino dulce de una denominación con límite propio ({ law-of })? Nunca lo deduzco: dilo así: { $wine } con denominación 300

## La primera línea: una elección y no una dosis

choice-head = { at }una elección, no una dosis: con pH { $ph }, { $target } molecular pide { $free } de libre.
choice-leave = { $mark } Dejarlo: { $free } de libre es { $molecular } molecular.
choice-to =
    { $total ->
        [unknown] { $mark } A { $free } ({ $molecular } molecular): { measured }; total sin dato: mídelo antes
       *[known] { $mark } A { $free } ({ $molecular } molecular): { measured }
    }
choice-no-amount = – A { $free } ({ $molecular } molecular): sin cantidad: el total pasaría de { $limit } ({ law-of }).
choice-red =
    { $kind ->
        [none] Si es tinto, { $red } pide { $free } de libre: nada que añadir.
        [over] Si es tinto, { $red } pide { $free } de libre: sin cantidad, el total pasaría de { $limit } ({ law-of }).
       *[other] Si es tinto, { $red } pide { $free } de libre: { bare-amount }.
    }
ways-out = O bien: más frío, más limpio, medir más a menudo; ácido para bajar el pH: pregunta a alguien cualificado.

## La fase

bottling-no-oxygen = No se cuenta el oxígeno. Mídelo, disuelto y en espacio de cabeza, y escríbelo detrás: oxígeno 2 mg/L
bottling-takes = { $oxygen } mg/L de oxígeno pueden gastar { $loss } { $unit } ({ bottling-each }).
bottling-target = { $after } de libre al embotellar, o sea { $now } ahora: { $oxygen } mg/L de oxígeno pueden gastar { $loss } { $unit } ({ bottling-each }).
bottling-each =
    { $each ->
        [formula] 4 por 1, por fórmula
       *[other] { $each } por 1, como dices
    }
bottling-measured = Cifras del sector (sin confirmar) dan { $each } por 1: bastaría { bare-amount }. Para contar así: oxígeno { $oxygen } mg/L x { $each }
bottling-measured-none = Cifras del sector (sin confirmar) dan { $each } por 1: no haría falta nada. Para contar así: oxígeno { $oxygen } mg/L x { $each }
condition-stage = Solo si la malo está hecha o no se quiere.
condition-red =
    { $kind ->
        [none] Si es tinto ({ $red } molecular): nada que añadir.
        [over] Si es tinto ({ $red } molecular): { bare-amount }, también sobre { $limit }.
       *[other] Si es tinto ({ $red } molecular): { bare-amount }.
    }
no-dose-fermenting = { at }ahora nada de sulfuroso, todavía fermenta.
no-dose-malolactic = { at }ahora nada de sulfuroso, falta la maloláctica.
no-dose-molecular = Ahora { $molecular } molecular.
no-dose-why = Las bacterias piden libre por debajo de 5–10 y total por debajo de 30–40 mg/L (publicado para pH 3,3–3,5).
no-dose-why-fermenting = El sulfuroso ahora se combina enseguida y daña levaduras y bacterias: estas piden libre por debajo de 5–10, total por debajo de 30–40 mg/L (publicado para pH 3,3–3,5).
no-dose-all-the-same = ¿Tu propia cifra de todos modos? Pregunta a quien responde de este vino y escríbelo entero: { whole-example }
figure-alone = “{ $text }”: en esa fase solo tomo una cifra en un mensaje entero. Escribe: { whole-example }
whole-example = { $wine }{ in-all } { stage-word } añadir { $adds } { $unit }
in-all =
    { $count ->
        [several] {" "}en total
       *[one] {""}
    }
stage-word =
    { $stage ->
        [must] mosto
        [fermenting] fermentando
        [malolactic] en maloláctica
       *[base] vino base
    }

## Lo que hace

effect-land = { $after } { $unit } de libre si nada se combina; cuenta con { $range } (suele combinarse de 1/3 a 1/2); mide mañana.
effect-land-molecular = De { $molecularNow } a { $molecular } molecular: { $after } { $unit } de libre si nada se combina; cuenta con { $range } (suele combinarse de 1/3 a 1/2); mide mañana.
effect-land-to-molecular = A { $molecular } molecular: { $after } { $unit } de libre si nada se combina; cuenta con { $range } (suele combinarse de 1/3 a 1/2); mide mañana.
effect-land-low = { $after } { $unit } de libre si nada se combina; por debajo de 10 de libre puede combinarse mucho o todo: cuenta con { $range }, mide antes de añadir otra vez.
effect-land-small = { $after } { $unit } de libre como mucho: sube menos que el error de una medida.
effect-rise = El libre sube unos { $range } { $unit } (suele combinarse de 1/3 a 1/2); mide mañana.
effect-must = La mayor parte se combina mientras fermenta el mosto: luego no protege el vino.
must-comes-back = Un tercio más o menos vuelve como SO2 total: + { $total } { $unit } (texto técnico alemán, 2012).
must-yeast = Levadura de { $least } a { $most } horas después (práctica común, sin fuente).
must-malolactic = Hasta { $most } { $unit } antes de estrujar no estorba a la maloláctica (AWRI).
must-published =
    { $read ->
        [read] Publicado: { $list } ({ $source }).
       *[memory] Publicado: { $list } ({ $source }; de memoria, no leído).
    }
must-none-published = Las cifras que tengo se publicaron para uva; para { fact-product } no hay ninguna.
must-range =
    { $state ->
        [sound] uva { must-colour }sana { $range }
        [damaged] uva { must-colour }algo dañada { $range }
       *[rot] uva { must-colour }con podredumbre { $range }
    } { $unit }
must-colour =
    { $style ->
        [red] tinta{" "}
       *[any] {""}
    }
must-say-state = ¿Cómo viene la uva? Di uva sana, algo dañada o con podredumbre, y habrá una cifra que elegir.
button-published = Añadir { $add }
effect-raise = + { $dose } { $unit } si nada se combina; suele combinarse de 1/3 a 1/2; mide mañana.
third-needs =
    { $third ->
        [more] ; si se combina un tercio hace falta la mitad más
       *[covered] {""}
    }
effect-allowance = Dosis × { $factor } por + { $percent } %: llega a { $after } { $unit } si se combina como mucho un { $covers } %{ third-needs }. Cuenta con { $range }; mide mañana.
effect-allowance-bare = Dosis × { $factor } por + { $percent } %: cubre que se combine un { $covers } %{ third-needs }. Mide mañana.
effect-share = Dosis ÷ (1 − { $share }): llega a { $after } { $unit } si se combina justo esa parte; cuenta con { $range }; mide mañana.
effect-share-bare = Dosis ÷ (1 − { $share }): acierta si se combina justo esa parte; mide mañana.
other-as-share = Si en cambio se pierde un { $percent } % (÷ { $divisor }): { bare-amount }.
other-as-allowance = Como suplemento de + { $percent } % (× { $factor }): { bare-amount }.
nothing-why = { $free } de libre es { $molecular } molecular con pH { $ph }; el objetivo es { target }.
nothing-why-free = { $free } de libre; el objetivo es { target }.

## Una cantidad por la que se pregunta, que se echó, una solución

adds =
    { $number ->
        [many] { at }{ $list } añaden { $adds } de SO2
       *[one] { at }{ $list } añaden { $adds } de SO2
    }
adds-rate = { at }“{ $rate }” ({ $ofAdditive } de { additive }) añade { $adds } de SO2
amount = { $amount } de { additive }
amount-solution = { $amount } de { additive } al { $strength } %
amount-SO2 = { $amount } de SO2 de { additive }
amount-tablets =
    { $size ->
        [none] { $amount } { tablet-word } de { additive }
       *[other] { tablets-of }
    }
adds-rate-mass = En { $volume } son { $amount }.
ferment-stop =
    { $adds ->
        [none] Ninguna dosis de SO2 para con seguridad la levadura, y las botellas pueden reventar: pregunta a alguien cualificado.
       *[other] { $adds } no para con seguridad la levadura, las botellas pueden reventar: pregunta a alguien cualificado.
    }
ferment-stop-more = Para eso no doy dosis. Mientras: frío, y nada de cierres herméticos.
measure-tomorrow = Mide el libre mañana, antes de añadir otra vez.
reading-read = { at }{ $list }.
solution-weigh = Pesa { $amount } de { additive } y completa con agua hasta { $volume }.
solution-measure = Mide { $amount } de { additive } y completa con agua hasta { $volume }.
solution-from-powder = Solo preparo soluciones desde polvo: preparar { $volume } de meta al 10%
solution-strength = Esa solución lleva { $strength } g de SO2 en 100 mL.
solution-fresh = Hazla fresca y ponle fecha: pierde fuerza en días o semanas (práctica común, sin fuente).
solution-per-barrel = En una barrica de { $barrel }, 1 mL aporta { $adds } mg/L; para { $rise } mg/L hacen falta { $amount }.
solution-us-water = También es agua: en EE. UU. como mucho el 1 % del vino, con todas las adiciones (27 CFR 24.246).
solution-too-much = No: { $wanted } g/L no se disuelven seguro. Publicado para { additive } a { $celsius } °C: { $least ->
        [none] { $most } g/L ({ $source }).
       *[other] { $least } y { $most } g/L ({ $source }).
    } Hazla más floja.
solution-strengths = Preparo soluciones del 1 al 25 %. Publicado para metabisulfito potásico a 20 °C: 250 g/L (Food Additives Data Book, p. 780) y 450 g/L (página de una enciclopedia).
solution-too-cold = No: { $wanted } g/L en agua a { $water } °C. Publicado hay { $most } g/L a { $celsius } °C ({ $source }), y nada para agua más fría. Templa el agua, o hazla más floja.
solution-colder = No hay cifra publicada por debajo de { $celsius } °C: mira que se haya disuelto toda.
solution-holding = Solución de conservación, { $volume }: { $acid } de ácido cítrico, { $amount } de { additive }.
solution-rinse = Enjuague, { $volume }: { $acid } de ácido cítrico, { $amount } de { additive }.
solution-order = Toda el agua, luego el ácido, al final el sulfito, poco a poco. Nunca polvo sobre ácido.
solution-air = Suelta SO2: ventila, cara lejos de la boca.
solution-for-holding = Para barrica vacía y limpia, hasta la boca; revísala cada pocas semanas.
solution-for-rinse = Para material limpio: moja todo y deja actuar unos minutos.
solution-drain = Viértela según las normas locales. Enjuaga con agua antes del vino.
solution-practice = { $salt } y { $acid } g/L: práctica común, sin fuente. Otra cifra: { $use ->
        [holding] solución de conservación { $litres } L meta al 1%
       *[rinse] enjuague { $litres } L meta al 1%
    }
solution-not-wine =
    { $vessel ->
        [none] Nunca en el vino.
       *[other] Nunca en el vino: { $vessel } tiene que estar vacío. No se anota nada.
    }
ask-solution-volume =
    { $use ->
        [rinse] ¿Cuánto enjuague preparas? En litros, o con su unidad: 20 L, 1 hl
        [holding] ¿Cuánta solución de conservación? En litros, o con su unidad: 225 L, 2 hl
       *[stock] ¿Cuánta preparas? En litros, o con su unidad: 5 L, 1 hl
    }
burning-sulfur-never = El azufre que se quema (pajuelas, discos) nunca es una dosis para el vino: nadie sabe cuánto entra. No doy cifra.
burning-sulfur-danger = Solo en barricas vacías, como digan el envase, las normas locales y personal formado. Nunca tras alcohol fuerte (fuego), sin ventilar ni sin vigilar.
burning-sulfur-rather = Para una barrica vacía, mejor: solución de conservación 225 L. Para su vino envía la lectura: pH, libre, volumen.

## Lo leído y lo supuesto

basis-oiv = Por la tabla de la OIV para { $percent } %, { $celsius } °C (pK { $pK }).
basis-oiv-need = Por la tabla de la OIV para { $percent } %, { $celsius } °C (pK { $pK }); con pK 1,81 pediría { $free } de libre.
read = Leído: { $list }.
assumed = Supuesto: { $list }.
set-aside = No usado: { $list }.
fact-volume = { $volume }
fact-volume-count = { $volume } en { $count } recipientes
fact-ph = pH { $ph }
fact-free = libre { $free }
fact-total = total { $total }
fact-temperature = { $celsius } °C
fact-alcohol = { $percent } % vol
fact-sugar = { $sugar } g/L de azúcar
fact-figure = { $figure }
fact-allowance = suplemento + { $percent } %
fact-share = se combina un { $percent } %
fact-style = { $style ->
        [red] tinto
        [white] blanco
       *[other] rosado
    }
fact-category = { $category ->
        [sweet] dulce
        [sparkling] espumoso
       *[fortified] vino de licor
    }
fact-product = { $product ->
        [cider] sidra
        [mead] hidromiel
        [alcohol-free] vino sin alcohol
       *[fruit-wine] vino de frutas
    }
fact-organic = ecológico
fact-designated = con denominación ({ $limit })
fact-uplift =
    { $declared ->
        [yes] año declarado
       *[no] año no declarado
    }
fact-quality =
    { $quality ->
        [yes] de la clase de calidad
       *[no] no de la clase de calidad
    }
fact-pdo = nombre protegido (DOP)
fact-bulk = granel para exportación
fact-density = densidad { $density } kg/L
fact-reserve = { $reserve } reservados para el embotellado
fact-stage = { stage-now }
fact-target = objetivo { target }
fact-tablet =
    { $additive ->
        [tablet] pastillas efervescentes de { $size } g de SO2
       *[other] pastillas de { $size } g de { additive }
    }
fact-strength =
    { $kind ->
        [assay] { additive }, { $strength } % de pureza
        [SO2-yield] { additive }, { $strength } % tomado como rendimiento en SO2
        [salt-per-100mL] { additive }, { $strength } % = { $strength } g de sal en 100 mL
        [SO2-per-100mL] { additive }, { $strength } % = { $strength } g de SO2 en 100 mL
       *[noted] { additive }, { $strength } %
    }
assumed-additive = { additive } puro
assumed-target = objetivo { target }
assumed-target-red = objetivo { target } (tinto)
assumed-target-sweet = objetivo { target } (dulce)
assumed-gallon = { $gallon ->
        [US] galones (EE. UU.)
       *[imperial] galones imperiales
    }
assumed-must = { $fruit } kg × { $yield } L/100 kg = { $volume }
assumed-must-usual = { $fruit } kg × { $yield } L/100 kg (tu rendimiento habitual) = { $volume }
assumed-barrels =
    { $count ->
        [one] una barrica de 225 L
       *[several] { $volume } a 225 L por barrica
    }
note-free-unlabelled = “{ $text }” es SO2 libre
note-ph-unlabelled = “{ $text }” es el pH
note-round-ph = un decimal sin nombre es el pH
note-round-free = una cifra sin nombre es SO2 libre
note-volume-sum = “{ $text }” sumado
note-strength-as-salt = el porcentaje son gramos de sal en 100 mL; como SO2 sería { $factor } veces más fuerte
note-strength-as-SO2 = el porcentaje son gramos de SO2 en 100 mL
note-mass-beside-readings = “{ $text }” son gramos, no galones
note-each-or-total = “{ $text }” es de cada uno
note-unread-words = Me he saltado: { $text }
set-aside-figure = { $text }

## La única pregunta

ask-vessel = { at }¿qué depósito? Por ejemplo: T4
ask-volume_L =
    { $unit ->
        [L] { at }¿qué volumen{ of-each }? En litros, o con su unidad: 40 hl, 1450 gal
        [hL] { at }¿qué volumen{ of-each }? En hectolitros, o con su unidad: 4000 L, 1450 gal
        [m3] { at }¿qué volumen{ of-each }? En metros cúbicos, o con su unidad: 40 hl
        [galUS] { at }¿qué volumen{ of-each }? En galones de EE. UU., o con su unidad: 40 hl
        [galUK] { at }¿qué volumen{ of-each }? En galones imperiales, o con su unidad: 40 hl
       *[other] { at }¿qué volumen{ of-each }? Con su unidad: 225 L, 40 hl
    }
of-each =
    { $count ->
        [several] {" "}de cada uno
       *[one] {""}
    }
ask-ph = { at }¿qué pH? Por ejemplo: 3,58
ask-free_mg_L = { at }¿qué SO2 libre, en { $unit }? Por ejemplo: 21
ask-target =
    { $usual ->
        [none] { at }¿qué objetivo? Un vino así no tiene uno habitual. Por ejemplo: objetivo 30, 0,6 molecular, añadir 25 ppm
       *[some] { at }¿qué objetivo? Por ejemplo: objetivo 30, 0,6 molecular, añadir 25 ppm
    }
ask-target-stage =
    { $stage ->
        [must] { at }¿cuántos { $unit } quieres añadir al mosto? Escríbelo entero: { whole-example }
        [base] { at }¿cuántos { $unit } quieres añadir al vino base? Escríbelo entero: { whole-example }
       *[other] { at }¿cuántos { $unit } quieres añadir? Escríbelo entero: { whole-example }
    }
ask-tablet-additive = { at }¿de qué sal son las pastillas? Lo pone en el envase.
ask-additive = { at }¿qué aditivo es?
ask-strength_percent = { at }¿qué concentración tiene, en %? Lo pone en la etiqueta. Por ejemplo: { usual-strength }
usual-strength =
    { $named ->
        [potassium-metabisulfite] 96%
        [sodium-metabisulfite] 96%
        [sulfur-dioxide-solution] 6%
       *[other] 10%
    }
ask-tablet_salt_g = { at }¿cuántos gramos pesa una pastilla? Lo pone en el envase; son usuales 0,44 y 0,55.
ask-tablet_SO2_g = { at }¿cuántos gramos de SO2 da una pastilla efervescente? Lo pone en el envase.
ask-mass_g = { at }¿cuántos gramos?
ask-mass-spoon = { at }¿cuántos gramos? Una cucharadita rasa de polvo pesa unos 5 o 6 g, y eso es muy basto para dosificar: usa una báscula.
ask-fruit = { at }¿qué volumen de mosto, o qué rendimiento? Con su unidad, por ejemplo: 65 L/100 kg, o: 1300 L
option = { $mark }) { $list }
target-of =
    { $vessel ->
        [none] Otro objetivo.
       *[other] { $vessel }: otro objetivo.
    }

## Lo que así no se puede contestar

problem-ph-out-of-range = { at }“{ $about }” no puede ser el pH de un vino: tomo de 2,5 a 4,8. ¿Falta la coma? Envíalo así: pH 3,58
problem-negative-value = { at }“{ $about }” está por debajo de cero, no puede ser. Envía la cifra sin el menos.
problem-total-below-free = { at }el total es menor que el libre (“{ $about }”). ¿Al revés? Escribe: libre { $one } total { $two }
problem-volume-not-positive = { at }un volumen de “{ $about }” no puede ser. Envíalo así: 55 hl
problem-unit-mismatch = { at }la unidad no cuadra en “{ $about }”. El libre va en mg/L o ppm, el volumen en L, hl o gal.
problem-ambiguous-number =
    { $kind ->
        [split] { at }hay un espacio dentro de “{ $about }”. Escribe: pH { $one }
        [volume] { at }“{ $about }”: ¿son miles o decimales? Escribe: { $one }, o: { $two }
        [mass] { at }“{ $about }”: ¿son miles o decimales? Escribe: { $one }, o: { $two }
        [thousands] { at }“{ $about }”: ¿son miles o decimales? Escribe: { $one }, o: { $two }
        [powder] { at }“{ $about }”: ¿de SO2 o del polvo? Escribe: añadir { $one } ppm SO2, o: { $two } g por 10 L de { $named }
        [salt] { at }“{ $about }”: ¿de SO2 o de la sal? Como SO2 es demasiado fuerte para venderse. Si la etiqueta dice sal, escribe: { salt-name } sal { $one }%
        [water] { at }“{ $about }”: ¿SO2 en agua o una solución de metabisulfito? Escribe: solución sulfurosa { $one }%, o: solución de meta al { $one }%
        [SO2-percent] { at }“{ $about }”: ¿alcohol, SO2 en agua o una solución de metabisulfito? Escribe: { $one }% vol, solución sulfurosa { $one }%, o: solución de meta al { $one }%
        [percent] { at }“{ $about }”: ¿alcohol o la concentración de una solución? Escribe: { $one }% vol, o: solución de { stock-name } al { $one }%
        [degree] { at }“{ $about }”: ¿alcohol o temperatura? Escribe: { $one }% vol, o: { $one } C
        [to] { at }“{ $about }”: ¿es { $two } el objetivo? Escribe: libre { $one }, objetivo { $two }
        [range] { at }“{ $about }” parece un intervalo. Escribe uno: libre { $one }, o: libre { $two }
        [pair] { at }“{ $about }”: ¿libre y total, o una lectura entre dos marcas? Escribe: libre { $one } total { $two }, o: libre { $one }
        [free] { at }“{ $about }”: ¿SO2 libre o total? Escribe: libre { $one }, o: total { $one }
        [aim] { at }“{ $about }”: ¿por añadir o por alcanzar? Escribe: añadir { $one } ppm, o: objetivo { $one }
       *[other] { at }“{ $about }” se puede leer de más de una manera. Di qué es, así: pH 3,58 libre 21 55 hl
    }
salt-name =
    { $named ->
        [ammonium-bisulfite-solution] bisulfito amónico
       *[other] bisulfito potásico
    }
stock-name =
    { $named ->
        [sodium-metabisulfite] metabisulfito sódico
        [sodium-metabisulfite-solution] metabisulfito sódico
       *[other] meta
    }
problem-each-or-total = { at }¿“{ $about }” es de cada uno, o de todos juntos? Escribe: { $about } cada uno, o: { $about } en total
problem-conflicting-values = { at }dos valores para una cosa: “{ $about }”. Envía uno solo; dos vinos van en una línea cada uno.
problem-unknown-additive = { at }“{ $about }” no es un aditivo de SO2 que conozca. Conozco: metabisulfito potásico o sódico (polvo, solución), bisulfito, SO2 en agua, SO2 gas, pastillas.
problem-did-you-mean = { at }“{ $about }” es otro producto. ¿Querías decir metabisulfito?
problem-strength-out-of-range = { at }la concentración “{ $about }” no cuadra con ese aditivo. Mira la etiqueta. Por ejemplo: { usual-strength }
problem-value-out-of-range = { at }“{ $about }” es más de lo que tiene una bodega. Revisa la cifra y su unidad.
problem-not-understood = No he podido leer eso. Envía una lectura así: T4 55 hl pH 3,58 libre 21. ? muestra más.
problem-too-long = Es demasiado largo para leerlo seguro. Envía como mucho 25 depósitos a la vez, una línea cada uno.
problem-no-number =
    { $again ->
        [correction] No hay dosis hasta que eso esté claro.
       *[whole] No hay dosis hasta que eso esté claro. Envía otra vez la línea entera.
    }
problem-share = { at }“{ $about }”: calculo con 4/5 (0,8) combinado como mucho.
problem-vessel-twice = { $vessel } está dos veces: envíalo una.
problem-two-vessels = “{ $about }”: dos depósitos. Envía una línea para cada uno.
no-such-choice = Aquí no hay { $text }: de a hasta { $last }, o su nombre.
no-such-button = Aquí no hay { $text }: de 1 a { $last }, o una lectura entera.

## Avisos

warning-no-dose-at-this-stage = ⚠ { stage-now }: a esa fase no le toca dosis; pregunta a quien responde de este vino.
warning-stage-not-over =
    { $stage ->
        [malolactic] ⚠ Esto parará o retrasará la maloláctica: pregunta antes a quien responde de este vino. { no-dose-why }
       *[fermenting] ⚠ Un vino que fermenta lo combina enseguida, y no para la levadura con seguridad: pregunta antes a quien responde de este vino.
    }
warning-additive-not-permitted =
    { $reason ->
        [ammonium] ⚠ El bisulfito amónico es solo para uva y mosto (OIV): no para este vino; pregunta antes.
        [organic] ⚠ El vino ecológico solo admite SO2 y sales potásicas ({ law-of }, Reglamento 889/2008): este no. Pregunta antes.
        [organic-none] ⚠ Un vino con etiqueta de ecológico no admite ningún sulfito añadido ({ law-of }, 7 CFR part 205). Pregunta antes.
       *[sodium] { warning-sodium }
    }
warning-sodium =
    { $region ->
        [oiv] ⚠ Metabisulfito sódico: muchas normas lo excluyen del vino (OIV; UE y Reino Unido sin confirmar). Pregunta antes.
        [eu] ⚠ El metabisulfito sódico no es para vino en la UE, solo para material (sin confirmar). Pregunta antes.
        [uk] ⚠ El metabisulfito sódico no es para vino en el Reino Unido, solo para material (sin confirmar). Pregunta antes.
        [ar] ⚠ El metabisulfito sódico no es para vino en Argentina: solo sales potásicas (INV 281/85). Pregunta antes.
       *[other] ⚠ Metabisulfito sódico: no se ha leído ninguna lista de { law-of }, así que sin confirmar; muchas normas lo excluyen del vino. Pregunta antes.
    }
refused-organic =
    { $reason ->
        [organic-none] { at }nada de sulfito: un vino con etiqueta de ecológico no admite ninguno ({ law-of }, 7 CFR part 205).
       *[organic] { at }no con { additive }: el vino ecológico solo admite SO2 y sales potásicas ({ law-of }, Reglamento 889/2008).
    }
refused-organic-instead =
    { $reason ->
        [organic-none] ¿Al final no es ecológico? Pregunta a quien responde de este vino; luego: anula la entrada que lo dice.
       *[organic] Escríbelo con metabisulfito potásico. No es consejo legal: confírmalo para tu mercado.
    }
limit-doubt =
    { $confidence ->
        [unconfirmed] , sin confirmar: de memoria
       *[read] {""}
    }
warning-total-over-limit =
    { $total ->
        [known] ⚠ El total quedaría en { $total_after_mg_L }, sobre { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: pregunta antes.
       *[at-least] ⚠ El total quedaría al menos en { $total_after_mg_L }, sobre { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: pregunta antes.
    }
warning-free-over-limit = ⚠ El libre podría llegar a { $free_after_mg_L } si nada se combina, sobre el límite de libre { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: pregunta antes.
warning-label-threshold =
    ⚠ Etiqueta ({ law-of }): los sulfitos se nombran { $comparator ->
        [more] por encima de
       *[from] desde
    } { $threshold_mg_L } { $unit_of_law }{ $counts ->
        [added] {" "}añadidos
       *[total] {""}
    }{ limit-doubt }; el total sería { $total_after_mg_L }.
warning-total-near-limit =
    { $total ->
        [known] ⚠ El total sería { $total_after_mg_L } { $unit }, cerca del límite { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
       *[at-least] ⚠ El total sería al menos { $total_after_mg_L } { $unit }, cerca del límite { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
    }
warning-total-unknown = ⚠ No hay dato del total: mídelo.
warning-total-unknown-most = ⚠ Total sin dato, mídelo: para esta dosis puede ser hoy como mucho { $most_total_mg_L } { $unit }, límite { $limit_mg_L } ({ rule-short }){ law-decides }.
warning-no-limit-on-file =
    { $region ->
        [oiv] ⚠ No conozco límite para un vino así: consulta la ley de tu país.
       *[other] ⚠ No tengo límite para él ({ law-of }): consúltalo para tu mercado.
    }
warning-limit-unconfirmed =
    { $region ->
        [oiv] ⚠ El límite está sin confirmar: consulta la ley de tu país.
       *[other] ⚠ Límite { $limit_mg_L } { $unit } de { $of ->
            [free] libre
           *[total] total
        } ({ rule-short }): sin confirmar, de memoria. Consúltalo para tu mercado.
    }
warning-addition-large = ⚠ { $dose_mg_L } { $unit } de una vez es mucho: revisa el volumen y su unidad.
warning-free-needed-high = ⚠ { $target_free_mg_L } { $unit } de libre es mucho: tenlo más frío, más limpio, mídelo más a menudo; o baja el pH, con consejo.
warning-molecular-above-2 = ⚠ Por encima de 2 { $unit } el SO2 molecular se huele y se nota en boca.
warning-free-low-may-bind-all = ⚠ Por debajo de 10 de libre puede combinarse mucho o todo: mide antes de añadir otra vez.
warning-ph-unusual = ⚠ pH { $ph } es raro en un vino: revisa el pH-metro.
warning-basis-fallback = ⚠ La base OIV necesita el alcohol, y 20–40 °C: calculado con pK 1,81.
warning-basis-fallback-change = ⚠ La base OIV necesita el alcohol, y 20–40 °C: calculado con pK 1,81. Por OIV con { $compared_at_alcohol_percent } %, { $compared_at_temperature_C } °C serían unos { $change } { $unit } { $direction ->
    [more] más.
   *[less] menos.
}
warning-malolactic-may-not-start =
    { $above ->
        [free] ⚠ El libre { $free_mg_L } pasa de { $free_ceiling_high_mg_L } { $unit }: puede que la maloláctica no arranque (AWRI, para pH 3,3–3,5).
        [total] ⚠ El total { $total_mg_L } pasa de { $total_ceiling_high_mg_L } { $unit }: puede que la maloláctica no arranque (AWRI, para pH 3,3–3,5).
       *[both] ⚠ El libre { $free_mg_L } pasa de { $free_ceiling_high_mg_L }, el total { $total_mg_L } de { $total_ceiling_high_mg_L } { $unit }: puede que la maloláctica no arranque (AWRI, para pH 3,3–3,5).
    }
warning-restart-may-fail = ⚠ { $molecular_mg_L } { $unit } de molecular frena la levadura: desde { $held_back_molecular_mg_L } puede fallar un rearranque (práctica común, sin fuente).
warning-must-may-hinder-malolactic = ⚠ Por encima de { $malolactic_unharmed_mg_L } { $unit } en el mosto se puede estorbar la maloláctica (AWRI).
warning-rounding-coarse = ⚠ Lo que marca la báscula se desvía aquí { $rounding_mg_L } { $unit }: usa una más fina, o una solución.
warning-already-dosed = ⚠ Se le añadió hace poco.

## Precauciones

cautions = ⚠ { $list }
caution-trained-people-with-breathing-apparatus = Solo personal formado, con equipo de respiración a mano.
caution-grapes-and-must-only = Solo para uva y mosto.
caution-ventilate = Ventila.
caution-never-lean-in = No te asomes al depósito.
caution-gloves-goggles = Guantes, gafas.
caution-no-acid-no-chlorine = Nunca con ácido ni lejía.
caution-no-other-acid-no-chlorine = Ni otro ácido ni lejía.
caution-asthma = No para asmáticos.
caution-crush-first = Machaca y disuelve en algo de vino o agua.
caution-dissolve-first = Disuelve antes en algo de vino o agua.
caution-foams-with-carbon-dioxide = Vino con mucho CO2: rebosa.
caution-mix-and-measure-again = Remueve, mide al otro día.
caution-label-and-rules-first = Antes: etiqueta, normas locales, alguien cualificado.
cautions-of = ⚠ { additive }: { $list }
cautions-short = ⚠ Precauciones como antes: botón Seguridad.

## Charla

chat-greeting = Hola. Envíame una lectura así: T4 55 hl pH 3,58 libre 21. ? muestra más.
chat-thanks = De nada. Mide otra vez mañana.
chat-other = Calculo adiciones de SO2. Envía una lectura así: T4 55 hl pH 3,58 libre 21. ? muestra más.
still-asked = Todavía falta una cosa.
chat-negated = Nada añadido, pues. Nada que guardar.
chat-help-what = Envía una lectura y te digo cuánto SO2 añadir.
chat-help-dose = T4 55 hl pH 3,58 libre 21
chat-help-dose-means = → qué hay que pesar
chat-help-effect = 100 g de meta en 20 hl
chat-help-effect-means = → qué añade una cantidad
chat-help-solution = preparar 5 L de meta al 10%
chat-help-solution-means = → cómo se hace una solución
chat-help-fields = En cualquier orden; también total, tinto, 13,5%, objetivo 35, +25 ppm, +30%. Depósitos: una línea cada uno.
chat-help-topics = Más: ayuda y una de { $list }.
chat-help-care = Antes van la etiqueta, las normas de tu zona y alguien cualificado.

## Ayuda por temas: cada uno una pantalla de mensajes para enviar

help-wine-1 = En cualquier orden: el depósito, su volumen, pH, SO2 libre.
help-wine-2 = T4 55 hl pH 3,58 libre 21 blanco → qué pesar
help-wine-3 = T4 40 hl 3,6/18/60 13,5% 14 C → pH, SO2 libre y total
help-wine-4 = T4 40 hl pH 3,5 libre 18 0,6 molecular → a un nivel tuyo; o bien objetivo 36
help-wine-5 = T4 40 hl añadir 25 ppm → una adición fija
help-wine-6 = T4 40 hl pH 3,5 libre 18 +30% → más, por lo que se combina; o bien: se combina un tercio
help-wine-7 = T4 40 hl pH 3,5 libre 18, meta al 10% → de una solución; también metabisulfito sódico, SO2 al 6%, pastillas de 5 g
help-wine-8 = 100 g de meta en 20 hl → qué añade una cantidad
help-wine-9 = Tinto, rosado, dulce, sidra, hidromiel, ecológico; mosto, fermentando, malo hecha: di qué es, o la respuesta dice qué supuso.
help-must-1 = Para mosto no hay cifra habitual: digo lo publicado, tú eliges.
help-must-2 = mosto 20 hl uva sana → cifras para elegir; también: algo dañada, podredumbre
help-must-3 = mosto 20 hl añadir 40 → qué pesar para 40 mg/L
help-must-4 = 2 t uva 65 L/100 kg uva sana → por el peso de la uva y su rendimiento
help-must-5 = 5 t uva 70 L/100 kg añadir 50 → lo mismo con una cifra tuya
help-must-6 = rendimiento 65 → fija el rendimiento habitual, litros de 100 kg
help-must-7 = La mayor parte se combina: luego no protege, y un tercio más o menos vuelve como SO2 total.
help-bottling-1 = Lo que tiene que haber ahora para que el objetivo aguante cuando el oxígeno gaste su parte.
help-bottling-2 = embotellar T4 40 hl pH 3,4 libre 22 oxígeno 2 mg/L → 4 de SO2 por 1 de oxígeno, por fórmula
help-bottling-3 = embotellar T4 40 hl pH 3,4 libre 22 oxígeno 2 mg/L x 2,5 → con una cifra tuya
help-bottling-4 = T4 40 hl pH 3,4 libre 22 total 90 reservar 20 para embotellar → margen que se guarda bajo el límite
help-bottling-5 = T4 en maloláctica pH 3,4 libre 25 total 60 → si la maloláctica puede arrancar; también fermentación parada: un rearranque
help-bottling-6 = Oxígeno: disuelto y de cabeza juntos, en mg/L de vino.
help-solutions-1 = Soluciones en agua: ninguna es una dosis para el vino, y nada de ellas va al registro.
help-solutions-2 = preparar 5 L de meta al 10% → una solución: qué pesar, qué fuerza tiene, mL por barrica
help-solutions-3 = preparar 1 L de meta al 10%, añadir 30 ppm → los mL que llevan ahí una barrica de 225 L
help-solutions-4 = 10 g de meta en 100 mL de agua → qué fuerza tiene eso
help-solutions-5 = solución de conservación 225 L → para una barrica vacía; también: solución de conservación para 3 barricas
help-solutions-6 = enjuague 20 L → para material limpio; con tu propia fuerza: enjuague 20 L meta al 1%
help-solutions-7 = Pajuelas o discos que se queman: nunca una dosis para el vino, y no doy cifras.
help-law-1 = Cada dosis se compara con los límites de tu mercado. No es consejo legal: confírmalo para el tuyo.
help-law-2 = ley UE → también EE. UU., Reino Unido, OIV, Argentina, Chile …; para toda la bodega
help-law-3 = límite T4 → la norma, su texto, cómo se comprobó, lo que queda
help-law-4 = límite tinto azúcar 3 UE → sin depósito
help-law-5 = T4 tinto → deciden color y azúcar (azúcar 3 con una lectura); sin dato vale lo más estricto
help-law-6 = T4 ecológico → también espumoso de calidad, DOP, granel, densidad 0,992
help-law-7 = T4 con denominación 300 → un dulce de una denominación; también T4 año declarado
help-law-8 = T4 reservar 30 para embotellar → se guarda bajo el límite, con 15 por el error de medida
help-law-9 = Si lo pasa, primero va la dosis menor: dosis completa, luego sí. El registro lo guarda.
help-round-1 = Muchos depósitos en un mensaje, una línea cada uno; lo que vale para todos (meta, objetivo 30) en la primera. Un toque lo anota todo, o línea a línea.
help-round-2 = T1 20 hl pH 3,4 libre 18 → como línea de ella; sumo lo que hay que traer
help-round-3 = ronda → todas sus líneas otra vez
help-round-4 = hoja xlsx → para llevar; también hoja csv, hoja imagen
help-round-5 = B1-B24 225 L pH 3,6 libre 18 → una dosis para cada barrica, una entrada para cada una
help-round-6 = B1-B24 sin B7 225 L pH 3,6 libre 18 → todas menos una
help-round-7 = 34 barricas, muestra mezclada: pH 3,6 libre 18 → para su media, y lo que eso esconde
help-round-8 = O envía un CSV o XLSX: depósito, volumen, pH, SO2 libre. Vuelve la hoja.
help-stock-1 = Cada adición se descuenta, en cuanto hay algo apuntado.
help-stock-2 = recibidos 25 kg de meta lote 4471 de Suministros Norte → también 10 L de SO2 al 6%
help-stock-3 = existencias → lo que hay, por lotes; existencias meta: uno
help-stock-4 = existencias meta 3,2 kg → contado en el estante: vale desde entonces
help-stock-5 = usados 200 g de meta para enjuagar → para ningún vino
help-stock-6 = tirado 1 kg de meta por apelmazado → a la basura
help-stock-7 = añadidos 82 g de meta T4 lote 4471 → de ese lote; si no, del más viejo
help-stock-8 = exportar existencias → entradas, proveedores, lotes y lo que quedaba, para los libros
help-log-1 = Nada se borra; las correcciones van junto a lo que corrigen.
help-log-2 = añadidos 82 g de meta T4 → anotado; también ppm, mL, ayer 17:00, lote 4471, nota: …
help-log-3 = T4 ahora libre 28 total 96 → una lectura guardada, sin dosis
help-log-4 = encargar T4 256 g de meta → para que lo haga otro; encargos muestra lo no hecho
help-log-5 = hoy → lo anotado hoy; también ayer, 12 nov
help-log-6 = historial T4 → todo lo anotado de él
help-log-7 = deshacer → quita lo último tuyo, en 15 minutos
help-log-8 = anular 17 error → quita la entrada 17 y dice por qué
help-vessels-1 = Lo que le pasa a un vino cambia lo que doy por bueno.
help-vessels-2 = T4? → lo que sé de él
help-vessels-3 = depósitos → todos
help-vessels-4 = T4 tinto → también en maloláctica, acabado
help-vessels-5 = T4 tiene ahora 5200 L → lo que hay dentro; capacidad T4 6000 L: su tamaño
help-vessels-6 = trasegado T4 6100 L → también rellenado T4
help-vessels-7 = pasado T4 a T9 → todo, o 20 hl
help-vessels-8 = mezclado T5 en T4 → hay que medir el pH de nuevo
help-vessels-9 = T4 = Blanca 2026 → el nombre de su vino
help-vessels-10 = T4 vacío → también: olvidar T4
help-reminders-1 = Digo una vez al día qué medir, y tras una adición cuándo.
help-reminders-2 = pendientes → qué medir ahora
help-reminders-3 = lista diaria a las 7:00 → cuándo lo digo; o bien: sin lista diaria
help-reminders-4 = aplazar T4 3 días → lo pide más tarde
help-reminders-5 = no vigilar T4 → nada más de él; vigilar T4: otra vez
help-reminders-6 = silencio de 21 a 6 → de noche nada sin preguntar
help-settings-1 = Todo esto vale para la bodega entera.
help-settings-2 = ajustes → lo que está puesto y cómo cambiarlo
help-settings-3 = unidades métricas → también EE. UU., imperiales
help-settings-4 = nuestro habitual es metabisulfito sódico → el aditivo si no se nombra otro
help-settings-5 = objetivo 0,5 para tintos → también blancos, dulces
help-settings-6 = suplemento 30% → sumado a cada dosis, por lo que se combina
help-settings-7 = zona horaria Europe/Madrid → para horas y días
help-settings-8 = respuestas cortas → el cálculo en un botón
help-pictures-1 = Una gráfica muestra SO2 libre, molecular y total, y lo que se echó.
help-pictures-2 = gráfica T4 → como foto, con lo mismo en palabras
help-files-1 = Tu registro es tuyo.
help-files-2 = exportar → este mes como hoja de cálculo
help-files-3 = exportar 2026 → también exportar T4 csv, exportar del 1 oct al 31 oct
help-files-4 = Una exportación de otra bodega, o una lista de depósitos en CSV o XLSX: envía el archivo. Se muestra antes, y se toma entero o nada.
help-people-1 = Un grupo es una bodega propia: llámame por mi nombre, o respóndeme.
help-people-2 = personas → quién está dentro
help-people-3 = invitar operario → un código para una persona; también encargado, visitante
help-people-4 = Un encargado puede todo, un operario dosifica y anota, un visitante mira.
help-people-5 = lee todo → contesto lecturas claras sin que me llamen
help-people-6 = estamos en → en qué bodega; estamos en Blanca: ir allí; salir de Blanca: dejarla
help-people-7 = olvídame → tu nombre y número se quitan
help-lab-1 = Una valoración se calcula con su desarrollo; no se guarda nada antes de que toques.
help-lab-2 = AO 20 mL muestra, 1,9 mL 0,01 N → SO2 libre; con T4 delante se guarda con un toque
help-lab-3 = T4 total AO 20 mL muestra, 5,6 mL 0,01 N, blanco 0,1 → SO2 total
help-lab-4 = ripper 25 mL muestra, 1,2 mL 0,02 N, ascórbico 50 → yodo, sin lo que cuenta el ácido ascórbico
help-lab-5 = margen → cuánto puede errar la última dosis
help-lab-6 = T4 55 hl pH 3,58±0,03 libre 21±2 → con tus propios ±
help-lab-7 = tabla 0,5 0,8 1,5 pH 3,2-3,8 → SO2 libre necesario
help-lab-8 = molecular T4 → por pK 1,81 y por OIV
help-forecast-1 = Las lecturas de un vino dicen más que cualquier regla.
help-forecast-2 = previsión T4 → el día en que el libre baja de lo que pide su pH
help-forecast-3 = Hacen falta tres lecturas desde la última adición; antes, solo barricas y botellas tienen pérdidas publicadas.
help-forecast-4 = Tras dos adiciones con lecturas antes y después, una dosis dice qué parte combinó este vino.
help-forecast-5 = demasiado SO2 en T4 → qué ayuda y qué no
help-forecast-6 = mezclar T4 con T7 → qué parte de T7 respeta límite y objetivo
help-forecast-7 = mezclar T4 → qué otros depósitos servirían
help-topic =
    { $topic ->
        [wine] vino
        [must] mosto
        [bottling] embotellado
        [law] ley
        [round] ronda
        [stock] existencias
        [solutions] soluciones
        [log] registro
        [vessels] depósitos
        [reminders] avisos
        [settings] ajustes
        [pictures] gráficas
        [files] archivos
        [people] personas
        [lab] laboratorio
        [forecast] previsión
       *[other] { $topic }
    }

send-alone = Eso va en un mensaje aparte.
unreadable =
    { $what ->
        [edited] No leo mensajes cambiados. Envíalo de nuevo, por favor.
        [photo] No puedo leer fotos. Escribe las cifras, por favor.
        [sticker] Bonito. Pero solo leo texto.
        [voice] No puedo oír mensajes de voz. Escribe las cifras, por favor.
        [file] Todavía no puedo leer archivos. Escribe las cifras, por favor.
       *[other] Solo leo texto. Escribe las cifras, por favor.
    }
fault = Eso ha fallado por mi parte y no se ha calculado nada. Envíalo otra vez; si vuelve a fallar, díselo a quien me lleva.
fault-aside = Eso ha fallado tres veces por mi parte, así que lo he apartado: nada se ha calculado ni anotado. Quien me lleva puede ver por qué.
left-unread =
    { $count ->
        [one] Estuve fuera. Un mensaje de aquí tiene más de 12 horas y no lo he leído: nada de él está anotado. Envíalo otra vez si todavía vale.
       *[other] Estuve fuera. { $count } mensajes de aquí tienen más de 12 horas y no los he leído: nada de ellos está anotado. Envía otra vez lo que todavía valga.
    }
old-button = Ese botón es de un mensaje anterior. Envía otra vez la lectura.

## Una emergencia

emergency-out = TODOS FUERA, al aire libre, ya.
emergency-nobody-in = Nadie entra ni se asoma detrás de nadie.
emergency-call = Llama a emergencias.
emergency-swallowed = Tragado: enjuagar la boca, no provocar el vómito, llamar a toxicología o a emergencias.
emergency-eyes = Ojos: enjuagar con agua 15 minutos y quitar las lentillas.
emergency-skin = Piel: enjuagar con mucha agua y quitar la ropa mojada.

## El cálculo

working = { $substituted } = { $result }
working-symbol = { $symbol } = { $substituted } = { $result }
working-source = ({ $source })
working-head =
    { $vessel ->
        [none] El cálculo
       *[other] { $vessel }: el cálculo
    }
step-dissociation = Constante de disociación, entre los cuatro valores más próximos por alcohol y temperatura:
step-molecular-now = SO2 molecular ahora, libre ÷ (10^(pH − pK) + 1):
step-free-needed = SO2 libre necesario, objetivo × (10^(pH − pK) + 1):
step-oxygen-loss = Lo que gasta el oxígeno, oxígeno × SO2 por 1 mg:
step-free-before-bottling = SO2 libre necesario antes, querido al embotellar + lo que gasta el oxígeno:
step-addition = Por añadir, libre querido − libre ahora:
step-dose-with-allowance = Con el suplemento, adición × (1 + suplemento):
step-dose-with-share = Con la parte que se combina, adición ÷ (1 − parte):
step-volume-in-litres = Volumen en litros:
step-room-to-limit = Lo que queda, límite − lo guardado por debajo − SO2 ahora:
step-must-of-fruit = Mosto, uva × litros de 100 kg ÷ 100 kg:
step-so2-mass = SO2 en gramos, adición × volumen ÷ 1000:
step-so2-mass-each = SO2 para uno, adición × volumen de uno ÷ 1000:
step-all-vessels = Para todos, uno × número:
step-additive-mass = Aditivo, SO2 ÷ su parte de SO2:
step-additive-mass-by-assay = Aditivo, SO2 ÷ (pureza × parte de SO2 en la sal pura):
step-additive-mass-by-yield = Aditivo, SO2 ÷ su rendimiento en SO2 indicado:
step-additive-volume-by-salt = Solución, SO2 ÷ (sal que lleva × parte de SO2 en la sal):
step-additive-volume-by-so2 = Solución, SO2 ÷ SO2 que lleva:
step-tablets-by-so2 = Pastillas, SO2 ÷ SO2 de una:
step-tablets-by-salt = Pastillas, SO2 ÷ (sal de una × parte de SO2 en la sal):
step-gas-by-purity = Gas, SO2 ÷ pureza:
step-so2-in-amount = SO2 que lleva, cantidad × SO2 de una unidad:
step-added-concentration = Añadido, SO2 × 1000 ÷ volumen:
step-added-by-rate = Añadido, proporción × parte de SO2:
step-mass-by-rate = Aditivo, proporción × volumen ÷ 1000:
step-free-after = Libre después, si nada se combina:
step-molecular-after = Molecular después, libre ÷ (10^(pH − pK) + 1):
step-salt-mass = Sal, gramos en 0,1 L ÷ 0,1 L × volumen:
step-added-by-one-millilitre = Un mL en una barrica, SO2 que lleva ÷ volumen de la barrica:
step-stock-for-a-barrel = Solución por barrica, subida × volumen de la barrica ÷ SO2 de la solución:
step-salt-by-recipe = Sulfito, gramos por litro × volumen:
step-citric-acid-by-recipe = Ácido cítrico, gramos por litro × volumen:
step-solution-strength = Fuerza en 100 mL, SO2 ÷ volumen × 0,1 L:
step-solution-strength-by-salt = Fuerza como SO2, sal × parte de SO2 en ella:
step-titrant-normality = Normalidad del yodo, 2 × su molaridad:
step-iodate-normality = Normalidad, 6 × mg de yodato ÷ 214 ÷ mL del matraz:
step-titrant-used = Valorante gastado, bureta − blanco:
step-so2-by-titration = SO2, 32 000 × normalidad × valorante ÷ muestra:
step-ascorbic-counted = El ácido ascórbico cuenta como, mg/L × 64,06 ÷ 176,12:
step-so2-without-ascorbic = SO2 sin él:
step-spread-of-need = ± de lo necesario, objetivo × 10^(pH − pK) × ln 10 × ± del pH:
step-spread-of-dose = ± de la adición, raíz de ambos al cuadrado:
step-dose-lowest = Mínimo, necesario − libre − su ±:
step-dose-highest = Máximo, necesario − libre + su ±:
step-molecular-sure = Molecular seguro, después × (1 − raíz de ambos ± relativos al cuadrado):
step-blend-free = SO2 libre de la mezcla, por volumen:
step-blend-total = SO2 total de la mezcla, por volumen:
safety-head = Cuidado con { additive }
more-head =
    { $vessel ->
        [none] Más
       *[other] { $vessel }: más
    }
more-no-warnings = No hay más avisos.
choice-left = { at }se queda como está, { $molecular } molecular. Cata y mide a menudo.
choice-over = { at }para eso no hay cantidad: el total pasaría de { $limit } ({ law-of }).
round-choice = { at }con pH { $ph } hay que elegir: envíalo solo.
round-missing =
    { $field ->
        [vessel] ¿qué depósito es?
        [volume_L] { at }falta el volumen.
        [ph] { at }falta el pH.
        [free_mg_L] { at }falta el SO2 libre.
        [target] { at }¿qué objetivo? Añade uno.
        [additive] { at }¿qué aditivo es?
        [strength_percent] { at }¿qué concentración tiene el aditivo?
        [tablet_salt_g] { at }¿cuántos gramos pesa una pastilla?
        [tablet_SO2_g] { at }¿cuántos gramos de SO2 da una pastilla?
        [mass_g] { at }¿cuántos gramos?
       *[none] { at }falta algo.
    }
round-dose = { $vessel } ({ $list }): { round-amount }
round-dose-bare = { at }{ round-amount }
round-amount =
    { $unit ->
        [tablets] { $amount } pastillas{ round-of }{ round-all }{ round-limited }{ round-if-red }
       *[other] { round-tablet }{ $amount }{ round-of }{ round-all }{ round-limited }{ round-if-red }
    }
round-limited =
    { $limited ->
        [limited] {" "}(límite)
       *[none] {""}
    }
round-tablet =
    { $tablet ->
        [too-large] media pastilla es demasiado,{" "}
       *[fits] {""}
    }
round-of =
    { $additive ->
        [none] {""}
       *[other] {" "}de { additive }{ round-percent }
    }
round-percent =
    { $strength ->
        [none] {""}
       *[other] {" "}al { $strength } %
    }
round-all =
    { $all ->
        [none] {""}
       *[other] {" "}cada uno, { $all } en total
    }
round-if-red =
    { $red ->
        [unsaid] {""}
        [none] , si es tinto nada
        [over] , si es tinto { $redAmount }, también sobre el límite
       *[some] , si es tinto { $redAmount }
    }
round-nothing = { $vessel } ({ $list }): nada que añadir
round-nothing-bare = { at }nada que añadir
round-head =
    { $kind ->
        [powder] Pesa { additive }{ round-strength }:
        [gas] Pesa SO2 gas, solo por peso; solo personal formado, con equipo de respiración a mano:
        [tablet] Toma pastillas efervescentes de { $size } g de SO2:
        [salt-tablet] Toma pastillas de { $size } g de { additive }:
       *[solution] Mide { additive }{ round-strength }:
    }
round-strength =
    { $size ->
        [none] {""}
       *[other] , { $size } %
    }
round-for-all = Para todos: { $list }.
round-kept = Lecturas guardadas.
round-red = “Si es tinto” es para { $red } molecular.
round-stock = Como solución al { $strength } %: { $list }.
round-rest = El resto como solución al { $strength } %: { $list }.
round-stock-of = { $vessel } { $amount }
mixed-sample = Eso es para la media de las { $count }: una muestra mezclada no enseña la más baja, y cuánto difieren no consta; una con 5 menos queda 5 por debajo. Mide algunas sueltas antes de dosificar (práctica común, sin fuente).
round-mixed = ⚠ Una muestra mezclada da la media y no la más baja: { $list }. Mide algunas sueltas.
round-low = ⚠ Por debajo de 10 de libre puede combinarse mucho o todo: { $list }. Ahí mide antes de añadir otra vez.
round-name = { $name }
round-again = Reenvía entera cada línea que no se pudo leer.
round-total =
    En total { $list }: suma de las { $count } cantidades redondeadas.
round-total-of =
    { $kind ->
        [tablet] { $amount } pastillas efervescentes de { $size } g de SO2
        [salt-tablet] { $amount } pastillas de { $size } g de { additive }
       *[other] { $amount } de { additive }{ round-percent }
    }
round-open =
    { $count ->
        [one] Sin cantidad para uno:
       *[other] Sin cantidad para { $count }:
    }
round-open-names = Sin cantidad para { $list }: envía “ronda” para ver por qué.
round-more = … y { $count } más: envía “ronda”, o toma la hoja de abajo.
round-and-more = { $count } más
round-warned = ⚠ Hay avisos junto a { $list }: envía “ronda”.
button-round-all = Todo echado
button-round-lines = Uno a uno
button-round-line =
    { $vessel } { $amount }{ $unit ->
        [tablet] { " " }pastilla
        [tablets] { " " }pastillas
       *[other] { "" }
    }{ $count ->
        [several] { " " }cada uno
       *[one] { "" }
    }
button-round-next = Siguiente
button-round-picture = Hoja en imagen
button-round-file = Hoja en archivo
button-round-undo = Deshacer { $entries }
round-noted =
    Anotado { $entries }: { $count ->
        [one] una adición
       *[other] { $count } adiciones
    }, { $list }, { $when }.
round-noted-rest = el resto de la ronda
round-noted-line = Anotado { $entry }: { $vessel } { $list }, { $when }.
round-noted-each = Anotado { $entry }: { $vessel }, cada uno { $list }, { $when }.
round-noted-before = Anotado antes, y dejado: { $list }.
round-noted-none = Ya estaba todo anotado: entradas { $entries }.
round-not-noted = No anotado, pues no tiene una cantidad única: { $list }.
round-strike-one = ¿Uno no se echó? Envía “anular { $entry } no se echó”.
round-pick = ¿Cuáles se echaron? { $from }–{ $to } de { $all }:
round-pick-noted = { $vessel }: anotado, entrada { $entry }.
round-undone = Deshecho: { $entries }. Quedan en el registro, tachadas.
round-undone-none = Ya no queda nada de ella que deshacer.
sheet-vessel = Depósito
sheet-volume = Volumen L
sheet-ph = pH
sheet-free = SO2 libre mg/L
sheet-free-short = libre
sheet-total = SO2 total mg/L
sheet-dose = SO2 por añadir mg/L
sheet-weigh = Pesar g
sheet-measure = Medir mL
sheet-tablets = Pastillas
sheet-additive = Aditivo
sheet-strength = Concentración %
sheet-after = Libre después, si nada se combina mg/L
sheet-note = Nota
sheet-done = Hecho
sheet-in-all = En total
sheet-nothing = nada que añadir
sheet-limit = límite
sheet-title = Hoja de pesadas
sheet-open = Sin cantidad:
sheet-caution = Guantes, gafas, ventila. Nunca te asomes a un depósito. Remueve, mide mañana.
sheet-fetch = En total { $list }
sheet-additive-name = { additive }{ round-percent }
file-round = Una ronda de { $count } líneas.
file-round-left = No entendido, y dejado fuera: línea { $lines } del archivo.
file-round-ask = ¿Calculo las dosis, o solo anoto las lecturas?
button-file-dose = Dosis
button-file-note = Anotar lecturas
button-file-vessels = Tomar depósitos
round-gone = Aquí no hay ninguna ronda guardada: envíala otra vez.
round-target-stage = { at }¿cuántos mg/L quieres añadir?
round-not-understood =
    { $about ->
        [none] Una línea no la he podido leer.
       *[other] “{ $about }” no lo he podido leer.
    }
round-effect-short = Suele combinarse de 1/3 a 1/2: mide mañana.
round-effect = Suele combinarse de 1/3 a 1/2: mide mañana. Para ver un cálculo envía su línea sola.
choice-additive = { $value ->
        [potassium-metabisulfite] Metabisulfito potásico
        [sodium-metabisulfite] Metabisulfito sódico
        [potassium-metabisulfite-solution] Solución de metabisulfito potásico
        [sodium-metabisulfite-solution] Solución de metabisulfito sódico
        [potassium-bisulfite-solution] Solución de bisulfito potásico
        [ammonium-bisulfite-solution] Solución de bisulfito amónico
        [sulfur-dioxide-solution] Solución sulfurosa (SO2 en agua)
        [sulfur-dioxide-gas] SO2 gas
       *[tablet] Pastillas efervescentes
    }
choice-powder = { $value ->
        [potassium-metabisulfite] Metabisulfito potásico en polvo
       *[sodium-metabisulfite] Metabisulfito sódico en polvo
    }
choice-tablet_salt_g = { $value } g
choice-tablet_SO2_g = { $value } g
folded = Cálculo y otros avisos: pulsa Más.
terminal-start = brimnote calcula adiciones de SO2. Escribe una lectura, así:
terminal-start-example =     T4 55 hl pH 3,58 libre 21
demo-start = Esto es una demostración: la bodega del puerto y su gente son inventadas, y no se guarda nada de lo que hagas. Escribe:
demo-start-sheets = La hoja del día:  hoy        Un historial:  historial T4        Qué medir:  pendientes
demo-start-reading = Luego una lectura tuya, así:  T6 libre 21
demo-start-end = ? muestra más, Ctrl-D termina.
terminal-start-more = ? muestra más, Ctrl-D termina. Varias líneas pegadas juntas son un mensaje.

## Botones

button-working = Cálculo
button-safety = Seguridad
button-target = Otro objetivo
button-more = Más
button-not-finished = No acabado
button-red = Tinto
button-choice-leave = Dejarlo
button-choice-to = A { $free }

## Lo que recuerda la bodega

fault-unwritten = No anotado: no he podido escribirlo. Envíalo otra vez dentro de un minuto.
vessel-unknown =
    { $vessel ->
        [none] ¿Qué depósito? Por ejemplo: T4?
       *[other] Todavía no sé nada de { $vessel }. Envía una lectura, así: { $vessel } 55 hl pH 3,58 libre 21
    }
recalled = { $list } ({ $day })
recalled-additive = { additive } ({ $day })
recalled-allowance = suplemento { $percent } % (tu ajuste)
choice-volume_L = { $value }
ask-volume-which =
    { $vessel }: { $known ->
        [none] { $said } es más de lo que cabe. ¿Está bien?
       *[other] has escrito { $said }, yo tenía { $known }. ¿Cuál vale?
    }
read-kept =
    { $new ->
        [new] Guardado, { $vessel } es nuevo para mí: { $list }.
       *[known] Leído y guardado: { $list }.
    }
noted-something-else =
    Anotado { $entry }, sin calcular: { $vessel } { $text }, { $when }.{ $voids ->
        [ph] { " " }Hay que medir el pH de nuevo.
       *[none] { "" }
    }
reading-kept = { at }{ $list }: guardado, { $when }.
button-added = Lo he echado
button-mine = Lo hago yo
button-order = Encargarlo
button-note = Anotarlo
button-sampled-before = Antes
button-sampled-after = Después
button-dose-anyway = Dosis de todos modos
button-white = Blanco
button-take = Tomarlo
import-ask = ¿Lo tomo?
import-taken = Tomado: { $entries } entradas.
import-no-file = No hay ningún archivo “{ $file }” que pueda leer.
export-written = Escrito: { $path }
export-none = En ese tiempo no se anotó nada.
backup-written = Copia escrita: { $path }
progress-working = Estoy en ello …
progress-done = Hecho.
errand-failed = Eso no ha salido, y no se ha escrito nada. Prueba otra vez; si vuelve a fallar, díselo a quien me lleva.
backup-elsewhere = Las copias las hace quien me lleva. El registro de esta bodega te lo llevas con: exportar todo
button-undo = Deshacer { $entry }
button-done = Encargo { $entry } hecho
button-remind = Recuérdamelo en 24 h
added-confirm = { at }{ $added } son { $list }. ¿Lo anoto?
added-confirm-bare = { at }{ $added } de SO2. ¿Lo anoto?
noted-addition =
    Anotado { $entry }: { $vessel } { $list }, { $when }{ $added ->
        [none] .
       *[other] { " " }({ $added } de SO2).
    }{ $order ->
        [none] { "" }
       *[other] { " " }El encargo { $order } está hecho.
    }
noted-bare = Anotado { $entry }: { $vessel } { $added } de SO2, { $when }.
noted-measure = Mide el libre desde { $when }, antes de añadir otra vez.
noted-measure-now = Mide el libre antes de añadir otra vez.
already-noted = Ya anotado como { $entry }, { $when } ({ $who ->
        [you] tú
       *[other] { $who }
    }): { $vessel }.
odd-more-than-planned = Es { $factor } veces lo que calculé para { $vessel }. ¿Un despiste? Pues deshacer.
odd-large = { $added } en una sola adición es mucho. ¿Un despiste? Pues deshacer.
odd-second = { $vessel } ya llevaba una, { $when } (entrada { $entry }).
odd-empty = { $vessel } consta vacío desde { $when }.
odd-from-empty = { $vessel } constaba vacío desde { $when }.
odd-over-capacity = { $volume } es más que los { $capacity } que caben en { $vessel }.
when-noon = Sin hora: anotado a mediodía.
when-future =
    { at }“{ $text }” todavía no ha llegado{ $when ->
        [none] { "" }
       *[other] { " " }({ $when })
    }. No anotado. Envíalo otra vez con la hora que fue.
when-no-such-day = { at }no existe “{ $text }”. No anotado. Envíalo otra vez con la hora que fue.
vessel-new = { $vessel } es nuevo para mí.
volume-differs =
    { $vessel }: { $known ->
        [none] { $said } es más de lo que cabe
       *[other] { $said } no son los { $known } que tenía
    }: no guardado. Si está bien, escribe: { $vessel } tiene ahora { $written }
ask-zone = Doy las horas en UTC. ¿En qué zona estás? Escribe: zona horaria Europe/Madrid
dosed-who =
    { $who ->
        [you] tú
       *[other] { $who }
    }
dosed-which-first =
    { $vessel }: ya se { $known ->
        [none] añadió algo
       *[some] añadieron { $list }
    } ({ dosed-who }, { $when }). ¿La muestra es de antes? Sin dosis hasta saberlo.
dosed-add-more =
    { $vessel }: ya se { $known ->
        [none] añadió algo
       *[some] añadieron { $list }
    } ({ dosed-who }, { $when }). ¿Más de todos modos?
dosed-sampled-before =
    { $vessel }: sin dosis: ya se { $known ->
        [none] añadió algo
       *[some] añadieron { $list }
    } ({ dosed-who }, { $when }), después de esa muestra. Mide otra vez desde { $next }.
dosed-landed =
    { $vessel }: por ahora nada más: ya se { $known ->
        [none] añadió algo
       *[some] añadieron { $list }
    } ({ dosed-who }, { $when }), y el SO2 sigue combinándose un día. Mide otra vez desde { $next }.
dosed-in-round =
    { $vessel }: sin dosis: ya se { $known ->
        [none] añadió algo
       *[some] añadieron { $list }
    } ({ dosed-who }, { $when }). Envíalo solo.
landed =
    { $vessel } quedó en { $after }{ $planned ->
        [none] { "" }
       *[other] , previsto { $planned }
    }: de { $added } { $unit } se combinó un { $percent } %.
landed-loose = { $vessel } quedó en { $after }{ $planned ->
        [none] { "" }
       *[other] , previsto { $planned }
    }. No se dice cuánto se combinó: el libre de antes de los { $added } { $unit } se leyó el { $day }.
landed-fell = { $vessel } pasó de { $before } a { $after } aunque se añadieron { $added } { $unit }: todo combinado, o un despiste. Mide otra vez.
landed-too-high = { $vessel } subió { $rise } aunque solo se añadieron { $added } { $unit }. Una cifra no cuadra: mide otra vez.
on-it =
    { $vessel }: { $who ->
        [you] lo llevas tú
       *[other] lo lleva { $who }
    } desde { $when }.
claimed = { $vessel } es tuyo hasta { $until }. Los demás lo ven.
claim-taken = { $vessel }: lo lleva { $who } desde { $when }.
ordered = Encargo { $entry }: { $vessel } { $list }.
ordered-open = Abierto hasta que alguien anote lo que se echó.
order-how = Por ejemplo: encargar T4 256 g
order-gone = El encargo { $entry } ya no está abierto.
remind-set = Pregunto por { $vessel }: { $when }.
remind-late = Ya es tarde para eso: mide { $vessel } ahora.
undo-nothing = No hay nada tuyo que deshacer.
undo-late = La entrada { $entry } tiene más de 15 minutos. Escribe: anular { $entry } y el motivo
undo-not-yours = La entrada { $entry } es de { $who }. Escribe: anular { $entry } y el motivo
strike-none = No hay entrada { $entry }.
strike-again = La entrada { $entry } ya la anuló { $by }.
strike-correction = La entrada { $entry } es ella misma una corrección. Anota de nuevo lo correcto.
strike-why = ¿Por qué? Escribe: anular { $entry } error
struck = Anulada { $entry } ({ $list }). Las dos quedan en la hoja.
struck-addition = Si sí se echó, anótalo otra vez.
noted-vessel =
    Anotado { $entry }: { $list }.{ $voids ->
        [ph] { " " }Hay que medir el pH de nuevo.
        [volume] { " " }Di el nuevo volumen con la próxima lectura.
        [blend] { " " }Hay que medir pH y SO2 de nuevo.
       *[none] { "" }
    }
amount-unknown = algo de SO2
fact-capacity = caben { $volume }
fact-lot = { $lot }
fact-chemical-lot = lote { $lot }
fact-remark = “{ $remark }”
event-said =
    { $event ->
        [racked] { " " }trasegado
        [topped] { " " }rellenado
        [acid] { " " }ácido añadido
        [moved] { $whole ->
            [part] { " " }pasado en parte a { $to }
           *[all] { " " }pasado a { $to }
        }
        [blended] { $whole ->
            [part] { " " }mezclado en parte en { $to }
           *[all] { " " }mezclado en { $to }
        }
        [emptied] { " " }vacío
        [lot] { " " }es { $lot }
        [later] , sin medir hasta { $until }
        [unwatched] , ya no se vigila
        [watched] , se vigila otra vez
        [forgotten] { " " }olvidado
       *[told] :
    }
entry-addition =
    { $vessel } { $known ->
        [none] SO2
       *[some] { $list }
    }{ $added ->
        [none] { "" }
       *[other] , { $added } mg/L
    }
entry-order =
    encargo { $vessel } { $known ->
        [none] { $added } mg/L
       *[some] { $list }
    }
entry-reading = { $vessel } { $list }
entry-vessel =
    { $vessel }{ event-said }{ $told ->
        [none] { "" }
       *[some] { " " }{ $list }
    }
entry-other = { $vessel } { $text } (sin calcular)
entry-stock =
    { $event ->
        [received] recibido
        [used] usado, para ningún vino:
        [discarded] tirado
       *[counted] contado
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }de { $supplier }
    }
entry-correction =
    anula { $entry }: { $reason ->
        [undo] deshecho
        [sampled-before] muestra de antes de la adición
        [edited] se cambió el mensaje
       *[other] { $reason }
    }
round-volume-which = { $vessel }: { $said } no cuadra con lo que tenía: envíalo solo.
sheet-entry =
    { $entry } · { $when } · { $list } · { $who }{ $late ->
        [late] { " " }(anotado { $noted })
       *[none] { "" }
    }{ $struck ->
        [none] { "" }
       *[other] { " " }— ANULADA por { $struck }
    }
day-head = { $day } ({ $zone }):
day-empty = Nada anotado: { $day }.
day-more = Las anteriores de ese día están en la exportación.
day-none-such = Ese día no existe.
history-head = { $vessel }, lo último al final:
history-empty =
    { $vessel ->
        [none] ¿Qué depósito? Por ejemplo: historial T4
       *[other] Todavía no hay nada anotado de { $vessel }.
    }
history-more = Las anteriores: exportar { $vessel }
list-more = … y { $count } más.
vessels-none = Todavía no conozco ningún depósito. Envía una lectura, así: T4 55 hl pH 3,58 libre 21
vessels-head =
    { $number ->
        [one] Un depósito, { $due } por medir ahora:
       *[many] { $count } depósitos, { $due } por medir ahora:
    }
vessels-line =
    { $vessel }{ $lot ->
        [none] { "" }
       *[other] { " " }{ $lot }
    }: { $free ->
        [none] sin lectura
       *[other] libre { $free } ({ $day })
    }{ $next ->
        [empty] , vacío
        [now] , MEDIR YA
        [later] , próxima { $check }
       *[none] { "" }
    }
vessel-head = { $vessel }: { $list }
vessel-bare = { $vessel }
vessel-empty = { $vessel }: vacío desde { $day }
vessel-readings = Último: { $list }
vessel-void =
    { $field ->
        [ph] pH
       *[other] Volumen
    } sin dato desde { $day }: { $event ->
        [malolactic] maloláctica
        [fermentation] entonces era mosto
        [blended] mezclado
        [acid] ácido añadido
        [racked] trasegado
        [topped] rellenado
       *[moved] pasado
    }.
vessel-addition =
    { $entry } · { $when } · { $list }{ $added ->
        [none] { "" }
       *[other] , { $added } mg/L
    } · { $who }{ $landed ->
        [not-yet] { " " }(sin medir desde entonces)
       *[landed] { "" }
    }
vessel-bound =
    { $number ->
        [one] Combinado: { $share } % de una adición.
       *[many] Combinado: { $share } % de media en { $count } adiciones ({ $least }–{ $most } %).
    }
vessel-order = Encargo abierto { $entry }: { $list } ({ $who }, { $when }).
vessel-check =
    Próxima medida { $when }{ $why ->
        [landing] { " " }(tras la adición)
        [forecast] { " " }(según sus lecturas puede quedarse corto)
       *[other] { "" }
    }.
vessel-check-due =
    Por medir desde { $when }{ $why ->
        [landing] { " " }(tras la adición)
        [forecast] { " " }(según sus lecturas puede quedarse corto)
       *[other] { "" }
    }.
vessel-unwatched = No se vigila. Otra vez: vigilar { $vessel }
due-none = No hay nada por medir.
due-head =
    { $number ->
        [one] Un depósito por medir:
       *[many] { $count } depósitos por medir, el más urgente primero:
    }
due-stage =
    { $stage ->
        [none] { "" }
       *[other] { " " }(sin acabar: sin dosis)
    }
due-overdue =
    { $overdue ->
        [no] { "" }
       *[yes] , { $days } d de retraso
    }
due-landing = { $vessel }: adición de { $added }, sin medir desde entonces{ due-overdue }{ due-stage }
due-usual =
    { $vessel }: { $free ->
        [none] nunca medido
       *[other] libre { $free }, { $day }
    }{ due-overdue }{ due-stage }
due-often =
    { $vessel }: { $free ->
        [none] nunca medido
       *[other] libre { $free }, { $day }
    }{ $low ->
        [low] , bajo
       *[none] { "" }
    }{ due-overdue }{ due-stage }
due-forecast =
    { $vessel }: { $free ->
        [none] nunca medido
       *[other] libre { $free }, { $day }
    }, ya puede quedarse corto{ due-overdue }{ due-stage }
daily-head = Buenos días.
remind = Hace un día: { $list }. Mide el libre ahora.
open-none = No hay encargos abiertos.
open-head =
    { $number ->
        [one] Un encargo abierto:
       *[many] { $count } encargos abiertos:
    }
open-line = { $entry } · { $vessel } { $list } · { $who }, { $when }
language-changed = Has escrito en español: desde ahora contesto en español.
language-set = Contesto en español.
language-not-yet = Ese idioma lo leo, pero todavía no contesto en él.
button-stay-language = Seguir en español
settings-head = Ajustes de esta bodega, y cómo cambiarlos:
setting-set = Listo. { $list }
setting-units =
    Unidades: { $units ->
        [us] galones (EE. UU.)
        [imperial] galones imperiales
       *[metric] litros
    } (trabajamos en galones)
setting-usual-additive =
    Habitual: { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    } (nuestro habitual es meta 57%)
setting-target = Objetivos, molecular: tinto { $red }, blanco { $white }, dulce { $sweet } (objetivo 0,6 para tintos)
setting-allowance =
    { $percent ->
        [none] Sin suplemento por lo que se combina (suplemento 30%)
       *[other] Suplemento por lo que se combina: { $percent } % en dosis con objetivo (sin suplemento)
    }
setting-yield =
    { $yield ->
        [none] Sin rendimiento de uva habitual (rendimiento 65)
       *[other] Rendimiento: { $yield } L de mosto de 100 kg de uva (sin rendimiento)
    }
setting-basis =
    Base: { $basis ->
        [oiv] OIV
       *[other] pK 1,81
    } (base OIV, base 1,81)
setting-law = Ley: { law-of } (ley UE, ley Argentina)
setting-zone =
    Zona horaria: { $zone ->
        [none] sin decir, así que UTC
       *[other] { $zone }
    } (zona horaria Europe/Madrid)
setting-daily =
    Lista diaria: { $daily ->
        [off] no (lista diaria a las 7:30)
       *[other] { $daily } (sin lista diaria)
    }
setting-quiet = Silencio: de { $from } a { $to } (silencio de 20 a 6)
setting-ph-days = Un pH vale { $days } días (el pH vale 14 días)
setting-check-days = Medir cada { $usual } días; barricas y bajos cada { $often } (medir cada 30 días, medir barricas cada 14 días)
setting-language = Idioma: español (idioma español)
setting-short-replies =
    Respuestas: { $short ->
        [short] cortas (respuestas largas)
       *[long] enteras (respuestas cortas)
    }
setting-wrong =
    Eso no puede ser: “{ $text }”. { $of ->
        [units] Por ejemplo: trabajamos en galones
        [usual-additive] Por ejemplo: nuestro habitual es meta 57%
        [target] Por ejemplo: objetivo 0,6 para tintos
        [yield] Por ejemplo: rendimiento 65
        [quiet] Por ejemplo: silencio de 20 a 6
        [daily] Por ejemplo: lista diaria a las 7:30
        [zone] Por ejemplo: zona horaria Europe/Madrid
        [law] De ahí no tengo límites. Tengo: OIV, UE, Reino Unido, EE. UU., CA, AU, NZ, ZA, AR, CL, BR, JP, KR, CN, Codex, CH, GE, HK, EAEU. Por ejemplo: ley UE
        [allowance] Por ejemplo: suplemento 30%
        [basis] Por ejemplo: base OIV
        [ph-days] Por ejemplo: el pH vale 14 días
        [check-days] Por ejemplo: medir cada 30 días
       *[other] Por ejemplo: respuestas cortas
    }
forgotten-person = Tu nombre ya no sale en las hojas. Lo que anotaste queda, como persona { $number }.

## Personas, bodegas y chats

role =
    { $role ->
        [keeper] encargado
        [hand] operario
       *[guest] visitante
    }
cellar-called =
    { $cellar ->
        [none] { $keeper ->
            [none] esta bodega
           *[other] la bodega de { $keeper }
        }
       *[other] { $cellar }
    }
keeper-called = { $name }
not-allowed =
    { $role ->
        [keeper] Eso es cosa de un encargado de esta bodega
       *[hand] Eso es cosa de operarios y encargados de esta bodega
    }{ $keepers ->
        [none] .
       *[some] : pregunta a { $list }.
    }
guest-not-kept = Aquí estás de visita: nada de esto se anota.
not-of-cellar = Ya no eres de esta bodega. Un encargado puede invitarte: entonces envíame el código.
invite-how = ¿Con qué papel? Escribe: invitar operario, o: invitar visitante, o: invitar encargado
invite-not-here = Aquí no puedo hacer ningún código.
invited = Código para un { role }, hasta { $day }: { $code }
invited-how =
    { $link ->
        [none] Quien me envíe primero “entrar” y el código, entra.
       *[other] Quien abra esto primero, entra: { $link } (o me envía “entrar” y el código)
    }
joined = Estás en { $list }, como { role }.
joined-before = Ya estabas en { $list }, como { role }. El código sigue valiendo.
joined-how =
    { $role ->
        [guest] Pregunta por cualquier depósito, así: T4?
       *[other] Envía una lectura, así: T4 55 hl pH 3,58 libre 21
    }
join-unknown = Ese código no vale, o ya venció. Pide otro.
join-used = Ese código ya se usó. Pide otro.
people-head = Personas de esta bodega:
people-line =
    { $name }: { role }{ $me ->
        [me] { " " }(tú)
       *[other] { "" }
    }
people-how = Para cambiar: invitar operario, Ben es visitante, quitar Ben
role-changed =
    { $role ->
        [none] { $name } ya no es de esta bodega.
       *[other] { $name } es ahora { role }.
    }
role-same = { $name } ya es { role }.
last-keeper = { $name } es el último encargado. Pon antes a otro, así: Ben es encargado
person-unknown = Aquí no conozco a “{ $text }”. Están: { $list }.
person-which = ¿Qué “{ $text }”? { $list }. Escríbelo con el número, así: quitar persona 3
person-called =
    { $name ->
        [none] persona { $number }
       *[other] { $name }
    }
at-cellar = { $list }:
at-now = Ahora en { $list }.
at-already = Ya estamos en { $list }.
at-here = Estamos en { $list }.
at-others = Otras: { $list }. Para cambiar: estamos en, y el nombre
at-only = Aquí no hay otra.
at-unknown = Aquí no conozco ninguna bodega “{ $text }”. Están: { $list }.
at-which = ¿Qué “{ $text }”? { $list }.
cellar-left = Ya no estás en { $list }. Lo que anotaste se queda en su registro.
cellar-named = Esta bodega es ahora { $name }.
reads-along =
    { $on ->
        [on] Aquí contesto lecturas aunque nadie me llame, si depósito y cifras están claros.
       *[off] Aquí solo contesto si me llaman.
    }
group-joined = Hola. Calculo adiciones de sulfuroso y llevo el registro de una bodega. Llámame por mi nombre, o respóndeme.
group-how = Para empezar: T4 55 hl pH 3,58 libre 21. Más: ayuda
corrected = Corregido.
edited-noted = Tu edición no cambia nada: la entrada { $entry } ({ $vessel }) vale. Si está mal: anular { $entry } y el motivo
edited-added = Tu edición no cambia nada: { $vessel } recibió desde entonces una adición (entrada { $entry }). Envía las cifras buenas en un mensaje nuevo.
edited-late = Tu edición no cambia nada: ese mensaje tiene más de 15 minutos. Envíalo como nuevo.
edited-anew = Eso no lo tomo de una edición. Envíalo en un mensaje nuevo.
added-it-none =
    { $vessel ->
        [none] ¿Qué se echó, y dónde? Por ejemplo: añadidos 82 g de meta T4
       *[other] ¿Qué se echó en { $vessel }? Por ejemplo: añadidos 82 g de meta { $vessel }
    }
picture-none =
    { $vessel ->
        [none] ¿De qué depósito? Por ejemplo: gráfica T4
       *[other] Todavía no sé nada de { $vessel }, así que no hay nada que dibujar.
    }
stranger = Este bot es para gente invitada. Si tienes un código, envía: entrar y el código
too-fast = Demasiados mensajes de golpe: durante un minuto me salto los tuyos. Luego envía otra vez lo que no contesté.

command-today = Lo anotado hoy
command-due = Depósitos por medir
command-vessels = Todos los depósitos
command-open = Encargos sin hacer
command-settings = Lo habitual aquí, y cómo cambiarlo
command-help = Cómo usarme

## Archivos: exportar e importar

export-entry = N.º
export-kind = Tipo
export-done = Hecho (hora local)
export-noted = Anotado (hora local)
export-late = Tarde
export-is-late = tarde
export-person = Persona
export-unnamed = persona { $number }
export-vessels = Depósito
export-to = A
export-event = Qué pasó
export-wine-lot = Lote de vino
export-wine = Vino
export-additive = Aditivo
export-strength_percent = Concentración %
export-chemical_lot = Lote del aditivo
export-supplier = Proveedor
export-mass_g = Cantidad g
export-additive_volume_mL = Cantidad mL
export-tablets = Pastillas
export-SO2_g = SO2 añadido g
export-added_mg_L = SO2 añadido mg/L
export-planned_mg_L = SO2 previsto mg/L
export-planned_free_mg_L = SO2 libre buscado mg/L
export-volume_L = Volumen L
export-stock-left = Queda en almacén (g, mL, pastillas)
export-us-gallons = Volumen gal EE. UU.
export-ph = pH
export-free_mg_L = SO2 libre mg/L
export-total_mg_L = SO2 total mg/L
export-temperature_C = Temperatura °C
export-alcohol_percent = Alcohol % vol
export-sugar_g_L = Azúcar g/L
export-over_rule = Sobre el límite de
export-order = Cumple el encargo n.º
export-remark = Observación
export-corrects = Anula n.º
export-reason = Motivo
export-struck_by = Anulada por n.º
export-struck-reason = Anulada porque
export-calculated = Calculado
export-is-calculated = calculado
export-is-not-calculated = sin calcular
export-at = Hecho (con zona)
export-noted_at = Anotado (con zona)
export-by = Persona n.º
export-name = Nombre
export-style = Color
export-category = Clase
export-product = Producto
export-organic = Ecológico
export-stage = Fase
export-designated_mg_L = Con denominación, límite mg/L
export-uplift = Año declarado
export-quality = Espumoso de calidad
export-pdo = Nombre protegido
export-bulk = Granel para exportación
export-density_kg_L = Densidad kg/L
export-reserve_mg_L = Reservado para embotellado mg/L
export-lot = Lote dicho
export-capacity_L = Capacidad L
export-until = Hasta
export-strength_of = Concentración de
export-tablet_SO2_g = SO2 por pastilla g
export-tablet_salt_g = Sal por pastilla g
export-key = Clave

import-vessels = Depósitos en el archivo: { $vessels }.
import-log = Entradas en el archivo: { $entries }. Depósitos: { $vessels }. Personas: { $people }.
import-not-understood = No entendido y dejado fuera: { $count ->
        [one] línea { $lines }
       *[other] líneas { $lines }
    }.
import-not-taken = No se toma de él: { $list }.
import-not-taken-name = { $name ->
        [ph] pH
        [free_mg_L] SO2 libre
        [total_mg_L] SO2 total
        [temperature_C] temperatura
       *[other] { $name }
    }
import-unit = Los volúmenes sin unidad se leen en { $unit ->
        [L] litros
        [hL] hectolitros
        [mL] mililitros
        [m3] metros cúbicos
        [galUS] galones (EE. UU.)
       *[galUK] galones imperiales
    }.
import-problem = { $code ->
        [empty] El archivo está vacío.
        [too-large] El archivo es demasiado grande: como mucho 512 kB, nuestra propia exportación 8 MB.
        [too-many-rows] El archivo tiene demasiadas filas: como mucho 20.000.
        [too-many-columns] El archivo tiene demasiadas columnas: como mucho 200.
        [cell-too-long] Una celda del archivo es demasiado larga para serlo.
        [not-a-table] Eso no es una tabla que pueda leer. Envía un CSV o XLSX, o un texto con un depósito por línea: T4; 5200 L; tinto
        [old-spreadsheet] Esa hoja es de un tipo viejo, o lleva contraseña. Guárdala como XLSX o CSV, sin contraseña.
        [broken] El archivo está dañado, o en él no se cierra unas comillas. Guárdalo otra vez como XLSX o CSV.
        [too-heavy] Leer el archivo lleva demasiado tiempo o memoria. Pártelo, o envíalo como CSV.
        [columns-missing] Parece mi propia exportación, pero faltan columnas: { $about }.
        [columns-unknown] Parece mi propia exportación, pero no conozco estas columnas, o están dos veces: { $about }.
        [unclear-numbers] No sé si los números llevan coma o punto decimal: guarda el archivo con uno de los dos, sin marcas de miles.
        [not-understood] Parece mi propia exportación, pero estas líneas no son entradas: { $lines }.
        [doubled] Un número o una clave de estas líneas está dos veces en el archivo: { $lines }.
        [refers-outside] Estas líneas hablan de entradas que no están en el archivo: { $lines }. Exporta todo e importa eso.
        [already-noted] Estas líneas ya están anotadas aquí: { $lines }.
       *[no-vessels] No he encontrado en él ningún depósito. Una línea es así: T4; 5200 L; tinto
    }
import-nothing-taken = No se ha tomado nada.

## Imágenes

picture-unit = SO2 en { $unit }
picture-free = libre { $free } ({ $day })
picture-total = total { $total } ({ $day })
picture-bound = combinado: el hueco
picture-odd = libre sobre total
picture-needed =
    { $ph ->
        [no-ph] libre necesario (pH sin dato ahora)
        [no-target] libre necesario (sin objetivo habitual ahora)
       *[other] pide { $needed } de libre con pH { $ph }
    }
picture-limit = límite del total { $limit }
picture-added = añadido
picture-added-thinned = añadido (no caben todas las cifras)
picture-added-unknown = añadido, cantidad sin dato
picture-blended = mezclado

picture-head = { $vessel } desde { $day }. Lecturas: { $readings }, adiciones: { $additions }.
picture-last = { $list }.
picture-last-free = libre { $value } { $unit } ({ $day })
picture-last-total = total { $value } { $unit } ({ $day })
picture-last-bound = combinado { $value } { $unit } ({ $day })
picture-needs = pH { $ph } ({ $day }): { $molecular } molecular pide { $needed } de libre.
picture-needs-nothing =
    { $why ->
        [no-ph] Ahora no hay dato de pH, así que tampoco de qué libre pide.
       *[no-target] Ahora no hay objetivo habitual para él.
    }
picture-limit-of-total = Límite del total: { $limit }.
picture-additions =
    { $earlier ->
        [none] Añadido, { $unit }: { $list }.
       *[other] Añadido, { $unit }: { $list }; { $earlier } anteriores.
    }
picture-addition =
    { $added ->
        [none] sin dato ({ $day })
       *[other] { $added } ({ $day })
    }
picture-unmeasured = Libre sin medir desde la adición: { $day }.
picture-came-from = Llegó de { $vessels } ({ $day }): las cifras anteriores están allí.
picture-was-blended = Mezclado ({ $day }): las cifras de antes son de otro vino.
picture-empty = Vacío desde { $day }.
picture-is-odd = Libre sobre total ({ $days }): uno de los dos está mal, mide otra vez.
picture-nothing = Sin gráfica de { $vessel }: todavía no se ha medido SO2 en el vino que tiene.

# Preguntas sueltas: la respuesta, una cifra con su fuente, y qué enviar después.
question-small-or-large = Menos y más grandes. Una adición pequeña puede combinarse entera y no dejar libre.
question-small-or-large-why = De una adición queda libre del 35 al 67 % (AWRI; un manual, de memoria); las cifras no coinciden, así que mide al día siguiente.
question-small-or-large-next = Para tu vino: T4 55 hl pH 3,58 libre 21
question-how-often = Depósitos cada mes más o menos, barricas cada dos semanas, y un día después de cada adición (práctica común, sin fuente).
question-how-often-why = Antes si hace calor, está a medio llenar o bajo de libre.
question-how-often-next = Qué toca aquí: pendientes
question-which-figure = Protege el molecular; sale del libre y del pH. La ley cuenta el total: libre y combinado juntos.
question-which-figure-why = De 0,6 a 0,8 mg/L de molecular es lo usual (Understanding Wine Chemistry, 2016).
question-which-figure-next = El tuyo: pH 3,5 libre 20
question-which-yield = 57,6 %: tanto SO2 lleva el metabisulfito potásico puro por su fórmula, y así calculo.
question-which-yield-why = El 50 % es costumbre del oficio, con una reserva dentro: para lo mismo gasta un 15 % más de polvo.
question-which-yield-next = ¿Tu etiqueta dice otra cosa? Dila: meta 57%, o meta 96%
question-tablets-or-powder = El mismo SO2, si el tamaño es el que toca. El polvo dosifica más fino pero pide báscula.
question-tablets-or-powder-why = Las efervescentes se venden por gramos de SO2 (2 o 5 g), las Campden por gramos de sal (0,44 o 0,55 g): práctica común, sin fuente.
question-tablets-or-powder-next = Lo que añaden: 2 pastillas de 5 g en 225 L
question-old-powder = Abierto y húmedo pierde fuerza, como una décima parte al año (práctica común, sin fuente). Apelmazado: no para vino.
question-old-powder-why = Nunca huelas el saco. Con polvo viejo mide al día siguiente: quizá entró menos de lo que pesaste.
question-old-powder-next = Apunta su fecha: recibido 1 kg de meta lote 12
question-wait-before-yeast = De 12 a 24 horas después de la adición (práctica común, sin fuente).
question-wait-before-yeast-why = De 50 mg/L en el mosto, unos 16 están luego como total (texto técnico alemán, 2012).
question-wait-before-yeast-next = La dosis: mosto 20 hl añadir 40
question-after-malolactic = Cuando se mide que no queda málico, no antes.
question-after-malolactic-why = Las bacterias piden libre por debajo de 5–10 y total por debajo de 30–40 mg/L (AWRI, para pH 3,3 a 3,5).
question-after-malolactic-next = Entonces: T4 maloláctica hecha, y su lectura
question-ppm-and-mg-L = En vino 1 ppm cuenta como 1 mg/L, y 1 g/hL son 10 mg/L.
question-ppm-and-mg-L-why = De polvo es menos: 10 g/hL de metabisulfito potásico aportan 57,6 mg/L de SO2 (por su fórmula).
question-ppm-and-mg-L-next = Pruébalo: 10 g de meta en 1 hl
question-teaspoons = Nunca con cucharas. Una cucharadita rasa de polvo pesa unos 5 o 6 g (práctica común, sin fuente).
question-teaspoons-why = Para poco vino hace falta una báscula que marque 0,1 g, o una solución al 10 % y una jeringa.
question-teaspoons-next = La solución: preparar 1 L de meta al 10%
question-fell-short = Parte de cada adición se combina, suele ser de un tercio a la mitad; más en vinos jóvenes, dulces o de uva podrida. El aire también gasta.
question-fell-short-why = O bien: sin remover, medido pronto, polvo viejo, otro volumen. 1 mg/L de oxígeno puede gastar 4 mg/L de SO2 (por fórmula).
question-fell-short-next = Mide, luego: T4 libre 24. Lo que hizo: T4?
question-strip-reads-otherwise = Fíate del laboratorio. Las tiras son un primer vistazo; dosifica con una valoración por aireación o yodo.
question-strip-reads-otherwise-why = Los métodos que acidifican leen los tintos por alto, hasta un 66 % (Virginia, 2022). El yodo cuenta también el ácido ascórbico.
question-strip-reads-otherwise-next = Tu valoración: AO 20 mL muestra, 1,9 mL 0,01 N
question-stop-fermentation = No. El sulfuroso no para una fermentación en marcha, y las botellas con azúcar y levadura pueden reventar.
question-stop-fermentation-why = Frío y filtro esterilizante, por alguien cualificado; después el dulce se tiene cerca de 1,5 mg/L de molecular (una tabla publicada).
question-stop-fermentation-next = Cuando esté quieto: T4 10 hl dulce pH 3,3 libre 10
question-sorbate = Sorbato nunca solo: frena levaduras, no bacterias, y estas lo vuelven olor a geranio.
question-sorbate-why = Con él, el vino mantiene todo su libre para 0,8 mg/L de molecular (práctica común, sin fuente).
question-sorbate-next = Ese SO2: T4 10 hl pH 3,4 libre 12
question-allergy = Pregunta a un médico: aquí nadie puede decir qué es seguro para una persona. Con asma el sulfito puede ser peligroso.
question-allergy-why = Las etiquetas lo nombran desde 10 ppm de total (EE. UU., 27 CFR 4.32(e)), por encima de 10 mg/L en la UE (1169/2011). El dolor de cabeza tiene muchas causas.
question-allergy-next = Lo que lleva un vino: T4?
question-law = Depende del mercado, el color y el azúcar. Código internacional: tinto 150, blanco y rosado 200 mg/L de total hasta 4 g/L de azúcar, por encima 300.
question-law-why = (OIV-MA-C1-01.) No es consejo legal: confírmalo para tu mercado.
question-law-next = El de tu mercado: límite tinto azúcar 3 UE
question-gas = Solo gente formada y autorizada para ello donde estás; máscara, ventilación, otra persona fuera.
question-gas-why = 0,5 ppm por turno es el límite de la UE (2017/164); 100 ppm es de inmediato peligroso para la vida (NIOSH).
question-gas-next = Sin gas: T4 55 hl pH 3,58 libre 21 meta
question-potassium-or-sodium = Potásico para vino. El sódico es para material: la OIV no lo nombra para vino.
question-potassium-or-sodium-why = No pesan igual: 57,6 % de SO2 en la sal potásica, 67,4 % en la sódica (por fórmula).
question-potassium-or-sodium-next = Di cuál tienes: T4 55 hl pH 3,58 libre 21 meta
question-when-to-measure = Un día después de mezclarlo, mejor dos (práctica común, sin fuente).
question-when-to-measure-why = Antes, una parte todavía se está combinando: sale alto.
question-when-to-measure-next = Entonces: T4 libre 24
question-how-to-mix = Disuélvelo antes en agua fría o un poco de vino, unos 50 g por litro (revista técnica, 2009). Échalo removiendo.
question-how-to-mix-why = Guantes, gafas, aire. Nunca con ácido en el mismo recipiente; un vino lleno de CO2 rebosa espuma.
question-how-to-mix-next = Una solución: preparar 5 L de meta al 5%
question-pH-matters = Cuanto más bajo el pH, más parte del libre es molecular, y ese protege.
question-pH-matters-why = Para 0,8 mg/L de molecular: 26 de libre con pH 3,3, 79 con pH 3,8 (University of California, 1982).
question-pH-matters-next = El tuyo: pH 3,5 libre 20
question-which-target = Blanco y rosado 0,8 mg/L de molecular, tinto 0,6, dulce 1,5, si no pones otro.
question-which-target-why = Publicado: 0,6 a 0,8 para que aguante (Understanding Wine Chemistry, 2016), tinto al embotellar 0,4 a 0,6 (según California, 1982).
question-which-target-next = Para cambiarlo: objetivo 0,5 para tintos
question-stock-keeps = Días, no semanas: hazla fresca, tápala, ponle fecha (práctica común, sin fuente).
question-stock-keeps-why = La OIV llama inestables a las soluciones de SO2 y de bisulfito.
question-stock-keeps-next = Fresca: preparar 1 L de meta al 10%
question-too-much = No eches más. Tiempo, aire y trasiegos bajan el libre; mezclar baja libre y total.
question-too-much-why = Desde unos 2 mg/L de molecular se huele (Understanding Wine Chemistry, 2016). Agua oxigenada: solo alguien cualificado, donde la ley lo permita.
question-too-much-next = Cómo está: T4?
question-no-sulfite = Se puede, y entonces el vino depende de frío, limpieza, depósitos llenos, pH bajo y venta rápida.
question-no-sulfite-why = La levadura hace algo por su cuenta, normalmente menos de 30 mg/L (artículo de aficionados): "sin sulfitos añadidos" no es "sin sulfitos".
question-no-sulfite-next = Lo que tiene: T4 pH 3,5 libre 5
question-bottling = Mide unos días antes; la última adición va antes de arrancar la línea, mezclada y medida.
question-bottling-why = Cada mg/L de oxígeno que entra puede gastar hasta 4 mg/L de libre (por fórmula).
question-bottling-next = Con su oxígeno: embotellar T4 40 hl pH 3,4 libre 22 oxígeno 2 mg/L

## El almacén de productos
stock-tablets =
    { $unit ->
        [tablet] { " " }pastilla
        [tablets] { " " }pastillas
       *[none] { "" }
    }
stock-of =
    { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    }{ $size ->
        [none] { "" }
       *[other] , de { $size } g
    }
stock-none = Todavía no hay nada anotado en el almacén. Di lo que hay, o lo que entró: recibidos 25 kg de meta lote 4471 de Suministros Norte
stock-none-of = No hay { additive } en el almacén. Di lo que entró (recibidos …), o cuéntalo (existencias meta 3,2 kg).
stock-shelf =
    { stock-of }: { $amount }{ stock-tablets }{ $counted ->
        [none] .
       *[other] { " " }(contado { $counted }).
    }
stock-lot =
    { "  " }{ $lot ->
        [none] sin lote
       *[other] lote { $lot }
    }: { $amount }{ stock-tablets }, entró { $day }{ $supplier ->
        [none] { "" }
       *[other] { " " }de { $supplier }
    }
stock-negative = ⚠ { stock-of }: según el registro { $amount }{ stock-tablets }: entró algo que no está anotado. Anótalo, o cuenta: existencias meta 3,2 kg
stock-low = ⚠ Queda poco en el almacén: { stock-of }, { $amount }{ stock-tablets }.
stock-left = Quedan en el almacén: { stock-of }, { $amount }{ stock-tablets }.
stock-short = ⚠ En el almacén según el registro: { stock-of }, { $amount }{ stock-tablets }: menos de lo que hace falta.
stock-old = ⚠ Lleva más de un año: un saco abierto pierde fuerza (práctica común, sin fuente). Mide el libre después.
stock-oldest-lot =
    { $lot ->
        [none] Tomado del más viejo de varios; si no, di el lote: añadidos …, lote { $other }
       *[other] Tomado del lote { $lot }, el más viejo de varios; si no, dilo: añadidos …, lote { $other }
    }
stock-lot-unknown = El lote { $lot } no está en el almacén según el registro: tomado del más viejo.
stock-noted =
    Anotado { $entry }: { $event ->
        [received] recibido
        [used] usado
        [discarded] tirado
       *[counted] contado
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }de { $supplier }
    }{ $purpose ->
        [none] { "" }
       *[other] { " " }({ $purpose })
    }, { $when }.
stock-corrected =
    El registro decía { $was }: ahora { $amount }{ stock-tablets } { $way ->
        [more] más
       *[less] menos
    }.
stock-not-kept = De eso no hay nada anotado en el almacén, así que no se descuenta. Cuéntalo: existencias meta 3,2 kg
stock-lacks =
    { $what ->
        [additive] ¿Qué aditivo? Escribe: recibidos 25 kg de meta
        [strength] ¿Qué concentración tiene: { additive }? Escribe: recibidos 10 L de SO2 al 6%
        [size] ¿Pastillas de cuántos gramos? Escribe: recibidas 50 pastillas de 5 g
        [volume] Esto se mide por volumen: { additive }. Escribe: recibidos 10 L de SO2 al 6%
        [one] Un aditivo por mensaje. Escribe: recibidos 25 kg de meta
       *[amount] ¿Cuánto, y en qué unidad ({ additive })? Escribe: { $event ->
            [counted] existencias meta 3,2 kg
            [used] usados 200 g de meta para enjuagar
            [discarded] tirado 1 kg de meta
           *[received] recibidos 25 kg de meta
        }
    }

# El laboratorio: en qué queda una valoración

titration-result = { $vessel ->
    [none] SO2 { $of ->
        [total] total
       *[other] libre
    } { $result } { $unit }
   *[other] { $vessel }: SO2 { $of ->
        [total] total
       *[other] libre
    } { $result } { $unit }
}, por { $method ->
    [aeration] aireación-oxidación
   *[other] yodo
}.
titration-too-much = Más de lo que lleva un vino: revisa la muestra, la bureta y la fuerza del valorante. No se guarda.
titration-molar = Yodo { $molar } M es { $normal } N: un mol toma dos.
titration-ascorbic-asked = El yodo cuenta también el ácido ascórbico: { $amount } mg/L de él se leen como +{ $counts } { $unit }. Si lleva, añade “ascórbico { $amount }”.
titration-precision = Dos resultados de un vino pueden diferir { $again } en un laboratorio (OIV, de memoria), { $other } entre dos (CEE 2676/90).
titration-red-high = Un tinto: los métodos que acidifican leen el libre por alto, en un estudio hasta un 66 % (Virginia, 2022). No se resta nada; usa siempre un mismo método.
titration-name-vessel = Para guardarlo como lectura, pon el depósito delante: T4 …
titration-read = Leído: { $list }.
titration-sample = muestra { $volume } mL
titration-titrant = valorante { $volume } mL
titration-blank = blanco { $volume } mL
titration-strength = { $unit ->
    [none] { $strength }
   *[other] { $strength } { $unit }
}
titration-iodate = { $mass } mg de yodato en { $volume } mL
titration-ascorbic = ácido ascórbico { $amount } mg/L
titration-free-assumed = Tomado como SO2 libre; escribe “total” si la muestra se preparó para el total.
titration-no-blank = Sin restar blanco; añade “blanco 0,1” si lo hiciste.
titration-asks = { $missing ->
    [method] ¿Valorado con sosa (AO) o con yodo? Escríbelo: AO 20 mL muestra, 1,9 mL 0,01 N
    [sample] ¿Cuántos mL de vino? Envíalo entero: { $method ->
        [iodine] yodo 25 mL muestra, 1,4 mL 0,02 N
       *[other] AO 20 mL muestra, 1,9 mL 0,01 N
    }
    [titrant] ¿Cuántos mL de la bureta? Envíalo entero: { $method ->
        [iodine] yodo 25 mL muestra, 1,4 mL 0,02 N
       *[other] AO 20 mL muestra, 1,9 mL 0,01 N
    }
    [unit] ¿El yodo está en N o en M? Uno es la mitad del otro. Escribe N o M detrás de su fuerza.
   *[strength] ¿Qué fuerza tiene el valorante? Envíalo entero, con N o M: { $method ->
        [iodine] yodo 25 mL muestra, 1,4 mL 0,02 N
       *[other] AO 20 mL muestra, 1,9 mL 0,01 N
    }
}
titration-either = { $strength } N da { $normal } { $unit }, { $strength } M da { $molar } { $unit }.
button-keep-of = Guardar { $vessel }{ $of ->
    [total] {" "}total
   *[free] {""}
}
button-keep-result = Guardarlo

# El laboratorio: cuánto puede errar una dosis, tablas, las dos bases

range-dose = { $vessel ->
    [none] Con
   *[other] { $vessel }: con
} su margen (95 %): { $amount ->
    [none] { $low }–{ $high } { $unit } de SO2
   *[other] { $amount }{ $count ->
        [several] {" "}en total
       *[one] {""}
    }, o sea { $low }–{ $high } { $unit } de SO2
}.
range-sure = Tras la dosis puedes contar seguro con { $molecular } { $unit } de molecular, si se combina lo calculado.
range-sure-unbound = Si nada se combina puedes contar seguro con { $molecular } { $unit } de molecular tras la dosis.
range-sure-low = Por debajo de 10 { $unit } de libre puede combinarse toda una dosis: seguros son solo { $molecular } { $unit } de molecular. Mide al día siguiente.
range-rests = Se apoya en pH ± { $ph } y libre ± { $free } { $unit }{ $said ->
    [both] .
    [one] {" "}(lo que no dijiste: práctica común, sin fuente).
   *[none] {" "}(práctica común, sin fuente). Los tuyos: pH 3,58±0,03 libre 21±2
}
range-limit = Por arriba, el total puede pasar el límite.
range-nothing = Un margen necesita antes una dosis. Envía una lectura, así: T4 55 hl pH 3,58±0,03 libre 21
table-head = SO2 libre ({ $unit }) para molecular { $targets }, { $basis ->
    [oiv] por OIV con 12 % vol y 20 °C (pK { $pK })
   *[other] pK { $pK }
}:
table-row = pH { $ph }: { $free }
table-care = Los objetivos se publican con pK 1,81. Por encima de 60 de libre, piensa en el total y en el sabor.
molecular-head = { $vessel }: pH { $ph }{ $free ->
    [none] , sin dato de SO2 libre.
   *[other] , libre { $free } { $unit } ({ $day }).
}
molecular-base = { $basis ->
    [oiv] Por OIV, { $alcohol } % vol{ $known ->
        [yes] {""}
       *[no] {" "}(no dicho)
    }, 20 °C
   *[other] Por pK { $pK }
}: { $molecular ->
    [none] { $target } pide { $needed } de libre.
   *[other] { $molecular } molecular; { $target } pide { $needed } de libre.
}
molecular-meaning = Por pK 1,81 el mismo objetivo pide { $times } veces el libre: { $dose } { $unit } por añadir, por OIV { $other }. Los objetivos publicados se apoyan en pK 1,81; { $basis ->
    [oiv] las dosis de esta bodega van por OIV.
   *[other] las dosis de esta bodega también.
}

# Este vino: qué combinó, cuándo pide más, demasiado, mezclas

lab-lacks = { $vessel }: { $what ->
    [ph] sin dato de pH. Envía uno, así: T4 pH 3,58 libre 21
    [free] sin dato de SO2 libre. Envíalo, así: T4 libre 21
    [total] sin dato de SO2 total. Envíalo, así: T4 total 80
   *[target] tal como está no hay objetivo para él; no se calcula nada.
}
learned = Este vino combinó un { $share } % (± { $spread }) de sus últimas { $count } adiciones.
learned-offer = Este vino combinó un { $share } % (± { $spread }) de sus últimas { $count } adiciones. { $limit ->
    [passes] Lo que eso pide se acerca demasiado al límite.
   *[within] Según eso: { $amount ->
        [none] { $dose } { $unit }
       *[other] { $amount } ({ $dose } { $unit })
    }. Tú eliges.
}
forecast-below = { $vessel }: el libre baja de { $needed } { $unit } { $day ->
    [far] dentro de más de dos años
   *[other] hacia el { $day }
}{ $from ->
    [now] , y quizá ya esté por debajo.
    [far] .
   *[other] {" "}({ $by ->
        [readings] 9 de 10: {""}
       *[published] {""}
    }del { $from } a { $to ->
        [far] más de dos años
        [never] quizá nunca
       *[other] { $to }
    }).
}
forecast-steady = { $vessel }: según sus lecturas el libre no baja; { $from ->
    [now] mide para estar seguro.
    [far] por debajo de { $needed } { $unit } no antes de dos años.
   *[other] por debajo de { $needed } { $unit } no antes del { $from }.
}
forecast-by-readings = Por { $count } lecturas desde la última adición: se pierde un { $lost } % en 30 días.
forecast-by-rates = { $container ->
    [bottle] Por un estudio de botellas (según un sitio de vino de Quebec), no por este vino: tras 3 años queda un 45 % a 14 °C, un 20 % a 15–26 °C.
   *[other] Por lo que pierden las barricas, no por este vino: 3–10 mg/L al mes (práctica común, sin fuente). { $fewest } lecturas dicen lo suyo; hay { $number ->
        [one] una
       *[many] { $count }
    }.
}
forecast-measure = { $from ->
    [now] Mide ahora.
    [far] Mide como siempre.
   *[other] Mide antes del { $from }.
}
forecast-need = Pide { $needed }: pH { $ph } ({ $day }), { $molecular } molecular.
forecast-none = { $vessel }: { $why ->
    [unmeasured] sin libre medido desde su última adición, trasiego, cambio de depósito o embotellado. Mídelo y pregunta otra vez.
    [below-already] el libre está en los { $needed } { $unit } que pide su pH, o por debajo. Envía la lectura para una dosis.
   *[no-rate] todavía sin previsión. No hay dato de lo que pierden los depósitos, y lo suyo pide { $fewest } lecturas desde la última adición; hay { $number ->
        [one] una
       *[many] { $count }
    }.
}
forecast-unlanded = { $vessel }: la última adición todavía no se ha asentado. Mide antes el libre.
blend-share = { $vessel } con { $other }: { $starts ->
    [as-it-is] tal cual { $vessel } cumple los límites; puede entrar hasta un { $most } % de { $other }.
   *[other] de { $least } a { $most } % de { $other } en la mezcla.
}{ $volume ->
    [none] {""}
   *[other] {" "}Lo mínimo son { $volume } de { $other } con todo { $vessel }{ $enough ->
        [no] ; solo tiene { $held }.
       *[yes] .
    }
}
blend-candidates = Otros que meterían { $vessel } en sus límites, la parte menor primero:
blend-candidate = { $other }: { $least }–{ $most } %{ $volume ->
    [none] {""}
   *[other] , al menos { $volume }{ $enough ->
        [no] {" "}(tiene { $held })
       *[yes] {""}
    }
}
blend-nobody = { $any ->
    [none] Ningún otro depósito de ese color está acabado y con libre anotado, así que no hay con qué mezclar { $vessel }.
   *[other] Ninguno de otros { $count } depósitos con lectura mete { $vessel } en sus límites.
}
blend-fails = { $vessel } con { $other }: ninguna parte sirve: { $fails ->
    [total] el total sigue sobre el límite.
    [free] el libre sigue sobre el límite.
    [molecular] el molecular sigue fuera de sus límites.
   *[unmeasured] falta por medir algo de uno de los vinos.
}
blend-figures = Por el libre anotado: { $list }.
blend-figure = { $vessel } { $free } ({ $day })
blend-bounds = Respeta: { $list }.
blend-bound-total = total como mucho { $limit }
blend-bound-no-total = sin total (uno no está medido)
blend-bound-free = libre como mucho { $limit }
blend-bound-molecular = molecular { $least ->
    [none] como mucho { $most }
   *[other] { $least }–{ $most }
}, con el peor pH de los dos
blend-bound-no-ph = sin molecular (un pH no está medido)
blend-whole = Todo de ambos, { $volume }: { $free ->
    [none] libre sin dato
   *[other] libre { $free }
}, { $total ->
    [none] total sin dato
   *[other] total { $total }
}, antes de que se mueva lo combinado.
blend-care = El pH de una mezcla no se calcula: mezcla una copa en esa parte, mide pH, libre y total, y decide. También cuentan otros límites de ambos vinos.
too-much-head = { $vessel }: { $free ->
    [none] libre sin medir
   *[other] libre { $free }
}{ $total ->
    [none] {""}
   *[other] , total { $total }
}{ $molecular ->
    [none] {""}
   *[other] , molecular { $molecular }
}. Primero mide otra vez: a menudo una cifra está mal.
too-much-wait = Esperar: { $container ->
    [barrel] las barricas pierden { $least }–{ $most } mg/L de libre al mes (práctica común, sin fuente).
    [bottle] las botellas lo pierden en años; no se puede sacar nada.
   *[tank] no hay dato de lo que pierden los depósitos; las barricas pierden { $least }–{ $most } mg/L de libre al mes (práctica común, sin fuente).
} El total casi no baja.
too-much-air = Aire, un trasiego con chorro: 1 mg/L de oxígeno gasta hasta { $each } mg/L (teoría), un vino lleno de aire { $low }–{ $high } (artículo de aficionados). Envejece el vino.
too-much-blend = Mezclar baja también el total: mezclar { $vessel }
too-much-peroxide = Agua oxigenada: { $says ->
    [listed] en la lista de Australia, con { $left } mg/L de resto como mucho (AWRI, entonces).
    [not-listed] no permitida en la UE (AWRI, entonces).
    [old-text] una tabla antigua de EE. UU. la tiene solo para usos estrechos; por comprobar (27 CFR 24.246, 24.247).
   *[none] no tengo texto de tu mercado.
} Pregunta antes a tu autoridad y a un enólogo cualificado; no doy cantidades.
