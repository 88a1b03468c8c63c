### O que dizemos, em português de Portugal: por tu, como entre colegas de adega. Os números chegam já escritos.
### Uma linha é uma coisa; um telemóvel mostra dela umas 45 letras por fila.

## Peças que outras frases usam

list-separator = {", "}
barrel-name = barrica
cautions-separator = {" "}
dose-in-all-separator = {" e "}
cautions-of-separator = {" "}
assumed-separator = {"; "}

additive =
    { $additive ->
        [potassium-metabisulfite] metabissulfito de potássio (E224)
        [sodium-metabisulfite] metabissulfito de sódio (E223)
        [potassium-metabisulfite-solution] solução de metabissulfito de potássio
        [sodium-metabisulfite-solution] solução de metabissulfito de sódio
        [potassium-bisulfite-solution] solução de bissulfito de potássio (E228)
        [ammonium-bisulfite-solution] solução de bissulfito de amónio
        [sulfur-dioxide-solution] solução sulfurosa (SO2 em água)
        [sulfur-dioxide-gas] SO2 gás (E220)
        [tablet] pastilhas efervescentes
       *[other] aditivo
    }
stage-now =
    { $stage ->
        [must] mosto
        [fermenting] ainda a fermentar
        [malolactic] malolática por fazer
        [base] vinho base
        [bottled] engarrafado
       *[finished] fermentações acabadas
    }
weigh =
    { $vessel ->
        [none] Pesa
       *[other] { $vessel }: pesa
    }
measure =
    { $vessel ->
        [none] Mede
       *[other] { $vessel }: mede
    }
take =
    { $vessel ->
        [none] Usa
       *[other] { $vessel }: usa
    }
at =
    { $vessel ->
        [none] {""}
       *[other] { $vessel }:{" "}
    }
for-each =
    { $count ->
        [one] {""}
       *[other] {" "}para cada
    }
target =
    { $kind ->
        [molecular] { $value } molecular
        [free] { $value } de livre
       *[add] + { $value }
    }

## A primeira linha: uma dose

tablet-word =
    { $unit ->
        [tablet] pastilha
       *[tablets] pastilhas
    }
tablets-of =
    { $additive ->
        [tablet] { $amount } { $unit ->
            [tablet] pastilha efervescente
           *[tablets] pastilhas efervescentes
        } ({ $size } g de SO2 cada)
       *[other] { $amount } { tablet-word } de { $size } g de { additive }
    }
measured =
    { $unit ->
        [tablet] { tablets-of }{ for-each }
        [tablets] { tablets-of }{ for-each }
        [solution] { $amount } de { additive } a { $strength } %{ for-each }
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
dose-gas = { weigh } { $amount } de SO2 gás{ for-each }: só gente formada, com aparelho respiratório à mão, sempre ao peso
dose-in-all = Para as { $count }: { $list }.
in-all-stock = { $amount } da solução a { $strength } %
dose-tablet-too-large = { at }meia pastilha{ for-each } já é de mais.
dose-tablets-give = Só com pastilhas ficas em { $gives } dos { $wanted } { $unit }.
dose-stock = Ou { $amount } de solução dele a { $strength } %{ for-each }.
dose-only-stock = { measure } { $amount } de { additive } a { $strength } %{ for-each }
dose-rest-as-stock = O resto: { $amount } de { additive } a { $strength } %{ for-each }.
dose-negligible = { at }não vale a pena adicionar (faltam { $short }).
dose-too-fine = { at }demasiado pouco para pesar ou medir (faltam { $short }): faz uma solução mais fraca.
dose-gas-too-little = { at }{ $amount } é pouco para gás: usa uma solução.
dose-bottled = { at }engarrafado: adicionar é abrir todas as garrafas. Pergunta primeiro.
refused-ammonium = { at }o bissulfito de amónio é só para uva e mosto (OIV): neste vinho não; pergunta primeiro.
refused-ammonium-must =
    { $stage ->
        [assumed] Tomei-o por vinho de fermentações acabadas. É mosto? Então escreve tudo outra vez, com a palavra mosto.
       *[said] É mosto? Então escreve tudo outra vez, com a palavra mosto.
    }
dose-nothing = { at }nada a adicionar.
dose-rate = { at }{ $dose } de SO2 a adicionar, ou seja { measured } por { $per }
dose-rate-bare = { at }{ $dose } de SO2 a adicionar
dose-need = { at }a pH { $ph }, { $molecular } molecular pede { $free } de livre
dose-now = { at }{ $molecular } molecular agora (pH { $ph }, { $free } de livre)

## A lei

law-of =
    { $region ->
        [oiv] código internacional
        [eu] UE
        [uk] Reino Unido
        [us] EUA
        [ca] Canadá
        [ca-qc] Quebeque
        [au] Austrália
        [nz] Nova Zelândia
        [za] África do Sul
        [ar] Argentina
        [cl] Chile
        [br] Brasil
        [jp] Japão
        [kr] Coreia
        [cn] China
        [codex] Codex
        [ch] Suíça
        [ge] Geórgia
        [hk] Hong Kong
        [eaeu] União Eurasiática
        [uy] Uruguai
        [in] Índia
        [md] Moldávia
       *[mercosur] Mercosul
    }
law-decides =
    { $region ->
        [oiv] ; decide a lei do teu país
       *[other] {""}
    }
rule-sugar =
    { $band ->
        [under] {" "}com menos de { $high } g/L de açúcar
        [to] {" "}até { $high } g/L de açúcar
        [from] {" "}a partir de { $low } g/L de açúcar
        [above] {" "}com mais de { $low } g/L de açúcar
        [between] {" "}de { $low } a { $high } g/L de açúcar
       *[none] {""}
    }
rule-class =
    { $class ->
        [sweet-300] , doce designado
        [sweet-350] , doce designado
        [sweet-400] , doce designado
        [national-pdo] , DOP
        [national-pdo-dry] , DOP seco
        [national-pdo-other] , DOP não seco
        [dry] , seco
        [sweet] , doce
        [bulk-export] , granel para exportação
        [made-with-organic] , feito com uva biológica
       *[none] {""}
    }
rule-what =
    { $what ->
        [red] tinto
        [pale] branco ou rosé
        [white] branco
        [quality-sparkling] espumante de qualidade
        [other-sparkling] outro espumante
        [fortified] licoroso
        [cider] sidra
        [mead] hidromel
        [fruit-wine] vinho de fruta
        [alcohol-free] vinho sem álcool
       *[wine] vinho
    }{ $organic ->
        [yes] {" "}bio
       *[no] {""}
    }{ rule-sugar }{ rule-class }
rule-short = { law-of }, { rule-what }
dose-capped =
    { $of ->
        [free] { $list }, mais não: o livre fica até { $after }, limite { $limit } { $unit } de livre ({ rule-short }).
       *[total] { $list }, mais não: o total fica em { $least ->
            [yes] pelo menos{" "}
           *[no] {""}
        }{ $after }, limite { $limit } { $unit } ({ rule-short }).
    }
round-capped =
    { $of ->
        [free] { at }o livre fica até { $after }, limite { $limit } { $unit } de livre ({ rule-short }).
       *[total] { at }o total fica em { $least ->
            [yes] pelo menos{" "}
           *[no] {""}
        }{ $after }, limite { $limit } { $unit } ({ rule-short }).
    }
dose-at-limit =
    { $least ->
        [yes] { at }mede o total antes de pôr seja o que for: já vai em pelo menos { $now }, e assim passava o limite de { $limit } { $unit } ({ rule-short }).
       *[no] { at }agora sulfuroso não, { $standing ->
            [over] já está acima do limite
           *[at] está no limite
        }: { $of ->
            [free] livre { $now }, limite { $limit } { $unit } de livre ({ rule-short }).
           *[total] total { $now }, limite { $limit } { $unit } ({ rule-short }).
        }
    }
dose-over-already = Por essa lei não se pode vender assim{ law-decides }: fala com quem responde por este vinho.
law-assumed = Por saber, conto o mais apertado: { $list }.
law-unknown =
    { $code ->
        [colour-assumed] cor
        [sugar-assumed] açúcar
        [sparkling-class-assumed] classe de espumante
       *[density-assumed] densidade
    }
dose-capped-kept =
    { $reserve ->
        [none] Deixo { $kept } { $unit } de folga, porque { $of ->
            [free] um livre medido
           *[total] um total medido
        } pode errar isso. O teu objetivo passava-o.
       *[some] Deixo { $kept } { $unit } de folga: { $error } porque { $of ->
            [free] um livre medido
           *[total] um total medido
        } pode errar isso, { $reserve } para o engarrafamento. O teu objetivo passava-o.
    }
full-dose-asks =
    { $of ->
        [free] { at }o livre podia chegar a { $after }, acima do limite de { $limit } { $unit } de livre ({ rule-short }). Dou os números na mesma?
       *[total] { at }o total ficava em { $least ->
            [yes] pelo menos{" "}
           *[no] {""}
        }{ $after }, acima do limite de { $limit } { $unit } ({ rule-short }). Dou os números na mesma?
    }
full-dose-care = Por essa lei o vinho não se pode vender assim. O registo guarda que se sabia. Não é conselho jurídico: confirma para o teu mercado.
full-dose-left = Fica assim: vale a dose menor.
full-dose-none = Não há aqui dose nenhuma que passe um limite.
button-full-dose = Dose completa
button-all-the-same = Sim, na mesma
over-rule-noted = ⚠ Passa o limite ({ rule-short }): fica escrito no registo.
over-rule = acima do limite ({ rule-short })
total-sum = total { $total } ({ $measured } medido { $day } + { $since } adicionado depois)
limit-is =
    { at }{ $operator ->
        [below] menos de
       *[at-most] no máximo
    } { $limit } { $unit } de SO2 { $of ->
        [free] livre
       *[total] total
    }: { rule-short }{ $written ->
        [same] {""}
       *[other] , escrito { $value } { $law_unit }
    }{ $density ->
        [none] {""}
       *[other] {" "}(com densidade { $density })
    }{ $uplift ->
        [none] {""}
       *[other] , dos quais { $uplift } pelo ano declarado
    }.
limit-room =
    { $standing ->
        [over] Agora { $of ->
            [free] livre
           *[total] total
        } { $now }: { $room } { $unit } acima.
       *[room] Agora { $of ->
            [free] livre
           *[total] total
        } { $now }: espaço { $room } { $unit }; { $left } com { $kept } de folga.
    }
limit-amount = { $left } mg/L em { $volume }: { bare-amount } de { additive }.
limit-text =
    { $text }{ $provision ->
        [none] {""}
       *[other] , { $provision }
    }{ $version ->
        [none] {""}
       *[other] {" "}({ $version })
    }: { $checked ->
        [law-text] lido no texto da lei
        [law-copy] lido numa cópia da lei
        [agency] lido na página da autoridade
        [foreign-agency] lido na página da autoridade de outro país
        [trade-guide] lido num guia do setor
        [secondary] lido numa fonte secundária
       *[memory] de memória, logo por confirmar: não reduz dose nenhuma
    }.
limit-none =
    { at }sem limite no ficheiro: { law-of }, { $product ->
        [still] vinho
        [sparkling] espumante
        [quality-sparkling] espumante de qualidade
        [other-sparkling] espumante
        [fortified] licoroso
        [fruit-wine] vinho de fruta
        [cider] sidra
        [mead] hidromel
        [alcohol-free] vinho sem álcool
       *[other] { $product }
    }{ $reason ->
        [not-found] {" "}(procurado, não encontrado)
       *[other] {""}
    }. Não adivinho: vê o que vale no teu mercado.
limit-notes = Nota: { $list }.
limit-notes-separator = {"; "}
law-note =
    { $code ->
        [recommends-only] o código recomenda, decide a lei do teu país
        [other-value-told] noutro sítio vem outro número
        [boundary-open] o texto deixa em aberto este mesmo açúcar, contei o lado mais apertado
        [boundary-told-otherwise] a página lida tem o outro lado desta fronteira
        [dry-undefined] seco e doce vêm sem número
        [band-misprinted] a folha traz o intervalo ao contrário
        [by-reference] por remissão para o texto da UE
        [derived] dois números lidos, subtraídos
        [combined-as-total] o texto diz combinado, tomado como total
        [from-seven-percent] para vinho de 7 % ou mais
        [bulk-has-less] o granel para exportação tem limite mais baixo
        [stacks-on-general] o limite geral vale ao lado
        [sugar-assumed] açúcar por saber, contado o mais apertado
        [colour-assumed] cor por saber, contada a mais apertada
        [sparkling-class-assumed] classe de espumante por saber, contada a mais apertada
        [density-assumed] densidade por saber, tomada como 0,990 (diz: densidade 0,995)
        [designation-not-on-file] essa designação não está no ficheiro
        [no-uplift] aqui não há mais em ano declarado
        [organic-not-on-file] sem limite para biológico no ficheiro, contei o geral
        [repealed] { $value } { $unit } foi revogado e não se usa
        [other-unit-told] outra fonte traz { $value } { $unit }
       *[second-value-told] noutro sítio vem { $value } { $unit }, de memória
    }
limit-care = Não é conselho jurídico: confirma para o teu mercado.
designation-asked =
    Vinho doce de uma designação com limite próprio ({ law-of })? Nunca o adivinho: diz, { $wine ->
        [none] com: designado 300
       *[other] por exemplo: { $wine } designado 300
    }

## A primeira linha: uma escolha e não uma dose

choice-head = { at }uma escolha, não uma dose: a pH { $ph }, { $target } molecular pede { $free } de livre.
choice-leave = { $mark } Deixar assim: { $free } de livre é { $molecular } molecular.
choice-to =
    { $total ->
        [unknown] { $mark } Até { $free } ({ $molecular } molecular): { measured }; total por saber: mede-o primeiro
       *[known] { $mark } Até { $free } ({ $molecular } molecular): { measured }
    }
choice-no-amount = – Até { $free } ({ $molecular } molecular): sem quantidade, o total passava { $limit } ({ law-of }).
choice-red =
    { $kind ->
        [none] Se for tinto, { $red } pede { $free } de livre: nada a adicionar.
        [over] Se for tinto, { $red } pede { $free } de livre: sem quantidade, o total passava { $limit } ({ law-of }).
       *[other] Se for tinto, { $red } pede { $free } de livre: { bare-amount }.
    }
ways-out = Ou: mais frio, mais limpo, vigiar mais; baixar o pH com ácido: pergunta a quem sabe.

## A fase

bottling-no-oxygen = Não contei oxigénio. Mede-o, dissolvido e do espaço de cabeça, e escreve-o atrás: oxigénio 2 mg/L
bottling-takes = { $oxygen } mg/L de oxigénio podem levar { $loss } { $unit } dele ({ bottling-each }).
bottling-target = { $after } de livre ao engarrafar, logo { $now } agora: { $oxygen } mg/L de oxigénio podem levar { $loss } { $unit } ({ bottling-each }).
bottling-each =
    { $each ->
        [formula] 4 por 1, pela fórmula
       *[other] { $each } por 1, como dizes
    }
bottling-measured = Medido em números do setor (por confirmar) são { $each } por 1: então chegavam { bare-amount }. Para contar assim: oxigénio { $oxygen } mg/L x { $each }
bottling-measured-none = Medido em números do setor (por confirmar) são { $each } por 1: então não é preciso nada. Para contar assim: oxigénio { $oxygen } mg/L x { $each }
condition-stage = Só com a malolática feita, ou se não se quer.
condition-red =
    { $kind ->
        [none] Se for tinto ({ $red } molecular): nada a adicionar.
        [over] Se for tinto ({ $red } molecular): { bare-amount }, também acima de { $limit }.
       *[other] Se for tinto ({ $red } molecular): { bare-amount }.
    }
no-dose-fermenting = { at }agora sulfuroso não, ainda está a fermentar.
no-dose-malolactic = { at }agora sulfuroso não, falta a malolática.
no-dose-molecular = Agora { $molecular } molecular.
no-dose-why = As bactérias precisam de livre abaixo de 5–10 e total abaixo de 30–40 mg/L (publicado para pH 3,3–3,5).
no-dose-why-fermenting = O sulfuroso agora combina-se logo e faz mal a leveduras e bactérias: estas precisam de livre abaixo de 5–10, total abaixo de 30–40 mg/L (publicado para pH 3,3–3,5).
no-dose-all-the-same = Um número teu na mesma? Fala com quem responde por este vinho e depois escreve tudo: { whole-example }
figure-alone = «{ $text }»: nesta fase só aceito um número numa mensagem inteira. Escreve: { whole-example }
whole-example = { $wine }{ in-all } { stage-word } adicionar { $adds } { $unit }
in-all =
    { $count ->
        [several] {" "}ao todo
       *[one] {""}
    }
stage-word =
    { $stage ->
        [must] mosto
        [fermenting] a fermentar
        [malolactic] em malolática
       *[base] vinho base
    }

## O que faz

effect-land = { $after } { $unit } de livre se nada se combinar; conta com { $range } (em geral combina-se 1/3 a 1/2); mede amanhã.
effect-land-molecular = De { $molecularNow } para { $molecular } molecular: { $after } { $unit } de livre se nada se combinar; conta com { $range } (em geral combina-se 1/3 a 1/2); mede amanhã.
effect-land-to-molecular = Para { $molecular } molecular: { $after } { $unit } de livre se nada se combinar; conta com { $range } (em geral combina-se 1/3 a 1/2); mede amanhã.
effect-land-low = { $after } { $unit } de livre se nada se combinar; abaixo de 10 de livre pode combinar-se muito ou tudo: conta com { $range }, mede antes de voltar a adicionar.
effect-land-small = { $after } { $unit } de livre no máximo: a subida é menor do que o erro de uma análise.
effect-rise = O livre sobe cerca de { $range } { $unit } (em geral combina-se 1/3 a 1/2); mede amanhã.
effect-must = A maior parte combina-se enquanto o mosto fermenta: não protege o vinho mais tarde.
must-comes-back = Cerca de um terço volta como SO2 total: + { $total } { $unit } (texto alemão do setor, 2012).
must-yeast = Leveduras { $least } a { $most } horas depois (prática comum, sem fonte).
must-malolactic = Até { $most } { $unit } antes do esmagamento não prejudicam a malolática (AWRI).
must-published =
    { $read ->
        [read] Publicado: { $list } ({ $source }).
       *[memory] Publicado: { $list } ({ $source }; de memória, não lido).
    }
must-none-published = Os números do ficheiro foram publicados para uva; para { fact-product } não há nenhum.
must-range =
    { $state ->
        [sound] { must-colour }uva sã { $range }
        [damaged] { must-colour }algum dano { $range }
       *[rot] { must-colour }com podridão { $range }
    } { $unit }
must-colour =
    { $style ->
        [red] tinto,{" "}
       *[any] {""}
    }
must-say-state = Como vem a uva? Diz sã, algum dano ou podridão, e há um número para escolher.
button-published = Adicionar { $add }
effect-raise = + { $dose } { $unit } se nada se combinar (em geral combina-se 1/3 a 1/2); mede amanhã.
third-needs =
    { $third ->
        [more] ; se for um terço, é preciso mais metade
       *[covered] {""}
    }
effect-allowance = Dose × { $factor } por + { $percent } %: chega a { $after } { $unit } se se combinar no máximo { $covers } %{ third-needs }. Conta com { $range }; mede amanhã.
effect-allowance-bare = Dose × { $factor } por + { $percent } %: cobre { $covers } % combinado{ third-needs }. Mede amanhã.
effect-share = Dose ÷ (1 − { $share }): chega a { $after } { $unit } se se combinar exatamente essa parte; conta com { $range }; mede amanhã.
effect-share-bare = Dose ÷ (1 − { $share }): certa se se combinar exatamente essa parte; mede amanhã.
other-as-share = Se em vez disso se perderem { $percent } % dela (÷ { $divisor }): { bare-amount }.
other-as-allowance = Como margem de + { $percent } % (× { $factor }): { bare-amount }.
nothing-why = { $free } de livre é { $molecular } molecular a pH { $ph }; o objetivo é { target }.
nothing-why-free = { $free } de livre; o objetivo é { target }.

## Uma quantidade de que se pergunta, que entrou, uma solução

adds =
    { $number ->
        [many] { at }{ $list } são { $adds } de SO2
       *[one] { at }{ $list } são { $adds } de SO2
    }
adds-rate = { at }«{ $rate }» ({ $ofAdditive } de { additive }) dá { $adds } de SO2
amount = { $amount } de { additive }
amount-solution = { $amount } de { additive } a { $strength } %
amount-SO2 = { $amount } de SO2 de { additive }
amount-tablets =
    { $size ->
        [none] { $amount } { tablet-word } de { additive }
       *[other] { tablets-of }
    }
adds-rate-mass = Em { $volume } são { $amount }.
ferment-stop =
    { $adds ->
        [none] Nenhuma dose de SO2 para as leveduras com segurança, e as garrafas podem rebentar: pergunta a quem sabe.
       *[other] { $adds } não para as leveduras com segurança, as garrafas podem rebentar: pergunta a quem sabe.
    }
ferment-stop-more = Para isso não dou dose. Até lá: frio, e nada bem rolhado.
measure-tomorrow = Mede o SO2 livre amanhã, antes de voltar a adicionar.
reading-read = { at }{ $list }.
solution-weigh = Pesa { $amount } de { additive } e completa com água até { $volume }.
solution-measure = Mede { $amount } de { additive } e completa com água até { $volume }.
solution-from-powder = Só faço soluções a partir de pó: preparar { $volume } de meta a 10%
solution-strength = Essa solução tem { $strength } g de SO2 em 100 mL.
solution-fresh = Fá-la na altura e escreve-lhe a data: perde força em dias ou semanas (prática comum, sem fonte).
solution-per-barrel = Numa barrica de { $barrel } 1 mL dá { $adds } mg/L; { $rise } mg/L pedem { $amount }.
solution-us-water = Também é água: nos EUA no máximo 1 % do vinho, todas as adições juntas (27 CFR 24.246).
solution-too-much = Não: { $wanted } g/L não se dissolvem de certeza. Publicado para { additive } a { $celsius } °C: { $least ->
        [none] { $most } g/L ({ $source }).
       *[other] { $least } e { $most } g/L ({ $source }).
    } Fá-la mais fraca.
solution-strengths = Faço soluções de 1 a 25 %. Publicado para metabissulfito de potássio a 20 °C: 250 g/L (Food Additives Data Book, p. 780) e 450 g/L (uma página de enciclopédia).
solution-too-cold = Não: { $wanted } g/L em água a { $water } °C. Publicado: { $most } g/L a { $celsius } °C ({ $source }), e nada para água mais fria. Aquece a água, ou fá-la mais fraca.
solution-colder = Abaixo de { $celsius } °C não há número publicado: vê se se dissolveu tudo.
solution-holding = Solução de conservação, { $volume }: { $acid } de ácido cítrico, { $amount } de { additive }.
solution-rinse = Enxaguamento, { $volume }: { $acid } de ácido cítrico, { $amount } de { additive }.
solution-order = Primeiro a água toda, depois o ácido, o sulfito no fim e aos poucos. Nunca pó sobre ácido.
solution-air = Liberta SO2: ventila, cara longe do batoque.
solution-for-holding = Para barrica vazia e limpa, cheia até cima; vê-a a cada poucas semanas.
solution-for-rinse = Para equipamento limpo: molha tudo, deixa atuar uns minutos.
solution-drain = Despeja como mandam as regras locais. Passa por água antes de entrar vinho.
solution-practice = { $salt } e { $acid } g/L: prática comum, sem fonte. Com um número teu: { $use ->
        [holding] solução de conservação { $litres } L meta a 1%
       *[rinse] enxaguar { $litres } L meta a 1%
    }
solution-not-wine =
    { $vessel ->
        [none] Nunca no vinho.
       *[other] Nunca no vinho: { $vessel } tem de estar sem vinho. Disto não fica nada registado.
    }
ask-solution-volume =
    { $use ->
        [rinse] Quanta solução para enxaguar fazes? Em litros, ou com a unidade: 20 L, 1 hl
        [holding] Quanta solução de conservação? Em litros, ou com a unidade: 225 L, 3 hl
       *[stock] Quanta fazes? Em litros, ou com a unidade: 5 L, 1 hl
    }
burning-sulfur-never = Queimar enxofre (discos, mechas) nunca é dose para vinho: ninguém sabe quanto entra. De mim, nenhum número.
burning-sulfur-danger = Só em barricas vazias, como dizem a embalagem, as regras locais e gente formada. Nunca depois de aguardente (fogo), nunca sem ventilação, nunca sem ninguém ao pé.
burning-sulfur-rather = Para uma barrica vazia, antes: solução de conservação 225 L. Para o vinho dela manda a análise: pH, SO2 livre, volume.

## O que se leu e o que se supôs

basis-oiv = Pela tabela da OIV para { $percent } %, { $celsius } °C (pK { $pK }).
basis-oiv-need = Pela tabela da OIV para { $percent } %, { $celsius } °C (pK { $pK }); com pK 1,81 pedia { $free } de livre.
read = Lido: { $list }.
assumed = Suposto: { $list }.
set-aside = Não usado: { $list }.
fact-volume = { $volume }
fact-volume-count = { $volume } em { $count } vasilhas
fact-ph = pH { $ph }
fact-free = livre { $free }
fact-total = total { $total }
fact-temperature = { $celsius } °C
fact-alcohol = { $percent } % vol
fact-sugar = { $sugar } g/L de açúcar
fact-figure = { $figure }
fact-allowance = margem de + { $percent } %
fact-share = combina-se { $percent } %
fact-style = { $style ->
        [red] tinto
        [white] branco
       *[other] rosé
    }
fact-category = { $category ->
        [sweet] doce
        [sparkling] espumante
       *[fortified] licoroso
    }
fact-product = { $product ->
        [cider] sidra
        [mead] hidromel
        [alcohol-free] vinho sem álcool
       *[fruit-wine] vinho de fruta
    }
fact-organic = biológico
fact-designated = designado ({ $limit })
fact-uplift =
    { $declared ->
        [yes] ano declarado
       *[no] ano não declarado
    }
fact-quality =
    { $quality ->
        [yes] da classe de qualidade
       *[no] sem a classe de qualidade
    }
fact-pdo = denominação protegida (DOP)
fact-bulk = granel para exportação
fact-density = densidade { $density } kg/L
fact-reserve = { $reserve } guardados para o engarrafamento
fact-stage = { stage-now }
fact-target = objetivo { target }
fact-tablet =
    { $additive ->
        [tablet] pastilhas efervescentes de { $size } g de SO2
       *[other] pastilhas de { $size } g de { additive }
    }
fact-strength =
    { $kind ->
        [assay] { additive }, { $strength } % de pureza
        [SO2-yield] { additive }, { $strength } % tomado como rendimento em SO2
        [salt-per-100mL] { additive }, { $strength } % = { $strength } g de sal em 100 mL
        [SO2-per-100mL] { additive }, { $strength } % = { $strength } g de SO2 em 100 mL
       *[noted] { additive }, { $strength } %
    }
assumed-additive = { additive } puro
assumed-target = objetivo { target }
assumed-target-red = objetivo { target } (tinto)
assumed-target-sweet = objetivo { target } (doce)
assumed-gallon = { $gallon ->
        [US] galões americanos
       *[imperial] galões imperiais
    }
assumed-must = { $fruit } kg × { $yield } L/100 kg = { $volume }
assumed-must-usual = { $fruit } kg × { $yield } L/100 kg (o teu rendimento habitual) = { $volume }
assumed-barrels =
    { $count ->
        [one] uma barrica de 225 L
       *[several] { $volume } a 225 L por barrica
    }
note-free-unlabelled = «{ $text }» é SO2 livre
note-ph-unlabelled = «{ $text }» é o pH
note-round-ph = decimal sozinho = pH
note-round-free = número sozinho = SO2 livre
note-volume-sum = «{ $text }» somado
note-strength-as-salt = a força são gramas do sal em 100 mL; como SO2 seria { $factor } vezes mais forte
note-strength-as-SO2 = a força são gramas de SO2 em 100 mL
note-mass-beside-readings = «{ $text }» são gramas, não galões
note-each-or-total = «{ $text }» é de cada
note-unread-words = palavras que não conheço e deixei passar: { $text }
set-aside-figure = { $text }

## A pergunta

ask-vessel = { at }que vasilha? Por exemplo: T4
ask-volume_L =
    { $unit ->
        [L] { at }que volume{ of-each }? Em litros, ou com a unidade: 55 hl, 225 L
        [hL] { at }que volume{ of-each }? Em hectolitros, ou com a unidade: 5500 L, 225 L
        [m3] { at }que volume{ of-each }? Em metros cúbicos, ou com a unidade: 55 hl
        [galUS] { at }que volume{ of-each }? Em galões americanos, ou com a unidade: 55 hl
        [galUK] { at }que volume{ of-each }? Em galões imperiais, ou com a unidade: 55 hl
       *[other] { at }que volume{ of-each }? Com a unidade: 225 L, 55 hl
    }
of-each =
    { $count ->
        [several] {" "}tem cada
       *[one] {""}
    }
ask-ph = { at }que pH? Por exemplo: 3,58
ask-free_mg_L = { at }que SO2 livre, em { $unit }? Por exemplo: 21
ask-target =
    { $usual ->
        [none] { at }qual é o objetivo? Um vinho destes não tem objetivo habitual. Por exemplo: levar a 30 de livre, 0,6 molecular, adicionar 25 ppm
       *[some] { at }qual é o objetivo? Por exemplo: levar a 30 de livre, 0,6 molecular, adicionar 25 ppm
    }
ask-target-stage =
    { $stage ->
        [must] { at }quantos { $unit } queres adicionar ao mosto? Escreve tudo: { whole-example }
        [base] { at }quantos { $unit } queres adicionar ao vinho base? Escreve tudo: { whole-example }
       *[other] { at }quantos { $unit } queres adicionar? Escreve tudo: { whole-example }
    }
ask-tablet-additive = { at }de que sal são as pastilhas? Está na embalagem.
ask-additive = { at }que aditivo é?
ask-strength_percent = { at }que força tem, em %? Está no rótulo. Por exemplo: { usual-strength }
usual-strength =
    { $named ->
        [potassium-metabisulfite] 96%
        [sodium-metabisulfite] 96%
        [sulfur-dioxide-solution] 6%
       *[other] 10%
    }
ask-tablet_salt_g = { at }quantos gramas tem uma pastilha? Está na embalagem; o habitual é 0,44 ou 0,55.
ask-tablet_SO2_g = { at }quantos gramas de SO2 dá uma pastilha efervescente? Está na embalagem.
ask-mass_g = { at }quantos gramas?
ask-mass-spoon = { at }quantos gramas? Uma colher de chá rasa de pó são uns 5 a 6 g, e isso não chega para dosear: usa uma balança.
ask-fruit = { at }que volume de mosto, ou que rendimento? Com a unidade, por exemplo: 65 L/100 kg, ou: 650 L/t, ou: 1300 L
option = { $mark }) { $list }
target-of =
    { $vessel ->
        [none] Outro objetivo.
       *[other] { $vessel }: outro objetivo.
    }

## O que assim não se pode responder

problem-ph-out-of-range = { at }«{ $about }» não pode ser o pH de um vinho: aceito de 2,5 a 4,8. Falta a vírgula? Manda assim: pH 3,58
problem-negative-value = { at }«{ $about }» é menos que zero, não pode ser. Manda outra vez o número sem o menos.
problem-total-below-free = { at }o total é menor do que o livre («{ $about }»). Trocados? Escreve: livre { $one } total { $two }
problem-volume-not-positive = { at }um volume de «{ $about }» não pode ser. Manda assim: 55 hl
problem-unit-mismatch = { at }a unidade não bate em «{ $about }». O SO2 livre vai em mg/L ou ppm, o volume em L ou hl.
problem-ambiguous-number =
    { $kind ->
        [split] { at }há um espaço em «{ $about }». Escreve: pH { $one }
        [volume] { at }«{ $about }» pode estar errado por mil. Escreve: { $one }, ou: { $two }
        [mass] { at }«{ $about }» pode estar errado por mil. Escreve: { $one }, ou: { $two }
        [thousands] { at }«{ $about }» pode estar errado por mil. Escreve: { $one }, ou: { $two }
        [powder] { at }«{ $about }»: de SO2, ou de pó? Escreve: adicionar { $one } ppm SO2, ou: { $two } g por 10 L de { $named }
        [salt] { at }«{ $about }»: de SO2, ou de sal? Como SO2 é mais forte do que se vende. Se o rótulo diz sal, escreve: { salt-name } sal { $one }%
        [water] { at }«{ $about }»: SO2 em água, ou solução de metabissulfito? Escreve: solução sulfurosa { $one }%, ou: solução de meta a { $one }%
        [SO2-percent] { at }«{ $about }»: álcool, SO2 em água ou solução de metabissulfito? Escreve: { $one }% vol, solução sulfurosa { $one }%, ou: solução de meta a { $one }%
        [percent] { at }«{ $about }»: álcool, ou a força de uma solução? Escreve: { $one }% vol, ou: solução de { stock-name } a { $one }%
        [degree] { at }«{ $about }»: álcool ou temperatura? Escreve: { $one }% vol, ou: { $one } C
        [to] { at }«{ $about }»: o objetivo é { $two }? Escreve: livre { $one }, objetivo { $two }
        [range] { at }«{ $about }» parece um intervalo. Escreve um dos dois: livre { $one }, ou: livre { $two }
        [pair] { at }«{ $about }»: livre e total, ou uma leitura entre dois traços? Escreve: livre { $one } total { $two }, ou: livre { $one }
        [free] { at }«{ $about }»: SO2 livre ou total? Escreve: livre { $one }, ou: total { $one }
        [aim] { at }«{ $about }»: para adicionar, ou para atingir? Escreve: adicionar { $one } ppm, ou: objetivo { $one }
       *[other] { at }«{ $about }» lê-se de mais de uma maneira. Diz o que é, por exemplo: pH 3,58 livre 21 55 hl
    }
salt-name =
    { $named ->
        [ammonium-bisulfite-solution] bissulfito de amónio
       *[other] bissulfito de potássio
    }
stock-name =
    { $named ->
        [sodium-metabisulfite] metabissulfito de sódio
        [sodium-metabisulfite-solution] metabissulfito de sódio
       *[other] meta
    }
problem-each-or-total = { at }«{ $about }» é de cada, ou de todas juntas? Escreve: { $about } cada, ou: { $about } ao todo
problem-conflicting-values = { at }dois valores para a mesma coisa: «{ $about }». Manda só um; dois vinhos vão um em cada linha.
problem-unknown-additive = { at }«{ $about }» não é aditivo de SO2 que eu conheça. Conheço: metabissulfito de potássio ou de sódio (pó, solução), bissulfito, solução sulfurosa, SO2 gás, pastilhas.
problem-did-you-mean = { at }«{ $about }» é outro produto químico. Querias dizer metabissulfito?
problem-strength-out-of-range = { at }a força «{ $about }» não bate com esse aditivo. Vê o rótulo. Por exemplo: { usual-strength }
problem-value-out-of-range = { at }«{ $about }» é mais do que qualquer adega tem. Vê o número e a unidade.
problem-not-understood = Não percebi. Manda uma análise, por exemplo: T4 55 hl pH 3,58 livre 21. Com ? digo mais.
problem-too-long = É demasiado comprido para ler sem erros. Manda no máximo 25 vasilhas de cada vez, uma por linha.
problem-no-number =
    { $again ->
        [correction] Sem dose até isso ficar claro.
       *[whole] Sem dose até isso ficar claro. Manda a linha toda outra vez.
    }
problem-share = { at }«{ $about }»: conto no máximo 4/5 (0,8) que se combinam.
problem-vessel-twice = { $vessel } vem duas vezes: manda uma só.
problem-two-vessels = «{ $about }»: duas vasilhas. Manda uma linha para cada.
no-such-choice = { $text } aqui não há: de a até { $last }, ou o nome.
no-such-button = { $text } aqui não há: de 1 a { $last }, ou uma análise inteira.

## Avisos

warning-no-dose-at-this-stage = ⚠ { stage-now }: nesta fase não há dose; fala com quem responde por este vinho.
warning-stage-not-over =
    { $stage ->
        [malolactic] ⚠ Isto para ou atrasa a malolática: fala primeiro com quem responde por este vinho. { no-dose-why }
       *[fermenting] ⚠ Vinho a fermentar combina-o logo, e as leveduras não param de certeza: fala primeiro com quem responde por este vinho.
    }
warning-additive-not-permitted =
    { $reason ->
        [ammonium] ⚠ O bissulfito de amónio é só para uva e mosto (OIV): neste vinho não; pergunta primeiro.
        [organic] ⚠ O vinho biológico só leva SO2 e sais de potássio ({ law-of }, Regulamento 889/2008): este não. Pergunta primeiro.
        [organic-none] ⚠ Vinho rotulado de biológico não leva sulfito adicionado ({ law-of }, 7 CFR parte 205). Pergunta primeiro.
       *[sodium] { warning-sodium }
    }
warning-sodium =
    { $region ->
        [oiv] ⚠ Metabissulfito de sódio: muitas regras não o deixam no vinho (OIV; UE e Reino Unido por confirmar). Pergunta primeiro.
        [eu] ⚠ O metabissulfito de sódio não é para vinho na UE, só para equipamento (por confirmar). Pergunta primeiro.
        [uk] ⚠ O metabissulfito de sódio não é para vinho no Reino Unido, só para equipamento (por confirmar). Pergunta primeiro.
        [ar] ⚠ O metabissulfito de sódio não é para vinho na Argentina: só sais de potássio (INV 281/85). Pergunta primeiro.
       *[other] ⚠ Metabissulfito de sódio: não li lista nenhuma ({ law-of }), logo por confirmar; muitas regras não o deixam no vinho. Pergunta primeiro.
    }
refused-organic =
    { $reason ->
        [organic-none] { at }sem sulfito: vinho rotulado de biológico não leva nenhum ({ law-of }, 7 CFR parte 205).
       *[organic] { at }com { additive } não: o vinho biológico só leva SO2 e sais de potássio ({ law-of }, Regulamento 889/2008).
    }
refused-organic-instead =
    { $reason ->
        [organic-none] Afinal não é biológico? Fala com quem responde por este vinho; depois: risca a entrada que o diz.
       *[organic] Escreve-o antes com meta. Não é conselho jurídico: confirma para o teu mercado.
    }
limit-doubt =
    { $confidence ->
        [unconfirmed] , por confirmar: de memória
       *[read] {""}
    }
warning-total-over-limit =
    { $total ->
        [known] ⚠ O total ficava em { $total_after_mg_L }, acima de { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: pergunta primeiro.
       *[at-least] ⚠ O total ficava em pelo menos { $total_after_mg_L }, acima de { $limit_mg_L } { $unit } ({ rule-short }{ limit-doubt }){ law-decides }: pergunta primeiro.
    }
warning-free-over-limit = ⚠ O livre podia chegar a { $free_after_mg_L } se nada se combinar, acima do limite de { $limit_mg_L } { $unit } de livre ({ rule-short }{ limit-doubt }){ law-decides }: pergunta primeiro.
warning-label-threshold =
    ⚠ Rótulo ({ law-of }): os sulfitos declaram-se { $comparator ->
        [more] acima de
       *[from] a partir de
    } { $threshold_mg_L } { $unit_of_law }{ $counts ->
        [added] {" "}adicionados
       *[total] {""}
    }{ limit-doubt }; o total ficava em { $total_after_mg_L }.
warning-total-near-limit =
    { $total ->
        [known] ⚠ O total ficava em { $total_after_mg_L } { $unit }, perto do limite de { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
       *[at-least] ⚠ O total ficava em pelo menos { $total_after_mg_L } { $unit }, perto do limite de { $limit_mg_L } ({ rule-short }{ limit-doubt }){ law-decides }.
    }
warning-total-unknown = ⚠ Não sei o total: mede-o.
warning-total-unknown-most = ⚠ Não sei o total, mede-o: para esta dose pode ser hoje no máximo { $most_total_mg_L } { $unit }, limite { $limit_mg_L } ({ rule-short }){ law-decides }.
warning-no-limit-on-file =
    { $region ->
        [oiv] ⚠ Não conheço limite para um vinho destes: vê a lei do teu país.
       *[other] ⚠ Não há limite para ele no ficheiro ({ law-of }): vê o que vale no teu mercado.
    }
warning-limit-unconfirmed =
    { $region ->
        [oiv] ⚠ O limite está por confirmar: vê a lei do teu país.
       *[other] ⚠ Limite { $limit_mg_L } { $unit } { $of ->
            [free] de livre
           *[total] de total
        } ({ rule-short }): por confirmar, de memória. Vê o que vale no teu mercado.
    }
warning-addition-large = ⚠ { $dose_mg_L } { $unit } de uma vez é muito: vê o volume e a unidade.
warning-free-needed-high = ⚠ { $target_free_mg_L } { $unit } de livre é muito: mais frio, mais limpo, vigiado mais vezes; ou baixar o pH, com quem saiba.
warning-molecular-above-2 = ⚠ Acima de 2 { $unit } de SO2 molecular nota-se no nariz e na boca.
warning-free-low-may-bind-all = ⚠ Abaixo de 10 de livre pode combinar-se muito ou tudo: mede antes de voltar a adicionar.
warning-ph-unusual = ⚠ pH { $ph } não é normal num vinho: vê o medidor.
warning-basis-fallback = ⚠ A base da OIV pede o álcool, e 20–40 °C: contado com pK 1,81.
warning-basis-fallback-change = ⚠ A base da OIV pede o álcool, e 20–40 °C: contado com pK 1,81. Pela OIV a { $compared_at_alcohol_percent } %, { $compared_at_temperature_C } °C seriam cerca de { $change } { $unit } a { $direction ->
    [more] mais.
   *[less] menos.
}
warning-malolactic-may-not-start =
    { $above ->
        [free] ⚠ Livre { $free_mg_L } acima de { $free_ceiling_high_mg_L } { $unit }: a malolática pode não arrancar (AWRI, para pH 3,3–3,5).
        [total] ⚠ Total { $total_mg_L } acima de { $total_ceiling_high_mg_L } { $unit }: a malolática pode não arrancar (AWRI, para pH 3,3–3,5).
       *[both] ⚠ Livre { $free_mg_L } acima de { $free_ceiling_high_mg_L }, total { $total_mg_L } acima de { $total_ceiling_high_mg_L } { $unit }: a malolática pode não arrancar (AWRI, para pH 3,3–3,5).
    }
warning-restart-may-fail = ⚠ { $molecular_mg_L } { $unit } molecular travam as leveduras: a partir de { $held_back_molecular_mg_L } um rearranque pode falhar (prática comum, sem fonte).
warning-must-may-hinder-malolactic = ⚠ Acima de { $malolactic_unharmed_mg_L } { $unit } no mosto a malolática pode custar a fazer-se (AWRI).
warning-rounding-coarse = ⚠ O que a balança mostra erra aqui { $rounding_mg_L } { $unit }: usa uma mais fina, ou uma solução.
warning-already-dosed = ⚠ Foi sulfitado há pouco.

## Cuidados

cautions = ⚠ { $list }
caution-trained-people-with-breathing-apparatus = Só gente formada, com aparelho respiratório à mão.
caution-grapes-and-must-only = Só para uva e mosto.
caution-ventilate = Ventila.
caution-never-lean-in = Não te debruces na cuba.
caution-gloves-goggles = Luvas, óculos de proteção.
caution-no-acid-no-chlorine = Nunca com ácido nem cloro.
caution-no-other-acid-no-chlorine = Nem outro ácido nem cloro.
caution-asthma = Não é para asmáticos.
caution-crush-first = Esmaga, dissolve em pouco vinho ou água.
caution-dissolve-first = Dissolve antes em pouco vinho ou água.
caution-foams-with-carbon-dioxide = Vinho com muito CO2 transborda.
caution-mix-and-measure-again = Homogeneíza, mede no outro dia.
caution-label-and-rules-first = Antes: rótulo, regras locais, gente qualificada.
cautions-of = ⚠ { additive }: { $list }
cautions-short = ⚠ Cuidados como antes: botão Segurança.

## Conversa

chat-greeting = Olá. Manda-me uma análise, por exemplo: T4 55 hl pH 3,58 livre 21. Com ? digo mais.
chat-thanks = De nada. Volta a medir amanhã.
chat-other = Calculo adições de SO2. Manda uma análise, por exemplo: T4 55 hl pH 3,58 livre 21. Com ? digo mais.
still-asked = Ainda falta uma coisa.
chat-negated = Então não entrou nada. Nada a guardar.
chat-help-what = Manda uma análise, recebes a adição de SO2.
chat-help-dose = T4 55 hl pH 3,58 livre 21
chat-help-dose-means = → o que pesar
chat-help-effect = 100 g de meta em 20 hl
chat-help-effect-means = → o que dá uma quantidade
chat-help-solution = preparar 5 L de meta a 10%
chat-help-solution-means = → como fazer uma solução
chat-help-fields = Ordem qualquer; também total, tinto, 13,5%, objetivo 35, +25 ppm, +30%. Vasilhas: uma por linha.
chat-help-topics = Mais: ajuda e um destes: { $list }.
chat-help-care = Primeiro o rótulo, as regras locais e quem é qualificado.

## Ajuda por tema: cada um é um ecrã de mensagens para mandar; `help-<topic>-…` pela ordem em que se dizem

help-wine-1 = Por qualquer ordem: a vasilha, o volume, pH, SO2 livre.
help-wine-2 = T4 55 hl pH 3,58 livre 21 branco → o que pesar
help-wine-3 = T4 40 hl 3,6/18/60 13,5% 14 C → pH, SO2 livre e total
help-wine-4 = T4 40 hl pH 3,5 livre 18 0,6 molecular → até um nível teu; ou objetivo 36
help-wine-5 = T4 40 hl adicionar 25 ppm → uma adição tua
help-wine-6 = T4 40 hl pH 3,5 livre 18 +30% → mais, pelo que se combina; ou: combina-se um terço
help-wine-7 = T4 40 hl pH 3,5 livre 18, meta a 10% → de uma solução; também solução sulfurosa a 6%, pastilhas de 5 g
help-wine-8 = 100 g de meta em 20 hl → o que dá uma quantidade
help-wine-9 = Tinto, rosé, doce, sidra, hidromel, biológico; mosto, a fermentar, malolática feita: diz o que é, ou a resposta diz o que supus.
help-must-1 = Para mosto não há número habitual: digo o que está publicado, tu escolhes.
help-must-2 = mosto 20 hl uva sã → números para escolher; também: algum dano, podridão
help-must-3 = mosto 20 hl adicionar 40 → o que pesar para 40 mg/L
help-must-4 = 2 t uva 65 L/100 kg sã → pelo peso da uva e o rendimento
help-must-5 = 5 t uva 700 L/t adicionar 50 → o mesmo, por tonelada
help-must-6 = rendimento 65 → põe o rendimento habitual, litros de 100 kg
help-must-7 = A maior parte combina-se: não protege mais tarde, e cerca de um terço volta como SO2 total.
help-bottling-1 = O que tem de lá estar agora, para o objetivo se manter depois de o oxigénio levar a parte dele.
help-bottling-2 = engarrafamento T4 40 hl pH 3,4 livre 22 oxigénio 2 mg/L → 4 de SO2 por 1 de oxigénio, pela fórmula
help-bottling-3 = engarrafamento T4 40 hl pH 3,4 livre 22 oxigénio 2 mg/L x 2,5 → com um número teu
help-bottling-4 = T4 40 hl pH 3,4 livre 22 total 90 guardar 20 para engarrafamento → folga até ao limite que se guarda
help-bottling-5 = T4 em malolática pH 3,4 livre 25 total 60 → se a malolática pode arrancar; também amuada: um rearranque
help-bottling-6 = Oxigénio: dissolvido e do espaço de cabeça juntos, em mg/L de vinho.
help-solutions-1 = Soluções em água: nenhuma é dose para vinho, e nada disto vai para o registo.
help-solutions-2 = preparar 5 L de meta a 10% → uma solução: o que pesar, que força tem, mL para uma barrica
help-solutions-3 = preparar 1 L de meta a 10%, adicionar 30 ppm → os mL para uma barrica de 225 L
help-solutions-4 = 10 g de meta em 100 mL de água → que força tem
help-solutions-5 = solução de conservação 225 L → para barrica vazia; também: solução de conservação para 3 barricas
help-solutions-6 = enxaguar 20 L → para equipamento limpo; com força tua: enxaguar 20 L meta a 1%
help-solutions-7 = Queimar discos ou mechas: nunca é dose para vinho, e de mim nenhum número.
help-law-1 = Cada dose é posta ao lado dos limites do teu mercado. Não é conselho jurídico: confirma-os.
help-law-2 = lei UE → também EUA, Brasil, OIV, Canadá, Japão …; para a adega toda
help-law-3 = limite T4 → a regra, o texto, como foi visto, a folga que há
help-law-4 = limite tinto açúcar 3 UE → sem vasilha
help-law-5 = T4 tinto → decidem a cor e o açúcar (açúcar 3 com uma análise); o que não se sabe conta pelo mais apertado
help-law-6 = T4 biológico → também espumante de qualidade, DOP, granel, densidade 0,992
help-law-7 = T4 designado 300 → vinho doce de uma designação; também T4 ano declarado
help-law-8 = T4 guardar 30 para engarrafamento → fica abaixo do limite, com 15 pelo erro da análise
help-law-9 = Acima dele vem primeiro a dose menor: dose completa, depois sim. O registo guarda-o.
help-round-1 = Muitas vasilhas numa mensagem, uma por linha; o que vale para todas (meta, objetivo 30) na primeira. Um toque regista tudo, ou linha a linha.
help-round-2 = T1 20 hl pH 3,4 livre 18 → assim cada linha; eu somo o que há a ir buscar
help-round-3 = ronda → todas as linhas outra vez
help-round-4 = folha xlsx → para levar; também folha csv, folha gráfico
help-round-5 = B1-B24 225 L pH 3,6 livre 18 → uma dose por barrica, uma entrada por cada
help-round-6 = B1-B24 sem B7 225 L pH 3,6 livre 18 → todas menos uma
help-round-7 = 34 barricas, amostra misturada: pH 3,6 livre 18 → para a média, e o que ela esconde
help-round-8 = Ou manda um CSV ou XLSX: vasilha, volume, pH, SO2 livre. A folha volta.
help-stock-1 = Cada adição sai daqui, logo que haja alguma coisa dentro.
help-stock-2 = recebidos 25 kg de meta lote 4471 de Fornecimentos Norte → também 10 L de solução sulfurosa a 6%
help-stock-3 = stock → o que há, por lote; stock meta: só um
help-stock-4 = stock meta 3,2 kg → contado na prateleira: vale a partir daí
help-stock-5 = usados 200 g de meta para enxaguar → para vinho nenhum
help-stock-6 = deitado fora 1 kg de meta porque empedrado → para o lixo
help-stock-7 = adicionados 82 g de meta T4 lote 4471 → desse lote; senão do mais antigo
help-stock-8 = exportar stock → entradas, fornecedores, lotes e o que sobrou, para os livros
help-log-1 = Nada se apaga; as correções ficam ao lado do que corrigem.
help-log-2 = adicionados 82 g de meta T4 → registado; também ppm, mL, ontem 17:00, lote 4471, nota: …
help-log-3 = T4 agora livre 28 total 96 → uma análise guardada, sem dose
help-log-4 = ordem T4 256 g de meta → para outro fazer; ordens mostra as que faltam
help-log-5 = hoje → o que se registou hoje; também ontem, 12 novembro
help-log-6 = histórico T4 → tudo o que há dela
help-log-7 = anular → tira a tua última, até 15 minutos
help-log-8 = riscar 17 engano → risca a entrada 17, e diz porquê
help-vessels-1 = O que acontece a um vinho muda aquilo com que ainda conto.
help-vessels-2 = T4? → o que sei dela
help-vessels-3 = vasilhas → todas
help-vessels-4 = T4 tinto → também em malolática, acabado
help-vessels-5 = T4 tem agora 5200 L → o que está dentro; capacidade T4 6000 L: o tamanho
help-vessels-6 = trasfegada T4 6100 L → também atestada T4
help-vessels-7 = passado T4 para T9 → o vinho todo, ou 20 hl dele
help-vessels-8 = loteado T5 em T4 → o pH tem de ser medido outra vez
help-vessels-9 = T4 = Alva 2026 → o nome do vinho
help-vessels-10 = T4 vazia → também: esquecer T4
help-reminders-1 = Digo uma vez por dia o que há a medir, e depois de uma adição quando.
help-reminders-2 = pendentes → o que medir agora
help-reminders-3 = lista diária às 7:00 → quando a digo; ou: sem lista diária
help-reminders-4 = adiar T4 3 dias → pergunto mais tarde
help-reminders-5 = não vigiar T4 → não falo mais dela; vigiar T4: outra vez
help-reminders-6 = silêncio 21 a 6 → de noite nada sem ser pedido
help-settings-1 = Tudo isto vale para a adega toda.
help-settings-2 = definições → o que está posto, e como mudar cada uma
help-settings-3 = unidades us → também métrico, imperial
help-settings-4 = o nosso habitual é metabissulfito de sódio → o aditivo quando não se diz nenhum
help-settings-5 = objetivo 0,5 para tintos → também brancos, doces
help-settings-6 = margem 30% → junta-se a cada dose, pelo que se combina
help-settings-7 = fuso horário Europe/Lisbon → para horas e dias
help-settings-8 = respostas curtas → as contas num botão
help-pictures-1 = Um gráfico mostra SO2 livre, molecular e total, e o que entrou.
help-pictures-2 = gráfico T4 → como foto, com o mesmo por palavras
help-files-1 = O registo é vosso.
help-files-2 = exportar → este mês como folha de cálculo
help-files-3 = exportar 2026 → também exportar T4 csv, exportar 1 outubro a 31 outubro
help-files-4 = Uma exportação de outra adega, ou uma lista de vasilhas em CSV ou XLSX: manda o ficheiro. Mostro-o primeiro, depois entra todo ou nada.
help-people-1 = Um grupo é uma adega própria: chama-me pelo nome, ou responde-me.
help-people-2 = pessoas → quem está
help-people-3 = convidar adegueiro → um código para uma pessoa; também responsável, convidado
help-people-4 = O responsável pode tudo, o adegueiro doseia e regista, o convidado vê.
help-people-5 = lê tudo → respondo a análises claras sem ser chamado
help-people-6 = que adega → em que adega estamos; em Alva: ir para lá; sair de Alva: sair dela
help-people-7 = esquece-me → o teu nome e número saem
help-lab-1 = Uma titulação vem com as contas; nada se guarda antes de tocares.
help-lab-2 = AO 20 mL amostra, 1,9 mL 0,01 N → SO2 livre; com T4 à frente, guarda-se num toque
help-lab-3 = T4 total AO 20 mL amostra, 5,6 mL 0,01 N, branco 0,1 → SO2 total
help-lab-4 = iodo 25 mL amostra, 1,2 mL 0,02 N, ascórbico 50 → iodo, sem o que o ascórbico conta
help-lab-5 = intervalo → quanto pode errar a última dose
help-lab-6 = T4 55 hl pH 3,58±0,03 livre 21±2 → com o teu ±
help-lab-7 = tabela 0,5 0,8 1,5 pH 3,2-3,8 → SO2 livre preciso
help-lab-8 = molecular T4 → por pK 1,81 e pela OIV
help-forecast-1 = As análises de um vinho dizem mais do que qualquer regra.
help-forecast-2 = previsão T4 → o dia em que o SO2 livre fica abaixo do que o pH pede
help-forecast-3 = Três análises desde a última adição dão-na; antes disso só há números publicados para barricas e garrafas.
help-forecast-4 = Depois de duas adições com análises antes e depois, a dose diz que parte este vinho combinou.
help-forecast-5 = SO2 a mais na T4 → o que ajuda e o que não ajuda
help-forecast-6 = lotar T4 T7 → que parte de T7 cumpre limite e objetivo
help-forecast-7 = lotar T4 → que outras vasilhas serviam
help-topic =
    { $topic ->
        [wine] vinho
        [must] mosto
        [bottling] engarrafamento
        [law] lei
        [round] ronda
        [stock] stock
        [solutions] soluções
        [log] registo
        [vessels] vasilhas
        [reminders] avisos
        [settings] definições
        [pictures] gráficos
        [files] ficheiros
        [people] pessoas
        [lab] laboratório
        [forecast] previsão
       *[other] { $topic }
    }

send-alone = Isso vai numa mensagem só para si.
unreadable =
    { $what ->
        [edited] Não leio mensagens alteradas. Manda-a de novo, por favor.
        [photo] Não leio fotos. Escreve os números, por favor.
        [sticker] Bonito. Mas só leio texto.
        [voice] Não ouço mensagens de voz. Escreve os números, por favor.
        [file] Ainda não leio ficheiros destes. Escreve os números, por favor.
       *[other] Só leio texto. Escreve os números, por favor.
    }
fault = Falhei, e não calculei nada. Manda outra vez, por favor; se voltar a falhar, diz a quem me mantém.
fault-aside = Falhei três vezes e pus isso de parte: nada foi calculado nem registado. Quem me mantém pode ver porquê.
left-unread =
    { $count ->
        [one] Estive fora. Há aqui uma mensagem com mais de 12 horas que não li: dela nada ficou registado. Manda-a outra vez se ainda valer.
       *[other] Estive fora. Há aqui { $count } mensagens com mais de 12 horas que não li: delas nada ficou registado. Manda outra vez o que ainda valer.
    }
old-button = Esse botão é de uma mensagem antiga. Manda a análise outra vez, por favor.

## Uma emergência

emergency-out = TODOS PARA FORA, para o ar livre, já.
emergency-nobody-in = Ninguém entra nem se debruça atrás de ninguém.
emergency-call = Liguem para a emergência.
emergency-swallowed = Engolido: enxaguar a boca, não provocar o vómito, ligar para o centro antivenenos ou para a emergência.
emergency-eyes = Olhos: lavar com água durante 15 minutos, tirar as lentes de contacto.
emergency-skin = Pele: lavar com muita água, tirar a roupa molhada.

## As contas

working = { $substituted } = { $result }
working-symbol = { $symbol } = { $substituted } = { $result }
working-source = ({ $source })
working-head =
    { $vessel ->
        [none] As contas
       *[other] { $vessel }: as contas
    }
step-dissociation = Constante de dissociação, entre os quatro valores mais próximos por álcool e temperatura:
step-molecular-now = SO2 molecular agora, livre ÷ (10^(pH − pK) + 1):
step-free-needed = SO2 livre preciso, objetivo × (10^(pH − pK) + 1):
step-oxygen-loss = O que o oxigénio leva, oxigénio × SO2 por 1 mg dele:
step-free-before-bottling = SO2 livre preciso antes, pretendido ao engarrafar + o que o oxigénio leva:
step-addition = A adicionar, livre pretendido − livre agora:
step-dose-with-allowance = Com a margem, adição × (1 + margem):
step-dose-with-share = Com a parte que se combina, adição ÷ (1 − parte):
step-volume-in-litres = Volume em litros:
step-room-to-limit = Espaço, limite − folga − SO2 agora:
step-must-of-fruit = Mosto, uva × litros de 100 kg ÷ 100 kg:
step-so2-mass = SO2 em gramas, adição × volume ÷ 1000:
step-so2-mass-each = SO2 de uma vasilha, adição × volume de uma ÷ 1000:
step-all-vessels = Para todas as vasilhas, uma × número:
step-additive-mass = Aditivo, SO2 ÷ a parte de SO2 dele:
step-additive-mass-by-assay = Aditivo, SO2 ÷ (pureza × parte de SO2 do sal puro):
step-additive-mass-by-yield = Aditivo, SO2 ÷ rendimento em SO2 que diz o rótulo:
step-additive-volume-by-salt = Solução, SO2 ÷ (sal nela × parte de SO2 do sal):
step-additive-volume-by-so2 = Solução, SO2 ÷ SO2 nela:
step-tablets-by-so2 = Pastilhas, SO2 ÷ SO2 de uma:
step-tablets-by-salt = Pastilhas, SO2 ÷ (sal de uma × parte de SO2 do sal):
step-gas-by-purity = Gás, SO2 ÷ pureza:
step-so2-in-amount = SO2 lá dentro, quantidade × SO2 de uma unidade:
step-added-concentration = Adicionado, SO2 × 1000 ÷ volume:
step-added-by-rate = Adicionado, dose × parte de SO2:
step-mass-by-rate = Aditivo, dose × volume ÷ 1000:
step-free-after = Livre depois, se nada se combinar:
step-molecular-after = Molecular depois, livre ÷ (10^(pH − pK) + 1):
step-salt-mass = Sal, gramas em 0,1 L ÷ 0,1 L × volume:
step-added-by-one-millilitre = Um mL numa barrica, SO2 nele ÷ volume da barrica:
step-stock-for-a-barrel = Solução para uma barrica, subida × volume da barrica ÷ SO2 na solução:
step-salt-by-recipe = Sulfito, gramas num litro × volume:
step-citric-acid-by-recipe = Ácido cítrico, gramas num litro × volume:
step-solution-strength = Força em 100 mL, SO2 ÷ volume × 0,1 L:
step-solution-strength-by-salt = Força como SO2, sal × parte de SO2 dele:
step-titrant-normality = Normalidade do iodo, 2 × molaridade:
step-iodate-normality = Normalidade, 6 × mg de iodato ÷ 214 ÷ mL do balão:
step-titrant-used = Titulante gasto, bureta − branco:
step-so2-by-titration = SO2, 32 000 × normalidade × titulante ÷ amostra:
step-ascorbic-counted = O ácido ascórbico conta como, mg/L × 64,06 ÷ 176,12:
step-so2-without-ascorbic = SO2 sem ele:
step-spread-of-need = ± do preciso, objetivo × 10^(pH − pK) × ln 10 × ± do pH:
step-spread-of-dose = ± da adição, raiz dos dois ao quadrado:
step-dose-lowest = Menor, preciso − livre − o ±:
step-dose-highest = Maior, preciso − livre + o ±:
step-molecular-sure = Molecular garantido, depois × (1 − raiz dos dois ± relativos ao quadrado):
step-blend-free = SO2 livre do lote, por volume:
step-blend-total = SO2 total do lote, por volume:
safety-head = Cuidado com { additive }
more-head =
    { $vessel ->
        [none] Mais
       *[other] { $vessel }: mais
    }
more-no-warnings = Não há mais avisos.
choice-left = { at }fica assim, { $molecular } molecular. Prova e mede muitas vezes.
choice-over = { at }sem quantidade para isso: o total passava { $limit } ({ law-of }).
round-choice = { at }pH { $ph } faz disto uma escolha: manda-a sozinha.
round-missing =
    { $field ->
        [vessel] que vasilha é?
        [volume_L] { at }falta o volume.
        [ph] { at }falta o pH.
        [free_mg_L] { at }falta o SO2 livre.
        [target] { at }qual é o objetivo? Junta-o.
        [additive] { at }que aditivo é?
        [strength_percent] { at }que força tem o aditivo?
        [tablet_salt_g] { at }quantos gramas tem uma pastilha?
        [tablet_SO2_g] { at }quantos gramas de SO2 dá uma pastilha?
        [mass_g] { at }quantos gramas?
       *[none] { at }falta alguma coisa.
    }
round-dose = { $vessel } ({ $list }): { round-amount }
round-dose-bare = { at }{ round-amount }
round-amount =
    { $unit ->
        [tablets] { $amount } pastilhas{ round-of }{ round-all }{ round-limited }{ round-if-red }
       *[other] { round-tablet }{ $amount }{ round-of }{ round-all }{ round-limited }{ round-if-red }
    }
round-limited =
    { $limited ->
        [limited] {" "}(limite)
       *[none] {""}
    }
round-tablet =
    { $tablet ->
        [too-large] meia pastilha é de mais,{" "}
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
       *[other] {" "}a { $strength } %
    }
round-all =
    { $all ->
        [none] {""}
       *[other] {" "}cada, { $all } ao todo
    }
round-if-red =
    { $red ->
        [unsaid] {""}
        [none] , se for tinto nada
        [over] , se for tinto { $redAmount }, também acima do limite
       *[some] , se for tinto { $redAmount }
    }
round-nothing = { $vessel } ({ $list }): nada a adicionar
round-nothing-bare = { at }nada a adicionar
round-head =
    { $kind ->
        [powder] Pesa { additive }{ round-strength }:
        [gas] Pesa SO2 gás, sempre ao peso; só gente formada, com aparelho respiratório à mão:
        [tablet] Usa pastilhas efervescentes de { $size } g de SO2:
        [salt-tablet] Usa pastilhas de { $size } g de { additive }:
       *[solution] Mede { additive }{ round-strength }:
    }
round-strength =
    { $size ->
        [none] {""}
       *[other] , { $size } %
    }
round-for-all = Para todas: { $list }.
round-kept = As análises ficam guardadas.
round-red = «Se for tinto» é para { $red } molecular.
round-stock = Como solução dele a { $strength } %: { $list }.
round-rest = O resto como solução a { $strength } %: { $list }.
round-stock-of = { $vessel } { $amount }
mixed-sample = É a média das { $count }: não mostra a mais baixa. Quanto diferem não sei; a que está 5 abaixo fica 5 abaixo. Mede algumas à parte primeiro (prática comum, sem fonte).
round-mixed = ⚠ Uma amostra misturada dá a média e não a mais baixa: { $list }. Mede algumas à parte.
round-low = ⚠ Abaixo de 10 de livre pode combinar-se muito ou tudo: { $list }. Aí mede antes de voltar a adicionar.
round-name = { $name }
round-again = Manda outra vez, inteira, cada linha que não se leu.
round-total = Ao todo { $list } (soma das { $count } arredondadas).
round-total-of =
    { $kind ->
        [tablet] { $amount } pastilhas efervescentes de { $size } g de SO2
        [salt-tablet] { $amount } pastilhas de { $size } g de { additive }
       *[other] { $amount } de { additive }{ round-percent }
    }
round-open =
    { $count ->
        [one] Sem quantidade para uma:
       *[other] Sem quantidade para { $count }:
    }
round-open-names = Sem quantidade para { $list }: manda «ronda» para ver porquê.
round-more = … e mais { $count }: manda «ronda», ou leva a folha aqui em baixo.
round-and-more = mais { $count }
round-warned = ⚠ Há avisos junto de { $list }: manda «ronda».
button-round-all = Entrou tudo
button-round-lines = Uma a uma
button-round-line =
    { $vessel } { $amount }{ $unit ->
        [tablet] { " " }pastilha
        [tablets] { " " }pastilhas
       *[other] { "" }
    }{ $count ->
        [several] { " " }cada
       *[one] { "" }
    }
button-round-next = Seguinte
button-round-picture = Folha em imagem
button-round-file = Folha em ficheiro
button-round-undo = Anular { $entries }
round-noted =
    Registado { $entries }: { $count ->
        [one] uma adição
       *[other] { $count } adições
    }, { $list }, { $when }.
round-noted-rest = o resto da ronda
round-noted-line = Registado { $entry }: { $vessel } { $list }, { $when }.
round-noted-each = Registado { $entry }: { $vessel } { $list } cada, { $when }.
round-noted-before = Já registado, e fica assim: { $list }.
round-noted-none = Já estava tudo registado: entradas { $entries }.
round-not-noted = Não registado, por não ter uma só quantidade: { $list }.
round-strike-one = Alguma não entrou? Manda «riscar { $entry } não entrou».
round-pick = Quais entraram? { $from }–{ $to } de { $all }:
round-pick-noted = { $vessel }: registado, entrada { $entry }.
round-undone = Anulado: { $entries }. Fica no registo, riscado.
round-undone-none = Já não há nada disto para anular.
sheet-vessel = Vasilha
sheet-volume = Volume L
sheet-ph = pH
sheet-free = SO2 livre mg/L
sheet-free-short = livre
sheet-total = SO2 total mg/L
sheet-dose = SO2 a adicionar mg/L
sheet-weigh = Pesar g
sheet-measure = Medir mL
sheet-tablets = Pastilhas
sheet-additive = Aditivo
sheet-strength = Força %
sheet-after = Livre depois, se nada se combinar mg/L
sheet-note = Nota
sheet-done = Feito
sheet-in-all = Ao todo
sheet-nothing = nada a adicionar
sheet-limit = limite
sheet-title = Folha de pesagem
sheet-open = Sem quantidade:
sheet-caution = Luvas, óculos, ventilar. Não te debruces na cuba. Homogeneíza, mede amanhã.
sheet-fetch = Ao todo { $list }
sheet-additive-name = { additive }{ round-percent }
file-round = Uma ronda de { $count } linhas.
file-round-left = Não percebido, e deixado de fora: linha { $lines } do ficheiro.
file-round-ask = Calculo as doses, ou só registo as análises?
button-file-dose = Doses
button-file-note = Registar análises
button-file-vessels = Ficar com as vasilhas
round-gone = Aqui não há ronda guardada: manda-a outra vez.
round-target-stage = { at }quantos mg/L queres adicionar?
round-not-understood =
    { $about ->
        [none] Há uma linha que não percebi.
       *[other] «{ $about }» não percebi.
    }
round-effect-short = Em geral combina-se 1/3 a 1/2: mede amanhã.
round-effect = Em geral combina-se 1/3 a 1/2: mede amanhã. Contas de uma vasilha: manda só a linha dela.
choice-additive = { $value ->
        [potassium-metabisulfite] Metabissulfito de potássio
        [sodium-metabisulfite] Metabissulfito de sódio
        [potassium-metabisulfite-solution] Solução de metabissulfito de potássio
        [sodium-metabisulfite-solution] Solução de metabissulfito de sódio
        [potassium-bisulfite-solution] Solução de bissulfito de potássio
        [ammonium-bisulfite-solution] Solução de bissulfito de amónio
        [sulfur-dioxide-solution] Solução sulfurosa
        [sulfur-dioxide-gas] SO2 gás
       *[tablet] Pastilhas efervescentes
    }
choice-powder = { $value ->
        [potassium-metabisulfite] Metabissulfito de potássio em pó
       *[sodium-metabisulfite] Metabissulfito de sódio em pó
    }
choice-tablet_salt_g = { $value } g
choice-tablet_SO2_g = { $value } g
folded = Contas, outros avisos: carrega em Mais.
terminal-start = brimnote calcula adições de SO2. Escreve uma análise, por exemplo:
terminal-start-example =     T4 55 hl pH 3,58 livre 21
demo-start = Isto é uma demonstração: a adega do porto e a gente dela são inventadas, e nada do que fizeres fica guardado. Escreve:
demo-start-sheets = A folha do dia:  hoje        Um histórico:  histórico T4        O que medir a seguir:  pendentes
demo-start-reading = Depois uma análise tua, por exemplo:  T6 livre 21
demo-start-end = Com ? digo mais, Ctrl-D acaba.
terminal-start-more = Com ? digo mais, Ctrl-D acaba. Várias linhas coladas juntas são uma mensagem.

## Botões

button-working = Contas
button-safety = Segurança
button-target = Outro objetivo
button-more = Mais
button-not-finished = Não acabado
button-red = Tinto
button-choice-leave = Deixar assim
button-choice-to = Até { $free }

## O que a adega guarda

fault-unwritten = Não registado: não o consegui escrever. Manda outra vez daqui a um minuto, por favor.
vessel-unknown =
    { $vessel ->
        [none] Que vasilha? Por exemplo: T4?
       *[other] De { $vessel } ainda não sei nada. Manda uma análise, por exemplo: { $vessel } 55 hl pH 3,58 livre 21
    }
recalled = { $list } ({ $day })
recalled-additive = { additive } ({ $day })
recalled-allowance = margem { $percent } % (a tua definição)
choice-volume_L = { $value }
ask-volume-which =
    { $vessel }: { $known ->
        [none] { $said } é mais do que lá cabe. Está certo?
       *[other] escreveste { $said }, eu tinha { $known }. Qual é?
    }
read-kept =
    { $new ->
        [new] Guardado, não conhecia { $vessel }: { $list }.
       *[known] Lido e guardado: { $list }.
    }
noted-something-else =
    Registado { $entry }, sem contas: { $vessel } { $text }, { $when }.{ $voids ->
        [ph] { " " }O pH tem de ser medido outra vez.
       *[none] { "" }
    }
reading-kept = { at }{ $list }: guardado, { $when }.
button-added = Já pus
button-mine = Faço eu
button-order = Dar ordem
button-note = Registar
button-sampled-before = Antes
button-sampled-after = Depois
button-dose-anyway = Dose na mesma
button-white = Branco
button-take = Aceitar
import-ask = Fico com isto?
import-taken = Entrou: { $entries } entradas.
import-no-file = Não há ficheiro «{ $file }» que eu consiga ler.
export-written = Escrito: { $path }
export-none = Nesse tempo não se registou nada.
backup-written = Cópia escrita: { $path }
progress-working = Estou a tratar disso …
progress-done = Feito.
errand-failed = Não resultou, e nada foi escrito. Tenta outra vez, por favor; se voltar a falhar, diz a quem me mantém.
backup-elsewhere = As cópias de segurança faz quem me mantém. O registo desta adega leva-lo com: exportar tudo
button-undo = Anular { $entry }
button-done = Ordem { $entry } feita
button-remind = Lembra-me em 24 h
added-confirm = { at }{ $added } são { $list }. Registo?
added-confirm-bare = { at }{ $added } de SO2. Registo?
noted-addition =
    Registado { $entry }: { $vessel } { $list }, { $when }{ $added ->
        [none] .
       *[other] { " " }({ $added } de SO2).
    }{ $order ->
        [none] { "" }
       *[other] { " " }A ordem { $order } está feita.
    }
noted-bare = Registado { $entry }: { $vessel } { $added } de SO2, { $when }.
noted-measure = Mede o SO2 livre a partir de { $when }, antes de voltar a adicionar.
noted-measure-now = Mede o SO2 livre antes de voltar a adicionar.
already-noted = Já estava registado como { $entry }, { $when } ({ $who ->
        [you] tu
       *[other] { $who }
    }): { $vessel }.
odd-more-than-planned = É { $factor } vezes o que calculei para { $vessel }. Engano? Então anula.
odd-large = { $added } numa só adição é muito. Engano? Então anula.
odd-second = { $vessel } já tinha uma, { $when } (entrada { $entry }).
odd-empty = Pelo registo { $vessel } está sem vinho desde { $when }.
odd-from-empty = Pelo registo { $vessel } estava sem vinho desde { $when }.
odd-over-capacity = { $volume } é mais do que os { $capacity } que { $vessel } leva.
when-noon = Sem hora dita: fica ao meio-dia.
when-future =
    { at }«{ $text }» ainda está para vir{ $when ->
        [none] { "" }
       *[other] { " " }({ $when })
    }. Não registado. Manda outra vez com a hora a que foi.
when-no-such-day = { at }«{ $text }» não existe. Não registado. Manda outra vez com a hora a que foi.
vessel-new = Não conhecia { $vessel }.
volume-differs =
    { $vessel }: { $known ->
        [none] { $said } é mais do que lá cabe
       *[other] { $said } não são os { $known } que eu tinha
    }: não guardado. Se estiver certo, escreve: { $vessel } tem agora { $written }
ask-zone = Dou as horas em UTC. Em que fuso estás? Escreve: fuso horário Europe/Lisbon
dosed-who =
    { $who ->
        [you] tu
       *[other] { $who }
    }
dosed-which-first =
    { $vessel }: { $who ->
        [you] puseste
       *[other] { dosed-who } pôs
    } { $known ->
        [none] sulfuroso
       *[some] { $list }
    }, { $when }. A amostra é de antes? Sem dose até eu saber.
dosed-add-more =
    { $vessel }: { $who ->
        [you] puseste
       *[other] { dosed-who } pôs
    } { $known ->
        [none] sulfuroso
       *[some] { $list }
    }, { $when }. Mais na mesma?
dosed-sampled-before =
    { $vessel }: sem dose: { $who ->
        [you] puseste
       *[other] { dosed-who } pôs
    } { $known ->
        [none] sulfuroso
       *[some] { $list }
    }, { $when }, depois dessa amostra. Mede outra vez a partir de { $next }.
dosed-landed =
    { $vessel }: por agora mais não: { $who ->
        [you] puseste
       *[other] { dosed-who } pôs
    } { $known ->
        [none] sulfuroso
       *[some] { $list }
    }, { $when }, e o SO2 ainda se combina durante um dia. Mede outra vez a partir de { $next }.
dosed-in-round =
    { $vessel }: sem dose: { $who ->
        [you] puseste
       *[other] { dosed-who } pôs
    } { $known ->
        [none] sulfuroso
       *[some] { $list }
    }, { $when }. Manda-a sozinha.
landed =
    { $vessel } ficou em { $after }{ $planned ->
        [none] { "" }
       *[other] , previsto { $planned }
    }: de { $added } { $unit } combinou-se { $percent } %.
landed-loose = { $vessel } ficou em { $after }{ $planned ->
        [none] { "" }
       *[other] , previsto { $planned }
    }. Não se diz quanto se combinou: o livre de antes dos { $added } { $unit } foi lido em { $day }.
landed-fell = { $vessel } foi de { $before } para { $after } apesar de terem entrado { $added } { $unit }: combinou-se tudo, ou há engano. Mede outra vez.
landed-too-high = { $vessel } subiu { $rise } e só entraram { $added } { $unit }. Um número está mal: mede outra vez.
on-it =
    { $vessel }: { $who ->
        [you] estás tu
       *[other] está { $who }
    } a tratar, desde { $when }.
claimed = { $vessel } fica contigo até { $until }. Os outros veem-no.
claim-taken = { $vessel }: está { $who } a tratar, desde { $when }.
ordered = Ordem { $entry }: { $vessel } { $list }.
ordered-open = Aberta até alguém registar o que entrou.
order-how = Por exemplo: ordem T4 256 g
order-gone = A ordem { $entry } já não está aberta.
remind-set = Pergunto por { $vessel }: { $when }.
remind-late = Já é tarde para isso: mede { $vessel } agora.
undo-nothing = Não há nada teu para anular.
undo-late = A entrada { $entry } tem mais de 15 minutos. Escreve: riscar { $entry } e porquê
undo-not-yours = A entrada { $entry } é de { $who }. Escreve: riscar { $entry } e porquê
strike-none = Não há entrada { $entry }.
strike-again = A entrada { $entry } já foi riscada, pela { $by }.
strike-correction = A entrada { $entry } já é uma correção. Regista de novo o que estava certo.
strike-why = Porquê? Escreve: riscar { $entry } engano
struck = Riscado { $entry } ({ $list }). As duas ficam na folha.
struck-addition = Se chegou a entrar, regista-o outra vez.
noted-vessel =
    Registado { $entry }: { $list }.{ $voids ->
        [ph] { " " }O pH tem de ser medido outra vez.
        [volume] { " " }Diz o volume novo com a próxima análise.
        [blend] { " " }pH e SO2 têm de ser medidos outra vez.
       *[none] { "" }
    }
amount-unknown = sulfuroso
fact-capacity = leva { $volume }
fact-lot = { $lot }
fact-chemical-lot = lote { $lot }
fact-remark = «{ $remark }»
event-said =
    { $event ->
        [racked] { " " }trasfega
        [topped] { " " }atesto
        [acid] { " " }acidificação
        [moved] { $whole ->
            [part] { " " }passa em parte para { $to }
           *[all] { " " }passa para { $to }
        }
        [blended] { $whole ->
            [part] { " " }entra em parte no lote de { $to }
           *[all] { " " }entra no lote de { $to }
        }
        [emptied] { " " }sem vinho
        [lot] { " " }é { $lot }
        [later] , sem medição antes de { $until }
        [unwatched] , sem mais medições
        [watched] , medições outra vez
        [forgotten] { " " }fora da lista
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
    ordem { $vessel } { $known ->
        [none] { $added } mg/L
       *[some] { $list }
    }
entry-reading = { $vessel } { $list }
entry-vessel =
    { $vessel }{ event-said }{ $told ->
        [none] { "" }
       *[some] { " " }{ $list }
    }
entry-other = { $vessel } { $text } (sem contas)
entry-stock =
    { $event ->
        [received] recebido
        [used] gasto, em vinho nenhum:
        [discarded] deitado fora
       *[counted] contado
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }de { $supplier }
    }
entry-correction =
    risca { $entry }: { $reason ->
        [undo] anulado
        [sampled-before] amostra de antes da adição
        [edited] a mensagem foi alterada
       *[other] { $reason }
    }
round-volume-which = { $vessel }: { $said } não bate com o que lá estava: manda-a sozinha.
sheet-entry =
    { $entry } · { $when } · { $list } · { $who }{ $late ->
        [late] { " " }(registado { $noted })
       *[none] { "" }
    }{ $struck ->
        [none] { "" }
       *[other] { " " }— RISCADO pela { $struck }
    }
day-head = { $day } ({ $zone }):
day-empty = Nada registado: { $day }.
day-more = As anteriores desse dia estão na exportação.
day-none-such = Esse dia não existe.
history-head = { $vessel }, o mais novo no fim:
history-empty =
    { $vessel ->
        [none] Que vasilha? Por exemplo: histórico T4
       *[other] De { $vessel } ainda não há nada registado.
    }
history-more = Os mais antigos: exportar { $vessel }
list-more = … e mais { $count }.
vessels-none = Ainda não conheço vasilha nenhuma. Manda uma análise, por exemplo: T4 55 hl pH 3,58 livre 21
vessels-head =
    { $number ->
        [one] Uma vasilha, { $due } a medir agora:
       *[many] { $count } vasilhas, { $due } a medir agora:
    }
vessels-line =
    { $vessel }{ $lot ->
        [none] { "" }
       *[other] { " " }{ $lot }
    }: { $free ->
        [none] sem análise
       *[other] livre { $free } ({ $day })
    }{ $next ->
        [empty] , sem vinho
        [now] , MEDIR AGORA
        [later] , a seguir { $check }
       *[none] { "" }
    }
vessel-head = { $vessel }: { $list }
vessel-bare = { $vessel }
vessel-empty = { $vessel }: sem vinho desde { $day }
vessel-readings = Última: { $list }
vessel-void =
    { $field ->
        [ph] pH
       *[other] Volume
    } por saber desde { $day }: { $event ->
        [malolactic] malolática
        [fermentation] nessa altura era mosto
        [blended] lote
        [acid] acidificação
        [racked] trasfega
        [topped] atesto
       *[moved] passagem
    }.
vessel-addition =
    { $entry } · { $when } · { $list }{ $added ->
        [none] { "" }
       *[other] , { $added } mg/L
    } · { $who }{ $landed ->
        [not-yet] { " " }(por medir desde então)
       *[landed] { "" }
    }
vessel-bound =
    { $number ->
        [one] Combinado: { $share } % de uma adição.
       *[many] Combinado: { $share } % em média de { $count } adições ({ $least }–{ $most } %).
    }
vessel-order = Ordem aberta { $entry }: { $list } ({ $who }, { $when }).
vessel-check =
    Próxima medição { $when }{ $why ->
        [landing] { " " }(depois da adição)
        [forecast] { " " }(pelas análises pode já não chegar)
       *[other] { "" }
    }.
vessel-check-due =
    Por medir desde { $when }{ $why ->
        [landing] { " " }(depois da adição)
        [forecast] { " " }(pelas análises pode já não chegar)
       *[other] { "" }
    }.
vessel-unwatched = Sem medições. Outra vez: vigiar { $vessel }
due-none = Nada a medir.
due-head =
    { $number ->
        [one] Uma vasilha a medir:
       *[many] { $count } vasilhas a medir, a mais urgente primeiro:
    }
due-stage =
    { $stage ->
        [none] { "" }
       *[other] { " " }(ainda não acabou: sem dose)
    }
due-overdue =
    { $overdue ->
        [no] { "" }
       *[yes] , { $days } d de atraso
    }
due-landing = { $vessel }: adição de { $added }, por medir desde então{ due-overdue }{ due-stage }
due-usual =
    { $vessel }: { $free ->
        [none] sem análise
       *[other] livre { $free } em { $day }
    }{ due-overdue }{ due-stage }
due-often =
    { $vessel }: { $free ->
        [none] sem análise
       *[other] livre { $free } em { $day }
    }{ $low ->
        [low] , baixo
       *[none] { "" }
    }{ due-overdue }{ due-stage }
due-forecast =
    { $vessel }: { $free ->
        [none] sem análise
       *[other] livre { $free } em { $day }
    }, já pode não chegar{ due-overdue }{ due-stage }
daily-head = Bom dia.
remind = Há um dia: { $list }. Mede o SO2 livre agora.
open-none = Não há ordens abertas.
open-head =
    { $number ->
        [one] Uma ordem aberta:
       *[many] { $count } ordens abertas:
    }
open-line = { $entry } · { $vessel } { $list } · { $who }, { $when }
language-changed = Escreveste em português: a partir de agora respondo em português.
language-set = Respondo em português.
button-stay-language = Continuar em português
language-not-yet = Leio essa língua, mas ainda não respondo nela.
settings-head = Definições desta adega, e como mudar cada uma:
setting-set = Feito. { $list }
setting-units =
    Unidades: { $units ->
        [us] galões americanos
        [imperial] galões imperiais
       *[metric] litros
    } (trabalhamos em litros)
setting-usual-additive =
    Habitual: { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    } (o nosso habitual é meta 57%)
setting-target = Objetivos, molecular: tinto { $red }, branco { $white }, doce { $sweet } (objetivo 0,6 para tintos)
setting-allowance =
    { $percent ->
        [none] Sem margem de combinação (margem 30%)
       *[other] Margem de combinação: { $percent } % nas doses com objetivo (sem margem)
    }
setting-yield =
    { $yield ->
        [none] Sem rendimento habitual da uva (rendimento 65)
       *[other] Rendimento: { $yield } L de mosto de 100 kg de uva (sem rendimento)
    }
setting-basis =
    Base: { $basis ->
        [oiv] OIV
       *[other] pK 1,81
    } (base OIV, base 1,81)
setting-law = Lei: { law-of } (lei UE, lei Brasil)
setting-zone =
    Fuso horário: { $zone ->
        [none] por dizer, logo UTC
       *[other] { $zone }
    } (fuso horário Europe/Lisbon)
setting-daily =
    Lista diária: { $daily ->
        [off] desligada (lista diária às 7:30)
       *[other] { $daily } (sem lista diária)
    }
setting-quiet = Silêncio: { $from } a { $to } (silêncio 20 a 6)
setting-ph-days = Um pH vale { $days } dias (o pH vale 14 dias)
setting-check-days = Medir a cada { $usual } dias; barricas e o que está baixo a cada { $often } (medir a cada 30 dias, medir barricas a cada 14 dias)
setting-language = Língua: português (língua es)
setting-short-replies =
    Respostas: { $short ->
        [short] curtas (respostas longas)
       *[long] inteiras (respostas curtas)
    }
setting-wrong =
    Não pode ser: «{ $text }». { $of ->
        [units] Por exemplo: trabalhamos em litros
        [usual-additive] Por exemplo: o nosso habitual é meta 57%
        [target] Por exemplo: objetivo 0,6 para tintos
        [yield] Por exemplo: rendimento 65
        [quiet] Por exemplo: silêncio 20 a 6
        [daily] Por exemplo: lista diária às 7:30
        [zone] Por exemplo: fuso horário Europe/Lisbon
        [law] Daí não há limite no ficheiro. Há: OIV, UE, Reino Unido, EUA, Canadá, Austrália, Nova Zelândia, África do Sul, Argentina, Chile, Brasil, Japão, Coreia, China, Codex, Suíça, Geórgia, Hong Kong, EAEU. Por exemplo: lei UE
        [allowance] Por exemplo: margem 30%
        [basis] Por exemplo: base OIV
        [ph-days] Por exemplo: o pH vale 14 dias
        [check-days] Por exemplo: medir a cada 30 dias
       *[other] Por exemplo: respostas curtas
    }
forgotten-person = O teu nome sai das próximas folhas. O que registaste fica, como pessoa { $number }.

## Pessoas, adegas e grupos

role =
    { $role ->
        [keeper] responsável
        [hand] adegueiro
       *[guest] convidado
    }
cellar-called =
    { $cellar ->
        [none] { $keeper ->
            [none] esta adega
           *[other] adega de { $keeper }
        }
       *[other] { $cellar }
    }
keeper-called = { $name }
not-allowed =
    { $role ->
        [keeper] Isso é para um responsável desta adega
       *[hand] Isso é para adegueiros e responsáveis desta adega
    }{ $keepers ->
        [none] .
       *[some] : pede a { $list }.
    }
guest-not-kept = Aqui és convidado: nada disto fica registado.
not-of-cellar = Já não és desta adega. Um responsável pode convidar-te: depois manda-me o código.
invite-how = Com que papel? Escreve: convidar adegueiro, ou: convidar convidado, ou: convidar responsável
invite-not-here = Aqui não posso fazer códigos.
invited = Código para um { role }, até { $day }: { $code }
invited-how =
    { $link ->
        [none] Quem primeiro me mandar «entrar» e o código, entra.
       *[other] Quem primeiro abrir isto, entra: { $link } (ou manda-me «entrar» e o código)
    }
joined = Estás em { $list }, como { role }.
joined-before = Já estavas em { $list }, como { role }. O código continua bom.
joined-how =
    { $role ->
        [guest] Pergunta por qualquer vasilha, por exemplo: T4?
       *[other] Manda uma análise, por exemplo: T4 55 hl pH 3,58 livre 21
    }
join-unknown = Esse código não vale, ou já acabou. Pede um novo.
join-used = Esse código já foi usado. Pede um novo.
people-head = Pessoas desta adega:
people-line =
    { $name }: { role }{ $me ->
        [me] { " " }(tu)
       *[other] { "" }
    }
people-how = Para mudar: convidar adegueiro, Rui é convidado, remover Rui
role-changed =
    { $role ->
        [none] { $name } já não é desta adega.
       *[other] { $name } agora é { role }.
    }
role-same = { $name } já é { role }.
last-keeper = { $name } é o último responsável. Nomeia outro primeiro, por exemplo: Rui é responsável
person-unknown = Não conheço «{ $text }» aqui. Há: { $list }.
person-which = Que «{ $text }»? { $list }. Escreve com o número, por exemplo: remover pessoa 3
person-called =
    { $name ->
        [none] pessoa { $number }
       *[other] { $name }
    }
at-cellar = { $list }:
at-now = Agora em { $list }.
at-already = Estamos em { $list }.
at-here = Estamos em { $list }.
at-others = Outras: { $list }. Para mudar: em, e o nome
at-only = Aqui não há outra.
at-unknown = Não conheço aqui adega «{ $text }». Há: { $list }.
at-which = Que «{ $text }»? { $list }.
cellar-left = Saíste de { $list }. O que registaste fica no registo dela.
cellar-named = Esta adega chama-se agora { $name }.
reads-along =
    { $on ->
        [on] Respondo aqui a análises também sem me chamarem, quando a vasilha e os números são claros.
       *[off] Aqui só respondo se me chamarem.
    }
group-joined = Olá. Calculo adições de sulfuroso e guardo o registo de uma adega. Chama-me pelo nome, ou responde-me.
group-how = Para começar: T4 55 hl pH 3,58 livre 21. Mais: ajuda
corrected = Corrigido.
edited-noted = A tua alteração não muda nada: a entrada { $entry } ({ $vessel }) mantém-se. Se está mal: riscar { $entry } e porquê
edited-added = A tua alteração não muda nada: { $vessel } teve uma adição entretanto (entrada { $entry }). Manda os números certos numa mensagem nova.
edited-late = A tua alteração não muda nada: a mensagem tem mais de 15 minutos. Manda-a como nova.
edited-anew = Isso não aceito numa alteração. Manda-o numa mensagem nova.
added-it-none =
    { $vessel ->
        [none] O que entrou, e onde? Por exemplo: adicionados 82 g de meta T4
       *[other] O que entrou em { $vessel }? Por exemplo: adicionados 82 g de meta { $vessel }
    }
picture-none =
    { $vessel ->
        [none] De que vasilha? Por exemplo: gráfico T4
       *[other] De { $vessel } ainda não sei nada, por isso não há o que desenhar.
    }
stranger = Este bot é só para convidados. Se tens um código, manda: entrar e o código
too-fast = Demasiadas mensagens de uma vez: deixo passar as tuas durante um minuto. Depois manda outra vez aquilo a que não respondi.

command-today = O que se registou hoje
command-due = Vasilhas a medir
command-vessels = Todas as vasilhas
command-open = Ordens por fazer
command-settings = O que é habitual aqui, e como mudar
command-help = Como se usa

## Ficheiros: exportar e importar

export-entry = N.º
export-kind = Tipo
export-done = Feito (hora local)
export-noted = Registado (hora local)
export-late = Atrasado
export-is-late = atrasado
export-person = Pessoa
export-unnamed = pessoa { $number }
export-vessels = Vasilha
export-to = Para
export-event = O que aconteceu
export-wine-lot = Lote do vinho
export-wine = Vinho
export-additive = Aditivo
export-strength_percent = Força %
export-chemical_lot = Lote do aditivo
export-supplier = Fornecedor
export-mass_g = Quantidade g
export-additive_volume_mL = Quantidade mL
export-tablets = Pastilhas
export-SO2_g = SO2 adicionado g
export-added_mg_L = SO2 adicionado mg/L
export-planned_mg_L = SO2 previsto mg/L
export-planned_free_mg_L = SO2 livre pretendido mg/L
export-volume_L = Volume L
export-stock-left = Resta em stock (g, mL, pastilhas)
export-us-gallons = Volume gal (EUA)
export-ph = pH
export-free_mg_L = SO2 livre mg/L
export-total_mg_L = SO2 total mg/L
export-temperature_C = Temperatura °C
export-alcohol_percent = Álcool % vol
export-sugar_g_L = Açúcar g/L
export-over_rule = Acima do limite de
export-order = Cumpre a ordem n.º
export-remark = Observação
export-corrects = Anula o n.º
export-reason = Motivo
export-struck_by = Riscado pelo n.º
export-struck-reason = Riscado porque
export-calculated = Calculado
export-is-calculated = calculado
export-is-not-calculated = sem contas
export-at = Feito (com fuso)
export-noted_at = Registado (com fuso)
export-by = Pessoa n.º
export-name = Nome
export-style = Cor
export-category = Categoria
export-product = Produto
export-organic = Biológico
export-stage = Fase
export-designated_mg_L = Designado, limite mg/L
export-uplift = Ano declarado
export-quality = Espumante de qualidade
export-pdo = Denominação protegida
export-bulk = Granel para exportação
export-density_kg_L = Densidade kg/L
export-reserve_mg_L = Guardado para o engarrafamento mg/L
export-lot = Lote dito
export-capacity_L = Capacidade L
export-until = Até
export-strength_of = Força de
export-tablet_SO2_g = SO2 por pastilha g
export-tablet_salt_g = Sal por pastilha g
export-key = Chave

import-vessels = Vasilhas no ficheiro: { $vessels }.
import-log = Entradas no ficheiro: { $entries }. Vasilhas: { $vessels }. Pessoas: { $people }.
import-not-understood = Não percebido e deixado de fora: { $count ->
        [one] linha { $lines }
       *[other] linhas { $lines }
    }.
import-not-taken = Não aproveitado: { $list }.
import-not-taken-name = { $name ->
        [ph] pH
        [free_mg_L] SO2 livre
        [total_mg_L] SO2 total
        [temperature_C] temperatura
       *[other] { $name }
    }
import-unit = Volumes sem unidade são lidos em { $unit ->
        [L] litros
        [hL] hectolitros
        [mL] mililitros
        [m3] metros cúbicos
        [galUS] galões americanos
       *[galUK] galões imperiais
    }.
import-problem = { $code ->
        [empty] O ficheiro está vazio.
        [too-large] O ficheiro é demasiado grande: no máximo 512 kB, a nossa exportação 8 MB.
        [too-many-rows] O ficheiro tem linhas a mais: no máximo 20 000.
        [too-many-columns] O ficheiro tem colunas a mais: no máximo 200.
        [cell-too-long] Há uma célula demasiado comprida para o ser.
        [not-a-table] Não é uma tabela que eu consiga ler. Manda um CSV ou XLSX, ou um texto com uma vasilha por linha: T4; 5200 L; tinto
        [old-spreadsheet] Essa folha é de tipo antigo, ou tem palavra-passe. Guarda-a como XLSX ou CSV, sem palavra-passe.
        [broken] O ficheiro está estragado, ou há aspas que nunca fecham. Guarda-o outra vez como XLSX ou CSV.
        [too-heavy] O ficheiro leva demasiado tempo ou memória a ler. Divide-o, ou manda-o como CSV.
        [columns-missing] Parece a minha exportação, mas faltam colunas: { $about }.
        [columns-unknown] Parece a minha exportação, mas não conheço estas colunas, ou vêm duas vezes: { $about }.
        [unclear-numbers] Não sei se os números têm vírgula ou ponto decimal: guarda o ficheiro só com um deles, sem sinal nos milhares.
        [not-understood] Parece a minha exportação, mas estas linhas não são entradas: { $lines }.
        [doubled] Um número ou uma chave destas linhas vem duas vezes no ficheiro: { $lines }.
        [refers-outside] Estas linhas falam de entradas que não estão no ficheiro: { $lines }. Exporta tudo e importa isso.
        [already-noted] Estas linhas já cá estão registadas: { $lines }.
       *[no-vessels] Não encontrei lá vasilha nenhuma. Uma linha é assim: T4; 5200 L; tinto
    }
import-nothing-taken = Não ficou nada.

## Gráficos

picture-unit = SO2 em { $unit }
picture-free = livre { $free } ({ $day })
picture-total = total { $total } ({ $day })
picture-bound = combinado: o que vai de um ao outro
picture-odd = livre acima do total
picture-needed =
    { $ph ->
        [no-ph] livre preciso (pH agora por saber)
        [no-target] livre preciso (agora sem objetivo habitual)
       *[other] pede { $needed } de livre a pH { $ph }
    }
picture-limit = limite do total { $limit }
picture-added = adicionado
picture-added-thinned = adicionado (nem todos os números cabem)
picture-added-unknown = adicionado, quantidade por saber
picture-blended = loteado

picture-head = { $vessel } desde { $day }. Análises: { $readings }, adições: { $additions }.
picture-last = { $list }.
picture-last-free = livre { $value } { $unit } ({ $day })
picture-last-total = total { $value } { $unit } ({ $day })
picture-last-bound = combinado { $value } { $unit } ({ $day })
picture-needs = pH { $ph } ({ $day }): { $molecular } molecular pede { $needed } de livre.
picture-needs-nothing =
    { $why ->
        [no-ph] pH agora por saber, logo também o livre que pede.
       *[no-target] Agora não há objetivo habitual para ele.
    }
picture-limit-of-total = Limite do total: { $limit }.
picture-additions =
    { $earlier ->
        [none] Adicionado, { $unit }: { $list }.
       *[other] Adicionado, { $unit }: { $list }; mais { $earlier } antes.
    }
picture-addition =
    { $added ->
        [none] por saber ({ $day })
       *[other] { $added } ({ $day })
    }
picture-unmeasured = Livre por medir desde a adição de { $day }.
picture-came-from = Veio de { $vessels } em { $day }: os números anteriores estão lá.
picture-was-blended = Loteado em { $day }: os números anteriores são de outro vinho.
picture-empty = Sem vinho desde { $day }.
picture-is-odd = Livre acima do total ({ $days }): um dos dois está mal, mede outra vez.
picture-nothing = Sem gráfico de { $vessel }: do vinho que lá está ainda não se mediu SO2.

# Perguntas do dia a dia: a resposta, um número com a fonte, e o que mandar a seguir.
question-small-or-large = Menos e maiores. Uma adição pequena pode combinar-se toda e não deixar livre nenhum.
question-small-or-large-why = De uma adição ficam livres 35 a 67 %; os números publicados não concordam, por isso mede no dia seguinte.
question-small-or-large-next = Para o teu vinho: T4 55 hl pH 3,58 livre 21
question-how-often = Cubas cerca de uma vez por mês, barricas de duas em duas semanas, e um dia depois de cada adição (prática comum, sem fonte).
question-how-often-why = Mais cedo com calor, vasilha a meio ou pouco SO2 livre.
question-how-often-next = O que há aqui a medir: pendentes
question-which-figure = O molecular é que protege; sai do livre e do pH. A lei conta o total: livre e combinado juntos.
question-which-figure-why = O habitual é 0,6 a 0,8 mg/L molecular (Understanding Wine Chemistry, 2016).
question-which-figure-next = O teu: pH 3,5 livre 20
question-which-yield = 57,6 %: é o SO2 do metabissulfito de potássio puro pela fórmula, e assim conto.
question-which-yield-why = 50 % é convenção do setor, com uma reserva dentro: para o mesmo leva 15 % mais pó.
question-which-yield-next = O rótulo diz outra coisa? Escreve-o: meta 57%, ou meta 96%
question-tablets-or-powder = O mesmo SO2, se o tamanho estiver certo. O pó doseia mais fino, mas pede balança.
question-tablets-or-powder-why = As efervescentes vendem-se por gramas de SO2 (2 ou 5 g), as Campden por gramas de sal (0,44 ou 0,55 g): prática comum, sem fonte.
question-tablets-or-powder-next = O que dão: 2 pastilhas de 5 g em 225 L
question-old-powder = Aberto e com humidade perde força, cerca de um décimo por ano (prática comum, sem fonte). Empedrado: para vinho não.
question-old-powder-why = Nunca cheires o saco. Com pó velho mede no dia seguinte: pode ter entrado menos do que pesaste.
question-old-powder-next = Guarda-lhe a data: recebido 1 kg de meta lote 12
question-wait-before-yeast = 12 a 24 horas depois da adição (prática comum, sem fonte).
question-wait-before-yeast-why = De 50 mg/L no mosto cerca de 16 ficam mais tarde como total (texto alemão do setor, 2012).
question-wait-before-yeast-next = A dose: mosto 20 hl adicionar 40
question-after-malolactic = Quando a análise já não dá ácido málico, antes não.
question-after-malolactic-why = As bactérias precisam de livre abaixo de 5–10 e total abaixo de 30–40 mg/L (AWRI, para pH 3,3 a 3,5).
question-after-malolactic-next = Depois: T4 malolática feita, e a análise
question-ppm-and-mg-L = Em vinho 1 ppm conta como 1 mg/L, e 1 g/hL são 10 mg/L.
question-ppm-and-mg-L-why = De pó é menos: 10 g/hL de metabissulfito de potássio dão 57,6 mg/L de SO2 (pela fórmula).
question-ppm-and-mg-L-next = Experimenta: 10 g de meta em 1 hl
question-teaspoons = Nunca às colheres. Uma colher de chá rasa de pó pesa uns 5 a 6 g (prática comum, sem fonte).
question-teaspoons-why = Uma balança que mostre 0,1 g, ou uma solução a 10 % e uma seringa: é disso que os lotes pequenos precisam.
question-teaspoons-next = A solução: preparar 1 L de meta a 10%
question-fell-short = De cada adição combina-se uma parte, em geral um terço a metade, mais em vinhos novos, doces ou com podridão. O ar também leva.
question-fell-short-why = Ou: mal homogeneizado, medido cedo de mais, pó velho, outro volume. 1 mg/L de oxigénio pode gastar 4 mg/L de SO2 (pela fórmula).
question-fell-short-next = Mede, depois: T4 livre 24. O que fez: T4?
question-strip-reads-otherwise = Fia-te no laboratório. Tiras e ampolas são um primeiro olhar; doseia por uma titulação de aspiração ou de iodo.
question-strip-reads-otherwise-why = Métodos acidificados dão demasiado nos tintos, até 66 % (Virgínia, 2022). O iodo conta também o ácido ascórbico.
question-strip-reads-otherwise-next = A tua titulação: AO 20 mL amostra, 1,9 mL 0,01 N
question-stop-fermentation = Não. O sulfuroso não para uma fermentação em curso, e garrafas com açúcar e leveduras podem rebentar.
question-stop-fermentation-why = Frio e filtração esterilizante, por quem saiba; depois um doce guarda-se perto de 1,5 mg/L molecular (uma tabela publicada).
question-stop-fermentation-next = Quando estiver parado: T4 10 hl doce pH 3,3 livre 10
question-sorbate = Sorbato nunca sozinho: trava leveduras, não bactérias, e estas fazem dele um cheiro a gerânio.
question-sorbate-why = Ao lado dele o vinho mantém todo o SO2 livre para 0,8 mg/L molecular (prática comum, sem fonte).
question-sorbate-next = Esse SO2: T4 10 hl pH 3,4 livre 12
question-allergy = Pergunta a um médico: aqui ninguém pode dizer o que é seguro para uma pessoa. Com asma o sulfito pode ser perigoso.
question-allergy-why = O rótulo declara-o a partir de 10 ppm de total (EUA, 27 CFR 4.32(e)), acima de 10 mg/L na UE (1169/2011). As dores de cabeça têm muitas causas.
question-allergy-next = O que um vinho tem: T4?
question-law = Depende do mercado, da cor, do açúcar. Código internacional: tinto 150, branco e rosé 200 mg/L de total até 4 g/L de açúcar, acima disso 300.
question-law-why = (OIV-MA-C1-01.) Não é conselho jurídico: confirma para o teu mercado.
question-law-next = O do teu mercado: limite tinto açúcar 3 UE
question-gas = Só gente formada e com licença para isso onde estás; máscara, ventilação, uma segunda pessoa cá fora.
question-gas-why = 0,5 ppm num turno é o limite da UE (2017/164); 100 ppm põem logo a vida em perigo (NIOSH).
question-gas-next = Sem gás: T4 55 hl pH 3,58 livre 21 meta
question-potassium-or-sodium = Potássio para o vinho. O de sódio é para equipamento: a OIV não o nomeia para vinho.
question-potassium-or-sodium-why = Não pesam o mesmo: 57,6 % de SO2 no sal de potássio, 67,4 % no de sódio (pela fórmula).
question-potassium-or-sodium-next = Diz o que tens à mão: T4 55 hl pH 3,58 livre 21 meta
question-when-to-measure = Um dia depois de homogeneizado, melhor dois (prática comum, sem fonte).
question-when-to-measure-why = Antes disso uma parte ainda vai a caminho de se combinar: dá a mais.
question-when-to-measure-next = Depois: T4 livre 24
question-how-to-mix = Dissolve-o antes em água fria ou num pouco de vinho, cerca de 50 g por litro (revista do setor, 2009). Deita-o a homogeneizar.
question-how-to-mix-why = Luvas, óculos, ar. Nunca com ácido na mesma vasilha; vinho cheio de CO2 transborda em espuma.
question-how-to-mix-next = Uma solução: preparar 5 L de meta a 5%
question-pH-matters = Quanto mais baixo o pH, mais do SO2 livre é molecular, e é esse que protege.
question-pH-matters-why = Para 0,8 mg/L molecular: 26 de livre a pH 3,3, 79 a pH 3,8 (Universidade da Califórnia, 1982).
question-pH-matters-next = O teu: pH 3,5 livre 20
question-which-target = Branco e rosé 0,8 mg/L molecular, tinto 0,6, doce 1,5, se não puseres outro.
question-which-target-why = Publicado: 0,6 a 0,8 para estabilidade (Understanding Wine Chemistry, 2016), tinto ao engarrafar 0,4 a 0,6 (segundo a Califórnia, 1982).
question-which-target-next = Para o mudar: objetivo 0,5 para tintos
question-stock-keeps = Dias, não semanas: fá-la na altura, fecha-a, põe-lhe a data (prática comum, sem fonte).
question-stock-keeps-why = A OIV chama instáveis às soluções de SO2 e de bissulfito.
question-stock-keeps-next = Nova: preparar 1 L de meta a 10%
question-too-much = Não ponhas mais nada. Tempo, ar e trasfegas baixam o SO2 livre; lotar baixa o livre e o total.
question-too-much-why = A partir de uns 2 mg/L molecular nota-se no nariz (Understanding Wine Chemistry, 2016). Água oxigenada: só quem saiba, onde a lei deixa.
question-too-much-next = Como está: T4?
question-no-sulfite = Podes, e o vinho fica então à conta de frio, vasilhas limpas e cheias, pH baixo e venda rápida.
question-no-sulfite-why = As leveduras fazem algum, em geral menos de 30 mg/L: «sem sulfitos adicionados» não é «sem sulfitos».
question-no-sulfite-next = O que tem: T4 pH 3,5 livre 5
question-bottling = Mede uns dias antes; a última adição entra antes de a linha arrancar, homogeneizada e medida.
question-bottling-why = Cada mg/L de oxigénio que apanhar pode levar até 4 mg/L de SO2 livre (pela fórmula).
question-bottling-next = Com o oxigénio: engarrafamento T4 40 hl pH 3,4 livre 22 oxigénio 2 mg/L

## O armazém dos produtos
stock-tablets =
    { $unit ->
        [tablet] { " " }pastilha
        [tablets] { " " }pastilhas
       *[none] { "" }
    }
stock-of =
    { additive }{ $strength ->
        [none] { "" }
       *[other] { " " }{ $strength } %
    }{ $size ->
        [none] { "" }
       *[other] , { $size } g cada
    }
stock-none = Ainda não há nada registado no stock. Diz o que há, ou o que chegou: recebidos 25 kg de meta lote 4471 de Fornecimentos Norte
stock-none-of = De { additive } não há nada registado no stock. Diz o que chegou (recebidos …), ou conta-o (stock meta 3,2 kg).
stock-shelf =
    { stock-of }: { $amount }{ stock-tablets }{ $counted ->
        [none] .
       *[other] { " " }(contado { $counted }).
    }
stock-lot =
    { "  " }{ $lot ->
        [none] sem lote
       *[other] lote { $lot }
    }: { $amount }{ stock-tablets }, entrou { $day }{ $supplier ->
        [none] { "" }
       *[other] { " " }de { $supplier }
    }
stock-negative = ⚠ { stock-of }: o registo dá { $amount }{ stock-tablets }: chegou alguma coisa que não está registada. Regista-a, ou conta: stock meta 3,2 kg
stock-low =
    ⚠ Está a acabar: { $amount }{ stock-tablets } { $additive ->
        [tablet] { stock-of }
       *[other] de { stock-of }
    } em stock.
stock-left =
    Agora em stock: { $amount }{ stock-tablets } { $additive ->
        [tablet] { stock-of }
       *[other] de { stock-of }
    }.
stock-short =
    ⚠ Em stock pelo registo: { $amount }{ stock-tablets } { $additive ->
        [tablet] { stock-of }
       *[other] de { stock-of }
    }, menos do que isto leva.
stock-old = ⚠ Está cá há mais de um ano: um saco aberto perde força (prática comum, sem fonte). Depois dele mede o SO2 livre.
stock-oldest-lot =
    { $lot ->
        [none] Tirado do mais antigo de vários; senão diz o lote: adicionados …, lote { $other }
       *[other] Tirado do lote { $lot }, o mais antigo de vários; senão diz: adicionados …, lote { $other }
    }
stock-lot-unknown = Pelo registo o lote { $lot } não está em stock: tirado do mais antigo.
stock-noted =
    Registado { $entry }: { $event ->
        [received] recebido
        [used] gasto
        [discarded] deitado fora
       *[counted] contado
    } { $list }{ $supplier ->
        [none] { "" }
       *[other] { " " }de { $supplier }
    }{ $purpose ->
        [none] { "" }
       *[other] { " " }({ $purpose })
    }, { $when }.
stock-corrected =
    O registo dava { $was }: agora { $amount }{ stock-tablets } a { $way ->
        [more] mais
       *[less] menos
    }.
stock-not-kept = Dele ainda não há nada em stock, por isso não desconto nada. Conta-o: stock meta 3,2 kg
stock-lacks =
    { $what ->
        [additive] Que aditivo? Escreve: recebidos 25 kg de meta
        [strength] Que força tem: { additive }? Escreve: recebidos 10 L de solução sulfurosa a 6%
        [size] Pastilhas de quantos gramas? Escreve: recebidas 50 pastilhas de 5 g
        [volume] Isso mede-se ao volume: { additive }. Escreve: recebidos 10 L de solução sulfurosa a 6%
        [one] Um aditivo por mensagem. Escreve: recebidos 25 kg de meta
       *[amount] Quanto, e em que unidade: { additive }? Escreve: { $event ->
            [counted] stock meta 3,2 kg
            [used] usados 200 g de meta para enxaguar
            [discarded] deitado fora 1 kg de meta
           *[received] recebidos 25 kg de meta
        }
    }

# O laboratório: o que dá uma titulação

titration-result = { $vessel ->
    [none] SO2 { $of ->
        [total] total
       *[other] livre
    } { $result } { $unit }
   *[other] { $vessel }: SO2 { $of ->
        [total] total
       *[other] livre
    } { $result } { $unit }
}, por { $method ->
    [aeration] aspiração e oxidação
   *[other] iodo
}.
titration-too-much = Mais do que um vinho tem: vê a amostra, a bureta e a força do titulante. Não fica guardado.
titration-molar = Iodo { $molar } M é { $normal } N: uma mole gasta o dobro.
titration-ascorbic-asked = O iodo conta também o ácido ascórbico: { $amount } mg/L dele dão +{ $counts } { $unit }. Se houver, junta «ascórbico { $amount }».
titration-precision = Dois resultados do mesmo vinho podem diferir { $again } num laboratório, { $other } entre dois (publicado).
titration-red-high = É tinto: métodos acidificados dão SO2 livre a mais, num estudo até 66 %. Não desconto nada; usa sempre o mesmo método.
titration-name-vessel = Para o guardar como análise, põe a vasilha à frente: T4 …
titration-read = Lido: { $list }.
titration-sample = amostra { $volume } mL
titration-titrant = titulante { $volume } mL
titration-blank = branco { $volume } mL
titration-strength = { $unit ->
    [none] { $strength }
   *[other] { $strength } { $unit }
}
titration-iodate = { $mass } mg de iodato em { $volume } mL
titration-ascorbic = ácido ascórbico { $amount } mg/L
titration-free-assumed = Tomado como SO2 livre; escreve «total» se a amostra foi preparada para o total.
titration-no-blank = Não descontei branco; junta «branco 0,1» se fizeste um.
titration-asks = { $missing ->
    [method] Titulado com soda (AO) ou com iodo? Escreve-o: AO 20 mL amostra, 1,9 mL 0,01 N
    [sample] Quantos mL de vinho? Manda tudo: { $method ->
        [iodine] iodo 25 mL amostra, 1,4 mL 0,02 N
       *[other] AO 20 mL amostra, 1,9 mL 0,01 N
    }
    [titrant] Quantos mL da bureta? Manda tudo: { $method ->
        [iodine] iodo 25 mL amostra, 1,4 mL 0,02 N
       *[other] AO 20 mL amostra, 1,9 mL 0,01 N
    }
    [unit] O iodo está em N ou em M? Um é metade do outro. Escreve N ou M atrás da força.
   *[strength] Que força tem o titulante? Manda tudo, com N ou M: { $method ->
        [iodine] iodo 25 mL amostra, 1,4 mL 0,02 N
       *[other] AO 20 mL amostra, 1,9 mL 0,01 N
    }
}
titration-either = { $strength } N dá { $normal } { $unit }, { $strength } M dá { $molar } { $unit }.
button-keep-of = Guardar { $vessel }{ $of ->
    [total] {" "}total
   *[free] {""}
}
button-keep-result = Guardar

# O laboratório: quanto pode errar uma dose, tabelas, as duas bases

range-dose = { $vessel ->
    [none] Em
   *[other] { $vessel }: em
} intervalo (95 %): { $amount ->
    [none] { $low }–{ $high } { $unit } de SO2
   *[other] { $amount }{ $count ->
        [several] {" "}ao todo
       *[one] {""}
    }, ou seja { $low }–{ $high } { $unit } de SO2
}.
range-sure = Depois da dose tens garantidos { $molecular } { $unit } molecular, se se combinar o que contei.
range-sure-unbound = Se nada se combinar tens garantidos { $molecular } { $unit } molecular depois da dose.
range-sure-low = Abaixo de 10 { $unit } de livre pode combinar-se uma dose inteira: garantidos são só { $molecular } { $unit } molecular. Mede ao fim de um dia.
range-rests = Assenta em pH ± { $ph } e livre ± { $free } { $unit }{ $said ->
    [both] .
    [one] {" "}(o que não disseste: prática comum, sem fonte).
   *[none] {" "}(prática comum, sem fonte). Com os teus: pH 3,58±0,03 livre 21±2
}
range-limit = Na ponta de cima o total pode passar o limite.
range-nothing = Para um intervalo é preciso primeiro uma dose. Manda uma análise, por exemplo: T4 55 hl pH 3,58±0,03 livre 21
table-head = SO2 livre ({ $unit }) para molecular { $targets }, { $basis ->
    [oiv] pela OIV a 12 % vol e 20 °C (pK { $pK })
   *[other] pK { $pK }
}:
table-row = pH { $ph }: { $free }
table-care = Os objetivos são publicados com pK 1,81. Acima de 60 de livre pensa no total e no sabor.
molecular-head = { $vessel }: pH { $ph }{ $free ->
    [none] , sem SO2 livre no registo.
   *[other] , livre { $free } { $unit } ({ $day }).
}
molecular-base = { $basis ->
    [oiv] Pela OIV, { $alcohol } % vol{ $known ->
        [yes] {""}
       *[no] {" "}(não dito)
    }, 20 °C
   *[other] Por pK { $pK }
}: { $molecular ->
    [none] { $target } pede { $needed } de livre.
   *[other] { $molecular } molecular; { $target } pede { $needed } de livre.
}
molecular-meaning = Por pK 1,81 o mesmo objetivo pede { $times } vezes o SO2 livre: { $dose } { $unit } a adicionar, pela OIV { $other }. Os objetivos publicados assentam em pK 1,81; { $basis ->
    [oiv] as doses desta adega vão pela OIV.
   *[other] as doses desta adega também.
}

# Este vinho: o que combinou, quando precisa de mais, de mais, lotar

lab-lacks = { $vessel }: { $what ->
    [ph] sem pH no registo. Manda um, por exemplo: T4 pH 3,58 livre 21
    [free] sem SO2 livre no registo. Manda-o, por exemplo: T4 livre 21
    [total] sem SO2 total no registo. Manda-o, por exemplo: T4 total 80
   *[target] assim como está não vale objetivo nenhum; não calculo nada.
}
learned = Este vinho combinou { $share } % (± { $spread }) das últimas { $count } adições.
learned-offer = Este vinho combinou { $share } % (± { $spread }) das últimas { $count } adições. { $limit ->
    [passes] O que isso pede chega perto de mais do limite.
   *[within] Por aí: { $amount ->
        [none] { $dose } { $unit }
       *[other] { $amount } ({ $dose } { $unit })
    }. Escolhes tu.
}
forecast-below = { $vessel }: o SO2 livre fica abaixo de { $needed } { $unit } { $day ->
    [far] daqui a mais de dois anos
   *[other] por volta de { $day }
}{ $from ->
    [now] , e já pode estar abaixo.
    [far] .
   *[other] {" "}({ $by ->
        [readings] 9 em 10: {""}
       *[published] {""}
    }{ $from } a { $to ->
        [far] mais de dois anos
        [never] talvez nunca
       *[other] { $to }
    }).
}
forecast-steady = { $vessel }: pelas análises o SO2 livre não desce; { $from ->
    [now] mede para teres a certeza.
    [far] abaixo de { $needed } { $unit } só daqui a dois anos, se tanto.
   *[other] abaixo de { $needed } { $unit } em { $from }, o mais cedo.
}
forecast-by-readings = Por { $count } análises desde a última adição: perdem-se { $lost } % em 30 dias.
forecast-by-rates = { $container ->
    [bottle] Por um estudo de garrafas, não por este vinho: ao fim de 3 anos restam 45 % a 14 °C, 20 % a 15–26 °C.
   *[other] Pelo que as barricas perdem, não por este vinho: 3–10 mg/L por mês (prática comum, sem fonte). { $fewest } análises dizem o dele; { $number ->
        [one] só há { $count }
       *[many] há { $count }
    }.
}
forecast-measure = { $from ->
    [now] Mede agora.
    [far] Mede como de costume.
   *[other] Mede até { $from }.
}
forecast-need = Precisa de { $needed }: pH { $ph } de { $day }, { $molecular } molecular.
forecast-none = { $vessel }: { $why ->
    [unmeasured] sem SO2 livre medido desde a última adição. Mede-o, depois pergunta outra vez.
    [below-already] o SO2 livre está nos { $needed } { $unit } que o pH pede, ou abaixo. Manda a análise para uma dose.
   *[no-rate] ainda sem previsão. Não há no ficheiro quanto perdem as cubas, e para o dele são precisas { $fewest } análises desde a última adição; { $number ->
        [one] só há { $count }
       *[many] há { $count }
    }.
}
forecast-unlanded = { $vessel }: a última adição ainda não foi medida. Mede primeiro o SO2 livre.
blend-share = { $vessel } com { $other }: { $starts ->
    [as-it-is] assim como está { $vessel } cumpre; podem entrar até { $most } % de { $other }.
   *[other] de { $least } a { $most } % de { $other } no lote.
}{ $volume ->
    [none] {""}
   *[other] {" "}O mínimo são { $volume } de { $other } para tudo o que há em { $vessel }{ $enough ->
        [no] ; só tem { $held }.
       *[yes] .
    }
}
blend-candidates = Outras que punham { $vessel } dentro dos limites, a menor parte primeiro:
blend-candidate = { $other }: { $least }–{ $most } %{ $volume ->
    [none] {""}
   *[other] , pelo menos { $volume }{ $enough ->
        [no] {" "}(tem { $held })
       *[yes] {""}
    }
}
blend-nobody = { $any ->
    [none] Nenhuma outra vasilha dessa cor está acabada e com SO2 livre no registo: não há com que lotar { $vessel }.
   *[other] Nenhuma de { $count } outras vasilhas com análise põe { $vessel } dentro dos limites.
}
blend-fails = { $vessel } com { $other }: nenhuma parte serve: { $fails ->
    [total] o total fica acima do limite.
    [free] o SO2 livre fica acima do limite.
    [molecular] o SO2 molecular fica fora dos limites.
   *[unmeasured] falta medir alguma coisa num dos vinhos.
}
blend-figures = Pelo SO2 livre no registo: { $list }.
blend-figure = { $vessel } { $free } ({ $day })
blend-bounds = Cumprido: { $list }.
blend-bound-total = total no máximo { $limit }
blend-bound-no-total = total não (um por medir)
blend-bound-free = livre no máximo { $limit }
blend-bound-molecular = molecular { $least ->
    [none] no máximo { $most }
   *[other] { $least }–{ $most }
}, ao pior pH dos dois
blend-bound-no-ph = molecular não (um pH por medir)
blend-whole = As duas inteiras, { $volume }: { $free ->
    [none] livre por saber
   *[other] livre { $free }
}, { $total ->
    [none] total por saber
   *[other] total { $total }
}, antes de a combinação mexer.
blend-care = O pH de um lote não se calcula: mistura um copo nessa parte, mede pH, livre e total, e decide depois. Contam também os outros limites dos dois vinhos.
too-much-head = { $vessel }: { $free ->
    [none] livre por medir
   *[other] livre { $free }
}{ $total ->
    [none] {""}
   *[other] , total { $total }
}{ $molecular ->
    [none] {""}
   *[other] , molecular { $molecular }
}. Primeiro mede outra vez: muitas vezes um número está mal.
too-much-wait = Esperar: { $container ->
    [barrel] as barricas perdem { $least }–{ $most } mg/L de livre por mês (prática comum, sem fonte).
    [bottle] as garrafas perdem-no em anos; tirar não se pode nada.
   *[tank] não há no ficheiro quanto perdem as cubas; as barricas perdem { $least }–{ $most } mg/L de livre por mês (prática comum, sem fonte).
} O total quase não desce.
too-much-air = Ar, uma trasfega arejada: 1 mg/L de oxigénio leva até { $each } mg/L (teoria), um vinho cheio de ar { $low }–{ $high } (um artigo de amadores). Envelhece o vinho.
too-much-blend = Lotar baixa também o total: lotar { $vessel }
too-much-peroxide = Água oxigenada: { $says ->
    [listed] na lista da Austrália, restando no máximo { $left } mg/L (AWRI, à época).
    [not-listed] não permitida na UE (AWRI, à época).
    [old-text] uma tabela antiga dos EUA tem-na só para usos estreitos; por verificar (27 CFR 24.246, 24.247).
   *[none] do teu mercado não há texto no ficheiro.
} Pergunta primeiro à tua autoridade e a um enólogo; quantidades não dou.
