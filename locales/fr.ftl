### What we say, in français. So far only what an emergency needs; the rest is said in English.

emergency-out = TOUT LE MONDE DEHORS, à l’air libre, tout de suite.
emergency-nobody-in = Personne n’entre ni ne se penche pour aller chercher quelqu’un.
emergency-call = Appelez les secours.
emergency-swallowed = Avalé : rincer la bouche, ne pas faire vomir, appeler le centre antipoison ou les secours.
emergency-eyes = Yeux : rincer à l’eau pendant 15 minutes, enlever les lentilles.
emergency-skin = Peau : rincer à grande eau, enlever les vêtements mouillés.

language-changed = Tu as écrit en français : je réponds désormais en français.
language-set = Je réponds en français.
button-stay-language = Rester en français
