### What we say, in English. Figures come in as finished text; names of additives, stages and codes as ids.
### A line is one thing; a phone shows about 45 letters of it in a row.

## Pieces that other sentences use

list-separator = {", "}
barrel-name = barrel
cautions-separator = {" "}
dose-in-all-separator = {" and "}
cautions-of-separator = {" "}
assumed-separator = {"; "}

additive =
    { $additive ->
        [potassium-metabisulfite] potassium metabisulfite
        [sodium-metabisulfite] sodium metabisulfite
        [potassium-metabisulfite-solution] potassium metabisulfite solution
        [sodium-metabisulfite-solution] sodium metabisulfite solution
        [potassium-bisulfite-solution] potassium bisulfite solution
        [ammonium-bisulfite-solution] ammonium bisulfite solution
        [sulfur-dioxide-solution] SO2 solution in water
        [sulfur-dioxide-gas] SO2 gas
        [tablet] effervescent tablets
       *[other] additive
    }
stage-now =
    { $stage ->
        [must] must
        [fermenting] still fermenting
        [malolactic] malolactic still to come
        [base] base wine
        [bottled] bottled
       *[finished] fermentations over
    }
weigh =
    { $vessel ->
        [none] Weigh
       *[other] { $vessel }: weigh
    }
measure =
    { $vessel ->
        [none] Measure
       *[other] { $vessel }: measure
    }
take =
    { $vessel ->
        [none] Take
       *[other] { $vessel }: take
    }
at =
    { $vessel ->
        [none] {""}
       *[other] { $vessel }:{" "}
    }
for-each =
    { $count ->
        [one] {""}
       *[other] {" "}for each
    }
target =
    { $kind ->
        [molecular] { $value } molecular
        [free] { $value } free
       *[add] + { $value }
    }

## The first line: a dose

tablet-word =
    { $unit ->
        [tablet] tablet
       *[tablets] tablets
    }
tablets-of =
    { $additive ->
        [tablet] { $amount } effervescent { tablet-word } ({ $size } g SO2 each)
       *[other] { $amount } { tablet-word } of { $size } g { additive }
    }
measured =
    { $unit ->
        [tablet] { tablets-of }{ for-each }
        [tablets] { tablets-of }{ for-each }
        [solution] { $amount } of { $strength } % { additive }{ for-each }
       *[other] { $amount } { additive }{ for-each }
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
dose-gas = { weigh } { $amount } SO2 gas{ for-each }: trained people only, breathing apparatus at hand, by mass only
dose-in-all = For all { $count }: { $list }.
in-all-stock = { $amount } of the { $strength } % solution
dose-tablet-too-large = { at }half a tablet{ for-each } is already too much.
dose-tablets-give = The tablets alone give { $gives } of { $wanted } { $unit }.
dose-stock = Or { $amount } of a { $strength } % stock of it{ for-each }.
dose-only-stock = { measure } { $amount } of { $strength } % { additive }{ for-each }
dose-rest-as-stock = The rest: { $amount } of { $strength } % { additive }{ for-each }.
dose-negligible = { at }nothing worth adding ({ $short } short).
dose-too-fine = { at }too little to weigh or measure ({ $short } short): make a weaker stock.
dose-gas-too-little = { at }{ $amount } is too little for gas: use a solution.
dose-bottled = { at }bottled: an addition means opening every bottle. Ask first.
refused-ammonium = { at }ammonium bisulfite is for grapes and must only (OIV): not for this wine; ask first.
refused-ammonium-must =
    { $stage ->
        [assumed] Taken as wine whose fermentations are over. Is it must? Then write it whole, with the word must.
       *[said] Is it must? Then write it whole, with the word must.
    }
dose-nothing = { at }nothing to add.
dose-rate = { at }{ $dose } SO2 to add, that is { measured } per { $per }
dose-rate-bare = { at }{ $dose } SO2 to add
dose-need = { at }at pH { $ph }, { $molecular } molecular takes { $free } free
dose-now = { at }{ $molecular } molecular now (pH { $ph }, { $free } free)

## The law

law-of =
    { $region ->
        [oiv] international code
        [eu] EU
        [uk] UK
        [us] US
        [ca] Canada
        [ca-qc] Quebec
        [au] Australia
        [nz] New Zealand
        [za] South Africa
        [ar] Argentina
        [cl] Chile
        [br] Brazil
        [jp] Japan
        [kr] Korea
        [cn] China
        [codex] Codex
        [ch] Switzerland
        [ge] Georgia
        [hk] Hong Kong
        [eaeu] Eurasian union
        [uy] Uruguay
        [in] India
        [md] Moldova
       *[mercosur] Mercosur
    }
law-decides =
    { $region ->
        [oiv] ; your country’s law decides
       *[other] {""}
    }
rule-sugar =
    { $band ->
        [under] {" "}under { $high } g/L sugar
        [to] {" "}up to { $high } g/L sugar
        [from] {" "}from { $low } g/L sugar
        [above] {" "}above { $low } g/L sugar
        [between] {" "}from { $low } to { $high } g/L sugar
       *[none] {""}
    }
rule-class =
    { $class ->
        [sweet-300] , designated sweet
        [sweet-350] , designated sweet
        [sweet-400] , designated sweet
        [national-pdo] , PDO
        [national-pdo-dry] , PDO dry
        [national-pdo-other] , PDO not dry
        [dry] , dry
        [sweet] , sweet
        [bulk-export] , bulk for export
        [made-with-organic] , made with organic grapes
       *[none] {""}
    }
rule-what =
    { $organic ->
        [yes] organic{" "}
       *[no] {""}
    }{ $what ->
        [red] red
        [pale] white or rosé
        [white] white
        [quality-sparkling] quality sparkling
        [other-sparkling] other sparkling
        [fortified] fortified
        [cider] cider
        [mead] mead
        [fruit-wine] fruit wine
        [alcohol-free] alcohol-free wine
       *[wine] wine
    }{ rule-sugar }{ rule-class }
rule-short = { law-of }, { rule-what }
dose-capped =
    { $of ->
        [free] { $list }, not more: free then up to { $after }, limit { $limit } { $unit } free ({ rule-short }).
       *[total] { $list }, not more: total then { $least ->
            [yes] at least{" "}
           *[no] {""}
        }{ $after }, limit { $limit } { $unit } ({ rule-short }).
    }
round-capped =
    { $of ->
        [free] { at }free then up to { $after }, limit { $limit } { $unit } free ({ rule-short }).
       *[total] { at }total then { $least ->
            [yes] at least{" "}
           *[no] {""}
        }{ $after }, limit { $limit } { $unit } ({ rule-short }).
    }
dose-at-limit =
    { $least ->
        [yes] { at }measure the total before any of this: it is at least { $now } now, and this would pass the limit { $limit } { $unit } ({ rule-short }).
       *[no] { at }no sulfite now, { $standing ->
            [over] over the limit already
           *[at] at the limit
        }: { $of ->
            [free] free { $now }, limit { $limit } { $unit } free ({ rule-short }).
           *[total] total { $now }, limit { $limit } { $unit } ({ rule-short }).
        }
    }
dose-over-already = It may not be sold so under that law{ law-decides }: ask whoever answers for this wine.
law-assumed = Unknown, so at its strictest for the limit: { $list }.
law-unknown =
    { $code ->
        [colour-assumed] colour
        [sugar-assumed] sugar
        [sparkling-class-assumed] class of sparkling
       *[density-assumed] density
    }
dose-capped-kept =
    { $reserve ->
        [none] { $kept } { $unit } are kept below it, as a measured { $of } may be so far off. What you aim at would pass it.
       *[some] { $kept } { $unit } are kept below it: { $error } as a measured { $of } may be so far off, { $reserve } for bottling. What you aim at would pass it.
    }
full-dose-asks =
    { $of ->
        [free] { at }free could be { $after }, over the limit of { $limit } { $unit } free ({ rule-short }). Give the figures all the same?
       *[total] { at }total would be { $least ->
            [yes] at least{" "}
           *[no] {""}
        }{ $after }, over the limit of { $limit } { $unit } ({ rule-short }). Give the figures all the same?
    }
full-dose-care = The wine may not be sold so under that law. The log keeps that it was known. Not legal advice: confirm for your market.
full-dose-left = Left: the smaller dose stands.
full-dose-none = There is no dose above that would pass a limit.
button-full-dose = Full dose
button-all-the-same = Yes, all the same
over-rule-noted = ⚠ It passes the limit ({ rule-short }): that stands in the log with it.
over-rule = over the limit ({ rule-short })
total-sum = total { $total } ({ $measured } measured { $day } + { $since } added since)
limit-is =
    { at }{ $operator ->
        [below] below
       *[at-most] at most
    } { $limit } { $unit } { $of } SO2: { rule-short }{ $written ->
        [same] {""}
       *[other] , written { $value } { $law_unit }
    }{ $density ->
        [none] {""}
       *[other] {" "}(at density { $density })
    }{ $uplift ->
        [none] {""}
       *[other] , of it { $uplift } for the declared year
    }.
limit-room =
    { $standing ->
        [over] Now { $now } { $of }: over it by { $room } { $unit }.
       *[room] Now { $now } { $of }: room { $room } { $unit }; { $left } with { $kept } kept below it.
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
        [law-text] read in the text of the law
        [law-copy] read in a copy of the law
        [agency] read on the agency’s page
        [foreign-agency] read on another country’s agency page
        [trade-guide] read in a trade guide
        [secondary] read in a secondary source
       *[memory] from memory, so unconfirmed: it makes no dose smaller
    }.
limit-none =
    { at }no limit on file: { law-of }, { $product ->
        [still] wine
        [sparkling] sparkling wine
        [quality-sparkling] quality sparkling
        [other-sparkling] sparkling wine
        [fortified] fortified wine
        [fruit-wine] fruit wine
        [alcohol-free] alcohol-free wine
       *[other] { $product }
    }{ $reason ->
        [not-found] {" "}(looked for, not found)
       *[other] {""}
    }. I do not guess: look it up for your market.
limit-notes = Note: { $list }.
limit-notes-separator = {"; "}
law-note =
    { $code ->
        [recommends-only] the code recommends, your country’s law decides
        [other-value-told] another figure is told elsewhere
        [boundary-open] the text leaves this very sugar open, the stricter side was taken
        [boundary-told-otherwise] the page that was read has the other side of this boundary
        [dry-undefined] dry and sweet are given without a figure
        [band-misprinted] the sheet prints the band the wrong way round
        [by-reference] by reference to the EU text
        [derived] two figures that were read, subtracted
        [combined-as-total] the text says combined, taken as total
        [from-seven-percent] for wine of 7 % and more
        [bulk-has-less] bulk wine for export has a lower limit
        [stacks-on-general] the general limit holds beside it
        [sugar-assumed] sugar unknown, taken at its strictest
        [colour-assumed] colour unknown, taken at its strictest
        [sparkling-class-assumed] class of sparkling unknown, the stricter was taken
        [density-assumed] density unknown, taken as 0.990 (say: density 0.995)
        [designation-not-on-file] no row on file for that designation
        [no-uplift] no more in a declared year here
        [organic-not-on-file] no organic limit on file, the general one was taken
        [repealed] { $value } { $unit } was repealed and is not used
        [other-unit-told] another source has { $value } { $unit }
       *[second-value-told] { $value } { $unit } is told elsewhere, from memory
    }
limit-care = Not legal advice: confirm for your market.
designation-asked =
    Sweet wine of a designation with a limit of its own ({ law-of })? I never infer it: say so, { $wine ->
        [none] with: designated 300
       *[other] like: { $wine } designated 300
    }

## The first line: a choice and not a dose

choice-head = { at }a choice, not a dose: at pH { $ph }, { $target } molecular takes { $free } free.
choice-leave = { $mark } Leave it: { $free } free is { $molecular } molecular.
choice-to =
    { $total ->
        [unknown] { $mark } To { $free } ({ $molecular } molecular): { measured }; total unknown: measure it first
       *[known] { $mark } To { $free } ({ $molecular } molecular): { measured }
    }
choice-no-amount = – To { $free } ({ $molecular } molecular): no amount: total would pass { $limit } ({ law-of }).
choice-red =
    { $kind ->
        [none] If it is red, { $red } takes { $free } free: nothing to add.
        [over] If it is red, { $red } takes { $free } free: no amount, total would pass { $limit } ({ law-of }).
       *[other] If it is red, { $red } takes { $free } free: { bare-amount }.
    }
ways-out = Or: colder, cleaner, checked more often; acid for a lower pH: ask someone qualified.

## The stage

bottling-no-oxygen = No oxygen is counted. Measure it, dissolved and headspace, and write it behind: oxygen 2 mg/L
bottling-takes = { $oxygen } mg/L oxygen can take { $loss } { $unit } of it ({ bottling-each }).
bottling-target = { $after } free at bottling, so { $now } now: { $oxygen } mg/L oxygen can take { $loss } { $unit } ({ bottling-each }).
bottling-each =
    { $each ->
        [formula] 4 for 1, by formula
       *[other] { $each } for 1, as you say
    }
bottling-measured = Measured in trade figures (not confirmed) it is { $each } for 1: then { bare-amount } would do. To reckon so: oxygen { $oxygen } mg/L at { $each }
bottling-measured-none = Measured in trade figures (not confirmed) it is { $each } for 1: then nothing is needed. To reckon so: oxygen { $oxygen } mg/L at { $each }
condition-stage = Only if malolactic is finished or not wanted.
condition-red =
    { $kind ->
        [none] If it is red ({ $red } molecular): nothing to add.
        [over] If red ({ $red } molecular): { bare-amount }, also over { $limit }.
       *[other] If it is red ({ $red } molecular): { bare-amount }.
    }
no-dose-fermenting = { at }no sulfite now, it is still fermenting.
no-dose-malolactic = { at }no sulfite now, malolactic is still to come.
no-dose-molecular = Now { $molecular } molecular.
no-dose-why = The bacteria need free below 5–10 and total below 30–40 mg/L (published for pH 3.3–3.5).
no-dose-why-fermenting = Sulfite now is bound at once and harms yeast and bacteria: these need free below 5–10, total below 30–40 mg/L (published for pH 3.3–3.5).
no-dose-all-the-same = Your own figure all the same? Ask whoever answers for this wine, then write it whole: { whole-example }
figure-alone = “{ $text }”: at that stage I take a figure only in a whole message. Write: { whole-example }
whole-example = { $wine }{ in-all } { stage-word } add { $adds } { $unit }
in-all =
    { $count ->
        [several] {" "}total
       *[one] {""}
    }
stage-word =
    { $stage ->
        [must] must
        [fermenting] fermenting
        [malolactic] in ML
       *[base] base wine
    }

## What it does

effect-land = { $after } { $unit } free if nothing binds; expect { $range }, as a third to a half usually binds; measure tomorrow.
effect-land-molecular = From { $molecularNow } to { $molecular } molecular: { $after } { $unit } free if nothing binds; expect { $range }, as a third to a half usually binds; measure tomorrow.
effect-land-to-molecular = To { $molecular } molecular: { $after } { $unit } free if nothing binds; expect { $range }, as a third to a half usually binds; measure tomorrow.
effect-land-low = { $after } { $unit } free if nothing binds; below 10 free much or all may bind: expect { $range }, measure before you add again.
effect-land-small = { $after } { $unit } free at most: the rise is less than a reading’s error.
effect-rise = Free rises about { $range } { $unit }, as a third to a half usually binds; measure tomorrow.
effect-must = Most of it binds while the must ferments: it does not protect the wine later.
must-comes-back = About a third comes back as total SO2: + { $total } { $unit } (German trade text, 2012).
must-yeast = Yeast { $least } to { $most } hours later (common practice, no source).
must-malolactic = Up to { $most } { $unit } before crushing does malolactic no harm (AWRI).
must-published =
    { $read ->
        [read] Published: { $list } ({ $source }).
       *[memory] Published: { $list } ({ $source }; from memory, not read).
    }
must-none-published = The figures on file were published for grapes; for { fact-product } there is none.
must-range =
    { $state ->
        [sound] { must-colour }sound { $range }
        [damaged] { must-colour }some damage { $range }
       *[rot] { must-colour }with rot { $range }
    } { $unit }
must-colour =
    { $style ->
        [red] red{" "}
       *[any] {""}
    }
must-say-state = How sound is the fruit? Say sound, some damage or rot, and there is a figure to choose.
button-published = Add { $add }
effect-raise = + { $dose } { $unit } if nothing binds; a third to a half usually binds; measure tomorrow.
third-needs =
    { $third ->
        [more] ; a third binding needs half as much again
       *[covered] {""}
    }
effect-allowance = Dose × { $factor } for + { $percent } %: reaches { $after } { $unit } if at most { $covers } % binds{ third-needs }. Expect { $range }; measure tomorrow.
effect-allowance-bare = Dose × { $factor } for + { $percent } %: covers { $covers } % binding{ third-needs }. Measure tomorrow.
effect-share = Dose ÷ (1 − { $share }): reaches { $after } { $unit } if just that share binds; expect { $range }; measure tomorrow.
effect-share-bare = Dose ÷ (1 − { $share }): right if just that share binds; measure tomorrow.
other-as-share = If instead { $percent } % of it were lost (÷ { $divisor }): { bare-amount }.
other-as-allowance = As an allowance of + { $percent } % (× { $factor }): { bare-amount }.
nothing-why = { $free } free is { $molecular } molecular at pH { $ph }; the aim is { target }.
nothing-why-free = { $free } free; the aim is { target }.

## An amount that is asked about, that went in, a stock

adds =
    { $number ->
        [many] { at }{ $list } add { $adds } SO2
       *[one] { at }{ $list } adds { $adds } SO2
    }
adds-rate = { at }“{ $rate }” ({ $ofAdditive } { additive }) adds { $adds } SO2
amount = { $amount } { additive }
amount-solution = { $amount } of { $strength } % { additive }
amount-SO2 = { $amount } SO2 from { additive }
amount-tablets =
    { $size ->
        [none] { $amount } { tablet-word } of { additive }
       *[other] { tablets-of }
    }
adds-rate-mass = In { $volume } that is { $amount }.
ferment-stop =
    { $adds ->
        [none] No dose of SO2 reliably stops yeast, and bottles can burst: ask someone qualified.
       *[other] { $adds } does not reliably stop yeast, bottles can burst: ask someone qualified.
    }
ferment-stop-more = I give no dose for that. Until then: keep it cold, no tight closures.
measure-tomorrow = Measure free SO2 tomorrow, before adding again.
reading-read = { at }{ $list }.
solution-weigh = Weigh { $amount } { additive } and fill up with water to { $volume }.
solution-measure = Measure { $amount } { additive } and fill up with water to { $volume }.
solution-from-powder = I make stocks from powder only: make { $volume } of 10% kmbs
solution-strength = That stock holds { $strength } g SO2 in 100 mL.
solution-fresh = Make it fresh, write the date on it: its strength falls within days to weeks (common practice, no source).
solution-per-barrel = In a { $barrel } barrel 1 mL brings { $adds } mg/L; { $rise } mg/L take { $amount }.
solution-us-water = It is water too: in the US at most 1 % of the wine, all additions together (27 CFR 24.246).
solution-too-much = No: { $wanted } g/L does not surely dissolve. Published for { additive } at { $celsius } °C: { $least ->
        [none] { $most } g/L ({ $source }).
       *[other] { $least } and { $most } g/L ({ $source }).
    } Make it weaker.
solution-strengths = I make stocks of 1 to 25 %. Published for potassium metabisulfite at 20 °C: 250 g/L (Food Additives Data Book, p. 780) and 450 g/L (an encyclopedia page).
solution-too-cold = No: { $wanted } g/L in water of { $water } °C. Published is { $most } g/L at { $celsius } °C ({ $source }), and nothing for colder water. Warm the water, or make it weaker.
solution-colder = No figure is published below { $celsius } °C: see that all of it has dissolved.
solution-holding = Holding solution, { $volume }: { $acid } citric acid, { $amount } { additive }.
solution-rinse = Rinse, { $volume }: { $acid } citric acid, { $amount } { additive }.
solution-order = All the water first, then the acid, the sulfite last and little by little. Never powder on acid.
solution-air = It gives off SO2: ventilate, keep your face away, also from the bunghole.
solution-for-holding = For an empty, clean barrel, full to the bung; look after it every few weeks.
solution-for-rinse = For clean equipment: wet all of it, let it act some minutes.
solution-drain = Drain it as local rules allow. Rinse with water before wine goes in.
solution-practice = { $salt } and { $acid } g/L: common practice, no source. Your own figure: { $use ->
        [holding] holding solution { $litres } L 1% kmbs
       *[rinse] rinse { $litres } L 1% kmbs
    }
solution-not-wine =
    { $vessel ->
        [none] Never into wine.
       *[other] Never into wine: { $vessel } has to be empty. Nothing is noted for it.
    }
ask-solution-volume =
    { $use ->
        [rinse] How much rinse do you make? In litres, or with its unit: 20 L, 5 gal
        [holding] How much holding solution? In litres, or with its unit: 225 L, 60 gal
       *[stock] How much do you make? In litres, or with its unit: 5 L, 1 gal
    }
burning-sulfur-never = Burning sulfur (discs, wicks) is never a dose for wine: nobody knows how much of it goes in. No figure from me.
burning-sulfur-danger = In empty barrels only, as the packet, local rules and trained people say. Never after spirits (fire), never unventilated, never unattended.
burning-sulfur-rather = For an empty barrel rather: holding solution 225 L. For its wine send the reading: pH, free SO2, volume.

## What was read and what was assumed

basis-oiv = By the OIV table for { $percent } %, { $celsius } °C (pK { $pK }).
basis-oiv-need = By the OIV table for { $percent } %, { $celsius } °C (pK { $pK }); with pK 1.81 it would need { $free } free.
read = Read: { $list }.
assumed = Assumed: { $list }.
set-aside = Not used: { $list }.
fact-volume = { $volume }
fact-volume-count = { $volume } in { $count } vessels
fact-ph = pH { $ph }
fact-free = free { $free }
fact-total = total { $total }
fact-temperature = { $celsius } °C
fact-alcohol = { $percent } % vol
fact-sugar = { $sugar } g/L sugar
fact-figure = { $figure }
fact-allowance = + { $percent } % allowance
fact-share = { $percent } % binds
fact-style = { $style ->
        [red] red
        [white] white
       *[other] rosé
    }
fact-category = { $category ->
        [sweet] sweet
        [sparkling] sparkling
       *[fortified] fortified
    }
fact-product = { $product ->
        [cider] cider
        [mead] mead
        [alcohol-free] alcohol-free wine
       *[fruit-wine] fruit wine
    }
fact-organic = organic
fact-designated = designated ({ $limit })
fact-uplift =
    { $declared ->
        [yes] declared year
       *[no] no declared year
    }
fact-quality =
    { $quality ->
        [yes] of the quality class
       *[no] not of the quality class
    }
fact-pdo = protected name (PDO)
fact-bulk = bulk for export
fact-density = density { $density } kg/L
fact-reserve = { $reserve } kept for bottling
fact-stage = { stage-now }
fact-target = aim { target }
fact-tablet =
    { $additive ->
        [tablet] effervescent tablets of { $size } g SO2
       *[other] tablets of { $size } g { additive }
    }
fact-strength =
    { $kind ->
        [assay] { additive }, { $strength } % as purity
        [SO2-yield] { additive }, { $strength } % taken as its SO2 yield
        [salt-per-100mL] { additive }, { $strength } % = { $strength } g salt in 100 mL
        [SO2-per-100mL] { additive }, { $strength } % = { $strength } g SO2 in 100 mL
       *[noted] { additive }, { $strength } %
    }
assumed-additive = pure { additive }
assumed-target = target { target }
assumed-target-red = target { target } (red)
assumed-target-sweet = target { target } (sweet)
assumed-gallon = { $gallon ->
        [US] US gallons
       *[imperial] imperial gallons
    }
assumed-must = { $fruit } kg × { $yield } L/100 kg = { $volume }
assumed-must-usual = { $fruit } kg × { $yield } L/100 kg (your usual yield) = { $volume }
assumed-barrels =
    { $count ->
        [one] a barrel of 225 L
       *[several] { $volume } at 225 L a barrel
    }
note-free-unlabelled = “{ $text }” is free SO2
note-ph-unlabelled = “{ $text }” is the pH
note-round-ph = a bare decimal is the pH
note-round-free = a bare figure is free SO2
note-volume-sum = “{ $text }” added up
note-strength-as-salt = the strength is grams of the salt in 100 mL; as SO2 it would be { $factor } times as strong
note-strength-as-SO2 = the strength is grams of SO2 in 100 mL
note-mass-beside-readings = “{ $text }” is grams, not gallons
note-each-or-total = “{ $text }” is of each
note-unread-words = I read English so far, and passed over: { $text }
set-aside-figure = { $text }

## The one question

ask-vessel = { at }which vessel? Like: T4
ask-volume_L =
    { $unit ->
        [L] { at }what volume{ of-each }? In litres, or with its unit: 40 hl, 1450 gal
        [hL] { at }what volume{ of-each }? In hectolitres, or with its unit: 4000 L, 1450 gal
        [m3] { at }what volume{ of-each }? In cubic metres, or with its unit: 40 hl
        [galUS] { at }what volume{ of-each }? In US gallons, or with its unit: 40 hl
        [galUK] { at }what volume{ of-each }? In imperial gallons, or with its unit: 40 hl
       *[other] { at }what volume{ of-each }? With its unit: 225 L, 1450 gal
    }
of-each =
    { $count ->
        [several] {" "}of each
       *[one] {""}
    }
ask-ph = { at }what pH? Like: 3.58
ask-free_mg_L = { at }what free SO2, in { $unit }? Like: 21
ask-target =
    { $usual ->
        [none] { at }what do you aim at? Such wine has no usual target. Like: to 30 free, 0.6 mol, add 25 ppm
       *[some] { at }what do you aim at? Like: to 30 free, 0.6 mol, add 25 ppm
    }
ask-target-stage =
    { $stage ->
        [must] { at }how many { $unit } do you want to add to the must? Write it whole: { whole-example }
        [base] { at }how many { $unit } do you want to add to the base wine? Write it whole: { whole-example }
       *[other] { at }how many { $unit } do you want to add? Write it whole: { whole-example }
    }
ask-tablet-additive = { at }which salt are the tablets? It stands on the packet.
ask-additive = { at }which additive is it?
ask-strength_percent = { at }how strong is it, in %? It stands on the label. Like: { usual-strength }
usual-strength =
    { $named ->
        [potassium-metabisulfite] 96%
        [sodium-metabisulfite] 96%
        [sulfur-dioxide-solution] 6%
       *[other] 10%
    }
ask-tablet_salt_g = { at }how many grams is one tablet? It stands on the packet; 0.44 and 0.55 are usual.
ask-tablet_SO2_g = { at }how many grams of SO2 does one effervescent tablet give? It stands on the packet.
ask-mass_g = { at }how many grams?
ask-mass-spoon = { at }how many grams? A level teaspoon of powder is roughly 5 to 6 g, and that is too rough to dose by: use a balance.
ask-fruit = { at }what volume of must, or what yield? Each with its unit, like: 65 L/100 kg, or: 160 gal/ton, or: 1300 L
option = { $mark }) { $list }
target-of =
    { $vessel ->
        [none] Another target.
       *[other] { $vessel }: another target.
    }

## What cannot be answered as it stands

problem-ph-out-of-range = { at }“{ $about }” cannot be the pH of a wine: I take 2.5 to 4.8. A lost point? Send it like: pH 3.58
problem-negative-value = { at }“{ $about }” is below zero, that cannot be. Send the figure again without the minus.
problem-total-below-free = { at }the total is below the free (“{ $about }”). Turned round? Write: free { $one } total { $two }
problem-volume-not-positive = { at }a volume of “{ $about }” cannot be. Send it like: 1450 gal
problem-unit-mismatch = { at }the unit does not fit in “{ $about }”. Free SO2 is in mg/L or ppm, volume in L, hl or gal.
problem-ambiguous-number =
    { $kind ->
        [split] { at }a blank stands in “{ $about }”. Write: pH { $one }
        [volume] { at }“{ $about }” could be off by a thousand. Write: { $one }, or: { $two }
        [mass] { at }“{ $about }” could be off by a thousand. Write: { $one }, or: { $two }
        [thousands] { at }“{ $about }” could be off by a thousand. Write: { $one }, or: { $two }
        [powder] { at }“{ $about }”: of SO2, or of the powder? Write: add { $one } ppm SO2, or: { $two } g per 10 L { $named }
        [salt] { at }“{ $about }”: of SO2, or of the salt? As SO2 it is too strong to be sold. If the label says salt, write: { salt-name } salt { $one }%
        [water] { at }“{ $about }”: SO2 in water, or a stock of metabisulfite? Write: SO2 water { $one }%, or: { $one }% kmbs solution
        [SO2-percent] { at }“{ $about }”: alcohol, SO2 in water or a stock of metabisulfite? Write: { $one }% vol, SO2 water { $one }%, or: { $one }% kmbs solution
        [percent] { at }“{ $about }”: alcohol, or the strength of a solution? Write: { $one }% vol, or: { stock-name } solution { $one }%
        [degree] { at }“{ $about }”: alcohol or temperature? Write: { $one }% vol, or: { $one } C
        [to] { at }“{ $about }”: is { $two } the aim? Write: free { $one }, target { $two }
        [range] { at }“{ $about }” looks like a range. Write one of them: free { $one }, or: free { $two }
        [pair] { at }“{ $about }”: free and total, or one reading between two marks? Write: free { $one } total { $two }, or: free { $one }
        [free] { at }“{ $about }”: free or total SO2? Write: free { $one }, or: total { $one }
        [aim] { at }“{ $about }”: to add, or to reach? Write: add { $one } ppm, or: target { $one }
       *[other] { at }“{ $about }” can be read in more than one way. Say what it is, like: pH 3.58 free 21 1450 gal
    }
salt-name =
    { $named ->
        [ammonium-bisulfite-solution] ammonium bisulfite
       *[other] potassium bisulfite
    }
stock-name =
    { $named ->
        [sodium-metabisulfite] smbs
        [sodium-metabisulfite-solution] smbs
       *[other] kmbs
    }
problem-each-or-total = { at }is “{ $about }” of each, or of all together? Write: { $about } each, or: { $about } total
problem-conflicting-values = { at }two values for one thing: “{ $about }”. Send one of them; two wines go on a line each.
problem-unknown-additive = { at }“{ $about }” is no SO2 additive that I know. I know: potassium or sodium metabisulfite (powder, solution), bisulfite, SO2 in water, SO2 gas, tablets.
problem-did-you-mean = { at }“{ $about }” is another chemical. Did you mean metabisulfite?
problem-strength-out-of-range = { at }the strength “{ $about }” does not fit that additive. Look at the label. Like: { usual-strength }
problem-value-out-of-range = { at }“{ $about }” is more than any cellar has. Check the figure and its unit.
problem-not-understood = I could not read that. Send a reading like: T4 1450 gal pH 3.58 free 21. ? shows more.
problem-too-long = That is too long to read safely. Send at most 25 vessels at a time, a line each.
problem-no-number =
    { $again ->
        [correction] No dose until that is clear.
       *[whole] No dose until that is clear. Send the whole line again.
    }
problem-share = { at }“{ $about }”: I reckon with at most 4/5 (0.8) that binds.
problem-vessel-twice = { $vessel } stands twice: send it once.
problem-two-vessels = “{ $about }”: two vessels. Send a line for each.
no-such-choice = There is no { $text } here: a to { $last }, or its name.
no-such-button = There is no { $text } here: 1 to { $last }, or a whole reading.

## Warnings

warning-no-dose-at-this-stage = ⚠ { stage-now }: no dose belongs to that stage; ask whoever answers for this wine.
warning-stage-not-over =
    { $stage ->
        [malolactic] ⚠ This will stop or delay malolactic: ask whoever answers for this wine first. { no-dose-why }
       *[fermenting] ⚠ Fermenting wine binds it at once, and it does not stop yeast reliably: ask whoever answers for this wine first.
    }
warning-additive-not-permitted =
    { $reason ->
        [ammonium] ⚠ Ammonium bisulfite is for grapes and must only (OIV): not for this wine; ask first.
        [organic] ⚠ Organic wine takes SO2 and potassium salts only ({ law-of }, Regulation 889/2008): not this one. Ask first.
        [organic-none] ⚠ Wine labelled organic takes no added sulfite at all ({ law-of }, 7 CFR part 205). Ask first.
       *[sodium] { warning-sodium }
    }
warning-sodium =
    { $region ->
        [oiv] ⚠ Sodium metabisulfite: many rules bar it from wine (OIV; EU and UK unconfirmed). Ask first.
        [eu] ⚠ Sodium metabisulfite is not for wine in the EU, for equipment only (unconfirmed). Ask first.
        [uk] ⚠ Sodium metabisulfite is not for wine in the UK, for equipment only (unconfirmed). Ask first.
        [ar] ⚠ Sodium metabisulfite is not for wine in Argentina: potassium salts only (INV 281/85). Ask first.
       *[other] ⚠ Sodium metabisulfite: no list for { law-of } was read, so unconfirmed; many rules bar it from wine. Ask first.
    }
refused-organic =
    { $reason ->
        [organic-none] { at }no sulfite: wine labelled organic takes none at all ({ law-of }, 7 CFR part 205).
       *[organic] { at }not with { additive }: organic wine takes SO2 and potassium salts only ({ law-of }, Regulation 889/2008).
    }
refused-organic-instead =
    { $reason ->
        [organic-none] Not organic after all? Ask whoever answers for this wine; then: strike the entry that says so.
       *[organic] Write it with kmbs instead. Not legal advice: confirm for your market.
    }
limit-doubt =
    { $confidence ->
        [unconfirmed] , unconfirmed: from memory
       *[read] {""}
    }
warning-total-over-limit =
    { $total ->
        [known] ⚠ That would make total { $total_after_mg_L }, over { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: ask first.
       *[at-least] ⚠ That would make total at least { $total_after_mg_L }, over { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: ask first.
    }
warning-free-over-limit = ⚠ Free could reach { $free_after_mg_L } if nothing binds, over the free limit { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: ask first.
warning-label-threshold =
    ⚠ Label ({ law-of }): sulfites are named { $comparator ->
        [more] above
       *[from] from
    } { $threshold_mg_L } { $unit_of_law }{ $counts ->
        [added] {" "}added
       *[total] {""}
    }{ limit-doubt }; total would be { $total_after_mg_L }.
warning-total-near-limit =
    { $total ->
        [known] ⚠ Total would be { $total_after_mg_L } { $unit }, near the limit { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
       *[at-least] ⚠ Total would be at least { $total_after_mg_L } { $unit }, near the limit { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
    }
warning-total-unknown = ⚠ The total is unknown: measure it.
warning-total-unknown-most = ⚠ Total unknown, measure it: for this dose it may be { $most_total_mg_L } { $unit } at most today, limit { $limit_mg_L } ({ rule-short }){ law-decides }.
warning-no-limit-on-file =
    { $region ->
        [oiv] ⚠ I know no limit for such wine: look up your country’s law.
       *[other] ⚠ No limit on file for it ({ law-of }): look it up for your market.
    }
warning-limit-unconfirmed =
    { $region ->
        [oiv] ⚠ The limit is unconfirmed: look up your country’s law.
       *[other] ⚠ Limit { $limit_mg_L } { $unit } { $of } ({ rule-short }): unconfirmed, from memory. Look it up for your market.
    }
warning-addition-large = ⚠ { $dose_mg_L } { $unit } at once is a lot: check the volume and its unit.
warning-free-needed-high = ⚠ { $target_free_mg_L } { $unit } free is a lot: keep it colder, cleaner, checked more often; or a lower pH, with advice.
warning-molecular-above-2 = ⚠ Above 2 { $unit } molecular SO2 is smelt and tasted.
warning-free-low-may-bind-all = ⚠ Below 10 free much or all may bind: measure before adding again.
warning-ph-unusual = ⚠ pH { $ph } is unusual for wine: check the meter.
warning-basis-fallback = ⚠ The OIV basis needs alcohol, and 20–40 °C: reckoned with pK 1.81.
warning-basis-fallback-change = ⚠ The OIV basis needs alcohol, and 20–40 °C: reckoned with pK 1.81. By OIV at { $compared_at_alcohol_percent } %, { $compared_at_temperature_C } °C it would be about { $change } { $unit } { $direction ->
    [more] more.
   *[less] less.
}
warning-malolactic-may-not-start =
    { $above ->
        [free] ⚠ Free { $free_mg_L } is above { $free_ceiling_high_mg_L } { $unit }: malolactic may not start (AWRI, for pH 3.3–3.5).
        [total] ⚠ Total { $total_mg_L } is above { $total_ceiling_high_mg_L } { $unit }: malolactic may not start (AWRI, for pH 3.3–3.5).
       *[both] ⚠ Free { $free_mg_L } is above { $free_ceiling_high_mg_L }, total { $total_mg_L } above { $total_ceiling_high_mg_L } { $unit }: malolactic may not start (AWRI, for pH 3.3–3.5).
    }
warning-restart-may-fail = ⚠ { $molecular_mg_L } { $unit } molecular holds yeast back: from { $held_back_molecular_mg_L } a restart may fail (common practice, no source).
warning-must-may-hinder-malolactic = ⚠ Above { $malolactic_unharmed_mg_L } { $unit } in the must malolactic may be hindered (AWRI).
warning-rounding-coarse = ⚠ What a scale shows is off by { $rounding_mg_L } { $unit } here: use a finer one, or a stock.
warning-already-dosed = ⚠ It was dosed lately.

## Cautions

cautions = ⚠ { $list }
caution-trained-people-with-breathing-apparatus = Trained people only, breathing apparatus at hand.
caution-grapes-and-must-only = For grapes and must only.
caution-ventilate = Ventilate.
caution-never-lean-in = Never lean into a tank.
caution-gloves-goggles = Gloves, goggles.
caution-no-acid-no-chlorine = Never with acid or chlorine cleaners.
caution-no-other-acid-no-chlorine = No other acid, no chlorine cleaner.
caution-asthma = Not for asthmatics.
caution-crush-first = Crush, dissolve in a little wine or water.
caution-dissolve-first = Dissolve first in a little wine or water.
caution-foams-with-carbon-dioxide = Wine full of CO2 foams over.
caution-mix-and-measure-again = Mix, measure after a day.
caution-label-and-rules-first = The label, local rules, a qualified person first.
cautions-of = ⚠ { additive }: { $list }
cautions-short = ⚠ Cautions as before: button Safety.

## Chat

chat-greeting = Hello. Send me a reading, like: T4 1450 gal pH 3.58 free 21. ? shows more.
chat-thanks = You are welcome. Measure again tomorrow.
chat-other = I reckon SO2 additions. Send a reading, like: T4 1450 gal pH 3.58 free 21. ? shows more.
still-asked = One thing is still missing.
chat-negated = Nothing added, then. Nothing to keep.
chat-help-what = Send a reading, get the SO2 addition.
chat-help-dose = T4 1450 gal pH 3.58 free 21
chat-help-dose-means = → what to weigh out
chat-help-effect = 100 g kmbs in 20 hl
chat-help-effect-means = → what an amount adds
chat-help-solution = make 5 L of 10% kmbs
chat-help-solution-means = → how to make a stock
chat-help-fields = Any order; also total, red, 13.5%, target 35, +25 ppm, +30%, smbs. Tanks: a line each.
chat-help-topics = More: help and one of { $list }.
chat-help-care = The label, your local rules and a qualified person come first.

## Help by topic: each a screen of messages to send; `help-<topic>-…` in the order in which they are said

help-wine-1 = In any order: the vessel, its volume, pH, free SO2.
help-wine-2 = T4 1450 gal pH 3.58 free 21 white → what to weigh out
help-wine-3 = T4 40 hl 3.6/18/60 13.5% 14 C → pH, free and total SO2
help-wine-4 = T4 40 hl pH 3.5 free 18 0.6 molecular → to a level of your own; or target 36
help-wine-5 = T4 40 hl add 25 ppm → a stated addition
help-wine-6 = T4 40 hl pH 3.5 free 18 +30% → more, for what binds; or: a third binds
help-wine-7 = T4 40 hl pH 3.5 free 18, 10% kmbs → from a solution; also smbs, 6% so2, 5 g tabs
help-wine-8 = 100 g kmbs in 20 hl → what an amount adds
help-wine-9 = Red, rosé, sweet, cider, mead, organic; must, fermenting, ML done: say what it is, or the reply says what it took.
help-must-1 = For must and juice there is no usual figure: I name what was published, you choose.
help-must-2 = must 20 hl sound → figures to choose from; also: some damage, rot
help-must-3 = must 20 hl add 40 → what to weigh for 40 mg/L
help-must-4 = 2 t grapes 65 L/100 kg sound → by weight of fruit and its yield
help-must-5 = 5 tons grapes 160 gal/ton add 50 → the same in tons and gallons
help-must-6 = yield 65 → sets the usual yield, litres from 100 kg
help-must-7 = Most of it binds: it is no protection later, and about a third is there again as total SO2.
help-bottling-1 = What has to be there now, so that the target stands once the oxygen has taken its part.
help-bottling-2 = bottling T4 40 hl pH 3.4 free 22 oxygen 2 mg/L → 4 SO2 for 1 oxygen, by formula
help-bottling-3 = bottling T4 40 hl pH 3.4 free 22 oxygen 2 mg/L at 2.5 → with a figure of your own
help-bottling-4 = T4 40 hl pH 3.4 free 22 total 90 keep 20 for bottling → room below the limit that is kept
help-bottling-5 = T4 in malo pH 3.4 free 25 total 60 → whether malolactic may start; also stuck: a restart
help-bottling-6 = Oxygen: dissolved and headspace together, in mg/L of wine.
help-solutions-1 = Solutions in water: none of them is a dose for wine, and nothing of them goes into the log.
help-solutions-2 = make 5 L of 10% kmbs → a stock: what to weigh, how strong it is, mL for a barrel
help-solutions-3 = make 1 L of 10% kmbs, add 30 ppm → the mL that take a 225 L barrel so far
help-solutions-4 = 10 g kmbs in 100 mL water → how strong that is
help-solutions-5 = holding solution 225 L → for an empty barrel; also: holding solution for 3 barrels
help-solutions-6 = rinse 20 L → for clean equipment; of your own strength: rinse 20 L 1% kmbs
help-solutions-7 = Burning discs or wicks: never a dose for wine, and no figures from me.
help-law-1 = Every dose is held against the limits of your market. Not legal advice: confirm for yours.
help-law-2 = law EU → also US, UK, OIV, Canada, Japan …; for the whole cellar
help-law-3 = limit T4 → the rule, its text, how it was checked, the room left
help-law-4 = limit red RS 3 EU → without a vessel
help-law-5 = T4 red → colour and sugar (RS 3 with a reading) decide; unknown counts at its strictest
help-law-6 = T4 organic → also quality sparkling, PDO, bulk wine, density 0.992
help-law-7 = T4 designated 300 → a sweet wine of a designation; also T4 declared year
help-law-8 = T4 keep 30 for bottling → kept below the limit, with 15 for the reading’s error
help-law-9 = Over it the smaller dose comes first: full dose, then yes. The log keeps that.
help-round-1 = Many vessels in one message, a line each; what holds for all (kmbs, target 30) in the first line. One tap notes all of it, or line by line.
help-round-2 = T1 20 hl pH 3.4 free 18 → as a line of it; I add up what to fetch
help-round-3 = round → all its lines once more
help-round-4 = sheet xlsx → to take along; also sheet csv, sheet picture
help-round-5 = B1-B24 225 L pH 3.6 free 18 → a dose for each barrel, an entry for each
help-round-6 = B1-B24 without B7 225 L pH 3.6 free 18 → all but one
help-round-7 = 34 barrels, mixed sample: pH 3.6 free 18 → for their mean, and what that hides
help-round-8 = Or send a CSV or XLSX: vessel, volume, pH, free SO2. The sheet comes back.
help-stock-1 = Every addition draws on it, once something is in.
help-stock-2 = received 25 kg kmbs lot 4471 from Norte Supplies → also 10 L of 6% so2
help-stock-3 = stock → what is there, by lot; stock kmbs: one
help-stock-4 = stock kmbs 3.2 kg → counted on the shelf: holds from then on
help-stock-5 = used 200 g kmbs for rinsing → for no wine
help-stock-6 = discarded 1 kg kmbs because caked → thrown away
help-stock-7 = added 82 g kmbs T4 lot 4471 → from that lot; else the oldest
help-stock-8 = export stock → receipts, suppliers, lots and what was left, for the books
help-log-1 = Nothing is deleted; corrections stand beside what they correct.
help-log-2 = added 82 g kmbs T4 → noted; also ppm, mL, yesterday 17:00, lot 4471, note: …
help-log-3 = T4 now free 28 total 96 → a reading kept, without a dose
help-log-4 = order T4 256 g kmbs → for somebody else to do; open shows what is not done yet
help-log-5 = today → what was noted today; also yesterday, 12 Nov
help-log-6 = T4 history → all that is noted of it
help-log-7 = undo → takes back your own last, within 15 minutes
help-log-8 = strike 17 typo → takes back entry 17, and says why
help-vessels-1 = What happens to a wine changes what I still count on.
help-vessels-2 = T4? → what I know of it
help-vessels-3 = vessels → all of them
help-vessels-4 = T4 red → also in malo, finished
help-vessels-5 = T4 is 5200 L now → what is in it; T4 holds 6000 L: its size
help-vessels-6 = racked T4 6100 L → also topped T4
help-vessels-7 = moved T4 to T9 → the whole of it, or 20 hl of it
help-vessels-8 = blended T5 into T4 → the pH has to be measured anew
help-vessels-9 = T4 = Blanca 2026 → the name of its wine
help-vessels-10 = T4 empty → also: forget T4
help-reminders-1 = I say once a day what to measure, and after an addition when.
help-reminders-2 = due → what to measure now
help-reminders-3 = daily list at 7:00 → when I say it; or: daily list off
help-reminders-4 = later T4 3 days → asks for it later
help-reminders-5 = not T4 → no more of it; watch T4: again
help-reminders-6 = quiet 21 to 6 → nothing unasked at night
help-settings-1 = All of this holds for the whole cellar.
help-settings-2 = settings → what is set, and how to change each
help-settings-3 = units us → also metric, imperial
help-settings-4 = our usual is smbs → the additive where none is named
help-settings-5 = target 0.5 for reds → also whites, sweets
help-settings-6 = allowance 30% → added to every dose, for what binds
help-settings-7 = time zone Europe/Madrid → for hours and days
help-settings-8 = short replies → the working on a button
help-pictures-1 = A picture shows free, molecular and total SO2, and what went in.
help-pictures-2 = picture T4 → as a photo, with the same in words
help-files-1 = Your log is yours.
help-files-2 = export → this month as a spreadsheet
help-files-3 = export 2026 → also export T4 csv, export 1 Oct to 31 Oct
help-files-4 = An export of another cellar, or a list of vessels as CSV or XLSX: send the file. It is shown first, then taken whole or not at all.
help-people-1 = A group is a cellar of its own: call me by my name, or reply to me.
help-people-2 = people → who is in
help-people-3 = invite hand → a code for one person; also keeper, guest
help-people-4 = A keeper may do everything, a hand doses and logs, a guest looks.
help-people-5 = read along → I answer plain readings uncalled
help-people-6 = at → which cellar; at Blanca: go there; leave Blanca: leave it
help-people-7 = forget me → your name and number come off
help-lab-1 = A titration is reckoned with its working; nothing is kept before you tap.
help-lab-2 = AO 20 mL sample, 1.9 mL 0.01 N → free SO2; with T4 in front, kept by one tap
help-lab-3 = T4 total AO 20 mL sample, 5.6 mL 0.01 N, blank 0.1 → total SO2
help-lab-4 = ripper 25 mL sample, 1.2 mL 0.02 N, ascorbic 50 → iodine, without what ascorbic acid counts as
help-lab-5 = range → how far the last dose may be off
help-lab-6 = T4 1450 gal pH 3.58±0.03 free 21±2 → by your own ±
help-lab-7 = table 0.5 0.8 1.5 pH 3.2-3.8 → free SO2 needed
help-lab-8 = molecular T4 → by pK 1.81 and by OIV
help-forecast-1 = A wine’s own readings tell more than any rule.
help-forecast-2 = forecast T4 → the day free SO2 falls below what its pH needs
help-forecast-3 = Three readings since the last addition make it; before that only barrels and bottles have published rates.
help-forecast-4 = After two additions with readings before and after, a dose says what share this wine bound.
help-forecast-5 = too much SO2 in T4 → what helps and what does not
help-forecast-6 = blend T4 T7 → which share of T7 keeps to limit and target
help-forecast-7 = blend T4 → which other vessels would do
help-topic =
    { $topic ->
        [wine] wine
        [must] must
        [bottling] bottling
        [law] law
        [round] round
        [stock] stock
        [solutions] solutions
        [log] log
        [vessels] vessels
        [reminders] reminders
        [settings] settings
        [pictures] pictures
        [files] files
        [people] people
        [lab] lab
       *[other] { $topic }
    }

send-alone = That goes in a message of its own.
unreadable =
    { $what ->
        [edited] I do not read changed messages. Please send it anew.
        [photo] I cannot read photos. Please type the figures.
        [sticker] Nice. I only read text, though.
        [voice] I cannot hear voice messages. Please type the figures.
        [file] I cannot read files yet. Please type the figures.
       *[other] I only read text. Please type the figures.
    }
fault = That failed on my side, and nothing was worked out. Please send it once more; if it fails again, tell whoever runs me.
fault-aside = That failed on my side three times, so I have put it aside: nothing of it was worked out or noted. Whoever runs me can see why.
left-unread =
    { $count ->
        [one] I was away. A message here is older than 12 hours, and I have not read it: nothing of it is noted. Send it again if it still counts.
       *[other] I was away. { $count } messages here are older than 12 hours, and I have not read them: nothing of them is noted. Send again what still counts.
    }
old-button = That button is from an older message. Please send the reading again.

## An emergency

emergency-out = EVERYBODY OUT to fresh air, now.
emergency-nobody-in = Nobody goes in or leans in after anyone.
emergency-call = Call the emergency services.
emergency-swallowed = Swallowed: rinse the mouth, do not make them vomit, call poison control or the emergency services.
emergency-eyes = Eyes: rinse with water for 15 minutes, contact lenses out.
emergency-skin = Skin: rinse with plenty of water, take wet clothes off.

## The working

working = { $substituted } = { $result }
working-symbol = { $symbol } = { $substituted } = { $result }
working-source = ({ $source })
working-head =
    { $vessel ->
        [none] The working
       *[other] { $vessel }: the working
    }
step-dissociation = Dissociation constant, between the four nearest values by alcohol and temperature:
step-molecular-now = Molecular SO2 now, free ÷ (10^(pH − pK) + 1):
step-free-needed = Free SO2 needed, target × (10^(pH − pK) + 1):
step-oxygen-loss = What oxygen takes, oxygen × SO2 for 1 mg of it:
step-free-before-bottling = Free SO2 needed before, wanted at bottling + what oxygen takes:
step-addition = To add, free wanted − free now:
step-dose-with-allowance = With the allowance, addition × (1 + allowance):
step-dose-with-share = With the share that binds, addition ÷ (1 − share):
step-volume-in-litres = Volume in litres:
step-room-to-limit = Room, limit − what is kept below it − SO2 now:
step-must-of-fruit = Must, fruit × litres from 100 kg ÷ 100 kg:
step-so2-mass = SO2 in grams, addition × volume ÷ 1000:
step-so2-mass-each = SO2 for one vessel, addition × volume of one ÷ 1000:
step-all-vessels = For all vessels, one × number:
step-additive-mass = Additive, SO2 ÷ its share of SO2:
step-additive-mass-by-assay = Additive, SO2 ÷ (assay × share of SO2 in the pure salt):
step-additive-mass-by-yield = Additive, SO2 ÷ its stated SO2 yield:
step-additive-volume-by-salt = Solution, SO2 ÷ (salt in it × share of SO2 in the salt):
step-additive-volume-by-so2 = Solution, SO2 ÷ SO2 in it:
step-tablets-by-so2 = Tablets, SO2 ÷ SO2 in one:
step-tablets-by-salt = Tablets, SO2 ÷ (salt in one × share of SO2 in the salt):
step-gas-by-purity = Gas, SO2 ÷ purity:
step-so2-in-amount = SO2 in it, amount × SO2 in one unit:
step-added-concentration = Added, SO2 × 1000 ÷ volume:
step-added-by-rate = Added, rate × share of SO2:
step-mass-by-rate = Additive, rate × volume ÷ 1000:
step-free-after = Free after, if nothing binds:
step-molecular-after = Molecular after, free ÷ (10^(pH − pK) + 1):
step-salt-mass = Salt, grams in 0.1 L ÷ 0.1 L × volume:
step-added-by-one-millilitre = One mL in a barrel, SO2 in it ÷ volume of the barrel:
step-stock-for-a-barrel = Stock for a barrel, rise × volume of the barrel ÷ SO2 in the stock:
step-salt-by-recipe = Sulfite, grams in a litre × volume:
step-citric-acid-by-recipe = Citric acid, grams in a litre × volume:
step-solution-strength = Strength in 100 mL, SO2 ÷ volume × 0.1 L:
step-solution-strength-by-salt = Strength as SO2, salt × share of SO2 in it:
step-titrant-normality = Normality of the iodine, 2 × its molarity:
step-iodate-normality = Normality, 6 × mg of iodate ÷ 214 ÷ mL of flask:
step-titrant-used = Titrant used, burette − blank:
step-so2-by-titration = SO2, 32 000 × normality × titrant ÷ sample:
step-ascorbic-counted = Ascorbic acid counts as, mg/L × 64.06 ÷ 176.12:
step-so2-without-ascorbic = SO2 without it:
step-spread-of-need = ± of what is needed, target × 10^(pH − pK) × ln 10 × ± of the pH:
step-spread-of-dose = ± of the addition, root of both squared:
step-dose-lowest = Lowest, needed − free − its ±:
step-dose-highest = Highest, needed − free + its ±:
step-molecular-sure = Molecular one is sure of, after × (1 − root of both relative ± squared):
step-blend-free = Free SO2 of the blend, by volume:
step-blend-total = Total SO2 of the blend, by volume:
safety-head = Care with { additive }
more-head =
    { $vessel ->
        [none] More
       *[other] { $vessel }: more
    }
more-no-warnings = No further warnings.
choice-left = { at }left as it is, { $molecular } molecular. Taste and measure often.
choice-over = { at }no amount for that: total would pass { $limit } ({ law-of }).
round-choice = { at }pH { $ph } makes it a choice: send it alone.
round-missing =
    { $field ->
        [vessel] which vessel is it?
        [volume_L] { at }volume is missing.
        [ph] { at }pH is missing.
        [free_mg_L] { at }free SO2 is missing.
        [target] { at }what do you aim at? Add a target.
        [additive] { at }which additive is it?
        [strength_percent] { at }how strong is the additive?
        [tablet_salt_g] { at }how many grams is one tablet?
        [tablet_SO2_g] { at }how many grams of SO2 does one tablet give?
        [mass_g] { at }how many grams?
       *[none] { at }something is missing.
    }
round-dose = { $vessel } ({ $list }): { round-amount }
round-dose-bare = { at }{ round-amount }
round-amount =
    { $unit ->
        [tablets] { $amount } tablets{ round-of }{ round-all }{ round-limited }{ round-if-red }
       *[other] { round-tablet }{ $amount }{ round-of }{ round-all }{ round-limited }{ round-if-red }
    }
round-limited =
    { $limited ->
        [limited] {" "}(limit)
       *[none] {""}
    }
round-tablet =
    { $tablet ->
        [too-large] half a tablet is too much,{" "}
       *[fits] {""}
    }
round-of =
    { $additive ->
        [none] {""}
       *[other] { round-percent } { additive }
    }
round-percent =
    { $strength ->
        [none] {""}
       *[other] {" "}of { $strength } %
    }
round-all =
    { $all ->
        [none] {""}
       *[other] {" "}each, { $all } in all
    }
round-if-red =
    { $red ->
        [unsaid] {""}
        [none] , if red nothing
        [over] , if red { $redAmount }, also over the limit
       *[some] , if red { $redAmount }
    }
round-nothing = { $vessel } ({ $list }): nothing to add
round-nothing-bare = { at }nothing to add
round-head =
    { $kind ->
        [powder] Weigh { additive }{ round-strength }:
        [gas] Weigh SO2 gas, by mass only; trained people only, breathing apparatus at hand:
        [tablet] Take effervescent tablets of { $size } g SO2:
        [salt-tablet] Take tablets of { $size } g { additive }:
       *[solution] Measure { additive }{ round-strength }:
    }
round-strength =
    { $size ->
        [none] {""}
       *[other] , { $size } %
    }
round-for-all = For all: { $list }.
round-kept = The readings are kept.
round-red = “If red” is for { $red } molecular.
round-stock = As a { $strength } % stock of it: { $list }.
round-rest = The rest as a { $strength } % stock: { $list }.
round-stock-of = { $vessel } { $amount }
mixed-sample = That is for the mean of the { $count }: a mixed sample does not show the lowest. How far they differ is not on file; one that is 5 lower lands 5 lower. Measure some each before dosing all (common practice, no source).
round-mixed = ⚠ A mixed sample tells the mean and not the lowest: { $list }. Measure some each.
round-low = ⚠ Below 10 free much or all may bind: { $list }. There measure before adding again.
round-name = { $name }
round-again = Send each line that could not be read again, whole.
round-total =
    In all { $list }: the { $count } rounded amounts added up.
round-total-of =
    { $kind ->
        [tablet] { $amount } effervescent tablets of { $size } g SO2
        [salt-tablet] { $amount } tablets of { $size } g { additive }
       *[other] { $amount }{ round-percent } { additive }
    }
round-open =
    { $count ->
        [one] No amount for one:
       *[other] No amount for { $count }:
    }
round-open-names = No amount for { $list }: send “round” to see why.
round-more = … and { $count } more: send “round”, or take the sheet below.
round-and-more = { $count } more
round-warned = ⚠ Warnings stand beside { $list }: send “round”.
button-round-all = All went in
button-round-lines = One by one
button-round-line =
    { $vessel } { $amount }{ $unit ->
        [tablet] { " " }tablet
        [tablets] { " " }tablets
       *[other] { "" }
    }{ $count ->
        [several] { " " }each
       *[one] { "" }
    }
button-round-next = Next
button-round-picture = Sheet as a picture
button-round-file = Sheet as a file
button-round-undo = Undo { $entries }
round-noted =
    Noted { $entries }: { $count ->
        [one] one addition
       *[other] { $count } additions
    }, { $list }, { $when }.
round-noted-rest = the rest of the round
round-noted-line = Noted { $entry }: { $vessel } { $list }, { $when }.
round-noted-each = Noted { $entry }: { $vessel } { $list } each, { $when }.
round-noted-before = Noted before, and left: { $list }.
round-noted-none = Noted before, all of it: entries { $entries }.
round-not-noted = Not noted, as they have no one amount: { $list }.
round-strike-one = One of them did not go in? Send “strike { $entry } did not go in”.
round-pick = Which went in? { $from }–{ $to } of { $all }:
round-pick-noted = { $vessel }: noted, entry { $entry }.
round-undone = Taken back: { $entries }. They stay in the log, crossed out.
round-undone-none = Nothing of it is left to take back.
sheet-vessel = Vessel
sheet-volume = Volume L
sheet-ph = pH
sheet-free = Free SO2 mg/L
sheet-free-short = free
sheet-total = Total SO2 mg/L
sheet-dose = SO2 to add mg/L
sheet-weigh = Weigh g
sheet-measure = Measure mL
sheet-tablets = Tablets
sheet-additive = Additive
sheet-strength = Strength %
sheet-after = Free after, if nothing binds mg/L
sheet-note = Note
sheet-done = Done
sheet-in-all = In all
sheet-nothing = nothing to add
sheet-limit = limit
sheet-title = Weigh-out sheet
sheet-open = No amount:
sheet-caution = Gloves, goggles, ventilate. Never lean into a tank. Mix, measure tomorrow.
sheet-fetch = In all { $list }
sheet-additive-name = { round-percent } { additive }
file-round = A round of { $count } lines.
file-round-left = Not understood, and left out: line { $lines } of the file.
file-round-ask = Shall I work out the doses, or only note the readings?
button-file-dose = Doses
button-file-note = Note the readings
button-file-vessels = Take the vessels
round-gone = No round is kept here: send it again.
round-target-stage = { at }how many mg/L do you want to add?
round-not-understood =
    { $about ->
        [none] One line I could not read.
       *[other] “{ $about }” I could not read.
    }
round-effect-short = A third to a half usually binds: measure tomorrow.
round-effect = A third to a half of an addition usually binds: measure tomorrow. For a vessel’s working send its line alone.
choice-additive = { $value ->
        [potassium-metabisulfite] Potassium metabisulfite
        [sodium-metabisulfite] Sodium metabisulfite
        [potassium-metabisulfite-solution] Potassium metabisulfite solution
        [sodium-metabisulfite-solution] Sodium metabisulfite solution
        [potassium-bisulfite-solution] Potassium bisulfite solution
        [ammonium-bisulfite-solution] Ammonium bisulfite solution
        [sulfur-dioxide-solution] SO2 solution in water
        [sulfur-dioxide-gas] SO2 gas
       *[tablet] Effervescent tablets
    }
choice-powder = { $value ->
        [potassium-metabisulfite] Potassium metabisulfite powder
       *[sodium-metabisulfite] Sodium metabisulfite powder
    }
choice-tablet_salt_g = { $value } g
choice-tablet_SO2_g = { $value } g
folded = Working, other warnings: press More.
terminal-start = brimnote reckons SO2 additions. Type a reading, like:
terminal-start-example =     T4 1450 gal pH 3.58 free 21
demo-start = This is a demo: the harbour cellar and its people are invented, and nothing you do is kept. Type:
demo-start-sheets = The day sheet:  today        A history:  T4 history        What to measure next:  due
demo-start-reading = Then a reading of your own, like:  T6 free 21
demo-start-end = ? shows more, Ctrl-D ends.
terminal-start-more = ? shows more, Ctrl-D ends. Several lines pasted together are one message.

## Buttons

button-working = Working
button-safety = Safety
button-target = Another target
button-more = More
button-not-finished = Not finished
button-red = Red
button-choice-leave = Leave it
button-choice-to = To { $free }

## What the cellar remembers

fault-unwritten = Not noted: I could not write it down. Please send it again in a minute.
vessel-unknown =
    { $vessel ->
        [none] Which vessel? Like: T4?
       *[other] I know nothing of { $vessel } yet. Send a reading, like: { $vessel } 1450 gal pH 3.58 free 21
    }
recalled = { $list } ({ $day })
recalled-additive = { additive } ({ $day })
recalled-allowance = allowance { $percent } % (your setting)
choice-volume_L = { $value }
ask-volume-which =
    { $vessel }: { $known ->
        [none] { $said } is more than it holds. Is that right?
       *[other] you wrote { $said }, I had { $known }. Which is it?
    }
read-kept =
    { $new ->
        [new] Kept, { $vessel } is new to me: { $list }.
       *[known] Read and kept: { $list }.
    }
noted-something-else =
    Noted { $entry }, not calculated: { $vessel } { $text }, { $when }.{ $voids ->
        [ph] { " " }The pH has to be measured again.
       *[none] { "" }
    }
reading-kept = { at }{ $list }: kept, { $when }.
button-added = I added it
button-mine = I do this one
button-order = Order it
button-note = Note it
button-sampled-before = Before
button-sampled-after = After
button-dose-anyway = A dose all the same
button-white = White
button-take = Take it
import-ask = Shall I take it?
import-taken = Taken: { $entries } entries.
import-no-file = There is no file “{ $file }” that I can read.
export-written = Written: { $path }
export-none = Nothing was noted in that time.
backup-written = Backup written: { $path }
progress-working = Working on it …
progress-done = Done.
errand-failed = That did not work, and nothing was written. Please try again; if it fails again, tell whoever runs me.
backup-elsewhere = Whoever runs me makes the backups. This cellar’s log you take away with: export all
button-undo = Undo { $entry }
button-done = Order { $entry } done
button-remind = Remind me in 24 h
added-confirm = { at }{ $added } is { $list }. Note it?
added-confirm-bare = { at }{ $added } SO2. Note it?
noted-addition =
    Noted { $entry }: { $vessel } { $list }, { $when }{ $added ->
        [none] .
       *[other] { " " }({ $added } SO2).
    }{ $order ->
        [none] { "" }
       *[other] { " " }Order { $order } is done.
    }
noted-bare = Noted { $entry }: { $vessel } { $added } SO2, { $when }.
noted-measure = Measure free SO2 from { $when }, before adding again.
noted-measure-now = Measure free SO2 before adding again.
already-noted = Already noted as { $entry } at { $when } ({ $who ->
        [you] you
       *[other] { $who }
    }): { $vessel }.
odd-more-than-planned = That is { $factor } times what I worked out for { $vessel }. A slip? Then undo.
odd-large = { $added } in one addition is a lot. A slip? Then undo.
odd-second = { $vessel } already had one, { $when } (entry { $entry }).
odd-empty = { $vessel } is down as empty since { $when }.
odd-from-empty = { $vessel } was down as empty since { $when }.
odd-over-capacity = { $volume } is more than the { $capacity } that { $vessel } holds.
when-noon = No hour told: noted for noon.
when-future =
    { at }“{ $text }” is still to come{ $when ->
        [none] { "" }
       *[other] { " " }({ $when })
    }. Not noted. Send it again with the time it was.
when-no-such-day = { at }there is no such time as “{ $text }”. Not noted. Send it again with the time it was.
vessel-new = { $vessel } is new to me.
volume-differs =
    { $vessel }: { $known ->
        [none] { $said } is more than it holds
       *[other] { $said } is not the { $known } I had
    }: not kept. If it is right, write: { $vessel } is { $written } now
ask-zone = I tell times in UTC. Which zone are you in? Write: time zone Europe/Madrid
dosed-who =
    { $who ->
        [you] you
       *[other] { $who }
    }
dosed-which-first =
    { $vessel }: { dosed-who } added { $known ->
        [none] some
       *[some] { $list }
    } at { $when }. Sampled before that? No dose until I know.
dosed-add-more =
    { $vessel }: { dosed-who } added { $known ->
        [none] some
       *[some] { $list }
    } at { $when }. More all the same?
dosed-sampled-before =
    { $vessel }: no dose: { dosed-who } added { $known ->
        [none] some
       *[some] { $list }
    } at { $when }, after that sample. Measure again from { $next }.
dosed-landed =
    { $vessel }: no more for now: { dosed-who } added { $known ->
        [none] some
       *[some] { $list }
    } at { $when }, and SO2 goes on binding for a day. Measure again from { $next }.
dosed-in-round =
    { $vessel }: no dose: { dosed-who } added { $known ->
        [none] some
       *[some] { $list }
    } at { $when }. Send it alone.
landed =
    { $vessel } landed at { $after }{ $planned ->
        [none] { "" }
       *[other] , planned { $planned }
    }: of { $added } { $unit }, { $percent } % bound.
landed-loose = { $vessel } landed at { $after }{ $planned ->
        [none] { "" }
       *[other] , planned { $planned }
    }. What bound is not told: free SO2 before the { $added } { $unit } was read on { $day }.
landed-fell = { $vessel } went from { $before } to { $after } although { $added } { $unit } went in: all bound, or a slip. Measure again.
landed-too-high = { $vessel } rose by { $rise } although only { $added } { $unit } went in. One figure is off: measure again.
on-it =
    { $vessel }: { $who ->
        [you] you are
       *[other] { $who } is
    } on it since { $when }.
claimed = { $vessel } is yours until { $until }. Others see it.
claim-taken = { $vessel }: { $who } is on it since { $when }.
ordered = Order { $entry }: { $vessel } { $list }.
ordered-open = Open until somebody notes what went in.
order-how = Like: order T4 256 g
order-gone = Order { $entry } is not open any more.
remind-set = I ask about { $vessel } at { $when }.
remind-late = Too late for that: measure { $vessel } now.
undo-nothing = There is nothing of yours to undo.
undo-late = Entry { $entry } is older than 15 minutes. Write: strike { $entry } and why
undo-not-yours = Entry { $entry } is by { $who }. Write: strike { $entry } and why
strike-none = There is no entry { $entry }.
strike-again = Entry { $entry } was struck before, by { $by }.
strike-correction = Entry { $entry } is itself a correction. Note anew what was right.
strike-why = Why? Write: strike { $entry } typo
struck = Struck { $entry } ({ $list }). Both stay in the sheet.
struck-addition = If it did go in, note it again.
noted-vessel =
    Noted { $entry }: { $list }.{ $voids ->
        [ph] { " " }The pH has to be measured again.
        [volume] { " " }Tell the new volume with the next reading.
        [blend] { " " }pH and SO2 have to be measured again.
       *[none] { "" }
    }
amount-unknown = some SO2
fact-capacity = holds { $volume }
fact-lot = { $lot }
fact-chemical-lot = lot { $lot }
fact-remark = “{ $remark }”
event-said =
    { $event ->
        [racked] { " " }racked
        [topped] { " " }topped
        [acid] { " " }acid added
        [moved] { $whole ->
            [part] { " " }moved in part to { $to }
           *[all] { " " }moved to { $to }
        }
        [blended] { $whole ->
            [part] { " " }blended in part into { $to }
           *[all] { " " }blended into { $to }
        }
        [emptied] { " " }empty
        [lot] { " " }is { $lot }
        [later] , no check before { $until }
        [unwatched] , no more checks
        [watched] , checks again
        [forgotten] { " " }forgotten
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
    order { $vessel } { $known ->
        [none] { $added } mg/L
       *[some] { $list }
    }
entry-reading = { $vessel } { $list }
entry-vessel =
    { $vessel }{ event-said }{ $told ->
        [none] { "" }
       *[some] { " " }{ $list }
    }
entry-other = { $vessel } { $text } (not calculated)
entry-stock =
    { $event ->
        [received] received
        [used] used, for no wine:
        [discarded] thrown away
       *[counted] counted
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }from { $supplier }
    }
entry-correction =
    strikes { $entry }: { $reason ->
        [undo] taken back
        [sampled-before] sampled before the addition
        [edited] the message was edited
       *[other] { $reason }
    }
round-volume-which = { $vessel }: { $said } does not fit what it held: send it alone.
sheet-entry =
    { $entry } · { $when } · { $list } · { $who }{ $late ->
        [late] { " " }(noted { $noted })
       *[none] { "" }
    }{ $struck ->
        [none] { "" }
       *[other] { " " }— STRUCK by { $struck }
    }
day-head = { $day } ({ $zone }):
day-empty = Nothing noted on { $day }.
day-more = Earlier ones of that day are in the export.
day-none-such = There is no such day.
history-head = { $vessel }, the newest last:
history-empty =
    { $vessel ->
        [none] Which vessel? Like: T4 history
       *[other] Nothing noted of { $vessel } yet.
    }
history-more = Older ones: export { $vessel }
list-more = … and { $count } more.
vessels-none = I know no vessel yet. Send a reading, like: T4 1450 gal pH 3.58 free 21
vessels-head =
    { $number ->
        [one] One vessel, { $due } to measure now:
       *[many] { $count } vessels, { $due } to measure now:
    }
vessels-line =
    { $vessel }{ $lot ->
        [none] { "" }
       *[other] { " " }{ $lot }
    }: { $free ->
        [none] no reading
       *[other] free { $free } ({ $day })
    }{ $next ->
        [empty] , empty
        [now] , MEASURE NOW
        [later] , next { $check }
       *[none] { "" }
    }
vessel-head = { $vessel }: { $list }
vessel-bare = { $vessel }
vessel-empty = { $vessel }: empty since { $day }
vessel-readings = Last: { $list }
vessel-void =
    { $field ->
        [ph] pH
       *[other] Volume
    } not known since { $day }: { $event ->
        [malolactic] malolactic
        [fermentation] it was must then
        [blended] blended
        [acid] acid added
        [racked] racked
        [topped] topped
       *[moved] moved
    }.
vessel-addition =
    { $entry } · { $when } · { $list }{ $added ->
        [none] { "" }
       *[other] , { $added } mg/L
    } · { $who }{ $landed ->
        [not-yet] { " " }(not measured since)
       *[landed] { "" }
    }
vessel-bound =
    { $number ->
        [one] Bound: { $share } % of one addition.
       *[many] Bound: { $share } % on average of { $count } additions ({ $least }–{ $most } %).
    }
vessel-order = Open order { $entry }: { $list } ({ $who }, { $when }).
vessel-check =
    Next check { $when }{ $why ->
        [landing] { " " }(after the addition)
        [forecast] { " " }(its readings say it may fall short then)
       *[other] { "" }
    }.
vessel-check-due =
    Check due since { $when }{ $why ->
        [landing] { " " }(after the addition)
        [forecast] { " " }(its readings say it may fall short)
       *[other] { "" }
    }.
vessel-unwatched = No checks. Again: watch { $vessel }
due-none = Nothing is due.
due-head =
    { $number ->
        [one] One vessel to measure:
       *[many] { $count } vessels to measure, the most urgent first:
    }
due-stage =
    { $stage ->
        [none] { "" }
       *[other] { " " }(not over yet: no dose)
    }
due-overdue =
    { $overdue ->
        [no] { "" }
       *[yes] , { $days } d overdue
    }
due-landing = { $vessel }: addition of { $added }, not measured since{ due-overdue }{ due-stage }
due-usual =
    { $vessel }: { $free ->
        [none] never measured
       *[other] free { $free } on { $day }
    }{ due-overdue }{ due-stage }
due-often =
    { $vessel }: { $free ->
        [none] never measured
       *[other] free { $free } on { $day }
    }{ $low ->
        [low] , low
       *[none] { "" }
    }{ due-overdue }{ due-stage }
due-forecast =
    { $vessel }: { $free ->
        [none] never measured
       *[other] free { $free } on { $day }
    }, may fall short by now{ due-overdue }{ due-stage }
daily-head = Good morning.
remind = A day ago: { $list }. Measure free SO2 now.
open-none = No open orders.
open-head =
    { $number ->
        [one] One open order:
       *[many] { $count } open orders:
    }
open-line = { $entry } · { $vessel } { $list } · { $who }, { $when }
language-changed = You wrote in English: I answer in English from now on.
language-set = I answer in English.
button-stay-language = Stay in English
language-not-yet = I read that language, but do not answer in it yet.
settings-head = Settings of this cellar, and how to change them:
setting-set = Set. { $list }
setting-units =
    Units: { $units ->
        [us] US gallons
        [imperial] imperial gallons
       *[metric] litres
    } (we work in gallons)
setting-usual-additive =
    Usual: { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    } (our usual is kmbs 57%)
setting-target = Targets, molecular: red { $red }, white { $white }, sweet { $sweet } (target 0.6 for reds)
setting-allowance =
    { $percent ->
        [none] No allowance for binding (allowance 30%)
       *[other] Allowance for binding: { $percent } % on doses from a target (no allowance)
    }
setting-yield =
    { $yield ->
        [none] No usual yield of fruit (yield 65)
       *[other] Yield: { $yield } L of must from 100 kg of fruit (no yield)
    }
setting-basis =
    Basis: { $basis ->
        [oiv] OIV
       *[other] pK 1.81
    } (basis OIV, basis 1.81)
setting-law = Law: { law-of } (law EU, law US)
setting-zone =
    Time zone: { $zone ->
        [none] not told, so UTC
       *[other] { $zone }
    } (time zone Europe/Madrid)
setting-daily =
    Daily list: { $daily ->
        [off] off (daily list at 7:30)
       *[other] { $daily } (no daily list)
    }
setting-quiet = Quiet: { $from } to { $to } (quiet 20 to 6)
setting-ph-days = A pH counts { $days } days (pH counts 14 days)
setting-check-days = Checks every { $usual } days; barrels and low ones every { $often } (check every 30 days, check barrels every 14 days)
setting-language = Language: English (language es)
setting-short-replies =
    Replies: { $short ->
        [short] short (long replies)
       *[long] whole (short replies)
    }
setting-wrong =
    That cannot be: “{ $text }”. { $of ->
        [units] Like: we work in gallons
        [usual-additive] Like: our usual is kmbs 57%
        [target] Like: target 0.6 for reds
        [yield] Like: yield 65
        [quiet] Like: quiet 20 to 6
        [daily] Like: daily list at 7:30
        [zone] Like: time zone Europe/Madrid
        [law] No limit on file there. On file: OIV, EU, UK, US, CA, AU, NZ, ZA, AR, CL, BR, JP, KR, CN, Codex, CH, GE, HK, EAEU. Like: law EU
        [allowance] Like: allowance 30%
        [basis] Like: basis OIV
        [ph-days] Like: pH counts 14 days
        [check-days] Like: check every 30 days
       *[other] Like: short replies
    }
forgotten-person = Your name is off further sheets. What you noted stays, as person { $number }.

## People, cellars and chats

role =
    { $role ->
        [keeper] keeper
        [hand] hand
       *[guest] guest
    }
cellar-called =
    { $cellar ->
        [none] { $keeper ->
            [none] this cellar
           *[other] { $keeper }’s cellar
        }
       *[other] { $cellar }
    }
keeper-called = { $name }
not-allowed =
    { $role ->
        [keeper] That is for a keeper of this cellar
       *[hand] That is for hands and keepers of this cellar
    }{ $keepers ->
        [none] .
       *[some] : ask { $list }.
    }
guest-not-kept = You are a guest here: nothing of this is noted.
not-of-cellar = You are not of this cellar any more. A keeper of it can invite you: then send me the code.
invite-how = With which role? Write: invite hand, or: invite guest, or: invite keeper
invite-not-here = I can make no code here.
invited = Code for one { role }, until { $day }: { $code }
invited-how =
    { $link ->
        [none] Whoever sends me “join” and the code first is in.
       *[other] Whoever opens this first is in: { $link } (or sends me “join” and the code)
    }
joined = You are in { $list }, as { role }.
joined-before = You were in { $list } already, as { role }. The code is still good.
joined-how =
    { $role ->
        [guest] Ask for any vessel, like: T4?
       *[other] Send a reading, like: T4 1450 gal pH 3.58 free 21
    }
join-unknown = That code is not good, or over. Ask for a new one.
join-used = That code was used before. Ask for a new one.
people-head = People of this cellar:
people-line =
    { $name }: { role }{ $me ->
        [me] { " " }(you)
       *[other] { "" }
    }
people-how = To change: invite hand, make Ben a guest, remove Ben
role-changed =
    { $role ->
        [none] { $name } is not of this cellar any more.
       *[other] { $name } is { role } now.
    }
role-same = { $name } is { role } already.
last-keeper = { $name } is the last keeper. Make somebody else keeper first, like: Ben is keeper
person-unknown = I know no “{ $text }” here. There are: { $list }.
person-which = Which “{ $text }”? { $list }. Write it with the number, like: remove person 3
person-called =
    { $name ->
        [none] person { $number }
       *[other] { $name }
    }
at-cellar = { $list }:
at-now = Now at { $list }.
at-already = We are at { $list }.
at-here = We are at { $list }.
at-others = Others: { $list }. To change: at, and the name
at-only = There is no other here.
at-unknown = I know no cellar “{ $text }” here. There are: { $list }.
at-which = Which “{ $text }”? { $list }.
cellar-left = You are out of { $list }. What you noted stays in its log.
cellar-named = This cellar is { $name } now.
reads-along =
    { $on ->
        [on] I answer readings here also when nobody calls me, where vessel and figures are plain.
       *[off] I answer here only when called.
    }
group-joined = Hello. I work out sulfite additions and keep the log of a cellar. Call me by my name, or reply to me.
group-how = To begin: T4 1450 gal pH 3.58 free 21. More: help
corrected = Corrected.
edited-noted = Your edit changes nothing: entry { $entry } ({ $vessel }) stands. If it is wrong: strike { $entry } and why
edited-added = Your edit changes nothing: { $vessel } had an addition since (entry { $entry }). Send the right figures as a new message.
edited-late = Your edit changes nothing: that message is older than 15 minutes. Send it as a new one.
edited-anew = I take no such thing from an edit. Send it as a new message.
added-it-none =
    { $vessel ->
        [none] What went in, and where? Like: added 82 g kmbs T4
       *[other] What went into { $vessel }? Like: added 82 g kmbs { $vessel }
    }
picture-none =
    { $vessel ->
        [none] Of which vessel? Like: picture T4
       *[other] I know nothing of { $vessel } yet, so there is nothing to draw.
    }
stranger = This bot is for invited people. If you have a code, send: join and the code
too-fast = Too many messages at once: I pass over yours for a minute. Then send again what I did not answer.

command-today = What was noted today
command-due = Vessels to measure
command-vessels = All vessels
command-open = Orders not done yet
command-settings = What is usual here, and how to change it
command-help = How to use me

## Files: export and import

export-entry = No.
export-kind = Kind
export-done = Done (local time)
export-noted = Noted (local time)
export-late = Late
export-is-late = late
export-person = Person
export-unnamed = person { $number }
export-vessels = Vessel
export-to = Into
export-event = What happened
export-wine-lot = Wine lot
export-wine = Wine
export-additive = Additive
export-strength_percent = Strength %
export-chemical_lot = Lot of the additive
export-supplier = Supplier
export-mass_g = Quantity g
export-additive_volume_mL = Quantity mL
export-tablets = Tablets
export-SO2_g = SO2 added g
export-added_mg_L = SO2 added mg/L
export-planned_mg_L = SO2 planned mg/L
export-planned_free_mg_L = Free SO2 aimed at mg/L
export-volume_L = Volume L
export-stock-left = Left in store (g, mL, tablets)
export-us-gallons = Volume US gal
export-ph = pH
export-free_mg_L = Free SO2 mg/L
export-total_mg_L = Total SO2 mg/L
export-temperature_C = Temperature °C
export-alcohol_percent = Alcohol % vol
export-sugar_g_L = Sugar g/L
export-over_rule = Over the limit of
export-order = Carries out order no.
export-remark = Remark
export-corrects = Takes back no.
export-reason = Reason
export-struck_by = Struck by no.
export-struck-reason = Struck because
export-calculated = Calculated
export-is-calculated = calculated
export-is-not-calculated = not calculated
export-at = Done (with zone)
export-noted_at = Noted (with zone)
export-by = Person no.
export-name = Name
export-style = Colour
export-category = Sort
export-product = Product
export-organic = Organic
export-stage = Stage
export-designated_mg_L = Designated, limit mg/L
export-uplift = Declared year
export-quality = Quality sparkling
export-pdo = Protected name
export-bulk = Bulk for export
export-density_kg_L = Density kg/L
export-reserve_mg_L = Kept for bottling mg/L
export-lot = Lot told
export-capacity_L = Capacity L
export-until = Until
export-strength_of = Strength of
export-tablet_SO2_g = SO2 in a tablet g
export-tablet_salt_g = Salt in a tablet g
export-key = Key

import-vessels = Vessels in the file: { $vessels }.
import-log = Entries in the file: { $entries }. Vessels: { $vessels }. People: { $people }.
import-not-understood = Not understood and left out: { $count ->
        [one] line { $lines }
       *[other] lines { $lines }
    }.
import-not-taken = Not taken from it: { $list }.
import-not-taken-name = { $name ->
        [ph] pH
        [free_mg_L] free SO2
        [total_mg_L] total SO2
        [temperature_C] temperature
       *[other] { $name }
    }
import-unit = Volumes without a unit are read in { $unit ->
        [L] litres
        [hL] hectolitres
        [mL] millilitres
        [m3] cubic metres
        [galUS] US gallons
       *[galUK] imperial gallons
    }.
import-problem = { $code ->
        [empty] The file is empty.
        [too-large] The file is too large: at most 512 kB, our own export 8 MB.
        [too-many-rows] The file has too many rows: at most 20,000.
        [too-many-columns] The file has too many columns: at most 200.
        [cell-too-long] A cell of the file is too long to be one.
        [not-a-table] That is no table that I can read. Send a CSV or XLSX file, or a text with a vessel a line: T4; 5200 L; red
        [old-spreadsheet] That spreadsheet is of an old kind, or locked by a password. Save it as XLSX or CSV, without a password.
        [broken] The file is damaged, or a quotation mark in it is never closed. Save it again as XLSX or CSV.
        [too-heavy] Reading the file takes too long or too much memory. Split it, or send it as CSV.
        [columns-missing] It looks like my own export, but columns are missing: { $about }.
        [columns-unknown] It looks like my own export, but I do not know these columns, or they stand there twice: { $about }.
        [unclear-numbers] I cannot tell whether the numbers have a decimal comma or a decimal point: save the file with one of them, without marks between thousands.
        [not-understood] It looks like my own export, but these lines are no entries: { $lines }.
        [doubled] A number or key of these lines stands in the file twice: { $lines }.
        [refers-outside] These lines are about entries that are not in the file: { $lines }. Export all and import that.
        [already-noted] These lines are noted here already: { $lines }.
       *[no-vessels] I found no vessel in it. A line looks like: T4; 5200 L; red
    }
import-nothing-taken = Nothing of it was taken.

## Pictures

picture-unit = SO2 in { $unit }
picture-free = free { $free } ({ $day })
picture-total = total { $total } ({ $day })
picture-bound = bound: the gap between
picture-odd = free above total
picture-needed =
    { $ph ->
        [no-ph] free needed (pH not known now)
        [no-target] free needed (no usual target now)
       *[other] needs { $needed } free at pH { $ph }
    }
picture-limit = limit of total { $limit }
picture-added = added
picture-added-thinned = added (not every figure has room)
picture-added-unknown = added, amount not known
picture-blended = blended

picture-head = { $vessel } since { $day }. Readings: { $readings }, additions: { $additions }.
picture-last = { $list }.
picture-last-free = free { $value } { $unit } ({ $day })
picture-last-total = total { $value } { $unit } ({ $day })
picture-last-bound = bound { $value } { $unit } ({ $day })
picture-needs = pH { $ph } ({ $day }): { $molecular } molecular takes { $needed } free.
picture-needs-nothing =
    { $why ->
        [no-ph] pH not known now, so what free it needs is not either.
       *[no-target] No usual target for it now.
    }
picture-limit-of-total = Limit of total: { $limit }.
picture-additions =
    { $earlier ->
        [none] Added, { $unit }: { $list }.
       *[other] Added, { $unit }: { $list }; { $earlier } earlier ones.
    }
picture-addition =
    { $added ->
        [none] not known ({ $day })
       *[other] { $added } ({ $day })
    }
picture-unmeasured = Free not measured since the addition of { $day }.
picture-came-from = It came from { $vessels } on { $day }: earlier figures are there.
picture-was-blended = Blended on { $day }: the figures before are of another wine.
picture-empty = Empty since { $day }.
picture-is-odd = Free above total ({ $days }): one of the two is wrong, measure again.
picture-nothing = No picture of { $vessel }: no SO2 measured yet in the wine that is in it.

# Plain questions: the answer, a figure with its source, and what to send next.
question-small-or-large = Fewer and larger. A small addition can bind whole and leave nothing free.
question-small-or-large-why = Of an addition 35 to 67 % stays free (AWRI; a handbook, from memory); figures disagree, so measure the day after.
question-small-or-large-next = For your wine: T4 1450 gal pH 3.58 free 21
question-how-often = Tanks about every month, barrels every two weeks, and a day after each addition (common practice, no source).
question-how-often-why = Sooner when it is warm, half full or low in free SO2.
question-how-often-next = What is due here: due
question-which-figure = Molecular protects; it follows from free and pH. The law counts total: free and bound together.
question-which-figure-why = 0.6 to 0.8 mg/L molecular is the usual range (Understanding Wine Chemistry, 2016).
question-which-figure-next = Yours: pH 3.5 free 20
question-which-yield = 57.6 %: so much SO2 is in pure potassium metabisulfite by its formula, and so I reckon.
question-which-yield-why = 50 % is a convention of the trade with a reserve in it: the same wish takes 15 % more powder.
question-which-yield-next = Your label says otherwise? Name it: kmbs 57%, or kmbs 96%
question-tablets-or-powder = The same SO2, if the size is right. Powder doses finer but needs a balance.
question-tablets-or-powder-why = Effervescent ones are sold by grams of SO2 (2 or 5 g), Campden ones by grams of salt (0.44 or 0.55 g): common practice, no source.
question-tablets-or-powder-next = What they add: 2 tabs of 5 g in 225 L
question-old-powder = Opened and damp it loses strength, about a tenth a year (common practice, no source). Clumped: not for wine.
question-old-powder-why = Never smell into the bag. With old powder measure the day after: less may have gone in than you weighed.
question-old-powder-next = Keep its date: received 1 kg kmbs lot 12
question-wait-before-yeast = 12 to 24 hours after the addition (common practice, no source).
question-wait-before-yeast-why = Of 50 mg/L in the must about 16 are there as total later (German trade text, 2012).
question-wait-before-yeast-next = The dose: must 20 hl add 40
question-after-malolactic = When malic acid is measured as gone, not before.
question-after-malolactic-why = The bacteria need free below 5–10 and total below 30–40 mg/L (AWRI, for pH 3.3 to 3.5).
question-after-malolactic-next = Then: T4 ML done, and its reading
question-ppm-and-mg-L = In wine 1 ppm counts as 1 mg/L, and 1 g/hL is 10 mg/L.
question-ppm-and-mg-L-why = Of powder it is less: 10 g/hL of potassium metabisulfite bring 57.6 mg/L SO2 (by its formula).
question-ppm-and-mg-L-next = Try it: 10 g kmbs in 1 hl
question-teaspoons = Never in spoons. A level teaspoon of powder weighs roughly 5 to 6 g (common practice, no source).
question-teaspoons-why = A balance that shows 0.1 g, or a 10 % stock and a syringe, is what small lots need.
question-teaspoons-next = The stock: make 1 L of 10% kmbs
question-fell-short = Part of each addition binds, usually a third to a half, more in young, sweet or rotten lots. Air takes some too.
question-fell-short-why = Or: not mixed, measured too early, old powder, another volume. 1 mg/L oxygen can use 4 mg/L SO2 (by formula).
question-fell-short-next = Measure, then: T4 free 24. What it did: T4?
question-strip-reads-otherwise = Trust the laboratory. Strips and titrets are a first look; dose by an aeration or iodine titration.
question-strip-reads-otherwise-why = Acidified methods read reds too high, by up to 66 % (Virginia, 2022). Iodine counts ascorbic acid too.
question-strip-reads-otherwise-next = Your titration: AO 20 mL sample, 1.9 mL 0.01 N
question-stop-fermentation = No. Sulfite does not stop a working fermentation, and bottles with sugar and yeast can burst.
question-stop-fermentation-why = Cold and a sterile filter, by someone qualified; after that sweet wine is kept near 1.5 mg/L molecular (a published table).
question-stop-fermentation-next = Once it is still: T4 10 hl sweet pH 3.3 free 10
question-sorbate = Sorbate never alone: it holds yeast, not bacteria, and those turn it into a smell of geranium.
question-sorbate-why = Beside it the wine keeps its full free SO2 for 0.8 mg/L molecular (common practice, no source).
question-sorbate-next = That SO2: T4 10 hl pH 3.4 free 12
question-allergy = Ask a doctor: nobody here can say what is safe for a person. With asthma sulfite can be dangerous.
question-allergy-why = Labels name it from 10 ppm total (US, 27 CFR 4.32(e)), above 10 mg/L in the EU (1169/2011). Headaches have many causes.
question-allergy-next = What a wine holds: T4?
question-law = It hangs on the market, the colour, the sugar. International code: red 150, white and rosé 200 mg/L total up to 4 g/L sugar, above it 300.
question-law-why = (OIV-MA-C1-01.) Not legal advice: confirm it for your market.
question-law-next = Your market's: limit red RS 3 EU
question-gas = Only people trained and licensed for it where you are; mask, ventilation, a second person outside.
question-gas-why = 0.5 ppm over a shift is the EU limit (2017/164); 100 ppm is at once dangerous to life (NIOSH).
question-gas-next = Without gas: T4 1450 gal pH 3.58 free 21 kmbs
question-potassium-or-sodium = Potassium for wine. Sodium is for equipment: the OIV does not name it for wine.
question-potassium-or-sodium-why = They are not the same weight: 57.6 % SO2 in the potassium salt, 67.4 % in the sodium salt (by formula).
question-potassium-or-sodium-next = Say which is at hand: T4 1450 gal pH 3.58 free 21 kmbs
question-when-to-measure = A day after it is mixed in, better two (common practice, no source).
question-when-to-measure-why = Before that a part is still on its way to being bound: it reads too high.
question-when-to-measure-next = Then: T4 free 24
question-how-to-mix = Dissolve it first in cold water or a little wine, about 50 g to the litre (trade journal, 2009). Pour it in while mixing.
question-how-to-mix-why = Gloves, goggles, air. Never with acid in one vessel; wine full of CO2 foams over.
question-how-to-mix-next = A stock: make 5 L of 5% kmbs
question-pH-matters = The lower the pH, the more of the free SO2 is molecular, and that protects.
question-pH-matters-why = For 0.8 mg/L molecular: 26 free at pH 3.3, 79 at pH 3.8 (University of California, 1982).
question-pH-matters-next = Yours: pH 3.5 free 20
question-which-target = White and rosé 0.8 mg/L molecular, red 0.6, sweet 1.5, where you set no other.
question-which-target-why = Published: 0.6 to 0.8 for stability (Understanding Wine Chemistry, 2016), red at bottling 0.4 to 0.6 (after California, 1982).
question-which-target-next = To change it: target 0.5 for reds
question-stock-keeps = Days, not weeks: make it fresh, close it, date it (common practice, no source).
question-stock-keeps-why = The OIV calls SO2 and bisulfite solutions unstable.
question-stock-keeps-next = Fresh: make 1 L of 10% kmbs
question-too-much = Put nothing more in. Time, air and racking lower free SO2; blending lowers both free and total.
question-too-much-why = From about 2 mg/L molecular people smell it (Understanding Wine Chemistry, 2016). Peroxide: only someone qualified, where law allows it.
question-too-much-next = Where it stands: T4?
question-no-sulfite = You can, and the wine then stands on cold, clean, full vessels, low pH and quick sale.
question-no-sulfite-why = Yeast make some of their own, usually under 30 mg/L (an amateur article): "no sulfite added" is not "no sulfite".
question-no-sulfite-next = What it has: T4 pH 3.5 free 5
question-bottling = Measure some days before; the last addition goes in before the line starts, mixed and measured.
question-bottling-why = Each mg/L of oxygen picked up can take up to 4 mg/L of free SO2 (by formula).
question-bottling-next = With its oxygen: bottling T4 40 hl pH 3.4 free 22 oxygen 2 mg/L

## The chemical store
stock-tablets =
    { $unit ->
        [tablet] { " " }tablet
        [tablets] { " " }tablets
       *[none] { "" }
    }
stock-of =
    { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    }{ $size ->
        [none] { "" }
       *[other] , { $size } g each
    }
stock-none = Nothing is noted in the chemical store yet. Tell what is there, or what came in: received 25 kg kmbs lot 4471 from Norte Supplies
stock-none-of = No { additive } is noted in the chemical store. Tell what came in (received …), or count it (stock kmbs 3.2 kg).
stock-shelf =
    { stock-of }: { $amount }{ stock-tablets }{ $counted ->
        [none] .
       *[other] { " " }(counted { $counted }).
    }
stock-lot =
    { "  " }{ $lot ->
        [none] no lot
       *[other] lot { $lot }
    }: { $amount }{ stock-tablets }, in { $day }{ $supplier ->
        [none] { "" }
       *[other] { " " }from { $supplier }
    }
stock-negative = ⚠ { stock-of }: the log says { $amount }{ stock-tablets }: something was received that is not noted. Note it, or count: stock kmbs 3.2 kg
stock-low = ⚠ Running low: { $amount }{ stock-tablets } { stock-of } left in store.
stock-left = In store now: { $amount }{ stock-tablets } { stock-of }.
stock-short = ⚠ In store by the log: { $amount }{ stock-tablets } { stock-of }, less than this takes.
stock-old = ⚠ In for over a year: an opened bag loses strength (common practice, no source). Measure free SO2 after it.
stock-oldest-lot =
    { $lot ->
        [none] Taken from the oldest of several; else say the lot: added …, lot { $other }
       *[other] Taken from lot { $lot }, the oldest of several; else say it: added …, lot { $other }
    }
stock-lot-unknown = Lot { $lot } is not in store by the log: taken from the oldest.
stock-noted =
    Noted { $entry }: { $event ->
        [received] received
        [used] used
        [discarded] thrown away
       *[counted] counted
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }from { $supplier }
    }{ $purpose ->
        [none] { "" }
       *[other] { " " }({ $purpose })
    }, { $when }.
stock-corrected =
    The log said { $was }: { $amount }{ stock-tablets } { $way ->
        [more] more
       *[less] less
    } now.
stock-not-kept = Nothing of it is noted in store yet, so nothing is drawn. Count it: stock kmbs 3.2 kg
stock-lacks =
    { $what ->
        [additive] Which additive? Write: received 25 kg kmbs
        [strength] Which strength has the { additive }? Write: received 10 L of 6% so2
        [size] Tablets of how many grams? Write: received 50 tablets 5 g
        [volume] Additions of { additive } are measured by volume. Write: received 10 L of 6% so2
        [one] One additive a message. Write: received 25 kg kmbs
       *[amount] How much { additive }, and in what unit? Write: { $event ->
            [counted] stock kmbs 3.2 kg
            [used] used 200 g kmbs for rinsing
            [discarded] discarded 1 kg kmbs
           *[received] received 25 kg kmbs
        }
    }

# The laboratory: what a titration comes to

titration-result = { $vessel ->
    [none] { $of ->
        [total] Total
       *[other] Free
    } SO2 { $result } { $unit }
   *[other] { $vessel }: { $of ->
        [total] total
       *[other] free
    } SO2 { $result } { $unit }
}, by { $method ->
    [aeration] aeration–oxidation
   *[other] iodine
}.
titration-too-much = More than wines hold: check the sample, the burette and the titrant’s strength. It is not kept.
titration-molar = { $molar } M iodine is { $normal } N: one mole takes up twice.
titration-ascorbic-asked = Iodine counts ascorbic acid too: { $amount } mg/L of it reads as +{ $counts } { $unit }. If there is any, add “ascorbic { $amount }”.
titration-precision = Two results of one wine may differ by { $again } in one lab (OIV, from memory), by { $other } between two (EEC 2676/90).
titration-red-high = A red: acidified methods read free SO2 high, in one study by up to 66 % (Virginia, 2022). Nothing is taken off; use one method throughout.
titration-name-vessel = To keep it as a reading, put the vessel in front: T4 …
titration-read = Read: { $list }.
titration-sample = sample { $volume } mL
titration-titrant = titrant { $volume } mL
titration-blank = blank { $volume } mL
titration-strength = { $unit ->
    [none] { $strength }
   *[other] { $strength } { $unit }
}
titration-iodate = { $mass } mg iodate in { $volume } mL
titration-ascorbic = ascorbic acid { $amount } mg/L
titration-free-assumed = Taken as free SO2; write “total” if the sample was prepared for the total.
titration-no-blank = No blank taken off; add “blank 0.1” if you ran one.
titration-asks = { $missing ->
    [method] Titrated with sodium hydroxide (AO) or with iodine? Write it in: AO 20 mL sample, 1.9 mL 0.01 N
    [sample] How many mL of wine? Send it whole: { $method ->
        [iodine] iodine 25 mL sample, 1.4 mL 0.02 N
       *[other] AO 20 mL sample, 1.9 mL 0.01 N
    }
    [titrant] How many mL from the burette? Send it whole: { $method ->
        [iodine] iodine 25 mL sample, 1.4 mL 0.02 N
       *[other] AO 20 mL sample, 1.9 mL 0.01 N
    }
    [unit] Is the iodine in N or in M? One is half the other. Write N or M behind its strength.
   *[strength] How strong is the titrant? Send it whole, with N or M: { $method ->
        [iodine] iodine 25 mL sample, 1.4 mL 0.02 N
       *[other] AO 20 mL sample, 1.9 mL 0.01 N
    }
}
titration-either = { $strength } N gives { $normal } { $unit }, { $strength } M gives { $molar } { $unit }.
button-keep-result = Keep it
button-keep-of = Keep { $vessel }{ $of ->
    [total] {" "}total
   *[free] {""}
}

# The laboratory: how far a dose may be off, tables, both bases

range-dose = { $vessel ->
    [none] As
   *[other] { $vessel }: as
} a range (95 %): { $amount ->
    [none] { $low }–{ $high } { $unit } SO2
   *[other] { $amount }{ $count ->
        [several] {" "}in all
       *[one] {""}
    }, that is { $low }–{ $high } { $unit } SO2
}.
range-sure = After the dose you can be sure of { $molecular } { $unit } molecular, if what binds is as reckoned.
range-sure-unbound = If nothing binds you can be sure of { $molecular } { $unit } molecular after the dose.
range-sure-low = Below 10 { $unit } free all of a dose may bind: sure is only { $molecular } { $unit } molecular. Measure after a day.
range-rests = Rests on pH ± { $ph } and free ± { $free } { $unit }{ $said ->
    [both] .
    [one] {" "}(what you did not say: common practice, no source).
   *[none] {" "}(common practice, no source). Yours: pH 3.58±0.03 free 21±2
}
range-limit = At its high end the total may pass the limit.
range-nothing = A range needs a dose first. Send a reading, like: T4 1450 gal pH 3.58±0.03 free 21
table-head = Free SO2 ({ $unit }) for molecular { $targets }, { $basis ->
    [oiv] by OIV at 12 % vol and 20 °C (pK { $pK })
   *[other] pK { $pK }
}:
table-row = pH { $ph }: { $free }
table-care = Targets are published on pK 1.81. Above 60 free, think of the total and the taste.
molecular-head = { $vessel }: pH { $ph }{ $free ->
    [none] , no free SO2 on file.
   *[other] , free { $free } { $unit } ({ $day }).
}
molecular-base = { $basis ->
    [oiv] By OIV, { $alcohol } % vol{ $known ->
        [yes] {""}
       *[no] {" "}(not told)
    }, 20 °C
   *[other] By pK { $pK }
}: { $molecular ->
    [none] { $target } needs { $needed } free.
   *[other] { $molecular } molecular; { $target } needs { $needed } free.
}
molecular-meaning = By pK 1.81 the same target takes { $times } times the free SO2: { $dose } { $unit } to add, by OIV { $other }. Published targets rest on pK 1.81; { $basis ->
    [oiv] this cellar’s doses go by OIV.
   *[other] so do this cellar’s doses.
}

# This wine: what it bound, when it needs more, too much, blending

lab-lacks = { $vessel }: { $what ->
    [ph] no pH on file. Send one, like: T4 pH 3.58 free 21
    [free] no free SO2 on file. Send it, like: T4 free 21
    [total] no total SO2 on file. Send it, like: T4 total 80
   *[target] no target holds for it as it is; nothing is reckoned.
}
learned = This wine bound { $share } % (± { $spread }) of its last { $count } additions.
learned-offer = This wine bound { $share } % (± { $spread }) of its last { $count } additions. { $limit ->
    [passes] As much as that takes comes too near the limit.
   *[within] By that: { $amount ->
        [none] { $dose } { $unit }
       *[other] { $amount } ({ $dose } { $unit })
    }. Yours to choose.
}
forecast-below = { $vessel }: free SO2 falls below { $needed } { $unit } { $day ->
    [far] in more than two years
   *[other] about { $day }
}{ $from ->
    [now] , and may be below already.
    [far] .
   *[other] {" "}({ $by ->
        [readings] 9 of 10: {""}
       *[published] {""}
    }{ $from } to { $to ->
        [far] more than two years
        [never] perhaps never
       *[other] { $to }
    }).
}
forecast-steady = { $vessel }: by its readings free SO2 does not fall; { $from ->
    [now] measure to be sure.
    [far] below { $needed } { $unit } in two years at the earliest.
   *[other] below { $needed } { $unit } on { $from } at the earliest.
}
forecast-by-readings = By { $count } readings since the last addition: { $lost } % lost in 30 days.
forecast-by-rates = { $container ->
    [bottle] By a study of bottles (told by a Quebec wine site), not by this wine: after 3 years 45 % left at 14 °C, 20 % at 15–26 °C.
   *[other] By what barrels lose, not by this wine: 3–10 mg/L a month (common practice, no source). { $fewest } readings tell its own; there { $number ->
        [one] is { $count }
       *[many] are { $count }
    }.
}
forecast-measure = { $from ->
    [now] Measure now.
    [far] Measure as usual.
   *[other] Measure by { $from }.
}
forecast-need = It needs { $needed }: pH { $ph } of { $day }, { $molecular } molecular.
forecast-none = { $vessel }: { $why ->
    [unmeasured] no free SO2 measured since its last addition, racking, move or bottling. Measure it, then ask again.
    [below-already] free SO2 is at or below the { $needed } { $unit } that its pH asks for. Send the reading for a dose.
   *[no-rate] no forecast yet. No rate of loss in tanks is on file, and its own takes { $fewest } readings since the last addition; there { $number ->
        [one] is { $count }
       *[many] are { $count }
    }.
}
forecast-unlanded = { $vessel }: the last addition has not landed yet. Measure free SO2 first.
blend-share = { $vessel } with { $other }: { $starts ->
    [as-it-is] as it is { $vessel } keeps to the bounds; up to { $most } % { $other } may come in.
   *[other] from { $least } to { $most } % of { $other } in the blend.
}{ $volume ->
    [none] {""}
   *[other] {" "}The least is { $volume } of { $other } to all of { $vessel }{ $enough ->
        [no] ; it holds only { $held }.
       *[yes] .
    }
}
blend-candidates = Others that would bring { $vessel } within its bounds, the least share first:
blend-candidate = { $other }: { $least }–{ $most } %{ $volume ->
    [none] {""}
   *[other] , at least { $volume }{ $enough ->
        [no] {" "}(it holds { $held })
       *[yes] {""}
    }
}
blend-nobody = { $any ->
    [none] No other vessel of that colour is finished and has free SO2 on file, so there is none to blend { $vessel } with.
   *[other] None of { $count } other vessels with a reading brings { $vessel } within its bounds.
}
blend-fails = { $vessel } with { $other }: no share does: { $fails ->
    [total] the total stays over the limit.
    [free] free SO2 stays over the limit.
    [molecular] molecular SO2 stays out of its bounds.
   *[unmeasured] something of one wine is not measured.
}
blend-figures = By free SO2 on file: { $list }.
blend-figure = { $vessel } { $free } ({ $day })
blend-bounds = Kept to: { $list }.
blend-bound-total = total at most { $limit }
blend-bound-no-total = no total (one is not measured)
blend-bound-free = free at most { $limit }
blend-bound-molecular = molecular { $least ->
    [none] at most { $most }
   *[other] { $least }–{ $most }
}, at whichever pH of the two is worse
blend-bound-no-ph = no molecular (one pH is not measured)
blend-whole = All of both, { $volume }: { $free ->
    [none] free not known
   *[other] free { $free }
}, { $total ->
    [none] total not known
   *[other] total { $total }
}, before binding moves.
blend-care = The pH of a blend is not reckoned: mix a glass in that share, measure pH, free and total, then decide. Other limits of both wines count too.
too-much-head = { $vessel }: { $free ->
    [none] free not measured
   *[other] free { $free }
}{ $total ->
    [none] {""}
   *[other] , total { $total }
}{ $molecular ->
    [none] {""}
   *[other] , molecular { $molecular }
}. First measure again: one figure is often wrong.
too-much-wait = Waiting: { $container ->
    [barrel] barrels lose { $least }–{ $most } mg/L free a month (common practice, no source).
    [bottle] bottles lose it over years; nothing can be taken out.
   *[tank] no rate of loss in tanks is on file; barrels lose { $least }–{ $most } mg/L free a month (common practice, no source).
} The total hardly falls.
too-much-air = Air, a splashing racking: 1 mg/L oxygen takes up to { $each } mg/L (theory), a wine full of air { $low }–{ $high } (an amateur article). It ages the wine.
too-much-blend = Blending takes down the total too: blend { $vessel }
too-much-peroxide = Peroxide: { $says ->
    [listed] on the list of Australia, at most { $left } mg/L left (AWRI, at that time).
    [not-listed] not permitted in the EU (AWRI, at that time).
    [old-text] an older US table has it for narrow uses only; to be checked (27 CFR 24.246, 24.247).
   *[none] no text of your market is on file.
} Ask your authority and a qualified oenologist first; I give no amounts.
