### What we say, in italiano. So far only what an emergency needs; the rest is said in English.

emergency-out = TUTTI FUORI all’aria aperta, subito.
emergency-nobody-in = Nessuno entra o si sporge dentro per soccorrere qualcuno.
emergency-call = Chiamate i soccorsi.
emergency-swallowed = Ingerito: sciacquare la bocca, non far vomitare, chiamare il centro antiveleni o i soccorsi.
emergency-eyes = Occhi: sciacquare con acqua per 15 minuti, togliere le lenti a contatto.
emergency-skin = Pelle: sciacquare con molta acqua, togliere i vestiti bagnati.

language-changed = Hai scritto in italiano: da ora rispondo in italiano.
language-set = Rispondo in italiano.
button-stay-language = Restare in italiano
