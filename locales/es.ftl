### What we say, in español. So far only what an emergency needs; the rest is said in English.

emergency-out = TODOS FUERA, al aire libre, ya.
emergency-nobody-in = Nadie entra ni se asoma detrás de nadie.
emergency-call = Llamad a emergencias.
emergency-swallowed = Tragado: enjuagar la boca, no provocar el vómito, llamar a toxicología o a emergencias.
emergency-eyes = Ojos: enjuagar con agua 15 minutos y quitar las lentillas.
emergency-skin = Piel: enjuagar con mucha agua y quitar la ropa mojada.

language-changed = Has escrito en español: desde ahora contesto en español.
language-set = Contesto en español.
button-stay-language = Seguir en español
