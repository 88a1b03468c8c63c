### What we say, in German. Figures come in as finished text; names of additives, stages and codes as ids.
### A line is one thing; a phone shows about 45 letters of it in a row. Cellar people say du to each other.

## Pieces that other sentences use

list-separator = {", "}
barrel-name = Fass
cautions-separator = {" "}
dose-in-all-separator = {" und "}
cautions-of-separator = {" "}
assumed-separator = {"; "}

additive =
    { $additive ->
        [potassium-metabisulfite] Kaliumdisulfit E 224
        [sodium-metabisulfite] Natriumdisulfit E 223
        [potassium-metabisulfite-solution] Kaliumdisulfit-Lösung
        [sodium-metabisulfite-solution] Natriumdisulfit-Lösung
        [potassium-bisulfite-solution] Kaliumbisulfit-Lösung E 228
        [ammonium-bisulfite-solution] Ammoniumbisulfit-Lösung
        [sulfur-dioxide-solution] SO2-Lösung in Wasser
        [sulfur-dioxide-gas] SO2-Gas E 220
        [tablet] Brausetabletten
       *[other] Schwefelmittel
    }
stage-now =
    { $stage ->
        [must] Most
        [fermenting] gärt noch
        [malolactic] BSA steht noch aus
        [base] Grundwein
        [bottled] abgefüllt
       *[finished] Gärung und BSA vorbei
    }
weigh =
    { $vessel ->
        [none] Abwiegen:
       *[other] { $vessel }: abwiegen:
    }
measure =
    { $vessel ->
        [none] Abmessen:
       *[other] { $vessel }: abmessen:
    }
take =
    { $vessel ->
        [none] Nimm
       *[other] { $vessel }: nimm
    }
at =
    { $vessel ->
        [none] {""}
       *[other] { $vessel }:{" "}
    }
for-each =
    { $count ->
        [one] {""}
       *[other] {" "}je Gebinde
    }
target =
    { $kind ->
        [molecular] { $value } molekular
        [free] { $value } frei
       *[add] + { $value }
    }

## The first line: a dose

tablet-word =
    { $unit ->
        [tablet] Tablette
       *[tablets] Tabletten
    }
tablets-of =
    { $additive ->
        [tablet] { $amount } Brause{ $unit ->
            [tablet] tablette
           *[tablets] tabletten
        } (je { $size } g SO2)
       *[other] { $amount } { tablet-word } { additive } zu { $size } g
    }
measured =
    { $unit ->
        [tablet] { tablets-of }{ for-each }
        [tablets] { tablets-of }{ for-each }
        [solution] { $amount } { additive } { $strength } %{ for-each }
       *[other] { $amount } { additive }{ for-each }
    }
bare-amount =
    { $unit ->
        [tablet] { $amount } { tablet-word }{ for-each }
        [tablets] { $amount } { tablet-word }{ for-each }
       *[other] { $amount }{ for-each }
    }
dose-weigh = { at }{ measured } abwiegen
dose-measure = { at }{ measured } abmessen
dose-tablets = { take } { measured }
dose-gas = { at }{ $amount } SO2-Gas{ for-each } abwiegen: nur geschulte Leute, Atemschutz griffbereit, nur nach Gewicht
dose-in-all = Für alle { $count }: { $list }.
in-all-stock = { $amount } von der Lösung mit { $strength } %
dose-tablet-too-large = { at }eine halbe Tablette{ for-each } ist schon zu viel.
dose-tablets-give = Die Tabletten allein bringen { $gives } von { $wanted } { $unit }.
dose-stock = Oder { $amount } einer Stammlösung davon mit { $strength } %{ for-each }.
dose-only-stock = { at }{ $amount } { additive } { $strength } %{ for-each } abmessen
dose-rest-as-stock = Der Rest: { $amount } { additive } { $strength } %{ for-each }.
dose-negligible = { at }keine Zugabe lohnt sich (es fehlen { $short }).
dose-too-fine = { at }zu wenig zum Wiegen oder Messen (es fehlen { $short }): setz eine schwächere Lösung an.
dose-gas-too-little = { at }{ $amount } ist für Gas zu wenig: nimm eine Lösung.
dose-bottled = { at }abgefüllt: dafür müsste jede Flasche auf. Frag erst nach.
refused-ammonium = { at }Ammoniumbisulfit ist nur für Trauben und Most (OIV): nicht für diesen Wein; frag erst nach.
refused-ammonium-must =
    { $stage ->
        [assumed] Gerechnet als Wein, dessen Gärung vorbei ist. Ist es Most? Dann schreib alles neu, mit dem Wort Most.
       *[said] Ist es Most? Dann schreib alles neu, mit dem Wort Most.
    }
dose-nothing = { at }nichts zuzugeben.
dose-rate = { at }{ $dose } SO2 fehlen, das sind { measured } pro { $per }
dose-rate-bare = { at }{ $dose } SO2 fehlen
dose-need = { at }für { $molecular } molekular bei pH { $ph } braucht es { $free } frei
dose-now = { at }jetzt { $molecular } molekular (pH { $ph }, { $free } frei)

## The law

law-of =
    { $region ->
        [oiv] OIV
        [eu] EU
        [uk] Vereinigtes Königreich
        [us] USA
        [ca] Kanada
        [ca-qc] Québec
        [au] Australien
        [nz] Neuseeland
        [za] Südafrika
        [ar] Argentinien
        [cl] Chile
        [br] Brasilien
        [jp] Japan
        [kr] Korea
        [cn] China
        [codex] Codex
        [ch] Schweiz
        [ge] Georgien
        [hk] Hongkong
        [eaeu] Eurasische Union
        [uy] Uruguay
        [in] Indien
        [md] Moldau
       *[mercosur] Mercosur
    }
law-decides =
    { $region ->
        [oiv] ; es gilt das Recht deines Landes
       *[other] {""}
    }
rule-sugar =
    { $band ->
        [under] {" "}unter { $high } g/L Zucker
        [to] {" "}bis { $high } g/L Zucker
        [from] {" "}ab { $low } g/L Zucker
        [above] {" "}über { $low } g/L Zucker
        [between] {" "}{ $low } bis { $high } g/L Zucker
       *[none] {""}
    }
rule-class =
    { $class ->
        [sweet-300] , süß mit Sondergrenze
        [sweet-350] , süß mit Sondergrenze
        [sweet-400] , süß mit Sondergrenze
        [national-pdo] , gU
        [national-pdo-dry] , gU trocken
        [national-pdo-other] , gU nicht trocken
        [dry] , trocken
        [sweet] , süß
        [bulk-export] , Fasswein für den Export
        [made-with-organic] , aus Bio-Trauben
       *[none] {""}
    }
rule-what =
    { $what ->
        [red] Rotwein
        [pale] Weißwein oder Rosé
        [white] Weißwein
        [quality-sparkling] Qualitätsschaumwein
        [other-sparkling] anderer Schaumwein
        [fortified] Likörwein
        [cider] Apfelwein
        [mead] Met
        [fruit-wine] Fruchtwein
        [alcohol-free] Wein ohne Alkohol
       *[wine] Wein
    }{ $organic ->
        [yes] {" "}(Bio)
       *[no] {""}
    }{ rule-sugar }{ rule-class }
rule-short = { law-of }, { rule-what }
dose-capped =
    { $of ->
        [free] { $list }, nicht mehr: frei dann bis { $after }, Grenzwert { $limit } { $unit } frei ({ rule-short }).
       *[total] { $list }, nicht mehr: gesamt dann { $least ->
            [yes] mindestens{" "}
           *[no] {""}
        }{ $after }, Grenzwert { $limit } { $unit } ({ rule-short }).
    }
round-capped =
    { $of ->
        [free] { at }frei dann bis { $after }, Grenzwert { $limit } { $unit } frei ({ rule-short }).
       *[total] { at }gesamt dann { $least ->
            [yes] mindestens{" "}
           *[no] {""}
        }{ $after }, Grenzwert { $limit } { $unit } ({ rule-short }).
    }
dose-at-limit =
    { $least ->
        [yes] { at }miss vorher die gesamte SO2: sie ist schon mindestens { $now }, und damit wäre der Grenzwert { $limit } { $unit } überschritten ({ rule-short }).
       *[no] { at }jetzt kein Schwefel, { $standing ->
            [over] schon über dem Grenzwert
           *[at] schon am Grenzwert
        }: { $of ->
            [free] frei { $now }, Grenzwert { $limit } { $unit } frei ({ rule-short }).
           *[total] gesamt { $now }, Grenzwert { $limit } { $unit } ({ rule-short }).
        }
    }
dose-over-already = So darf er nach diesem Recht nicht verkauft werden{ law-decides }: frag, wer für den Wein verantwortlich ist.
law-assumed = Unbekannt, für den Grenzwert also am strengsten: { $list }.
law-unknown =
    { $code ->
        [colour-assumed] Farbe
        [sugar-assumed] Zucker
        [sparkling-class-assumed] Klasse des Schaumweins
       *[density-assumed] Dichte
    }
dose-capped-kept =
    { $reserve ->
        [none] { $kept } { $unit } bleiben darunter frei, denn so weit kann ein Messwert ({ $of ->
            [free] frei
           *[total] gesamt
        }) daneben liegen. Dein Ziel läge darüber.
       *[some] { $kept } { $unit } bleiben darunter frei: { $error }, denn so weit kann ein Messwert ({ $of ->
            [free] frei
           *[total] gesamt
        }) daneben liegen, { $reserve } für die Füllung. Dein Ziel läge darüber.
    }
full-dose-asks =
    { $of ->
        [free] { at }frei könnte { $after } werden, über dem Grenzwert { $limit } { $unit } frei ({ rule-short }). Die Zahlen trotzdem?
       *[total] { at }gesamt wäre { $least ->
            [yes] mindestens{" "}
           *[no] {""}
        }{ $after }, über dem Grenzwert { $limit } { $unit } ({ rule-short }). Die Zahlen trotzdem?
    }
full-dose-care = So darf der Wein nach diesem Recht nicht verkauft werden. Das Kellerbuch hält fest, dass es bekannt war. Keine Rechtsberatung: klär es für deinen Markt.
full-dose-left = Gelassen: es bleibt bei der kleineren Dosis.
full-dose-none = Oben steht keine Dosis, die über einen Grenzwert ginge.
button-full-dose = Volle Dosis
button-all-the-same = Ja, trotzdem
over-rule-noted = ⚠ Das liegt über dem Grenzwert ({ rule-short }): so steht es auch im Kellerbuch.
over-rule = über dem Grenzwert ({ rule-short })
total-sum = gesamt { $total } ({ $measured } gemessen { $day } + { $since } seither zugegeben)
limit-is =
    { at }{ $operator ->
        [below] unter
       *[at-most] höchstens
    } { $limit } { $unit } { $of ->
        [free] freie
       *[total] gesamte
    } SO2: { rule-short }{ $written ->
        [same] {""}
       *[other] , im Text { $value } { $law_unit }
    }{ $density ->
        [none] {""}
       *[other] {" "}(bei Dichte { $density })
    }{ $uplift ->
        [none] {""}
       *[other] , davon { $uplift } für das Ausnahmejahr
    }.
limit-room =
    { $standing ->
        [over] Jetzt { $of ->
            [free] frei
           *[total] gesamt
        } { $now }: { $room } { $unit } darüber.
       *[room] Jetzt { $of ->
            [free] frei
           *[total] gesamt
        } { $now }: Platz für { $room } { $unit }; { $left }, wenn { $kept } darunter frei bleiben.
    }
limit-amount = { $left } mg/L in { $volume }: { bare-amount } { additive }.
limit-text =
    { $text }{ $provision ->
        [none] {""}
       *[other] , { $provision }
    }{ $version ->
        [none] {""}
       *[other] {" "}({ $version })
    }: { $checked ->
        [law-text] im Gesetzestext gelesen
        [law-copy] in einer Abschrift des Gesetzes gelesen
        [agency] auf der Seite der Behörde gelesen
        [foreign-agency] auf der Seite einer ausländischen Behörde gelesen
        [trade-guide] in einem Branchenleitfaden gelesen
        [secondary] in einer zweiten Quelle gelesen
       *[memory] aus dem Gedächtnis, also unbestätigt: macht keine Dosis kleiner
    }.
limit-none =
    { at }kein Grenzwert hinterlegt: { law-of }, { $product ->
        [still] Wein
        [sparkling] Schaumwein
        [quality-sparkling] Qualitätsschaumwein
        [other-sparkling] Schaumwein
        [fortified] Likörwein
        [fruit-wine] Fruchtwein
        [alcohol-free] Wein ohne Alkohol
        [cider] Apfelwein
        [mead] Met
       *[other] { $product }
    }{ $reason ->
        [not-found] {" "}(gesucht, nicht gefunden)
       *[other] {""}
    }. Ich rate nicht: schlag es für deinen Markt nach.
limit-notes = Hinweis: { $list }.
limit-notes-separator = {"; "}
law-note =
    { $code ->
        [recommends-only] die OIV empfiehlt nur, es gilt das Recht deines Landes
        [other-value-told] anderswo steht ein anderer Wert
        [boundary-open] der Text lässt genau diesen Zuckerwert offen, die strengere Seite gilt hier
        [boundary-told-otherwise] die gelesene Seite zieht diese Grenze auf der anderen Seite
        [dry-undefined] trocken und süß stehen ohne Zahl da
        [band-misprinted] im Blatt ist die Spanne verkehrt herum gedruckt
        [by-reference] durch Verweis auf den EU-Text
        [derived] zwei gelesene Werte, voneinander abgezogen
        [combined-as-total] im Text steht gebunden, als gesamt genommen
        [from-seven-percent] für Wein ab 7 %
        [bulk-has-less] Fasswein für den Export hat einen niedrigeren Grenzwert
        [stacks-on-general] der allgemeine Grenzwert gilt daneben
        [sugar-assumed] Zucker unbekannt, am strengsten genommen
        [colour-assumed] Farbe unbekannt, am strengsten genommen
        [sparkling-class-assumed] Klasse des Schaumweins unbekannt, die strengere genommen
        [density-assumed] Dichte unbekannt, mit 0,990 gerechnet (schreib: Dichte 0,995)
        [designation-not-on-file] zu dieser Bezeichnung ist nichts hinterlegt
        [no-uplift] hier gibt es im Ausnahmejahr nicht mehr
        [organic-not-on-file] kein Bio-Grenzwert hinterlegt, der allgemeine gilt hier
        [repealed] { $value } { $unit } wurde aufgehoben und zählt nicht
        [other-unit-told] eine andere Quelle nennt { $value } { $unit }
       *[second-value-told] anderswo steht { $value } { $unit }, aus dem Gedächtnis
    }
limit-care = Keine Rechtsberatung: klär es für deinen Markt.
designation-asked =
    Süßwein mit eigener Sondergrenze ({ law-of })? Das schließe ich nie selbst: sag es, { $wine ->
        [none] mit: Sondergrenze 300
       *[other] so: { $wine } Sondergrenze 300
    }

## The first line: a choice and not a dose

choice-head = { at }eine Wahl, keine Dosis: bei pH { $ph } braucht es für { $target } molekular { $free } frei.
choice-leave = { $mark } So lassen: { $free } frei ist { $molecular } molekular.
choice-to =
    { $total ->
        [unknown] { $mark } Auf { $free } ({ $molecular } molekular): { measured }; gesamt unbekannt: erst messen
       *[known] { $mark } Auf { $free } ({ $molecular } molekular): { measured }
    }
choice-no-amount = – Auf { $free } ({ $molecular } molekular): keine Menge: gesamt ginge über { $limit } ({ law-of }).
choice-red =
    { $kind ->
        [none] Ist es Rotwein ({ $red } molekular), reichen { $free } frei: nichts zuzugeben.
        [over] Ist es Rotwein ({ $red } molekular), reichen { $free } frei: keine Menge, gesamt ginge über { $limit } ({ law-of }).
       *[other] Ist es Rotwein ({ $red } molekular), reichen { $free } frei: { bare-amount }.
    }
ways-out = Oder: kühler, sauberer, öfter prüfen; Säure für tieferen pH: frag Fachleute.

## The stage

bottling-no-oxygen = Sauerstoff ist nicht eingerechnet. Miss ihn, gelöst und im Kopfraum, und häng ihn an: Sauerstoff 2 mg/l
bottling-takes = { $oxygen } mg/L Sauerstoff können davon { $loss } { $unit } nehmen ({ bottling-each }).
bottling-target = { $after } frei zur Füllung, also jetzt { $now }: { $oxygen } mg/L Sauerstoff können { $loss } { $unit } nehmen ({ bottling-each }).
bottling-each =
    { $each ->
        [formula] 4 zu 1, nach Formel
       *[other] { $each } zu 1, wie du sagst
    }
bottling-measured = In Zahlen aus der Praxis (nicht bestätigt) ist es { $each } zu 1: dann reichen { bare-amount }. So rechnen: Sauerstoff { $oxygen } mg/l mal { $each }
bottling-measured-none = In Zahlen aus der Praxis (nicht bestätigt) ist es { $each } zu 1: dann fehlt nichts. So rechnen: Sauerstoff { $oxygen } mg/l mal { $each }
condition-stage = Nur wenn BSA fertig oder nicht gewollt ist.
condition-red =
    { $kind ->
        [none] Ist es Rotwein ({ $red } molekular): nichts zuzugeben.
        [over] Ist es Rotwein ({ $red } molekular): { bare-amount }, auch über { $limit }.
       *[other] Ist es Rotwein ({ $red } molekular): { bare-amount }.
    }
no-dose-fermenting = { at }jetzt kein Schwefel, er gärt noch.
no-dose-malolactic = { at }jetzt kein Schwefel, der BSA steht noch aus.
no-dose-molecular = Jetzt { $molecular } molekular.
no-dose-why = Die Bakterien brauchen frei unter 5–10 und gesamt unter 30–40 mg/L (veröffentlicht für pH 3,3–3,5).
no-dose-why-fermenting = Schwefel wird jetzt sofort gebunden und schadet Hefe und Bakterien: die brauchen frei unter 5–10, gesamt unter 30–40 mg/L (veröffentlicht für pH 3,3–3,5).
no-dose-all-the-same = Trotzdem deine eigene Zahl? Frag, wer für den Wein verantwortlich ist, dann schreib alles neu: { whole-example }
figure-alone = „{ $text }“: in diesem Stadium nehme ich eine Zahl nur in einer ganzen Nachricht. Schreib: { whole-example }
whole-example = { $wine }{ in-all } { stage-word } { $adds } { $unit } zugeben
in-all =
    { $count ->
        [several] {" "}insgesamt
       *[one] {""}
    }
stage-word =
    { $stage ->
        [must] Most
        [fermenting] gärt noch
        [malolactic] im BSA
       *[base] Grundwein
    }

## What it does

effect-land = { $after } { $unit } frei, wenn nichts bindet; eher { $range } (meist bindet ein Drittel bis die Hälfte); morgen messen.
effect-land-molecular = Von { $molecularNow } auf { $molecular } molekular: { $after } { $unit } frei, wenn nichts bindet; eher { $range } (meist bindet ein Drittel bis die Hälfte); morgen messen.
effect-land-to-molecular = Auf { $molecular } molekular: { $after } { $unit } frei, wenn nichts bindet; eher { $range } (meist bindet ein Drittel bis die Hälfte); morgen messen.
effect-land-low = { $after } { $unit } frei, wenn nichts bindet; unter 10 frei kann viel oder alles binden: eher { $range }, miss, bevor du nochmal zugibst.
effect-land-small = Höchstens { $after } { $unit } frei: der Anstieg ist kleiner als der Messfehler.
effect-rise = Frei steigt um etwa { $range } { $unit } (meist bindet ein Drittel bis die Hälfte); morgen messen.
effect-must = Das meiste bindet während der Gärung: den Wein schützt es später nicht.
must-comes-back = Etwa ein Drittel ist später als gesamte SO2 wieder da: + { $total } { $unit } (deutscher Fachtext, 2012).
must-yeast = Hefe { $least } bis { $most } Stunden danach (üblich, ohne Quelle).
must-malolactic = Bis { $most } { $unit } vor dem Mahlen schaden dem BSA nicht (AWRI).
must-published =
    { $read ->
        [read] Veröffentlicht: { $list } ({ $source }).
       *[memory] Veröffentlicht: { $list } ({ $source }; aus dem Gedächtnis, nicht gelesen).
    }
must-none-published = Die hinterlegten Zahlen gelten für Trauben; für { fact-product } gibt es keine.
must-range =
    { $state ->
        [sound] { must-colour }gesund { $range }
        [damaged] { must-colour }leicht geschädigt { $range }
       *[rot] { must-colour }mit Fäulnis { $range }
    } { $unit }
must-colour =
    { $style ->
        [red] rot{" "}
       *[any] {""}
    }
must-say-state = Wie gesund ist das Lesegut? Sag gesund, leicht geschädigt oder faul, dann gibt es eine Zahl zur Wahl.
button-published = { $add } zugeben
effect-raise = + { $dose } { $unit }, wenn nichts bindet; meist bindet ein Drittel bis die Hälfte; morgen messen.
third-needs =
    { $third ->
        [more] ; bindet ein Drittel, braucht es die Hälfte mehr
       *[covered] {""}
    }
effect-allowance = Dosis × { $factor } für + { $percent } %: erreicht { $after } { $unit }, wenn höchstens { $covers } % binden{ third-needs }. Rechne mit { $range }; morgen messen.
effect-allowance-bare = Dosis × { $factor } für + { $percent } %: deckt { $covers } % Bindung{ third-needs }. Morgen messen.
effect-share = Dosis ÷ (1 − { $share }): erreicht { $after } { $unit }, wenn genau dieser Anteil bindet; rechne mit { $range }; morgen messen.
effect-share-bare = Dosis ÷ (1 − { $share }): stimmt, wenn genau dieser Anteil bindet; morgen messen.
other-as-share = Gingen stattdessen { $percent } % davon verloren (÷ { $divisor }): { bare-amount }.
other-as-allowance = Als Zuschlag von + { $percent } % (× { $factor }): { bare-amount }.
nothing-why = { $free } frei ist { $molecular } molekular bei pH { $ph }; das Ziel ist { target }.
nothing-why-free = { $free } frei; das Ziel ist { target }.

## An amount that is asked about, that went in, a stock

adds =
    { $number ->
        [many] { at }{ $list } bringen { $adds } SO2
       *[one] { at }{ $list } bringen { $adds } SO2
    }
adds-rate = { at }„{ $rate }“ ({ $ofAdditive } { additive }) bringt { $adds } SO2
amount = { $amount } { additive }
amount-solution = { $amount } { additive } { $strength } %
amount-SO2 = { $amount } SO2 aus { additive }
amount-tablets =
    { $size ->
        [none] { $amount } { tablet-word } { additive }
       *[other] { tablets-of }
    }
adds-rate-mass = In { $volume } sind das { $amount }.
ferment-stop =
    { $adds ->
        [none] Keine SO2-Dosis stoppt die Hefe sicher, und Flaschen können platzen: frag jemanden vom Fach.
       *[other] { $adds } stoppen die Hefe nicht sicher, Flaschen können platzen: frag jemanden vom Fach.
    }
ferment-stop-more = Dafür gebe ich keine Dosis. Bis dahin: kalt stellen, nichts dicht verschließen.
measure-tomorrow = Miss morgen die freie SO2, bevor du nochmal zugibst.
reading-read = { at }{ $list }.
solution-weigh = { $amount } { additive } abwiegen und mit Wasser auf { $volume } auffüllen.
solution-measure = { $amount } { additive } abmessen und mit Wasser auf { $volume } auffüllen.
solution-from-powder = Lösungen rechne ich nur aus Pulver: { $volume } KDS-Lösung 10% ansetzen
solution-strength = Diese Lösung hat { $strength } g SO2 in 100 mL.
solution-fresh = Frisch ansetzen, Datum drauf: sie wird in Tagen bis Wochen schwächer (üblich, ohne Quelle).
solution-per-barrel = In ein Fass von { $barrel } bringt 1 mL { $adds } mg/L; { $rise } mg/L brauchen { $amount }.
solution-us-water = Sie ist auch Wasser: in den USA höchstens 1 % des Weins, alle Zusätze zusammen (27 CFR 24.246).
solution-too-much = Nein: { $wanted } g/L lösen sich nicht sicher. Veröffentlicht für { additive } bei { $celsius } °C: { $least ->
        [none] { $most } g/L ({ $source }).
       *[other] { $least } und { $most } g/L ({ $source }).
    } Setz sie schwächer an.
solution-strengths = Ich rechne Lösungen von 1 bis 25 %. Veröffentlicht für Kaliumdisulfit bei 20 °C: 250 g/L (Food Additives Data Book, S. 780) und 450 g/L (eine Enzyklopädie).
solution-too-cold = Nein: { $wanted } g/L in Wasser von { $water } °C. Veröffentlicht sind { $most } g/L bei { $celsius } °C ({ $source }), für kälteres Wasser nichts. Nimm wärmeres Wasser oder setz sie schwächer an.
solution-colder = Unter { $celsius } °C ist keine Zahl veröffentlicht: schau, dass sich alles gelöst hat.
solution-holding = Konservierungslösung, { $volume }: { $acid } Zitronensäure, { $amount } { additive }.
solution-rinse = Spüllösung, { $volume }: { $acid } Zitronensäure, { $amount } { additive }.
solution-order = Erst alles Wasser, dann die Säure, zuletzt nach und nach das Sulfit. Nie Pulver auf Säure.
solution-air = SO2 wird frei: lüften, Gesicht weg vom Loch.
solution-for-holding = Fürs leere, saubere Fass, spundvoll; alle paar Wochen prüfen.
solution-for-rinse = Für sauberes Gerät: alles benetzen, ein paar Minuten wirken lassen.
solution-drain = Ablassen nach örtlichen Regeln; vor dem Wein mit Wasser spülen.
solution-practice = { $salt } und { $acid } g/L: üblich, ohne Quelle. Eigene Zahl: { $use ->
        [holding] Konservierungslösung { $litres } L KDS 1%
       *[rinse] Spüllösung { $litres } L KDS 1%
    }
solution-not-wine =
    { $vessel ->
        [none] Niemals in Wein.
       *[other] Niemals in Wein: { $vessel } muss leer sein. Dafür wird nichts eingetragen.
    }
ask-solution-volume =
    { $use ->
        [rinse] Wie viel Spüllösung setzt du an? In Litern oder mit Einheit: 20 L, 1 hl
        [holding] Wie viel Konservierungslösung? In Litern oder mit Einheit: 225 L, 3 hl
       *[stock] Wie viel setzt du an? In Litern oder mit Einheit: 5 L, 500 ml
    }
burning-sulfur-never = Schwefelschnitten und -scheiben sind nie eine Dosis für Wein: niemand weiß, wie viel davon hineinkommt. Keine Zahl von mir.
burning-sulfur-danger = Nur in leeren Fässern, nach Packung, örtlichen Regeln und geschulten Leuten. Nie nach Spirituosen (Feuer), nie ohne Lüftung, nie unbeaufsichtigt.
burning-sulfur-rather = Für ein leeres Fass lieber: Konservierungslösung 225 L. Für den Wein schick die Werte: pH, freie SO2, Volumen.

## What was read and what was assumed

basis-oiv = Nach der OIV-Tabelle für { $percent } %, { $celsius } °C (pK { $pK }).
basis-oiv-need = Nach der OIV-Tabelle für { $percent } %, { $celsius } °C (pK { $pK }); mit pK 1,81 wären { $free } frei nötig.
read = Gelesen: { $list }.
assumed = Angenommen: { $list }.
set-aside = Nicht verwendet: { $list }.
fact-volume = { $volume }
fact-volume-count = { $volume } in { $count } Gebinden
fact-ph = pH { $ph }
fact-free = frei { $free }
fact-total = gesamt { $total }
fact-temperature = { $celsius } °C
fact-alcohol = { $percent } % vol
fact-sugar = { $sugar } g/L Zucker
fact-figure = { $figure }
fact-allowance = + { $percent } % Zuschlag
fact-share = { $percent } % binden
fact-style = { $style ->
        [red] rot
        [white] weiß
       *[other] Rosé
    }
fact-category = { $category ->
        [sweet] süß
        [sparkling] Schaumwein
       *[fortified] Likörwein
    }
fact-product = { $product ->
        [cider] Apfelwein
        [mead] Met
        [alcohol-free] Wein ohne Alkohol
       *[fruit-wine] Fruchtwein
    }
fact-organic = Bio
fact-designated = Sondergrenze ({ $limit })
fact-uplift =
    { $declared ->
        [yes] Ausnahmejahr
       *[no] kein Ausnahmejahr
    }
fact-quality =
    { $quality ->
        [yes] Qualitätsschaumwein
       *[no] kein Qualitätsschaumwein
    }
fact-pdo = geschützter Ursprung (gU)
fact-bulk = Fasswein für den Export
fact-density = Dichte { $density } kg/L
fact-reserve = { $reserve } für die Füllung frei gehalten
fact-stage = { stage-now }
fact-target = Ziel { target }
fact-tablet =
    { $additive ->
        [tablet] Brausetabletten zu { $size } g SO2
       *[other] Tabletten { additive } zu { $size } g
    }
fact-strength =
    { $kind ->
        [assay] { additive }, { $strength } % als Reinheit
        [SO2-yield] { additive }, { $strength } % als SO2-Ausbeute genommen
        [salt-per-100mL] { additive }, { $strength } % = { $strength } g Salz in 100 mL
        [SO2-per-100mL] { additive }, { $strength } % = { $strength } g SO2 in 100 mL
       *[noted] { additive }, { $strength } %
    }
assumed-additive = reines { additive }
assumed-target = Ziel { target }
assumed-target-red = Ziel { target } (rot)
assumed-target-sweet = Ziel { target } (süß)
assumed-gallon = { $gallon ->
        [US] US-Gallonen
       *[imperial] englische Gallonen
    }
assumed-must = { $fruit } kg × { $yield } L/100 kg = { $volume }
assumed-must-usual = { $fruit } kg × { $yield } L/100 kg (eure übliche Ausbeute) = { $volume }
assumed-barrels =
    { $count ->
        [one] ein Fass von 225 L
       *[several] { $volume } bei 225 L je Fass
    }
note-free-unlabelled = „{ $text }“ ist freie SO2
note-ph-unlabelled = „{ $text }“ ist der pH
note-round-ph = Kommazahl allein ist der pH
note-round-free = Zahl allein ist freie SO2
note-volume-sum = „{ $text }“ zusammengezählt
note-strength-as-salt = die Stärke ist Gramm Salz in 100 mL; als SO2 wäre sie { $factor }-mal so stark
note-strength-as-SO2 = die Stärke ist Gramm SO2 in 100 mL
note-mass-beside-readings = „{ $text }“ sind Gramm, keine Gallonen
note-each-or-total = „{ $text }“ gilt für jedes
note-unread-words = nicht verstanden und übergangen: { $text }
set-aside-figure = { $text }

## The one question

ask-vessel = { at }welches Gebinde? Zum Beispiel: T4
ask-volume_L =
    { $unit ->
        [L] { at }welches Volumen{ of-each }? In Litern oder mit Einheit: 40 hl, 4000 L
        [hL] { at }welches Volumen{ of-each }? In Hektolitern oder mit Einheit: 4000 L
        [m3] { at }welches Volumen{ of-each }? In Kubikmetern oder mit Einheit: 40 hl
        [galUS] { at }welches Volumen{ of-each }? In US-Gallonen oder mit Einheit: 40 hl
        [galUK] { at }welches Volumen{ of-each }? In englischen Gallonen oder mit Einheit: 40 hl
       *[other] { at }welches Volumen{ of-each }? Mit Einheit: 225 L, 40 hl
    }
of-each =
    { $count ->
        [several] {" "}je Gebinde
       *[one] {""}
    }
ask-ph = { at }welcher pH? Zum Beispiel: 3,58
ask-free_mg_L = { at }wie viel freie SO2, in { $unit }? Zum Beispiel: 21
ask-target =
    { $usual ->
        [none] { at }was ist das Ziel? Für solchen Wein gibt es kein übliches. Zum Beispiel: auf 30 frei, 0,6 mol, 25 mg/l zugeben
       *[some] { at }was ist das Ziel? Zum Beispiel: auf 30 frei, 0,6 mol, 25 mg/l zugeben
    }
ask-target-stage =
    { $stage ->
        [must] { at }wie viele { $unit } willst du dem Most zugeben? Schreib alles neu: { whole-example }
        [base] { at }wie viele { $unit } willst du dem Grundwein zugeben? Schreib alles neu: { whole-example }
       *[other] { at }wie viele { $unit } willst du zugeben? Schreib alles neu: { whole-example }
    }
ask-tablet-additive = { at }aus welchem Salz sind die Tabletten? Es steht auf der Packung.
ask-additive = { at }welches Mittel ist es?
ask-strength_percent = { at }wie stark ist es, in %? Es steht auf dem Etikett. Zum Beispiel: { usual-strength }
usual-strength =
    { $named ->
        [potassium-metabisulfite] 96%
        [sodium-metabisulfite] 96%
        [sulfur-dioxide-solution] 6%
       *[other] 10%
    }
ask-tablet_salt_g = { at }wie viel Gramm wiegt eine Tablette? Es steht auf der Packung; 0,44 und 0,55 sind üblich.
ask-tablet_SO2_g = { at }wie viel Gramm SO2 gibt eine Brausetablette? Es steht auf der Packung.
ask-mass_g = { at }wie viel Gramm?
ask-mass-spoon = { at }wie viel Gramm? Ein gestrichener Teelöffel Pulver wiegt grob 5 bis 6 g, das ist zum Dosieren zu grob: nimm eine Waage.
ask-fruit = { at }wie viel Most, oder welche Ausbeute? Jeweils mit Einheit: 65 L/100 kg, oder: 1300 L
option = { $mark }) { $list }
target-of =
    { $vessel ->
        [none] Anderes Ziel.
       *[other] { $vessel }: anderes Ziel.
    }

## What cannot be answered as it stands

problem-ph-out-of-range = { at }„{ $about }“ kann kein Wein-pH sein (2,5 bis 4,8). Komma vergessen? Schreib: pH 3,58
problem-negative-value = { at }„{ $about }“ liegt unter null, das geht nicht. Schick die Zahl noch einmal ohne Minus.
problem-total-below-free = { at }gesamt liegt unter frei („{ $about }“). Vertauscht? Schreib: frei { $one } gesamt { $two }
problem-volume-not-positive = { at }ein Volumen „{ $about }“ gibt es nicht. Schreib: 55 hl
problem-unit-mismatch = { at }die Einheit passt nicht in „{ $about }“. Freie SO2 in mg/L oder ppm, Volumen in L oder hl.
problem-ambiguous-number =
    { $kind ->
        [split] { at }in „{ $about }“ steht eine Lücke. Schreib: pH { $one }
        [volume] { at }„{ $about }“ kann um das Tausendfache falsch sein. Schreib: { $one }, oder: { $two }
        [mass] { at }„{ $about }“ kann um das Tausendfache falsch sein. Schreib: { $one }, oder: { $two }
        [thousands] { at }„{ $about }“ kann um das Tausendfache falsch sein. Schreib: { $one }, oder: { $two }
        [powder] { at }„{ $about }“: SO2 oder Pulver? Schreib: { $one } mg/l SO2 zugeben, oder: { $two } g pro 10 L { $named }
        [salt] { at }„{ $about }“: SO2 oder Salz? Als SO2 wird es so stark nicht verkauft. Steht Salz auf dem Etikett, schreib: { salt-name } Salz { $one }%
        [water] { at }„{ $about }“: SO2 in Wasser oder eine Disulfit-Lösung? Schreib: schweflige Säure { $one }%, oder: KDS-Lösung { $one }%
        [SO2-percent] { at }„{ $about }“: Alkohol, SO2 in Wasser oder eine Disulfit-Lösung? Schreib: { $one }% vol, schweflige Säure { $one }%, oder: KDS-Lösung { $one }%
        [percent] { at }„{ $about }“: Alkohol oder Stärke einer Lösung? Schreib: { $one }% vol, oder: { stock-name }-Lösung { $one }%
        [degree] { at }„{ $about }“: Alkohol oder Temperatur? Schreib: { $one }% vol, oder: { $one } C
        [to] { at }„{ $about }“: ist { $two } das Ziel? Schreib: frei { $one }, Ziel { $two }
        [range] { at }„{ $about }“ sieht nach einer Spanne aus. Schreib eins davon: frei { $one }, oder: frei { $two }
        [pair] { at }„{ $about }“: frei und gesamt, oder ein Wert zwischen zwei Strichen? Schreib: frei { $one } gesamt { $two }, oder: frei { $one }
        [free] { at }„{ $about }“: freie oder gesamte SO2? Schreib: frei { $one }, oder: gesamt { $one }
        [aim] { at }„{ $about }“: zugeben oder erreichen? Schreib: { $one } mg/l zugeben, oder: Ziel { $one }
       *[other] { at }„{ $about }“ kann man verschieden lesen. Schreib dazu, was es ist: pH 3,58 frei 21 55 hl
    }
salt-name =
    { $named ->
        [ammonium-bisulfite-solution] Ammoniumbisulfit
       *[other] Kaliumbisulfit
    }
stock-name =
    { $named ->
        [sodium-metabisulfite] Natriumdisulfit
        [sodium-metabisulfite-solution] Natriumdisulfit
       *[other] KDS
    }
problem-each-or-total = { at }gilt „{ $about }“ für jedes oder für alle zusammen? Schreib: je { $about }, oder: { $about } insgesamt
problem-conflicting-values = { at }zwei Werte für dasselbe: „{ $about }“. Schick einen davon; zwei Weine kommen in zwei Zeilen.
problem-unknown-additive = { at }„{ $about }“ ist kein Schwefelmittel, das ich kenne. Ich kenne: Kalium- und Natriumdisulfit (Pulver, Lösung), Bisulfit, schweflige Säure, SO2-Gas, Tabletten.
problem-did-you-mean = { at }„{ $about }“ ist ein anderer Stoff. Meinst du Kaliumdisulfit (KDS)?
problem-strength-out-of-range = { at }die Stärke „{ $about }“ passt nicht zu diesem Mittel. Sieh aufs Etikett. Zum Beispiel: { usual-strength }
problem-value-out-of-range = { at }„{ $about }“ ist mehr, als ein Keller hat. Prüf Zahl und Einheit.
problem-not-understood = Das konnte ich nicht lesen. Schick Werte wie: T4 55 hl pH 3,58 frei 21. ? zeigt mehr.
problem-too-long = Zu lang, um es sicher zu lesen. Höchstens 25 Gebinde auf einmal, je eine Zeile.
problem-no-number =
    { $again ->
        [correction] Keine Dosis, bis das klar ist.
       *[whole] Keine Dosis, bis das klar ist. Schick die ganze Zeile noch einmal.
    }
problem-share = { at }„{ $about }“: ich rechne mit höchstens 4/5 (0,8), die binden.
problem-vessel-twice = { $vessel } steht zweimal da: schick es einmal.
problem-two-vessels = „{ $about }“: zwei Gebinde. Schick für jedes eine Zeile.
no-such-choice = { $text } gibt es hier nicht: a bis { $last }, oder den Namen.
no-such-button = { $text } gibt es hier nicht: 1 bis { $last }, oder die ganzen Werte.

## Warnings

warning-no-dose-at-this-stage = ⚠ { stage-now }: in dieses Stadium gehört keine Dosis; frag, wer für den Wein verantwortlich ist.
warning-stage-not-over =
    { $stage ->
        [malolactic] ⚠ Das stoppt oder verzögert den BSA: frag erst, wer für den Wein verantwortlich ist. { no-dose-why }
       *[fermenting] ⚠ Gärender Wein bindet es sofort, und es stoppt die Hefe nicht sicher: frag erst, wer für den Wein verantwortlich ist.
    }
warning-additive-not-permitted =
    { $reason ->
        [ammonium] ⚠ Ammoniumbisulfit ist nur für Trauben und Most (OIV): nicht für diesen Wein; frag erst nach.
        [organic] ⚠ Biowein bekommt nur SO2 und Kaliumsalze ({ law-of }, VO 889/2008): nicht dieses. Frag erst nach.
        [organic-none] ⚠ Wein mit Bio-Siegel bekommt gar kein zugesetztes Sulfit ({ law-of }, 7 CFR Part 205). Frag erst nach.
       *[sodium] { warning-sodium }
    }
warning-sodium =
    { $region ->
        [oiv] ⚠ Natriumdisulfit: viele Regeln verbieten es im Wein (OIV; EU und UK unbestätigt). Frag erst nach.
        [eu] ⚠ Natriumdisulfit ist in der EU nicht für Wein, nur für Gerät (unbestätigt). Frag erst nach.
        [uk] ⚠ Natriumdisulfit ist im Vereinigten Königreich nicht für Wein, nur für Gerät (unbestätigt). Frag erst nach.
        [ar] ⚠ Natriumdisulfit ist in Argentinien nicht für Wein: nur Kaliumsalze (INV 281/85). Frag erst nach.
       *[other] ⚠ Natriumdisulfit: für { law-of } wurde keine Liste gelesen, also unbestätigt; viele Regeln verbieten es im Wein. Frag erst nach.
    }
refused-organic =
    { $reason ->
        [organic-none] { at }kein Sulfit: Wein mit Bio-Siegel bekommt gar keins ({ law-of }, 7 CFR Part 205).
       *[organic] { at }nicht mit { additive }: Biowein bekommt nur SO2 und Kaliumsalze ({ law-of }, VO 889/2008).
    }
refused-organic-instead =
    { $reason ->
        [organic-none] Doch nicht Bio? Frag, wer für den Wein verantwortlich ist; dann streich den Eintrag, in dem es steht.
       *[organic] Schreib es stattdessen mit KDS. Keine Rechtsberatung: klär es für deinen Markt.
    }
limit-doubt =
    { $confidence ->
        [unconfirmed] , unbestätigt: aus dem Gedächtnis
       *[read] {""}
    }
warning-total-over-limit =
    { $total ->
        [known] ⚠ Damit wäre gesamt { $total_after_mg_L }, über { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: frag erst nach.
       *[at-least] ⚠ Damit wäre gesamt mindestens { $total_after_mg_L }, über { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: frag erst nach.
    }
warning-free-over-limit = ⚠ Frei könnte { $free_after_mg_L } erreichen, wenn nichts bindet, über dem Grenzwert { $limit_mg_L } { $unit } frei ({ rule-short }{ limit-doubt }){ law-decides }: frag erst nach.
warning-label-threshold =
    ⚠ Etikett ({ law-of }): Sulfite werden genannt { $comparator ->
        [more] über
       *[from] ab
    } { $threshold_mg_L } { $unit_of_law }{ $counts ->
        [added] {" "}zugesetzt
       *[total] {""}
    }{ limit-doubt }; gesamt wäre { $total_after_mg_L }.
warning-total-near-limit =
    { $total ->
        [known] ⚠ Gesamt wäre { $total_after_mg_L } { $unit }, nah am Grenzwert { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
       *[at-least] ⚠ Gesamt wäre mindestens { $total_after_mg_L } { $unit }, nah am Grenzwert { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
    }
warning-total-unknown = ⚠ Gesamte SO2 unbekannt: miss sie.
warning-total-unknown-most = ⚠ Gesamt unbekannt, miss es: für diese Dosis darf es heute höchstens { $most_total_mg_L } { $unit } sein, Grenzwert { $limit_mg_L } ({ rule-short }){ law-decides }.
warning-no-limit-on-file =
    { $region ->
        [oiv] ⚠ Für solchen Wein kenne ich keinen Grenzwert: schlag das Recht deines Landes nach.
       *[other] ⚠ Kein Grenzwert hinterlegt ({ law-of }): schlag ihn für deinen Markt nach.
    }
warning-limit-unconfirmed =
    { $region ->
        [oiv] ⚠ Der Grenzwert ist unbestätigt: schlag das Recht deines Landes nach.
       *[other] ⚠ Grenzwert { $limit_mg_L } { $unit } { $of ->
            [free] frei
           *[total] gesamt
        } ({ rule-short }): unbestätigt, aus dem Gedächtnis. Schlag ihn für deinen Markt nach.
    }
warning-addition-large = ⚠ { $dose_mg_L } { $unit } auf einmal ist viel: prüf Volumen und Einheit.
warning-free-needed-high = ⚠ { $target_free_mg_L } { $unit } frei ist viel: halt ihn kühler, sauberer, prüf öfter; oder tieferer pH, mit Beratung.
warning-molecular-above-2 = ⚠ Über 2 { $unit } molekulare SO2 riecht und schmeckt man.
warning-free-low-may-bind-all = ⚠ Unter 10 frei kann viel oder alles binden: miss, bevor du nochmal zugibst.
warning-ph-unusual = ⚠ pH { $ph } ist für Wein ungewöhnlich: prüf das Messgerät.
warning-basis-fallback = ⚠ Die OIV-Basis braucht Alkohol und 20–40 °C: mit pK 1,81 gerechnet.
warning-basis-fallback-change = ⚠ Die OIV-Basis braucht Alkohol und 20–40 °C: mit pK 1,81 gerechnet. Nach OIV bei { $compared_at_alcohol_percent } %, { $compared_at_temperature_C } °C wären es etwa { $change } { $unit } { $direction ->
    [more] mehr.
   *[less] weniger.
}
warning-malolactic-may-not-start =
    { $above ->
        [free] ⚠ Frei { $free_mg_L } liegt über { $free_ceiling_high_mg_L } { $unit }: der BSA startet vielleicht nicht (AWRI, für pH 3,3–3,5).
        [total] ⚠ Gesamt { $total_mg_L } liegt über { $total_ceiling_high_mg_L } { $unit }: der BSA startet vielleicht nicht (AWRI, für pH 3,3–3,5).
       *[both] ⚠ Frei { $free_mg_L } liegt über { $free_ceiling_high_mg_L }, gesamt { $total_mg_L } über { $total_ceiling_high_mg_L } { $unit }: der BSA startet vielleicht nicht (AWRI, für pH 3,3–3,5).
    }
warning-restart-may-fail = ⚠ { $molecular_mg_L } { $unit } molekular bremst die Hefe: ab { $held_back_molecular_mg_L } kann ein Neustart misslingen (üblich, ohne Quelle).
warning-must-may-hinder-malolactic = ⚠ Über { $malolactic_unharmed_mg_L } { $unit } im Most kann es den BSA behindern (AWRI).
warning-rounding-coarse = ⚠ Was die Waage zeigt, liegt hier um { $rounding_mg_L } { $unit } daneben: nimm eine feinere oder eine Lösung.
warning-already-dosed = ⚠ Hier wurde erst vor Kurzem geschwefelt.

## Cautions

cautions = ⚠ { $list }
caution-trained-people-with-breathing-apparatus = Nur geschulte Leute, Atemschutz griffbereit.
caution-grapes-and-must-only = Nur für Trauben und Most.
caution-ventilate = Lüften.
caution-never-lean-in = Nie in den Tank beugen.
caution-gloves-goggles = Handschuhe, Schutzbrille.
caution-no-acid-no-chlorine = Nie mit Säure oder Chlorreiniger.
caution-no-other-acid-no-chlorine = Keine andere Säure, kein Chlorreiniger.
caution-asthma = Nicht für Asthmatiker.
caution-crush-first = Zerdrücken, in wenig Wein oder Wasser lösen.
caution-dissolve-first = Erst in etwas Wein oder Wasser lösen.
caution-foams-with-carbon-dioxide = Wein voller CO2 schäumt über.
caution-mix-and-measure-again = Mischen, nach einem Tag messen.
caution-label-and-rules-first = Etikett, Vorschriften, Fachleute gehen vor.
cautions-of = ⚠ { additive }: { $list }
cautions-short = ⚠ Vorsicht wie vorhin: Knopf Sicherheit.

## Chat

chat-greeting = Hallo. Schick mir Werte, zum Beispiel: T4 55 hl pH 3,58 frei 21. ? zeigt mehr.
chat-thanks = Gern. Miss morgen noch einmal.
chat-other = Ich rechne Schwefelgaben aus. Schick Werte, zum Beispiel: T4 55 hl pH 3,58 frei 21. ? zeigt mehr.
still-asked = Eins fehlt noch.
chat-negated = Also nichts zugegeben. Nichts einzutragen.
chat-help-what = Schick Werte, du bekommst die Schwefelgabe.
chat-help-dose = T4 55 hl pH 3,58 frei 21
chat-help-dose-means = → was abzuwiegen ist
chat-help-effect = 100 g KDS in 20 hl
chat-help-effect-means = → was eine Menge bringt
chat-help-solution = 5 L KDS-Lösung 10% ansetzen
chat-help-solution-means = → wie man eine Lösung ansetzt
chat-help-fields = Reihenfolge egal; auch gesamt, rot, 13,5%, Ziel 35, +25 ppm, +30%, Natriumdisulfit. Mehrere Tanks: je eine Zeile.
chat-help-topics = Mehr: Hilfe und eins von { $list }.
chat-help-care = Etikett, örtliche Regeln und Fachleute gehen vor.

## Help by topic: each a screen of messages to send; `help-<topic>-…` in the order in which they are said

help-wine-1 = Reihenfolge egal: Gebinde, Volumen, pH, freie SO2.
help-wine-2 = T4 55 hl pH 3,58 frei 21 weiß → was abzuwiegen ist
help-wine-3 = T4 40 hl 3,6/18/60 13,5% 14 C → pH, freie und gesamte SO2
help-wine-4 = T4 40 hl pH 3,5 frei 18 0,6 molekular → auf einen eigenen Wert; oder Ziel 36
help-wine-5 = T4 40 hl 25 ppm zugeben → eine feste Gabe
help-wine-6 = T4 40 hl pH 3,5 frei 18 +30% → mehr für das, was bindet; oder: ein Drittel bindet
help-wine-7 = T4 40 hl pH 3,5 frei 18, KDS-Lösung 10% → aus einer Lösung; auch Natriumdisulfit, schweflige Säure 6%
help-wine-8 = 100 g KDS in 20 hl → was eine Menge bringt
help-wine-9 = Rot, Rosé, süß, Apfelwein, Met, Bio; Most, gärt noch, BSA fertig: schreib dazu, was es ist, sonst sagt die Antwort, was sie annahm.
help-must-1 = Für Most gibt es keine übliche Zahl: ich nenne Veröffentlichtes, du wählst.
help-must-2 = Most 20 hl gesund → Zahlen zur Wahl; auch: leicht geschädigt, faul
help-must-3 = Most 20 hl 40 mg/l zugeben → was für 40 mg/L zu wiegen ist
help-must-4 = 2 t Trauben 65 L/100 kg gesund → nach Gewicht und Ausbeute
help-must-5 = 5 t Trauben 70 L/100 kg 50 mg/l zugeben → dasselbe mit eigener Zahl
help-must-6 = Ausbeute 65 → die übliche Ausbeute, Liter aus 100 kg
help-must-7 = Das meiste bindet: es schützt später nicht, und etwa ein Drittel ist als gesamte SO2 wieder da.
help-bottling-1 = Was jetzt da sein muss, damit das Ziel hält, wenn der Sauerstoff sein Teil genommen hat.
help-bottling-2 = Füllung T4 40 hl pH 3,4 frei 22 Sauerstoff 2 mg/l → 4 SO2 auf 1 Sauerstoff, nach Formel
help-bottling-3 = Füllung T4 40 hl pH 3,4 frei 22 Sauerstoff 2 mg/l mal 2,5 → mit eigener Zahl
help-bottling-4 = T4 40 hl pH 3,4 frei 22 gesamt 90 Reserve 20 für die Füllung → Platz unter dem Grenzwert
help-bottling-5 = T4 im BSA pH 3,4 frei 25 gesamt 60 → ob der BSA startet; auch Gärstockung: ein Neustart
help-bottling-6 = Sauerstoff: gelöst und im Kopfraum zusammen, in mg/L Wein.
help-solutions-1 = Lösungen in Wasser: keine ist eine Dosis für Wein, und nichts davon kommt ins Kellerbuch.
help-solutions-2 = 5 L KDS-Lösung 10% ansetzen → was zu wiegen ist, wie stark sie ist, mL für ein Fass
help-solutions-3 = 1 L KDS-Lösung 10% ansetzen, 30 ppm zugeben → die mL für ein Fass von 225 L
help-solutions-4 = 10 g KDS in 100 mL Wasser → wie stark das ist
help-solutions-5 = Konservierungslösung 225 L → für ein leeres Fass; auch: Konservierungslösung für 3 Fässer
help-solutions-6 = Spüllösung 20 L → für sauberes Gerät; eigene Stärke: Spüllösung 20 L KDS 1%
help-solutions-7 = Schwefelschnitten: nie eine Dosis für Wein, und keine Zahlen von mir.
help-law-1 = Jede Dosis wird an den Grenzwerten deines Marktes geprüft. Keine Rechtsberatung: klär es für deinen.
help-law-2 = Recht EU → auch US, UK, OIV, CH, CA, JP …; für den ganzen Keller
help-law-3 = Grenzwert T4 → Regel, Text, wie geprüft, Platz darunter
help-law-4 = Grenzwert rot RZ 3 EU → ohne Gebinde
help-law-5 = T4 rot → Farbe und Zucker (RZ 3 beim Messwert) entscheiden; Unbekanntes zählt am strengsten
help-law-6 = T4 bio → auch Qualitätsschaumwein, gU, Fasswein, Dichte 0,992
help-law-7 = T4 Sondergrenze 300 → ein Süßwein mit eigenem Grenzwert; auch T4 Ausnahmejahr
help-law-8 = T4 Reserve 30 für die Füllung → bleibt unter dem Grenzwert frei, dazu 15 für den Messfehler
help-law-9 = Darüber kommt erst die kleinere Dosis: volle Dosis, dann ja. Das Kellerbuch hält es fest.
help-round-1 = Viele Gebinde in einer Nachricht, je eine Zeile; was für alle gilt (KDS, Ziel 30), in die erste. Ein Tipp trägt alles ein, oder Zeile für Zeile.
help-round-2 = T1 20 hl pH 3,4 frei 18 → als eine Zeile davon; ich zähle zusammen, was zu holen ist
help-round-3 = Runde → alle Zeilen noch einmal
help-round-4 = Blatt xlsx → zum Mitnehmen; auch Blatt csv, Blatt Bild
help-round-5 = B1-B24 225 L pH 3,6 frei 18 → eine Dosis je Fass, ein Eintrag für jedes
help-round-6 = B1-B24 ohne B7 225 L pH 3,6 frei 18 → alle bis auf eins
help-round-7 = 34 Fässer, Mischprobe: pH 3,6 frei 18 → fürs Mittel, und was das verdeckt
help-round-8 = Oder schick CSV oder XLSX: Gebinde, Volumen, pH, freie SO2. Das Blatt kommt zurück.
help-stock-1 = Jede Gabe wird abgebucht, sobald etwas im Bestand ist.
help-stock-2 = erhalten 25 kg KDS Charge 4471 von Nordbedarf → auch 10 L schweflige Säure 6%
help-stock-3 = Bestand → was da ist, nach Charge; Bestand KDS: eins davon
help-stock-4 = Bestand KDS 3,2 kg → im Regal gezählt: gilt ab dann
help-stock-5 = verbraucht 200 g KDS zum Spülen → für keinen Wein
help-stock-6 = entsorgt 1 kg KDS weil verklumpt → weggeworfen
help-stock-7 = zugegeben 82 g KDS T4 Charge 4471 → aus dieser Charge; sonst die älteste
help-stock-8 = Export Bestand → Eingänge, Lieferanten, Chargen und Reste fürs Büro
help-log-1 = Nichts wird gelöscht; Korrekturen stehen neben dem, was sie korrigieren.
help-log-2 = zugegeben 82 g KDS T4 → eingetragen; auch ppm, mL, gestern 17:00, Charge 4471, Notiz: …
help-log-3 = T4 jetzt frei 28 gesamt 96 → ein Messwert, ohne Dosis
help-log-4 = Auftrag T4 256 g KDS → für andere; offen zeigt, was noch nicht erledigt ist
help-log-5 = heute → was heute eingetragen wurde; auch gestern, 12. Nov
help-log-6 = Verlauf T4 → alles, was dazu eingetragen ist
help-log-7 = rückgängig → nimmt deinen letzten Eintrag zurück, 15 Minuten lang
help-log-8 = streichen 17 Tippfehler → nimmt Eintrag 17 zurück und sagt warum
help-vessels-1 = Was mit einem Wein passiert, ändert, womit ich noch rechne.
help-vessels-2 = T4? → was ich darüber weiß
help-vessels-3 = Tanks → alle Gebinde
help-vessels-4 = T4 rot → auch im BSA, fertiger Wein
help-vessels-5 = T4 hat jetzt 5200 L → was drin ist; T4 fasst 6000 L: wie groß er ist
help-vessels-6 = abgestochen T4 6100 L → auch aufgefüllt T4
help-vessels-7 = umgepumpt T4 nach T9 → alles, oder 20 hl davon
help-vessels-8 = verschnitten T5 in T4 → der pH muss neu gemessen werden
help-vessels-9 = T4 = Blanca 2026 → wie der Wein heißt
help-vessels-10 = T4 leer → auch: vergiss T4
help-reminders-1 = Einmal am Tag sage ich, was zu messen ist, und nach einer Gabe, wann.
help-reminders-2 = fällig → was jetzt zu messen ist
help-reminders-3 = Tagesliste um 7:00 → wann ich es sage; oder: Tagesliste aus
help-reminders-4 = später T4 3 Tage → fragt später danach
help-reminders-5 = T4 nicht erinnern → nicht mehr; beobachten T4: wieder
help-reminders-6 = Ruhe 21 bis 6 → nachts nichts ungefragt
help-settings-1 = Das alles gilt für den ganzen Keller.
help-settings-2 = Einstellungen → was gilt, und wie man es ändert
help-settings-3 = Einheiten us → auch metrisch, imperial
help-settings-4 = üblich ist Natriumdisulfit → das Mittel, wenn keins genannt ist
help-settings-5 = Ziel 0,5 für Rotweine → auch Weißweine, Süßweine
help-settings-6 = Zuschlag 30% → kommt auf jede Dosis, für das, was bindet
help-settings-7 = Zeitzone Europe/Berlin → für Stunden und Tage
help-settings-8 = kurze Antworten → der Rechenweg auf einem Knopf
help-pictures-1 = Ein Bild zeigt freie, molekulare und gesamte SO2 und was hineinkam.
help-pictures-2 = Bild T4 → als Foto, und dasselbe in Worten
help-files-1 = Dein Kellerbuch gehört dir.
help-files-2 = Export → dieser Monat als Tabelle
help-files-3 = Export 2026 → auch Export T4 csv, Export 1. Okt bis 31. Okt
help-files-4 = Der Export eines anderen Kellers oder eine Liste von Gebinden als CSV oder XLSX: schick die Datei. Sie wird erst gezeigt, dann ganz genommen oder gar nicht.
help-people-1 = Eine Gruppe ist ein eigener Keller: ruf mich beim Namen oder antworte mir.
help-people-2 = Leute → wer dabei ist
help-people-3 = einladen Mitarbeiter → ein Code für eine Person; auch Kellermeister, Gast
help-people-4 = Kellermeister dürfen alles, Mitarbeiter dosieren und tragen ein, Gäste schauen.
help-people-5 = lies mit → ich antworte auf klare Werte auch ungerufen
help-people-6 = meine Keller → in welchem wir sind; bei Blanca: ein anderer
help-people-7 = vergiss mich → dein Name und deine Nummer kommen weg
help-lab-1 = Eine Titration wird mit Rechenweg gerechnet; behalten wird erst, was du antippst.
help-lab-2 = AO 20 mL Probe, 1,9 mL 0,01 N → freie SO2; mit T4 davor auf einen Tipp behalten
help-lab-3 = T4 gesamt AO 20 mL Probe, 5,6 mL 0,01 N, Blindwert 0,1 → gesamte SO2
help-lab-4 = Ripper 25 mL Probe, 1,2 mL 0,02 N, Ascorbin 50 → Jod, ohne den Anteil der Ascorbinsäure
help-lab-5 = Spanne → wie weit die letzte Dosis daneben liegen kann
help-lab-6 = T4 55 hl pH 3,58±0,03 frei 21±2 → nach deinem eigenen ±
help-lab-7 = Tabelle 0,5 0,8 1,5 pH 3,2-3,8 → nötige freie SO2
help-lab-8 = molekular T4 → nach pK 1,81 und nach OIV
help-forecast-1 = Die eigenen Werte eines Weins sagen mehr als jede Regel.
help-forecast-2 = Prognose T4 → der Tag, an dem die freie SO2 unter das fällt, was der pH braucht
help-forecast-3 = Drei Werte seit der letzten Gabe ergeben sie; vorher gibt es nur für Fass und Flasche veröffentlichte Zahlen.
help-forecast-4 = Nach zwei Gaben mit Werten davor und danach sagt eine Dosis, welcher Anteil in diesem Wein gebunden hat.
help-forecast-5 = zu viel SO2 in T4 → was hilft und was nicht
help-forecast-6 = Verschnitt T4 T7 → welcher Anteil T7 Grenzwert und Ziel hält
help-forecast-7 = Verschnitt T4 → welche anderen Gebinde passen
help-topic =
    { $topic ->
        [wine] Wein
        [must] Most
        [bottling] Füllung
        [law] Recht
        [round] Runde
        [stock] Bestand
        [solutions] Lösungen
        [log] Kellerbuch
        [vessels] Gebinde
        [reminders] Erinnerungen
        [settings] Einstellungen
        [pictures] Bilder
        [files] Dateien
        [people] Leute
        [lab] Labor
        [forecast] Prognose
       *[other] { $topic }
    }

send-alone = Das kommt in eine eigene Nachricht.
unreadable =
    { $what ->
        [edited] Geänderte Nachrichten lese ich nicht. Bitte schick es neu.
        [photo] Fotos kann ich nicht lesen. Bitte tipp die Zahlen.
        [sticker] Schön. Ich lese aber nur Text.
        [voice] Sprachnachrichten kann ich nicht hören. Bitte tipp die Zahlen.
        [file] Dateien kann ich noch nicht lesen. Bitte tipp die Zahlen.
       *[other] Ich lese nur Text. Bitte tipp die Zahlen.
    }
fault = Da ist bei mir etwas schiefgegangen, nichts wurde gerechnet. Bitte schick es noch einmal; klappt es wieder nicht, sag dem Bescheid, der mich betreibt.
fault-aside = Das ging bei mir dreimal schief, ich habe es beiseitegelegt: nichts davon wurde gerechnet oder eingetragen. Wer mich betreibt, sieht den Grund.
left-unread =
    { $count ->
        [one] Ich war weg. Eine Nachricht hier ist älter als 12 Stunden, ich habe sie nicht gelesen: nichts davon ist eingetragen. Schick sie noch einmal, wenn sie noch gilt.
       *[other] Ich war weg. { $count } Nachrichten hier sind älter als 12 Stunden, ich habe sie nicht gelesen: nichts davon ist eingetragen. Schick noch einmal, was noch gilt.
    }
old-button = Der Knopf gehört zu einer älteren Nachricht. Bitte schick die Werte noch einmal.

## An emergency

emergency-out = ALLE RAUS an die frische Luft, sofort.
emergency-nobody-in = Niemand steigt oder beugt sich jemandem hinterher.
emergency-call = Den Notruf wählen.
emergency-swallowed = Verschluckt: Mund ausspülen, nicht zum Erbrechen bringen, Giftnotruf oder Notruf wählen.
emergency-eyes = Augen: 15 Minuten mit Wasser spülen, Kontaktlinsen heraus.
emergency-skin = Haut: mit viel Wasser spülen, nasse Kleidung ausziehen.

## The working

working = { $substituted } = { $result }
working-symbol = { $symbol } = { $substituted } = { $result }
working-source = ({ $source })
working-head =
    { $vessel ->
        [none] Der Rechenweg
       *[other] { $vessel }: der Rechenweg
    }
step-dissociation = Dissoziationskonstante, zwischen den vier nächsten Werten nach Alkohol und Temperatur:
step-molecular-now = Molekulare SO2 jetzt, frei ÷ (10^(pH − pK) + 1):
step-free-needed = Nötige freie SO2, Ziel × (10^(pH − pK) + 1):
step-oxygen-loss = Was Sauerstoff nimmt, Sauerstoff × SO2 je 1 mg davon:
step-free-before-bottling = Vorher nötige freie SO2, Ziel zur Füllung + was Sauerstoff nimmt:
step-addition = Zuzugeben, frei gewünscht − frei jetzt:
step-dose-with-allowance = Mit Zuschlag, Gabe × (1 + Zuschlag):
step-dose-with-share = Mit dem Anteil, der bindet, Gabe ÷ (1 − Anteil):
step-volume-in-litres = Volumen in Litern:
step-room-to-limit = Platz, Grenzwert − was darunter frei bleibt − SO2 jetzt:
step-must-of-fruit = Most, Lesegut × Liter aus 100 kg ÷ 100 kg:
step-so2-mass = SO2 in Gramm, Gabe × Volumen ÷ 1000:
step-so2-mass-each = SO2 für ein Gebinde, Gabe × sein Volumen ÷ 1000:
step-all-vessels = Für alle Gebinde, eins × Anzahl:
step-additive-mass = Mittel, SO2 ÷ sein Anteil SO2:
step-additive-mass-by-assay = Mittel, SO2 ÷ (Reinheit × Anteil SO2 im reinen Salz):
step-additive-mass-by-yield = Mittel, SO2 ÷ seine genannte SO2-Ausbeute:
step-additive-volume-by-salt = Lösung, SO2 ÷ (Salz darin × Anteil SO2 im Salz):
step-additive-volume-by-so2 = Lösung, SO2 ÷ SO2 darin:
step-tablets-by-so2 = Tabletten, SO2 ÷ SO2 in einer:
step-tablets-by-salt = Tabletten, SO2 ÷ (Salz in einer × Anteil SO2 im Salz):
step-gas-by-purity = Gas, SO2 ÷ Reinheit:
step-so2-in-amount = SO2 darin, Menge × SO2 in einer Einheit:
step-added-concentration = Zugegeben, SO2 × 1000 ÷ Volumen:
step-added-by-rate = Zugegeben, Menge je Liter × Anteil SO2:
step-mass-by-rate = Mittel, Menge je Liter × Volumen ÷ 1000:
step-free-after = Frei danach, wenn nichts bindet:
step-molecular-after = Molekular danach, frei ÷ (10^(pH − pK) + 1):
step-salt-mass = Salz, Gramm in 0,1 L ÷ 0,1 L × Volumen:
step-added-by-one-millilitre = Ein mL in ein Fass, SO2 darin ÷ Volumen des Fasses:
step-stock-for-a-barrel = Lösung für ein Fass, Anstieg × Volumen des Fasses ÷ SO2 in der Lösung:
step-salt-by-recipe = Sulfit, Gramm im Liter × Volumen:
step-citric-acid-by-recipe = Zitronensäure, Gramm im Liter × Volumen:
step-solution-strength = Stärke in 100 mL, SO2 ÷ Volumen × 0,1 L:
step-solution-strength-by-salt = Stärke als SO2, Salz × Anteil SO2 darin:
step-titrant-normality = Normalität der Jodlösung, 2 × ihre Molarität:
step-iodate-normality = Normalität, 6 × mg Jodat ÷ 214 ÷ mL des Kolbens:
step-titrant-used = Verbrauch, Bürette − Blindwert:
step-so2-by-titration = SO2, 32 000 × Normalität × Verbrauch ÷ Probe:
step-ascorbic-counted = Ascorbinsäure zählt wie, mg/L × 64,06 ÷ 176,12:
step-so2-without-ascorbic = SO2 ohne sie:
step-spread-of-need = ± des Nötigen, Ziel × 10^(pH − pK) × ln 10 × ± des pH:
step-spread-of-dose = ± der Gabe, Wurzel aus beiden Quadraten:
step-dose-lowest = Kleinste, nötig − frei − ihr ±:
step-dose-highest = Größte, nötig − frei + ihr ±:
step-molecular-sure = Sichere molekulare SO2, danach × (1 − Wurzel aus beiden relativen ± im Quadrat):
step-blend-free = Freie SO2 des Verschnitts, nach Volumen:
step-blend-total = Gesamte SO2 des Verschnitts, nach Volumen:
safety-head = Vorsicht mit { additive }
more-head =
    { $vessel ->
        [none] Mehr
       *[other] { $vessel }: mehr
    }
more-no-warnings = Keine weiteren Warnungen.
choice-left = { at }so gelassen, { $molecular } molekular. Oft probieren und messen.
choice-over = { at }dafür keine Menge: gesamt ginge über { $limit } ({ law-of }).
round-choice = { at }bei pH { $ph } ist es eine Wahl: schick es allein.
round-missing =
    { $field ->
        [vessel] welches Gebinde ist es?
        [volume_L] { at }Volumen fehlt.
        [ph] { at }pH fehlt.
        [free_mg_L] { at }freie SO2 fehlt.
        [target] { at }was ist das Ziel? Schreib es dazu.
        [additive] { at }welches Mittel ist es?
        [strength_percent] { at }wie stark ist das Mittel?
        [tablet_salt_g] { at }wie viel Gramm wiegt eine Tablette?
        [tablet_SO2_g] { at }wie viel Gramm SO2 gibt eine Tablette?
        [mass_g] { at }wie viel Gramm?
       *[none] { at }es fehlt etwas.
    }
round-dose = { $vessel } ({ $list }): { round-amount }
round-dose-bare = { at }{ round-amount }
round-amount =
    { $unit ->
        [tablets] { $amount } Tabletten{ round-of }{ round-all }{ round-limited }{ round-if-red }
       *[other] { round-tablet }{ $amount }{ round-of }{ round-all }{ round-limited }{ round-if-red }
    }
round-limited =
    { $limited ->
        [limited] {" "}(Grenzwert)
       *[none] {""}
    }
round-tablet =
    { $tablet ->
        [too-large] eine halbe Tablette ist zu viel,{" "}
       *[fits] {""}
    }
round-of =
    { $additive ->
        [none] {""}
       *[other] {" "}{ additive }{ round-percent }
    }
round-percent =
    { $strength ->
        [none] {""}
       *[other] {" "}{ $strength } %
    }
round-all =
    { $all ->
        [none] {""}
       *[other] {" "}je Gebinde, { $all } insgesamt
    }
round-if-red =
    { $red ->
        [unsaid] {""}
        [none] , wenn rot nichts
        [over] , wenn rot { $redAmount }, auch über dem Grenzwert
       *[some] , wenn rot { $redAmount }
    }
round-nothing = { $vessel } ({ $list }): nichts zuzugeben
round-nothing-bare = { at }nichts zuzugeben
round-head =
    { $kind ->
        [powder] { additive }{ round-strength } abwiegen:
        [gas] SO2-Gas abwiegen, nur nach Gewicht; nur geschulte Leute, Atemschutz griffbereit:
        [tablet] Brausetabletten zu { $size } g SO2 nehmen:
        [salt-tablet] Tabletten { additive } zu { $size } g nehmen:
       *[solution] { additive }{ round-strength } abmessen:
    }
round-strength =
    { $size ->
        [none] {""}
       *[other] , { $size } %,
    }
round-for-all = Für alle: { $list }.
round-kept = Die Werte sind eingetragen.
round-red = „Wenn rot“ gilt für { $red } molekular.
round-stock = Als Lösung davon mit { $strength } %: { $list }.
round-rest = Der Rest als Lösung mit { $strength } %: { $list }.
round-stock-of = { $vessel } { $amount }
mixed-sample = Gilt fürs Mittel der { $count }: das niedrigste zeigt eine Mischprobe nicht. Liegt eins 5 tiefer, landet es 5 tiefer. Wie weit sie abweichen, weiß ich nicht: erst einige einzeln messen (üblich, ohne Quelle).
round-mixed = ⚠ Eine Mischprobe zeigt das Mittel, nicht das niedrigste: { $list }. Miss einige einzeln.
round-low = ⚠ Unter 10 frei kann viel oder alles binden: { $list }. Dort messen, bevor du nochmal zugibst.
round-name = { $name }
round-again = Unlesbare Zeilen noch einmal ganz schicken.
round-total =
    Insgesamt { $list } ({ $count } gerundete Mengen).
round-total-of =
    { $kind ->
        [tablet] { $amount } Brausetabletten zu { $size } g SO2
        [salt-tablet] { $amount } Tabletten { additive } zu { $size } g
       *[other] { $amount } { additive }{ round-percent }
    }
round-open =
    { $count ->
        [one] Keine Menge für eins:
       *[other] Keine Menge für { $count }:
    }
round-open-names = Keine Menge für { $list }: „Runde“ zeigt warum.
round-more = … und { $count } weitere: schick „Runde“, oder nimm das Blatt unten.
round-and-more = { $count } weitere
round-warned = ⚠ Warnungen stehen bei { $list }: schick „Runde“.
button-round-all = Alles zugegeben
button-round-lines = Einzeln
button-round-line =
    { $vessel } { $amount }{ $unit ->
        [tablet] { " " }Tablette
        [tablets] { " " }Tabletten
       *[other] { "" }
    }{ $count ->
        [several] { " " }je
       *[one] { "" }
    }
button-round-next = Weiter
button-round-picture = Blatt als Bild
button-round-file = Blatt als Datei
button-round-undo = Rückgängig { $entries }
round-noted =
    Eingetragen { $entries }: { $count ->
        [one] eine Zugabe
       *[other] { $count } Zugaben
    }, { $list }, { $when }.
round-noted-rest = der Rest der Runde
round-noted-line = Eingetragen { $entry }: { $vessel } { $list }, { $when }.
round-noted-each = Eingetragen { $entry }: { $vessel } je { $list }, { $when }.
round-noted-before = Schon eingetragen und so gelassen: { $list }.
round-noted-none = Alles schon eingetragen: Einträge { $entries }.
round-not-noted = Nicht eingetragen, weil ohne eindeutige Menge: { $list }.
round-strike-one = Eins davon kam nicht hinein? Schick „streichen { $entry } kam nicht hinein“.
round-pick = Was kam hinein? { $from }–{ $to } von { $all }:
round-pick-noted = { $vessel }: eingetragen, Eintrag { $entry }.
round-undone = Zurückgenommen: { $entries }. Sie bleiben durchgestrichen im Kellerbuch.
round-undone-none = Davon ist nichts mehr zurückzunehmen.
sheet-vessel = Gebinde
sheet-volume = Volumen L
sheet-ph = pH
sheet-free = Freie SO2 mg/L
sheet-free-short = frei
sheet-total = Gesamte SO2 mg/L
sheet-dose = SO2-Gabe mg/L
sheet-weigh = Abwiegen g
sheet-measure = Abmessen mL
sheet-tablets = Tabletten
sheet-additive = Mittel
sheet-strength = Stärke %
sheet-after = Frei danach, wenn nichts bindet mg/L
sheet-note = Notiz
sheet-done = Erledigt
sheet-in-all = Insgesamt
sheet-nothing = nichts zuzugeben
sheet-limit = Grenzwert
sheet-title = Wiegeblatt
sheet-open = Keine Menge:
sheet-caution = Handschuhe, Schutzbrille, lüften. Nie in den Tank beugen. Mischen, morgen messen.
sheet-fetch = Insgesamt { $list }
sheet-additive-name = {" "}{ additive }{ round-percent }
file-round = Eine Runde mit { $count } Zeilen.
file-round-left = Nicht verstanden und ausgelassen: Zeile { $lines } der Datei.
file-round-ask = Soll ich die Dosen rechnen oder nur die Werte eintragen?
button-file-dose = Dosen
button-file-note = Werte eintragen
button-file-vessels = Gebinde nehmen
round-gone = Hier ist keine Runde mehr da: schick sie noch einmal.
round-target-stage = { at }wie viele mg/L willst du zugeben?
round-not-understood =
    { $about ->
        [none] Eine Zeile konnte ich nicht lesen.
       *[other] „{ $about }“ konnte ich nicht lesen.
    }
round-effect-short = Meist bindet ein Drittel bis die Hälfte: morgen messen.
round-effect = Meist bindet ein Drittel bis die Hälfte: morgen messen. Rechenweg: Zeile allein schicken.
choice-additive = { $value ->
        [potassium-metabisulfite] Kaliumdisulfit (E 224)
        [sodium-metabisulfite] Natriumdisulfit (E 223)
        [potassium-metabisulfite-solution] Kaliumdisulfit-Lösung
        [sodium-metabisulfite-solution] Natriumdisulfit-Lösung
        [potassium-bisulfite-solution] Kaliumbisulfit-Lösung (E 228)
        [ammonium-bisulfite-solution] Ammoniumbisulfit-Lösung
        [sulfur-dioxide-solution] Schweflige Säure (SO2 in Wasser)
        [sulfur-dioxide-gas] SO2-Gas (E 220)
       *[tablet] Brausetabletten
    }
choice-powder = { $value ->
        [potassium-metabisulfite] Kaliumdisulfit-Pulver
       *[sodium-metabisulfite] Natriumdisulfit-Pulver
    }
choice-tablet_salt_g = { $value } g
choice-tablet_SO2_g = { $value } g
folded = Rechenweg, weitere Warnungen: Knopf Mehr.
terminal-start = brimnote rechnet Schwefelgaben aus. Tipp Werte ein, zum Beispiel:
terminal-start-example =     T4 55 hl pH 3,58 frei 21
demo-start = Das ist eine Vorführung: Hafenkeller und Leute sind erfunden, und nichts davon bleibt. Tipp:
demo-start-sheets = Tagesblatt:  heute        Verlauf:  Verlauf T4        Was zu messen ist:  fällig
demo-start-reading = Dann eigene Werte, zum Beispiel:  T6 frei 21
demo-start-end = ? zeigt mehr, Strg-D beendet.
terminal-start-more = ? zeigt mehr, Strg-D beendet. Mehrere Zeilen auf einmal eingefügt sind eine Nachricht.

## Buttons

button-working = Rechenweg
button-safety = Sicherheit
button-target = Anderes Ziel
button-more = Mehr
button-not-finished = Noch nicht fertig
button-red = Rot
button-choice-leave = So lassen
button-choice-to = Auf { $free }

## What the cellar remembers

fault-unwritten = Nicht eingetragen: ich konnte es nicht speichern. Bitte schick es in einer Minute noch einmal.
vessel-unknown =
    { $vessel ->
        [none] Welches Gebinde? Zum Beispiel: T4?
       *[other] Über { $vessel } weiß ich noch nichts. Schick Werte wie: { $vessel } 55 hl pH 3,58 frei 21
    }
recalled = { $list } ({ $day })
recalled-additive = { additive } ({ $day })
recalled-allowance = Zuschlag { $percent } % (eure Einstellung)
choice-volume_L = { $value }
ask-volume-which =
    { $vessel }: { $known ->
        [none] { $said } ist mehr, als hineinpasst. Stimmt das?
       *[other] du schreibst { $said }, ich hatte { $known }. Was stimmt?
    }
read-kept =
    { $new ->
        [new] Eingetragen, { $vessel } ist neu für mich: { $list }.
       *[known] Gelesen und eingetragen: { $list }.
    }
noted-something-else =
    Eingetragen { $entry }, nicht gerechnet: { $vessel } { $text }, { $when }.{ $voids ->
        [ph] { " " }Der pH muss neu gemessen werden.
       *[none] { "" }
    }
reading-kept = { at }{ $list }: eingetragen, { $when }.
button-added = Zugegeben
button-mine = Ich mache es
button-order = Als Auftrag
button-note = Eintragen
button-sampled-before = Davor
button-sampled-after = Danach
button-dose-anyway = Trotzdem eine Dosis
button-white = Weiß
button-take = Nehmen
import-ask = Soll ich sie nehmen?
import-taken = Übernommen: { $entries } Einträge.
import-no-file = Eine Datei „{ $file }“ kann ich nicht lesen.
export-written = Geschrieben: { $path }
export-none = In dieser Zeit wurde nichts eingetragen.
backup-written = Sicherung geschrieben: { $path }
progress-working = Ich bin dran …
progress-done = Erledigt.
errand-failed = Das hat nicht geklappt, nichts wurde geschrieben. Bitte versuch es noch einmal; klappt es wieder nicht, sag dem Bescheid, der mich betreibt.
backup-elsewhere = Sicherungen macht, wer mich betreibt. Das Kellerbuch nimmst du so mit: Export alles
button-undo = Rückgängig { $entry }
button-done = Auftrag { $entry } erledigt
button-remind = Erinnere mich in 24 h
added-confirm = { at }{ $added } sind { $list }. Eintragen?
added-confirm-bare = { at }{ $added } SO2. Eintragen?
noted-addition =
    Eingetragen { $entry }: { $vessel } { $list }, { $when }{ $added ->
        [none] .
       *[other] { " " }({ $added } SO2).
    }{ $order ->
        [none] { "" }
       *[other] { " " }Auftrag { $order } ist erledigt.
    }
noted-bare = Eingetragen { $entry }: { $vessel } { $added } SO2, { $when }.
noted-measure = Freie SO2 ab { $when } messen, bevor du nochmal zugibst.
noted-measure-now = Freie SO2 messen, bevor du nochmal zugibst.
already-noted = Schon eingetragen als { $entry }, { $when } ({ $who ->
        [you] du
       *[other] { $who }
    }): { $vessel }.
odd-more-than-planned = Das ist das { $factor }-Fache von dem, was ich für { $vessel } gerechnet habe. Vertan? Dann rückgängig.
odd-large = { $added } auf einmal ist viel. Vertan? Dann rückgängig.
odd-second = { $vessel } hatte schon eine Zugabe, { $when } (Eintrag { $entry }).
odd-empty = { $vessel } gilt seit { $when } als leer.
odd-from-empty = { $vessel } galt seit { $when } als leer.
odd-over-capacity = { $volume } ist mehr als die { $capacity }, die { $vessel } fasst.
when-noon = Keine Uhrzeit genannt: für Mittag eingetragen.
when-future =
    { at }„{ $text }“ kommt erst noch{ $when ->
        [none] { "" }
       *[other] { " " }({ $when })
    }. Nicht eingetragen. Schick es noch einmal mit der Zeit, zu der es war.
when-no-such-day = { at }„{ $text }“ gibt es als Zeit nicht. Nicht eingetragen. Schick es noch einmal mit der Zeit, zu der es war.
vessel-new = { $vessel } ist neu für mich.
volume-differs =
    { $vessel }: { $known ->
        [none] { $said } ist mehr, als hineinpasst
       *[other] { $said } sind nicht die { $known }, die ich hatte
    }: nicht eingetragen. Stimmt es, schreib: { $vessel } hat jetzt { $written }
ask-zone = Zeiten nenne ich in UTC. In welcher Zone seid ihr? Schreib: Zeitzone Europe/Berlin
dosed-who =
    { $who ->
        [you] du
       *[other] { $who }
    }
dosed-which-first =
    { $vessel }: schon geschwefelt { $known ->
        [none] {""}
       *[some] mit { $list }{" "}
    }({ dosed-who }, { $when }). Die Probe war davor? Keine Dosis, bis ich es weiß.
dosed-add-more =
    { $vessel }: schon geschwefelt { $known ->
        [none] {""}
       *[some] mit { $list }{" "}
    }({ dosed-who }, { $when }). Trotzdem mehr?
dosed-sampled-before =
    { $vessel }: keine Dosis: geschwefelt { $known ->
        [none] {""}
       *[some] mit { $list }{" "}
    }({ dosed-who }, { $when }), nach dieser Probe. Miss wieder ab { $next }.
dosed-landed =
    { $vessel }: vorerst nichts mehr: geschwefelt { $known ->
        [none] {""}
       *[some] mit { $list }{" "}
    }({ dosed-who }, { $when }), und SO2 bindet noch einen Tag lang. Miss wieder ab { $next }.
dosed-in-round =
    { $vessel }: keine Dosis: schon geschwefelt { $known ->
        [none] {""}
       *[some] mit { $list }{" "}
    }({ dosed-who }, { $when }). Schick es allein.
landed =
    { $vessel } kam auf { $after }{ $planned ->
        [none] { "" }
       *[other] , geplant { $planned }
    }: von { $added } { $unit } haben { $percent } % gebunden.
landed-loose =
    { $vessel } kam auf { $after }{ $planned ->
        [none] { "" }
       *[other] , geplant { $planned }
    }. Wie viel gebunden hat, lässt sich nicht sagen: frei vor den { $added } { $unit } wurde am { $day } gemessen.
landed-fell = { $vessel } ging von { $before } auf { $after }, obwohl { $added } { $unit } hineinkamen: alles gebunden oder vertan. Miss noch einmal.
landed-too-high = { $vessel } stieg um { $rise }, obwohl nur { $added } { $unit } hineinkamen. Eine Zahl stimmt nicht: miss noch einmal.
on-it =
    { $vessel }: { $who ->
        [you] du bist
       *[other] { $who } ist
    } seit { $when } dran.
claimed = { $vessel } gehört dir bis { $until }. Die anderen sehen es.
claim-taken = { $vessel }: { $who } ist seit { $when } dran.
ordered = Auftrag { $entry }: { $vessel } { $list }.
ordered-open = Offen, bis jemand einträgt, was hineinkam.
order-how = Zum Beispiel: Auftrag T4 256 g KDS
order-gone = Auftrag { $entry } ist nicht mehr offen.
remind-set = { $when } frage ich nach { $vessel }.
remind-late = Dafür ist es zu spät: miss { $vessel } jetzt.
undo-nothing = Von dir ist nichts zurückzunehmen.
undo-late = Eintrag { $entry } ist älter als 15 Minuten. Schreib: streichen { $entry } und warum
undo-not-yours = Eintrag { $entry } ist von { $who }. Schreib: streichen { $entry } und warum
strike-none = Einen Eintrag { $entry } gibt es nicht.
strike-again = Eintrag { $entry } wurde schon gestrichen, durch { $by }.
strike-correction = Eintrag { $entry } ist selbst eine Korrektur. Trag neu ein, was richtig war.
strike-why = Warum? Schreib: streichen { $entry } Tippfehler
struck = Gestrichen { $entry } ({ $list }). Beides bleibt im Kellerbuch.
struck-addition = Kam es doch hinein, trag es neu ein.
noted-vessel =
    Eingetragen { $entry }: { $list }.{ $voids ->
        [ph] { " " }Der pH muss neu gemessen werden.
        [volume] { " " }Sag das neue Volumen mit dem nächsten Messwert.
        [blend] { " " }pH und SO2 müssen neu gemessen werden.
       *[none] { "" }
    }
amount-unknown = etwas SO2
fact-capacity = fasst { $volume }
fact-lot = { $lot }
fact-chemical-lot = Charge { $lot }
fact-remark = „{ $remark }“
event-said =
    { $event ->
        [racked] { " " }abgestochen
        [topped] { " " }aufgefüllt
        [acid] { " " }gesäuert
        [moved] { $whole ->
            [part] { " " }zum Teil nach { $to } umgepumpt
           *[all] { " " }nach { $to } umgepumpt
        }
        [blended] { $whole ->
            [part] { " " }zum Teil in { $to } verschnitten
           *[all] { " " }in { $to } verschnitten
        }
        [emptied] { " " }leer
        [lot] { " " }ist { $lot }
        [later] , keine Prüfung vor { $until }
        [unwatched] , keine Prüfungen mehr
        [watched] , wieder Prüfungen
        [forgotten] { " " }vergessen
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
    Auftrag { $vessel } { $known ->
        [none] { $added } mg/L
       *[some] { $list }
    }
entry-reading = { $vessel } { $list }
entry-vessel =
    { $vessel }{ event-said }{ $told ->
        [none] { "" }
       *[some] { " " }{ $list }
    }
entry-other = { $vessel } { $text } (nicht gerechnet)
entry-stock =
    { $event ->
        [received] erhalten
        [used] verbraucht, für keinen Wein:
        [discarded] entsorgt
       *[counted] gezählt
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }von { $supplier }
    }
entry-correction =
    streicht { $entry }: { $reason ->
        [undo] zurückgenommen
        [sampled-before] Probe vor der Zugabe
        [edited] die Nachricht wurde geändert
       *[other] { $reason }
    }
round-volume-which = { $vessel }: { $said } passt nicht zu dem, was drin war: schick es allein.
sheet-entry =
    { $entry } · { $when } · { $list } · { $who }{ $late ->
        [late] { " " }(eingetragen { $noted })
       *[none] { "" }
    }{ $struck ->
        [none] { "" }
       *[other] { " " }— GESTRICHEN durch { $struck }
    }
day-head = { $day } ({ $zone }):
day-empty = Am { $day } nichts eingetragen.
day-more = Frühere von diesem Tag stehen im Export.
day-none-such = Den Tag gibt es nicht.
history-head = { $vessel }, das Neueste zuletzt:
history-empty =
    { $vessel ->
        [none] Welches Gebinde? Zum Beispiel: Verlauf T4
       *[other] Zu { $vessel } ist noch nichts eingetragen.
    }
history-more = Ältere: Export { $vessel }
list-more = … und { $count } weitere.
vessels-none = Ich kenne noch kein Gebinde. Schick Werte wie: T4 55 hl pH 3,58 frei 21
vessels-head =
    { $number ->
        [one] Ein Gebinde, jetzt zu messen: { $due }
       *[many] { $count } Gebinde, jetzt zu messen: { $due }
    }
vessels-line =
    { $vessel }{ $lot ->
        [none] { "" }
       *[other] { " " }{ $lot }
    }: { $free ->
        [none] kein Messwert
       *[other] frei { $free } ({ $day })
    }{ $next ->
        [empty] , leer
        [now] , JETZT MESSEN
        [later] , nächste { $check }
       *[none] { "" }
    }
vessel-head = { $vessel }: { $list }
vessel-bare = { $vessel }
vessel-empty = { $vessel }: leer seit { $day }
vessel-readings = Zuletzt: { $list }
vessel-void =
    { $field ->
        [ph] pH
       *[other] Volumen
    } unbekannt seit { $day }: { $event ->
        [malolactic] BSA
        [fermentation] da war es Most
        [blended] verschnitten
        [acid] gesäuert
        [racked] abgestochen
        [topped] aufgefüllt
       *[moved] umgepumpt
    }.
vessel-addition =
    { $entry } · { $when } · { $list }{ $added ->
        [none] { "" }
       *[other] , { $added } mg/L
    } · { $who }{ $landed ->
        [not-yet] { " " }(seither nicht gemessen)
       *[landed] { "" }
    }
vessel-bound =
    { $number ->
        [one] Gebunden: { $share } % einer Gabe.
       *[many] Gebunden: { $share } % im Mittel von { $count } Gaben ({ $least }–{ $most } %).
    }
vessel-order = Offener Auftrag { $entry }: { $list } ({ $who }, { $when }).
vessel-check =
    Nächste Prüfung { $when }{ $why ->
        [landing] { " " }(nach der Zugabe)
        [forecast] { " " }(nach seinen Werten könnte dann etwas fehlen)
       *[other] { "" }
    }.
vessel-check-due =
    Prüfung fällig seit { $when }{ $why ->
        [landing] { " " }(nach der Zugabe)
        [forecast] { " " }(nach seinen Werten könnte etwas fehlen)
       *[other] { "" }
    }.
vessel-unwatched = Keine Prüfungen. Wieder: beobachten { $vessel }
due-none = Nichts ist fällig.
due-head =
    { $number ->
        [one] Ein Gebinde zu messen:
       *[many] { $count } Gebinde zu messen, das dringendste zuerst:
    }
due-stage =
    { $stage ->
        [none] { "" }
       *[other] { " " }(noch nicht fertig: keine Dosis)
    }
due-overdue =
    { $overdue ->
        [no] { "" }
       *[yes] , { $days } T überfällig
    }
due-landing = { $vessel }: Zugabe { $added }, seither nicht gemessen{ due-overdue }{ due-stage }
due-usual =
    { $vessel }: { $free ->
        [none] nie gemessen
       *[other] frei { $free } am { $day }
    }{ due-overdue }{ due-stage }
due-often =
    { $vessel }: { $free ->
        [none] nie gemessen
       *[other] frei { $free } am { $day }
    }{ $low ->
        [low] , niedrig
       *[none] { "" }
    }{ due-overdue }{ due-stage }
due-forecast =
    { $vessel }: { $free ->
        [none] nie gemessen
       *[other] frei { $free } am { $day }
    }, jetzt könnte etwas fehlen{ due-overdue }{ due-stage }
daily-head = Guten Morgen.
remind = Vor einem Tag: { $list }. Jetzt freie SO2 messen.
open-none = Keine offenen Aufträge.
open-head =
    { $number ->
        [one] Ein offener Auftrag:
       *[many] { $count } offene Aufträge:
    }
open-line = { $entry } · { $vessel } { $list } · { $who }, { $when }
language-changed = Du schreibst Deutsch: ab jetzt antworte ich auf Deutsch.
language-not-yet = Diese Sprache lese ich, antworte darin aber noch nicht.
language-set = Ich antworte auf Deutsch.
button-stay-language = Bei Deutsch bleiben
settings-head = Einstellungen dieses Kellers, und wie man sie ändert:
setting-set = Gilt ab jetzt. { $list }
setting-units =
    Einheiten: { $units ->
        [us] US-Gallonen
        [imperial] englische Gallonen
       *[metric] Liter
    } (Einheiten metrisch)
setting-usual-additive =
    Üblich: { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    } (üblich ist KDS 57%)
setting-target = Ziele, molekular: rot { $red }, weiß { $white }, süß { $sweet } (Ziel 0,6 für Rotweine)
setting-allowance =
    { $percent ->
        [none] Kein Zuschlag für Bindung (Zuschlag 30%)
       *[other] Zuschlag für Bindung: { $percent } % auf Dosen nach Ziel (kein Zuschlag)
    }
setting-yield =
    { $yield ->
        [none] Keine übliche Ausbeute (Ausbeute 65)
       *[other] Ausbeute: { $yield } L Most aus 100 kg (keine Ausbeute)
    }
setting-basis =
    Basis: { $basis ->
        [oiv] OIV
       *[other] pK 1,81
    } (Basis OIV, Basis 1,81)
setting-law = Recht: { law-of } (Recht EU, Recht US)
setting-zone =
    Zeitzone: { $zone ->
        [none] nicht gesagt, also UTC
       *[other] { $zone }
    } (Zeitzone Europe/Berlin)
setting-daily =
    Tagesliste: { $daily ->
        [off] aus (Tagesliste um 7:30)
       *[other] { $daily } (Tagesliste aus)
    }
setting-quiet = Ruhe: { $from } bis { $to } (Ruhe 20 bis 6)
setting-ph-days = Ein pH gilt { $days } Tage (pH gilt 14 Tage)
setting-check-days = Prüfung alle { $usual } Tage; Fässer und niedrige alle { $often } (prüfen alle 30 Tage, Fässer prüfen alle 14 Tage)
setting-language = Sprache: Deutsch (Sprache en)
setting-short-replies =
    Antworten: { $short ->
        [short] kurz (lange Antworten)
       *[long] ganz (kurze Antworten)
    }
setting-wrong =
    Das geht nicht: „{ $text }“. { $of ->
        [units] Zum Beispiel: Einheiten metrisch
        [usual-additive] Zum Beispiel: üblich ist KDS 57%
        [target] Zum Beispiel: Ziel 0,6 für Rotweine
        [yield] Zum Beispiel: Ausbeute 65
        [quiet] Zum Beispiel: Ruhe 20 bis 6
        [daily] Zum Beispiel: Tagesliste um 7:30
        [zone] Zum Beispiel: Zeitzone Europe/Berlin
        [law] Dafür ist kein Grenzwert hinterlegt. Hinterlegt: OIV, EU, UK, US, CA, AU, NZ, ZA, AR, CL, BR, JP, KR, CN, Codex, CH, GE, HK, EAEU. Zum Beispiel: Recht EU
        [allowance] Zum Beispiel: Zuschlag 30%
        [basis] Zum Beispiel: Basis OIV
        [ph-days] Zum Beispiel: pH gilt 14 Tage
        [check-days] Zum Beispiel: prüfen alle 30 Tage
       *[other] Zum Beispiel: kurze Antworten
    }
forgotten-person = Dein Name steht auf keinem Blatt mehr. Was du eingetragen hast, bleibt, als Person { $number }.

## People, cellars and chats

role =
    { $role ->
        [keeper] Kellermeister
        [hand] Mitarbeiter
       *[guest] Gast
    }
cellar-called =
    { $cellar ->
        [none] { $keeper ->
            [none] dieser Keller
           *[other] Keller von { $keeper }
        }
       *[other] { $cellar }
    }
keeper-called = { $name }
not-allowed =
    { $role ->
        [keeper] Das darf nur ein Kellermeister dieses Kellers
       *[hand] Das dürfen Mitarbeiter und Kellermeister dieses Kellers
    }{ $keepers ->
        [none] .
       *[some] : frag { $list }.
    }
guest-not-kept = Du bist hier Gast: nichts davon wird eingetragen.
not-of-cellar = Du gehörst nicht mehr zu diesem Keller. Ein Kellermeister kann dich einladen: dann schick mir den Code.
invite-how = Mit welcher Rolle? Schreib: einladen Mitarbeiter, oder: einladen Gast, oder: einladen Kellermeister
invite-not-here = Hier kann ich keinen Code machen.
invited = Code für eine Person ({ role }), bis { $day }: { $code }
invited-how =
    { $link ->
        [none] Wer mir zuerst „beitreten“ und den Code schickt, ist dabei.
       *[other] Wer das zuerst öffnet, ist dabei: { $link } (oder schickt mir „beitreten“ und den Code)
    }
joined = Du bist dabei: { $list }, als { role }.
joined-before = Du warst schon dabei: { $list }, als { role }. Der Code gilt noch.
joined-how =
    { $role ->
        [guest] Frag nach einem Gebinde, zum Beispiel: T4?
       *[other] Schick Werte, zum Beispiel: T4 55 hl pH 3,58 frei 21
    }
cellar-left = Du bist nicht mehr dabei: { $list }. Was du eingetragen hast, bleibt im Kellerbuch.
join-unknown = Der Code stimmt nicht oder ist abgelaufen. Lass dir einen neuen geben.
join-used = Der Code wurde schon benutzt. Lass dir einen neuen geben.
people-head = Leute dieses Kellers:
people-line =
    { $name }: { role }{ $me ->
        [me] { " " }(du)
       *[other] { "" }
    }
people-how = Ändern: einladen Mitarbeiter, mach Ben zum Gast, entferne Ben
role-changed =
    { $role ->
        [none] { $name } gehört nicht mehr zu diesem Keller.
       *[other] { $name } ist jetzt { role }.
    }
role-same = { $name } ist schon { role }.
last-keeper = { $name } ist der letzte Kellermeister. Mach erst jemand anderen dazu, zum Beispiel: Ben ist Kellermeister
person-unknown = „{ $text }“ kenne ich hier nicht. Es gibt: { $list }.
person-which = Welcher „{ $text }“? { $list }. Schreib die Nummer dazu: entferne Person 3
person-called =
    { $name ->
        [none] Person { $number }
       *[other] { $name }
    }
at-cellar = { $list }:
at-now = Jetzt: { $list }.
at-already = Wir sind schon hier: { $list }.
at-here = Wir sind hier: { $list }.
at-others = Andere: { $list }. Wechseln: bei und der Name
at-only = Einen anderen gibt es hier nicht.
at-unknown = Einen Keller „{ $text }“ kenne ich hier nicht. Es gibt: { $list }.
at-which = Welcher „{ $text }“? { $list }.
cellar-named = Dieser Keller heißt jetzt { $name }.
reads-along =
    { $on ->
        [on] Ich antworte hier auch ungerufen, wenn Gebinde und Zahlen klar sind.
       *[off] Ich antworte hier nur, wenn man mich ruft.
    }
group-joined = Hallo. Ich rechne Schwefelgaben und führe das Kellerbuch. Ruf mich beim Namen oder antworte mir.
group-how = Zum Anfang: T4 55 hl pH 3,58 frei 21. Mehr: Hilfe
corrected = Korrigiert.
edited-noted = Deine Änderung bewirkt nichts: Eintrag { $entry } ({ $vessel }) bleibt. Ist er falsch: streichen { $entry } und warum
edited-added = Deine Änderung bewirkt nichts: { $vessel } hat seither eine Zugabe (Eintrag { $entry }). Schick die richtigen Werte als neue Nachricht.
edited-late = Deine Änderung bewirkt nichts: die Nachricht ist älter als 15 Minuten. Schick sie neu.
edited-anew = So etwas nehme ich aus keiner Änderung. Schick es als neue Nachricht.
added-it-none =
    { $vessel ->
        [none] Was kam hinein, und wo? Zum Beispiel: zugegeben 82 g KDS T4
       *[other] Was kam in { $vessel }? Zum Beispiel: zugegeben 82 g KDS { $vessel }
    }
picture-none =
    { $vessel ->
        [none] Von welchem Gebinde? Zum Beispiel: Bild T4
       *[other] Über { $vessel } weiß ich noch nichts, es gibt nichts zu zeichnen.
    }
stranger = Dieser Bot ist für Eingeladene. Hast du einen Code, schick: beitreten und den Code
too-fast = Zu viele Nachrichten auf einmal: eine Minute lang übergehe ich deine. Dann schick noch einmal, was ohne Antwort blieb.

command-today = Was heute eingetragen wurde
command-due = Gebinde, die zu messen sind
command-vessels = Alle Gebinde
command-open = Aufträge, die noch offen sind
command-settings = Was hier üblich ist, und wie man es ändert
command-help = Wie man mich benutzt

## Files: export and import

export-entry = Nr.
export-kind = Art
export-done = Ausgeführt (Ortszeit)
export-noted = Eingetragen (Ortszeit)
export-late = Nachgetragen
export-is-late = nachgetragen
export-person = Person
export-unnamed = Person { $number }
export-vessels = Gebinde
export-to = Nach
export-event = Was geschah
export-wine-lot = Partie
export-wine = Wein
export-additive = Mittel
export-strength_percent = Stärke %
export-chemical_lot = Charge des Mittels
export-supplier = Lieferant
export-mass_g = Menge g
export-additive_volume_mL = Menge mL
export-tablets = Tabletten
export-SO2_g = SO2 zugegeben g
export-added_mg_L = SO2 zugegeben mg/L
export-planned_mg_L = SO2 geplant mg/L
export-planned_free_mg_L = Freie SO2 als Ziel mg/L
export-volume_L = Volumen L
export-stock-left = Rest im Bestand (g, mL, Tabletten)
export-us-gallons = Volumen US gal
export-ph = pH
export-free_mg_L = Freie SO2 mg/L
export-total_mg_L = Gesamte SO2 mg/L
export-temperature_C = Temperatur °C
export-alcohol_percent = Alkohol % vol
export-sugar_g_L = Zucker g/L
export-over_rule = Über dem Grenzwert von
export-order = Führt Auftrag aus Nr.
export-remark = Notiz
export-corrects = Nimmt zurück Nr.
export-reason = Grund
export-struck_by = Gestrichen durch Nr.
export-struck-reason = Gestrichen weil
export-calculated = Gerechnet
export-is-calculated = gerechnet
export-is-not-calculated = nicht gerechnet
export-at = Ausgeführt (mit Zone)
export-noted_at = Eingetragen (mit Zone)
export-by = Person Nr.
export-name = Name
export-style = Farbe
export-category = Sorte
export-product = Erzeugnis
export-organic = Bio
export-stage = Stadium
export-designated_mg_L = Sondergrenze mg/L
export-uplift = Ausnahmejahr
export-quality = Qualitätsschaumwein
export-pdo = Geschützter Ursprung
export-bulk = Fasswein für den Export
export-density_kg_L = Dichte kg/L
export-reserve_mg_L = Reserve für die Füllung mg/L
export-lot = Genannte Partie
export-capacity_L = Fassungsvermögen L
export-until = Bis
export-strength_of = Stärke von
export-tablet_SO2_g = SO2 je Tablette g
export-tablet_salt_g = Salz je Tablette g
export-key = Schlüssel

import-vessels = Gebinde in der Datei: { $vessels }.
import-log = Einträge in der Datei: { $entries }. Gebinde: { $vessels }. Leute: { $people }.
import-not-understood = Nicht verstanden und ausgelassen: { $count ->
        [one] Zeile { $lines }
       *[other] Zeilen { $lines }
    }.
import-not-taken = Nicht daraus übernommen: { $list }.
import-not-taken-name = { $name ->
        [ph] pH
        [free_mg_L] freie SO2
        [total_mg_L] gesamte SO2
        [temperature_C] Temperatur
       *[other] { $name }
    }
import-unit = Volumen ohne Einheit gelten als { $unit ->
        [L] Liter
        [hL] Hektoliter
        [mL] Milliliter
        [m3] Kubikmeter
        [galUS] US-Gallonen
       *[galUK] englische Gallonen
    }.
import-problem = { $code ->
        [empty] Die Datei ist leer.
        [too-large] Die Datei ist zu groß: höchstens 512 kB, unser eigener Export 8 MB.
        [too-many-rows] Die Datei hat zu viele Zeilen: höchstens 20.000.
        [too-many-columns] Die Datei hat zu viele Spalten: höchstens 200.
        [cell-too-long] Eine Zelle der Datei ist zu lang.
        [not-a-table] Das ist keine Tabelle, die ich lesen kann. Schick CSV oder XLSX, oder einen Text mit je einem Gebinde pro Zeile: T4; 5200 L; rot
        [old-spreadsheet] Das Tabellenformat ist zu alt oder mit Passwort gesperrt. Speicher es als XLSX oder CSV, ohne Passwort.
        [broken] Die Datei ist beschädigt, oder ein Anführungszeichen ist nie geschlossen. Speicher sie neu als XLSX oder CSV.
        [too-heavy] Die Datei zu lesen dauert zu lange oder braucht zu viel Speicher. Teil sie auf oder schick CSV.
        [columns-missing] Das sieht nach meinem eigenen Export aus, aber Spalten fehlen: { $about }.
        [columns-unknown] Das sieht nach meinem eigenen Export aus, aber diese Spalten kenne ich nicht, oder sie stehen doppelt: { $about }.
        [unclear-numbers] Ich erkenne nicht, ob die Zahlen Dezimalkomma oder Dezimalpunkt haben: speicher die Datei mit einem davon, ohne Tausenderzeichen.
        [not-understood] Das sieht nach meinem eigenen Export aus, aber diese Zeilen sind keine Einträge: { $lines }.
        [doubled] Eine Nummer oder ein Schlüssel dieser Zeilen steht doppelt in der Datei: { $lines }.
        [refers-outside] Diese Zeilen betreffen Einträge, die nicht in der Datei sind: { $lines }. Exportier alles und lies das ein.
        [already-noted] Diese Zeilen sind hier schon eingetragen: { $lines }.
       *[no-vessels] Ich habe kein Gebinde darin gefunden. Eine Zeile sieht so aus: T4; 5200 L; rot
    }
import-nothing-taken = Nichts davon wurde übernommen.

## Pictures

picture-unit = SO2 in { $unit }
picture-free = frei { $free } ({ $day })
picture-total = gesamt { $total } ({ $day })
picture-bound = gebunden: der Abstand dazwischen
picture-odd = frei über gesamt
picture-needed =
    { $ph ->
        [no-ph] frei nötig (pH gerade unbekannt)
        [no-target] frei nötig (gerade kein übliches Ziel)
       *[other] braucht { $needed } frei bei pH { $ph }
    }
picture-limit = Grenzwert gesamt { $limit }
picture-added = zugegeben
picture-added-thinned = zugegeben (nicht jede Zahl hat Platz)
picture-added-unknown = zugegeben, Menge unbekannt
picture-blended = verschnitten

picture-head = { $vessel } seit { $day }. Messwerte: { $readings }, Zugaben: { $additions }.
picture-last = { $list }.
picture-last-free = frei { $value } { $unit } ({ $day })
picture-last-total = gesamt { $value } { $unit } ({ $day })
picture-last-bound = gebunden { $value } { $unit } ({ $day })
picture-needs = pH { $ph } ({ $day }): für { $molecular } molekular braucht es { $needed } frei.
picture-needs-nothing =
    { $why ->
        [no-ph] pH gerade unbekannt, also auch die nötige freie SO2.
       *[no-target] Gerade kein übliches Ziel dafür.
    }
picture-limit-of-total = Grenzwert gesamt: { $limit }.
picture-additions =
    { $earlier ->
        [none] Zugegeben, { $unit }: { $list }.
       *[other] Zugegeben, { $unit }: { $list }; { $earlier } frühere.
    }
picture-addition =
    { $added ->
        [none] unbekannt ({ $day })
       *[other] { $added } ({ $day })
    }
picture-unmeasured = Seit der Zugabe vom { $day } ist frei nicht gemessen.
picture-came-from = Er kam am { $day } aus { $vessels }: frühere Werte stehen dort.
picture-was-blended = Am { $day } verschnitten: die Werte davor sind von einem anderen Wein.
picture-empty = Leer seit { $day }.
picture-is-odd = Frei über gesamt ({ $days }): eins von beiden stimmt nicht, miss noch einmal.
picture-nothing = Kein Bild von { $vessel }: im jetzigen Wein ist noch keine SO2 gemessen.

# Plain questions: the answer, a figure with its source, and what to send next.
question-small-or-large = Seltener und größer. Eine kleine Gabe kann ganz binden und nichts frei lassen.
question-small-or-large-why = Von einer Gabe bleiben 35 bis 67 % frei; die veröffentlichten Zahlen gehen auseinander, also am Tag danach messen.
question-small-or-large-next = Für deinen Wein: T4 55 hl pH 3,58 frei 21
question-how-often = Tanks etwa jeden Monat, Fässer alle zwei Wochen, und einen Tag nach jeder Gabe (üblich, ohne Quelle).
question-how-often-why = Früher, wenn es warm ist, das Gebinde halb voll oder wenig frei da ist.
question-how-often-next = Was hier dran ist: fällig
question-which-figure = Molekulare schützt; sie folgt aus frei und pH. Im Gesetz zählt gesamt: freie und gebundene zusammen.
question-which-figure-why = 0,6 bis 0,8 mg/L molekular ist die übliche Spanne (Understanding Wine Chemistry, 2016).
question-which-figure-next = Deiner: pH 3,5 frei 20
question-which-yield = 57,6 %: so viel SO2 steckt nach der Formel in reinem Kaliumdisulfit, und so rechne ich.
question-which-yield-why = 50 % ist eine Faustzahl der Praxis mit Reserve: derselbe Wunsch braucht 15 % mehr Pulver.
question-which-yield-next = Dein Etikett sagt etwas anderes? Schreib es: KDS 57%, oder KDS 96%
question-tablets-or-powder = Dieselbe SO2, wenn die Größe stimmt. Pulver dosiert feiner, braucht aber eine Waage.
question-tablets-or-powder-why = Brausetabletten zählen in Gramm SO2 (2 oder 5 g), Campden-Tabletten in Gramm Salz (0,44 oder 0,55 g): üblich, ohne Quelle.
question-tablets-or-powder-next = Was sie bringen: 2 Brausetabletten zu 5 g in 225 L
question-old-powder = Offen und feucht wird es schwächer, etwa ein Zehntel im Jahr (üblich, ohne Quelle). Verklumpt: nicht in Wein.
question-old-powder-why = Nie in den Sack riechen. Mit altem Pulver am Tag danach messen: es kann weniger hineingekommen sein als gewogen.
question-old-powder-next = Das Datum merken: erhalten 1 kg KDS Charge 12
question-wait-before-yeast = 12 bis 24 Stunden nach der Gabe (üblich, ohne Quelle).
question-wait-before-yeast-why = Von 50 mg/L im Most sind etwa 16 später als gesamte da (deutscher Fachtext, 2012).
question-wait-before-yeast-next = Die Dosis: Most 20 hl 40 mg/l zugeben
question-after-malolactic = Wenn die Äpfelsäure nachweislich weg ist, nicht vorher.
question-after-malolactic-why = Die Bakterien brauchen frei unter 5–10 und gesamt unter 30–40 mg/L (AWRI, für pH 3,3 bis 3,5).
question-after-malolactic-next = Dann: T4 BSA fertig, und die Werte dazu
question-ppm-and-mg-L = In Wein gilt 1 ppm als 1 mg/L, und 1 g/hL sind 10 mg/L.
question-ppm-and-mg-L-why = Vom Pulver ist es weniger: 10 g/hL Kaliumdisulfit bringen 57,6 mg/L SO2 (nach der Formel).
question-ppm-and-mg-L-next = Probier: 10 g KDS in 1 hl
question-teaspoons = Nie mit Löffeln. Ein gestrichener Teelöffel Pulver wiegt grob 5 bis 6 g (üblich, ohne Quelle).
question-teaspoons-why = Kleine Mengen brauchen eine Waage mit 0,1 g oder eine Lösung mit 10 % und eine Spritze.
question-teaspoons-next = Die Lösung: 1 L KDS-Lösung 10% ansetzen
question-fell-short = Ein Teil jeder Gabe bindet, meist ein Drittel bis die Hälfte, mehr bei jungen, süßen oder faulen Partien. Luft nimmt auch etwas.
question-fell-short-why = Oder: nicht gemischt, zu früh gemessen, altes Pulver, anderes Volumen. 1 mg/L Sauerstoff kann 4 mg/L SO2 verbrauchen (nach Formel).
question-fell-short-next = Messen, dann: T4 frei 24. Was es brachte: T4?
question-strip-reads-otherwise = Trau dem Labor. Streifen und Schnelltests sind ein erster Blick; dosier nach Destillation oder Jodtitration.
question-strip-reads-otherwise-why = Verfahren mit Säure zeigen bei Rotwein zu viel, bis zu 66 % (Virginia, 2022). Jod zählt Ascorbinsäure mit.
question-strip-reads-otherwise-next = Deine Titration: AO 20 mL Probe, 1,9 mL 0,01 N
question-stop-fermentation = Nein. Schwefel stoppt keine laufende Gärung, und Flaschen mit Zucker und Hefe können platzen.
question-stop-fermentation-why = Kälte und Sterilfilter, durch jemanden vom Fach; danach hält man Süßwein bei etwa 1,5 mg/L molekular (eine veröffentlichte Tabelle).
question-stop-fermentation-next = Wenn er ruht: T4 10 hl süß pH 3,3 frei 10
question-sorbate = Sorbat nie allein: es hemmt Hefe, nicht Bakterien, und die machen daraus einen Geranienton.
question-sorbate-why = Daneben behält der Wein seine volle freie SO2 für 0,8 mg/L molekular (üblich, ohne Quelle).
question-sorbate-next = Diese SO2: T4 10 hl pH 3,4 frei 12
question-allergy = Frag einen Arzt: hier kann niemand sagen, was für einen Menschen sicher ist. Bei Asthma kann Sulfit gefährlich sein.
question-allergy-why = Etiketten nennen es ab 10 ppm gesamt (USA, 27 CFR 4.32(e)), über 10 mg/L in der EU (1169/2011). Kopfweh hat viele Gründe.
question-allergy-next = Was ein Wein hat: T4?
question-law = Das hängt an Markt, Farbe und Zucker. OIV: rot 150, weiß und Rosé 200 mg/L gesamt bis 4 g/L Zucker, darüber 300.
question-law-why = (OIV-MA-C1-01.) Keine Rechtsberatung: klär es für deinen Markt.
question-law-next = Für deinen Markt: Grenzwert rot RZ 3 EU
question-gas = Nur Leute, die dafür geschult und befugt sind; Atemschutz, Lüftung, eine zweite Person draußen.
question-gas-why = 0,5 ppm über eine Schicht ist der EU-Grenzwert (2017/164); 100 ppm sind sofort lebensgefährlich (NIOSH).
question-gas-next = Ohne Gas: T4 55 hl pH 3,58 frei 21 KDS
question-potassium-or-sodium = Kalium für Wein. Natrium ist für Gerät: die OIV nennt es nicht für Wein.
question-potassium-or-sodium-why = Sie wiegen nicht gleich: 57,6 % SO2 im Kaliumsalz, 67,4 % im Natriumsalz (nach der Formel).
question-potassium-or-sodium-next = Schreib dazu, welches da ist: T4 55 hl pH 3,58 frei 21 KDS
question-when-to-measure = Einen Tag nach dem Einmischen, besser zwei (üblich, ohne Quelle).
question-when-to-measure-why = Vorher ist ein Teil noch nicht gebunden: der Wert ist zu hoch.
question-when-to-measure-next = Dann: T4 frei 24
question-how-to-mix = Erst in kaltem Wasser oder wenig Wein lösen, etwa 50 g auf den Liter (Fachzeitschrift, 2009). Unter Rühren zugießen.
question-how-to-mix-why = Handschuhe, Schutzbrille, Luft. Nie mit Säure in ein Gefäß; Wein voller CO2 schäumt über.
question-how-to-mix-next = Eine Lösung: 5 L KDS-Lösung 5% ansetzen
question-pH-matters = Je tiefer der pH, desto mehr der freien SO2 ist molekular, und die schützt.
question-pH-matters-why = Für 0,8 mg/L molekular: 26 frei bei pH 3,3, 79 bei pH 3,8 (Universität von Kalifornien, 1982).
question-pH-matters-next = Deiner: pH 3,5 frei 20
question-which-target = Weiß und Rosé 0,8 mg/L molekular, rot 0,6, süß 1,5, wenn ihr nichts anderes setzt.
question-which-target-why = Veröffentlicht: 0,6 bis 0,8 für Stabilität (Understanding Wine Chemistry, 2016), rot zur Füllung 0,4 bis 0,6 (nach Kalifornien, 1982).
question-which-target-next = Ändern: Ziel 0,5 für Rotweine
question-stock-keeps = Tage, nicht Wochen: frisch ansetzen, gut schließen, Datum drauf (üblich, ohne Quelle).
question-stock-keeps-why = Die OIV nennt Lösungen von SO2 und Bisulfit unbeständig.
question-stock-keeps-next = Frisch: 1 L KDS-Lösung 10% ansetzen
question-too-much = Nichts mehr zugeben. Zeit, Luft und Abstich senken freie SO2; ein Verschnitt senkt frei und gesamt.
question-too-much-why = Ab etwa 2 mg/L molekular riecht man sie (Understanding Wine Chemistry, 2016). Peroxid: nur Fachleute, wo es erlaubt ist.
question-too-much-next = Wo er steht: T4?
question-no-sulfite = Das geht, und der Wein hängt dann an Kälte, Sauberkeit, vollen Gebinden, tiefem pH und schnellem Verkauf.
question-no-sulfite-why = Hefe bildet selbst etwas, meist unter 30 mg/L: „ohne Schwefelzusatz“ ist nicht „ohne Schwefel“.
question-no-sulfite-next = Was er hat: T4 pH 3,5 frei 5
question-bottling = Einige Tage vorher messen; die letzte Gabe kommt vor der Füllung hinein, gemischt und gemessen.
question-bottling-why = Jedes mg/L aufgenommener Sauerstoff kann bis 4 mg/L freie SO2 nehmen (nach Formel).
question-bottling-next = Mit Sauerstoff: Füllung T4 40 hl pH 3,4 frei 22 Sauerstoff 2 mg/l

## The chemical store
stock-tablets =
    { $unit ->
        [tablet] { " " }Tablette
        [tablets] { " " }Tabletten
       *[none] { "" }
    }
stock-of =
    { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    }{ $size ->
        [none] { "" }
       *[other] , je { $size } g
    }
stock-none = Im Bestand ist noch nichts eingetragen. Sag, was da ist oder kam: erhalten 25 kg KDS Charge 4471 von Nordbedarf
stock-none-of = { additive } steht nicht im Bestand. Sag, was kam (erhalten …), oder zähl es (Bestand KDS 3,2 kg).
stock-shelf =
    { stock-of }: { $amount }{ stock-tablets }{ $counted ->
        [none] .
       *[other] { " " }(gezählt { $counted }).
    }
stock-lot =
    { "  " }{ $lot ->
        [none] ohne Charge
       *[other] Charge { $lot }
    }: { $amount }{ stock-tablets }, seit { $day }{ $supplier ->
        [none] { "" }
       *[other] { " " }von { $supplier }
    }
stock-negative = ⚠ { stock-of }: nach dem Buch { $amount }{ stock-tablets }: ein Eingang fehlt. Trag ihn ein, oder zähl: Bestand KDS 3,2 kg
stock-low = ⚠ Wird knapp: noch { $amount }{ stock-tablets } { stock-of } im Bestand.
stock-left = Jetzt im Bestand: { $amount }{ stock-tablets } { stock-of }.
stock-short = ⚠ Im Bestand nach dem Buch: { $amount }{ stock-tablets } { stock-of }, weniger als nötig.
stock-old = ⚠ Über ein Jahr da: ein offener Sack wird schwächer (üblich, ohne Quelle). Miss danach die freie SO2.
stock-oldest-lot =
    { $lot ->
        [none] Aus der ältesten von mehreren genommen; sonst nenn die Charge: zugegeben …, Charge { $other }
       *[other] Aus Charge { $lot } genommen, der ältesten; sonst nenn sie: zugegeben …, Charge { $other }
    }
stock-lot-unknown = Charge { $lot } ist nach dem Buch nicht da: aus der ältesten genommen.
stock-noted =
    Eingetragen { $entry }: { $event ->
        [received] erhalten
        [used] verbraucht
        [discarded] entsorgt
       *[counted] gezählt
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }von { $supplier }
    }{ $purpose ->
        [none] { "" }
       *[other] { " " }({ $purpose })
    }, { $when }.
stock-corrected =
    Im Buch standen { $was }: jetzt { $amount }{ stock-tablets } { $way ->
        [more] mehr
       *[less] weniger
    }.
stock-not-kept = Davon ist noch nichts im Bestand, also wird nichts abgebucht. Zähl es: Bestand KDS 3,2 kg
stock-lacks =
    { $what ->
        [additive] Welches Mittel? Schreib: erhalten 25 kg KDS
        [strength] Welche Stärke: { additive }? Schreib: erhalten 10 L schweflige Säure 6%
        [size] Tabletten zu wie viel Gramm? Schreib: erhalten 50 Tabletten 5 g
        [volume] { additive } wird nach Volumen zugegeben. Schreib: erhalten 10 L schweflige Säure 6%
        [one] Ein Mittel je Nachricht. Schreib: erhalten 25 kg KDS
       *[amount] Wie viel { additive }, in welcher Einheit? Schreib: { $event ->
            [counted] Bestand KDS 3,2 kg
            [used] verbraucht 200 g KDS zum Spülen
            [discarded] entsorgt 1 kg KDS
           *[received] erhalten 25 kg KDS
        }
    }

# The laboratory: what a titration comes to

titration-result = { $vessel ->
    [none] { $of ->
        [total] Gesamte
       *[other] Freie
    } SO2 { $result } { $unit }
   *[other] { $vessel }: { $of ->
        [total] gesamte
       *[other] freie
    } SO2 { $result } { $unit }
}, nach { $method ->
    [aeration] Destillation (AO)
   *[other] Jod
}.
titration-too-much = Mehr, als Wein hat: prüf Probe, Bürette und Stärke der Maßlösung. Nicht eingetragen.
titration-molar = { $molar } M Jod sind { $normal } N: ein Mol nimmt doppelt auf.
titration-ascorbic-asked = Jod zählt Ascorbinsäure mit: { $amount } mg/L davon zeigen +{ $counts } { $unit }. Ist welche drin, häng „Ascorbin { $amount }“ an.
titration-precision = Zwei Ergebnisse eines Weins dürfen in einem Labor um { $again } abweichen, zwischen zweien um { $other } (veröffentlicht).
titration-red-high = Rotwein: Verfahren mit Säure zeigen freie SO2 zu hoch, in einer Studie bis zu 66 %. Abgezogen wird nichts; bleib bei einem Verfahren.
titration-name-vessel = Zum Eintragen setz das Gebinde davor: T4 …
titration-read = Gelesen: { $list }.
titration-sample = Probe { $volume } mL
titration-titrant = Verbrauch { $volume } mL
titration-blank = Blindwert { $volume } mL
titration-strength = { $unit ->
    [none] { $strength }
   *[other] { $strength } { $unit }
}
titration-iodate = { $mass } mg Jodat in { $volume } mL
titration-ascorbic = Ascorbinsäure { $amount } mg/L
titration-free-assumed = Als freie SO2 genommen; schreib „gesamt“, wenn die Probe für gesamt vorbereitet war.
titration-no-blank = Kein Blindwert abgezogen; häng „Blindwert 0,1“ an, wenn du einen hast.
titration-asks = { $missing ->
    [method] Mit Natronlauge (AO) oder mit Jod titriert? Schreib es dazu: AO 20 mL Probe, 1,9 mL 0,01 N
    [sample] Wie viel mL Wein? Schick alles: { $method ->
        [iodine] Jod 25 mL Probe, 1,4 mL 0,02 N
       *[other] AO 20 mL Probe, 1,9 mL 0,01 N
    }
    [titrant] Wie viel mL aus der Bürette? Schick alles: { $method ->
        [iodine] Jod 25 mL Probe, 1,4 mL 0,02 N
       *[other] AO 20 mL Probe, 1,9 mL 0,01 N
    }
    [unit] Ist die Jodlösung in N oder M? Eins ist die Hälfte vom anderen. Schreib N oder M hinter die Stärke.
   *[strength] Wie stark ist die Maßlösung? Schick alles, mit N oder M: { $method ->
        [iodine] Jod 25 mL Probe, 1,4 mL 0,02 N
       *[other] AO 20 mL Probe, 1,9 mL 0,01 N
    }
}
titration-either = { $strength } N ergibt { $normal } { $unit }, { $strength } M ergibt { $molar } { $unit }.
button-keep-result = Eintragen
button-keep-of = { $vessel }{ $of ->
    [total] {" "}gesamt
   *[free] {""}
} eintragen

# The laboratory: how far a dose may be off, tables, both bases

range-dose = { $vessel ->
    [none] Als
   *[other] { $vessel }: als
} Spanne (95 %): { $amount ->
    [none] { $low }–{ $high } { $unit } SO2
   *[other] { $amount }{ $count ->
        [several] {" "}insgesamt
       *[one] {""}
    }, das sind { $low }–{ $high } { $unit } SO2
}.
range-sure = Nach der Dosis sind { $molecular } { $unit } molekular sicher, wenn so viel bindet wie gerechnet.
range-sure-unbound = Bindet nichts, sind nach der Dosis { $molecular } { $unit } molekular sicher.
range-sure-low = Unter 10 { $unit } frei kann eine Dosis ganz binden: sicher sind nur { $molecular } { $unit } molekular. Nach einem Tag messen.
range-rests = Beruht auf pH ± { $ph } und frei ± { $free } { $unit }{ $said ->
    [both] .
    [one] {" "}(was du nicht gesagt hast: üblich, ohne Quelle).
   *[none] {" "}(üblich, ohne Quelle). Deine: pH 3,58±0,03 frei 21±2
}
range-limit = Am oberen Ende kann gesamt über den Grenzwert gehen.
range-nothing = Eine Spanne braucht erst eine Dosis. Schick Werte wie: T4 55 hl pH 3,58±0,03 frei 21
table-head = Freie SO2 ({ $unit }) für molekular { $targets }, { $basis ->
    [oiv] nach OIV bei 12 % vol und 20 °C (pK { $pK })
   *[other] pK { $pK }
}:
table-row = pH { $ph }: { $free }
table-care = Ziele sind für pK 1,81 veröffentlicht. Über 60 frei: denk an gesamt und Geschmack.
molecular-head = { $vessel }: pH { $ph }{ $free ->
    [none] , keine freie SO2 eingetragen.
   *[other] , frei { $free } { $unit } ({ $day }).
}
molecular-base = { $basis ->
    [oiv] Nach OIV, { $alcohol } % vol{ $known ->
        [yes] {""}
       *[no] {" "}(nicht genannt)
    }, 20 °C
   *[other] Nach pK { $pK }
}: { $molecular ->
    [none] { $target } braucht { $needed } frei.
   *[other] { $molecular } molekular; { $target } braucht { $needed } frei.
}
molecular-meaning = Nach pK 1,81 braucht dasselbe Ziel { $times }-mal so viel freie SO2: { $dose } { $unit } zuzugeben, nach OIV { $other }. Veröffentlichte Ziele beruhen auf pK 1,81; { $basis ->
    [oiv] dieser Keller rechnet nach OIV.
   *[other] dieser Keller rechnet auch so.
}

# This wine: what it bound, when it needs more, too much, blending

lab-lacks = { $vessel }: { $what ->
    [ph] kein pH eingetragen. Schick einen: T4 pH 3,58 frei 21
    [free] keine freie SO2 eingetragen. Schick sie: T4 frei 21
    [total] keine gesamte SO2 eingetragen. Schick sie: T4 gesamt 80
   *[target] so gilt kein Ziel dafür; nichts wird gerechnet.
}
learned = Dieser Wein hat von den letzten { $count } Gaben { $share } % (± { $spread }) gebunden.
learned-offer = Dieser Wein hat von den letzten { $count } Gaben { $share } % (± { $spread }) gebunden. { $limit ->
    [passes] Was das braucht, kommt dem Grenzwert zu nahe.
   *[within] Danach: { $amount ->
        [none] { $dose } { $unit }
       *[other] { $amount } ({ $dose } { $unit })
    }. Du wählst.
}
forecast-below = { $vessel }: freie SO2 fällt unter { $needed } { $unit } { $day ->
    [far] in mehr als zwei Jahren
   *[other] etwa am { $day }
}{ $from ->
    [now] , vielleicht ist sie schon darunter.
    [far] .
   *[other] {" "}({ $by ->
        [readings] 9 von 10: {""}
       *[published] {""}
    }{ $from } bis { $to ->
        [far] mehr als zwei Jahre
        [never] vielleicht nie
       *[other] { $to }
    }).
}
forecast-steady = { $vessel }: nach seinen Werten fällt die freie SO2 nicht; { $from ->
    [now] miss, um sicher zu sein.
    [far] unter { $needed } { $unit } frühestens in zwei Jahren.
   *[other] unter { $needed } { $unit } frühestens am { $from }.
}
forecast-by-readings = Nach { $count } Werten seit der letzten Gabe: { $lost } % Verlust in 30 Tagen.
forecast-by-rates = { $container ->
    [bottle] Nach einer Studie an Flaschen, nicht nach diesem Wein: nach 3 Jahren noch 45 % bei 14 °C, 20 % bei 15–26 °C.
   *[other] Nach dem, was Fässer verlieren, nicht nach diesem Wein: 3–10 mg/L im Monat (üblich, ohne Quelle). { $fewest } Messwerte zeigen seinen eigenen; da { $number ->
        [one] ist { $count }
       *[many] sind { $count }
    }.
}
forecast-measure = { $from ->
    [now] Jetzt messen.
    [far] Messen wie üblich.
   *[other] Messen bis { $from }.
}
forecast-need = Er braucht { $needed }: pH { $ph } vom { $day }, { $molecular } molekular.
forecast-none = { $vessel }: { $why ->
    [unmeasured] seit der letzten Gabe keine freie SO2 gemessen. Miss sie, dann frag noch einmal.
    [below-already] freie SO2 ist bei oder unter den { $needed } { $unit }, die der pH verlangt. Schick die Werte für eine Dosis.
   *[no-rate] noch keine Prognose. Für Tanks ist kein Verlust hinterlegt, und sein eigener braucht { $fewest } Messwerte seit der letzten Gabe; da { $number ->
        [one] ist { $count }
       *[many] sind { $count }
    }.
}
forecast-unlanded = { $vessel }: die letzte Gabe ist noch nicht nachgemessen. Miss erst die freie SO2.
blend-share = { $vessel } mit { $other }: { $starts ->
    [as-it-is] { $vessel } hält die Grenzen schon so; bis { $most } % { $other } dürfen dazu.
   *[other] von { $least } bis { $most } % { $other } im Verschnitt.
}{ $volume ->
    [none] {""}
   *[other] {" "}Mindestens { $volume } { $other } auf ganz { $vessel }{ $enough ->
        [no] ; es sind nur { $held } da.
       *[yes] .
    }
}
blend-candidates = Andere, die { $vessel } in seine Grenzen bringen, der kleinste Anteil zuerst:
blend-candidate = { $other }: { $least }–{ $most } %{ $volume ->
    [none] {""}
   *[other] , mindestens { $volume }{ $enough ->
        [no] {" "}(es sind { $held } da)
       *[yes] {""}
    }
}
blend-nobody = { $any ->
    [none] Kein anderes Gebinde dieser Farbe ist fertig und hat freie SO2 eingetragen, also gibt es keinen Partner für { $vessel }.
   *[other] Keins von { $count } anderen Gebinden mit Werten bringt { $vessel } in seine Grenzen.
}
blend-fails = { $vessel } mit { $other }: kein Anteil hilft: { $fails ->
    [total] gesamt bleibt über dem Grenzwert.
    [free] frei bleibt über dem Grenzwert.
    [molecular] molekular bleibt außerhalb seiner Grenzen.
   *[unmeasured] bei einem Wein ist etwas nicht gemessen.
}
blend-figures = Nach eingetragener freier SO2: { $list }.
blend-figure = { $vessel } { $free } ({ $day })
blend-bounds = Eingehalten: { $list }.
blend-bound-total = gesamt höchstens { $limit }
blend-bound-no-total = gesamt nicht (eins ist nicht gemessen)
blend-bound-free = frei höchstens { $limit }
blend-bound-molecular = molekular { $least ->
    [none] höchstens { $most }
   *[other] { $least }–{ $most }
}, bei dem schlechteren pH der beiden
blend-bound-no-ph = molekular nicht (ein pH ist nicht gemessen)
blend-whole = Beide ganz, { $volume }: { $free ->
    [none] frei unbekannt
   *[other] frei { $free }
}, { $total ->
    [none] gesamt unbekannt
   *[other] gesamt { $total }
}, bevor sich die Bindung verschiebt.
blend-care = Den pH eines Verschnitts rechne ich nicht: misch ein Glas in diesem Anteil, miss pH, frei und gesamt, dann entscheide. Andere Grenzen beider Weine zählen auch.
too-much-head = { $vessel }: { $free ->
    [none] frei nicht gemessen
   *[other] frei { $free }
}{ $total ->
    [none] {""}
   *[other] , gesamt { $total }
}{ $molecular ->
    [none] {""}
   *[other] , molekular { $molecular }
}. Erst noch einmal messen: oft stimmt eine Zahl nicht.
too-much-wait = Warten: { $container ->
    [barrel] Fässer verlieren { $least }–{ $most } mg/L frei im Monat (üblich, ohne Quelle).
    [bottle] Flaschen verlieren es über Jahre; herausnehmen kann man nichts.
   *[tank] für Tanks ist kein Verlust hinterlegt; Fässer verlieren { $least }–{ $most } mg/L frei im Monat (üblich, ohne Quelle).
} Gesamt fällt kaum.
too-much-air = Luft, ein offener Abstich: 1 mg/L Sauerstoff nimmt bis { $each } mg/L (Theorie), ein Wein voller Luft { $low }–{ $high } (ein Hobbyartikel). Der Wein altert dabei.
too-much-blend = Ein Verschnitt senkt auch gesamt: Verschnitt { $vessel }
too-much-peroxide = Peroxid: { $says ->
    [listed] in Australien auf der Liste, höchstens { $left } mg/L Rest (AWRI, damals).
    [not-listed] in der EU nicht erlaubt (AWRI, damals).
    [old-text] eine ältere Tabelle der USA nennt es für enge Zwecke; zu prüfen (27 CFR 24.246, 24.247).
   *[none] für deinen Markt ist kein Text hinterlegt.
} Frag erst deine Behörde und einen Önologen; ich nenne keine Mengen.
