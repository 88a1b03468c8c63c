### Ce que nous disons, en français. Les chiffres arrivent en texte fini ; additifs, stades et codes comme identifiants.
### Une ligne dit une chose ; un téléphone en montre environ 45 signes par rangée. On tutoie ; les gestes sont à l’infinitif.

## Pieces that other sentences use

list-separator = {", "}
barrel-name = barrique
cautions-separator = {" "}
dose-in-all-separator = {" et "}
cautions-of-separator = {" "}
assumed-separator = {" ; "}

additive =
    { $additive ->
        [potassium-metabisulfite] métabisulfite de potassium E224
        [sodium-metabisulfite] métabisulfite de sodium E223
        [potassium-metabisulfite-solution] métabisulfite de potassium E224 en solution
        [sodium-metabisulfite-solution] métabisulfite de sodium E223 en solution
        [potassium-bisulfite-solution] bisulfite de potassium E228
        [ammonium-bisulfite-solution] bisulfite d’ammonium
        [sulfur-dioxide-solution] solution sulfureuse E220
        [sulfur-dioxide-gas] SO2 gazeux E220
        [tablet] comprimés effervescents
       *[other] produit sulfitant
    }
stage-now =
    { $stage ->
        [must] moût
        [fermenting] encore en fermentation
        [malolactic] malo encore à venir
        [base] vin de base
        [bottled] en bouteille
       *[finished] fermentations finies
    }
weigh =
    { $vessel ->
        [none] Peser
       *[other] { $vessel } : peser
    }
measure =
    { $vessel ->
        [none] Mesurer
       *[other] { $vessel } : mesurer
    }
take =
    { $vessel ->
        [none] Prendre
       *[other] { $vessel } : prendre
    }
at =
    { $vessel ->
        [none] {""}
       *[other] { $vessel } :{" "}
    }
for-each =
    { $count ->
        [one] {""}
       *[other] {" "}chacun
    }
target =
    { $kind ->
        [molecular] { $value } moléculaire
        [free] { $value } de libre
       *[add] + { $value }
    }

## The first line: a dose

tablet-word =
    { $unit ->
        [tablet] comprimé
       *[tablets] comprimés
    }
tablets-of =
    { $additive ->
        [tablet] { $amount } { tablet-word } { $unit ->
            [tablet] effervescent
           *[tablets] effervescents
        } ({ $size } g de SO2 par comprimé)
       *[other] { $amount } { tablet-word } de { $size } g de { additive }
    }
measured =
    { $unit ->
        [tablet] { tablets-of }{ for-each }
        [tablets] { tablets-of }{ for-each }
        [solution] { $amount } de { additive } à { $strength } %{ for-each }
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
dose-gas = { weigh } { $amount } de SO2 gazeux{ for-each } : personnel formé seulement, appareil respiratoire à portée, au poids uniquement
dose-in-all = Pour les { $count } : { $list }.
in-all-stock = { $amount } de la solution à { $strength } %
dose-tablet-too-large = { at }un demi-comprimé{ for-each } est déjà trop.
dose-tablets-give = Les comprimés seuls donnent { $gives } sur { $wanted } { $unit }.
dose-stock = Ou { $amount } de sa solution à { $strength } %{ for-each }.
dose-only-stock = { measure } { $amount } de { additive } à { $strength } %{ for-each }
dose-rest-as-stock = Le reste : { $amount } de { additive } à { $strength } %{ for-each }.
dose-negligible = { at }rien qui vaille un ajout (il manque { $short }).
dose-too-fine = { at }trop peu pour peser ou mesurer (il manque { $short }) : faire une solution plus faible.
dose-gas-too-little = { at }{ $amount }, c’est trop peu pour du gaz : prendre une solution.
dose-bottled = { at }en bouteille : ajouter voudrait dire rouvrir chaque bouteille. Demander d’abord.
refused-ammonium = { at }le bisulfite d’ammonium est réservé au raisin et au moût (OIV) : pas pour ce vin ; demander d’abord.
refused-ammonium-must =
    { $stage ->
        [assumed] Pris pour un vin aux fermentations finies. C’est du moût ? Alors tout réécrire, avec le mot moût.
       *[said] C’est du moût ? Alors tout réécrire, avec le mot moût.
    }
dose-nothing = { at }rien à ajouter.
dose-rate = { at }{ $dose } de SO2 à ajouter, soit { measured } par { $per }
dose-rate-bare = { at }{ $dose } de SO2 à ajouter
dose-need = { at }à pH { $ph }, { $molecular } moléculaire demande { $free } de libre
dose-now = { at }{ $molecular } moléculaire maintenant (pH { $ph }, { $free } de libre)

## The law

law-of =
    { $region ->
        [oiv] code international
        [eu] UE
        [uk] Royaume-Uni
        [us] États-Unis
        [ca] Canada
        [ca-qc] Québec
        [au] Australie
        [nz] Nouvelle-Zélande
        [za] Afrique du Sud
        [ar] Argentine
        [cl] Chili
        [br] Brésil
        [jp] Japon
        [kr] Corée
        [cn] Chine
        [codex] Codex
        [ch] Suisse
        [ge] Géorgie
        [hk] Hong Kong
        [eaeu] Union eurasiatique
        [uy] Uruguay
        [in] Inde
        [md] Moldavie
       *[mercosur] Mercosur
    }
law-decides =
    { $region ->
        [oiv] {" "}; la loi de ton pays décide
       *[other] {""}
    }
rule-sugar =
    { $band ->
        [under] {" "}à moins de { $high } g/L de sucre
        [to] {" "}jusqu’à { $high } g/L de sucre
        [from] {" "}à partir de { $low } g/L de sucre
        [above] {" "}au-dessus de { $low } g/L de sucre
        [between] {" "}de { $low } à { $high } g/L de sucre
       *[none] {""}
    }
rule-class =
    { $class ->
        [sweet-300] , doux en dérogation
        [sweet-350] , doux en dérogation
        [sweet-400] , doux en dérogation
        [national-pdo] , AOP
        [national-pdo-dry] , AOP sec
        [national-pdo-other] , AOP non sec
        [dry] , sec
        [sweet] , doux
        [bulk-export] , vrac pour l’export
        [made-with-organic] , issu de raisins bio
       *[none] {""}
    }
rule-what =
    { $what ->
        [red] rouge
        [pale] blanc ou rosé
        [white] blanc
        [quality-sparkling] mousseux de qualité
        [other-sparkling] autre mousseux
        [fortified] vin muté
        [cider] cidre
        [mead] hydromel
        [fruit-wine] vin de fruits
        [alcohol-free] vin sans alcool
       *[wine] vin
    }{ $organic ->
        [yes] {" "}bio
       *[no] {""}
    }{ rule-sugar }{ rule-class }
rule-short = { law-of }, { rule-what }
dose-capped =
    { $of ->
        [free] { $list }, pas plus : libre alors jusqu’à { $after }, limite { $limit } { $unit } de libre ({ rule-short }).
       *[total] { $list }, pas plus : total alors { $least ->
            [yes] d’au moins{" "}
           *[no] {""}
        }{ $after }, limite { $limit } { $unit } ({ rule-short }).
    }
round-capped =
    { $of ->
        [free] { at }libre alors jusqu’à { $after }, limite { $limit } { $unit } de libre ({ rule-short }).
       *[total] { at }total alors { $least ->
            [yes] d’au moins{" "}
           *[no] {""}
        }{ $after }, limite { $limit } { $unit } ({ rule-short }).
    }
dose-at-limit =
    { $least ->
        [yes] { at }mesurer le total avant tout : il est déjà d’au moins { $now }, et ceci dépasserait la limite de { $limit } { $unit } ({ rule-short }).
       *[no] { at }pas de sulfite maintenant, { $standing ->
            [over] limite déjà dépassée
           *[at] limite atteinte
        } : { $of ->
            [free] libre { $now }, limite { $limit } { $unit } de libre ({ rule-short }).
           *[total] total { $now }, limite { $limit } { $unit } ({ rule-short }).
        }
    }
dose-over-already = Selon cette règle, il ne peut pas être vendu tel quel{ law-decides } : voir avec le responsable de ce vin.
law-assumed = Inconnu, donc pris au plus strict pour la limite : { $list }.
law-unknown =
    { $code ->
        [colour-assumed] couleur
        [sugar-assumed] sucre
        [sparkling-class-assumed] catégorie du mousseux
       *[density-assumed] densité
    }
dose-capped-kept =
    { $reserve ->
        [none] { $kept } { $unit } restent en réserve dessous : un { $of ->
            [free] libre
           *[total] total
        } mesuré peut se tromper d’autant. Ton objectif la dépasserait.
       *[some] { $kept } { $unit } restent en réserve dessous : { $error } parce qu’un { $of ->
            [free] libre
           *[total] total
        } mesuré peut se tromper d’autant, { $reserve } pour la mise. Ton objectif la dépasserait.
    }
full-dose-asks =
    { $of ->
        [free] { at }le libre pourrait atteindre { $after }, au-dessus de la limite de { $limit } { $unit } de libre ({ rule-short }). Donner les chiffres quand même ?
       *[total] { at }le total serait { $least ->
            [yes] d’au moins{" "}
           *[no] de{" "}
        }{ $after }, au-dessus de la limite de { $limit } { $unit } ({ rule-short }). Donner les chiffres quand même ?
    }
full-dose-care = Selon cette règle, le vin ne pourrait pas être vendu ainsi. Le registre garde que c’était su. Pas un avis juridique : à confirmer pour ton marché.
full-dose-left = Laissé : la dose réduite reste valable.
full-dose-none = Aucune dose ci-dessus ne dépasse de limite.
button-full-dose = Dose entière
button-all-the-same = Oui, quand même
over-rule-noted = ⚠ Ça dépasse la limite ({ rule-short }) : c’est noté avec.
over-rule = au-dessus de la limite ({ rule-short })
total-sum = total { $total } ({ $measured } mesuré le { $day } + { $since } ajouté depuis)
limit-is =
    { at }{ $operator ->
        [below] moins de
       *[at-most] au plus
    } { $limit } { $unit } de SO2 { $of ->
        [free] libre
       *[total] total
    } : { rule-short }{ $written ->
        [same] {""}
       *[other] , écrit { $value } { $law_unit }
    }{ $density ->
        [none] {""}
       *[other] {" "}(densité { $density })
    }{ $uplift ->
        [none] {""}
       *[other] , dont { $uplift } pour l’année déclarée
    }.
limit-room =
    { $standing ->
        [over] Maintenant { $now } de { $of ->
            [free] libre
           *[total] total
        } : { $room } { $unit } de trop.
       *[room] Maintenant { $now } de { $of ->
            [free] libre
           *[total] total
        } : il reste { $room } { $unit } ; { $left } en gardant { $kept } de réserve.
    }
limit-amount = { $left } mg/L dans { $volume } : { bare-amount } de { additive }.
limit-text =
    { $text }{ $provision ->
        [none] {""}
       *[other] , { $provision }
    }{ $version ->
        [none] {""}
       *[other] {" "}({ $version })
    } : { $checked ->
        [law-text] lu dans le texte de loi
        [law-copy] lu dans une copie du texte
        [agency] lu sur la page de l’administration
        [foreign-agency] lu sur la page d’une administration étrangère
        [trade-guide] lu dans un guide professionnel
        [secondary] lu dans une source secondaire
       *[memory] de mémoire, donc non confirmé : ne réduit aucune dose
    }.
limit-none =
    { at }aucune limite connue : { law-of }, { $product ->
        [still] vin
        [sparkling] mousseux
        [quality-sparkling] mousseux de qualité
        [other-sparkling] mousseux
        [fortified] vin muté
        [fruit-wine] vin de fruits
        [alcohol-free] vin sans alcool
        [cider] cidre
        [mead] hydromel
       *[other] { $product }
    }{ $reason ->
        [not-found] {" "}(cherchée, pas trouvée)
       *[other] {""}
    }. Je ne devine pas : à vérifier pour ton marché.
limit-notes = À noter : { $list }.
limit-notes-separator = {" ; "}
law-note =
    { $code ->
        [recommends-only] le code recommande, la loi de ton pays décide
        [other-value-told] un autre chiffre circule ailleurs
        [boundary-open] le texte ne tranche pas pour ce sucre précis, pris au plus strict
        [boundary-told-otherwise] la page lue met cette borne de l’autre côté
        [dry-undefined] sec et doux sont donnés sans chiffre
        [band-misprinted] la fiche imprime la plage à l’envers
        [by-reference] par renvoi au texte de l’UE
        [derived] différence de deux chiffres lus
        [combined-as-total] le texte dit combiné, pris pour total
        [from-seven-percent] pour les vins de 7 % et plus
        [bulk-has-less] le vrac pour l’export a une limite plus basse
        [stacks-on-general] la limite générale vaut aussi
        [sugar-assumed] sucre inconnu, pris au plus strict
        [colour-assumed] couleur inconnue, prise au plus strict
        [sparkling-class-assumed] catégorie du mousseux inconnue, prise au plus strict
        [density-assumed] densité inconnue, prise à 0,990 (écrire : densité 0,995)
        [designation-not-on-file] rien de connu pour cette dérogation
        [no-uplift] ici pas de hausse pour une année déclarée
        [organic-not-on-file] aucune limite bio connue, la générale a été prise
        [repealed] { $value } { $unit } est abrogé et ne sert plus
        [other-unit-told] une autre source donne { $value } { $unit }
       *[second-value-told] { $value } { $unit } se dit ailleurs, de mémoire
    }
limit-care = Pas un avis juridique : à confirmer pour ton marché.
designation-asked =
    Vin doux d’une appellation qui a sa propre limite ({ law-of }) ? Je ne le devine jamais : l’écrire, { $wine ->
        [none] avec : dérogation 300
       *[other] par ex. : { $wine } dérogation 300
    }

## The first line: a choice and not a dose

choice-head = { at }un choix, pas une dose : à pH { $ph }, { $target } moléculaire demande { $free } libre.
choice-leave = { $mark } Laisser : { $free } de libre, c’est { $molecular } moléculaire.
choice-to =
    { $total ->
        [unknown] { $mark } À { $free } ({ $molecular } moléc.) : { measured } ; total à mesurer
       *[known] { $mark } À { $free } ({ $molecular } moléc.) : { measured }
    }
choice-no-amount = – À { $free } ({ $molecular } moléc.) : rien : le total dépasserait { $limit } ({ law-of }).
choice-red =
    { $kind ->
        [none] Si rouge, { $red } demande { $free } libre : rien à ajouter.
        [over] Si rouge, { $red } demande { $free } libre : pas de quantité, le total dépasserait { $limit } ({ law-of }).
       *[other] Si rouge, { $red } demande { $free } libre : { bare-amount }.
    }
ways-out = Sinon : plus froid, plus propre, plus de contrôles ; acidifier : voir avec un œnologue.

## The stage

bottling-no-oxygen = Aucun oxygène compté. Le mesurer, dissous et espace de tête, et l’écrire derrière : oxygène 2 mg/L
bottling-takes = { $oxygen } mg/L d’oxygène peuvent en prendre { $loss } { $unit } ({ bottling-each }).
bottling-target = { $after } de libre à la mise, donc { $now } maintenant : { $oxygen } mg/L d’oxygène peuvent prendre { $loss } { $unit } ({ bottling-each }).
bottling-each =
    { $each ->
        [formula] 4 pour 1, par la formule
       *[other] { $each } pour 1, selon toi
    }
bottling-measured = Mesuré dans la filière (non confirmé), c’est { $each } pour 1 : { bare-amount } suffirait. Pour compter ainsi : oxygène { $oxygen } mg/L à { $each }
bottling-measured-none = Mesuré dans la filière (non confirmé), c’est { $each } pour 1 : rien ne serait nécessaire. Pour compter ainsi : oxygène { $oxygen } mg/L à { $each }
condition-stage = Seulement si la malo est finie ou non voulue.
condition-red =
    { $kind ->
        [none] Si rouge ({ $red } moléculaire) : rien à ajouter.
        [over] Si rouge ({ $red } moléculaire) : { bare-amount }, aussi au-dessus de { $limit }.
       *[other] Si rouge ({ $red } moléculaire) : { bare-amount }.
    }
no-dose-fermenting = { at }pas de sulfite maintenant, ça fermente encore.
no-dose-malolactic = { at }pas de sulfite maintenant, la malo est à venir.
no-dose-molecular = Maintenant { $molecular } moléculaire.
no-dose-why = Les bactéries veulent moins de 5–10 de libre et moins de 30–40 mg/L de total (publié pour pH 3,3–3,5).
no-dose-why-fermenting = Le sulfite se combine aussitôt et gêne levures et bactéries : il leur faut moins de 5–10 de libre, moins de 30–40 mg/L de total (publié pour pH 3,3–3,5).
no-dose-all-the-same = Ton propre chiffre quand même ? Voir avec le responsable de ce vin, puis tout écrire : { whole-example }
figure-alone = « { $text } » : à ce stade je ne prends un chiffre que dans un message entier. Écrire : { whole-example }
whole-example = { $wine }{ in-all } { stage-word } ajouter { $adds } { $unit }
in-all =
    { $count ->
        [several] {" "}au total
       *[one] {""}
    }
stage-word =
    { $stage ->
        [must] moût
        [fermenting] en fermentation
        [malolactic] en malo
       *[base] vin de base
    }

## What it does

effect-land = { $after } { $unit } de libre si rien ne se combine ; attendre { $range } (1/3 à 1/2 se combine d’habitude) ; mesurer demain.
effect-land-molecular = De { $molecularNow } à { $molecular } moléculaire : { $after } { $unit } de libre si rien ne se combine ; attendre { $range } (1/3 à 1/2 se combine d’habitude) ; mesurer demain.
effect-land-to-molecular = À { $molecular } moléculaire : { $after } { $unit } de libre si rien ne se combine ; attendre { $range } (1/3 à 1/2 se combine d’habitude) ; mesurer demain.
effect-land-low = { $after } { $unit } de libre si rien ne se combine ; sous 10 de libre, beaucoup ou tout peut se combiner : attendre { $range }, mesurer avant d’en remettre.
effect-land-small = { $after } { $unit } de libre au plus : la hausse est plus petite que l’erreur de mesure.
effect-rise = Le libre monte d’environ { $range } { $unit } (1/3 à 1/2 se combine d’habitude) ; mesurer demain.
effect-must = La plus grande part se combine pendant la fermentation du moût : elle ne protège pas le vin ensuite.
must-comes-back = Environ un tiers se retrouve en SO2 total : + { $total } { $unit } (texte professionnel allemand, 2012).
must-yeast = Levurer { $least } à { $most } heures après (pratique courante, sans source).
must-malolactic = Jusqu’à { $most } { $unit } avant foulage, la malo n’en souffre pas (AWRI).
must-published =
    { $read ->
        [read] Publié : { $list } ({ $source }).
       *[memory] Publié : { $list } ({ $source } ; de mémoire, non lu).
    }
must-none-published = Les chiffres connus sont publiés pour le raisin ; pour { $product ->
        [cider] le cidre
        [mead] l’hydromel
        [alcohol-free] le vin sans alcool
       *[fruit-wine] le vin de fruits
    } il n’y en a pas.
must-range =
    { $state ->
        [sound] { must-colour }sain { $range }
        [damaged] { must-colour }un peu abîmé { $range }
       *[rot] { must-colour }avec pourriture { $range }
    } { $unit }
must-colour =
    { $style ->
        [red] rouge{" "}
       *[any] {""}
    }
must-say-state = La vendange est-elle saine ? Écrire sain, un peu abîmé ou pourri, et il y aura un chiffre à choisir.
button-published = Ajouter { $add }
effect-raise = + { $dose } { $unit } si rien ne se combine (d’habitude 1/3 à 1/2 se combine) ; mesurer demain.
third-needs =
    { $third ->
        [more] {" "}; si un tiers se combine, il en faut moitié plus
       *[covered] {""}
    }
effect-allowance = Dose × { $factor } pour + { $percent } % : atteint { $after } { $unit } si au plus { $covers } % se combine{ third-needs }. Attendre { $range } ; mesurer demain.
effect-allowance-bare = Dose × { $factor } pour + { $percent } % : couvre { $covers } % de combinaison{ third-needs }. Mesurer demain.
effect-share = Dose ÷ (1 − { $share }) : atteint { $after } { $unit } si juste cette part se combine ; attendre { $range } ; mesurer demain.
effect-share-bare = Dose ÷ (1 − { $share }) : juste si précisément cette part se combine ; mesurer demain.
other-as-share = Si c’était { $percent } % de perdu (÷ { $divisor }) : { bare-amount }.
other-as-allowance = Comme marge de + { $percent } % (× { $factor }) : { bare-amount }.
nothing-why = { $free } de libre, c’est { $molecular } moléculaire à pH { $ph } ; l’objectif est { target }.
nothing-why-free = { $free } de libre ; l’objectif est { target }.

## An amount that is asked about, that went in, a stock

adds =
    { $number ->
        [many] { at }{ $list } apportent { $adds } de SO2
       *[one] { at }{ $list } apporte { $adds } de SO2
    }
adds-rate = { at }« { $rate } » ({ $ofAdditive } de { additive }) apporte { $adds } de SO2
amount = { $amount } de { additive }
amount-solution = { $amount } de { additive } à { $strength } %
amount-SO2 = { $amount } de SO2 en { additive }
amount-tablets =
    { $size ->
        [none] { $amount } { tablet-word } de { additive }
       *[other] { tablets-of }
    }
adds-rate-mass = Dans { $volume }, ça fait { $amount }.
ferment-stop =
    { $adds ->
        [none] Aucune dose de SO2 n’arrête sûrement des levures, et des bouteilles peuvent éclater : voir avec un œnologue.
       *[other] { $adds } n’arrête pas sûrement des levures, des bouteilles peuvent éclater : voir avec un œnologue.
    }
ferment-stop-more = Je ne donne pas de dose pour ça. D’ici là : au froid, sans fermeture étanche.
measure-tomorrow = Mesurer le SO2 libre demain, avant d’en remettre.
reading-read = { at }{ $list }.
solution-weigh = Peser { $amount } de { additive } et compléter à { $volume } avec de l’eau.
solution-measure = Mesurer { $amount } de { additive } et compléter à { $volume } avec de l’eau.
solution-from-powder = Je ne prépare des solutions qu’à partir de poudre : préparer { $volume } de solution de méta à 10%
solution-strength = Cette solution contient { $strength } g de SO2 dans 100 mL.
solution-fresh = La faire fraîche, la dater : elle faiblit en jours ou semaines (pratique courante, sans source).
solution-per-barrel = Dans une barrique de { $barrel }, 1 mL apporte { $adds } mg/L ; { $rise } mg/L demandent { $amount }.
solution-us-water = C’est aussi de l’eau : aux États-Unis 1 % du vin au plus en tout (27 CFR 24.246).
solution-too-much = Non : { $wanted } g/L ne se dissout pas sûrement. Publié pour { additive } à { $celsius } °C : { $least ->
        [none] { $most } g/L ({ $source }).
       *[other] { $least } et { $most } g/L ({ $source }).
    } La faire plus faible.
solution-strengths = Je fais des solutions de 1 à 25 %. Publié pour le métabisulfite de potassium à 20 °C : 250 g/L (Food Additives Data Book, p. 780) et 450 g/L (une page d’encyclopédie).
solution-too-cold = Non : { $wanted } g/L dans une eau à { $water } °C. Publié : { $most } g/L à { $celsius } °C ({ $source }), et rien pour une eau plus froide. Tiédir l’eau, ou la faire plus faible.
solution-colder = Rien n’est publié sous { $celsius } °C : vérifier que tout est dissous.
solution-holding = Solution de conservation, { $volume } : { $acid } d’acide citrique, { $amount } de { additive }.
solution-rinse = Rinçage, { $volume } : { $acid } d’acide citrique, { $amount } de { additive }.
solution-order = Toute l’eau, l’acide, enfin le sulfite peu à peu. Jamais de poudre sur l’acide.
solution-air = Elle dégage du SO2 : ventiler, visage à l’écart, aussi de la bonde.
solution-for-holding = Barrique vide et propre, pleine à la bonde ; à revoir après quelques semaines.
solution-for-rinse = Pour du matériel propre : tout mouiller, laisser agir quelques minutes.
solution-drain = Vidanger selon les règles locales. Rincer à l’eau avant le vin.
solution-practice = { $salt } et { $acid } g/L : pratique courante, sans source. Sinon : { $use ->
        [holding] solution de conservation { $litres } L 1% méta
       *[rinse] rinçage { $litres } L 1% méta
    }
solution-not-wine =
    { $vessel ->
        [none] Jamais dans du vin.
       *[other] Jamais dans du vin : { $vessel } doit être vide. Rien n’en est noté.
    }
ask-solution-volume =
    { $use ->
        [rinse] Quel volume de rinçage ? En litres, ou avec son unité : 20 L, 1 hl
        [holding] Quel volume de solution de conservation ? En litres, ou avec son unité : 225 L, 3 hl
       *[stock] Quel volume à préparer ? En litres, ou avec son unité : 5 L, 1 hl
    }
burning-sulfur-never = Brûler du soufre (mèche, pastille à brûler) n’est jamais une dose pour le vin : personne ne sait ce qui y passe. Pas de chiffre de ma part.
burning-sulfur-danger = Seulement en barrique vide, selon l’emballage, les règles locales et des gens formés. Jamais après de l’alcool fort (feu), jamais sans aération, jamais sans surveillance.
burning-sulfur-rather = Pour une barrique vide, plutôt : solution de conservation 225 L. Pour son vin, envoyer la mesure : pH, SO2 libre, volume.

## What was read and what was assumed

basis-oiv = Selon la table OIV pour { $percent } %, { $celsius } °C (pK { $pK }).
basis-oiv-need = Selon la table OIV pour { $percent } %, { $celsius } °C (pK { $pK }) ; avec pK 1,81 il faudrait { $free } de libre.
read = Lu : { $list }.
assumed = Supposé : { $list }.
set-aside = Non utilisé : { $list }.
fact-volume = { $volume }
fact-volume-count = { $volume } en { $count } contenants
fact-ph = pH { $ph }
fact-free = libre { $free }
fact-total = total { $total }
fact-temperature = { $celsius } °C
fact-alcohol = { $percent } % vol
fact-sugar = { $sugar } g/L de sucre
fact-figure = { $figure }
fact-allowance = marge de + { $percent } %
fact-share = { $percent } % se combine
fact-style = { $style ->
        [red] rouge
        [white] blanc
       *[other] rosé
    }
fact-category = { $category ->
        [sweet] doux
        [sparkling] effervescent
       *[fortified] muté
    }
fact-product = { $product ->
        [cider] cidre
        [mead] hydromel
        [alcohol-free] vin sans alcool
       *[fruit-wine] vin de fruits
    }
fact-organic = bio
fact-designated = dérogation ({ $limit })
fact-uplift =
    { $declared ->
        [yes] année déclarée
       *[no] pas d’année déclarée
    }
fact-quality =
    { $quality ->
        [yes] mousseux de qualité
       *[no] pas mousseux de qualité
    }
fact-pdo = AOP
fact-bulk = vrac pour l’export
fact-density = densité { $density } kg/L
fact-reserve = { $reserve } gardés pour la mise
fact-stage = { stage-now }
fact-target = objectif { target }
fact-tablet =
    { $additive ->
        [tablet] comprimés effervescents de { $size } g de SO2
       *[other] comprimés de { $size } g de { additive }
    }
fact-strength =
    { $kind ->
        [assay] { additive }, { $strength } % de pureté
        [SO2-yield] { additive }, { $strength } % pris comme rendement en SO2
        [salt-per-100mL] { additive }, { $strength } % = { $strength } g de sel dans 100 mL
        [SO2-per-100mL] { additive }, { $strength } % = { $strength } g de SO2 dans 100 mL
       *[noted] { additive }, { $strength } %
    }
assumed-additive =
    { $additive ->
        [potassium-metabisulfite] métabisulfite de potassium pur
        [sodium-metabisulfite] métabisulfite de sodium pur
       *[other] { additive } pur
    }
assumed-target = objectif { target }
assumed-target-red = objectif { target } (rouge)
assumed-target-sweet = objectif { target } (doux)
assumed-gallon = { $gallon ->
        [US] gallons américains
       *[imperial] gallons impériaux
    }
assumed-must = { $fruit } kg × { $yield } L/100 kg = { $volume }
assumed-must-usual = { $fruit } kg × { $yield } L/100 kg (votre rendement habituel) = { $volume }
assumed-barrels =
    { $count ->
        [one] une barrique de 225 L
       *[several] { $volume } à 225 L la barrique
    }
note-free-unlabelled = « { $text } » est le SO2 libre
note-ph-unlabelled = « { $text } » est le pH
note-round-ph = un décimal seul est le pH
note-round-free = un chiffre seul est le SO2 libre
note-volume-sum = « { $text } » additionné
note-strength-as-salt = le titre est en grammes de sel dans 100 mL ; en SO2 elle serait { $factor } fois plus forte
note-strength-as-SO2 = le titre est en grammes de SO2 dans 100 mL
note-mass-beside-readings = « { $text } », ce sont des grammes
note-each-or-total = « { $text } » vaut pour chacun
note-unread-words = mots non lus : { $text }
set-aside-figure = { $text }

## The one question

ask-vessel = { at }quelle cuve ? Par ex. : T4
ask-volume_L =
    { $unit ->
        [L] { at }quel volume{ of-each } ? En litres, ou avec son unité : 40 hl
        [hL] { at }quel volume{ of-each } ? En hectolitres, ou avec son unité : 4000 L
        [m3] { at }quel volume{ of-each } ? En mètres cubes, ou avec son unité : 40 hl
        [galUS] { at }quel volume{ of-each } ? En gallons américains, ou avec son unité : 40 hl
        [galUK] { at }quel volume{ of-each } ? En gallons impériaux, ou avec son unité : 40 hl
       *[other] { at }quel volume{ of-each } ? Avec son unité : 225 L, 40 hl
    }
of-each =
    { $count ->
        [several] {" "}pour chacun
       *[one] {""}
    }
ask-ph = { at }quel pH ? Par ex. : 3,58
ask-free_mg_L = { at }quel SO2 libre, en { $unit } ? Par ex. : 21
ask-target =
    { $usual ->
        [none] { at }quel objectif ? Un tel vin n’en a pas d’habituel. Par ex. : monter à 30 libre, 0,6 mol, ajouter 25 mg/L
       *[some] { at }quel objectif ? Par ex. : monter à 30 libre, 0,6 mol, ajouter 25 mg/L
    }
ask-target-stage =
    { $stage ->
        [must] { at }combien de { $unit } ajouter au moût ? Tout écrire : { whole-example }
        [base] { at }combien de { $unit } ajouter au vin de base ? Tout écrire : { whole-example }
       *[other] { at }combien de { $unit } ajouter ? Tout écrire : { whole-example }
    }
ask-tablet-additive = { at }quel sel dans les comprimés ? C’est sur l’emballage.
ask-additive = { at }quel produit ?
ask-strength_percent = { at }quel titre, en % ? C’est sur l’étiquette. Par ex. : { usual-strength }
usual-strength =
    { $named ->
        [potassium-metabisulfite] 96%
        [sodium-metabisulfite] 96%
        [sulfur-dioxide-solution] 6%
       *[other] 10%
    }
ask-tablet_salt_g = { at }combien de grammes pèse un comprimé ? C’est sur l’emballage ; 0,44 et 0,55 sont courants.
ask-tablet_SO2_g = { at }combien de grammes de SO2 donne un comprimé effervescent ? C’est sur l’emballage.
ask-mass_g = { at }combien de grammes ?
ask-mass-spoon = { at }combien de grammes ? Une cuillère à café rase de poudre fait à peu près 5 à 6 g, bien trop vague pour doser : prendre une balance.
ask-fruit = { at }quel volume de moût, ou quel rendement ? Avec l’unité, par ex. : 65 L/100 kg, ou : 650 L/t, ou : 1300 L
option = { $mark }) { $list }
target-of =
    { $vessel ->
        [none] Un autre objectif.
       *[other] { $vessel } : un autre objectif.
    }

## What cannot be answered as it stands

problem-ph-out-of-range = { at }« { $about } » ne peut pas être le pH d’un vin : je prends 2,5 à 4,8. Une virgule perdue ? L’envoyer ainsi : pH 3,58
problem-negative-value = { at }« { $about } » est sous zéro, impossible. Renvoyer le chiffre sans le moins.
problem-total-below-free = { at }le total est sous le libre (« { $about } »). Inversés ? Écrire : libre { $one } total { $two }
problem-volume-not-positive = { at }un volume de « { $about } » est impossible. L’envoyer ainsi : 45 hl
problem-unit-mismatch = { at }l’unité ne va pas dans « { $about } ». Le SO2 libre est en mg/L ou ppm, le volume en L ou hl.
problem-ambiguous-number =
    { $kind ->
        [split] { at }il y a un espace dans « { $about } ». Écrire : pH { $one }
        [volume] { at }« { $about } » : un doute d’un facteur mille. Écrire : { $one }, ou : { $two }
        [mass] { at }« { $about } » : un doute d’un facteur mille. Écrire : { $one }, ou : { $two }
        [thousands] { at }« { $about } » : un doute d’un facteur mille. Écrire : { $one }, ou : { $two }
        [powder] { at }« { $about } » : de SO2, ou de poudre ? Écrire : ajouter { $one } ppm SO2, ou : { $two } g par 10 L { $named }
        [salt] { at }« { $about } » : de SO2, ou de sel ? En SO2, c’est trop fort pour être vendu. Si l’étiquette dit sel, écrire : { salt-name } sel { $one }%
        [water] { at }« { $about } » : solution sulfureuse, ou solution de métabisulfite ? Écrire : solution sulfureuse { $one }%, ou : solution de méta { $one }%
        [SO2-percent] { at }« { $about } » : alcool, solution sulfureuse ou solution de métabisulfite ? Écrire : { $one }% vol, solution sulfureuse { $one }%, ou : solution de méta { $one }%
        [percent] { at }« { $about } » : alcool, ou titre d’une solution ? Écrire : { $one }% vol, ou : solution de { stock-name } { $one }%
        [degree] { at }« { $about } » : alcool ou température ? Écrire : { $one }% vol, ou : { $one } C
        [to] { at }« { $about } » : { $two } est-il l’objectif ? Écrire : libre { $one }, objectif { $two }
        [range] { at }« { $about } » ressemble à une fourchette. N’en écrire qu’un : libre { $one }, ou : libre { $two }
        [pair] { at }« { $about } » : libre et total, ou une valeur lue entre deux traits ? Écrire : libre { $one } total { $two }, ou : libre { $one }
        [free] { at }« { $about } » : SO2 libre ou total ? Écrire : libre { $one }, ou : total { $one }
        [aim] { at }« { $about } » : à ajouter, ou à atteindre ? Écrire : ajouter { $one } ppm, ou : objectif { $one }
       *[other] { at }« { $about } » peut se lire de plusieurs façons. Dire ce que c’est, par ex. : pH 3,58 libre 21 45 hl
    }
salt-name =
    { $named ->
        [ammonium-bisulfite-solution] bisulfite d’ammonium
       *[other] bisulfite de potassium
    }
stock-name =
    { $named ->
        [sodium-metabisulfite] métabisulfite de sodium
        [sodium-metabisulfite-solution] métabisulfite de sodium
       *[other] méta
    }
problem-each-or-total = { at }« { $about } » : pour chacun, ou pour tous ensemble ? Écrire : { $about } chacun, ou : { $about } au total
problem-conflicting-values = { at }deux valeurs pour une même chose : « { $about } ». N’en envoyer qu’une ; deux vins vont sur deux lignes.
problem-unknown-additive = { at }« { $about } » n’est pas un produit sulfitant que je connais. Je connais : métabisulfite de potassium ou de sodium (poudre, solution), bisulfite, solution sulfureuse, SO2 gazeux, comprimés.
problem-did-you-mean = { at }« { $about } » est un autre produit. Tu voulais dire métabisulfite ?
problem-strength-out-of-range = { at }le titre « { $about } » ne va pas à ce produit. Regarder l’étiquette. Par ex. : { usual-strength }
problem-value-out-of-range = { at }« { $about } », c’est plus que n’en a aucun chai. Vérifier le chiffre et son unité.
problem-not-understood = Je n’ai pas pu lire ça. Envoyer une mesure, par ex. : T4 45 hl pH 3,58 libre 21. ? en dit plus.
problem-too-long = C’est trop long pour être lu sûrement. Envoyer 25 cuves au plus à la fois, une par ligne.
problem-no-number =
    { $again ->
        [correction] Pas de dose tant que ce n’est pas clair.
       *[whole] Pas de dose tant que ce n’est pas clair. Renvoyer la ligne entière.
    }
problem-share = { at }« { $about } » : je compte au plus 4/5 (0,8) de combiné.
problem-vessel-twice = { $vessel } y est deux fois : l’envoyer une seule fois.
problem-two-vessels = « { $about } » : deux cuves. Envoyer une ligne pour chacune.
no-such-choice = Pas de { $text } ici : a à { $last }, ou son nom.
no-such-button = Pas de { $text } ici : 1 à { $last }, ou une mesure entière.

## Warnings

warning-no-dose-at-this-stage = ⚠ { stage-now } : pas de dose à ce stade ; voir avec le responsable de ce vin.
warning-stage-not-over =
    { $stage ->
        [malolactic] ⚠ Ça arrêtera ou retardera la malo : voir d’abord avec le responsable de ce vin. { no-dose-why }
       *[fermenting] ⚠ Un vin en fermentation le combine aussitôt, et ça n’arrête pas sûrement les levures : voir d’abord avec le responsable de ce vin.
    }
warning-additive-not-permitted =
    { $reason ->
        [ammonium] ⚠ Le bisulfite d’ammonium est réservé au raisin et au moût (OIV) : pas pour ce vin ; demander d’abord.
        [organic] ⚠ Un vin bio n’admet que le SO2 et les sels de potassium ({ law-of }, règlement 889/2008) : pas celui-ci. Demander d’abord.
        [organic-none] ⚠ Un vin étiqueté bio n’admet aucun sulfite ajouté ({ law-of }, 7 CFR part 205). Demander d’abord.
       *[sodium] { warning-sodium }
    }
warning-sodium =
    { $region ->
        [oiv] ⚠ Métabisulfite de sodium : beaucoup de règles l’interdisent dans le vin (OIV ; UE et Royaume-Uni non confirmés). Demander d’abord.
        [eu] ⚠ Le métabisulfite de sodium n’est pas pour le vin dans l’UE, pour le matériel seulement (non confirmé). Demander d’abord.
        [uk] ⚠ Le métabisulfite de sodium n’est pas pour le vin au Royaume-Uni, pour le matériel seulement (non confirmé). Demander d’abord.
        [ar] ⚠ Le métabisulfite de sodium n’est pas pour le vin en Argentine : sels de potassium seulement (INV 281/85). Demander d’abord.
       *[other] ⚠ Métabisulfite de sodium : aucune liste lue ({ law-of }), donc non confirmé ; beaucoup de règles l’interdisent dans le vin. Demander d’abord.
    }
refused-organic =
    { $reason ->
        [organic-none] { at }pas de sulfite : un vin étiqueté bio n’en admet aucun ({ law-of }, 7 CFR part 205).
       *[organic] { at }pas de { additive } : un vin bio n’admet que le SO2 et les sels de potassium ({ law-of }, règlement 889/2008).
    }
refused-organic-instead =
    { $reason ->
        [organic-none] Finalement pas bio ? Voir avec le responsable de ce vin ; puis rayer l’entrée qui le dit.
       *[organic] L’écrire plutôt avec méta. Pas un avis juridique : à confirmer pour ton marché.
    }
limit-doubt =
    { $confidence ->
        [unconfirmed] , non confirmé : de mémoire
       *[read] {""}
    }
warning-total-over-limit =
    { $total ->
        [known] ⚠ Le total ferait { $total_after_mg_L }, au-dessus de { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides } : demander d’abord.
       *[at-least] ⚠ Le total ferait au moins { $total_after_mg_L }, au-dessus de { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides } : demander d’abord.
    }
warning-free-over-limit = ⚠ Le libre pourrait atteindre { $free_after_mg_L } si rien ne se combine, au-dessus de la limite de libre { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides } : demander d’abord.
warning-label-threshold =
    ⚠ Étiquette ({ law-of }) : les sulfites se mentionnent { $comparator ->
        [more] au-dessus de
       *[from] dès
    } { $threshold_mg_L } { $unit_of_law }{ $counts ->
        [added] {" "}ajoutés
       *[total] {""}
    }{ limit-doubt } ; le total serait de { $total_after_mg_L }.
warning-total-near-limit =
    { $total ->
        [known] ⚠ Le total serait de { $total_after_mg_L } { $unit }, près de la limite { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
       *[at-least] ⚠ Le total serait d’au moins { $total_after_mg_L } { $unit }, près de la limite { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
    }
warning-total-unknown = ⚠ Le total est inconnu : le mesurer.
warning-total-unknown-most = ⚠ Total inconnu, le mesurer : pour cette dose il peut être aujourd’hui de { $most_total_mg_L } { $unit } au plus, limite { $limit_mg_L } ({ rule-short }){ law-decides }.
warning-no-limit-on-file =
    { $region ->
        [oiv] ⚠ Je ne connais pas de limite pour un tel vin : voir la loi de ton pays.
       *[other] ⚠ Pas de limite connue pour lui ({ law-of }) : à vérifier pour ton marché.
    }
warning-limit-unconfirmed =
    { $region ->
        [oiv] ⚠ La limite n’est pas confirmée : voir la loi de ton pays.
       *[other] ⚠ Limite { $limit_mg_L } { $unit } de { $of ->
            [free] libre
           *[total] total
        } ({ rule-short }) : non confirmée, de mémoire. À vérifier pour ton marché.
    }
warning-addition-large = ⚠ { $dose_mg_L } { $unit } d’un coup, c’est beaucoup : vérifier le volume et son unité.
warning-free-needed-high = ⚠ { $target_free_mg_L } { $unit } de libre, c’est beaucoup : tenir plus froid, plus propre, contrôler plus souvent ; ou un pH plus bas, avec un conseil.
warning-molecular-above-2 = ⚠ Au-dessus de 2 { $unit } moléculaire, le SO2 se sent et se goûte.
warning-free-low-may-bind-all = ⚠ Sous 10 de libre, beaucoup ou tout peut se combiner : mesurer avant d’en remettre.
warning-ph-unusual = ⚠ pH { $ph } est inhabituel pour un vin : vérifier le pH-mètre.
warning-basis-fallback = ⚠ La base OIV demande l’alcool, et 20–40 °C : compté avec pK 1,81.
warning-basis-fallback-change = ⚠ La base OIV demande l’alcool, et 20–40 °C : compté avec pK 1,81. Selon l’OIV à { $compared_at_alcohol_percent } %, { $compared_at_temperature_C } °C, ce serait environ { $change } { $unit } de { $direction ->
    [more] plus.
   *[less] moins.
}
warning-malolactic-may-not-start =
    { $above ->
        [free] ⚠ Libre { $free_mg_L }, au-dessus de { $free_ceiling_high_mg_L } { $unit } : la malo risque de ne pas partir (AWRI, pour pH 3,3–3,5).
        [total] ⚠ Total { $total_mg_L }, au-dessus de { $total_ceiling_high_mg_L } { $unit } : la malo risque de ne pas partir (AWRI, pour pH 3,3–3,5).
       *[both] ⚠ Libre { $free_mg_L }, au-dessus de { $free_ceiling_high_mg_L }, total { $total_mg_L }, au-dessus de { $total_ceiling_high_mg_L } { $unit } : la malo risque de ne pas partir (AWRI, pour pH 3,3–3,5).
    }
warning-restart-may-fail = ⚠ { $molecular_mg_L } { $unit } moléculaire freine les levures : dès { $held_back_molecular_mg_L } une reprise peut échouer (pratique courante, sans source).
warning-must-may-hinder-malolactic = ⚠ Au-dessus de { $malolactic_unharmed_mg_L } { $unit } dans le moût, la malo peut être gênée (AWRI).
warning-rounding-coarse = ⚠ Ce que montre la balance fait ici { $rounding_mg_L } { $unit } d’écart : en prendre une plus fine, ou une solution.
warning-already-dosed = ⚠ Sulfité il y a peu.

## Cautions

cautions = ⚠ { $list }
caution-trained-people-with-breathing-apparatus = Personnel formé seulement, appareil respiratoire à portée.
caution-grapes-and-must-only = Pour raisin et moût seulement.
caution-ventilate = Ventiler.
caution-never-lean-in = Ne jamais se pencher dans une cuve.
caution-gloves-goggles = Gants, lunettes.
caution-no-acid-no-chlorine = Jamais avec acide ou chlore.
caution-no-other-acid-no-chlorine = Aucun autre acide, pas de chlore.
caution-asthma = Pas pour asthmatiques.
caution-crush-first = Écraser, dissoudre dans un peu de vin ou d’eau.
caution-dissolve-first = Dissoudre dans un peu de vin ou d’eau.
caution-foams-with-carbon-dioxide = Vin plein de CO2 : ça déborde.
caution-mix-and-measure-again = Mélanger, mesurer demain.
caution-label-and-rules-first = Étiquette, lois locales, professionnel d’abord.
cautions-of = ⚠ { additive } : { $list }
cautions-short = ⚠ Précautions comme avant : bouton Sécurité.

## Chat

chat-greeting = Bonjour. Envoie une mesure, par ex. : T4 45 hl pH 3,58 libre 21. ? en dit plus.
chat-thanks = De rien. Mesure encore demain.
chat-other = Je calcule les ajouts de SO2. Envoie une mesure, par ex. : T4 45 hl pH 3,58 libre 21. ? en dit plus.
still-asked = Il manque encore une chose.
chat-negated = Rien d’ajouté, donc. Rien à garder.
chat-help-what = Envoie une mesure, je donne l’ajout de SO2.
chat-help-dose = T4 45 hl pH 3,58 libre 21
chat-help-dose-means = → ce qu’il faut peser
chat-help-effect = 100 g de méta dans 20 hl
chat-help-effect-means = → ce qu’une quantité apporte
chat-help-solution = préparer 5 L de solution de méta à 10%
chat-help-solution-means = → comment faire une solution
chat-help-fields = Dans n’importe quel ordre ; aussi total, rouge, 13,5%, objectif 35, +25 ppm, +30%. Plusieurs cuves : une par ligne.
chat-help-topics = Plus : aide et un mot parmi { $list }.
chat-help-care = L’étiquette, les règles locales et un professionnel passent d’abord.

## Help by topic: each a screen of messages to send; `help-<topic>-…` in the order in which they are said

help-wine-1 = Dans n’importe quel ordre : la cuve, son volume, le pH, le SO2 libre.
help-wine-2 = T4 45 hl pH 3,58 libre 21 blanc → ce qu’il faut peser
help-wine-3 = T4 40 hl 3,6/18/60 13,5% 14 C → pH, SO2 libre et total
help-wine-4 = T4 40 hl pH 3,5 libre 18 0,6 moléculaire → à ton propre niveau ; ou objectif 36
help-wine-5 = T4 40 hl ajouter 25 ppm → un ajout donné
help-wine-6 = T4 40 hl pH 3,5 libre 18 +30% → plus, pour ce qui se combine ; ou : un tiers se combine
help-wine-7 = T4 40 hl pH 3,5 libre 18, solution de méta 10% → avec une solution ; aussi SO2 6%, comprimés 5 g
help-wine-8 = 100 g de méta dans 20 hl → ce qu’une quantité apporte
help-wine-9 = Rouge, rosé, doux, cidre, hydromel, bio ; moût, en fermentation, malo finie : le dire, sinon la réponse dit ce qu’elle a pris.
help-must-1 = Pour moût et jus, pas de chiffre habituel : je cite ce qui est publié, tu choisis.
help-must-2 = moût 20 hl sain → des chiffres à choisir ; aussi : un peu abîmé, pourri
help-must-3 = moût 20 hl ajouter 40 → ce qu’il faut peser pour 40 mg/L
help-must-4 = 2 t raisin 65 L/100 kg sain → au poids de vendange et son rendement
help-must-5 = 5 t raisin 650 L/t ajouter 50 → la même chose par tonne
help-must-6 = rendement 65 → le rendement habituel, litres pour 100 kg
help-must-7 = La plupart se combine : ça ne protège pas plus tard, et un tiers environ revient en SO2 total.
help-bottling-1 = Ce qu’il faut maintenant pour que l’objectif tienne une fois l’oxygène servi.
help-bottling-2 = mise T4 40 hl pH 3,4 libre 22 oxygène 2 mg/L → 4 de SO2 pour 1 d’oxygène, par la formule
help-bottling-3 = mise T4 40 hl pH 3,4 libre 22 oxygène 2 mg/L à 2,5 → avec ton propre chiffre
help-bottling-4 = T4 40 hl pH 3,4 libre 22 total 90 garder 20 pour la mise → réserve gardée sous la limite
help-bottling-5 = T4 en malo pH 3,4 libre 25 total 60 → la malo peut-elle partir ; aussi bloquée : une reprise
help-bottling-6 = Oxygène : dissous et espace de tête ensemble, en mg/L de vin.
help-solutions-1 = Solutions dans l’eau : aucune n’est une dose pour le vin, rien n’en va au registre.
help-solutions-2 = préparer 5 L de solution de méta à 10% → quoi peser, sa force, les mL par barrique
help-solutions-3 = préparer 1 L de solution de méta à 10%, ajouter 30 ppm → les mL pour une barrique de 225 L
help-solutions-4 = 10 g de méta dans 100 mL d’eau → sa force
help-solutions-5 = solution de conservation 225 L → pour une barrique vide ; aussi : solution de conservation pour 3 barriques
help-solutions-6 = rinçage 20 L → pour du matériel propre ; à ta force : rinçage 20 L 1% méta
help-solutions-7 = Brûler mèches ou pastilles : jamais une dose pour le vin, et pas de chiffre de ma part.
help-law-1 = Chaque dose est comparée aux limites de ton marché. Pas un avis juridique : à confirmer.
help-law-2 = loi UE → aussi US, UK, OIV, Canada, Japon … ; pour toute la cave
help-law-3 = limite T4 → la règle, son texte, comment vérifié, ce qui reste
help-law-4 = limite rouge SR 3 UE → sans cuve
help-law-5 = T4 rouge → couleur et sucre (SR 3 avec une mesure) décident ; l’inconnu compte au plus strict
help-law-6 = T4 bio → aussi mousseux de qualité, AOP, vrac, densité 0,992
help-law-7 = T4 dérogation 300 → un doux d’appellation ; aussi T4 année déclarée
help-law-8 = T4 garder 30 pour la mise → gardés sous la limite, plus 15 pour l’erreur de mesure
help-law-9 = Au-dessus, la dose réduite vient d’abord : dose entière, puis oui. Le registre le garde.
help-round-1 = Plusieurs cuves en un message, une par ligne ; le commun (méta, objectif 30) en première ligne. Un bouton note tout, ou ligne par ligne.
help-round-2 = T1 20 hl pH 3,4 libre 18 → une de ses lignes ; j’additionne ce qu’il faut sortir
help-round-3 = tournée → revoir toutes ses lignes
help-round-4 = feuille xlsx → à emporter ; aussi feuille csv, feuille image
help-round-5 = B1-B24 225 L pH 3,6 libre 18 → une dose par barrique, une entrée chacune
help-round-6 = B1-B24 sauf B7 225 L pH 3,6 libre 18 → toutes sauf une
help-round-7 = 34 barriques, échantillon moyen : pH 3,6 libre 18 → pour leur moyenne, et ce qu’elle cache
help-round-8 = Ou envoie un CSV ou XLSX : cuve, volume, pH, SO2 libre. La feuille revient.
help-stock-1 = Chaque ajout en est tiré, dès qu’il y a quelque chose dedans.
help-stock-2 = reçu 25 kg de méta lot 4471 de chez Norte → aussi 10 L de SO2 6%
help-stock-3 = stock → ce qu’il y a, par lot ; stock méta : un seul
help-stock-4 = stock méta 3,2 kg → compté en rayon : vaut à partir de là
help-stock-5 = utilisé 200 g de méta pour le rinçage → pour aucun vin
help-stock-6 = jeté 1 kg de méta car pris en masse → jeté
help-stock-7 = ajouté 82 g de méta T4 lot 4471 → de ce lot ; sinon le plus ancien
help-stock-8 = export stock → entrées, fournisseurs, lots et restes, pour les registres
help-log-1 = Rien n’est effacé ; une correction reste à côté de ce qu’elle corrige.
help-log-2 = ajouté 82 g de méta T4 → noté ; aussi ppm, mL, hier 17:00, lot 4471, note : …
help-log-3 = T4 maintenant libre 28 total 96 → une mesure gardée, sans dose
help-log-4 = consigne T4 256 g de méta → à faire par un autre ; en cours montre ce qui reste à faire
help-log-5 = aujourd’hui → ce qui a été noté ; aussi hier, 12 nov
help-log-6 = historique T4 → tout ce qui est noté d’elle
help-log-7 = annuler → retire ta dernière entrée, dans les 15 minutes
help-log-8 = rayer 17 erreur de saisie → raye l’entrée 17, et dit pourquoi
help-vessels-1 = Ce qui arrive à un vin change ce sur quoi je compte encore.
help-vessels-2 = T4 ? → ce que je sais d’elle
help-vessels-3 = cuves → toutes
help-vessels-4 = T4 rouge → aussi en malo, finie
help-vessels-5 = T4 contient 52 hl maintenant → ce qu’il y a dedans ; capacité T4 60 hl : sa taille
help-vessels-6 = soutiré T4 61 hl → aussi ouillé T4
help-vessels-7 = transvasé T4 dans T9 → tout, ou 20 hl de T4
help-vessels-8 = assemblé T5 dans T4 → le pH est à remesurer
help-vessels-9 = T4 = Blanca 2026 → le nom de son vin
help-vessels-10 = T4 vide → aussi : oublie T4
help-reminders-1 = Je dis une fois par jour quoi mesurer, et après un ajout quand.
help-reminders-2 = à mesurer → ce qu’il faut mesurer maintenant
help-reminders-3 = liste quotidienne à 7:00 → l’heure ; ou : sans liste quotidienne
help-reminders-4 = plus tard T4 3 jours → la redemande plus tard
help-reminders-5 = pas T4 → plus rien pour elle ; surveiller T4 : de nouveau
help-reminders-6 = silence 21 à 6 → rien la nuit sans qu’on demande
help-settings-1 = Tout ceci vaut pour la cave entière.
help-settings-2 = réglages → ce qui est réglé, et comment le changer
help-settings-3 = unités us → aussi métrique, impérial
help-settings-4 = notre habituel est méta 57% → le produit quand aucun n’est nommé
help-settings-5 = objectif 0,5 pour les rouges → aussi blancs, doux
help-settings-6 = marge 30% → ajoutée à chaque dose, pour ce qui se combine
help-settings-7 = fuseau Europe/Paris → pour les heures et les jours
help-settings-8 = réponses courtes → le calcul derrière un bouton
help-pictures-1 = Un graphique montre SO2 libre, moléculaire et total, et les ajouts.
help-pictures-2 = graphique T4 → en photo, avec la même chose en mots
help-files-1 = Ton registre est à toi.
help-files-2 = export → ce mois en tableur
help-files-3 = export 2026 → aussi export T4 csv, export 1 oct au 31 oct
help-files-4 = L’export d’une autre cave, ou une liste de cuves en CSV ou XLSX : envoie le fichier. Il est montré, puis pris en entier ou pas du tout.
help-people-1 = Un groupe est une cave à lui seul : appelle-moi par mon nom, ou réponds-moi.
help-people-2 = membres → qui en est
help-people-3 = inviter caviste → un code pour une personne ; aussi responsable, visiteur
help-people-4 = Un responsable peut tout, un caviste dose et note, un visiteur regarde.
help-people-5 = lis tout → je réponds aux mesures claires sans qu’on m’appelle
help-people-6 = quelle cave → laquelle ; à Blanca : y aller ; quitter Blanca : en sortir
help-people-7 = oublie-moi → ton nom et ton numéro disparaissent
help-lab-1 = Un titrage est calculé avec son détail ; rien n’est gardé sans ton bouton.
help-lab-2 = AO 20 mL échantillon, 1,9 mL 0,01 N → SO2 libre ; avec T4 devant, gardé d’un bouton
help-lab-3 = T4 total AO 20 mL échantillon, 5,6 mL 0,01 N, témoin 0,1 → SO2 total
help-lab-4 = iode 25 mL échantillon, 1,2 mL 0,02 N, ascorbique 50 → sans ce que compte l’acide ascorbique
help-lab-5 = fourchette → de combien la dernière dose peut s’écarter
help-lab-6 = T4 45 hl pH 3,58±0,03 libre 21±2 → avec tes propres ±
help-lab-7 = tableau 0,5 0,8 1,5 pH 3,2-3,8 → le SO2 libre nécessaire
help-lab-8 = moléculaire T4 → par pK 1,81 et par l’OIV
help-forecast-1 = Les mesures d’un vin en disent plus que toute règle.
help-forecast-2 = prévision T4 → le jour où le libre passe sous ce que demande son pH
help-forecast-3 = Trois mesures depuis le dernier ajout la font ; avant, seules barriques et bouteilles ont des vitesses publiées.
help-forecast-4 = Après deux ajouts mesurés avant et après, une dose dit quelle part ce vin a combinée.
help-forecast-5 = trop de SO2 dans T4 → ce qui aide et ce qui n’aide pas
help-forecast-6 = assembler T4 T7 → quelle part de T7 tient limite et objectif
help-forecast-7 = assembler T4 → quelles autres cuves iraient
help-topic =
    { $topic ->
        [wine] vin
        [must] moût
        [bottling] mise
        [law] loi
        [round] tournée
        [stock] stock
        [solutions] solutions
        [log] registre
        [vessels] cuves
        [reminders] rappels
        [settings] réglages
        [pictures] graphiques
        [files] fichiers
        [people] membres
        [lab] labo
        [forecast] prévision
       *[other] { $topic }
    }

send-alone = Ça va dans un message à part.
unreadable =
    { $what ->
        [edited] Je ne lis pas les messages modifiés. Merci de le renvoyer.
        [photo] Je ne lis pas les photos. Merci d’écrire les chiffres.
        [sticker] Joli. Mais je ne lis que du texte.
        [voice] Je n’entends pas les messages vocaux. Merci d’écrire les chiffres.
        [file] Je ne lis pas encore les fichiers. Merci d’écrire les chiffres.
       *[other] Je ne lis que du texte. Merci d’écrire les chiffres.
    }
fault = Ça a échoué de mon côté, rien n’a été calculé. Merci de le renvoyer ; si ça échoue encore, le dire à qui me gère.
fault-aside = Ça a échoué trois fois de mon côté, je l’ai mis de côté : rien n’a été calculé ni noté. Qui me gère peut voir pourquoi.
left-unread =
    { $count ->
        [one] J’étais absent. Un message ici a plus de 12 heures, je ne l’ai pas lu : rien n’en est noté. Le renvoyer s’il compte encore.
       *[other] J’étais absent. { $count } messages ici ont plus de 12 heures, je ne les ai pas lus : rien n’en est noté. Renvoyer ceux qui comptent encore.
    }
old-button = Ce bouton vient d’un ancien message. Merci de renvoyer la mesure.

## An emergency

emergency-out = TOUT LE MONDE DEHORS, à l’air libre, tout de suite.
emergency-nobody-in = Personne n’entre ni ne se penche pour aller chercher quelqu’un.
emergency-call = Appelez les secours.
emergency-swallowed = Avalé : rincer la bouche, ne pas faire vomir, appeler le centre antipoison ou les secours.
emergency-eyes = Yeux : rincer à l’eau pendant 15 minutes, enlever les lentilles.
emergency-skin = Peau : rincer à grande eau, enlever les vêtements mouillés.

## The working

working = { $substituted } = { $result }
working-symbol = { $symbol } = { $substituted } = { $result }
working-source = ({ $source })
working-head =
    { $vessel ->
        [none] Le calcul
       *[other] { $vessel } : le calcul
    }
step-dissociation = Constante de dissociation, entre les quatre valeurs voisines en alcool et température :
step-molecular-now = SO2 moléculaire maintenant, libre ÷ (10^(pH − pK) + 1) :
step-free-needed = SO2 libre nécessaire, objectif × (10^(pH − pK) + 1) :
step-oxygen-loss = Ce que prend l’oxygène, oxygène × SO2 pour 1 mg :
step-free-before-bottling = SO2 libre nécessaire avant, voulu à la mise + ce que prend l’oxygène :
step-addition = À ajouter, libre voulu − libre maintenant :
step-dose-with-allowance = Avec la marge, ajout × (1 + marge) :
step-dose-with-share = Avec la part qui se combine, ajout ÷ (1 − part) :
step-volume-in-litres = Volume en litres :
step-room-to-limit = Place, limite − réserve dessous − SO2 maintenant :
step-must-of-fruit = Moût, vendange × litres pour 100 kg ÷ 100 kg :
step-so2-mass = SO2 en grammes, ajout × volume ÷ 1000 :
step-so2-mass-each = SO2 pour un contenant, ajout × son volume ÷ 1000 :
step-all-vessels = Pour tous, un × nombre :
step-additive-mass = Produit, SO2 ÷ sa part de SO2 :
step-additive-mass-by-assay = Produit, SO2 ÷ (pureté × part de SO2 du sel pur) :
step-additive-mass-by-yield = Produit, SO2 ÷ son rendement en SO2 indiqué :
step-additive-volume-by-salt = Solution, SO2 ÷ (sel dedans × part de SO2 du sel) :
step-additive-volume-by-so2 = Solution, SO2 ÷ SO2 dedans :
step-tablets-by-so2 = Comprimés, SO2 ÷ SO2 d’un seul :
step-tablets-by-salt = Comprimés, SO2 ÷ (sel d’un seul × part de SO2 du sel) :
step-gas-by-purity = Gaz, SO2 ÷ pureté :
step-so2-in-amount = SO2 dedans, quantité × SO2 d’une unité :
step-added-concentration = Apport, SO2 × 1000 ÷ volume :
step-added-by-rate = Apport, taux × part de SO2 :
step-mass-by-rate = Produit, taux × volume ÷ 1000 :
step-free-after = Libre après, si rien ne se combine :
step-molecular-after = Moléculaire après, libre ÷ (10^(pH − pK) + 1) :
step-salt-mass = Sel, grammes dans 0,1 L ÷ 0,1 L × volume :
step-added-by-one-millilitre = Un mL dans une barrique, SO2 dedans ÷ volume de la barrique :
step-stock-for-a-barrel = Solution pour une barrique, hausse × volume de la barrique ÷ SO2 de la solution :
step-salt-by-recipe = Sulfite, grammes par litre × volume :
step-citric-acid-by-recipe = Acide citrique, grammes par litre × volume :
step-solution-strength = Force dans 100 mL, SO2 ÷ volume × 0,1 L :
step-solution-strength-by-salt = Force en SO2, sel × sa part de SO2 :
step-titrant-normality = Normalité de l’iode, 2 × sa molarité :
step-iodate-normality = Normalité, 6 × mg d’iodate ÷ 214 ÷ mL de la fiole :
step-titrant-used = Titrant consommé, burette − témoin :
step-so2-by-titration = SO2, 32 000 × normalité × titrant ÷ échantillon :
step-ascorbic-counted = L’acide ascorbique compte pour, mg/L × 64,06 ÷ 176,12 :
step-so2-without-ascorbic = SO2 sans lui :
step-spread-of-need = ± du besoin, objectif × 10^(pH − pK) × ln 10 × ± du pH :
step-spread-of-dose = ± de l’ajout, racine de la somme des carrés :
step-dose-lowest = Au plus bas, besoin − libre − son ± :
step-dose-highest = Au plus haut, besoin − libre + son ± :
step-molecular-sure = Moléculaire assuré, après × (1 − racine de la somme des ± relatifs au carré) :
step-blend-free = SO2 libre de l’assemblage, au prorata des volumes :
step-blend-total = SO2 total de l’assemblage, au prorata des volumes :
safety-head = Précautions avec { additive }
more-head =
    { $vessel ->
        [none] Plus
       *[other] { $vessel } : plus
    }
more-no-warnings = Pas d’autre avertissement.
choice-left = { at }laissé tel quel, { $molecular } moléculaire. Goûter et mesurer souvent.
choice-over = { at }pas de quantité pour ça : le total dépasserait { $limit } ({ law-of }).
round-choice = { at }à pH { $ph } c’est un choix : l’envoyer seule.
round-missing =
    { $field ->
        [vessel] quelle cuve est-ce ?
        [volume_L] { at }il manque le volume.
        [ph] { at }il manque le pH.
        [free_mg_L] { at }il manque le SO2 libre.
        [target] { at }quel objectif ? Ajouter un objectif.
        [additive] { at }quel produit ?
        [strength_percent] { at }quel titre a le produit ?
        [tablet_salt_g] { at }combien de grammes pèse un comprimé ?
        [tablet_SO2_g] { at }combien de grammes de SO2 donne un comprimé ?
        [mass_g] { at }combien de grammes ?
       *[none] { at }il manque quelque chose.
    }
round-dose = { $vessel } ({ $list }) : { round-amount }
round-dose-bare = { at }{ round-amount }
round-amount =
    { $unit ->
        [tablets] { $amount } comprimés{ round-of }{ round-all }{ round-limited }{ round-if-red }
       *[other] { round-tablet }{ $amount }{ round-of }{ round-all }{ round-limited }{ round-if-red }
    }
round-limited =
    { $limited ->
        [limited] {" "}(limite)
       *[none] {""}
    }
round-tablet =
    { $tablet ->
        [too-large] un demi-comprimé est trop,{" "}
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
       *[other] {" "}à { $strength } %
    }
round-all =
    { $all ->
        [none] {""}
       *[other] {" "}chacun, { $all } en tout
    }
round-if-red =
    { $red ->
        [unsaid] {""}
        [none] , si rouge rien
        [over] , si rouge { $redAmount }, aussi au-dessus de la limite
       *[some] , si rouge { $redAmount }
    }
round-nothing = { $vessel } ({ $list }) : rien à ajouter
round-nothing-bare = { at }rien à ajouter
round-head =
    { $kind ->
        [powder] À peser, { additive }{ round-strength } :
        [gas] Peser du SO2 gazeux, au poids seulement ; personnel formé, appareil respiratoire à portée :
        [tablet] Prendre des comprimés effervescents de { $size } g de SO2 :
        [salt-tablet] Prendre des comprimés de { $size } g de { additive } :
       *[solution] À mesurer, { additive }{ round-strength } :
    }
round-strength =
    { $size ->
        [none] {""}
       *[other] , { $size } %
    }
round-for-all = Pour toutes : { $list }.
round-kept = Les mesures sont gardées.
round-red = « Si rouge » vaut pour { $red } moléculaire.
round-stock = En solution à { $strength } % : { $list }.
round-rest = Le reste en solution à { $strength } % : { $list }.
round-stock-of = { $vessel } { $amount }
mixed-sample = C’est la moyenne des { $count }, pas le plus bas. L’écart n’est pas connu ; un fût 5 plus bas finit 5 plus bas. En mesurer quelques-uns avant (pratique courante, sans source).
round-mixed = ⚠ Un échantillon moyen dit la moyenne, pas le plus bas : { $list }. En mesurer quelques-uns.
round-low = ⚠ Sous 10 de libre, beaucoup ou tout peut se combiner : { $list }. Y mesurer avant d’en remettre.
round-name = { $name }
round-again = Renvoyer en entier chaque ligne non lue.
round-total =
    En tout { $list } (somme des { $count } quantités arrondies).
round-total-of =
    { $kind ->
        [tablet] { $amount } comprimés effervescents de { $size } g de SO2
        [salt-tablet] { $amount } comprimés de { $size } g de { additive }
       *[other] { $amount } de { additive }{ round-percent }
    }
round-open =
    { $count ->
        [one] Pas de quantité pour une :
       *[other] Pas de quantité pour { $count } :
    }
round-open-names = Pas de quantité pour { $list } : envoyer « tournée » pour voir pourquoi.
round-more = … et { $count } de plus : envoyer « tournée », ou prendre la feuille dessous.
round-and-more = { $count } de plus
round-warned = ⚠ Avertissements à côté de { $list } : envoyer « tournée ».
button-round-all = Tout est mis
button-round-lines = Une par une
button-round-line =
    { $vessel } { $amount }{ $unit ->
        [tablet] { " " }comprimé
        [tablets] { " " }comprimés
       *[other] { "" }
    }{ $count ->
        [several] { " " }chacun
       *[one] { "" }
    }
button-round-next = Suite
button-round-picture = Feuille en image
button-round-file = Feuille en fichier
button-round-undo = Annuler { $entries }
round-noted =
    Noté { $entries } : { $count ->
        [one] un ajout
       *[other] { $count } ajouts
    }, { $list }, { $when }.
round-noted-rest = le reste de la tournée
round-noted-line = Noté { $entry } : { $vessel } { $list }, { $when }.
round-noted-each = Noté { $entry } : { $vessel } { $list } chacun, { $when }.
round-noted-before = Noté avant, et laissé : { $list }.
round-noted-none = Déjà tout noté avant : entrées { $entries }.
round-not-noted = Pas noté, car sans quantité unique : { $list }.
round-strike-one = L’un d’eux n’a pas été mis ? Envoyer « rayer { $entry } pas mis ».
round-pick = Lesquels sont mis ? { $from }–{ $to } sur { $all } :
round-pick-noted = { $vessel } : noté, entrée { $entry }.
round-undone = Annulé : { $entries }. Tout reste au registre, rayé.
round-undone-none = Il n’en reste rien à annuler.
sheet-vessel = Cuve
sheet-volume = Volume L
sheet-ph = pH
sheet-free = SO2 libre mg/L
sheet-free-short = libre
sheet-total = SO2 total mg/L
sheet-dose = SO2 à ajouter mg/L
sheet-weigh = Peser g
sheet-measure = Mesurer mL
sheet-tablets = Comprimés
sheet-additive = Produit
sheet-strength = Titre %
sheet-after = Libre après, si rien ne se combine mg/L
sheet-note = Note
sheet-done = Fait
sheet-in-all = En tout
sheet-nothing = rien à ajouter
sheet-limit = limite
sheet-title = Feuille de pesée
sheet-open = Pas de quantité :
sheet-caution = Gants, lunettes, ventiler. Ne jamais se pencher dans une cuve. Mélanger, mesurer demain.
sheet-fetch = En tout { $list }
sheet-additive-name = { additive }{ round-percent }
file-round = Une tournée de { $count } lignes.
file-round-left = Pas compris, et laissé de côté : ligne { $lines } du fichier.
file-round-ask = Calculer les doses, ou seulement noter les mesures ?
button-file-dose = Doses
button-file-note = Noter les mesures
button-file-vessels = Prendre les cuves
round-gone = Aucune tournée gardée ici : la renvoyer.
round-target-stage = { at }combien de mg/L ajouter ?
round-not-understood =
    { $about ->
        [none] Une ligne que je n’ai pas pu lire.
       *[other] « { $about } » : je n’ai pas pu lire.
    }
round-effect-short = D’habitude 1/3 à 1/2 se combine : mesurer demain.
round-effect = D’habitude 1/3 à 1/2 se combine : mesurer demain. Pour le calcul : envoyer une ligne seule.
choice-additive = { $value ->
        [potassium-metabisulfite] Métabisulfite de potassium E224
        [sodium-metabisulfite] Métabisulfite de sodium E223
        [potassium-metabisulfite-solution] Métabisulfite de potassium E224 en solution
        [sodium-metabisulfite-solution] Métabisulfite de sodium E223 en solution
        [potassium-bisulfite-solution] Bisulfite de potassium E228
        [ammonium-bisulfite-solution] Bisulfite d’ammonium
        [sulfur-dioxide-solution] Solution sulfureuse E220
        [sulfur-dioxide-gas] SO2 gazeux E220
       *[tablet] Comprimés effervescents
    }
choice-powder = { $value ->
        [potassium-metabisulfite] Métabisulfite de potassium en poudre
       *[sodium-metabisulfite] Métabisulfite de sodium en poudre
    }
choice-tablet_salt_g = { $value } g
choice-tablet_SO2_g = { $value } g
folded = Calcul, autres avertissements : bouton Plus.
terminal-start = brimnote calcule les ajouts de SO2. Tape une mesure, par ex. :
terminal-start-example =     T4 45 hl pH 3,58 libre 21
demo-start = Ceci est une démo : le chai du port et ses gens sont inventés, rien n’est gardé. Tape :
demo-start-sheets = La feuille du jour :  aujourd’hui        Un historique :  historique T4        Quoi mesurer ensuite :  à mesurer
demo-start-reading = Puis une mesure à toi, par ex. :  T6 libre 21
demo-start-end = ? en dit plus, Ctrl-D termine.
terminal-start-more = ? en dit plus, Ctrl-D termine. Plusieurs lignes collées ensemble font un message.

## Buttons

button-working = Calcul
button-safety = Sécurité
button-target = Autre objectif
button-more = Plus
button-not-finished = Pas finie
button-red = Rouge
button-choice-leave = Laisser
button-choice-to = À { $free }

## What the cellar remembers

fault-unwritten = Pas noté : je n’ai pas pu l’écrire. Merci de le renvoyer dans une minute.
vessel-unknown =
    { $vessel ->
        [none] Quelle cuve ? Par ex. : T4 ?
       *[other] Je ne sais encore rien de { $vessel }. Envoyer une mesure, par ex. : { $vessel } 45 hl pH 3,58 libre 21
    }
recalled = { $list } ({ $day })
recalled-additive = { additive } ({ $day })
recalled-allowance = marge { $percent } % (votre réglage)
choice-volume_L = { $value }
ask-volume-which =
    { $vessel } : { $known ->
        [none] { $said }, c’est plus que sa capacité. C’est juste ?
       *[other] tu écris { $said }, j’avais { $known }. Lequel ?
    }
read-kept =
    { $new ->
        [new] { $vessel }, nouveau, gardé : { $list }.
       *[known] Lu et gardé : { $list }.
    }
noted-something-else =
    Noté { $entry }, sans calcul : { $vessel } { $text }, { $when }.{ $voids ->
        [ph] { " " }Le pH est à remesurer.
       *[none] { "" }
    }
reading-kept = { at }{ $list }, gardé ({ $when }).
button-added = Je l’ai mis
button-mine = Je m’en charge
button-order = En consigne
button-note = Noter
button-sampled-before = Avant
button-sampled-after = Après
button-dose-anyway = Une dose quand même
button-white = Blanc
button-take = Prendre
import-ask = Je le prends ?
import-taken = Pris : { $entries } entrées.
import-no-file = Pas de fichier « { $file } » que je puisse lire.
export-written = Écrit : { $path }
export-none = Rien n’a été noté dans cette période.
backup-written = Sauvegarde écrite : { $path }
progress-working = J’y travaille …
progress-done = Fait.
errand-failed = Ça n’a pas marché, rien n’a été écrit. Merci de réessayer ; si ça échoue encore, le dire à qui me gère.
backup-elsewhere = Qui me gère fait les sauvegardes. Le registre de cette cave s’emporte avec : export tout
button-undo = Annuler { $entry }
button-done = Consigne { $entry } faite
button-remind = Me le rappeler dans 24 h
added-confirm = { at }{ $added }, c’est { $list }. Noter ?
added-confirm-bare = { at }{ $added } de SO2. Noter ?
noted-addition =
    Noté { $entry } : { $vessel } { $list }, { $when }{ $added ->
        [none] .
       *[other] { " " }({ $added } de SO2).
    }{ $order ->
        [none] { "" }
       *[other] { " " }La consigne { $order } est faite.
    }
noted-bare = Noté { $entry } : { $vessel } { $added } de SO2, { $when }.
noted-measure = Mesurer le SO2 libre dès { $when }, avant d’en remettre.
noted-measure-now = Mesurer le SO2 libre avant d’en remettre.
already-noted = Déjà noté { $entry }, { $when } ({ $who ->
        [you] toi
       *[other] { $who }
    }) : { $vessel }.
odd-more-than-planned = C’est { $factor } fois ce que j’ai calculé pour { $vessel }. Une erreur ? Alors annuler.
odd-large = { $added } en un seul ajout, c’est beaucoup. Une erreur ? Alors annuler.
odd-second = { $vessel } en a déjà eu un, { $when } (entrée { $entry }).
odd-empty = { $vessel } : vide dans mes notes depuis { $when }.
odd-from-empty = { $vessel } : était vide dans mes notes depuis { $when }.
odd-over-capacity = { $volume }, c’est plus que la capacité de { $vessel } ({ $capacity }).
when-noon = Pas d’heure donnée : noté à midi.
when-future =
    { at }« { $text } » est encore à venir{ $when ->
        [none] { "" }
       *[other] { " " }({ $when })
    }. Pas noté. Le renvoyer avec la bonne heure.
when-no-such-day = { at }« { $text } » n’existe pas. Pas noté. Le renvoyer avec la bonne heure.
vessel-new = { $vessel } : première fois que je le vois.
volume-differs =
    { $vessel } : { $known ->
        [none] { $said }, c’est plus que sa capacité
       *[other] { $said }, j’avais { $known }
    } : pas gardé. Si c’est juste, écrire : { $vessel } contient { $written } maintenant
ask-zone = Je donne l’heure en UTC. Quel est ton fuseau ? Écrire : fuseau Europe/Paris
dosed-who =
    { $who ->
        [you] tu as
       *[other] { $who } a
    }
dosed-which-first =
    { $vessel } : { dosed-who } ajouté { $known ->
        [none] du SO2
       *[some] { $list }
    } ({ $when }). Prélevé avant ça ? Pas de dose sans le savoir.
dosed-add-more =
    { $vessel } : { dosed-who } ajouté { $known ->
        [none] du SO2
       *[some] { $list }
    } ({ $when }). En remettre quand même ?
dosed-sampled-before =
    { $vessel } : pas de dose : { dosed-who } ajouté { $known ->
        [none] du SO2
       *[some] { $list }
    } ({ $when }), après ce prélèvement. Remesurer dès { $next }.
dosed-landed =
    { $vessel } : rien de plus pour l’instant : { dosed-who } ajouté { $known ->
        [none] du SO2
       *[some] { $list }
    } ({ $when }), et le SO2 se combine encore pendant un jour. Remesurer dès { $next }.
dosed-in-round =
    { $vessel } : pas de dose : { dosed-who } ajouté { $known ->
        [none] du SO2
       *[some] { $list }
    } ({ $when }). L’envoyer seule.
landed =
    { $vessel } est à { $after }{ $planned ->
        [none] { "" }
       *[other] , prévu { $planned }
    } : sur { $added } { $unit }, { $percent } % combinés.
landed-loose = { $vessel } est à { $after }{ $planned ->
        [none] { "" }
       *[other] , prévu { $planned }
    }. La part combinée n’est pas dite : le libre avant les { $added } { $unit } a été lu le { $day }
landed-fell = { $vessel } : de { $before } à { $after } malgré { $added } { $unit } ajoutés : tout combiné, ou une erreur. Remesurer.
landed-too-high = { $vessel } a monté de { $rise } pour seulement { $added } { $unit } ajoutés. Un chiffre est faux : remesurer.
on-it =
    { $vessel } : { $who ->
        [you] tu t’en charges
       *[other] { $who } s’en charge
    } depuis { $when }.
claimed = { $vessel } est pour toi jusqu’à { $until }. Les autres le voient.
claim-taken = { $vessel } : { $who } s’en charge depuis { $when }.
ordered = Consigne { $entry } : { $vessel } { $list }.
ordered-open = En cours jusqu’à ce que quelqu’un note ce qui a été mis.
order-how = Par ex. : consigne T4 256 g
order-gone = La consigne { $entry } n’est plus en cours.
remind-set = Je redemande pour { $vessel } : { $when }.
remind-late = Trop tard pour ça : mesurer { $vessel } maintenant.
undo-nothing = Rien de toi à annuler.
undo-late = L’entrée { $entry } a plus de 15 minutes. Écrire : rayer { $entry } et pourquoi
undo-not-yours = L’entrée { $entry } a été notée par { $who }. Écrire : rayer { $entry } et pourquoi
strike-none = Il n’y a pas d’entrée { $entry }.
strike-again = L’entrée { $entry } a déjà été rayée (par { $by }).
strike-correction = L’entrée { $entry } est elle-même une correction. Noter à nouveau ce qui était juste.
strike-why = Pourquoi ? Écrire : rayer { $entry } erreur de saisie
struck = Rayé { $entry } ({ $list }). Les deux restent sur la feuille.
struck-addition = Si c’était bien mis, le noter à nouveau.
noted-vessel =
    Noté { $entry } : { $list }.{ $voids ->
        [ph] { " " }Le pH est à remesurer.
        [volume] { " " }Donner le nouveau volume avec la prochaine mesure.
        [blend] { " " }pH et SO2 sont à remesurer.
       *[none] { "" }
    }
amount-unknown = du SO2
fact-capacity = capacité { $volume }
fact-lot = { $lot }
fact-chemical-lot = lot { $lot }
fact-remark = « { $remark } »
event-said =
    { $event ->
        [racked] { " " }soutirage
        [topped] { " " }ouillage
        [acid] { " " }acide ajouté
        [moved] { $whole ->
            [part] { " " }en partie vers { $to }
           *[all] { " " }vers { $to }
        }
        [blended] { $whole ->
            [part] { " " }en partie assemblé dans { $to }
           *[all] { " " }assemblé dans { $to }
        }
        [emptied] { " " }vide
        [lot] { " " }= { $lot }
        [later] , pas de contrôle avant le { $until }
        [unwatched] , plus de contrôles
        [watched] , contrôles repris
        [forgotten] { " " }oublié
       *[told] ,
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
    consigne { $vessel } { $known ->
        [none] { $added } mg/L
       *[some] { $list }
    }
entry-reading = { $vessel } { $list }
entry-vessel =
    { $vessel }{ event-said }{ $told ->
        [none] { "" }
       *[some] { " " }{ $list }
    }
entry-other = { $vessel } { $text } (sans calcul)
entry-stock =
    { $event ->
        [received] reçu
        [used] utilisé, pour aucun vin :
        [discarded] jeté
       *[counted] compté
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }de chez { $supplier }
    }
entry-correction =
    raye { $entry } : { $reason ->
        [undo] annulé
        [sampled-before] prélevé avant l’ajout
        [edited] le message a été modifié
       *[other] { $reason }
    }
round-volume-which = { $vessel } : { $said } ne va pas avec ce qu’il y avait : l’envoyer seule.
sheet-entry =
    { $entry } · { $when } · { $list } · { $who }{ $late ->
        [late] { " " }(noté { $noted })
       *[none] { "" }
    }{ $struck ->
        [none] { "" }
       *[other] { " " }— RAYÉ par { $struck }
    }
day-head = { $day } ({ $zone }) :
day-empty = Rien de noté ({ $day }).
day-more = Les précédentes de ce jour sont dans l’export.
day-none-such = Ce jour n’existe pas.
history-head = { $vessel }, le plus récent en dernier :
history-empty =
    { $vessel ->
        [none] Quelle cuve ? Par ex. : historique T4
       *[other] Encore rien de noté pour { $vessel }.
    }
history-more = Plus anciennes : export { $vessel }
list-more = … et { $count } de plus.
vessels-none = Je ne connais encore aucune cuve. Envoyer une mesure, par ex. : T4 45 hl pH 3,58 libre 21
vessels-head =
    { $number ->
        [one] Une cuve, { $due } à mesurer maintenant :
       *[many] { $count } cuves, { $due } à mesurer maintenant :
    }
vessels-line =
    { $vessel }{ $lot ->
        [none] { "" }
       *[other] { " " }{ $lot }
    } : { $free ->
        [none] pas de mesure
       *[other] libre { $free } ({ $day })
    }{ $next ->
        [empty] , vide
        [now] , À MESURER
        [later] , prochaine { $check }
       *[none] { "" }
    }
vessel-head = { $vessel } : { $list }
vessel-bare = { $vessel }
vessel-empty = { $vessel } : vide depuis le { $day }
vessel-readings = Dernière : { $list }
vessel-void =
    { $field ->
        [ph] pH inconnu
       *[other] Volume inconnu
    } depuis le { $day } ({ $event ->
        [malolactic] malo
        [fermentation] c’était du moût
        [blended] assemblage
        [acid] acide ajouté
        [racked] soutirage
        [topped] ouillage
       *[moved] transfert
    }).
vessel-addition =
    { $entry } · { $when } · { $list }{ $added ->
        [none] { "" }
       *[other] , { $added } mg/L
    } · { $who }{ $landed ->
        [not-yet] { " " }(pas mesuré depuis)
       *[landed] { "" }
    }
vessel-bound =
    { $number ->
        [one] Combiné : { $share } % d’un ajout.
       *[many] Combiné : { $share } % en moyenne sur { $count } ajouts ({ $least }–{ $most } %).
    }
vessel-order = Consigne en cours { $entry } : { $list } ({ $who }, { $when }).
vessel-check =
    Prochain contrôle { $when }{ $why ->
        [landing] { " " }(après l’ajout)
        [forecast] { " " }(d’après ses mesures, il peut alors manquer de libre)
       *[other] { "" }
    }.
vessel-check-due =
    À contrôler depuis { $when }{ $why ->
        [landing] { " " }(après l’ajout)
        [forecast] { " " }(d’après ses mesures, il peut manquer de libre)
       *[other] { "" }
    }.
vessel-unwatched = Pas de contrôles. De nouveau : surveiller { $vessel }
due-none = Rien à mesurer.
due-head =
    { $number ->
        [one] Une cuve à mesurer :
       *[many] { $count } cuves à mesurer, la plus pressée d’abord :
    }
due-stage =
    { $stage ->
        [none] { "" }
       *[other] { " " }(pas finie : pas de dose)
    }
due-overdue =
    { $overdue ->
        [no] { "" }
       *[yes] , { $days } j de retard
    }
due-landing = { $vessel } : ajout ({ $added }) pas mesuré depuis{ due-overdue }{ due-stage }
due-usual =
    { $vessel } : { $free ->
        [none] pas encore de mesure
       *[other] libre { $free } le { $day }
    }{ due-overdue }{ due-stage }
due-often =
    { $vessel } : { $free ->
        [none] pas encore de mesure
       *[other] libre { $free } le { $day }
    }{ $low ->
        [low] , bas
       *[none] { "" }
    }{ due-overdue }{ due-stage }
due-forecast =
    { $vessel } : { $free ->
        [none] pas encore de mesure
       *[other] libre { $free } le { $day }
    }, peut déjà manquer de libre{ due-overdue }{ due-stage }
daily-head = Bonjour.
remind = Il y a un jour : { $list }. Mesurer le SO2 libre maintenant.
open-none = Pas de consigne en cours.
open-head =
    { $number ->
        [one] Une consigne en cours :
       *[many] { $count } consignes en cours :
    }
open-line = { $entry } · { $vessel } { $list } · { $who }, { $when }
language-changed = Tu as écrit en français : je réponds désormais en français.
language-set = Je réponds en français.
button-stay-language = Rester en français
language-not-yet = Je lis cette langue, mais je n’y réponds pas encore.
settings-head = Réglages de cette cave, et comment les changer :
setting-set = Réglé. { $list }
setting-units =
    Unités : { $units ->
        [us] gallons américains
        [imperial] gallons impériaux
       *[metric] litres
    } (on travaille en gallons)
setting-usual-additive =
    Habituel : { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    } (notre habituel est méta 57%)
setting-target = Objectifs, moléculaire : rouge { $red }, blanc { $white }, doux { $sweet } (objectif 0,6 pour les rouges)
setting-allowance =
    { $percent ->
        [none] Pas de marge pour la combinaison (marge 30%)
       *[other] Marge pour la combinaison : { $percent } % sur les doses d’objectif (sans marge)
    }
setting-yield =
    { $yield ->
        [none] Pas de rendement habituel de vendange (rendement 65)
       *[other] Rendement : { $yield } L de moût pour 100 kg de vendange (sans rendement)
    }
setting-basis =
    Base : { $basis ->
        [oiv] OIV
       *[other] pK 1,81
    } (base OIV, base 1,81)
setting-law = Loi : { law-of } (loi UE, loi US)
setting-zone =
    Fuseau : { $zone ->
        [none] pas donné, donc UTC
       *[other] { $zone }
    } (fuseau Europe/Paris)
setting-daily =
    Liste quotidienne : { $daily ->
        [off] aucune (liste quotidienne à 7:30)
       *[other] { $daily } (sans liste quotidienne)
    }
setting-quiet = Silence : { $from } à { $to } (silence 20 à 6)
setting-ph-days = Un pH compte { $days } jours (le pH compte 14 jours)
setting-check-days = Contrôle tous les { $usual } jours ; barriques et libres bas tous les { $often } (contrôler tous les 30 jours, contrôler les barriques tous les 14 jours)
setting-language = Langue : français (langue en)
setting-short-replies =
    Réponses : { $short ->
        [short] courtes (réponses longues)
       *[long] entières (réponses courtes)
    }
setting-wrong =
    Impossible : « { $text } ». { $of ->
        [units] Par ex. : on travaille en gallons
        [usual-additive] Par ex. : notre habituel est méta 57%
        [target] Par ex. : objectif 0,6 pour les rouges
        [yield] Par ex. : rendement 65
        [quiet] Par ex. : silence 20 à 6
        [daily] Par ex. : liste quotidienne à 7:30
        [zone] Par ex. : fuseau Europe/Paris
        [law] Pas de limite connue là. Connues : OIV, UE, UK, US, Canada, Australie, NZ, ZA, Argentine, Chili, Brésil, Japon, Corée, Chine, Codex, Suisse, Géorgie, HK, EAEU. Par ex. : loi UE
        [allowance] Par ex. : marge 30%
        [basis] Par ex. : base OIV
        [ph-days] Par ex. : le pH compte 14 jours
        [check-days] Par ex. : contrôler tous les 30 jours
       *[other] Par ex. : réponses courtes
    }
forgotten-person = Ton nom ne paraîtra plus sur les feuilles. Ce que tu as noté reste, comme personne { $number }.

## People, cellars and chats

role =
    { $role ->
        [keeper] responsable
        [hand] caviste
       *[guest] visiteur
    }
cellar-called =
    { $cellar ->
        [none] { $keeper ->
            [none] cette cave
           *[other] la cave de { $keeper }
        }
       *[other] { $cellar }
    }
keeper-called = { $name }
not-allowed =
    { $role ->
        [keeper] C’est réservé à un responsable de cette cave
       *[hand] C’est réservé aux cavistes et responsables de cette cave
    }{ $keepers ->
        [none] .
       *[some] {" "}: demander à { $list }.
    }
guest-not-kept = Tu es visiteur ici : rien de ceci n’est noté.
not-of-cellar = Tu n’es plus de cette cave. Un responsable peut t’inviter : envoie-moi alors le code.
invite-how = Avec quel rôle ? Écrire : inviter caviste, ou : inviter visiteur, ou : inviter responsable
invite-not-here = Je ne peux pas faire de code ici.
invited = Code pour un { role }, jusqu’au { $day } : { $code }
invited-how =
    { $link ->
        [none] Le premier qui m’envoie « rejoindre » et le code en est.
       *[other] Le premier qui ouvre ceci en est : { $link } (ou m’envoie « rejoindre » et le code)
    }
joined = Te voilà dans { $list }, comme { role }.
joined-before = Tu étais déjà dans { $list }, comme { role }. Le code reste valable.
joined-how =
    { $role ->
        [guest] Demande n’importe quelle cuve, par ex. : T4 ?
       *[other] Envoie une mesure, par ex. : T4 45 hl pH 3,58 libre 21
    }
join-unknown = Ce code n’est pas bon, ou fini. En demander un nouveau.
join-used = Ce code a déjà servi. En demander un nouveau.
people-head = Membres de cette cave :
people-line =
    { $name } : { role }{ $me ->
        [me] { " " }(toi)
       *[other] { "" }
    }
people-how = Pour changer : inviter caviste, nommer Léo visiteur, retirer Léo
role-changed =
    { $role ->
        [none] { $name } n’est plus de cette cave.
       *[other] { $name } est maintenant { role }.
    }
role-same = { $name } est déjà { role }.
last-keeper = { $name } est le dernier responsable. En nommer d’abord un autre, par ex. : Léo est responsable
person-unknown = Je ne connais pas « { $text } » ici. Il y a : { $list }.
person-which = Quel « { $text } » ? { $list }. L’écrire avec le numéro, par ex. : retirer personne 3
person-called =
    { $name ->
        [none] personne { $number }
       *[other] { $name }
    }
at-cellar = { $list } :
at-now = Maintenant à { $list }.
at-already = Nous sommes à { $list }.
at-here = Nous sommes à { $list }.
at-others = Autres : { $list }. Pour changer : à, et le nom
at-only = Il n’y en a pas d’autre ici.
at-unknown = Je ne connais pas de cave « { $text } » ici. Il y a : { $list }.
at-which = Quelle « { $text } » ? { $list }.
cellar-left = Tu n’es plus dans { $list }. Ce que tu as noté reste dans son registre.
cellar-named = Cette cave s’appelle maintenant { $name }.
reads-along =
    { $on ->
        [on] Je réponds ici aux mesures même sans être appelé, quand cuve et chiffres sont clairs.
       *[off] Je ne réponds ici que si on m’appelle.
    }
group-joined = Bonjour. Je calcule les ajouts de sulfite et je tiens le registre d’une cave. Appelez-moi par mon nom, ou répondez-moi.
group-how = Pour commencer : T4 45 hl pH 3,58 libre 21. Plus : aide
corrected = Corrigé.
edited-noted = Ta modification ne change rien : l’entrée { $entry } ({ $vessel }) reste. Si elle est fausse : rayer { $entry } et pourquoi
edited-added = Ta modification ne change rien : { $vessel } a eu un ajout depuis (entrée { $entry }). Envoyer les bons chiffres dans un nouveau message.
edited-late = Ta modification ne change rien : ce message a plus de 15 minutes. L’envoyer à neuf.
edited-anew = Je ne prends pas ça d’une modification. L’envoyer dans un nouveau message.
added-it-none =
    { $vessel ->
        [none] Qu’est-ce qui a été mis, et où ? Par ex. : ajouté 82 g de méta T4
       *[other] Qu’est-ce qui a été mis dans { $vessel } ? Par ex. : ajouté 82 g de méta { $vessel }
    }
picture-none =
    { $vessel ->
        [none] De quelle cuve ? Par ex. : graphique T4
       *[other] Je ne sais encore rien de { $vessel }, il n’y a rien à dessiner.
    }
stranger = Ce bot est pour des personnes invitées. Si tu as un code, envoie : rejoindre et le code
too-fast = Trop de messages d’un coup : je saute les tiens pendant une minute. Renvoie ensuite ce qui est resté sans réponse.

command-today = Ce qui a été noté aujourd’hui
command-due = Cuves à mesurer
command-vessels = Toutes les cuves
command-open = Consignes pas encore faites
command-settings = Ce qui est réglé ici, et comment le changer
command-help = Comment se servir de moi

## Files: export and import

export-entry = N°
export-kind = Type
export-done = Fait (heure locale)
export-noted = Noté (heure locale)
export-late = Tard
export-is-late = tard
export-person = Personne
export-unnamed = personne { $number }
export-vessels = Cuve
export-to = Vers
export-event = Opération
export-wine-lot = Lot de vin
export-wine = Vin
export-additive = Produit
export-strength_percent = Titre %
export-chemical_lot = Lot du produit
export-supplier = Fournisseur
export-mass_g = Quantité g
export-additive_volume_mL = Quantité mL
export-tablets = Comprimés
export-SO2_g = SO2 ajouté g
export-added_mg_L = SO2 ajouté mg/L
export-planned_mg_L = SO2 prévu mg/L
export-planned_free_mg_L = SO2 libre visé mg/L
export-volume_L = Volume L
export-stock-left = Reste en stock (g, mL, comprimés)
export-us-gallons = Volume gal US
export-ph = pH
export-free_mg_L = SO2 libre mg/L
export-total_mg_L = SO2 total mg/L
export-temperature_C = Température °C
export-alcohol_percent = Alcool % vol
export-sugar_g_L = Sucre g/L
export-over_rule = Au-dessus de la limite
export-order = Exécute la consigne n°
export-remark = Remarque
export-corrects = Annule le n°
export-reason = Raison
export-struck_by = Rayé par le n°
export-struck-reason = Rayé parce que
export-calculated = Calculé
export-is-calculated = calculé
export-is-not-calculated = pas calculé
export-at = Fait (avec fuseau)
export-noted_at = Noté (avec fuseau)
export-by = Personne n°
export-name = Nom
export-style = Couleur
export-category = Sorte
export-product = Boisson
export-organic = Bio
export-stage = Stade
export-designated_mg_L = Dérogation, limite mg/L
export-uplift = Année déclarée
export-quality = Mousseux de qualité
export-pdo = AOP
export-bulk = Vrac export
export-density_kg_L = Densité kg/L
export-reserve_mg_L = Gardé pour la mise mg/L
export-lot = Lot dit
export-capacity_L = Capacité L
export-until = Jusqu’à
export-strength_of = Titre en
export-tablet_SO2_g = SO2 d’un comprimé g
export-tablet_salt_g = Sel d’un comprimé g
export-key = Clé

import-vessels = Cuves dans le fichier : { $vessels }.
import-log = Entrées dans le fichier : { $entries }. Cuves : { $vessels }. Personnes : { $people }.
import-not-understood = Pas compris et laissé de côté : { $count ->
        [one] ligne { $lines }
       *[other] lignes { $lines }
    }.
import-not-taken = Pas pris dans ce fichier : { $list }.
import-not-taken-name = { $name ->
        [ph] pH
        [free_mg_L] SO2 libre
        [total_mg_L] SO2 total
        [temperature_C] température
       *[other] { $name }
    }
import-unit = Les volumes sans unité sont lus en { $unit ->
        [L] litres
        [hL] hectolitres
        [mL] millilitres
        [m3] mètres cubes
        [galUS] gallons américains
       *[galUK] gallons impériaux
    }.
import-problem = { $code ->
        [empty] Le fichier est vide.
        [too-large] Le fichier est trop gros : 512 ko au plus, notre propre export 8 Mo.
        [too-many-rows] Le fichier a trop de lignes : 20 000 au plus.
        [too-many-columns] Le fichier a trop de colonnes : 200 au plus.
        [cell-too-long] Une cellule du fichier est trop longue pour en être une.
        [not-a-table] Ce n’est pas un tableau que je sais lire. Envoyer un CSV ou XLSX, ou un texte avec une cuve par ligne : T4; 5200 L; rouge
        [old-spreadsheet] Ce tableur est d’un ancien type, ou verrouillé par un mot de passe. L’enregistrer en XLSX ou CSV, sans mot de passe.
        [broken] Le fichier est abîmé, ou un guillemet n’y est jamais fermé. L’enregistrer à nouveau en XLSX ou CSV.
        [too-heavy] Lire ce fichier prend trop de temps ou de mémoire. Le couper, ou l’envoyer en CSV.
        [columns-missing] On dirait mon propre export, mais il manque des colonnes : { $about }.
        [columns-unknown] On dirait mon propre export, mais je ne connais pas ces colonnes, ou elles y sont deux fois : { $about }.
        [unclear-numbers] Je ne peux pas dire si les nombres ont une virgule ou un point décimal : enregistrer le fichier avec l’un des deux, sans séparateur de milliers.
        [not-understood] On dirait mon propre export, mais ces lignes ne sont pas des entrées : { $lines }.
        [doubled] Un numéro ou une clé de ces lignes est deux fois dans le fichier : { $lines }.
        [refers-outside] Ces lignes renvoient à des entrées absentes du fichier : { $lines }. Tout exporter et importer cela.
        [already-noted] Ces lignes sont déjà notées ici : { $lines }.
       *[no-vessels] Je n’y ai trouvé aucune cuve. Une ligne ressemble à : T4; 5200 L; rouge
    }
import-nothing-taken = Rien n’en a été pris.

## Pictures

picture-unit = SO2 en { $unit }
picture-free = libre { $free } ({ $day })
picture-total = total { $total } ({ $day })
picture-bound = combiné : l’écart entre les deux
picture-odd = libre au-dessus du total
picture-needed =
    { $ph ->
        [no-ph] libre nécessaire (pH pas connu maintenant)
        [no-target] libre nécessaire (pas d’objectif habituel)
       *[other] demande { $needed } de libre à pH { $ph }
    }
picture-limit = limite du total { $limit }
picture-added = ajouté
picture-added-thinned = ajouté (pas de place pour chaque chiffre)
picture-added-unknown = ajouté, quantité inconnue
picture-blended = assemblé

picture-head = { $vessel } depuis le { $day }. Mesures : { $readings }, ajouts : { $additions }.
picture-last = { $list }.
picture-last-free = libre { $value } { $unit } ({ $day })
picture-last-total = total { $value } { $unit } ({ $day })
picture-last-bound = combiné { $value } { $unit } ({ $day })
picture-needs = pH { $ph } ({ $day }) : { $molecular } moléculaire demande { $needed } de libre.
picture-needs-nothing =
    { $why ->
        [no-ph] pH pas connu maintenant, donc le libre nécessaire non plus.
       *[no-target] Pas d’objectif habituel pour lui maintenant.
    }
picture-limit-of-total = Limite du total : { $limit }.
picture-additions =
    { $earlier ->
        [none] Ajouté, { $unit } : { $list }.
       *[other] Ajouté, { $unit } : { $list } ; { $earlier } avant.
    }
picture-addition =
    { $added ->
        [none] pas connu ({ $day })
       *[other] { $added } ({ $day })
    }
picture-unmeasured = Libre pas mesuré depuis l’ajout ({ $day }).
picture-came-from = Venu de { $vessels } ({ $day }) : les chiffres d’avant y sont.
picture-was-blended = Assemblé ({ $day }) : les chiffres d’avant sont d’un autre vin.
picture-empty = Vide ({ $day }).
picture-is-odd = Libre au-dessus du total ({ $days }) : l’un des deux est faux, remesurer.
picture-nothing = Pas de graphique de { $vessel } : encore aucun SO2 mesuré dans son vin actuel.

# Plain questions: the answer, a figure with its source, and what to send next.
question-small-or-large = Moins souvent et plus fort. Un petit ajout peut se combiner en entier sans laisser de libre.
question-small-or-large-why = D’un ajout, 35 à 67 % reste libre ; les chiffres publiés divergent, donc mesurer le lendemain.
question-small-or-large-next = Pour ton vin : T4 45 hl pH 3,58 libre 21
question-how-often = Cuves environ chaque mois, barriques toutes les deux semaines, et un jour après chaque ajout (pratique courante, sans source).
question-how-often-why = Plus tôt s’il fait chaud, si c’est en vidange ou bas en libre.
question-how-often-next = Ce qui est à faire ici : à mesurer
question-which-figure = Le moléculaire protège ; il suit du libre et du pH. La loi compte le total : libre et combiné ensemble.
question-which-figure-why = 0,6 à 0,8 mg/L moléculaire est la plage habituelle (Understanding Wine Chemistry, 2016).
question-which-figure-next = Le tien : pH 3,5 libre 20
question-which-yield = 57,6 % : c’est le SO2 du métabisulfite de potassium pur, par sa formule, et je compte ainsi.
question-which-yield-why = 50 % est une convention du métier avec une réserve dedans : pour le même but, 15 % de poudre en plus.
question-which-yield-next = Ton étiquette dit autre chose ? L’écrire : méta 57%, ou méta 96%
question-tablets-or-powder = Le même SO2, si la taille est la bonne. La poudre dose plus fin mais demande une balance.
question-tablets-or-powder-why = Les effervescents se vendent en grammes de SO2 (2 ou 5 g), les Campden en grammes de sel (0,44 ou 0,55 g) : pratique courante, sans source.
question-tablets-or-powder-next = Ce qu’ils apportent : 2 comprimés de 5 g dans 225 L
question-old-powder = Ouvert et humide, il faiblit, d’un dixième par an environ (pratique courante, sans source). Pris en masse : pas pour le vin.
question-old-powder-why = Ne jamais sentir le sac. Avec une vieille poudre, mesurer le lendemain : il peut en être entré moins que pesé.
question-old-powder-next = Garder sa date : reçu 1 kg de méta lot 12
question-wait-before-yeast = 12 à 24 heures après l’ajout (pratique courante, sans source).
question-wait-before-yeast-why = Sur 50 mg/L dans le moût, environ 16 se retrouvent en total (texte professionnel allemand, 2012).
question-wait-before-yeast-next = La dose : moût 20 hl ajouter 40
question-after-malolactic = Quand l’acide malique est mesuré à zéro, pas avant.
question-after-malolactic-why = Les bactéries veulent moins de 5–10 de libre et de 30–40 mg/L de total (AWRI, pour pH 3,3 à 3,5).
question-after-malolactic-next = Ensuite : T4 malo finie, et sa mesure
question-ppm-and-mg-L = Dans le vin, 1 ppm compte pour 1 mg/L, et 1 g/hL fait 10 mg/L.
question-ppm-and-mg-L-why = En poudre c’est moins : 10 g/hL de métabisulfite de potassium apportent 57,6 mg/L de SO2 (par sa formule).
question-ppm-and-mg-L-next = À essayer : 10 g de méta dans 1 hl
question-teaspoons = Jamais à la cuillère. Une cuillère à café rase de poudre pèse à peu près 5 à 6 g (pratique courante, sans source).
question-teaspoons-why = Une balance à 0,1 g, ou une solution à 10 % et une seringue : voilà ce qu’il faut aux petits lots.
question-teaspoons-next = La solution : préparer 1 L de solution de méta à 10%
question-fell-short = Une part de chaque ajout se combine, d’habitude un tiers à la moitié, plus dans un vin jeune, doux ou pourri. L’air en prend aussi.
question-fell-short-why = Ou : mal mélangé, mesuré trop tôt, vieille poudre, autre volume. 1 mg/L d’oxygène peut consommer 4 mg/L de SO2 (par la formule).
question-fell-short-next = Mesurer, puis : T4 libre 24. Ce que ça a fait : T4 ?
question-strip-reads-otherwise = Croire le labo. Bandelettes et ampoules donnent une idée ; doser d’après un titrage par entraînement ou à l’iode.
question-strip-reads-otherwise-why = Les méthodes qui acidifient lisent trop haut sur les rouges, jusqu’à 66 % (Virginie, 2022). L’iode compte aussi l’acide ascorbique.
question-strip-reads-otherwise-next = Ton titrage : AO 20 mL échantillon, 1,9 mL 0,01 N
question-stop-fermentation = Non. Le sulfite n’arrête pas une fermentation en route, et des bouteilles avec sucre et levures peuvent éclater.
question-stop-fermentation-why = Le froid et une filtration stérile, par quelqu’un du métier ; ensuite un doux se tient près de 1,5 mg/L moléculaire (une table publiée).
question-stop-fermentation-next = Une fois calme : T4 10 hl doux pH 3,3 libre 10
question-sorbate = Jamais de sorbate seul : il tient les levures, pas les bactéries, qui en font une odeur de géranium.
question-sorbate-why = À côté, le vin garde tout son libre pour 0,8 mg/L moléculaire (pratique courante, sans source).
question-sorbate-next = Ce SO2 : T4 10 hl pH 3,4 libre 12
question-allergy = Demander à un médecin : personne ici ne peut dire ce qui est sûr pour quelqu’un. Avec de l’asthme, le sulfite peut être dangereux.
question-allergy-why = L’étiquette le dit dès 10 ppm de total (États-Unis, 27 CFR 4.32(e)), au-dessus de 10 mg/L dans l’UE (1169/2011). Les maux de tête ont bien des causes.
question-allergy-next = Ce que contient un vin : T4 ?
question-law = Ça dépend du marché, de la couleur, du sucre. Code international : rouge 150, blanc et rosé 200 mg/L de total jusqu’à 4 g/L de sucre, au-dessus 300.
question-law-why = (OIV-MA-C1-01.) Pas un avis juridique : à confirmer pour ton marché.
question-law-next = Celui de ton marché : limite rouge SR 3 UE
question-gas = Seulement des gens formés et autorisés là où tu es ; masque, ventilation, une deuxième personne dehors.
question-gas-why = 0,5 ppm sur un poste est la limite de l’UE (2017/164) ; 100 ppm est aussitôt un danger de mort (NIOSH).
question-gas-next = Sans gaz : T4 45 hl pH 3,58 libre 21 méta
question-potassium-or-sodium = Potassium pour le vin. Le sodium est pour le matériel : l’OIV ne le cite pas pour le vin.
question-potassium-or-sodium-why = Ce n’est pas le même poids : 57,6 % de SO2 dans le sel de potassium, 67,4 % dans celui de sodium (par la formule).
question-potassium-or-sodium-next = Dire lequel tu as : T4 45 hl pH 3,58 libre 21 méta
question-when-to-measure = Un jour après le mélange, mieux deux (pratique courante, sans source).
question-when-to-measure-why = Avant, une part est encore en train de se combiner : ça lit trop haut.
question-when-to-measure-next = Ensuite : T4 libre 24
question-how-to-mix = Le dissoudre d’abord dans de l’eau froide ou un peu de vin, environ 50 g par litre (revue professionnelle, 2009). Verser en brassant.
question-how-to-mix-why = Gants, lunettes, air. Jamais avec de l’acide dans le même récipient ; un vin plein de CO2 déborde en mousse.
question-how-to-mix-next = Une solution : préparer 5 L de solution de méta à 5%
question-pH-matters = Plus le pH est bas, plus le libre est moléculaire, et c’est lui qui protège.
question-pH-matters-why = Pour 0,8 mg/L moléculaire : 26 de libre à pH 3,3, 79 à pH 3,8 (University of California, 1982).
question-pH-matters-next = Le tien : pH 3,5 libre 20
question-which-target = Blanc et rosé 0,8 mg/L moléculaire, rouge 0,6, doux 1,5, si tu n’en règles pas d’autre.
question-which-target-why = Publié : 0,6 à 0,8 pour la stabilité (Understanding Wine Chemistry, 2016), rouge à la mise 0,4 à 0,6 (d’après Californie, 1982).
question-which-target-next = Pour le changer : objectif 0,5 pour les rouges
question-stock-keeps = Des jours, pas des semaines : la faire fraîche, la fermer, la dater (pratique courante, sans source).
question-stock-keeps-why = L’OIV dit instables les solutions de SO2 et de bisulfite.
question-stock-keeps-next = Fraîche : préparer 1 L de solution de méta à 10%
question-too-much = Ne plus rien mettre. Le temps, l’air et un soutirage baissent le libre ; un assemblage baisse libre et total.
question-too-much-why = Dès 2 mg/L moléculaire environ, ça se sent (Understanding Wine Chemistry, 2016). Eau oxygénée : seulement un professionnel, là où la loi le permet.
question-too-much-next = Où il en est : T4 ?
question-no-sulfite = C’est possible ; le vin ne tient alors que par le froid, des cuves propres et pleines, un pH bas et une vente rapide.
question-no-sulfite-why = Les levures en font un peu, d’habitude moins de 30 mg/L : « sans sulfite ajouté » n’est pas « sans sulfite ».
question-no-sulfite-next = Ce qu’il a : T4 pH 3,5 libre 5
question-bottling = Mesurer quelques jours avant ; le dernier ajout se fait avant de lancer la chaîne, mélangé et mesuré.
question-bottling-why = Chaque mg/L d’oxygène pris peut consommer jusqu’à 4 mg/L de SO2 libre (par la formule).
question-bottling-next = Avec son oxygène : mise T4 40 hl pH 3,4 libre 22 oxygène 2 mg/L

## The chemical store
stock-tablets =
    { $unit ->
        [tablet] { " " }comprimé
        [tablets] { " " }comprimés
       *[none] { "" }
    }
stock-of =
    { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    }{ $size ->
        [none] { "" }
       *[other] , { $size } g pièce
    }
stock-none = Rien n’est encore noté en stock. Dire ce qu’il y a, ou ce qui est arrivé : reçu 25 kg de méta lot 4471 de chez Norte
stock-none-of = Pas de { additive } noté en stock. Dire ce qui est arrivé (reçu …), ou le compter (stock méta 3,2 kg).
stock-shelf =
    { stock-of } : { $amount }{ stock-tablets }{ $counted ->
        [none] .
       *[other] { " " }(compté { $counted }).
    }
stock-lot =
    { "  " }{ $lot ->
        [none] sans lot
       *[other] lot { $lot }
    } : { $amount }{ stock-tablets }, entré le { $day }{ $supplier ->
        [none] { "" }
       *[other] { " " }de chez { $supplier }
    }
stock-negative = ⚠ { stock-of } : le registre donne { $amount }{ stock-tablets } : une réception n’est pas notée. La noter, ou compter : stock méta 3,2 kg
stock-low = ⚠ Bientôt à court : { $amount }{ stock-tablets } de { stock-of } en stock.
stock-left = En stock maintenant : { $amount }{ stock-tablets } de { stock-of }.
stock-short = ⚠ En stock d’après le registre : { $amount }{ stock-tablets } de { stock-of }, moins qu’il n’en faut.
stock-old = ⚠ Entré depuis plus d’un an : un sac ouvert faiblit (pratique courante, sans source). Mesurer le SO2 libre après.
stock-oldest-lot =
    { $lot ->
        [none] Pris sur le plus ancien de plusieurs ; sinon dire le lot : ajouté …, lot { $other }
       *[other] Pris sur le lot { $lot }, le plus ancien de plusieurs ; sinon le dire : ajouté …, lot { $other }
    }
stock-lot-unknown = Le lot { $lot } n’est pas en stock d’après le registre : pris sur le plus ancien.
stock-noted =
    Noté { $entry } : { $event ->
        [received] reçu
        [used] utilisé
        [discarded] jeté
       *[counted] compté
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }de chez { $supplier }
    }{ $purpose ->
        [none] { "" }
       *[other] { " " }({ $purpose })
    }, { $when }.
stock-corrected =
    Le registre disait { $was } : { $amount }{ stock-tablets } de { $way ->
        [more] plus
       *[less] moins
    } maintenant.
stock-not-kept = Rien n’en est encore noté en stock, donc rien n’en sort. Le compter : stock méta 3,2 kg
stock-lacks =
    { $what ->
        [additive] Quel produit ? Écrire : reçu 25 kg de méta
        [strength] Quel titre ({ additive }) ? Écrire : reçu 10 L de SO2 6%
        [size] Des comprimés de combien de grammes ? Écrire : reçu 50 comprimés 5 g
        [volume] { additive } : les ajouts se mesurent en volume. Écrire : reçu 10 L de SO2 6%
        [one] Un seul produit par message. Écrire : reçu 25 kg de méta
       *[amount] Combien de { additive }, et en quelle unité ? Écrire : { $event ->
            [counted] stock méta 3,2 kg
            [used] utilisé 200 g de méta pour le rinçage
            [discarded] jeté 1 kg de méta
           *[received] reçu 25 kg de méta
        }
    }

# The laboratory: what a titration comes to

titration-result = { $vessel ->
    [none] SO2 { $of ->
        [total] total
       *[other] libre
    } { $result } { $unit }
   *[other] { $vessel } : SO2 { $of ->
        [total] total
       *[other] libre
    } { $result } { $unit }
}, par { $method ->
    [aeration] entraînement et oxydation
   *[other] l’iode
}.
titration-too-much = C’est plus que n’en contient un vin : vérifier l’échantillon, la burette et le titre de la solution. Pas gardé.
titration-molar = L’iode { $molar } M est { $normal } N : une mole prend deux fois.
titration-ascorbic-asked = L’iode compte aussi l’acide ascorbique : { $amount } mg/L se lisent comme +{ $counts } { $unit }. S’il y en a, ajouter « ascorbique { $amount } ».
titration-precision = Deux résultats d’un même vin peuvent différer de { $again } dans un labo, de { $other } entre deux (publié).
titration-red-high = Un rouge : les méthodes qui acidifient lisent le libre trop haut, jusqu’à 66 % dans une étude. Rien n’est déduit ; garder la même méthode.
titration-name-vessel = Pour le garder comme mesure, mettre la cuve devant : T4 …
titration-read = Lu : { $list }.
titration-sample = échantillon { $volume } mL
titration-titrant = titrant { $volume } mL
titration-blank = témoin { $volume } mL
titration-strength = { $unit ->
    [none] { $strength }
   *[other] { $strength } { $unit }
}
titration-iodate = { $mass } mg d’iodate dans { $volume } mL
titration-ascorbic = acide ascorbique { $amount } mg/L
titration-free-assumed = Pris pour du SO2 libre ; écrire « total » si l’échantillon était préparé pour le total.
titration-no-blank = Pas de témoin déduit ; ajouter « témoin 0,1 » s’il y en a eu un.
titration-asks = { $missing ->
    [method] Titré à la soude (AO) ou à l’iode ? L’écrire dedans : AO 20 mL échantillon, 1,9 mL 0,01 N
    [sample] Combien de mL de vin ? Tout renvoyer : { $method ->
        [iodine] iode 25 mL échantillon, 1,4 mL 0,02 N
       *[other] AO 20 mL échantillon, 1,9 mL 0,01 N
    }
    [titrant] Combien de mL à la burette ? Tout renvoyer : { $method ->
        [iodine] iode 25 mL échantillon, 1,4 mL 0,02 N
       *[other] AO 20 mL échantillon, 1,9 mL 0,01 N
    }
    [unit] L’iode est en N ou en M ? L’un est la moitié de l’autre. Écrire N ou M derrière sa force.
   *[strength] Quelle force a le titrant ? Tout renvoyer, avec N ou M : { $method ->
        [iodine] iode 25 mL échantillon, 1,4 mL 0,02 N
       *[other] AO 20 mL échantillon, 1,9 mL 0,01 N
    }
}
titration-either = { $strength } N donne { $normal } { $unit }, { $strength } M donne { $molar } { $unit }.
button-keep-result = Garder
button-keep-of = Garder { $vessel }{ $of ->
    [total] {" "}total
   *[free] {""}
}

# The laboratory: how far a dose may be off, tables, both bases

range-dose = { $vessel ->
    [none] En fourchette
   *[other] { $vessel } : en fourchette
} (95 %) : { $amount ->
    [none] { $low }–{ $high } { $unit } de SO2
   *[other] { $amount }{ $count ->
        [several] {" "}en tout
       *[one] {""}
    }, soit { $low }–{ $high } { $unit } de SO2
}.
range-sure = Après la dose, { $molecular } { $unit } moléculaire sont sûrs, si ce qui se combine est comme compté.
range-sure-unbound = Si rien ne se combine, { $molecular } { $unit } moléculaire sont sûrs après la dose.
range-sure-low = Sous 10 { $unit } de libre, toute la dose peut se combiner : seul { $molecular } { $unit } moléculaire est sûr. Mesurer après un jour.
range-rests = Repose sur pH ± { $ph } et libre ± { $free } { $unit }{ $said ->
    [both] .
    [one] {" "}(ce que tu n’as pas dit : pratique courante, sans source).
   *[none] {" "}(pratique courante, sans source). Les tiens : pH 3,58±0,03 libre 21±2
}
range-limit = Tout en haut, le total peut dépasser la limite.
range-nothing = Une fourchette demande d’abord une dose. Envoyer une mesure, par ex. : T4 45 hl pH 3,58±0,03 libre 21
table-head = SO2 libre ({ $unit }) pour { $targets } moléculaire, { $basis ->
    [oiv] selon l’OIV à 12 % vol et 20 °C (pK { $pK })
   *[other] pK { $pK }
} :
table-row = pH { $ph } : { $free }
table-care = Les objectifs sont publiés sur pK 1,81. Au-dessus de 60 de libre, penser au total et au goût.
molecular-head = { $vessel } : pH { $ph }{ $free ->
    [none] , pas de SO2 libre connu.
   *[other] , libre { $free } { $unit } ({ $day }).
}
molecular-base = { $basis ->
    [oiv] Selon l’OIV, { $alcohol } % vol{ $known ->
        [yes] {""}
       *[no] {" "}(pas donné)
    }, 20 °C
   *[other] Selon pK { $pK }
} : { $molecular ->
    [none] { $target } demande { $needed } de libre.
   *[other] { $molecular } moléculaire ; { $target } demande { $needed } de libre.
}
molecular-meaning = Selon pK 1,81, le même objectif prend { $times } fois le SO2 libre : { $dose } { $unit } à ajouter, selon l’OIV { $other }. Les objectifs publiés reposent sur pK 1,81 ; { $basis ->
    [oiv] les doses de cette cave suivent l’OIV.
   *[other] les doses de cette cave aussi.
}

# This wine: what it bound, when it needs more, too much, blending

lab-lacks = { $vessel } : { $what ->
    [ph] pas de pH connu. En envoyer un, par ex. : T4 pH 3,58 libre 21
    [free] pas de SO2 libre connu. L’envoyer, par ex. : T4 libre 21
    [total] pas de SO2 total connu. L’envoyer, par ex. : T4 total 80
   *[target] aucun objectif ne vaut pour lui tel quel ; rien n’est calculé.
}
learned = Ce vin a combiné { $share } % (± { $spread }) de ses { $count } derniers ajouts.
learned-offer = Ce vin a combiné { $share } % (± { $spread }) de ses { $count } derniers ajouts. { $limit ->
    [passes] Ce qu’il faudrait alors passe trop près de la limite.
   *[within] D’après ça : { $amount ->
        [none] { $dose } { $unit }
       *[other] { $amount } ({ $dose } { $unit })
    }. À toi de choisir.
}
forecast-below = { $vessel } : le SO2 libre passe sous { $needed } { $unit } { $day ->
    [far] dans plus de deux ans
   *[other] vers le { $day }
}{ $from ->
    [now] , et peut y être déjà.
    [far] .
   *[other] {" "}({ $by ->
        [readings] 9 fois sur 10 :{" "}
       *[published] {""}
    }{ $from } à { $to ->
        [far] plus de deux ans
        [never] peut-être jamais
       *[other] { $to }
    }).
}
forecast-steady = { $vessel } : d’après ses mesures, le libre ne baisse pas ; { $from ->
    [now] mesurer pour être sûr.
    [far] sous { $needed } { $unit } dans deux ans au plus tôt.
   *[other] sous { $needed } { $unit } au plus tôt vers { $from }
}
forecast-by-readings = D’après { $count } mesures depuis le dernier ajout : { $lost } % perdus en 30 jours.
forecast-by-rates = { $container ->
    [bottle] D’après une étude de bouteilles, pas d’après ce vin : après 3 ans il reste 45 % à 14 °C, 20 % à 15–26 °C.
   *[other] D’après ce que perdent les barriques, pas d’après ce vin : 3–10 mg/L par mois (pratique courante, sans source). { $fewest } mesures disent la sienne ; il y en a { $number ->
        [one] { $count } seule
       *[many] { $count }
    }.
}
forecast-measure = { $from ->
    [now] Mesurer maintenant.
    [far] Mesurer comme d’habitude.
   *[other] Mesurer avant le { $from }
}
forecast-need = Il lui faut { $needed } : pH { $ph } ({ $day }), { $molecular } moléculaire.
forecast-none = { $vessel } : { $why ->
    [unmeasured] pas de libre mesuré depuis le dernier ajout. Mesurer, puis redemander.
    [below-already] le libre est déjà aux { $needed } { $unit } que demande son pH, ou dessous. Envoyer la mesure pour une dose.
   *[no-rate] pas encore de prévision. Aucune vitesse de perte en cuve n’est connue, et la sienne demande { $fewest } mesures depuis le dernier ajout ; il y en a { $number ->
        [one] { $count } seule
       *[many] { $count }
    }.
}
forecast-unlanded = { $vessel } : le dernier ajout n’est pas encore mesuré. Mesurer d’abord le SO2 libre.
blend-share = { $vessel } avec { $other } : { $starts ->
    [as-it-is] sans rien changer, { $vessel } tient les bornes ; jusqu’à { $most } % de { $other } peuvent y entrer.
   *[other] de { $least } à { $most } % de { $other } dans l’assemblage.
}{ $volume ->
    [none] {""}
   *[other] {" "}Au moins { $volume } de { $other } pour la totalité de { $vessel }{ $enough ->
        [no] {" "}; il n’y en a que { $held }.
       *[yes] .
    }
}
blend-candidates = D’autres qui mettraient { $vessel } dans ses bornes, la plus petite part d’abord :
blend-candidate = { $other } : { $least }–{ $most } %{ $volume ->
    [none] {""}
   *[other] , au moins { $volume }{ $enough ->
        [no] {" "}(il y a { $held })
       *[yes] {""}
    }
}
blend-nobody = { $any ->
    [none] Aucune autre cuve de cette couleur n’est finie avec un libre connu : rien à assembler avec { $vessel }.
   *[other] Aucune des { $count } autres cuves mesurées ne met { $vessel } dans ses bornes.
}
blend-fails = { $vessel } avec { $other } : aucune part ne va : { $fails ->
    [total] le total reste au-dessus de la limite.
    [free] le libre reste au-dessus de la limite.
    [molecular] le moléculaire reste hors de ses bornes.
   *[unmeasured] il manque une mesure d’un des vins.
}
blend-figures = D’après le libre connu : { $list }.
blend-figure = { $vessel } { $free } ({ $day })
blend-bounds = Bornes tenues : { $list }.
blend-bound-total = total au plus { $limit }
blend-bound-no-total = pas de total (un n’est pas mesuré)
blend-bound-free = libre au plus { $limit }
blend-bound-molecular = moléculaire { $least ->
    [none] au plus { $most }
   *[other] { $least }–{ $most }
}, au pire des deux pH
blend-bound-no-ph = pas de moléculaire (un pH n’est pas mesuré)
blend-whole = Les deux en entier, { $volume } : { $free ->
    [none] libre inconnu
   *[other] libre { $free }
}, { $total ->
    [none] total inconnu
   *[other] total { $total }
}, avant que la combinaison ne bouge.
blend-care = Le pH d’un assemblage ne se calcule pas : en mêler un verre dans cette part, mesurer pH, libre et total, puis décider. Les autres limites des deux vins comptent aussi.
too-much-head = { $vessel } : { $free ->
    [none] libre pas mesuré
   *[other] libre { $free }
}{ $total ->
    [none] {""}
   *[other] , total { $total }
}{ $molecular ->
    [none] {""}
   *[other] , moléculaire { $molecular }
}. D’abord remesurer : un chiffre est souvent faux.
too-much-wait = Attendre : { $container ->
    [barrel] les barriques perdent { $least }–{ $most } mg/L de libre par mois (pratique courante, sans source).
    [bottle] les bouteilles en perdent au fil des ans ; on ne peut rien en sortir.
   *[tank] aucune vitesse de perte en cuve n’est connue ; les barriques perdent { $least }–{ $most } mg/L de libre par mois (pratique courante, sans source).
} Le total ne baisse guère.
too-much-air = L’air, un soutirage aéré : 1 mg/L d’oxygène prend jusqu’à { $each } mg/L (théorie), un vin saturé d’air { $low }–{ $high } (un article d’amateur). Ça vieillit le vin.
too-much-blend = Assembler baisse aussi le total : assembler { $vessel }
too-much-peroxide = Eau oxygénée : { $says ->
    [listed] sur la liste de l’Australie, au plus { $left } mg/L restants (AWRI, à l’époque).
    [not-listed] pas admise dans l’UE (AWRI, à l’époque).
    [old-text] une ancienne table américaine l’admet pour des usages étroits seulement ; à vérifier (27 CFR 24.246, 24.247).
   *[none] aucun texte connu pour ton marché.
} Voir d’abord avec l’administration et un œnologue diplômé ; je ne donne pas de quantités.
