// Made from locales/en.ftl by `node .ci/sentence-keys.ts`: change the locale, not this file.

/** Every sentence by its key, and the names of the values it takes. */
export interface SentenceValues {
  'added-confirm': 'added' | 'list' | 'vessel';
  'added-confirm-bare': 'added' | 'vessel';
  'added-it-none': 'vessel';
  additive: 'additive';
  adds: 'adds' | 'list' | 'number' | 'vessel';
  'adds-rate': 'additive' | 'adds' | 'ofAdditive' | 'rate' | 'vessel';
  'adds-rate-mass': 'amount' | 'volume';
  'already-noted': 'entry' | 'vessel' | 'when' | 'who';
  amount: 'additive' | 'amount';
  'amount-SO2': 'additive' | 'amount';
  'amount-solution': 'additive' | 'amount' | 'strength';
  'amount-tablets': 'additive' | 'amount' | 'size' | 'unit';
  'amount-unknown': never;
  'ask-additive': 'vessel';
  'ask-free_mg_L': 'unit' | 'vessel';
  'ask-fruit': 'vessel';
  'ask-mass-spoon': 'vessel';
  'ask-mass_g': 'vessel';
  'ask-ph': 'vessel';
  'ask-solution-volume': 'use';
  'ask-strength_percent': 'named' | 'vessel';
  'ask-tablet-additive': 'vessel';
  'ask-tablet_SO2_g': 'vessel';
  'ask-tablet_salt_g': 'vessel';
  'ask-target': 'usual' | 'vessel';
  'ask-target-stage': 'adds' | 'count' | 'stage' | 'unit' | 'vessel' | 'wine';
  'ask-vessel': 'vessel';
  'ask-volume-which': 'known' | 'said' | 'vessel';
  'ask-volume_L': 'count' | 'unit' | 'vessel';
  'ask-zone': never;
  assumed: 'list';
  'assumed-additive': 'additive';
  'assumed-barrels': 'count' | 'volume';
  'assumed-gallon': 'gallon';
  'assumed-must': 'fruit' | 'volume' | 'yield';
  'assumed-must-usual': 'fruit' | 'volume' | 'yield';
  'assumed-separator': never;
  'assumed-target': 'kind' | 'value';
  'assumed-target-red': 'kind' | 'value';
  'assumed-target-sweet': 'kind' | 'value';
  at: 'vessel';
  'at-already': 'list';
  'at-cellar': 'list';
  'at-here': 'list';
  'at-now': 'list';
  'at-only': never;
  'at-others': 'list';
  'at-unknown': 'list' | 'text';
  'at-which': 'list' | 'text';
  'backup-elsewhere': never;
  'backup-written': 'path';
  'bare-amount': 'amount' | 'count' | 'unit';
  'barrel-name': never;
  'basis-oiv': 'celsius' | 'pK' | 'percent';
  'basis-oiv-need': 'celsius' | 'free' | 'pK' | 'percent';
  'blend-bound-free': 'limit';
  'blend-bound-molecular': 'least' | 'most';
  'blend-bound-no-ph': never;
  'blend-bound-no-total': never;
  'blend-bound-total': 'limit';
  'blend-bounds': 'list';
  'blend-candidate': 'enough' | 'held' | 'least' | 'most' | 'other' | 'volume';
  'blend-candidates': 'vessel';
  'blend-care': never;
  'blend-fails': 'fails' | 'other' | 'vessel';
  'blend-figure': 'day' | 'free' | 'vessel';
  'blend-figures': 'list';
  'blend-nobody': 'any' | 'count' | 'vessel';
  'blend-share': 'enough' | 'held' | 'least' | 'most' | 'other' | 'starts' | 'vessel' | 'volume';
  'blend-whole': 'free' | 'total' | 'volume';
  'bottling-each': 'each';
  'bottling-measured': 'amount' | 'count' | 'each' | 'oxygen' | 'unit';
  'bottling-measured-none': 'each' | 'oxygen';
  'bottling-no-oxygen': never;
  'bottling-takes': 'each' | 'loss' | 'oxygen' | 'unit';
  'bottling-target': 'after' | 'each' | 'loss' | 'now' | 'oxygen' | 'unit';
  'burning-sulfur-danger': never;
  'burning-sulfur-never': never;
  'burning-sulfur-rather': never;
  'button-added': never;
  'button-all-the-same': never;
  'button-choice-leave': never;
  'button-choice-to': 'free';
  'button-done': 'entry';
  'button-dose-anyway': never;
  'button-file-dose': never;
  'button-file-note': never;
  'button-file-vessels': never;
  'button-full-dose': never;
  'button-keep-of': 'of' | 'vessel';
  'button-keep-result': never;
  'button-mine': never;
  'button-more': never;
  'button-not-finished': never;
  'button-note': never;
  'button-order': never;
  'button-published': 'add';
  'button-red': never;
  'button-remind': never;
  'button-round-all': never;
  'button-round-file': never;
  'button-round-line': 'amount' | 'count' | 'unit' | 'vessel';
  'button-round-lines': never;
  'button-round-next': never;
  'button-round-picture': never;
  'button-round-undo': 'entries';
  'button-safety': never;
  'button-sampled-after': never;
  'button-sampled-before': never;
  'button-stay-language': never;
  'button-take': never;
  'button-target': never;
  'button-undo': 'entry';
  'button-white': never;
  'button-working': never;
  'caution-asthma': never;
  'caution-crush-first': never;
  'caution-dissolve-first': never;
  'caution-foams-with-carbon-dioxide': never;
  'caution-gloves-goggles': never;
  'caution-grapes-and-must-only': never;
  'caution-label-and-rules-first': never;
  'caution-mix-and-measure-again': never;
  'caution-never-lean-in': never;
  'caution-no-acid-no-chlorine': never;
  'caution-no-other-acid-no-chlorine': never;
  'caution-trained-people-with-breathing-apparatus': never;
  'caution-ventilate': never;
  cautions: 'list';
  'cautions-of': 'additive' | 'list';
  'cautions-of-separator': never;
  'cautions-separator': never;
  'cautions-short': never;
  'cellar-called': 'cellar' | 'keeper';
  'cellar-left': 'list';
  'cellar-named': 'name';
  'chat-greeting': never;
  'chat-help-care': never;
  'chat-help-dose': never;
  'chat-help-dose-means': never;
  'chat-help-effect': never;
  'chat-help-effect-means': never;
  'chat-help-fields': never;
  'chat-help-solution': never;
  'chat-help-solution-means': never;
  'chat-help-topics': 'list';
  'chat-help-what': never;
  'chat-negated': never;
  'chat-other': never;
  'chat-thanks': never;
  'choice-additive': 'value';
  'choice-head': 'free' | 'ph' | 'target' | 'vessel';
  'choice-leave': 'free' | 'mark' | 'molecular';
  'choice-left': 'molecular' | 'vessel';
  'choice-no-amount': 'free' | 'limit' | 'molecular' | 'region';
  'choice-over': 'limit' | 'region' | 'vessel';
  'choice-powder': 'value';
  'choice-red': 'amount' | 'count' | 'free' | 'kind' | 'limit' | 'red' | 'region' | 'unit';
  'choice-tablet_SO2_g': 'value';
  'choice-tablet_salt_g': 'value';
  'choice-to':
    'additive' | 'amount' | 'count' | 'free' | 'mark' | 'molecular' | 'size' | 'strength' | 'total' | 'unit';
  'choice-volume_L': 'value';
  'claim-taken': 'vessel' | 'when' | 'who';
  claimed: 'until' | 'vessel';
  'command-due': never;
  'command-help': never;
  'command-open': never;
  'command-settings': never;
  'command-today': never;
  'command-vessels': never;
  'condition-red': 'amount' | 'count' | 'kind' | 'limit' | 'red' | 'unit';
  'condition-stage': never;
  corrected: never;
  'daily-head': never;
  'day-empty': 'day';
  'day-head': 'day' | 'zone';
  'day-more': never;
  'day-none-such': never;
  'demo-start': never;
  'demo-start-end': never;
  'demo-start-reading': never;
  'demo-start-sheets': never;
  'designation-asked': 'region' | 'wine';
  'dose-at-limit':
    | 'band'
    | 'class'
    | 'high'
    | 'least'
    | 'limit'
    | 'low'
    | 'now'
    | 'of'
    | 'organic'
    | 'region'
    | 'standing'
    | 'unit'
    | 'vessel'
    | 'what';
  'dose-bottled': 'vessel';
  'dose-capped':
    | 'after'
    | 'band'
    | 'class'
    | 'high'
    | 'least'
    | 'limit'
    | 'list'
    | 'low'
    | 'of'
    | 'organic'
    | 'region'
    | 'unit'
    | 'what';
  'dose-capped-kept': 'error' | 'kept' | 'of' | 'reserve' | 'unit';
  'dose-gas': 'amount' | 'count' | 'vessel';
  'dose-gas-too-little': 'amount' | 'vessel';
  'dose-in-all': 'count' | 'list';
  'dose-in-all-separator': never;
  'dose-measure': 'additive' | 'amount' | 'count' | 'size' | 'strength' | 'unit' | 'vessel';
  'dose-need': 'free' | 'molecular' | 'ph' | 'vessel';
  'dose-negligible': 'short' | 'vessel';
  'dose-nothing': 'vessel';
  'dose-now': 'free' | 'molecular' | 'ph' | 'vessel';
  'dose-only-stock': 'additive' | 'amount' | 'count' | 'strength' | 'vessel';
  'dose-over-already': 'region';
  'dose-rate': 'additive' | 'amount' | 'count' | 'dose' | 'per' | 'size' | 'strength' | 'unit' | 'vessel';
  'dose-rate-bare': 'dose' | 'vessel';
  'dose-rest-as-stock': 'additive' | 'amount' | 'count' | 'strength';
  'dose-stock': 'amount' | 'count' | 'strength';
  'dose-tablet-too-large': 'count' | 'vessel';
  'dose-tablets': 'additive' | 'amount' | 'count' | 'size' | 'strength' | 'unit' | 'vessel';
  'dose-tablets-give': 'gives' | 'unit' | 'wanted';
  'dose-too-fine': 'short' | 'vessel';
  'dose-weigh': 'additive' | 'amount' | 'count' | 'size' | 'strength' | 'unit' | 'vessel';
  'dosed-add-more': 'known' | 'list' | 'vessel' | 'when' | 'who';
  'dosed-in-round': 'known' | 'list' | 'vessel' | 'when' | 'who';
  'dosed-landed': 'known' | 'list' | 'next' | 'vessel' | 'when' | 'who';
  'dosed-sampled-before': 'known' | 'list' | 'next' | 'vessel' | 'when' | 'who';
  'dosed-which-first': 'known' | 'list' | 'vessel' | 'when' | 'who';
  'dosed-who': 'who';
  'due-forecast': 'day' | 'days' | 'free' | 'overdue' | 'stage' | 'vessel';
  'due-head': 'count' | 'number';
  'due-landing': 'added' | 'days' | 'overdue' | 'stage' | 'vessel';
  'due-none': never;
  'due-often': 'day' | 'days' | 'free' | 'low' | 'overdue' | 'stage' | 'vessel';
  'due-overdue': 'days' | 'overdue';
  'due-stage': 'stage';
  'due-usual': 'day' | 'days' | 'free' | 'overdue' | 'stage' | 'vessel';
  'edited-added': 'entry' | 'vessel';
  'edited-anew': never;
  'edited-late': never;
  'edited-noted': 'entry' | 'vessel';
  'effect-allowance': 'after' | 'covers' | 'factor' | 'percent' | 'range' | 'third' | 'unit';
  'effect-allowance-bare': 'covers' | 'factor' | 'percent' | 'third';
  'effect-land': 'after' | 'range' | 'unit';
  'effect-land-low': 'after' | 'range' | 'unit';
  'effect-land-molecular': 'after' | 'molecular' | 'molecularNow' | 'range' | 'unit';
  'effect-land-small': 'after' | 'unit';
  'effect-land-to-molecular': 'after' | 'molecular' | 'range' | 'unit';
  'effect-must': never;
  'effect-raise': 'dose' | 'unit';
  'effect-rise': 'range' | 'unit';
  'effect-share': 'after' | 'range' | 'share' | 'unit';
  'effect-share-bare': 'share';
  'emergency-call': never;
  'emergency-eyes': never;
  'emergency-nobody-in': never;
  'emergency-out': never;
  'emergency-skin': never;
  'emergency-swallowed': never;
  'entry-addition': 'added' | 'known' | 'list' | 'vessel';
  'entry-correction': 'entry' | 'reason';
  'entry-order': 'added' | 'known' | 'list' | 'vessel';
  'entry-other': 'text' | 'vessel';
  'entry-reading': 'list' | 'vessel';
  'entry-stock': 'event' | 'list' | 'supplier';
  'entry-vessel': 'event' | 'list' | 'lot' | 'to' | 'told' | 'until' | 'vessel' | 'whole';
  'errand-failed': never;
  'event-said': 'event' | 'lot' | 'to' | 'until' | 'whole';
  'export-SO2_g': never;
  'export-added_mg_L': never;
  'export-additive': never;
  'export-additive_volume_mL': never;
  'export-alcohol_percent': never;
  'export-at': never;
  'export-bulk': never;
  'export-by': never;
  'export-calculated': never;
  'export-capacity_L': never;
  'export-category': never;
  'export-chemical_lot': never;
  'export-corrects': never;
  'export-density_kg_L': never;
  'export-designated_mg_L': never;
  'export-done': never;
  'export-entry': never;
  'export-event': never;
  'export-free_mg_L': never;
  'export-is-calculated': never;
  'export-is-late': never;
  'export-is-not-calculated': never;
  'export-key': never;
  'export-kind': never;
  'export-late': never;
  'export-lot': never;
  'export-mass_g': never;
  'export-name': never;
  'export-none': never;
  'export-noted': never;
  'export-noted_at': never;
  'export-order': never;
  'export-organic': never;
  'export-over_rule': never;
  'export-pdo': never;
  'export-person': never;
  'export-ph': never;
  'export-planned_free_mg_L': never;
  'export-planned_mg_L': never;
  'export-product': never;
  'export-quality': never;
  'export-reason': never;
  'export-remark': never;
  'export-reserve_mg_L': never;
  'export-stage': never;
  'export-stock-left': never;
  'export-strength_of': never;
  'export-strength_percent': never;
  'export-struck-reason': never;
  'export-struck_by': never;
  'export-style': never;
  'export-sugar_g_L': never;
  'export-supplier': never;
  'export-tablet_SO2_g': never;
  'export-tablet_salt_g': never;
  'export-tablets': never;
  'export-temperature_C': never;
  'export-to': never;
  'export-total_mg_L': never;
  'export-unnamed': 'number';
  'export-until': never;
  'export-uplift': never;
  'export-us-gallons': never;
  'export-vessels': never;
  'export-volume_L': never;
  'export-wine': never;
  'export-wine-lot': never;
  'export-written': 'path';
  'fact-alcohol': 'percent';
  'fact-allowance': 'percent';
  'fact-bulk': never;
  'fact-capacity': 'volume';
  'fact-category': 'category';
  'fact-chemical-lot': 'lot';
  'fact-density': 'density';
  'fact-designated': 'limit';
  'fact-figure': 'figure';
  'fact-free': 'free';
  'fact-lot': 'lot';
  'fact-organic': never;
  'fact-pdo': never;
  'fact-ph': 'ph';
  'fact-product': 'product';
  'fact-quality': 'quality';
  'fact-remark': 'remark';
  'fact-reserve': 'reserve';
  'fact-share': 'percent';
  'fact-stage': 'stage';
  'fact-strength': 'additive' | 'kind' | 'strength';
  'fact-style': 'style';
  'fact-sugar': 'sugar';
  'fact-tablet': 'additive' | 'size';
  'fact-target': 'kind' | 'value';
  'fact-temperature': 'celsius';
  'fact-total': 'total';
  'fact-uplift': 'declared';
  'fact-volume': 'volume';
  'fact-volume-count': 'count' | 'volume';
  fault: never;
  'fault-aside': never;
  'fault-unwritten': never;
  'ferment-stop': 'adds';
  'ferment-stop-more': never;
  'figure-alone': 'adds' | 'count' | 'stage' | 'text' | 'unit' | 'wine';
  'file-round': 'count';
  'file-round-ask': never;
  'file-round-left': 'lines';
  folded: never;
  'for-each': 'count';
  'forecast-below': 'by' | 'day' | 'from' | 'needed' | 'to' | 'unit' | 'vessel';
  'forecast-by-rates': 'container' | 'count' | 'fewest' | 'number';
  'forecast-by-readings': 'count' | 'lost';
  'forecast-measure': 'from';
  'forecast-need': 'day' | 'molecular' | 'needed' | 'ph';
  'forecast-none': 'count' | 'fewest' | 'needed' | 'number' | 'unit' | 'vessel' | 'why';
  'forecast-steady': 'from' | 'needed' | 'unit' | 'vessel';
  'forecast-unlanded': 'vessel';
  'forgotten-person': 'number';
  'full-dose-asks':
    | 'after'
    | 'band'
    | 'class'
    | 'high'
    | 'least'
    | 'limit'
    | 'low'
    | 'of'
    | 'organic'
    | 'region'
    | 'unit'
    | 'vessel'
    | 'what';
  'full-dose-care': never;
  'full-dose-left': never;
  'full-dose-none': never;
  'group-how': never;
  'group-joined': never;
  'guest-not-kept': never;
  'help-bottling-1': never;
  'help-bottling-2': never;
  'help-bottling-3': never;
  'help-bottling-4': never;
  'help-bottling-5': never;
  'help-bottling-6': never;
  'help-files-1': never;
  'help-files-2': never;
  'help-files-3': never;
  'help-files-4': never;
  'help-forecast-1': never;
  'help-forecast-2': never;
  'help-forecast-3': never;
  'help-forecast-4': never;
  'help-forecast-5': never;
  'help-forecast-6': never;
  'help-forecast-7': never;
  'help-lab-1': never;
  'help-lab-2': never;
  'help-lab-3': never;
  'help-lab-4': never;
  'help-lab-5': never;
  'help-lab-6': never;
  'help-lab-7': never;
  'help-lab-8': never;
  'help-law-1': never;
  'help-law-2': never;
  'help-law-3': never;
  'help-law-4': never;
  'help-law-5': never;
  'help-law-6': never;
  'help-law-7': never;
  'help-law-8': never;
  'help-law-9': never;
  'help-log-1': never;
  'help-log-2': never;
  'help-log-3': never;
  'help-log-4': never;
  'help-log-5': never;
  'help-log-6': never;
  'help-log-7': never;
  'help-log-8': never;
  'help-must-1': never;
  'help-must-2': never;
  'help-must-3': never;
  'help-must-4': never;
  'help-must-5': never;
  'help-must-6': never;
  'help-must-7': never;
  'help-people-1': never;
  'help-people-2': never;
  'help-people-3': never;
  'help-people-4': never;
  'help-people-5': never;
  'help-people-6': never;
  'help-people-7': never;
  'help-pictures-1': never;
  'help-pictures-2': never;
  'help-reminders-1': never;
  'help-reminders-2': never;
  'help-reminders-3': never;
  'help-reminders-4': never;
  'help-reminders-5': never;
  'help-reminders-6': never;
  'help-round-1': never;
  'help-round-2': never;
  'help-round-3': never;
  'help-round-4': never;
  'help-round-5': never;
  'help-round-6': never;
  'help-round-7': never;
  'help-round-8': never;
  'help-settings-1': never;
  'help-settings-2': never;
  'help-settings-3': never;
  'help-settings-4': never;
  'help-settings-5': never;
  'help-settings-6': never;
  'help-settings-7': never;
  'help-settings-8': never;
  'help-solutions-1': never;
  'help-solutions-2': never;
  'help-solutions-3': never;
  'help-solutions-4': never;
  'help-solutions-5': never;
  'help-solutions-6': never;
  'help-solutions-7': never;
  'help-stock-1': never;
  'help-stock-2': never;
  'help-stock-3': never;
  'help-stock-4': never;
  'help-stock-5': never;
  'help-stock-6': never;
  'help-stock-7': never;
  'help-stock-8': never;
  'help-topic': 'topic';
  'help-vessels-1': never;
  'help-vessels-10': never;
  'help-vessels-2': never;
  'help-vessels-3': never;
  'help-vessels-4': never;
  'help-vessels-5': never;
  'help-vessels-6': never;
  'help-vessels-7': never;
  'help-vessels-8': never;
  'help-vessels-9': never;
  'help-wine-1': never;
  'help-wine-2': never;
  'help-wine-3': never;
  'help-wine-4': never;
  'help-wine-5': never;
  'help-wine-6': never;
  'help-wine-7': never;
  'help-wine-8': never;
  'help-wine-9': never;
  'history-empty': 'vessel';
  'history-head': 'vessel';
  'history-more': 'vessel';
  'import-ask': never;
  'import-log': 'entries' | 'people' | 'vessels';
  'import-no-file': 'file';
  'import-not-taken': 'list';
  'import-not-taken-name': 'name';
  'import-not-understood': 'count' | 'lines';
  'import-nothing-taken': never;
  'import-problem': 'about' | 'code' | 'lines';
  'import-taken': 'entries';
  'import-unit': 'unit';
  'import-vessels': 'vessels';
  'in-all': 'count';
  'in-all-stock': 'amount' | 'strength';
  'invite-how': never;
  'invite-not-here': never;
  invited: 'code' | 'day' | 'role';
  'invited-how': 'link';
  'join-unknown': never;
  'join-used': never;
  joined: 'list' | 'role';
  'joined-before': 'list' | 'role';
  'joined-how': 'role';
  'keeper-called': 'name';
  'lab-lacks': 'vessel' | 'what';
  landed: 'added' | 'after' | 'percent' | 'planned' | 'unit' | 'vessel';
  'landed-fell': 'added' | 'after' | 'before' | 'unit' | 'vessel';
  'landed-loose': 'added' | 'after' | 'day' | 'planned' | 'unit' | 'vessel';
  'landed-too-high': 'added' | 'rise' | 'unit' | 'vessel';
  'language-changed': never;
  'language-not-yet': never;
  'language-set': never;
  'last-keeper': 'name';
  'law-assumed': 'list';
  'law-decides': 'region';
  'law-note': 'code' | 'unit' | 'value';
  'law-of': 'region';
  'law-unknown': 'code';
  learned: 'count' | 'share' | 'spread';
  'learned-offer': 'amount' | 'count' | 'dose' | 'limit' | 'share' | 'spread' | 'unit';
  'left-unread': 'count';
  'limit-amount': 'additive' | 'amount' | 'count' | 'left' | 'unit' | 'volume';
  'limit-care': never;
  'limit-doubt': 'confidence';
  'limit-is':
    | 'band'
    | 'class'
    | 'density'
    | 'high'
    | 'law_unit'
    | 'limit'
    | 'low'
    | 'of'
    | 'operator'
    | 'organic'
    | 'region'
    | 'unit'
    | 'uplift'
    | 'value'
    | 'vessel'
    | 'what'
    | 'written';
  'limit-none': 'product' | 'reason' | 'region' | 'vessel';
  'limit-notes': 'list';
  'limit-notes-separator': never;
  'limit-room': 'kept' | 'left' | 'now' | 'of' | 'room' | 'standing' | 'unit';
  'limit-text': 'checked' | 'provision' | 'text' | 'version';
  'list-more': 'count';
  'list-separator': never;
  measure: 'vessel';
  'measure-tomorrow': never;
  measured: 'additive' | 'amount' | 'count' | 'size' | 'strength' | 'unit';
  'mixed-sample': 'count';
  'molecular-base': 'alcohol' | 'basis' | 'known' | 'molecular' | 'needed' | 'pK' | 'target';
  'molecular-head': 'day' | 'free' | 'ph' | 'unit' | 'vessel';
  'molecular-meaning': 'basis' | 'dose' | 'other' | 'times' | 'unit';
  'more-head': 'vessel';
  'more-no-warnings': never;
  'must-colour': 'style';
  'must-comes-back': 'total' | 'unit';
  'must-malolactic': 'most' | 'unit';
  'must-none-published': 'product';
  'must-published': 'list' | 'read' | 'source';
  'must-range': 'range' | 'state' | 'style' | 'unit';
  'must-say-state': never;
  'must-yeast': 'least' | 'most';
  'no-dose-all-the-same': 'adds' | 'count' | 'stage' | 'unit' | 'wine';
  'no-dose-fermenting': 'vessel';
  'no-dose-malolactic': 'vessel';
  'no-dose-molecular': 'molecular';
  'no-dose-why': never;
  'no-dose-why-fermenting': never;
  'no-such-button': 'last' | 'text';
  'no-such-choice': 'last' | 'text';
  'not-allowed': 'keepers' | 'list' | 'role';
  'not-of-cellar': never;
  'note-each-or-total': 'text';
  'note-free-unlabelled': 'text';
  'note-mass-beside-readings': 'text';
  'note-ph-unlabelled': 'text';
  'note-round-free': never;
  'note-round-ph': never;
  'note-strength-as-SO2': never;
  'note-strength-as-salt': 'factor';
  'note-unread-words': 'text';
  'note-volume-sum': 'text';
  'noted-addition': 'added' | 'entry' | 'list' | 'order' | 'vessel' | 'when';
  'noted-bare': 'added' | 'entry' | 'vessel' | 'when';
  'noted-measure': 'when';
  'noted-measure-now': never;
  'noted-something-else': 'entry' | 'text' | 'vessel' | 'voids' | 'when';
  'noted-vessel': 'entry' | 'list' | 'voids';
  'nothing-why': 'free' | 'kind' | 'molecular' | 'ph' | 'value';
  'nothing-why-free': 'free' | 'kind' | 'value';
  'odd-empty': 'vessel' | 'when';
  'odd-from-empty': 'vessel' | 'when';
  'odd-large': 'added';
  'odd-more-than-planned': 'factor' | 'vessel';
  'odd-over-capacity': 'capacity' | 'vessel' | 'volume';
  'odd-second': 'entry' | 'vessel' | 'when';
  'of-each': 'count';
  'old-button': never;
  'on-it': 'vessel' | 'when' | 'who';
  'open-head': 'count' | 'number';
  'open-line': 'entry' | 'list' | 'vessel' | 'when' | 'who';
  'open-none': never;
  option: 'list' | 'mark';
  'order-gone': 'entry';
  'order-how': never;
  ordered: 'entry' | 'list' | 'vessel';
  'ordered-open': never;
  'other-as-allowance': 'amount' | 'count' | 'factor' | 'percent' | 'unit';
  'other-as-share': 'amount' | 'count' | 'divisor' | 'percent' | 'unit';
  'over-rule': 'band' | 'class' | 'high' | 'low' | 'organic' | 'region' | 'what';
  'over-rule-noted': 'band' | 'class' | 'high' | 'low' | 'organic' | 'region' | 'what';
  'people-head': never;
  'people-how': never;
  'people-line': 'me' | 'name' | 'role';
  'person-called': 'name' | 'number';
  'person-unknown': 'list' | 'text';
  'person-which': 'list' | 'text';
  'picture-added': never;
  'picture-added-thinned': never;
  'picture-added-unknown': never;
  'picture-addition': 'added' | 'day';
  'picture-additions': 'earlier' | 'list' | 'unit';
  'picture-blended': never;
  'picture-bound': never;
  'picture-came-from': 'day' | 'vessels';
  'picture-empty': 'day';
  'picture-free': 'day' | 'free';
  'picture-head': 'additions' | 'day' | 'readings' | 'vessel';
  'picture-is-odd': 'days';
  'picture-last': 'list';
  'picture-last-bound': 'day' | 'unit' | 'value';
  'picture-last-free': 'day' | 'unit' | 'value';
  'picture-last-total': 'day' | 'unit' | 'value';
  'picture-limit': 'limit';
  'picture-limit-of-total': 'limit';
  'picture-needed': 'needed' | 'ph';
  'picture-needs': 'day' | 'molecular' | 'needed' | 'ph';
  'picture-needs-nothing': 'why';
  'picture-none': 'vessel';
  'picture-nothing': 'vessel';
  'picture-odd': never;
  'picture-total': 'day' | 'total';
  'picture-unit': 'unit';
  'picture-unmeasured': 'day';
  'picture-was-blended': 'day';
  'problem-ambiguous-number': 'about' | 'kind' | 'named' | 'one' | 'two' | 'vessel';
  'problem-conflicting-values': 'about' | 'vessel';
  'problem-did-you-mean': 'about' | 'vessel';
  'problem-each-or-total': 'about' | 'vessel';
  'problem-negative-value': 'about' | 'vessel';
  'problem-no-number': 'again';
  'problem-not-understood': never;
  'problem-ph-out-of-range': 'about' | 'vessel';
  'problem-share': 'about' | 'vessel';
  'problem-strength-out-of-range': 'about' | 'named' | 'vessel';
  'problem-too-long': never;
  'problem-total-below-free': 'about' | 'one' | 'two' | 'vessel';
  'problem-two-vessels': 'about';
  'problem-unit-mismatch': 'about' | 'vessel';
  'problem-unknown-additive': 'about' | 'vessel';
  'problem-value-out-of-range': 'about' | 'vessel';
  'problem-vessel-twice': 'vessel';
  'problem-volume-not-positive': 'about' | 'vessel';
  'progress-done': never;
  'progress-working': never;
  'question-after-malolactic': never;
  'question-after-malolactic-next': never;
  'question-after-malolactic-why': never;
  'question-allergy': never;
  'question-allergy-next': never;
  'question-allergy-why': never;
  'question-bottling': never;
  'question-bottling-next': never;
  'question-bottling-why': never;
  'question-fell-short': never;
  'question-fell-short-next': never;
  'question-fell-short-why': never;
  'question-gas': never;
  'question-gas-next': never;
  'question-gas-why': never;
  'question-how-often': never;
  'question-how-often-next': never;
  'question-how-often-why': never;
  'question-how-to-mix': never;
  'question-how-to-mix-next': never;
  'question-how-to-mix-why': never;
  'question-law': never;
  'question-law-next': never;
  'question-law-why': never;
  'question-no-sulfite': never;
  'question-no-sulfite-next': never;
  'question-no-sulfite-why': never;
  'question-old-powder': never;
  'question-old-powder-next': never;
  'question-old-powder-why': never;
  'question-pH-matters': never;
  'question-pH-matters-next': never;
  'question-pH-matters-why': never;
  'question-potassium-or-sodium': never;
  'question-potassium-or-sodium-next': never;
  'question-potassium-or-sodium-why': never;
  'question-ppm-and-mg-L': never;
  'question-ppm-and-mg-L-next': never;
  'question-ppm-and-mg-L-why': never;
  'question-small-or-large': never;
  'question-small-or-large-next': never;
  'question-small-or-large-why': never;
  'question-sorbate': never;
  'question-sorbate-next': never;
  'question-sorbate-why': never;
  'question-stock-keeps': never;
  'question-stock-keeps-next': never;
  'question-stock-keeps-why': never;
  'question-stop-fermentation': never;
  'question-stop-fermentation-next': never;
  'question-stop-fermentation-why': never;
  'question-strip-reads-otherwise': never;
  'question-strip-reads-otherwise-next': never;
  'question-strip-reads-otherwise-why': never;
  'question-tablets-or-powder': never;
  'question-tablets-or-powder-next': never;
  'question-tablets-or-powder-why': never;
  'question-teaspoons': never;
  'question-teaspoons-next': never;
  'question-teaspoons-why': never;
  'question-too-much': never;
  'question-too-much-next': never;
  'question-too-much-why': never;
  'question-wait-before-yeast': never;
  'question-wait-before-yeast-next': never;
  'question-wait-before-yeast-why': never;
  'question-when-to-measure': never;
  'question-when-to-measure-next': never;
  'question-when-to-measure-why': never;
  'question-which-figure': never;
  'question-which-figure-next': never;
  'question-which-figure-why': never;
  'question-which-target': never;
  'question-which-target-next': never;
  'question-which-target-why': never;
  'question-which-yield': never;
  'question-which-yield-next': never;
  'question-which-yield-why': never;
  'range-dose': 'amount' | 'count' | 'high' | 'low' | 'unit' | 'vessel';
  'range-limit': never;
  'range-nothing': never;
  'range-rests': 'free' | 'ph' | 'said' | 'unit';
  'range-sure': 'molecular' | 'unit';
  'range-sure-low': 'molecular' | 'unit';
  'range-sure-unbound': 'molecular' | 'unit';
  read: 'list';
  'read-kept': 'list' | 'new' | 'vessel';
  'reading-kept': 'list' | 'vessel' | 'when';
  'reading-read': 'list' | 'vessel';
  'reads-along': 'on';
  recalled: 'day' | 'list';
  'recalled-additive': 'additive' | 'day';
  'recalled-allowance': 'percent';
  'refused-ammonium': 'vessel';
  'refused-ammonium-must': 'stage';
  'refused-organic': 'additive' | 'reason' | 'region' | 'vessel';
  'refused-organic-instead': 'reason';
  remind: 'list';
  'remind-late': 'vessel';
  'remind-set': 'vessel' | 'when';
  role: 'role';
  'role-changed': 'name' | 'role';
  'role-same': 'name' | 'role';
  'round-again': never;
  'round-all': 'all';
  'round-amount':
    'additive' | 'all' | 'amount' | 'limited' | 'red' | 'redAmount' | 'strength' | 'tablet' | 'unit';
  'round-and-more': 'count';
  'round-capped':
    | 'after'
    | 'band'
    | 'class'
    | 'high'
    | 'least'
    | 'limit'
    | 'low'
    | 'of'
    | 'organic'
    | 'region'
    | 'unit'
    | 'vessel'
    | 'what';
  'round-choice': 'ph' | 'vessel';
  'round-dose':
    | 'additive'
    | 'all'
    | 'amount'
    | 'limited'
    | 'list'
    | 'red'
    | 'redAmount'
    | 'strength'
    | 'tablet'
    | 'unit'
    | 'vessel';
  'round-dose-bare':
    | 'additive'
    | 'all'
    | 'amount'
    | 'limited'
    | 'red'
    | 'redAmount'
    | 'strength'
    | 'tablet'
    | 'unit'
    | 'vessel';
  'round-effect': never;
  'round-effect-short': never;
  'round-for-all': 'list';
  'round-gone': never;
  'round-head': 'additive' | 'kind' | 'size';
  'round-if-red': 'red' | 'redAmount';
  'round-kept': never;
  'round-limited': 'limited';
  'round-low': 'list';
  'round-missing': 'field' | 'vessel';
  'round-mixed': 'list';
  'round-more': 'count';
  'round-name': 'name';
  'round-not-noted': 'list';
  'round-not-understood': 'about';
  'round-noted': 'count' | 'entries' | 'list' | 'when';
  'round-noted-before': 'list';
  'round-noted-each': 'entry' | 'list' | 'vessel' | 'when';
  'round-noted-line': 'entry' | 'list' | 'vessel' | 'when';
  'round-noted-none': 'entries';
  'round-noted-rest': never;
  'round-nothing': 'list' | 'vessel';
  'round-nothing-bare': 'vessel';
  'round-of': 'additive' | 'strength';
  'round-open': 'count';
  'round-open-names': 'list';
  'round-percent': 'strength';
  'round-pick': 'all' | 'from' | 'to';
  'round-pick-noted': 'entry' | 'vessel';
  'round-red': 'red';
  'round-rest': 'list' | 'strength';
  'round-stock': 'list' | 'strength';
  'round-stock-of': 'amount' | 'vessel';
  'round-strength': 'size';
  'round-strike-one': 'entry';
  'round-tablet': 'tablet';
  'round-target-stage': 'vessel';
  'round-total': 'count' | 'list';
  'round-total-of': 'additive' | 'amount' | 'kind' | 'size' | 'strength';
  'round-undone': 'entries';
  'round-undone-none': never;
  'round-volume-which': 'said' | 'vessel';
  'round-warned': 'list';
  'rule-class': 'class';
  'rule-short': 'band' | 'class' | 'high' | 'low' | 'organic' | 'region' | 'what';
  'rule-sugar': 'band' | 'high' | 'low';
  'rule-what': 'band' | 'class' | 'high' | 'low' | 'organic' | 'what';
  'safety-head': 'additive';
  'salt-name': 'named';
  'send-alone': never;
  'set-aside': 'list';
  'set-aside-figure': 'text';
  'setting-allowance': 'percent';
  'setting-basis': 'basis';
  'setting-check-days': 'often' | 'usual';
  'setting-daily': 'daily';
  'setting-language': never;
  'setting-law': 'region';
  'setting-ph-days': 'days';
  'setting-quiet': 'from' | 'to';
  'setting-set': 'list';
  'setting-short-replies': 'short';
  'setting-target': 'red' | 'sweet' | 'white';
  'setting-units': 'units';
  'setting-usual-additive': 'additive' | 'strength';
  'setting-wrong': 'of' | 'text';
  'setting-yield': 'yield';
  'setting-zone': 'zone';
  'settings-head': never;
  'sheet-additive': never;
  'sheet-additive-name': 'additive' | 'strength';
  'sheet-after': never;
  'sheet-caution': never;
  'sheet-done': never;
  'sheet-dose': never;
  'sheet-entry': 'entry' | 'late' | 'list' | 'noted' | 'struck' | 'when' | 'who';
  'sheet-fetch': 'list';
  'sheet-free': never;
  'sheet-free-short': never;
  'sheet-in-all': never;
  'sheet-limit': never;
  'sheet-measure': never;
  'sheet-note': never;
  'sheet-nothing': never;
  'sheet-open': never;
  'sheet-ph': never;
  'sheet-strength': never;
  'sheet-tablets': never;
  'sheet-title': never;
  'sheet-total': never;
  'sheet-vessel': never;
  'sheet-volume': never;
  'sheet-weigh': never;
  'solution-air': never;
  'solution-colder': 'celsius';
  'solution-drain': never;
  'solution-for-holding': never;
  'solution-for-rinse': never;
  'solution-fresh': never;
  'solution-from-powder': 'volume';
  'solution-holding': 'acid' | 'additive' | 'amount' | 'volume';
  'solution-measure': 'additive' | 'amount' | 'volume';
  'solution-not-wine': 'vessel';
  'solution-order': never;
  'solution-per-barrel': 'adds' | 'amount' | 'barrel' | 'rise';
  'solution-practice': 'acid' | 'litres' | 'salt' | 'use';
  'solution-rinse': 'acid' | 'additive' | 'amount' | 'volume';
  'solution-strength': 'strength';
  'solution-strengths': never;
  'solution-too-cold': 'celsius' | 'most' | 'source' | 'wanted' | 'water';
  'solution-too-much': 'additive' | 'celsius' | 'least' | 'most' | 'source' | 'wanted';
  'solution-us-water': never;
  'solution-weigh': 'additive' | 'amount' | 'volume';
  'stage-now': 'stage';
  'stage-word': 'stage';
  'step-added-by-one-millilitre': never;
  'step-added-by-rate': never;
  'step-added-concentration': never;
  'step-addition': never;
  'step-additive-mass': never;
  'step-additive-mass-by-assay': never;
  'step-additive-mass-by-yield': never;
  'step-additive-volume-by-salt': never;
  'step-additive-volume-by-so2': never;
  'step-all-vessels': never;
  'step-ascorbic-counted': never;
  'step-blend-free': never;
  'step-blend-total': never;
  'step-citric-acid-by-recipe': never;
  'step-dissociation': never;
  'step-dose-highest': never;
  'step-dose-lowest': never;
  'step-dose-with-allowance': never;
  'step-dose-with-share': never;
  'step-free-after': never;
  'step-free-before-bottling': never;
  'step-free-needed': never;
  'step-gas-by-purity': never;
  'step-iodate-normality': never;
  'step-mass-by-rate': never;
  'step-molecular-after': never;
  'step-molecular-now': never;
  'step-molecular-sure': never;
  'step-must-of-fruit': never;
  'step-oxygen-loss': never;
  'step-room-to-limit': never;
  'step-salt-by-recipe': never;
  'step-salt-mass': never;
  'step-so2-by-titration': never;
  'step-so2-in-amount': never;
  'step-so2-mass': never;
  'step-so2-mass-each': never;
  'step-so2-without-ascorbic': never;
  'step-solution-strength': never;
  'step-solution-strength-by-salt': never;
  'step-spread-of-dose': never;
  'step-spread-of-need': never;
  'step-stock-for-a-barrel': never;
  'step-tablets-by-salt': never;
  'step-tablets-by-so2': never;
  'step-titrant-normality': never;
  'step-titrant-used': never;
  'step-volume-in-litres': never;
  'still-asked': never;
  'stock-corrected': 'amount' | 'unit' | 'was' | 'way';
  'stock-lacks': 'additive' | 'event' | 'what';
  'stock-left': 'additive' | 'amount' | 'size' | 'strength' | 'unit';
  'stock-lot': 'amount' | 'day' | 'lot' | 'supplier' | 'unit';
  'stock-lot-unknown': 'lot';
  'stock-low': 'additive' | 'amount' | 'size' | 'strength' | 'unit';
  'stock-name': 'named';
  'stock-negative': 'additive' | 'amount' | 'size' | 'strength' | 'unit';
  'stock-none': never;
  'stock-none-of': 'additive';
  'stock-not-kept': never;
  'stock-noted': 'entry' | 'event' | 'list' | 'purpose' | 'supplier' | 'when';
  'stock-of': 'additive' | 'size' | 'strength';
  'stock-old': never;
  'stock-oldest-lot': 'lot' | 'other';
  'stock-shelf': 'additive' | 'amount' | 'counted' | 'size' | 'strength' | 'unit';
  'stock-short': 'additive' | 'amount' | 'size' | 'strength' | 'unit';
  'stock-tablets': 'unit';
  stranger: never;
  'strike-again': 'by' | 'entry';
  'strike-correction': 'entry';
  'strike-none': 'entry';
  'strike-why': 'entry';
  struck: 'entry' | 'list';
  'struck-addition': never;
  'table-care': never;
  'table-head': 'basis' | 'pK' | 'targets' | 'unit';
  'table-row': 'free' | 'ph';
  'tablet-word': 'unit';
  'tablets-of': 'additive' | 'amount' | 'size' | 'unit';
  take: 'vessel';
  target: 'kind' | 'value';
  'target-of': 'vessel';
  'terminal-start': never;
  'terminal-start-example': never;
  'terminal-start-more': never;
  'third-needs': 'third';
  'titration-ascorbic': 'amount';
  'titration-ascorbic-asked': 'amount' | 'counts' | 'unit';
  'titration-asks': 'method' | 'missing';
  'titration-blank': 'volume';
  'titration-either': 'molar' | 'normal' | 'strength' | 'unit';
  'titration-free-assumed': never;
  'titration-iodate': 'mass' | 'volume';
  'titration-molar': 'molar' | 'normal';
  'titration-name-vessel': never;
  'titration-no-blank': never;
  'titration-precision': 'again' | 'other';
  'titration-read': 'list';
  'titration-red-high': never;
  'titration-result': 'method' | 'of' | 'result' | 'unit' | 'vessel';
  'titration-sample': 'volume';
  'titration-strength': 'strength' | 'unit';
  'titration-titrant': 'volume';
  'titration-too-much': never;
  'too-fast': never;
  'too-much-air': 'each' | 'high' | 'low';
  'too-much-blend': 'vessel';
  'too-much-head': 'free' | 'molecular' | 'total' | 'vessel';
  'too-much-peroxide': 'left' | 'says';
  'too-much-wait': 'container' | 'least' | 'most';
  'total-sum': 'day' | 'measured' | 'since' | 'total';
  'undo-late': 'entry';
  'undo-not-yours': 'entry' | 'who';
  'undo-nothing': never;
  unreadable: 'what';
  'usual-strength': 'named';
  'vessel-addition': 'added' | 'entry' | 'landed' | 'list' | 'when' | 'who';
  'vessel-bare': 'vessel';
  'vessel-bound': 'count' | 'least' | 'most' | 'number' | 'share';
  'vessel-check': 'when' | 'why';
  'vessel-check-due': 'when' | 'why';
  'vessel-empty': 'day' | 'vessel';
  'vessel-head': 'list' | 'vessel';
  'vessel-new': 'vessel';
  'vessel-order': 'entry' | 'list' | 'when' | 'who';
  'vessel-readings': 'list';
  'vessel-unknown': 'vessel';
  'vessel-unwatched': 'vessel';
  'vessel-void': 'day' | 'event' | 'field';
  'vessels-head': 'count' | 'due' | 'number';
  'vessels-line': 'check' | 'day' | 'free' | 'lot' | 'next' | 'vessel';
  'vessels-none': never;
  'volume-differs': 'known' | 'said' | 'vessel' | 'written';
  'warning-addition-large': 'dose_mg_L' | 'unit';
  'warning-additive-not-permitted': 'reason' | 'region';
  'warning-already-dosed': never;
  'warning-basis-fallback': never;
  'warning-basis-fallback-change':
    'change' | 'compared_at_alcohol_percent' | 'compared_at_temperature_C' | 'direction' | 'unit';
  'warning-free-low-may-bind-all': never;
  'warning-free-needed-high': 'target_free_mg_L' | 'unit';
  'warning-free-over-limit':
    | 'band'
    | 'class'
    | 'confidence'
    | 'free_after_mg_L'
    | 'high'
    | 'limit_mg_L'
    | 'low'
    | 'organic'
    | 'region'
    | 'unit'
    | 'what';
  'warning-label-threshold':
    'comparator' | 'confidence' | 'counts' | 'region' | 'threshold_mg_L' | 'total_after_mg_L' | 'unit_of_law';
  'warning-limit-unconfirmed':
    'band' | 'class' | 'high' | 'limit_mg_L' | 'low' | 'of' | 'organic' | 'region' | 'unit' | 'what';
  'warning-malolactic-may-not-start':
    'above' | 'free_ceiling_high_mg_L' | 'free_mg_L' | 'total_ceiling_high_mg_L' | 'total_mg_L' | 'unit';
  'warning-molecular-above-2': 'unit';
  'warning-must-may-hinder-malolactic': 'malolactic_unharmed_mg_L' | 'unit';
  'warning-no-dose-at-this-stage': 'stage';
  'warning-no-limit-on-file': 'region';
  'warning-ph-unusual': 'ph';
  'warning-restart-may-fail': 'held_back_molecular_mg_L' | 'molecular_mg_L' | 'unit';
  'warning-rounding-coarse': 'rounding_mg_L' | 'unit';
  'warning-sodium': 'region';
  'warning-stage-not-over': 'stage';
  'warning-total-near-limit':
    | 'band'
    | 'class'
    | 'confidence'
    | 'high'
    | 'limit_mg_L'
    | 'low'
    | 'organic'
    | 'region'
    | 'total'
    | 'total_after_mg_L'
    | 'unit'
    | 'what';
  'warning-total-over-limit':
    | 'band'
    | 'class'
    | 'confidence'
    | 'high'
    | 'limit_mg_L'
    | 'low'
    | 'organic'
    | 'region'
    | 'total'
    | 'total_after_mg_L'
    | 'unit'
    | 'what';
  'warning-total-unknown': never;
  'warning-total-unknown-most':
    | 'band'
    | 'class'
    | 'high'
    | 'limit_mg_L'
    | 'low'
    | 'most_total_mg_L'
    | 'organic'
    | 'region'
    | 'unit'
    | 'what';
  'ways-out': never;
  weigh: 'vessel';
  'when-future': 'text' | 'vessel' | 'when';
  'when-no-such-day': 'text' | 'vessel';
  'when-noon': never;
  'whole-example': 'adds' | 'count' | 'stage' | 'unit' | 'wine';
  working: 'result' | 'substituted';
  'working-head': 'vessel';
  'working-source': 'source';
  'working-symbol': 'result' | 'substituted' | 'symbol';
}

/** The key of a sentence in `locales/`. */
export type SentenceKey = keyof SentenceValues;
