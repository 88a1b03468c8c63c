### What we say, in English. Figures come in as finished text; names of additives, stages and codes as ids.
### A line is one thing; a phone shows about 45 letters of it in a row.

## Pieces that other sentences use

list-separator = {", "}
cautions-separator = {"; "}
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

dose-weigh = { weigh } { $amount } { additive }{ for-each }
dose-measure = { measure } { $amount } { additive }{ for-each }
dose-tablets = { take } { $amount } effervescent tablets ({ $size } g SO2 each){ for-each }
dose-tablets-salt = { take } { $amount } tablets of { $size } g { additive }{ for-each }
dose-gas = { weigh } { $amount } SO2 gas{ for-each }: trained people only, breathing apparatus at hand, by mass only
dose-in-all =
    { $unit ->
        [tablets] For all { $count }: { $amount } tablets.
       *[other] For all { $count }: { $amount }.
    }
dose-tablets-give = The tablets alone give { $gives } of { $wanted } { $unit }.
dose-stock = Or { $amount } of a { $strength } % stock of it.
dose-only-stock = { measure } { $amount } of a { $strength } % { additive }{ for-each }
dose-rest-as-stock = The rest: { $amount } of a { $strength } % { additive }.
dose-nothing = { at }nothing to add.
dose-rate = { at }{ $dose } SO2 to add, that is { $amount } { additive } per { $per }
dose-rate-bare = { at }{ $dose } SO2 to add
dose-need = { at }at pH { $ph }, { $molecular } molecular takes { $free } free
dose-now = { at }{ $molecular } molecular now (pH { $ph }, { $free } free)

## The first line: a choice and not a dose

choice-head = { at }a choice, not a dose: at pH { $ph }, { $target } molecular takes { $free } free.
choice-leave = { $mark } Leave it: { $free } free is { $molecular } molecular.
choice-to = { $mark } To { $free } ({ $molecular } molecular): { $amount } { additive }
choice-no-amount = { $mark } To { $free } ({ $molecular } molecular): no amount, the total would pass the limit on file.
ways-out = Or: colder, cleaner, checked more often; acid for a lower pH: ask someone qualified.

## The stage

condition-stage = If malolactic is finished or not wanted.
condition-red =
    { $amount ->
        [none] If it is red (0.6 molecular): nothing to add.
        [over] If it is red (0.6 molecular): no amount, it would pass the limit.
       *[other] If it is red (0.6 molecular): { $amount }{ red-unit }.
    }
condition-red-choice = If it is red, full is 0.6 molecular: More.
round-red =
    { $amount ->
        [none] { at }if red (0.6 molecular), nothing to add.
        [over] { at }if red (0.6 molecular), no amount: it would pass the limit.
       *[other] { at }if red (0.6 molecular), { $amount }{ red-unit }.
    }
red-unit =
    { $unit ->
        [tablets] {" "}tablets{ for-each-red }
       *[other] { for-each-red }
    }
for-each-red =
    { $each ->
        [several] {" "}for each
       *[one] {""}
    }
no-dose-fermenting = { at }no sulfite now, it is still fermenting.
no-dose-malolactic = { at }no sulfite now, malolactic is still to come.
no-dose-molecular = Now { $molecular } molecular.
no-dose-why = The bacteria need free below 5–10 and total below 30–40 mg/L (published for pH 3.3–3.5).
no-dose-why-fermenting = Sulfite now is bound at once and harms yeast and bacteria: these need free below 5–10, total below 30–40 mg/L (published for pH 3.3–3.5).
no-dose-all-the-same =
    { $stage ->
        [fermenting] Your own figure all the same? Ask whoever answers for this wine, then write it whole: T7 20 hl fermenting add 30 ppm
       *[malolactic] Your own figure all the same? Ask whoever answers for this wine, then write it whole: T7 20 hl in ML add 30 ppm
    }

## What it does

effect-land = { $after } { $unit } free if nothing binds; expect { $low }–{ $high }, as a third to a half usually binds; measure tomorrow.
effect-land-molecular = From { $molecularNow } to { $molecular } molecular: { $after } { $unit } free if nothing binds; expect { $low }–{ $high }, as a third to a half usually binds; measure tomorrow.
effect-land-to-molecular = To { $molecular } molecular: { $after } { $unit } free if nothing binds; expect { $low }–{ $high }, as a third to a half usually binds; measure tomorrow.
effect-land-low = { $after } { $unit } free if nothing binds; below 10 free much or all may bind: expect { $low }–{ $high }, measure before you add again.
effect-must = Most of it binds while the must ferments: it does not protect the wine later.
effect-raise = + { $dose } { $unit } if nothing binds; a third to a half usually binds; measure tomorrow.
effect-allowance = Dose × { $factor } for + { $percent } %: reaches { $after } { $unit } if at most { $covers } % binds; a third binding needs half as much again. Expect { $low }–{ $high }; measure tomorrow.
effect-allowance-bare = Dose × { $factor } for + { $percent } %: covers { $covers } % binding; a third binding needs half as much again. Measure tomorrow.
effect-share = Dose ÷ (1 − { $share }): reaches { $after } { $unit } if just that share binds; expect { $low }–{ $high }; measure tomorrow.
effect-share-bare = Dose ÷ (1 − { $share }): right if just that share binds; measure tomorrow.
other-as-share = If instead { $percent } % of it were lost (÷ { $divisor }): { $amount }.
other-as-allowance = As an allowance of + { $percent } % (× { $factor }): { $amount }.
nothing-why = { $free } free is { $molecular } molecular at pH { $ph }; the aim is { target }.
nothing-why-free = { $free } free; the aim is { target }.

## An amount that is asked about, that went in, a stock

adds = { at }{ $list } adds { $adds } SO2
adds-rate = { at }{ $rate } { additive } adds { $adds } SO2
amount = { $amount } { additive }
amount-SO2 = { $amount } SO2 from { additive }
amount-tablets =
    { $size ->
        [none] { $amount } tablets of { additive }
       *[other] { $amount } tablets of { $size } g { additive }
    }
adds-rate-mass = In { $volume } that is { $amount }.
ferment-stop =
    { $adds ->
        [none] No dose of SO2 reliably stops yeast, and bottles can burst: ask someone qualified.
       *[other] { $adds } does not reliably stop yeast, bottles can burst: ask someone qualified.
    }
ferment-stop-more = I give no dose for that. Until then: keep it cold, no tight closures.
added =
    { $added ->
        [none] { at }{ $list } went in.
       *[other] { at }{ $list } went in: { $added } SO2.
    }
added-worked = { at }{ $added } SO2 went in: that is { $list }.
added-bare = { at }{ $added } SO2 went in.
not-kept-addition = Not kept yet: I keep no log so far, so write it in yours.
measure-tomorrow = Measure free SO2 tomorrow, before adding again.
reading-read = { at }{ $list }.
not-kept-reading = Not kept yet: I keep no readings so far, so write it in your book.
solution-weigh = Weigh { $amount } { additive } and fill up with water to { $volume }.
solution-measure = Measure { $amount } { additive } and fill up with water to { $volume }.
solution-no-recipe = For a solution to store or to clean with I have no recipe yet. A stock I can do: make 5 L of 10% kmbs
solution-bought = Fill { $volume } with { additive } as it is sold.
solution-strength = That stock holds { $strength } g SO2 in 100 mL.
solution-fresh = Make it fresh and label it: it loses strength in days to weeks.

## What was read and what was assumed

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
       *[fruit-wine] fruit wine
    }
fact-organic = organic
fact-stage = { stage-now }
fact-target = aim { target }
fact-strength = { additive }, { $strength } %
assumed-additive = pure { additive }
assumed-target = target { target }
assumed-target-red = target { target } (red)
assumed-target-sweet = target { target } (sweet)
assumed-gallon = { $gallon ->
        [US] US gallons
       *[imperial] imperial gallons
    }
assumed-barrels =
    { $count ->
        [one] a barrel of 225 L
       *[several] { $volume } at 225 L a barrel
    }
note-free-unlabelled = “{ $text }” is free SO2
note-ph-unlabelled = “{ $text }” is the pH
note-volume-sum = “{ $text }” added up
note-strength-as-salt = the strength is grams of the salt in 100 mL; as SO2 it would be { $factor } times as strong
note-strength-as-SO2 = the strength is grams of SO2 in 100 mL
note-mass-beside-readings = “{ $text }” is grams, not gallons
note-each-or-total = “{ $text }” is of each
set-aside-figure = { $text }

## The one question

ask-vessel = { at }which vessel? Like: T4
ask-volume_L =
    { $unit ->
        [L] { at }what volume? In litres, or with its unit: 40 hl, 1450 gal
        [hL] { at }what volume? In hectolitres, or with its unit: 4000 L, 1450 gal
        [m3] { at }what volume? In cubic metres, or with its unit: 40 hl
        [galUS] { at }what volume? In US gallons, or with its unit: 40 hl
        [galUK] { at }what volume? In imperial gallons, or with its unit: 40 hl
       *[other] { at }what volume? With its unit: 225 L, 1450 gal
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
        [must] { at }how many mg/L do you want to add to the must? Write it with the figures, like: T4 40 hl must add 40 ppm
       *[base] { at }how many mg/L do you want to add to the base wine? Write it with the figures, like: T4 40 hl base wine add 20 ppm
    }
ask-tablet-additive = { at }which salt are the tablets? It stands on the packet.
ask-additive = { at }which additive is it?
ask-strength_percent = { at }how strong is it, in %? It stands on the label. Like: 10%
ask-tablet_salt_g = { at }how many grams is one tablet? It stands on the packet; 0.44 and 0.55 are usual.
ask-tablet_SO2_g = { at }how many grams of SO2 does one effervescent tablet give? It stands on the packet.
ask-mass_g = { at }how many grams?
ask-mass-spoon = { at }how many grams? A level teaspoon of powder is roughly 5 to 6 g, and that is too rough to dose by: use a balance.
ask-fruit = { at }what volume in litres or gallons? I do not reckon by weight of fruit.
ask-each-or-total = { at }is “{ $text }” each, or all together? Write it so: 2 x 40 hl, or the sum: 80 hl
option = { $mark }) { $list }
target-of =
    { $vessel ->
        [none] Another target.
       *[other] { $vessel }: another target.
    }

## What cannot be answered as it stands

problem-ph-out-of-range = { at }“{ $about }” cannot be the pH of a wine: I take 2.5 to 4.8. A lost point? Send it like: pH 3.58
problem-negative-value = { at }“{ $about }” is below zero, that cannot be. Send the figure again without the minus.
problem-total-below-free = { at }the total is below the free (“{ $about }”). Free goes first: 18/60, or free 18 total 60
problem-volume-not-positive = { at }a volume of “{ $about }” cannot be. Send it like: 1450 gal
problem-unit-mismatch = { at }the unit does not fit in “{ $about }”. Free SO2 is in mg/L or ppm, volume in L, hl or gal.
problem-ambiguous-number =
    { $kind ->
        [percent] { at }“{ $about }” could be alcohol, or the strength of more than one thing. Write 13.5% vol, or: 10% kmbs solution
        [degree] { at }“{ $about }” could be alcohol or temperature. Write 12% vol, or 12 C
        [rate] { at }“{ $about }” could be more than one thing: free or total SO2, SO2 or powder. Write: free 18, add 30 ppm SO2, or 5 g per 10 L kmbs
        [thousands] { at }“{ $about }” could be off by a thousand. Write it without that mark, like: 1200 L, or 1.2 L
        [range] { at }“{ $about }” looks like a range. Send one figure, and say what it is.
       *[other] { at }“{ $about }” can be read in more than one way. Say what it is, like: pH 3.58 free 21 1450 gal
    }
problem-each-or-total = { at }is “{ $about }” of each, or of all together? Write: { $about } each, or: { $about } total
problem-conflicting-values = { at }two values for one thing: “{ $about }”. Send one of them; two wines go on a line each.
problem-unknown-additive = { at }“{ $about }” is no SO2 additive that I know. I know: potassium or sodium metabisulfite (powder, solution), bisulfite, SO2 in water, SO2 gas, tablets.
problem-did-you-mean = { at }“{ $about }” is another chemical. Did you mean metabisulfite? Then send it again with that word.
problem-strength-out-of-range = { at }the strength “{ $about }” does not fit that additive. Look at the label and send it like: 10% kmbs
problem-value-out-of-range = { at }“{ $about }” is more than any cellar has. Check the figure and its unit.
problem-not-understood = I could not read that. Send a reading like: T4 1450 gal pH 3.58 free 21. ? shows more.
problem-too-long = That is too long to read safely. Send at most 25 vessels at a time, a line each.
problem-no-number = No dose until that is clear.
bare-number = “{ $text }” of what? Write it whole, with the stage, like: T7 20 hl must add { $text } ppm

## Warnings

warning-no-dose-at-this-stage = ⚠ { stage-now }: no dose belongs to that stage; ask whoever answers for this wine.
warning-additive-not-permitted = ⚠ That additive is not permitted there.
warning-total-over-limit =
    { $total ->
        [known] ⚠ Total would be { $total_after_mg_L } { $unit }, over the { $limit_mg_L } of the international code; your country’s law decides: ask before you add.
       *[at-least] ⚠ Total would be at least { $total_after_mg_L } { $unit }, over the { $limit_mg_L } of the international code; your country’s law decides: ask before you add.
    }
warning-total-near-limit =
    { $total ->
        [known] ⚠ Total would be { $total_after_mg_L } { $unit }, near the { $limit_mg_L } of the international code; your country’s law decides.
       *[at-least] ⚠ Total would be at least { $total_after_mg_L } { $unit }, near the { $limit_mg_L } of the international code; your country’s law decides.
    }
warning-total-unknown = ⚠ The total is unknown: measure it.
warning-total-unknown-half = ⚠ The total is unknown: measure it, free alone comes over half of the { $limit_mg_L } { $unit } limit.
warning-no-limit-on-file = ⚠ No limit on file for this wine: look up your country’s law.
warning-limit-unconfirmed = ⚠ The limit is unconfirmed: look up your country’s law.
warning-addition-large = ⚠ { $dose_mg_L } { $unit } at once is a lot: check the volume and its unit.
warning-free-needed-high = ⚠ { $target_free_mg_L } { $unit } free is a lot: keep it colder, cleaner, checked more often; or a lower pH, with advice.
warning-molecular-above-2 = ⚠ Above 2 { $unit } molecular SO2 is smelt and tasted.
warning-free-low-may-bind-all = ⚠ Below 10 free much or all may bind: measure before adding again.
warning-ph-unusual = ⚠ pH { $ph } is unusual for wine: check the meter.
warning-basis-fallback = ⚠ The OIV basis needs alcohol, and 20–40 °C: reckoned with pK 1.81.
warning-basis-fallback-change = ⚠ The OIV basis needs alcohol, and 20–40 °C: reckoned with pK 1.81; it changes the need by about { $need_change_mg_L } { $unit }.
warning-rounding-coarse = ⚠ What a scale shows is off by { $rounding_mg_L } { $unit } here: use a finer one, or a stock.
warning-already-dosed = ⚠ It was dosed lately.

## Cautions

cautions = ⚠ { $list }.
caution-trained-people-with-breathing-apparatus = trained people only, breathing apparatus at hand
caution-grapes-and-must-only = ammonium bisulfite is for grapes and must only
caution-ventilate = ventilate
caution-never-lean-in = never lean into a tank
caution-gloves-goggles = gloves, goggles
caution-no-acid-no-chlorine = never with acid or chlorine cleaners
caution-asthma = not for anyone with asthma
caution-dissolve-first = dissolve in a little wine or water first
caution-foams-with-carbon-dioxide = wine full of CO2 foams over
caution-mix-and-measure-again = mix, measure again after a day
caution-label-and-rules-first = the label, your local rules and a qualified person come first
cautions-short = ⚠ Cautions as before: button Safety.

## Chat

chat-greeting = Hello. Send me a reading, like: T4 1450 gal pH 3.58 free 21. ? shows more.
chat-thanks = You are welcome. Measure again tomorrow.
chat-other = I reckon SO2 additions. Send a reading, like: T4 1450 gal pH 3.58 free 21. ? shows more.
chat-negated = Nothing added, then. Nothing to keep.
chat-help-what = Send a reading, get the SO2 addition.
chat-help-dose = T4 1450 gal pH 3.58 free 21
chat-help-dose-means = → what to weigh out
chat-help-effect = 100 g kmbs in 20 hl
chat-help-effect-means = → what an amount adds
chat-help-solution = make 5 L of 10% kmbs
chat-help-solution-means = → how to make a stock
chat-help-fields = Any order; also total, red, 13.5%, target 35, +25 ppm, +30%, smbs. Tanks: a line each.
chat-help-care = The label, your local rules and a qualified person come first.
not-served = I cannot do that yet. Send a reading, like: T4 1450 gal pH 3.58 free 21
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
old-button = That button is from an older message. Please send the reading again.

## An emergency

emergency-out = EVERYBODY OUT to fresh air, now.
emergency-nobody-in = Nobody goes in or leans in after anyone.
emergency-call = Call the emergency services.
emergency-eyes = Eyes: rinse with water for 15 minutes, contact lenses out.

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
step-addition = To add, free wanted − free now:
step-dose-with-allowance = With the allowance, addition × (1 + allowance):
step-dose-with-share = With the share that binds, addition ÷ (1 − share):
step-volume-in-litres = Volume in litres:
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
step-solution-strength = Strength in 100 mL, SO2 ÷ volume × 0.1 L:
step-solution-strength-by-salt = Strength as SO2, salt × share of SO2 in it:
safety-head = Care with { additive }
more-head =
    { $vessel ->
        [none] More
       *[other] { $vessel }: more
    }
more-no-warnings = No further warnings.
choice-left = { at }left as it is, { $molecular } molecular. Taste and measure often.
choice-over = { at }no amount for that: its total would pass the limit on file.
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
round-target-stage = { at }how many mg/L do you want to add?
round-not-understood = “{ $about }” I could not read.
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
choice-tablet_salt_g = { $value } g
choice-tablet_SO2_g = { $value } g
folded = Working and the rest of the warnings: press More.
terminal-start = brimnote reckons SO2 additions. Type a reading, like:
terminal-start-example =     T4 1450 gal pH 3.58 free 21
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
