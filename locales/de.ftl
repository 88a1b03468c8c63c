### What we say, in Deutsch. So far only what an emergency needs; the rest is said in English.

emergency-out = ALLE RAUS an die frische Luft, sofort.
emergency-nobody-in = Niemand steigt oder beugt sich jemandem hinterher.
emergency-call = Den Notruf wählen.
emergency-swallowed = Verschluckt: Mund ausspülen, nicht zum Erbrechen bringen, Giftnotruf oder Notruf wählen.
emergency-eyes = Augen: 15 Minuten mit Wasser spülen, Kontaktlinsen heraus.
emergency-skin = Haut: mit viel Wasser spülen, nasse Kleidung ausziehen.

language-changed = Du hast Deutsch geschrieben: ab jetzt antworte ich auf Deutsch.
language-set = Ich antworte auf Deutsch.
button-stay-language = Bei Deutsch bleiben
