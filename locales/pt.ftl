### What we say, in português. So far only what an emergency needs; the rest is said in English.

emergency-out = TODOS PARA FORA, para o ar livre, já.
emergency-nobody-in = Ninguém entra nem se debruça atrás de ninguém.
emergency-call = Liguem para a emergência.
emergency-swallowed = Engolido: enxaguar a boca, não provocar o vómito, ligar para o centro antivenenos ou para a emergência.
emergency-eyes = Olhos: lavar com água durante 15 minutos, tirar as lentes de contacto.
emergency-skin = Pele: lavar com muita água, tirar a roupa molhada.

language-changed = Escreveste em português: a partir de agora respondo em português.
language-set = Respondo em português.
button-stay-language = Continuar em português
