import type { AdditiveId } from '../../core/additives/additive-id.ts';
import type { StockEvent } from '../../core/cellar/entry.ts';
import type { SaidDay, SaidWhen as SaidMoment } from '../../core/time/said-when.ts';
import type { Region } from '../../core/limits/region.ts';
import type { Basis } from '../../core/wine.ts';
import type { Language } from './words/languages.ts';

/** A moment as it was said, with the person's own words. */
export interface SaidWhen extends SaidMoment {
  readonly text: string;
}

/** Something that is set for the cellar. */
export type Setting =
  | { readonly of: 'units'; readonly units: 'metric' | 'us' | 'imperial' }
  | {
      readonly of: 'usual-additive';
      readonly additive: AdditiveId;
      readonly strength_percent?: number;
      readonly strength_of?: 'salt';
    }
  | { readonly of: 'target'; readonly style: 'red' | 'white' | 'sweet'; readonly molecular_mg_L: number }
  | { readonly of: 'quiet'; readonly from_minute: number; readonly to_minute: number }
  | { readonly of: 'daily'; readonly at_minute: number }
  | { readonly of: 'daily'; readonly at_minute: 'off' }
  | { readonly of: 'zone'; readonly zone: string }
  | { readonly of: 'allowance'; readonly percent: number }
  | { readonly of: 'basis'; readonly basis: Basis }
  /** Litres of must from 100 kg of fruit. */
  | { readonly of: 'yield'; readonly yield_L_per_100_kg: number | 'off' }
  | { readonly of: 'law'; readonly region: Region }
  | { readonly of: 'short-replies'; readonly on: boolean }
  | { readonly of: 'ph-days'; readonly days: number }
  | { readonly of: 'check-days'; readonly of_what: 'usual' | 'often'; readonly days: number };

/** What somebody may do in a cellar, as it is said. */
export type SaidRole = 'keeper' | 'hand' | 'guest';

/** Which entries are taken away. */
export type Span =
  | { readonly is: 'month' } // this month
  | { readonly is: 'last-month' }
  /** Without a year the last such month that has begun. */
  | { readonly is: 'named-month'; readonly month: number; readonly year?: number }
  | { readonly is: 'year'; readonly year?: number } // without a year this one
  | { readonly is: 'last-year' }
  | { readonly is: 'between'; readonly from: SaidDay; readonly to: SaidDay }
  | { readonly is: 'all' };

/**
 * One of the bot's own words, or a statement about a vessel. The vessel it is about, a volume, a style, a stage, an
 * amount stand in the reading's fields.
 */
export type Command =
  | { readonly name: 'vessel' } // T4?
  | { readonly name: 'vessels' }
  | { readonly name: 'day'; readonly day: SaidDay }
  | { readonly name: 'history' }
  | { readonly name: 'undo' }
  | { readonly name: 'strike'; readonly entry: number; readonly reason: string }
  | { readonly name: 'order' }
  | { readonly name: 'open' }
  | { readonly name: 'due' }
  | { readonly name: 'later'; readonly days: number }
  | { readonly name: 'unwatch' } // not T4
  | { readonly name: 'watch' }
  | { readonly name: 'settings' }
  | { readonly name: 'language'; readonly language: Language }
  | { readonly name: 'set'; readonly setting: Setting }
  /** A setting whose value cannot be; `about` is what was written. */
  | { readonly name: 'set-wrong'; readonly of: Setting['of']; readonly about: string }
  | { readonly name: 'export'; readonly span: Span; readonly of?: 'stock'; readonly format?: 'csv' | 'xlsx' }
  | { readonly name: 'import'; readonly file: string }
  | { readonly name: 'backup' }
  | { readonly name: 'forget-me' }
  | { readonly name: 'forget' }
  | { readonly name: 'told' } // T4 red; T4 is 5200 L now; T4 in malo
  | { readonly name: 'capacity' } // T4 holds 6000 L: the litres are in `volume_L`
  | { readonly name: 'racked' }
  | { readonly name: 'topped'; readonly from?: string } // `from`: the vessel whose wine it was topped with
  | { readonly name: 'acid' }
  | { readonly name: 'moved'; readonly to: string } // `volume_L` where only a part was moved
  | { readonly name: 'blended'; readonly to: string }
  | { readonly name: 'emptied' }
  | { readonly name: 'lot'; readonly lot: string }
  | { readonly name: 'picture' } // picture T4
  /** The sheet of the last round: in messages, as a file, or as pictures. */
  | { readonly name: 'round-sheet'; readonly form: 'text' | 'csv' | 'xlsx' | 'picture' }
  /** limit T4, limit red RS 3 EU: the wine stands in the fields. */
  | { readonly name: 'limit'; readonly region?: Region }
  | { readonly name: 'full-dose' } // the dose that passes the limit, all the same
  | { readonly name: 'stock' } // stock; stock kmbs
  /** What came in, went out otherwise than into wine, or was counted: how much of which stands in the fields. */
  | {
      readonly name: 'stock-note';
      readonly event: StockEvent;
      readonly supplier?: string;
      readonly purpose?: string;
      /** More than one thing was told at once. */
      readonly several?: true;
    }
  | { readonly name: 'added-it' } // what was reckoned last, or for the vessel named, went in
  | { readonly name: 'invite'; readonly role?: SaidRole }
  | { readonly name: 'join'; readonly code: string }
  | { readonly name: 'people' }
  | { readonly name: 'remove-person'; readonly who: string }
  | { readonly name: 'make-person'; readonly who: string; readonly role: SaidRole }
  | { readonly name: 'at'; readonly cellar?: string } // at Blanca; without a name they are listed
  | { readonly name: 'name-cellar'; readonly as: string }
  | { readonly name: 'leave'; readonly cellar: string } // leave Blanca
  | { readonly name: 'range' } // how far the dose may be off; of a vessel, its last dose
  /** Without targets the cellar's own; without a pH from 3.0 to 4.0. */
  | {
      readonly name: 'table';
      readonly molecular_mg_L: readonly number[];
      readonly ph_from?: number; // pH
      readonly ph_to?: number; // pH
    }
  | { readonly name: 'molecular' } // molecular T4: by both bases
  | { readonly name: 'forecast' } // forecast T4
  | { readonly name: 'blend'; readonly vessel: string; readonly other?: string }
  | { readonly name: 'too-much' } // too much SO2 in T4
  | { readonly name: 'read-along'; readonly on: boolean };
