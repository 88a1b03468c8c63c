### Quello che diciamo, in italiano. Le cifre arrivano come testo già fatto; prodotti, fasi e codici come id.
### Una riga è una cosa; un telefono ne mostra circa 45 lettere.

## Pezzi che servono ad altre frasi

list-separator = {", "}
barrel-name = barrique
cautions-separator = {" "}
dose-in-all-separator = {" e "}
cautions-of-separator = {" "}
assumed-separator = {"; "}

additive =
    { $additive ->
        [potassium-metabisulfite] metabisolfito di potassio (E224)
        [sodium-metabisulfite] metabisolfito di sodio (E223)
        [potassium-metabisulfite-solution] soluzione di metabisolfito di potassio
        [sodium-metabisulfite-solution] soluzione di metabisolfito di sodio
        [potassium-bisulfite-solution] bisolfito di potassio in soluzione (E228)
        [ammonium-bisulfite-solution] bisolfito d’ammonio in soluzione
        [sulfur-dioxide-solution] soluzione solforosa (SO2 in acqua)
        [sulfur-dioxide-gas] SO2 gassosa (E220)
        [tablet] pastiglie effervescenti
       *[other] prodotto
    }
stage-now =
    { $stage ->
        [must] mosto
        [fermenting] ancora in fermentazione
        [malolactic] malolattica ancora da fare
        [base] base spumante
        [bottled] imbottigliato
       *[finished] fermentazioni finite
    }
weigh =
    { $vessel ->
        [none] Pesa
       *[other] { $vessel }: pesa
    }
measure =
    { $vessel ->
        [none] Misura
       *[other] { $vessel }: misura
    }
take =
    { $vessel ->
        [none] Prendi
       *[other] { $vessel }: prendi
    }
at =
    { $vessel ->
        [none] {""}
       *[other] { $vessel }:{" "}
    }
for-each =
    { $count ->
        [one] {""}
       *[other] {" "}ciascuna
    }
target =
    { $kind ->
        [molecular] { $value } molecolare
        [free] { $value } di libera
       *[add] + { $value }
    }

## La prima riga: una dose

tablet-word =
    { $unit ->
        [tablet] pastiglia
       *[tablets] pastiglie
    }
tablets-of =
    { $additive ->
        [tablet] { $amount } { $unit ->
            [tablet] pastiglia effervescente
           *[tablets] pastiglie effervescenti
        } da { $size } g di SO2
       *[other] { $amount } { tablet-word } da { $size } g di { additive }
    }
measured =
    { $unit ->
        [tablet] { tablets-of }{ for-each }
        [tablets] { tablets-of }{ for-each }
        [solution] { $amount } di { additive } { $strength } %{ for-each }
       *[other] { $amount } di { additive }{ for-each }
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
dose-gas = { weigh } { $amount } di SO2 gassosa{ for-each }: solo personale formato, autorespiratore a portata di mano, solo a peso
dose-in-all = Per tutte e { $count }: { $list }.
in-all-stock = { $amount } della soluzione { $strength } %
dose-tablet-too-large = { at }mezza pastiglia{ for-each } è già troppo.
dose-tablets-give = Le pastiglie da sole danno { $gives } dei { $wanted } { $unit } voluti.
dose-stock = Oppure { $amount } di una sua soluzione { $strength } %{ for-each }.
dose-only-stock = { measure } { $amount } di { additive } { $strength } %{ for-each }
dose-rest-as-stock = Il resto: { $amount } di { additive } { $strength } %{ for-each }.
dose-negligible = { at }niente che valga la pena aggiungere (mancano { $short }).
dose-too-fine = { at }troppo poco da pesare o misurare (mancano { $short }): prepara una soluzione più debole.
dose-gas-too-little = { at }{ $amount } è troppo poco per il gas: usa una soluzione.
dose-bottled = { at }già imbottigliato: per aggiungere si apre ogni bottiglia. Chiedi prima.
refused-ammonium = { at }bisolfito d’ammonio solo per uve e mosti (OIV): non per questo vino; chiedi prima.
refused-ammonium-must =
    { $stage ->
        [assumed] L’ho preso per vino a fermentazioni finite. È mosto? Allora riscrivi tutto, con la parola mosto.
       *[said] È mosto? Allora riscrivi tutto, con la parola mosto.
    }
dose-nothing = { at }niente da aggiungere.
dose-rate = { at }{ $dose } di SO2 da aggiungere, cioè { measured } ogni { $per }
dose-rate-bare = { at }{ $dose } di SO2 da aggiungere
dose-need = { at }a pH { $ph }, per { $molecular } di molecolare servono { $free } di libera
dose-now = { at }ora { $molecular } di molecolare (pH { $ph }, { $free } di libera)

## La legge

law-of =
    { $region ->
        [oiv] codice OIV
        [eu] UE
        [uk] Regno Unito
        [us] USA
        [ca] Canada
        [ca-qc] Québec
        [au] Australia
        [nz] Nuova Zelanda
        [za] Sudafrica
        [ar] Argentina
        [cl] Cile
        [br] Brasile
        [jp] Giappone
        [kr] Corea
        [cn] Cina
        [codex] Codex
        [ch] Svizzera
        [ge] Georgia
        [hk] Hong Kong
        [eaeu] Unione eurasiatica
        [uy] Uruguay
        [in] India
        [md] Moldavia
       *[mercosur] Mercosur
    }
law-decides =
    { $region ->
        [oiv] ; decide la legge del tuo paese
       *[other] {""}
    }
rule-sugar =
    { $band ->
        [under] {" "}sotto { $high } g/L di zuccheri
        [to] {" "}fino a { $high } g/L di zuccheri
        [from] {" "}da { $low } g/L di zuccheri
        [above] {" "}oltre { $low } g/L di zuccheri
        [between] {" "}da { $low } a { $high } g/L di zuccheri
       *[none] {""}
    }
rule-class =
    { $class ->
        [sweet-300] , dolce in deroga
        [sweet-350] , dolce in deroga
        [sweet-400] , dolce in deroga
        [national-pdo] , DOP
        [national-pdo-dry] , DOP secco
        [national-pdo-other] , DOP non secco
        [dry] , secco
        [sweet] , dolce
        [bulk-export] , sfuso per l’export
        [made-with-organic] , da uve biologiche
       *[none] {""}
    }
rule-what =
    { $what ->
        [red] rosso
        [pale] bianco o rosato
        [white] bianco
        [quality-sparkling] spumante di qualità
        [other-sparkling] altro spumante
        [fortified] liquoroso
        [cider] sidro
        [mead] idromele
        [fruit-wine] vino di frutta
        [alcohol-free] vino dealcolato
       *[wine] vino
    }{ $organic ->
        [yes] {" "}biologico
       *[no] {""}
    }{ rule-sugar }{ rule-class }
rule-short = { law-of }, { rule-what }
dose-capped =
    { $of ->
        [free] { $list }, non di più: libera poi fino a { $after }, limite { $limit } { $unit } di libera ({ rule-short }).
       *[total] { $list }, non di più: totale poi { $least ->
            [yes] almeno{" "}
           *[no] {""}
        }{ $after }, limite { $limit } { $unit } ({ rule-short }).
    }
round-capped =
    { $of ->
        [free] { at }libera poi fino a { $after }, limite { $limit } { $unit } di libera ({ rule-short }).
       *[total] { at }totale poi { $least ->
            [yes] almeno{" "}
           *[no] {""}
        }{ $after }, limite { $limit } { $unit } ({ rule-short }).
    }
dose-at-limit =
    { $least ->
        [yes] { at }misura la totale prima di aggiungere: ora è almeno { $now }, e così si passerebbe il limite di { $limit } { $unit } ({ rule-short }).
       *[no] { at }niente solforosa ora, { $standing ->
            [over] già oltre il limite
           *[at] al limite
        }: { $of ->
            [free] libera { $now }, limite { $limit } { $unit } di libera ({ rule-short }).
           *[total] totale { $now }, limite { $limit } { $unit } ({ rule-short }).
        }
    }
dose-over-already = Così, per quella legge, non si può vendere{ law-decides }: chiedi a chi risponde di questo vino.
law-assumed = Non detto, quindi preso il limite più severo: { $list }.
law-unknown =
    { $code ->
        [colour-assumed] colore
        [sugar-assumed] zuccheri
        [sparkling-class-assumed] tipo di spumante
       *[density-assumed] densità
    }
dose-capped-kept =
    { $reserve ->
        [none] Tengo { $kept } { $unit } sotto il limite: la { $of ->
            [free] libera
           *[total] totale
        } misurata può sbagliare di tanto. Il tuo obiettivo lo supererebbe.
       *[some] Tengo { $kept } { $unit } sotto il limite: { $error } perché la { $of ->
            [free] libera
           *[total] totale
        } misurata può sbagliare di tanto, { $reserve } per l’imbottigliamento. Il tuo obiettivo lo supererebbe.
    }
full-dose-asks =
    { $of ->
        [free] { at }la libera potrebbe arrivare a { $after }, oltre il limite di { $limit } { $unit } di libera ({ rule-short }). Vuoi le cifre lo stesso?
       *[total] { at }la totale sarebbe { $least ->
            [yes] almeno{" "}
           *[no] {""}
        }{ $after }, oltre il limite di { $limit } { $unit } ({ rule-short }). Vuoi le cifre lo stesso?
    }
full-dose-care = Per quella legge il vino così non si può vendere. Nel registro resta che si sapeva. Non è un parere legale: verifica per il tuo mercato.
full-dose-left = Va bene: resta la dose più piccola.
full-dose-none = Qui sopra non c’è una dose che passi un limite.
button-full-dose = Dose intera
button-all-the-same = Sì, lo stesso
over-rule-noted = ⚠ Passa il limite ({ rule-short }): nel registro resta scritto.
over-rule = oltre il limite ({ rule-short })
total-sum = totale { $total } ({ $measured } misurati { $day } + { $since } aggiunti dopo)
limit-is =
    { at }{ $operator ->
        [below] meno di
       *[at-most] al massimo
    } { $limit } { $unit } di SO2 { $of ->
        [free] libera
        [total] totale
       *[other] { $of }
    }: { rule-short }{ $written ->
        [same] {""}
       *[other] , scritto { $value } { $law_unit }
    }{ $density ->
        [none] {""}
       *[other] {" "}(densità { $density })
    }{ $uplift ->
        [none] {""}
       *[other] , di cui { $uplift } per l’annata sfavorevole
    }.
limit-room =
    { $standing ->
        [over] Ora { $of ->
            [free] libera
           *[total] totale
        } { $now }: oltre di { $room } { $unit }.
       *[room] Ora { $of ->
            [free] libera
           *[total] totale
        } { $now }: margine { $room } { $unit }; { $left } se ne tieni { $kept } sotto il limite.
    }
limit-amount = { $left } mg/L in { $volume }: { bare-amount } di { additive }.
limit-text =
    { $text }{ $provision ->
        [none] {""}
       *[other] , { $provision }
    }{ $version ->
        [none] {""}
       *[other] {" "}({ $version })
    }: { $checked ->
        [law-text] letto nel testo di legge
        [law-copy] letto in una copia della legge
        [agency] letto sulla pagina dell’autorità
        [foreign-agency] letto sulla pagina di un’autorità straniera
        [trade-guide] letto in una guida di settore
        [secondary] letto in una fonte secondaria
       *[memory] a memoria, quindi non confermato: non riduce nessuna dose
    }.
limit-none =
    { at }nessun limite in archivio: { law-of }, { $product ->
        [still] vino
        [sparkling] spumante
        [quality-sparkling] spumante di qualità
        [other-sparkling] altro spumante
        [fortified] liquoroso
        [fruit-wine] vino di frutta
        [alcohol-free] vino dealcolato
        [cider] sidro
        [mead] idromele
       *[other] { $product }
    }{ $reason ->
        [not-found] {" "}(cercato, non trovato)
       *[other] {""}
    }. Io non tiro a indovinare: cercalo per il tuo mercato.
limit-notes = Nota: { $list }.
limit-notes-separator = {"; "}
law-note =
    { $code ->
        [recommends-only] il codice raccomanda, decide la legge del tuo paese
        [other-value-told] altrove si legge un’altra cifra
        [boundary-open] il testo non dice di questo preciso zucchero, preso il lato più severo
        [boundary-told-otherwise] la pagina letta mette questo confine dall’altra parte
        [dry-undefined] secco e dolce sono dati senza cifra
        [band-misprinted] il foglio stampa la fascia al contrario
        [by-reference] per rinvio al testo UE
        [derived] due cifre lette, sottratte
        [combined-as-total] il testo dice combinata, presa come totale
        [from-seven-percent] per vini da 7 % in su
        [bulk-has-less] lo sfuso per l’export ha un limite più basso
        [stacks-on-general] accanto vale il limite generale
        [sugar-assumed] zuccheri non detti, preso il più severo
        [colour-assumed] colore non detto, preso il più severo
        [sparkling-class-assumed] tipo di spumante non detto, preso il più severo
        [density-assumed] densità non detta, presa 0,990 (scrivi: densità 0,995)
        [designation-not-on-file] per quella deroga non c’è una riga in archivio
        [no-uplift] qui nessun aumento per annata sfavorevole
        [organic-not-on-file] nessun limite biologico in archivio, preso quello generale
        [repealed] { $value } { $unit } è abrogato e non si usa
        [other-unit-told] un’altra fonte dà { $value } { $unit }
       *[second-value-told] altrove si legge { $value } { $unit }, a memoria
    }
limit-care = Non è un parere legale: verifica per il tuo mercato.
designation-asked =
    Vino dolce con un limite suo in deroga ({ law-of })? Non lo deduco mai: dillo, { $wine ->
        [none] con: deroga 300
       *[other] così: { $wine } deroga 300
    }

## La prima riga: una scelta e non una dose

choice-head = { at }una scelta, non una dose: a pH { $ph }, { $target } di molecolare = { $free } di libera.
choice-leave = { $mark } Lascia così: { $free } di libera sono { $molecular } di molecolare.
choice-to =
    { $total ->
        [unknown] { $mark } A { $free } ({ $molecular } mol.): { measured }; misura la totale
       *[known] { $mark } A { $free } ({ $molecular } mol.): { measured }
    }
choice-no-amount = – A { $free } ({ $molecular } di molecolare): nessuna quantità, la totale passerebbe { $limit } ({ law-of }).
choice-red =
    { $kind ->
        [none] Se è rosso, per { $red } servono { $free } di libera: niente da aggiungere.
        [over] Se è rosso, per { $red } servono { $free } di libera: nessuna quantità, la totale passerebbe { $limit } ({ law-of }).
       *[other] Se è rosso, per { $red } servono { $free } di libera: { bare-amount }.
    }
ways-out = Oppure: più freddo, più pulizia, più controlli; acido per il pH: chiedi a un enologo.

## La fase

bottling-no-oxygen = L’ossigeno non è contato. Misuralo, disciolto e spazio di testa, e scrivilo in fondo: ossigeno 2 mg/L
bottling-takes = { $oxygen } mg/L di ossigeno possono toglierne { $loss } { $unit } ({ bottling-each }).
bottling-target = { $after } di libera all’imbottigliamento, quindi ora { $now }: { $oxygen } mg/L di ossigeno possono toglierne { $loss } { $unit } ({ bottling-each }).
bottling-each =
    { $each ->
        [formula] 4 per 1, da formula
       *[other] { $each } per 1, come dici tu
    }
bottling-measured = Cifre di settore (non confermate) danno { $each } per 1: allora bastano { bare-amount }. Per contare così: ossigeno { $oxygen } mg/L a { $each }
bottling-measured-none = Cifre di settore (non confermate) danno { $each } per 1: allora non serve niente. Per contare così: ossigeno { $oxygen } mg/L a { $each }
condition-stage = Solo a malolattica finita o non voluta.
condition-red =
    { $kind ->
        [none] Se è rosso ({ $red } di molecolare): niente da aggiungere.
        [over] Se è rosso ({ $red } di molecolare): { bare-amount }, anche così oltre { $limit }.
       *[other] Se è rosso ({ $red } di molecolare): { bare-amount }.
    }
no-dose-fermenting = { at }niente solforosa ora, sta ancora fermentando.
no-dose-malolactic = { at }niente solforosa ora, la malolattica è ancora da fare.
no-dose-molecular = Ora { $molecular } di molecolare.
no-dose-why = I batteri vogliono libera sotto 5–10 e totale sotto 30–40 mg/L (pubblicato per pH 3,3–3,5).
no-dose-why-fermenting = La solforosa ora si combina subito e danneggia lieviti e batteri: vogliono libera sotto 5–10, totale sotto 30–40 mg/L (pubblicato per pH 3,3–3,5).
no-dose-all-the-same = Vuoi lo stesso una tua cifra? Chiedi a chi risponde di questo vino, poi scrivi tutto: { whole-example }
figure-alone = “{ $text }”: in questa fase prendo una cifra solo in un messaggio intero. Scrivi: { whole-example }
whole-example = { $wine }{ in-all } { stage-word } aggiungere { $adds } { $unit }
in-all =
    { $count ->
        [several] {" "}in totale
       *[one] {""}
    }
stage-word =
    { $stage ->
        [must] mosto
        [fermenting] in fermentazione
        [malolactic] in malolattica
       *[base] base spumante
    }

## Che effetto fa

effect-land = { $after } { $unit } di libera se niente si combina; attesi { $range }, di solito si combina 1/3–1/2; misura domani.
effect-land-molecular = Da { $molecularNow } a { $molecular } di molecolare: { $after } { $unit } di libera se niente si combina; attesi { $range }, di solito si combina 1/3–1/2; misura domani.
effect-land-to-molecular = A { $molecular } di molecolare: { $after } { $unit } di libera se niente si combina; attesi { $range }, di solito si combina 1/3–1/2; misura domani.
effect-land-low = { $after } { $unit } di libera se niente si combina; sotto 10 può combinarsi molta o tutta: attesi { $range }, misura prima di aggiungere ancora.
effect-land-small = { $after } { $unit } di libera al massimo: il rialzo è meno dell’errore di una misura.
effect-rise = La libera sale di circa { $range } { $unit }, di solito si combina da un terzo a metà; misura domani.
effect-must = Il più si combina mentre il mosto fermenta: dopo non protegge il vino.
must-comes-back = Circa un terzo si ritrova nella totale: + { $total } { $unit } (testo tecnico tedesco, 2012).
must-yeast = Lieviti da { $least } a { $most } ore dopo (pratica comune, senza fonte).
must-malolactic = Fino a { $most } { $unit } prima della pigiatura non nuoce alla malolattica (AWRI).
must-published =
    { $read ->
        [read] Pubblicato: { $list } ({ $source }).
       *[memory] Pubblicato: { $list } ({ $source }; a memoria, non letto).
    }
must-none-published = Le cifre in archivio sono pubblicate per l’uva; per questo ({ fact-product }) non ce n’è.
must-range =
    { $state ->
        [sound] { must-colour }uva sana { $range }
        [damaged] { must-colour }uva danneggiata { $range }
       *[rot] { must-colour }con marciume { $range }
    } { $unit }
must-colour =
    { $style ->
        [red] rosso,{" "}
       *[any] {""}
    }
must-say-state = Com’è l’uva? Scrivi uva sana, uva danneggiata o marciume, e c’è una cifra da scegliere.
button-published = Aggiungi { $add }
effect-raise = + { $dose } { $unit } se niente si combina; di solito si combina da un terzo a metà; misura domani.
third-needs =
    { $third ->
        [more] ; se si combina un terzo serve una volta e mezza la dose
       *[covered] {""}
    }
effect-allowance = Dose × { $factor } per + { $percent } %: arriva a { $after } { $unit } se si combina al massimo { $covers } %{ third-needs }. Attesi { $range }; misura domani.
effect-allowance-bare = Dose × { $factor } per + { $percent } %: copre una combinazione di { $covers } %{ third-needs }. Misura domani.
effect-share = Dose ÷ (1 − { $share }): arriva a { $after } { $unit } se si combina proprio quella parte; attesi { $range }; misura domani.
effect-share-bare = Dose ÷ (1 − { $share }): giusta se si combina proprio quella parte; misura domani.
other-as-share = Se invece ne va perso { $percent } % (÷ { $divisor }): { bare-amount }.
other-as-allowance = Come margine di + { $percent } % (× { $factor }): { bare-amount }.
nothing-why = { $free } di libera sono { $molecular } di molecolare a pH { $ph }; l’obiettivo è { target }.
nothing-why-free = { $free } di libera; l’obiettivo è { target }.

## Una quantità chiesta, una aggiunta, una soluzione

adds =
    { $number ->
        [many] { at }{ $list } danno { $adds } di SO2
       *[one] { at }{ $list } danno { $adds } di SO2
    }
adds-rate = { at }“{ $rate }” ({ $ofAdditive } di { additive }) danno { $adds } di SO2
amount = { $amount } di { additive }
amount-solution = { $amount } di { additive } { $strength } %
amount-SO2 = { $amount } di SO2 da { additive }
amount-tablets =
    { $size ->
        [none] { $amount } { tablet-word } di { additive }
       *[other] { tablets-of }
    }
adds-rate-mass = In { $volume } sono { $amount }.
ferment-stop =
    { $adds ->
        [none] Nessuna dose di SO2 ferma di sicuro i lieviti, e le bottiglie possono scoppiare: chiedi a un enologo.
       *[other] { $adds } non ferma di sicuro i lieviti, le bottiglie possono scoppiare: chiedi a un enologo.
    }
ferment-stop-more = Per questo non do dosi. Intanto: tienilo al freddo, niente tappi a tenuta.
measure-tomorrow = Misura la libera domani, prima di aggiungere ancora.
reading-read = { at }{ $list }.
solution-weigh = Pesa { $amount } di { additive } e porta con acqua a { $volume }.
solution-measure = Misura { $amount } di { additive } e porta con acqua a { $volume }.
solution-from-powder = Le soluzioni le faccio solo da polvere: preparare { $volume } di meta al 10%
solution-strength = Questa soluzione contiene { $strength } g di SO2 in 100 mL.
solution-fresh = Preparala fresca, scrivici la data: perde forza in giorni o settimane (pratica comune, senza fonte).
solution-per-barrel = In una barrique da { $barrel } 1 mL porta { $adds } mg/L; per { $rise } mg/L servono { $amount }.
solution-us-water = È anche acqua: negli USA al massimo l’1 % del vino, tutte le aggiunte insieme (27 CFR 24.246).
solution-too-much = No: { $wanted } g/L non è sicuro che si sciolgano. Pubblicato per { additive } a { $celsius } °C: { $least ->
        [none] { $most } g/L ({ $source }).
       *[other] { $least } e { $most } g/L ({ $source }).
    } Falla più debole.
solution-strengths = Preparo soluzioni da 1 a 25 %. Pubblicato per il metabisolfito di potassio a 20 °C: 250 g/L (Food Additives Data Book, p. 780) e 450 g/L (una voce di enciclopedia).
solution-too-cold = No: { $wanted } g/L in acqua a { $water } °C. Pubblicato: { $most } g/L a { $celsius } °C ({ $source }), e niente per acqua più fredda. Scalda l’acqua, o falla più debole.
solution-colder = Sotto { $celsius } °C non ci sono cifre pubblicate: guarda che si sia sciolto tutto.
solution-holding = Soluzione di conservazione, { $volume }: { $acid } di acido citrico, { $amount } di { additive }.
solution-rinse = Risciacquo, { $volume }: { $acid } di acido citrico, { $amount } di { additive }.
solution-order = Prima tutta l’acqua, poi l’acido, infine il meta poco per volta. Mai polvere sull’acido.
solution-air = Sprigiona SO2: arieggia, viso lontano, anche dal cocchiume.
solution-for-holding = Per una barrique vuota e pulita, da riempire tutta; controllala ogni poche settimane.
solution-for-rinse = Per attrezzi puliti: bagna tutto, lascia agire qualche minuto.
solution-drain = Scaricala come da norme locali. Sciacqua con acqua prima del vino.
solution-practice = { $salt } e { $acid } g/L: pratica comune, senza fonte. Con una tua cifra: { $use ->
        [holding] soluzione di conservazione { $litres } L meta 1%
       *[rinse] risciacquo { $litres } L meta 1%
    }
solution-not-wine =
    { $vessel ->
        [none] Mai nel vino.
       *[other] Mai nel vino: { $vessel } dev’essere vuota. Non annoto niente.
    }
ask-solution-volume =
    { $use ->
        [rinse] Quanto risciacquo prepari? In litri, o con l’unità: 20 L, 1 hl
        [holding] Quanta soluzione di conservazione? In litri, o con l’unità: 225 L, 3 hl
       *[stock] Quanta ne prepari? In litri, o con l’unità: 5 L, 500 mL
    }
burning-sulfur-never = Lo zolfo bruciato (dischetti, micce) non è mai una dose per il vino: nessuno sa quanto ne entra. Da me nessuna cifra.
burning-sulfur-danger = Solo in botti vuote, come dicono la confezione, le regole locali e chi è formato. Mai dopo distillati (incendio), mai senza aerazione, mai senza sorveglianza.
burning-sulfur-rather = Per una barrique vuota piuttosto: soluzione di conservazione 225 L. Per il suo vino manda l’analisi: pH, SO2 libera, volume.

## Che cosa ho letto e che cosa ho supposto

basis-oiv = Con la tabella OIV per { $percent } %, { $celsius } °C (pK { $pK }).
basis-oiv-need = Con la tabella OIV per { $percent } %, { $celsius } °C (pK { $pK }); con pK 1,81 servirebbero { $free } di libera.
read = Letto: { $list }.
assumed = Supposto: { $list }.
set-aside = Non usato: { $list }.
fact-volume = { $volume }
fact-volume-count = { $volume } in { $count } recipienti
fact-ph = pH { $ph }
fact-free = libera { $free }
fact-total = totale { $total }
fact-temperature = { $celsius } °C
fact-alcohol = { $percent } % vol
fact-sugar = zuccheri { $sugar } g/L
fact-figure = { $figure }
fact-allowance = margine + { $percent } %
fact-share = si combina { $percent } %
fact-style = { $style ->
        [red] rosso
        [white] bianco
       *[other] rosato
    }
fact-category = { $category ->
        [sweet] dolce
        [sparkling] spumante
       *[fortified] liquoroso
    }
fact-product = { $product ->
        [cider] sidro
        [mead] idromele
        [alcohol-free] vino dealcolato
       *[fruit-wine] vino di frutta
    }
fact-organic = biologico
fact-designated = in deroga ({ $limit })
fact-uplift =
    { $declared ->
        [yes] annata sfavorevole
       *[no] annata normale
    }
fact-quality =
    { $quality ->
        [yes] spumante di qualità
       *[no] non di qualità
    }
fact-pdo = denominazione protetta (DOP)
fact-bulk = sfuso per l’export
fact-density = densità { $density } kg/L
fact-reserve = { $reserve } tenuti per l’imbottigliamento
fact-stage = { stage-now }
fact-target = obiettivo { target }
fact-tablet =
    { $additive ->
        [tablet] pastiglie effervescenti da { $size } g di SO2
       *[other] pastiglie da { $size } g di { additive }
    }
fact-strength =
    { $kind ->
        [assay] { additive }, { $strength } % di purezza
        [SO2-yield] { additive }, { $strength } % preso come resa in SO2
        [salt-per-100mL] { additive }, { $strength } % = { $strength } g di sale in 100 mL
        [SO2-per-100mL] { additive }, { $strength } % = { $strength } g di SO2 in 100 mL
       *[noted] { additive }, { $strength } %
    }
assumed-additive =
    { $additive ->
        [potassium-metabisulfite] metabisolfito di potassio puro
        [sodium-metabisulfite] metabisolfito di sodio puro
       *[other] { additive }
    }
assumed-target = obiettivo { target }
assumed-target-red = obiettivo { target } (rosso)
assumed-target-sweet = obiettivo { target } (dolce)
assumed-gallon = { $gallon ->
        [US] galloni americani
       *[imperial] galloni imperiali
    }
assumed-must = { $fruit } kg × { $yield } L/100 kg = { $volume }
assumed-must-usual = { $fruit } kg × { $yield } L/100 kg (la tua resa solita) = { $volume }
assumed-barrels =
    { $count ->
        [one] una barrique da 225 L
       *[several] { $volume } a 225 L per barrique
    }
note-free-unlabelled = “{ $text }” è la SO2 libera
note-ph-unlabelled = “{ $text }” è il pH
note-round-ph = il decimale solo è il pH
note-round-free = la cifra sola è la libera
note-volume-sum = “{ $text }” sommati
note-strength-as-salt = il titolo è in grammi di sale in 100 mL; in SO2 sarebbe { $factor } volte più forte
note-strength-as-SO2 = il titolo è in grammi di SO2 in 100 mL
note-mass-beside-readings = “{ $text }” sono grammi, non galloni
note-each-or-total = “{ $text }” ciascuna
note-unread-words = parole che non conosco, saltate: { $text }
set-aside-figure = { $text }

## L’unica domanda

ask-vessel = { at }quale vasca? Per esempio: T4
ask-volume_L =
    { $unit ->
        [L] { at }che volume{ of-each }? In litri, o con l’unità: 40 hl, 4000 L
        [hL] { at }che volume{ of-each }? In ettolitri, o con l’unità: 4000 L, 40 hl
        [m3] { at }che volume{ of-each }? In metri cubi, o con l’unità: 40 hl
        [galUS] { at }che volume{ of-each }? In galloni americani, o con l’unità: 40 hl
        [galUK] { at }che volume{ of-each }? In galloni imperiali, o con l’unità: 40 hl
       *[other] { at }che volume{ of-each }? Con l’unità: 225 L, 40 hl
    }
of-each =
    { $count ->
        [several] {" "}di ciascuna
       *[one] {""}
    }
ask-ph = { at }che pH? Per esempio: 3,58
ask-free_mg_L = { at }quanta SO2 libera, in { $unit }? Per esempio: 21
ask-target =
    { $usual ->
        [none] { at }a quanto vuoi arrivare? Un vino così non ha un obiettivo solito. Per esempio: obiettivo 30, 0,6 mol, aggiungere 25 ppm
       *[some] { at }a quanto vuoi arrivare? Per esempio: obiettivo 30, 0,6 mol, aggiungere 25 ppm
    }
ask-target-stage =
    { $stage ->
        [must] { at }quanti { $unit } vuoi aggiungere al mosto? Scrivi tutto: { whole-example }
        [base] { at }quanti { $unit } vuoi aggiungere alla base? Scrivi tutto: { whole-example }
       *[other] { at }quanti { $unit } vuoi aggiungere? Scrivi tutto: { whole-example }
    }
ask-tablet-additive = { at }di che sale sono le pastiglie? Sta scritto sulla confezione.
ask-additive = { at }quale prodotto è?
ask-strength_percent = { at }che titolo ha, in %? Sta in etichetta. Per esempio: { usual-strength }
usual-strength =
    { $named ->
        [potassium-metabisulfite] 96%
        [sodium-metabisulfite] 96%
        [sulfur-dioxide-solution] 6%
       *[other] 10%
    }
ask-tablet_salt_g = { at }quanti grammi pesa una pastiglia? Sta sulla confezione; le solite sono 0,44 e 0,55.
ask-tablet_SO2_g = { at }quanti grammi di SO2 dà una pastiglia effervescente? Sta sulla confezione.
ask-mass_g = { at }quanti grammi?
ask-mass-spoon = { at }quanti grammi? Un cucchiaino raso di polvere pesa circa 5–6 g, troppo impreciso per dosare: usa la bilancia.
ask-fruit = { at }quanto mosto, o che resa? Con l’unità, per esempio: 65 L/100 kg, oppure: 1300 L
option = { $mark }) { $list }
target-of =
    { $vessel ->
        [none] Un altro obiettivo.
       *[other] { $vessel }: un altro obiettivo.
    }

## A cosa non si può rispondere così

problem-ph-out-of-range = { at }“{ $about }” non può essere il pH di un vino (da 2,5 a 4,8). Manca la virgola? Scrivi: pH 3,58
problem-negative-value = { at }“{ $about }” è sotto zero, non può essere. Rimanda la cifra senza il meno.
problem-total-below-free = { at }la totale è sotto la libera (“{ $about }”). Invertite? Scrivi: libera { $one } totale { $two }
problem-volume-not-positive = { at }un volume di “{ $about }” non esiste. Scrivi così: 55 hl
problem-unit-mismatch = { at }l’unità non va bene in “{ $about }”. La SO2 libera è in mg/L o ppm, il volume in L, hl o gal.
problem-ambiguous-number =
    { $kind ->
        [split] { at }c’è uno spazio in “{ $about }”. Scrivi: pH { $one }
        [volume] { at }“{ $about }”: virgola o migliaia? Scrivi: { $one }, oppure: { $two }
        [mass] { at }“{ $about }”: virgola o migliaia? Scrivi: { $one }, oppure: { $two }
        [thousands] { at }“{ $about }”: virgola o migliaia? Scrivi: { $one }, oppure: { $two }
        [powder] { at }“{ $about }”: di SO2 o di polvere? Scrivi: aggiungere { $one } ppm SO2, oppure: { $two } g ogni 10 L { $named }
        [salt] { at }“{ $about }”: di SO2 o di sale? Come SO2 è più forte di quanto si venda. Se in etichetta c’è sale, scrivi: { salt-name } sale { $one }%
        [water] { at }“{ $about }”: SO2 in acqua o soluzione di metabisolfito? Scrivi: acqua solforosa { $one }%, oppure: soluzione di meta { $one }%
        [SO2-percent] { at }“{ $about }”: alcol, SO2 in acqua o soluzione di metabisolfito? Scrivi: { $one }% vol, acqua solforosa { $one }%, oppure: soluzione di meta { $one }%
        [percent] { at }“{ $about }”: alcol o titolo di una soluzione? Scrivi: { $one }% vol, oppure: soluzione di { stock-name } { $one }%
        [degree] { at }“{ $about }”: alcol o temperatura? Scrivi: { $one }% vol, oppure: { $one } C
        [to] { at }“{ $about }”: { $two } è l’obiettivo? Scrivi: libera { $one }, obiettivo { $two }
        [range] { at }“{ $about }” sembra un intervallo. Scrivine una: libera { $one }, oppure: libera { $two }
        [pair] { at }“{ $about }”: libera e totale, o una lettura tra due tacche? Scrivi: libera { $one } totale { $two }, oppure: libera { $one }
        [free] { at }“{ $about }”: SO2 libera o totale? Scrivi: libera { $one }, oppure: totale { $one }
        [aim] { at }“{ $about }”: da aggiungere o da raggiungere? Scrivi: aggiungere { $one } ppm, oppure: obiettivo { $one }
       *[other] { at }“{ $about }” si può leggere in più modi. Di’ che cos’è, per esempio: pH 3,58 libera 21 55 hl
    }
salt-name =
    { $named ->
        [ammonium-bisulfite-solution] bisolfito d’ammonio
       *[other] bisolfito di potassio
    }
stock-name =
    { $named ->
        [sodium-metabisulfite] metabisolfito di sodio
        [sodium-metabisulfite-solution] metabisolfito di sodio
       *[other] meta
    }
problem-each-or-total = { at }“{ $about }” è di ciascuna, o di tutte insieme? Scrivi: { $about } ciascuna, oppure: { $about } in totale
problem-conflicting-values = { at }due valori per la stessa cosa: “{ $about }”. Mandane uno; due vini vanno su due righe.
problem-unknown-additive = { at }“{ $about }” non è un prodotto a base di SO2 che conosco. Conosco: metabisolfito di potassio o di sodio (polvere, soluzione), bisolfito, SO2 in acqua, SO2 gassosa, pastiglie.
problem-did-you-mean = { at }“{ $about }” è un altro prodotto chimico. Volevi dire metabisolfito?
problem-strength-out-of-range = { at }il titolo “{ $about }” non va con quel prodotto. Guarda l’etichetta. Per esempio: { usual-strength }
problem-value-out-of-range = { at }“{ $about }” è più di quanto abbia una cantina. Controlla la cifra e l’unità.
problem-not-understood = Non sono riuscito a leggerlo. Manda un’analisi così: T4 55 hl pH 3,58 libera 21. Con ? vedi altro.
problem-too-long = Troppo lungo per leggerlo con sicurezza. Al massimo 25 vasche per volta, una per riga.
problem-no-number =
    { $again ->
        [correction] Nessuna dose finché non è chiaro.
       *[whole] Nessuna dose finché non è chiaro. Rimanda la riga intera.
    }
problem-share = { at }“{ $about }”: conto con al massimo 4/5 (0,8) che si combina.
problem-vessel-twice = { $vessel } c’è due volte: mandala una volta sola.
problem-two-vessels = “{ $about }”: due vasche. Una riga per ciascuna.
no-such-choice = Qui { $text } non c’è: da a fino a { $last }, oppure il nome.
no-such-button = Qui { $text } non c’è: da 1 a { $last }, oppure un’analisi intera.

## Avvisi

warning-no-dose-at-this-stage = ⚠ { stage-now }: in questa fase non c’è una dose; chiedi a chi risponde di questo vino.
warning-stage-not-over =
    { $stage ->
        [malolactic] ⚠ Così la malolattica si ferma o ritarda: chiedi prima a chi risponde di questo vino. { no-dose-why }
       *[fermenting] ⚠ Un vino che fermenta la combina subito, e i lieviti non si fermano di sicuro: chiedi prima a chi risponde di questo vino.
    }
warning-additive-not-permitted =
    { $reason ->
        [ammonium] ⚠ Bisolfito d’ammonio solo per uve e mosti (OIV): non per questo vino; chiedi prima.
        [organic] ⚠ Il vino biologico ammette solo SO2 e sali di potassio ({ law-of }, regolamento 889/2008): non questo. Chiedi prima.
        [organic-none] ⚠ Un vino etichettato “organic” non ammette solfiti aggiunti ({ law-of }, 7 CFR part 205). Chiedi prima.
       *[sodium] { warning-sodium }
    }
warning-sodium =
    { $region ->
        [oiv] ⚠ Metabisolfito di sodio: molte norme lo vietano nel vino (OIV; UE e Regno Unito non confermati). Chiedi prima.
        [eu] ⚠ Il metabisolfito di sodio nell’UE non va nel vino, solo per attrezzi (non confermato). Chiedi prima.
        [uk] ⚠ Il metabisolfito di sodio nel Regno Unito non va nel vino, solo per attrezzi (non confermato). Chiedi prima.
        [ar] ⚠ Il metabisolfito di sodio in Argentina non va nel vino: solo sali di potassio (INV 281/85). Chiedi prima.
       *[other] ⚠ Metabisolfito di sodio: nessun elenco letto per { law-of }, quindi non confermato; molte norme lo vietano nel vino. Chiedi prima.
    }
refused-organic =
    { $reason ->
        [organic-none] { at }niente solfiti: un vino etichettato “organic” non ne ammette ({ law-of }, 7 CFR part 205).
       *[organic] { at }non con { additive }: il vino biologico ammette solo SO2 e sali di potassio ({ law-of }, regolamento 889/2008).
    }
refused-organic-instead =
    { $reason ->
        [organic-none] Non è biologico? Chiedi a chi risponde di questo vino; poi cancella la voce che lo dice.
       *[organic] Riscrivilo con il meta (di potassio). Non è un parere legale: verifica per il tuo mercato.
    }
limit-doubt =
    { $confidence ->
        [unconfirmed] , non confermato: a memoria
       *[read] {""}
    }
warning-total-over-limit =
    { $total ->
        [known] ⚠ La totale diventerebbe { $total_after_mg_L }, oltre { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: chiedi prima.
       *[at-least] ⚠ La totale diventerebbe almeno { $total_after_mg_L }, oltre { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: chiedi prima.
    }
warning-free-over-limit = ⚠ La libera può arrivare a { $free_after_mg_L } se niente si combina, oltre il limite di libera { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: chiedi prima.
warning-label-threshold =
    ⚠ Etichetta ({ law-of }): i solfiti si dichiarano { $comparator ->
        [more] oltre
       *[from] da
    } { $threshold_mg_L } { $unit_of_law }{ $counts ->
        [added] {" "}aggiunti
       *[total] {""}
    }{ limit-doubt }; la totale sarebbe { $total_after_mg_L }.
warning-total-near-limit =
    { $total ->
        [known] ⚠ La totale sarebbe { $total_after_mg_L } { $unit }, vicino al limite { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
       *[at-least] ⚠ La totale sarebbe almeno { $total_after_mg_L } { $unit }, vicino al limite { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
    }
warning-total-unknown = ⚠ La totale non è nota: misurala.
warning-total-unknown-most = ⚠ Totale non nota, misurala: per questa dose oggi può essere al massimo { $most_total_mg_L } { $unit }, limite { $limit_mg_L } ({ rule-short }){ law-decides }.
warning-no-limit-on-file =
    { $region ->
        [oiv] ⚠ Per un vino così non conosco limiti: cerca la legge del tuo paese.
       *[other] ⚠ Nessun limite in archivio ({ law-of }): cercalo per il tuo mercato.
    }
warning-limit-unconfirmed =
    { $region ->
        [oiv] ⚠ Il limite non è confermato: cerca la legge del tuo paese.
       *[other] ⚠ Limite { $limit_mg_L } { $unit } di { $of ->
            [free] libera
           *[total] totale
        } ({ rule-short }): non confermato, a memoria. Cercalo per il tuo mercato.
    }
warning-addition-large = ⚠ { $dose_mg_L } { $unit } in una volta sono tanti: controlla il volume e l’unità.
warning-free-needed-high = ⚠ { $target_free_mg_L } { $unit } di libera sono tanti: tienilo più freddo, più pulito, controllalo più spesso; o un pH più basso, con un enologo.
warning-molecular-above-2 = ⚠ Oltre 2 { $unit } di molecolare la SO2 si sente al naso e in bocca.
warning-free-low-may-bind-all = ⚠ Sotto 10 di libera può combinarsi molta o tutta: misura prima di aggiungere ancora.
warning-ph-unusual = ⚠ pH { $ph } è insolito per un vino: controlla lo strumento.
warning-basis-fallback = ⚠ La base OIV vuole l’alcol, e 20–40 °C: calcolato con pK 1,81.
warning-basis-fallback-change = ⚠ La base OIV vuole l’alcol, e 20–40 °C: calcolato con pK 1,81. Con OIV a { $compared_at_alcohol_percent } %, { $compared_at_temperature_C } °C sarebbero circa { $change } { $unit } { $direction ->
    [more] in più.
   *[less] in meno.
}
warning-malolactic-may-not-start =
    { $above ->
        [free] ⚠ Libera { $free_mg_L }, sopra { $free_ceiling_high_mg_L } { $unit }: la malolattica può non partire (AWRI, per pH 3,3–3,5).
        [total] ⚠ Totale { $total_mg_L }, sopra { $total_ceiling_high_mg_L } { $unit }: la malolattica può non partire (AWRI, per pH 3,3–3,5).
       *[both] ⚠ Libera { $free_mg_L }, sopra { $free_ceiling_high_mg_L }, totale { $total_mg_L }, sopra { $total_ceiling_high_mg_L } { $unit }: la malolattica può non partire (AWRI, per pH 3,3–3,5).
    }
warning-restart-may-fail = ⚠ { $molecular_mg_L } { $unit } di molecolare frenano i lieviti: da { $held_back_molecular_mg_L } la ripartenza può fallire (pratica comune, senza fonte).
warning-must-may-hinder-malolactic = ⚠ Oltre { $malolactic_unharmed_mg_L } { $unit } nel mosto la malolattica può essere ostacolata (AWRI).
warning-rounding-coarse = ⚠ Qui la bilancia può sbagliare di { $rounding_mg_L } { $unit }: usane una più fine, o una soluzione.
warning-already-dosed = ⚠ È già stata dosata da poco.

## Cautele

cautions = ⚠ { $list }
caution-trained-people-with-breathing-apparatus = Solo personale formato, autorespiratore a portata di mano.
caution-grapes-and-must-only = Solo per uve e mosti.
caution-ventilate = Arieggia.
caution-never-lean-in = Mai sporgersi nelle vasche.
caution-gloves-goggles = Guanti, occhiali.
caution-no-acid-no-chlorine = Mai con acidi o cloro.
caution-no-other-acid-no-chlorine = Nessun altro acido, niente cloro.
caution-asthma = Non per asmatici.
caution-crush-first = Sbriciola, sciogli in poco vino o acqua.
caution-dissolve-first = Sciogli prima in poco vino o acqua.
caution-foams-with-carbon-dioxide = Vino pieno di CO2: trabocca.
caution-mix-and-measure-again = Mescola, misura il giorno dopo.
caution-label-and-rules-first = Prima: etichetta, norme locali, un tecnico.
cautions-of = ⚠ { additive }: { $list }
cautions-short = ⚠ Cautele come prima: tasto Sicurezza.

## Conversazione

chat-greeting = Ciao. Mandami un’analisi, per esempio: T4 55 hl pH 3,58 libera 21. Con ? vedi altro.
chat-thanks = Di niente. Rimisura domani.
chat-other = Calcolo aggiunte di SO2. Manda un’analisi, per esempio: T4 55 hl pH 3,58 libera 21. Con ? vedi altro.
still-asked = Manca ancora una cosa.
chat-negated = Niente aggiunto, allora. Non annoto niente.
chat-help-what = Manda un’analisi, ricevi l’aggiunta di SO2.
chat-help-dose = T4 55 hl pH 3,58 libera 21
chat-help-dose-means = → quanto pesare
chat-help-effect = 100 g di meta in 20 hl
chat-help-effect-means = → quanto aggiunge una quantità
chat-help-solution = preparare 5 L di meta al 10%
chat-help-solution-means = → come fare una soluzione
chat-help-fields = In qualsiasi ordine; anche totale, rosso, 13,5%, obiettivo 35, +25 ppm, +30%, meta di sodio. Vasche: una per riga.
chat-help-topics = Altro: aiuto e uno di questi: { $list }.
chat-help-care = L’etichetta, le regole locali e una persona qualificata vengono prima.

## Aiuto per argomento: ognuno una schermata di messaggi da mandare; `help-<argomento>-…` nell’ordine in cui si dicono

help-wine-1 = In qualsiasi ordine: vasca, volume, pH, SO2 libera.
help-wine-2 = T4 55 hl pH 3,58 libera 21 bianco → quanto pesare
help-wine-3 = T4 40 hl 3,6/18/60 13,5% 14 C → pH, SO2 libera e totale
help-wine-4 = T4 40 hl pH 3,5 libera 18 0,6 molecolare → a un livello tuo; oppure obiettivo 36
help-wine-5 = T4 40 hl aggiungere 25 ppm → un’aggiunta detta da te
help-wine-6 = T4 40 hl pH 3,5 libera 18 +30% → di più, per quello che si combina; oppure: un terzo si combina
help-wine-7 = T4 40 hl pH 3,5 libera 18, meta al 10% → da una soluzione; anche metabisolfito di sodio, SO2 al 6%, pastiglie da 5 g
help-wine-8 = 100 g di meta in 20 hl → quanto aggiunge una quantità
help-wine-9 = Rosso, rosato, dolce, sidro, idromele, biologico; mosto, in fermentazione, malolattica finita: dillo, o la risposta dice cosa ha supposto.
help-must-1 = Per il mosto non c’è una cifra solita: io dico quelle pubblicate, tu scegli.
help-must-2 = mosto 20 hl uva sana → cifre da scegliere; anche: uva danneggiata, marciume
help-must-3 = mosto 20 hl aggiungere 40 → quanto pesare per 40 mg/L
help-must-4 = 2000 kg di uva 65 L/100 kg uva sana → dal peso dell’uva e dalla resa
help-must-5 = 50 q di uva 65 L/100 kg aggiungere 50 → lo stesso in quintali
help-must-6 = resa 65 → imposta la resa solita, litri da 100 kg
help-must-7 = Il più si combina: dopo non protegge, e circa un terzo si ritrova nella totale.
help-bottling-1 = Quanto deve esserci ora, perché l’obiettivo tenga dopo quello che toglie l’ossigeno.
help-bottling-2 = imbottigliamento T4 40 hl pH 3,4 libera 22 ossigeno 2 mg/L → 4 di SO2 per 1 di ossigeno, da formula
help-bottling-3 = imbottigliamento T4 40 hl pH 3,4 libera 22 ossigeno 2 mg/L a 2,5 → con una cifra tua
help-bottling-4 = T4 40 hl pH 3,4 libera 22 totale 90 tenere 20 per l’imbottigliamento → margine tenuto sotto il limite
help-bottling-5 = T4 in malolattica pH 3,4 libera 25 totale 60 → se la malolattica può partire; anche fermentazione ferma: una ripartenza
help-bottling-6 = Ossigeno: disciolto e spazio di testa insieme, in mg/L di vino.
help-solutions-1 = Soluzioni in acqua: nessuna è una dose per il vino, e nel registro non va niente.
help-solutions-2 = preparare 5 L di meta al 10% → quanto pesare, quanto è forte, mL per barrique
help-solutions-3 = preparare 1 L di meta al 10%, aggiungere 30 ppm → i mL per una barrique da 225 L
help-solutions-4 = 10 g di meta in 100 mL d’acqua → quanto è forte
help-solutions-5 = soluzione di conservazione 225 L → per una barrique vuota; anche: soluzione di conservazione per 3 barrique
help-solutions-6 = risciacquo 20 L → per attrezzi puliti; con un titolo tuo: risciacquo 20 L meta 1%
help-solutions-7 = Zolfo da bruciare (dischetti, micce): mai una dose per il vino, da me nessuna cifra.
help-law-1 = Ogni dose è confrontata con i limiti del tuo mercato. Non è un parere legale: verifica.
help-law-2 = legge UE → anche USA, Regno Unito, OIV, Canada, Giappone …; per tutta la cantina
help-law-3 = limite T4 → la regola, il testo, come è stata verificata, il margine
help-law-4 = limite rosso zuccheri 3 UE → senza vasca
help-law-5 = T4 rosso → contano colore e zuccheri (zuccheri 3 con l’analisi); se non detti, il più severo
help-law-6 = T4 biologico → anche spumante di qualità, DOP, vino sfuso, densità 0,992
help-law-7 = T4 deroga 300 → un vino dolce in deroga; anche T4 annata sfavorevole
help-law-8 = T4 tenere 30 per l’imbottigliamento → tenuti sotto il limite, con 15 per l’errore di misura
help-law-9 = Oltre il limite viene prima la dose più piccola: dose intera, poi sì. Nel registro resta.
help-round-1 = Più vasche in un messaggio, una per riga; quello che vale per tutte (meta, obiettivo 30) nella prima riga. Un tocco le annota tutte, o una per una.
help-round-2 = T1 20 hl pH 3,4 libera 18 → come riga del giro; io sommo quanto prendere
help-round-3 = giro → di nuovo tutte le righe
help-round-4 = foglio xlsx → da portare con te; anche foglio csv, foglio immagine
help-round-5 = B1-B24 225 L pH 3,6 libera 18 → una dose per barrique, una voce per ciascuna
help-round-6 = B1-B24 senza B7 225 L pH 3,6 libera 18 → tutte meno una
help-round-7 = 34 barrique, campione misto: pH 3,6 libera 18 → per la media, e cosa nasconde
help-round-8 = Oppure manda un CSV o XLSX: vasca, volume, pH, SO2 libera. Torna il foglio.
help-stock-1 = Ogni aggiunta scala il magazzino, una volta che c’è dentro qualcosa.
help-stock-2 = ricevuti 25 kg di meta lotto 4471 da Norte Enologia → anche 10 L di SO2 al 6%
help-stock-3 = magazzino → cosa c’è, per lotto; magazzino meta: solo quello
help-stock-4 = giacenza meta 3,2 kg → contato sullo scaffale: vale da lì in poi
help-stock-5 = usati 200 g di meta per lavaggio → per nessun vino
help-stock-6 = buttato 1 kg di meta perché a grumi → buttato via
help-stock-7 = aggiunti 82 g di meta T4 lotto 4471 → da quel lotto; se no dal più vecchio
help-stock-8 = esporta magazzino → arrivi, fornitori, lotti e rimanenze, per i registri
help-log-1 = Non si cancella niente; le correzioni stanno accanto a quello che correggono.
help-log-2 = aggiunti 82 g di meta T4 → annotato; anche ppm, mL, ieri 17:00, lotto 4471, nota: …
help-log-3 = T4 ora libera 28 totale 96 → un’analisi annotata, senza dose
help-log-4 = ordine T4 256 g di meta → da far fare a un altro; ordini aperti mostra cosa manca
help-log-5 = oggi → cosa si è annotato oggi; anche ieri, 12 nov
help-log-6 = storico T4 → tutto quello che se ne sa
help-log-7 = annulla → toglie la tua ultima voce, entro 15 minuti
help-log-8 = cancella 17 refuso → toglie la voce 17, e dice perché
help-vessels-1 = Quello che succede a un vino cambia quello su cui posso contare.
help-vessels-2 = T4? → quello che ne so
help-vessels-3 = vasche → tutte
help-vessels-4 = T4 rosso → anche in malolattica, finita
help-vessels-5 = T4 ora ha 52 hl → quanto c’è dentro; T4 tiene 60 hl: quanto ci sta
help-vessels-6 = travasata T4 61 hl → anche colmata T4
help-vessels-7 = spostata T4 in T9 → tutta, o solo 20 hl
help-vessels-8 = T5 tagliata in T4 → il pH va rimisurato
help-vessels-9 = T4 = Blanca 2026 → il nome del suo vino
help-vessels-10 = T4 vuota → anche: dimentica T4
help-reminders-1 = Una volta al giorno dico cosa misurare, e dopo un’aggiunta quando.
help-reminders-2 = scadenze → cosa misurare ora
help-reminders-3 = lista giornaliera alle 7:00 → quando la dico; oppure: niente lista giornaliera
help-reminders-4 = rimanda T4 3 giorni → lo chiedo più avanti
help-reminders-5 = non seguire T4 → non ne parlo più; segui T4: di nuovo
help-reminders-6 = silenzio dalle 21 alle 6 → di notte niente se non chiedi
help-settings-1 = Tutto questo vale per l’intera cantina.
help-settings-2 = impostazioni → cosa è impostato, e come cambiarlo
help-settings-3 = unità americane → anche metriche, imperiali
help-settings-4 = di solito usiamo metabisolfito di sodio → il prodotto quando non lo dici
help-settings-5 = obiettivo 0,5 per i rossi → anche bianchi, dolci
help-settings-6 = margine 30% → aggiunto a ogni dose, per quello che si combina
help-settings-7 = fuso orario Europe/Rome → per ore e giorni
help-settings-8 = risposte brevi → il calcolo su un tasto
help-pictures-1 = Un grafico mostra SO2 libera, molecolare e totale, e cosa è entrato.
help-pictures-2 = grafico T4 → come foto, con lo stesso a parole
help-files-1 = Il tuo registro è tuo.
help-files-2 = esporta → questo mese come foglio di calcolo
help-files-3 = esporta 2026 → anche esporta T4 csv, esporta dal 1 ott al 31 ott
help-files-4 = L’export di un’altra cantina, o una lista di vasche in CSV o XLSX: manda il file. Prima lo mostro, poi lo prendo tutto o niente.
help-people-1 = Un gruppo è una cantina a sé: chiamami per nome, o rispondimi.
help-people-2 = persone → chi c’è
help-people-3 = invita cantiniere → un codice per una persona; anche responsabile, ospite
help-people-4 = Un responsabile può tutto, un cantiniere dosa e annota, un ospite guarda.
help-people-5 = leggi tutto → rispondo alle analisi chiare anche se non mi chiami
help-people-6 = cantine → in quale siamo; a Blanca: un’altra
help-people-7 = dimenticami → tolgo il tuo nome e il tuo numero
help-lab-1 = Una titolazione è calcolata passo per passo; non annoto niente finché non tocchi.
help-lab-2 = AO 20 mL di campione, 1,9 mL 0,01 N → SO2 libera; con T4 davanti la annoti con un tocco
help-lab-3 = T4 totale AO 20 mL di campione, 5,6 mL 0,01 N, bianco 0,1 → SO2 totale
help-lab-4 = ripper 25 mL di campione, 1,2 mL 0,02 N, ascorbico 50 → iodio, tolto quello che conta l’acido ascorbico
help-lab-5 = intervallo → di quanto può sbagliare l’ultima dose
help-lab-6 = T4 55 hl pH 3,58±0,03 libera 21±2 → con i tuoi ±
help-lab-7 = tabella 0,5 0,8 1,5 pH 3,2-3,8 → SO2 libera che serve
help-lab-8 = molecolare T4 → con pK 1,81 e con OIV
help-forecast-1 = Le analisi del vino stesso dicono più di ogni regola.
help-forecast-2 = previsione T4 → il giorno in cui la libera scende sotto quella che serve al suo pH
help-forecast-3 = Servono tre analisi dopo l’ultima aggiunta; prima, solo barrique e bottiglie hanno cali pubblicati.
help-forecast-4 = Dopo due aggiunte con analisi prima e dopo, la dose dice quanta parte ha combinato questo vino.
help-forecast-5 = troppa SO2 in T4 → cosa aiuta e cosa no
help-forecast-6 = taglio T4 T7 → che parte di T7 rispetta limite e obiettivo
help-forecast-7 = taglio T4 → quali altre vasche andrebbero bene
help-topic =
    { $topic ->
        [wine] vino
        [must] mosto
        [bottling] imbottigliamento
        [law] legge
        [round] giro
        [stock] magazzino
        [solutions] soluzioni
        [log] registro
        [vessels] vasche
        [reminders] promemoria
        [settings] impostazioni
        [pictures] grafici
        [files] file
        [people] persone
        [lab] laboratorio
        [forecast] previsione
       *[other] { $topic }
    }

send-alone = Questo mandalo in un messaggio a parte.
unreadable =
    { $what ->
        [edited] I messaggi modificati non li leggo. Rimandalo di nuovo.
        [photo] Le foto non le so leggere. Scrivi le cifre.
        [sticker] Bello. Però leggo solo testo.
        [voice] I vocali non li sento. Scrivi le cifre.
        [file] I file non li so ancora leggere. Scrivi le cifre.
       *[other] Leggo solo testo. Scrivi le cifre.
    }
fault = Errore mio, non ho calcolato niente. Rimandalo; se fallisce ancora, dillo a chi mi gestisce.
fault-aside = Errore mio per tre volte, l’ho messo da parte: niente è stato calcolato né annotato. Chi mi gestisce può vedere perché.
left-unread =
    { $count ->
        [one] Ero fermo. Un messaggio qui ha più di 12 ore e non l’ho letto: niente è annotato. Rimandalo se vale ancora.
       *[other] Ero fermo. { $count } messaggi qui hanno più di 12 ore e non li ho letti: niente è annotato. Rimanda quello che vale ancora.
    }
old-button = Questo tasto è di un messaggio vecchio. Rimanda l’analisi.

## Un’emergenza

emergency-out = TUTTI FUORI all’aria aperta, subito.
emergency-nobody-in = Nessuno entra o si sporge dentro per soccorrere qualcuno.
emergency-call = Chiamate i soccorsi.
emergency-swallowed = Ingerito: sciacquare la bocca, non far vomitare, chiamare il centro antiveleni o i soccorsi.
emergency-eyes = Occhi: sciacquare con acqua per 15 minuti, togliere le lenti a contatto.
emergency-skin = Pelle: sciacquare con molta acqua, togliere i vestiti bagnati.

## Il calcolo

working = { $substituted } = { $result }
working-symbol = { $symbol } = { $substituted } = { $result }
working-source = ({ $source })
working-head =
    { $vessel ->
        [none] Il calcolo
       *[other] { $vessel }: il calcolo
    }
step-dissociation = Costante di dissociazione, tra i quattro valori più vicini per alcol e temperatura:
step-molecular-now = SO2 molecolare ora, libera ÷ (10^(pH − pK) + 1):
step-free-needed = SO2 libera che serve, obiettivo × (10^(pH − pK) + 1):
step-oxygen-loss = Quello che toglie l’ossigeno, ossigeno × SO2 per 1 mg di ossigeno:
step-free-before-bottling = SO2 libera che serve prima, voluta all’imbottigliamento + quello che toglie l’ossigeno:
step-addition = Da aggiungere, libera voluta − libera ora:
step-dose-with-allowance = Con il margine, aggiunta × (1 + margine):
step-dose-with-share = Con la parte che si combina, aggiunta ÷ (1 − parte):
step-volume-in-litres = Volume in litri:
step-room-to-limit = Spazio, limite − quanto si tiene sotto − SO2 ora:
step-must-of-fruit = Mosto, uva × litri da 100 kg ÷ 100 kg:
step-so2-mass = SO2 in grammi, aggiunta × volume ÷ 1000:
step-so2-mass-each = SO2 per una, aggiunta × volume di una ÷ 1000:
step-all-vessels = Per tutte, una × numero:
step-additive-mass = Prodotto, SO2 ÷ la sua parte di SO2:
step-additive-mass-by-assay = Prodotto, SO2 ÷ (purezza × parte di SO2 nel sale puro):
step-additive-mass-by-yield = Prodotto, SO2 ÷ la resa in SO2 dichiarata:
step-additive-volume-by-salt = Soluzione, SO2 ÷ (sale che contiene × parte di SO2 nel sale):
step-additive-volume-by-so2 = Soluzione, SO2 ÷ SO2 che contiene:
step-tablets-by-so2 = Pastiglie, SO2 ÷ SO2 di una:
step-tablets-by-salt = Pastiglie, SO2 ÷ (sale di una × parte di SO2 nel sale):
step-gas-by-purity = Gas, SO2 ÷ purezza:
step-so2-in-amount = SO2 che contiene, quantità × SO2 di un’unità:
step-added-concentration = Aggiunta, SO2 × 1000 ÷ volume:
step-added-by-rate = Aggiunta, dose × parte di SO2:
step-mass-by-rate = Prodotto, dose × volume ÷ 1000:
step-free-after = Libera dopo, se niente si combina:
step-molecular-after = Molecolare dopo, libera ÷ (10^(pH − pK) + 1):
step-salt-mass = Sale, grammi in 0,1 L ÷ 0,1 L × volume:
step-added-by-one-millilitre = Un mL in una barrique, SO2 che contiene ÷ volume della barrique:
step-stock-for-a-barrel = Soluzione per barrique, rialzo × volume della barrique ÷ SO2 nella soluzione:
step-salt-by-recipe = Metabisolfito, grammi in un litro × volume:
step-citric-acid-by-recipe = Acido citrico, grammi in un litro × volume:
step-solution-strength = Titolo in 100 mL, SO2 ÷ volume × 0,1 L:
step-solution-strength-by-salt = Titolo in SO2, sale × parte di SO2 che contiene:
step-titrant-normality = Normalità dello iodio, 2 × la sua molarità:
step-iodate-normality = Normalità, 6 × mg di iodato ÷ 214 ÷ mL del matraccio:
step-titrant-used = Titolante usato, buretta − bianco:
step-so2-by-titration = SO2, 32 000 × normalità × titolante ÷ campione:
step-ascorbic-counted = L’acido ascorbico conta per, mg/L × 64,06 ÷ 176,12:
step-so2-without-ascorbic = SO2 senza ascorbico:
step-spread-of-need = ± di quella che serve, obiettivo × 10^(pH − pK) × ln 10 × ± del pH:
step-spread-of-dose = ± dell’aggiunta, radice dei due al quadrato:
step-dose-lowest = Minimo, serve − libera − il suo ±:
step-dose-highest = Massimo, serve − libera + il suo ±:
step-molecular-sure = Molecolare sicura, dopo × (1 − radice dei due ± relativi al quadrato):
step-blend-free = SO2 libera del taglio, per volume:
step-blend-total = SO2 totale del taglio, per volume:
safety-head = Attenzione con { additive }
more-head =
    { $vessel ->
        [none] Altro
       *[other] { $vessel }: altro
    }
more-no-warnings = Nessun altro avviso.
choice-left = { at }lasciata così, { $molecular } di molecolare. Assaggia e misura spesso.
choice-over = { at }nessuna quantità: la totale passerebbe { $limit } ({ law-of }).
round-choice = { at }con pH { $ph } c’è da scegliere: mandala da sola.
round-missing =
    { $field ->
        [vessel] quale vasca è?
        [volume_L] { at }manca il volume.
        [ph] { at }manca il pH.
        [free_mg_L] { at }manca la SO2 libera.
        [target] { at }a quanto vuoi arrivare? Scrivi un obiettivo.
        [additive] { at }quale prodotto è?
        [strength_percent] { at }che titolo ha il prodotto?
        [tablet_salt_g] { at }quanti grammi pesa una pastiglia?
        [tablet_SO2_g] { at }quanti grammi di SO2 dà una pastiglia?
        [mass_g] { at }quanti grammi?
       *[none] { at }manca qualcosa.
    }
round-dose = { $vessel } ({ $list }): { round-amount }
round-dose-bare = { at }{ round-amount }
round-amount =
    { $unit ->
        [tablets] { $amount } pastiglie{ round-of }{ round-all }{ round-limited }{ round-if-red }
       *[other] { round-tablet }{ $amount }{ round-of }{ round-all }{ round-limited }{ round-if-red }
    }
round-limited =
    { $limited ->
        [limited] {" "}(limite)
       *[none] {""}
    }
round-tablet =
    { $tablet ->
        [too-large] mezza pastiglia è troppo,{" "}
       *[fits] {""}
    }
round-of =
    { $additive ->
        [none] {""}
       *[other] {" "}di { additive }{ round-percent }
    }
round-percent =
    { $strength ->
        [none] {""}
       *[other] {" "}{ $strength } %
    }
round-all =
    { $all ->
        [none] {""}
       *[other] {" "}ciascuna, { $all } in tutto
    }
round-if-red =
    { $red ->
        [unsaid] {""}
        [none] , se rosso niente
        [over] , se rosso { $redAmount }, anche così oltre il limite
       *[some] , se rosso { $redAmount }
    }
round-nothing = { $vessel } ({ $list }): niente da aggiungere
round-nothing-bare = { at }niente da aggiungere
round-head =
    { $kind ->
        [powder] Pesa { additive }{ round-strength }:
        [gas] Pesa SO2 gassosa, solo a peso; solo personale formato, autorespiratore a portata di mano:
        [tablet] Prendi pastiglie effervescenti da { $size } g di SO2:
        [salt-tablet] Prendi pastiglie da { $size } g di { additive }:
       *[solution] Misura { additive }{ round-strength }:
    }
round-strength =
    { $size ->
        [none] {""}
       *[other] , { $size } %
    }
round-for-all = Per tutte: { $list }.
round-kept = Le analisi sono annotate.
round-red = “Se rosso” è per { $red } di molecolare.
round-stock = Come sua soluzione { $strength } %: { $list }.
round-rest = Il resto come soluzione { $strength } %: { $list }.
round-stock-of = { $vessel } { $amount }
mixed-sample = Vale per la media di { $count }: un campione misto nasconde la più bassa; di quanto, non si sa: una più bassa di 5 resta più bassa di 5. Misurane alcune prima di dosarle tutte (pratica comune, senza fonte).
round-mixed = ⚠ Un campione misto dice la media e non la più bassa: { $list }. Misurane alcune una per una.
round-low = ⚠ Sotto 10 di libera può combinarsi molta o tutta: { $list }. Lì misura prima di aggiungere ancora.
round-name = { $name }
round-again = Rimanda intera ogni riga che non si è potuta leggere.
round-total =
    In tutto { $list }: somma delle { $count } arrotondate.
round-total-of =
    { $kind ->
        [tablet] { $amount } pastiglie effervescenti da { $size } g di SO2
        [salt-tablet] { $amount } pastiglie da { $size } g di { additive }
       *[other] { $amount } di { additive }{ round-percent }
    }
round-open =
    { $count ->
        [one] Nessuna quantità per una:
       *[other] Nessuna quantità per { $count }:
    }
round-open-names = Nessuna quantità per { $list }: scrivi “giro” per sapere perché.
round-more = … e altre { $count }: scrivi “giro”, o prendi il foglio qui sotto.
round-and-more = altre { $count }
round-warned = ⚠ Ci sono avvisi per { $list }: scrivi “giro”.
button-round-all = Messe tutte
button-round-lines = Una per una
button-round-line =
    { $vessel } { $amount }{ $unit ->
        [tablet] { " " }pastiglia
        [tablets] { " " }pastiglie
       *[other] { "" }
    }{ $count ->
        [several] { " " }ciascuna
       *[one] { "" }
    }
button-round-next = Avanti
button-round-picture = Foglio come immagine
button-round-file = Foglio come file
button-round-undo = Annulla { $entries }
round-noted =
    Annotato, voci { $entries }: { $count ->
        [one] un’aggiunta
       *[other] { $count } aggiunte
    }, { $list }, { $when }.
round-noted-rest = il resto del giro
round-noted-line = Annotato, voce { $entry }: { $vessel } { $list }, { $when }.
round-noted-each = Annotato, voce { $entry }: { $vessel } { $list } ciascuna, { $when }.
round-noted-before = Già annotate prima, lasciate: { $list }.
round-noted-none = Già tutto annotato prima: voci { $entries }.
round-not-noted = Non annotate, perché non hanno una quantità unica: { $list }.
round-strike-one = Una non è entrata? Scrivi “cancella { $entry } non messa”.
round-pick = Quali sono entrate? { $from }–{ $to } di { $all }:
round-pick-noted = { $vessel }: annotata, voce { $entry }.
round-undone = Tolte: { $entries }. Restano nel registro, barrate.
round-undone-none = Non resta niente da togliere.
sheet-vessel = Vasca
sheet-volume = Volume L
sheet-ph = pH
sheet-free = SO2 libera mg/L
sheet-free-short = libera
sheet-total = SO2 totale mg/L
sheet-dose = SO2 da aggiungere mg/L
sheet-weigh = Pesare g
sheet-measure = Misurare mL
sheet-tablets = Pastiglie
sheet-additive = Prodotto
sheet-strength = Titolo %
sheet-after = Libera dopo, se niente si combina mg/L
sheet-note = Nota
sheet-done = Fatto
sheet-in-all = In tutto
sheet-nothing = niente da aggiungere
sheet-limit = limite
sheet-title = Foglio di pesata
sheet-open = Nessuna quantità:
sheet-caution = Guanti, occhiali, arieggiare. Mai sporgersi dentro una vasca. Rimescolare, misurare domani.
sheet-fetch = In tutto { $list }
sheet-additive-name = { additive }{ round-percent }
file-round = Un giro di { $count } righe.
file-round-left = Non capite, e lasciate fuori: righe { $lines } del file.
file-round-ask = Calcolo le dosi, o annoto solo le analisi?
button-file-dose = Dosi
button-file-note = Annota le analisi
button-file-vessels = Prendi le vasche
round-gone = Qui non c’è nessun giro: rimandalo.
round-target-stage = { at }quanti mg/L vuoi aggiungere?
round-not-understood =
    { $about ->
        [none] Una riga non l’ho letta.
       *[other] “{ $about }” non l’ho letto.
    }
round-effect-short = Di solito si combina da un terzo a metà: misura domani.
round-effect = Di solito si combina da un terzo a metà di un’aggiunta: misura domani. Per il calcolo di una vasca manda solo la sua riga.
choice-additive = { $value ->
        [potassium-metabisulfite] Metabisolfito di potassio (E224)
        [sodium-metabisulfite] Metabisolfito di sodio (E223)
        [potassium-metabisulfite-solution] Soluzione di metabisolfito di potassio
        [sodium-metabisulfite-solution] Soluzione di metabisolfito di sodio
        [potassium-bisulfite-solution] Bisolfito di potassio in soluzione (E228)
        [ammonium-bisulfite-solution] Bisolfito d’ammonio in soluzione
        [sulfur-dioxide-solution] Soluzione solforosa (SO2 in acqua)
        [sulfur-dioxide-gas] SO2 gassosa (E220)
       *[tablet] Pastiglie effervescenti
    }
choice-powder = { $value ->
        [potassium-metabisulfite] Metabisolfito di potassio in polvere
       *[sodium-metabisulfite] Metabisolfito di sodio in polvere
    }
choice-tablet_salt_g = { $value } g
choice-tablet_SO2_g = { $value } g
folded = Calcolo e altri avvisi: tocca Altro.
terminal-start = brimnote calcola aggiunte di SO2. Scrivi un’analisi, per esempio:
terminal-start-example =     T4 55 hl pH 3,58 libera 21
demo-start = Questa è una demo: la cantina del porto e le sue persone sono inventate, e niente di quello che fai resta. Scrivi:
demo-start-sheets = Il foglio del giorno:  oggi        Uno storico:  storico T4        Cosa misurare:  scadenze
demo-start-reading = Poi un’analisi tua, per esempio:  T6 libera 21
demo-start-end = ? mostra altro, Ctrl-D chiude.
terminal-start-more = ? mostra altro, Ctrl-D chiude. Più righe incollate insieme sono un messaggio.

## Tasti

button-working = Calcolo
button-safety = Sicurezza
button-target = Altro obiettivo
button-more = Altro
button-not-finished = Non finito
button-red = Rosso
button-choice-leave = Lascia così
button-choice-to = A { $free }

## Quello che la cantina ricorda

fault-unwritten = Non annotato: non sono riuscito a scriverlo. Rimandalo tra un minuto.
vessel-unknown =
    { $vessel ->
        [none] Quale vasca? Per esempio: T4?
       *[other] Di { $vessel } non so ancora niente. Manda un’analisi, per esempio: { $vessel } 55 hl pH 3,58 libera 21
    }
recalled = { $list } ({ $day })
recalled-additive = { additive } ({ $day })
recalled-allowance = margine { $percent } % (tua impostazione)
choice-volume_L = { $value }
ask-volume-which =
    { $vessel }: { $known ->
        [none] { $said } è più di quanto tiene. È giusto?
       *[other] hai scritto { $said }, io avevo { $known }. Quale vale?
    }
read-kept =
    { $new ->
        [new] Annotato ({ $vessel } è nuova): { $list }.
       *[known] Letto e annotato: { $list }.
    }
noted-something-else =
    Annotato, voce { $entry }, non calcolata: { $vessel } { $text }, { $when }.{ $voids ->
        [ph] { " " }Il pH va rimisurato.
       *[none] { "" }
    }
reading-kept = { at }{ $list }: annotato, { $when }.
button-added = Aggiunto
button-mine = Lo faccio io
button-order = Ordinalo
button-note = Annota
button-sampled-before = Prima
button-sampled-after = Dopo
button-dose-anyway = Una dose lo stesso
button-white = Bianco
button-take = Prendi
import-ask = Lo prendo?
import-taken = Prese: { $entries } voci.
import-no-file = Non trovo un file “{ $file }” da leggere.
export-written = Scritto: { $path }
export-none = In quel periodo non si è annotato niente.
backup-written = Backup scritto: { $path }
progress-working = Ci sto lavorando …
progress-done = Fatto.
errand-failed = Non è riuscito, e niente è stato scritto. Riprova; se fallisce ancora, dillo a chi mi gestisce.
backup-elsewhere = I backup li fa chi mi gestisce. Il registro di questa cantina lo porti via con: esporta tutto
button-undo = Annulla { $entry }
button-done = Ordine { $entry } fatto
button-remind = Ricordamelo tra 24 h
added-confirm = { at }{ $added } sono { $list }. Annoto?
added-confirm-bare = { at }{ $added } di SO2. Annoto?
noted-addition =
    Annotato, voce { $entry }: { $vessel } { $list }, { $when }{ $added ->
        [none] .
       *[other] { " " }({ $added } di SO2).
    }{ $order ->
        [none] { "" }
       *[other] { " " }L’ordine { $order } è fatto.
    }
noted-bare = Annotato, voce { $entry }: { $vessel } { $added } di SO2, { $when }.
noted-measure = Misura la libera dopo: { $when }, prima di aggiungere ancora.
noted-measure-now = Misura la libera prima di aggiungere ancora.
already-noted = Già annotata come { $entry }, { $when } ({ $who ->
        [you] tu
       *[other] { $who }
    }): { $vessel }.
odd-more-than-planned = È { $factor } volte quello che avevo calcolato per { $vessel }. Un errore? Allora annulla.
odd-large = { $added } in una sola aggiunta sono tanti. Un errore? Allora annulla.
odd-second = { $vessel } ne aveva già avuta una, { $when } (voce { $entry }).
odd-empty = { $vessel } risulta vuota, { $when }.
odd-from-empty = { $vessel } risultava vuota, { $when }.
odd-over-capacity = { $volume } è più dei { $capacity } che tiene { $vessel }.
when-noon = Ora non detta: annotato a mezzogiorno.
when-future =
    { at }“{ $text }” deve ancora venire{ $when ->
        [none] { "" }
       *[other] { " " }({ $when })
    }. Non annotato. Rimandalo con l’ora giusta.
when-no-such-day = { at }“{ $text }” non esiste. Non annotato. Rimandalo con l’ora giusta.
vessel-new = { $vessel } per me è nuova.
volume-differs =
    { $vessel }: { $known ->
        [none] { $said } è più di quanto tiene
       *[other] { $said } non sono i { $known } che avevo
    }: non annotato. Se è giusto, scrivi: { $vessel } ora ha { $written }
ask-zone = Dico le ore in UTC. In che fuso siete? Scrivi: fuso orario Europe/Rome
dosed-who =
    { $who ->
        [you] tua
       *[other] di { $who }
    }
dosed-which-first =
    { $vessel }: aggiunta { dosed-who }{ $known ->
        [none] { "" }
       *[some] , { $list }
    }, { $when }. Campione preso prima? Nessuna dose finché non lo so.
dosed-add-more =
    { $vessel }: aggiunta { dosed-who }{ $known ->
        [none] { "" }
       *[some] , { $list }
    }, { $when }. Ancora, lo stesso?
dosed-sampled-before =
    { $vessel }: nessuna dose: aggiunta { dosed-who }{ $known ->
        [none] { "" }
       *[some] , { $list }
    }, { $when }, dopo quel campione. Rimisura dopo: { $next }.
dosed-landed =
    { $vessel }: per ora basta: aggiunta { dosed-who }{ $known ->
        [none] { "" }
       *[some] , { $list }
    }, { $when }, e la SO2 si combina ancora per un giorno. Rimisura dopo: { $next }.
dosed-in-round =
    { $vessel }: nessuna dose: aggiunta { dosed-who }{ $known ->
        [none] { "" }
       *[some] , { $list }
    }, { $when }. Mandala da sola.
landed =
    { $vessel } è arrivata a { $after }{ $planned ->
        [none] { "" }
       *[other] , previsti { $planned }
    }: di { $added } { $unit } si è combinato { $percent } %.
landed-loose =
    { $vessel } è arrivata a { $after }{ $planned ->
        [none] { "" }
       *[other] , previsti { $planned }
    }. Quanto si è combinato non si sa: la libera prima dei { $added } { $unit } è di un altro giorno ({ $day }).
landed-fell = { $vessel } è passata da { $before } a { $after } con { $added } { $unit } aggiunti: tutto combinato, o un errore. Rimisura.
landed-too-high = { $vessel } è salita di { $rise } con solo { $added } { $unit } aggiunti. Una cifra è sbagliata: rimisura.
on-it =
    { $vessel }: { $who ->
        [you] ci sei tu
       *[other] c’è { $who }
    }, da { $when }.
claimed = { $vessel } è tua fino a { $until }. Gli altri lo vedono.
claim-taken = { $vessel }: c’è già { $who }, da { $when }.
ordered = Ordine { $entry }: { $vessel } { $list }.
ordered-open = Aperto finché qualcuno annota cosa è entrato.
order-how = Per esempio: ordine T4 256 g
order-gone = L’ordine { $entry } non è più aperto.
remind-set = Ti chiedo di { $vessel }: { $when }.
remind-late = È tardi per quello: misura { $vessel } ora.
undo-nothing = Non c’è niente di tuo da annullare.
undo-late = La voce { $entry } ha più di 15 minuti. Scrivi: cancella { $entry } e il perché
undo-not-yours = La voce { $entry } è di { $who }. Scrivi: cancella { $entry } e il perché
strike-none = La voce { $entry } non c’è.
strike-again = La voce { $entry } è già stata cancellata, da { $by }.
strike-correction = La voce { $entry } è già una correzione. Annota di nuovo quello che era giusto.
strike-why = Perché? Scrivi: cancella { $entry } refuso
struck = Cancellata la voce { $entry } ({ $list }). Nel foglio restano tutte e due.
struck-addition = Se invece è entrata, annotala di nuovo.
noted-vessel =
    Annotato, voce { $entry }: { $list }.{ $voids ->
        [ph] { " " }Il pH va rimisurato.
        [volume] { " " }Il nuovo volume dillo con la prossima analisi.
        [blend] { " " }pH e SO2 vanno rimisurati.
       *[none] { "" }
    }
amount-unknown = SO2, quantità non detta
fact-capacity = tiene { $volume }
fact-lot = { $lot }
fact-chemical-lot = lotto { $lot }
fact-remark = “{ $remark }”
event-said =
    { $event ->
        [racked] { " " }travasata
        [topped] { " " }colmata
        [acid] { " " }acidificata
        [moved] { $whole ->
            [part] { " " }spostata in parte in { $to }
           *[all] { " " }spostata in { $to }
        }
        [blended] { $whole ->
            [part] { " " }tagliata in parte in { $to }
           *[all] { " " }tagliata in { $to }
        }
        [emptied] { " " }vuota
        [lot] { " " }è { $lot }
        [later] , controllo rinviato: { $until }
        [unwatched] , niente più controlli
        [watched] , di nuovo controlli
        [forgotten] { " " }dimenticata
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
    ordine { $vessel } { $known ->
        [none] { $added } mg/L
       *[some] { $list }
    }
entry-reading = { $vessel } { $list }
entry-vessel =
    { $vessel }{ event-said }{ $told ->
        [none] { "" }
       *[some] { " " }{ $list }
    }
entry-other = { $vessel } { $text } (non calcolata)
entry-stock =
    { $event ->
        [received] ricevuto:
        [used] usato, per nessun vino:
        [discarded] buttato:
       *[counted] contato:
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }da { $supplier }
    }
entry-correction =
    cancella { $entry }: { $reason ->
        [undo] annullata
        [sampled-before] campione preso prima dell’aggiunta
        [edited] il messaggio è stato modificato
       *[other] { $reason }
    }
round-volume-which = { $vessel }: { $said } non va con quello che teneva: mandala da sola.
sheet-entry =
    { $entry } · { $when } · { $list } · { $who }{ $late ->
        [late] { " " }(annotata { $noted })
       *[none] { "" }
    }{ $struck ->
        [none] { "" }
       *[other] { " " }— CANCELLATA da { $struck }
    }
day-head = { $day } ({ $zone }):
day-empty = Niente annotato: { $day }.
day-more = Le altre di quel giorno sono nell’export.
day-none-such = Quel giorno non esiste.
history-head = { $vessel }, l’ultima in fondo:
history-empty =
    { $vessel ->
        [none] Quale vasca? Per esempio: storico T4
       *[other] Di { $vessel } non c’è ancora niente.
    }
history-more = Le più vecchie: esporta { $vessel }
list-more = … e altre { $count }.
vessels-none = Non conosco ancora vasche. Manda un’analisi, per esempio: T4 55 hl pH 3,58 libera 21
vessels-head =
    { $number ->
        [one] Una vasca, da misurare ora { $due }:
       *[many] { $count } vasche, da misurare ora { $due }:
    }
vessels-line =
    { $vessel }{ $lot ->
        [none] { "" }
       *[other] { " " }{ $lot }
    }: { $free ->
        [none] nessuna analisi
       *[other] libera { $free } ({ $day })
    }{ $next ->
        [empty] , vuota
        [now] , MISURARE ORA
        [later] , prossima { $check }
       *[none] { "" }
    }
vessel-head = { $vessel }: { $list }
vessel-bare = { $vessel }
vessel-empty = { $vessel }: vuota ({ $day })
vessel-readings = Ultime: { $list }
vessel-void =
    { $field ->
        [ph] pH
       *[other] Volume
    } non noto ({ $day }): { $event ->
        [malolactic] malolattica
        [fermentation] allora era mosto
        [blended] taglio
        [acid] acidificazione
        [racked] travaso
        [topped] colmatura
       *[moved] spostamento
    }.
vessel-addition =
    { $entry } · { $when } · { $list }{ $added ->
        [none] { "" }
       *[other] , { $added } mg/L
    } · { $who }{ $landed ->
        [not-yet] { " " }(dopo non misurata)
       *[landed] { "" }
    }
vessel-bound =
    { $number ->
        [one] Combinato: { $share } % di un’aggiunta.
       *[many] Combinato: { $share } % in media su { $count } aggiunte ({ $least }–{ $most } %).
    }
vessel-order = Ordine aperto { $entry }: { $list } ({ $who }, { $when }).
vessel-check =
    Prossimo controllo { $when }{ $why ->
        [landing] { " " }(dopo l’aggiunta)
        [forecast] { " " }(le sue analisi dicono che allora può mancare)
       *[other] { "" }
    }.
vessel-check-due =
    Controllo scaduto, { $when }{ $why ->
        [landing] { " " }(dopo l’aggiunta)
        [forecast] { " " }(le sue analisi dicono che può mancare)
       *[other] { "" }
    }.
vessel-unwatched = Niente controlli. Di nuovo: segui { $vessel }
due-none = Niente in scadenza.
due-head =
    { $number ->
        [one] Una vasca da misurare:
       *[many] { $count } vasche da misurare, la più urgente prima:
    }
due-stage =
    { $stage ->
        [none] { "" }
       *[other] { " " }(non finita: nessuna dose)
    }
due-overdue =
    { $overdue ->
        [no] { "" }
       *[yes] , in ritardo di { $days } g
    }
due-landing = { $vessel }: aggiunta { $added }, dopo non misurata{ due-overdue }{ due-stage }
due-usual =
    { $vessel }: { $free ->
        [none] mai misurata
       *[other] libera { $free } ({ $day })
    }{ due-overdue }{ due-stage }
due-often =
    { $vessel }: { $free ->
        [none] mai misurata
       *[other] libera { $free } ({ $day })
    }{ $low ->
        [low] , bassa
       *[none] { "" }
    }{ due-overdue }{ due-stage }
due-forecast =
    { $vessel }: { $free ->
        [none] mai misurata
       *[other] libera { $free } ({ $day })
    }, ormai può mancare{ due-overdue }{ due-stage }
daily-head = Buongiorno.
remind = Un giorno fa: { $list }. Misura ora la libera.
open-none = Nessun ordine aperto.
open-head =
    { $number ->
        [one] Un ordine aperto:
       *[many] { $count } ordini aperti:
    }
open-line = { $entry } · { $vessel } { $list } · { $who }, { $when }
language-changed = Hai scritto in italiano: da ora rispondo in italiano.
language-set = Rispondo in italiano.
button-stay-language = Resta in italiano
language-not-yet = Quella lingua la leggo, ma non ci rispondo ancora.
settings-head = Impostazioni di questa cantina, e come cambiarle:
setting-set = Fatto. { $list }
setting-units =
    Unità: { $units ->
        [us] galloni americani
        [imperial] galloni imperiali
       *[metric] litri
    } (lavoriamo in galloni)
setting-usual-additive =
    Di solito: { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    } (di solito usiamo meta 57%)
setting-target = Obiettivi, molecolare: rosso { $red }, bianco { $white }, dolce { $sweet } (obiettivo 0,6 per i rossi)
setting-allowance =
    { $percent ->
        [none] Nessun margine per la combinazione (margine 30%)
       *[other] Margine per la combinazione: { $percent } % sulle dosi da obiettivo (senza margine)
    }
setting-yield =
    { $yield ->
        [none] Nessuna resa solita dell’uva (resa 65)
       *[other] Resa: { $yield } L di mosto da 100 kg di uva (senza resa)
    }
setting-basis =
    Base: { $basis ->
        [oiv] OIV
       *[other] pK 1,81
    } (base OIV, base 1,81)
setting-law = Legge: { law-of } (legge UE, legge USA)
setting-zone =
    Fuso orario: { $zone ->
        [none] non detto, quindi UTC
       *[other] { $zone }
    } (fuso orario Europe/Rome)
setting-daily =
    Lista giornaliera: { $daily ->
        [off] spenta (lista giornaliera alle 7:30)
       *[other] { $daily } (niente lista giornaliera)
    }
setting-quiet = Silenzio: dalle { $from } alle { $to } (silenzio dalle 20 alle 6)
setting-ph-days = Un pH vale { $days } giorni (il pH vale 14 giorni)
setting-check-days = Controllo ogni { $usual } giorni; barrique e vasche basse ogni { $often } (controllo ogni 30 giorni, controllo barrique ogni 14 giorni)
setting-language = Lingua: italiano (lingua en)
setting-short-replies =
    Risposte: { $short ->
        [short] brevi (risposte lunghe)
       *[long] intere (risposte brevi)
    }
setting-wrong =
    Così non va: “{ $text }”. { $of ->
        [units] Per esempio: lavoriamo in galloni
        [usual-additive] Per esempio: di solito usiamo meta 57%
        [target] Per esempio: obiettivo 0,6 per i rossi
        [yield] Per esempio: resa 65
        [quiet] Per esempio: silenzio dalle 20 alle 6
        [daily] Per esempio: lista giornaliera alle 7:30
        [zone] Per esempio: fuso orario Europe/Rome
        [law] Lì nessun limite in archivio. In archivio: OIV, UE, UK, USA, CA, AU, NZ, ZA, AR, CL, BR, JP, KR, CN, Codex, CH, GE, HK, EAEU. Per esempio: legge UE
        [allowance] Per esempio: margine 30%
        [basis] Per esempio: base OIV
        [ph-days] Per esempio: il pH vale 14 giorni
        [check-days] Per esempio: controllo ogni 30 giorni
       *[other] Per esempio: risposte brevi
    }
forgotten-person = Il tuo nome non compare più nei fogli. Quello che hai annotato resta, come persona { $number }.

## Persone, cantine e chat

role =
    { $role ->
        [keeper] responsabile
        [hand] cantiniere
       *[guest] ospite
    }
cellar-called =
    { $cellar ->
        [none] { $keeper ->
            [none] questa cantina
           *[other] la cantina di { $keeper }
        }
       *[other] { $cellar }
    }
keeper-called = { $name }
not-allowed =
    { $role ->
        [keeper] Questo può farlo un responsabile di questa cantina
       *[hand] Questo possono farlo cantinieri e responsabili di questa cantina
    }{ $keepers ->
        [none] .
       *[some] : chiedi a { $list }.
    }
guest-not-kept = Qui sei ospite: di questo non annoto niente.
not-of-cellar = Non fai più parte di questa cantina. Un responsabile può invitarti: poi mandami il codice.
invite-how = Con quale ruolo? Scrivi: invita cantiniere, oppure: invita ospite, oppure: invita responsabile
invite-not-here = Qui non posso fare codici.
invited = Codice per un { role }, fino al giorno { $day }: { $code }
invited-how =
    { $link ->
        [none] Il primo che mi manda “entra” e il codice è dentro.
       *[other] Il primo che apre questo è dentro: { $link } (o mi manda “entra” e il codice)
    }
joined = Sei dentro: { $list }, come { role }.
joined-before = Eri già dentro: { $list }, come { role }. Il codice vale ancora.
joined-how =
    { $role ->
        [guest] Chiedi di una vasca, per esempio: T4?
       *[other] Manda un’analisi, per esempio: T4 55 hl pH 3,58 libera 21
    }
join-unknown = Il codice non è valido, o è scaduto. Chiedine uno nuovo.
join-used = Il codice è già stato usato. Chiedine uno nuovo.
people-head = Persone di questa cantina:
people-line =
    { $name }: { role }{ $me ->
        [me] { " " }(tu)
       *[other] { "" }
    }
people-how = Per cambiare: invita cantiniere, rendi Ben ospite, rimuovi Ben
role-changed =
    { $role ->
        [none] { $name } non fa più parte di questa cantina.
       *[other] { $name } ora è { role }.
    }
role-same = { $name } è già { role }.
last-keeper = { $name } è l’unico responsabile rimasto. Prima nominane un altro, per esempio: Ben è responsabile
person-unknown = Qui non conosco “{ $text }”. Ci sono: { $list }.
person-which = Quale “{ $text }”? { $list }. Scrivilo con il numero, per esempio: rimuovi persona 3
person-called =
    { $name ->
        [none] persona { $number }
       *[other] { $name }
    }
at-cellar = { $list }:
at-now = Da ora: { $list }.
at-already = Siamo già qui: { $list }.
at-here = Siamo qui: { $list }.
at-others = Altre: { $list }. Per cambiare scrivi “a” e il nome
at-only = Qui non ce n’è un’altra.
at-unknown = Qui non conosco una cantina “{ $text }”. Ci sono: { $list }.
at-which = Quale “{ $text }”? { $list }.
cellar-left = Non sei più in { $list }. Quello che hai annotato resta nel suo registro.
cellar-named = Questa cantina ora è { $name }.
reads-along =
    { $on ->
        [on] Qui rispondo alle analisi anche se nessuno mi chiama, quando vasca e cifre sono chiare.
       *[off] Qui rispondo solo se mi chiamate.
    }
group-joined = Ciao. Calcolo le aggiunte di solforosa e tengo il registro di una cantina. Chiamami per nome, o rispondimi.
group-how = Per cominciare: T4 55 hl pH 3,58 libera 21. Altro: aiuto
corrected = Corretto.
edited-noted = La tua modifica non cambia niente: la voce { $entry } ({ $vessel }) resta. Se è sbagliata: cancella { $entry } e il perché
edited-added = La tua modifica non cambia niente: { $vessel } ha avuto un’aggiunta dopo (voce { $entry }). Manda le cifre giuste in un messaggio nuovo.
edited-late = La tua modifica non cambia niente: quel messaggio ha più di 15 minuti. Mandane uno nuovo.
edited-anew = Una cosa così non la prendo da una modifica. Manda un messaggio nuovo.
added-it-none =
    { $vessel ->
        [none] Cosa è entrato, e dove? Per esempio: aggiunti 82 g di meta T4
       *[other] Cosa è entrato in { $vessel }? Per esempio: aggiunti 82 g di meta { $vessel }
    }
picture-none =
    { $vessel ->
        [none] Di quale vasca? Per esempio: grafico T4
       *[other] Di { $vessel } non so ancora niente, quindi niente da disegnare.
    }
stranger = Questo bot è per chi è invitato. Se hai un codice, manda: entra e il codice
too-fast = Troppi messaggi insieme: per un minuto salto i tuoi. Poi rimanda quelli senza risposta.

command-today = Cosa si è annotato oggi
command-due = Vasche da misurare
command-vessels = Tutte le vasche
command-open = Ordini ancora da fare
command-settings = Cosa è solito qui, e come cambiarlo
command-help = Come usarmi

## File: export e import

export-entry = N.
export-kind = Tipo
export-done = Fatto (ora locale)
export-noted = Annotato (ora locale)
export-late = In ritardo
export-is-late = in ritardo
export-person = Persona
export-unnamed = persona { $number }
export-vessels = Vasca
export-to = Verso
export-event = Cosa è successo
export-wine-lot = Lotto del vino
export-wine = Vino
export-additive = Prodotto
export-strength_percent = Titolo %
export-chemical_lot = Lotto del prodotto
export-supplier = Fornitore
export-mass_g = Quantità g
export-additive_volume_mL = Quantità mL
export-tablets = Pastiglie
export-SO2_g = SO2 aggiunta g
export-added_mg_L = SO2 aggiunta mg/L
export-planned_mg_L = SO2 prevista mg/L
export-planned_free_mg_L = SO2 libera obiettivo mg/L
export-volume_L = Volume L
export-stock-left = Rimanenza in magazzino (g, mL, pastiglie)
export-us-gallons = Volume US gal
export-ph = pH
export-free_mg_L = SO2 libera mg/L
export-total_mg_L = SO2 totale mg/L
export-temperature_C = Temperatura °C
export-alcohol_percent = Alcol % vol
export-sugar_g_L = Zuccheri g/L
export-over_rule = Oltre il limite di
export-order = Esegue l’ordine n.
export-remark = Nota
export-corrects = Annulla la n.
export-reason = Motivo
export-struck_by = Cancellata dalla n.
export-struck-reason = Cancellata perché
export-calculated = Calcolata
export-is-calculated = calcolata
export-is-not-calculated = non calcolata
export-at = Fatto (con fuso)
export-noted_at = Annotato (con fuso)
export-by = Persona n.
export-name = Nome
export-style = Colore
export-category = Categoria
export-product = Bevanda
export-organic = Biologico
export-stage = Fase
export-designated_mg_L = In deroga, limite mg/L
export-uplift = Annata sfavorevole
export-quality = Spumante di qualità
export-pdo = Denominazione protetta
export-bulk = Sfuso per l’export
export-density_kg_L = Densità kg/L
export-reserve_mg_L = Tenuti per l’imbottigliamento mg/L
export-lot = Lotto detto
export-capacity_L = Capacità L
export-until = Fino a
export-strength_of = Titolo di
export-tablet_SO2_g = SO2 in una pastiglia g
export-tablet_salt_g = Sale in una pastiglia g
export-key = Chiave

import-vessels = Vasche nel file: { $vessels }.
import-log = Voci nel file: { $entries }. Vasche: { $vessels }. Persone: { $people }.
import-not-understood = Non capite e lasciate fuori: { $count ->
        [one] riga { $lines }
       *[other] righe { $lines }
    }.
import-not-taken = Non preso dal file: { $list }.
import-not-taken-name = { $name ->
        [ph] pH
        [free_mg_L] SO2 libera
        [total_mg_L] SO2 totale
        [temperature_C] temperatura
       *[other] { $name }
    }
import-unit = I volumi senza unità sono letti in { $unit ->
        [L] litri
        [hL] ettolitri
        [mL] millilitri
        [m3] metri cubi
        [galUS] galloni americani
       *[galUK] galloni imperiali
    }.
import-problem = { $code ->
        [empty] Il file è vuoto.
        [too-large] Il file è troppo grande: al massimo 512 kB, un nostro export 8 MB.
        [too-many-rows] Il file ha troppe righe: al massimo 20.000.
        [too-many-columns] Il file ha troppe colonne: al massimo 200.
        [cell-too-long] Una cella del file è troppo lunga per essere tale.
        [not-a-table] Non è una tabella che so leggere. Manda un CSV o XLSX, o un testo con una vasca per riga: T4; 5200 L; rosso
        [old-spreadsheet] È un foglio di vecchio tipo, o con password. Salvalo come XLSX o CSV, senza password.
        [broken] Il file è danneggiato, o una virgoletta non è chiusa. Salvalo di nuovo come XLSX o CSV.
        [too-heavy] Leggere il file richiede troppo tempo o memoria. Dividilo, o mandalo come CSV.
        [columns-missing] Sembra un mio export, ma mancano colonne: { $about }.
        [columns-unknown] Sembra un mio export, ma queste colonne non le conosco, o ci sono due volte: { $about }.
        [unclear-numbers] Non capisco se i numeri hanno virgola o punto decimale: salva il file con uno solo dei due, senza segni per le migliaia.
        [not-understood] Sembra un mio export, ma queste righe non sono voci: { $lines }.
        [doubled] Un numero o una chiave di queste righe c’è due volte nel file: { $lines }.
        [refers-outside] Queste righe parlano di voci che non sono nel file: { $lines }. Esporta tutto e importa quello.
        [already-noted] Queste righe qui sono già annotate: { $lines }.
       *[no-vessels] Non ci ho trovato vasche. Una riga è così: T4; 5200 L; rosso
    }
import-nothing-taken = Non ho preso niente.

## Grafici

picture-unit = SO2 in { $unit }
picture-free = libera { $free } ({ $day })
picture-total = totale { $total } ({ $day })
picture-bound = combinata: lo spazio in mezzo
picture-odd = libera sopra la totale
picture-needed =
    { $ph ->
        [no-ph] libera che serve (pH ora non noto)
        [no-target] libera che serve (ora nessun obiettivo solito)
       *[other] servono { $needed } di libera a pH { $ph }
    }
picture-limit = limite di totale { $limit }
picture-added = aggiunta
picture-added-thinned = aggiunta (non c’è posto per ogni cifra)
picture-added-unknown = aggiunta, quantità non nota
picture-blended = taglio

picture-head = { $vessel }, inizio { $day }. Analisi: { $readings }, aggiunte: { $additions }.
picture-last = { $list }.
picture-last-free = libera { $value } { $unit } ({ $day })
picture-last-total = totale { $value } { $unit } ({ $day })
picture-last-bound = combinata { $value } { $unit } ({ $day })
picture-needs = pH { $ph } ({ $day }): per { $molecular } di molecolare servono { $needed } di libera.
picture-needs-nothing =
    { $why ->
        [no-ph] pH ora non noto, quindi nemmeno la libera che serve.
       *[no-target] Ora per questo vino non c’è un obiettivo solito.
    }
picture-limit-of-total = Limite di totale: { $limit }.
picture-additions =
    { $earlier ->
        [none] Aggiunte, { $unit }: { $list }.
       *[other] Aggiunte, { $unit }: { $list }; prima altre { $earlier }.
    }
picture-addition =
    { $added ->
        [none] non nota ({ $day })
       *[other] { $added } ({ $day })
    }
picture-unmeasured = Libera non misurata dopo l’aggiunta ({ $day }).
picture-came-from = Viene da { $vessels } ({ $day }): le cifre di prima sono lì.
picture-was-blended = Taglio ({ $day }): le cifre di prima sono di un altro vino.
picture-empty = Vuota ({ $day }).
picture-is-odd = Libera sopra la totale ({ $days }): una delle due è sbagliata, rimisura.
picture-nothing = Nessun grafico di { $vessel }: nel vino che c’è dentro la SO2 non è ancora misurata.

# Domande semplici: la risposta, una cifra con la fonte, e cosa mandare dopo.
question-small-or-large = Meno e più grandi. Una piccola aggiunta può combinarsi tutta e non lasciare libera.
question-small-or-large-why = Di un’aggiunta resta libero dal 35 al 67 %; le cifre pubblicate non concordano, quindi misura il giorno dopo.
question-small-or-large-next = Per il tuo vino: T4 55 hl pH 3,58 libera 21
question-how-often = Le vasche circa ogni mese, le barrique ogni due settimane, e un giorno dopo ogni aggiunta (pratica comune, senza fonte).
question-how-often-why = Prima, se fa caldo, se è scolma o con poca libera.
question-how-often-next = Cosa scade qui: scadenze
question-which-figure = Protegge la molecolare, che dipende da libera e pH. La legge conta la totale: libera e combinata insieme.
question-which-figure-why = Di solito 0,6–0,8 mg/L di molecolare (Understanding Wine Chemistry, 2016).
question-which-figure-next = Il tuo: pH 3,5 libera 20
question-which-yield = 57,6 %: tanta SO2 c’è nel metabisolfito di potassio puro, da formula, e così conto.
question-which-yield-why = Il 50 % è un’abitudine del mestiere con un margine dentro: per lo stesso scopo va il 15 % di polvere in più.
question-which-yield-next = L’etichetta dice altro? Scrivilo: meta 57%, oppure meta 96%
question-tablets-or-powder = La stessa SO2, se la misura è giusta. La polvere dosa più fine ma vuole una bilancia.
question-tablets-or-powder-why = Le effervescenti si vendono a grammi di SO2 (2 o 5 g), le Campden a grammi di sale (0,44 o 0,55 g): pratica comune, senza fonte.
question-tablets-or-powder-next = Quanto aggiungono: 2 pastiglie effervescenti da 5 g in 225 L
question-old-powder = Aperto e umido perde forza, circa un decimo l’anno (pratica comune, senza fonte). A grumi: non per il vino.
question-old-powder-why = Mai annusare il sacco. Con polvere vecchia misura il giorno dopo: può esserne entrata meno di quella pesata.
question-old-powder-next = Tieni la sua data: ricevuti 1 kg di meta lotto 12
question-wait-before-yeast = Da 12 a 24 ore dopo l’aggiunta (pratica comune, senza fonte).
question-wait-before-yeast-why = Di 50 mg/L nel mosto circa 16 si ritrovano poi nella totale (testo tecnico tedesco, 2012).
question-wait-before-yeast-next = La dose: mosto 20 hl aggiungere 40
question-after-malolactic = Quando l’acido malico, misurato, è finito; non prima.
question-after-malolactic-why = I batteri vogliono libera sotto 5–10 e totale sotto 30–40 mg/L (AWRI, per pH 3,3–3,5).
question-after-malolactic-next = Poi: T4 malolattica finita, e la sua analisi
question-ppm-and-mg-L = Nel vino 1 ppm vale 1 mg/L, e 1 g/hL sono 10 mg/L.
question-ppm-and-mg-L-why = Di polvere è meno: 10 g/hL di metabisolfito di potassio portano 57,6 mg/L di SO2 (da formula).
question-ppm-and-mg-L-next = Prova: 10 g di meta in 1 hl
question-teaspoons = Mai a cucchiaini. Un cucchiaino raso di polvere pesa circa 5–6 g (pratica comune, senza fonte).
question-teaspoons-why = Per le piccole quantità serve una bilancia da 0,1 g, o una soluzione 10 % e una siringa.
question-teaspoons-next = La soluzione: preparare 1 L di meta al 10%
question-fell-short = Di ogni aggiunta una parte si combina, di solito da un terzo a metà, di più nei vini giovani, dolci o da uva marcia. Un po’ la toglie l’aria.
question-fell-short-why = Oppure: non rimescolato, misurato troppo presto, polvere vecchia, altro volume. 1 mg/L di ossigeno può consumare 4 mg/L di SO2 (da formula).
question-fell-short-next = Misura, poi: T4 libera 24. Com’è andata: T4?
question-strip-reads-otherwise = Fidati del laboratorio. Strisce e kit sono un primo sguardo; dosa con una titolazione per aerazione o allo iodio.
question-strip-reads-otherwise-why = I metodi che acidificano leggono troppo alto nei rossi, fino al 66 % (Virginia, 2022). Lo iodio conta anche l’acido ascorbico.
question-strip-reads-otherwise-next = La tua titolazione: AO 20 mL di campione, 1,9 mL 0,01 N
question-stop-fermentation = No. La solforosa non ferma una fermentazione in corso, e bottiglie con zuccheri e lieviti possono scoppiare.
question-stop-fermentation-why = Freddo e filtrazione sterile, fatti da chi è qualificato; poi un dolce si tiene verso 1,5 mg/L di molecolare (una tabella pubblicata).
question-stop-fermentation-next = Quando è fermo: T4 10 hl dolce pH 3,3 libera 10
question-sorbate = Il sorbato mai da solo: frena i lieviti, non i batteri, e questi ne fanno odore di geranio.
question-sorbate-why = Accanto il vino tiene tutta la libera per 0,8 mg/L di molecolare (pratica comune, senza fonte).
question-sorbate-next = Quella SO2: T4 10 hl pH 3,4 libera 12
question-allergy = Chiedi a un medico: qui nessuno può dire cosa è sicuro per una persona. Con l’asma i solfiti possono essere pericolosi.
question-allergy-why = In etichetta da 10 ppm di totale (USA, 27 CFR 4.32(e)), oltre 10 mg/L nell’UE (1169/2011). Il mal di testa ha molte cause.
question-allergy-next = Quanto ne ha un vino: T4?
question-law = Dipende da mercato, colore e zuccheri. Codice OIV: rosso 150, bianco e rosato 200 mg/L di totale fino a 4 g/L di zuccheri, oltre 300.
question-law-why = (OIV-MA-C1-01.) Non è un parere legale: verifica per il tuo mercato.
question-law-next = Il tuo mercato: limite rosso zuccheri 3 UE
question-gas = Solo chi è formato e autorizzato lì dove sei; maschera, aerazione, una seconda persona fuori.
question-gas-why = 0,5 ppm su un turno è il limite UE (2017/164); 100 ppm sono subito pericolosi per la vita (NIOSH).
question-gas-next = Senza gas: T4 55 hl pH 3,58 libera 21 meta
question-potassium-or-sodium = Potassio per il vino. Il sodio è per gli attrezzi: l’OIV non lo nomina per il vino.
question-potassium-or-sodium-why = Non pesano uguale: 57,6 % di SO2 nel sale di potassio, 67,4 % in quello di sodio (da formula).
question-potassium-or-sodium-next = Di’ quale hai: T4 55 hl pH 3,58 libera 21 meta
question-when-to-measure = Un giorno dopo averla mescolata, meglio due (pratica comune, senza fonte).
question-when-to-measure-why = Prima, una parte deve ancora combinarsi: leggi troppo alto.
question-when-to-measure-next = Poi: T4 libera 24
question-how-to-mix = Scioglilo prima in acqua fredda o poco vino, circa 50 g al litro (rivista di settore, 2009). Versalo rimescolando.
question-how-to-mix-why = Guanti, occhiali, aria. Mai con un acido nello stesso recipiente; un vino pieno di CO2 trabocca di schiuma.
question-how-to-mix-next = Una soluzione: preparare 5 L di meta al 5%
question-pH-matters = Più basso è il pH, più SO2 libera è molecolare, ed è quella che protegge.
question-pH-matters-why = Per 0,8 mg/L di molecolare: 26 di libera a pH 3,3, 79 a pH 3,8 (University of California, 1982).
question-pH-matters-next = Il tuo: pH 3,5 libera 20
question-which-target = Bianco e rosato 0,8 mg/L di molecolare, rosso 0,6, dolce 1,5, se non ne imposti altri.
question-which-target-why = Pubblicato: 0,6–0,8 per la stabilità (Understanding Wine Chemistry, 2016), rosso all’imbottigliamento 0,4–0,6 (da California, 1982).
question-which-target-next = Per cambiarlo: obiettivo 0,5 per i rossi
question-stock-keeps = Giorni, non settimane: falla fresca, chiudila, mettici la data (pratica comune, senza fonte).
question-stock-keeps-why = L’OIV chiama instabili le soluzioni di SO2 e di bisolfito.
question-stock-keeps-next = Fresca: preparare 1 L di meta al 10%
question-too-much = Non metterne altra. Tempo, aria e travasi abbassano la libera; un taglio abbassa libera e totale.
question-too-much-why = Da circa 2 mg/L di molecolare si sente al naso (Understanding Wine Chemistry, 2016). Perossido: solo chi è qualificato, dove la legge lo ammette.
question-too-much-next = A che punto è: T4?
question-no-sulfite = Si può, e allora il vino si regge su freddo, pulizia, vasche piene, pH basso e vendita rapida.
question-no-sulfite-why = I lieviti ne fanno un po’ di loro, di solito sotto 30 mg/L: "senza solfiti aggiunti" non è "senza solfiti".
question-no-sulfite-next = Quanto ne ha: T4 pH 3,5 libera 5
question-bottling = Misura qualche giorno prima; l’ultima aggiunta va fatta prima che parta la linea, mescolata e misurata.
question-bottling-why = Ogni mg/L di ossigeno preso può togliere fino a 4 mg/L di SO2 libera (da formula).
question-bottling-next = Con il suo ossigeno: imbottigliamento T4 40 hl pH 3,4 libera 22 ossigeno 2 mg/L

## Il magazzino dei prodotti
stock-tablets =
    { $unit ->
        [tablet] { " " }pastiglia
        [tablets] { " " }pastiglie
       *[none] { "" }
    }
stock-of =
    { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    }{ $size ->
        [none] { "" }
       *[other] , da { $size } g
    }
stock-none = In magazzino non c’è ancora niente. Di’ cosa c’è, o cosa è arrivato: ricevuti 25 kg di meta lotto 4471 da Norte Enologia
stock-none-of = In magazzino non risulta { additive }. Di’ cosa è arrivato (ricevuti …), o contalo (giacenza meta 3,2 kg).
stock-shelf =
    { stock-of }: { $amount }{ stock-tablets }{ $counted ->
        [none] .
       *[other] { " " }(contato: { $counted }).
    }
stock-lot =
    { "  " }{ $lot ->
        [none] senza lotto
       *[other] lotto { $lot }
    }: { $amount }{ stock-tablets }, arrivo { $day }{ $supplier ->
        [none] { "" }
       *[other] { " " }da { $supplier }
    }
stock-negative = ⚠ { stock-of }: per il registro { $amount }{ stock-tablets }: è arrivato qualcosa che non è annotato. Annotalo, o conta: giacenza meta 3,2 kg
stock-low = ⚠ Sta finendo: { stock-of }, in magazzino { $amount }{ stock-tablets }.
stock-left = { stock-of }: in magazzino ora { $amount }{ stock-tablets }.
stock-short = ⚠ { stock-of }: per il registro in magazzino { $amount }{ stock-tablets }, meno di quanto serve.
stock-old = ⚠ È lì da oltre un anno: un sacco aperto perde forza (pratica comune, senza fonte). Dopo misura la libera.
stock-oldest-lot =
    { $lot ->
        [none] Preso dal più vecchio di più lotti; se no scrivi il lotto: aggiunti …, lotto { $other }
       *[other] Preso dal lotto { $lot }, il più vecchio; se no scrivilo: aggiunti …, lotto { $other }
    }
stock-lot-unknown = Il lotto { $lot } per il registro non è in magazzino: preso dal più vecchio.
stock-noted =
    Annotato, voce { $entry }: { $event ->
        [received] ricevuto,
        [used] usato,
        [discarded] buttato,
       *[counted] contato,
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }da { $supplier }
    }{ $purpose ->
        [none] { "" }
       *[other] { " " }({ $purpose })
    }, { $when }.
stock-corrected =
    Il registro diceva { $was }: ora { $amount }{ stock-tablets } { $way ->
        [more] in più
       *[less] in meno
    }.
stock-not-kept = In magazzino non ne risulta, quindi non scalo niente. Contalo: giacenza meta 3,2 kg
stock-lacks =
    { $what ->
        [additive] Quale prodotto? Scrivi: ricevuti 25 kg di meta
        [strength] Che titolo ha: { additive }? Scrivi: ricevuti 10 L di SO2 al 6%
        [size] Pastiglie da quanti grammi? Scrivi: ricevute 50 pastiglie 5 g
        [volume] Le aggiunte di { additive } si misurano a volume. Scrivi: ricevuti 10 L di SO2 al 6%
        [one] Un prodotto per messaggio. Scrivi: ricevuti 25 kg di meta
       *[amount] Quanto { additive }, e in che unità? Scrivi: { $event ->
            [counted] giacenza meta 3,2 kg
            [used] usati 200 g di meta per lavaggio
            [discarded] buttato 1 kg di meta
           *[received] ricevuti 25 kg di meta
        }
    }

# Il laboratorio: il risultato di una titolazione

titration-result = { $vessel ->
    [none] SO2 { $of ->
        [total] totale
       *[other] libera
    } { $result } { $unit }
   *[other] { $vessel }: SO2 { $of ->
        [total] totale
       *[other] libera
    } { $result } { $unit }
}, { $method ->
    [aeration] per aerazione-ossidazione
   *[other] allo iodio
}.
titration-too-much = Più di quanto tenga un vino: controlla campione, buretta e titolo del titolante. Non lo annoto.
titration-molar = Iodio { $molar } M è { $normal } N: una mole ne prende due.
titration-ascorbic-asked = Lo iodio conta anche l’acido ascorbico: { $amount } mg/L si leggono come +{ $counts } { $unit }. Se ce n’è, aggiungi “ascorbico { $amount }”.
titration-precision = Due risultati dello stesso vino possono differire di { $again } nello stesso laboratorio, di { $other } tra due (pubblicato).
titration-red-high = Un rosso: i metodi che acidificano leggono la libera troppo alta, in uno studio fino al 66 %. Non tolgo niente; usa sempre lo stesso metodo.
titration-name-vessel = Per annotarla come analisi metti la vasca davanti: T4 …
titration-read = Letto: { $list }.
titration-sample = campione { $volume } mL
titration-titrant = titolante { $volume } mL
titration-blank = bianco { $volume } mL
titration-strength = { $unit ->
    [none] { $strength }
   *[other] { $strength } { $unit }
}
titration-iodate = { $mass } mg di iodato in { $volume } mL
titration-ascorbic = acido ascorbico { $amount } mg/L
titration-free-assumed = Presa come SO2 libera; scrivi “totale” se il campione è preparato per la totale.
titration-no-blank = Nessun bianco sottratto; se l’hai fatto aggiungi “bianco 0,1”.
titration-asks = { $missing ->
    [method] Titolata con soda (AO) o con iodio? Scrivilo: AO 20 mL di campione, 1,9 mL 0,01 N
    [sample] Quanti mL di vino? Mandala intera: { $method ->
        [iodine] iodio 25 mL di campione, 1,4 mL 0,02 N
       *[other] AO 20 mL di campione, 1,9 mL 0,01 N
    }
    [titrant] Quanti mL dalla buretta? Mandala intera: { $method ->
        [iodine] iodio 25 mL di campione, 1,4 mL 0,02 N
       *[other] AO 20 mL di campione, 1,9 mL 0,01 N
    }
    [unit] Lo iodio è in N o in M? Uno è la metà dell’altro. Scrivi N o M dopo il titolo.
   *[strength] Che titolo ha il titolante? Mandala intera, con N o M: { $method ->
        [iodine] iodio 25 mL di campione, 1,4 mL 0,02 N
       *[other] AO 20 mL di campione, 1,9 mL 0,01 N
    }
}
titration-either = { $strength } N dà { $normal } { $unit }, { $strength } M dà { $molar } { $unit }.
button-keep-result = Annota
button-keep-of = Annota { $vessel }{ $of ->
    [total] {" "}totale
   *[free] {""}
}

# Il laboratorio: di quanto può sbagliare una dose, tabelle, le due basi

range-dose = { $vessel ->
    [none] Come
   *[other] { $vessel }: come
} intervallo (95 %): { $amount ->
    [none] { $low }–{ $high } { $unit } di SO2
   *[other] { $amount }{ $count ->
        [several] {" "}in tutto
       *[one] {""}
    }, cioè { $low }–{ $high } { $unit } di SO2
}.
range-sure = Dopo la dose sei sicuro di { $molecular } { $unit } di molecolare, se si combina quanto calcolato.
range-sure-unbound = Se niente si combina, dopo la dose sei sicuro di { $molecular } { $unit } di molecolare.
range-sure-low = Sotto 10 { $unit } di libera una dose può combinarsi tutta: sicuri sono solo { $molecular } { $unit } di molecolare. Misura dopo un giorno.
range-rests = Con pH ± { $ph } e libera ± { $free } { $unit }{ $said ->
    [both] .
    [one] {" "}(quello che non hai detto: pratica comune, senza fonte).
   *[none] {" "}(pratica comune, senza fonte). I tuoi: pH 3,58±0,03 libera 21±2
}
range-limit = All’estremo alto la totale può passare il limite.
range-nothing = Per un intervallo serve prima una dose. Manda un’analisi, per esempio: T4 55 hl pH 3,58±0,03 libera 21
table-head = SO2 libera ({ $unit }) per molecolare { $targets }, { $basis ->
    [oiv] con OIV a 12 % vol e 20 °C (pK { $pK })
   *[other] pK { $pK }
}:
table-row = pH { $ph }: { $free }
table-care = Gli obiettivi sono pubblicati per pK 1,81. Oltre 60 di libera pensa alla totale e al gusto.
molecular-head = { $vessel }: pH { $ph }{ $free ->
    [none] , nessuna SO2 libera in archivio.
   *[other] , libera { $free } { $unit } ({ $day }).
}
molecular-base = { $basis ->
    [oiv] Con OIV, { $alcohol } % vol{ $known ->
        [yes] {""}
       *[no] {" "}(non detto)
    }, 20 °C
   *[other] Con pK { $pK }
}: { $molecular ->
    [none] per { $target } servono { $needed } di libera.
   *[other] { $molecular } di molecolare; per { $target } servono { $needed } di libera.
}
molecular-meaning = Con pK 1,81 lo stesso obiettivo vuole { $times } volte la libera: { $dose } { $unit } da aggiungere, con OIV { $other }. Gli obiettivi pubblicati valgono per pK 1,81; { $basis ->
    [oiv] le dosi di questa cantina vanno con OIV.
   *[other] anche le dosi di questa cantina.
}

# Questo vino: quanto ha combinato, quando ne serve ancora, troppa, tagli

lab-lacks = { $vessel }: { $what ->
    [ph] nessun pH in archivio. Mandalo, per esempio: T4 pH 3,58 libera 21
    [free] nessuna SO2 libera in archivio. Mandala, per esempio: T4 libera 21
    [total] nessuna SO2 totale in archivio. Mandala, per esempio: T4 totale 80
   *[target] così com’è non ha un obiettivo; non calcolo niente.
}
learned = Quanto ha combinato questo vino nelle ultime { $count } aggiunte: { $share } % (± { $spread }).
learned-offer = Quanto ha combinato questo vino nelle ultime { $count } aggiunte: { $share } % (± { $spread }). { $limit ->
    [passes] Quanto servirebbe va troppo vicino al limite.
   *[within] Per compensarlo: { $amount ->
        [none] { $dose } { $unit }
       *[other] { $amount } ({ $dose } { $unit })
    }. Scegli tu.
}
forecast-below = { $vessel }: la libera scende sotto { $needed } { $unit } { $day ->
    [far] tra più di due anni
   *[other] verso { $day }
}{ $from ->
    [now] , e forse è già sotto.
    [far] .
   *[other] {" "}({ $by ->
        [readings] 9 su 10: {""}
       *[published] {""}
    }da { $from } a { $to ->
        [far] più di due anni
        [never] forse mai
       *[other] { $to }
    }).
}
forecast-steady = { $vessel }: per le sue analisi la libera non cala; { $from ->
    [now] misura per esserne sicuro.
    [far] sotto { $needed } { $unit } non prima di due anni.
   *[other] sotto { $needed } { $unit } non prima: { $from }.
}
forecast-by-readings = Da { $count } analisi dopo l’ultima aggiunta: { $lost } % perso in 30 giorni.
forecast-by-rates = { $container ->
    [bottle] Da uno studio su bottiglie, non da questo vino: dopo 3 anni resta il 45 % a 14 °C, il 20 % a 15–26 °C.
   *[other] Da quanto perdono le barrique, non da questo vino: 3–10 mg/L al mese (pratica comune, senza fonte). Con { $fewest } analisi parlano le sue; { $number ->
        [one] ce n’è { $count }
       *[many] ce ne sono { $count }
    }.
}
forecast-measure = { $from ->
    [now] Misura ora.
    [far] Misura come al solito.
   *[other] Misura entro: { $from }.
}
forecast-need = Ne servono { $needed }: pH { $ph } ({ $day }), { $molecular } di molecolare.
forecast-none = { $vessel }: { $why ->
    [unmeasured] dopo l’ultima aggiunta la libera non è misurata. Misurala, poi chiedi di nuovo.
    [below-already] la libera è già a { $needed } { $unit } o sotto, quanto chiede il suo pH. Manda l’analisi per una dose.
   *[no-rate] ancora nessuna previsione. Per le vasche non c’è un calo in archivio, e per il suo servono { $fewest } analisi dopo l’ultima aggiunta; { $number ->
        [one] ce n’è { $count }
       *[many] ce ne sono { $count }
    }.
}
forecast-unlanded = { $vessel }: dopo l’ultima aggiunta non è ancora misurata. Prima misura la libera.
blend-share = { $vessel } con { $other }: { $starts ->
    [as-it-is] così com’è { $vessel } è nei limiti; può entrare { $other } fino a { $most } %.
   *[other] da { $least } a { $most } % di { $other } nel taglio.
}{ $volume ->
    [none] {""}
   *[other] {" "}Il minimo è { $volume } di { $other } su tutta { $vessel }{ $enough ->
        [no] ; ma ne tiene solo { $held }.
       *[yes] .
    }
}
blend-candidates = Altre che porterebbero { $vessel } nei limiti, prima quella che ne vuole meno:
blend-candidate = { $other }: { $least }–{ $most } %{ $volume ->
    [none] {""}
   *[other] , almeno { $volume }{ $enough ->
        [no] {" "}(ne tiene { $held })
       *[yes] {""}
    }
}
blend-nobody = { $any ->
    [none] Nessun’altra vasca di quel colore è finita e ha la libera in archivio, quindi niente da tagliare con { $vessel }.
   *[other] Nessuna delle altre { $count } vasche con un’analisi porta { $vessel } nei limiti.
}
blend-fails = { $vessel } con { $other }: nessuna parte va bene: { $fails ->
    [total] la totale resta oltre il limite.
    [free] la libera resta oltre il limite.
    [molecular] la molecolare resta fuori dai limiti.
   *[unmeasured] di uno dei vini manca una misura.
}
blend-figures = Con la libera in archivio: { $list }.
blend-figure = { $vessel } { $free } ({ $day })
blend-bounds = Limiti rispettati: { $list }.
blend-bound-total = totale al massimo { $limit }
blend-bound-no-total = niente totale (una non è misurata)
blend-bound-free = libera al massimo { $limit }
blend-bound-molecular = molecolare { $least ->
    [none] al massimo { $most }
   *[other] { $least }–{ $most }
}, al peggiore dei due pH
blend-bound-no-ph = niente molecolare (un pH non è misurato)
blend-whole = Tutte e due intere, { $volume }: { $free ->
    [none] libera non nota
   *[other] libera { $free }
}, { $total ->
    [none] totale non nota
   *[other] totale { $total }
}, prima che la combinazione si muova.
blend-care = Il pH di un taglio non lo calcolo: mescola un bicchiere in quella proporzione, misura pH, libera e totale, poi decidi. Contano anche gli altri limiti dei due vini.
too-much-head = { $vessel }: { $free ->
    [none] libera non misurata
   *[other] libera { $free }
}{ $total ->
    [none] {""}
   *[other] , totale { $total }
}{ $molecular ->
    [none] {""}
   *[other] , molecolare { $molecular }
}. Prima rimisura: spesso una cifra è sbagliata.
too-much-wait = Aspettare: { $container ->
    [barrel] le barrique perdono { $least }–{ $most } mg/L di libera al mese (pratica comune, senza fonte).
    [bottle] le bottiglie la perdono in anni; non si può togliere niente.
   *[tank] per le vasche non c’è un calo in archivio; le barrique perdono { $least }–{ $most } mg/L di libera al mese (pratica comune, senza fonte).
} La totale cala appena.
too-much-air = Aria, un travaso all’aperto: 1 mg/L di ossigeno ne toglie fino a { $each } mg/L (teoria), un vino saturo d’aria { $low }–{ $high } (un articolo amatoriale). Il vino invecchia.
too-much-blend = Un taglio abbassa anche la totale: taglio { $vessel }
too-much-peroxide = Perossido: { $says ->
    [listed] nell’elenco dell’Australia, al massimo { $left } mg/L residui (AWRI, allora).
    [not-listed] non ammesso nell’UE (AWRI, allora).
    [old-text] una vecchia tabella USA lo dà per usi ristretti; da verificare (27 CFR 24.246, 24.247).
   *[none] nessun testo del tuo mercato in archivio.
} Chiedi prima all’autorità e a un enologo qualificato; io non do quantità.
