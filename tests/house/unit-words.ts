/** A unit in prose or at the end of a name, or the word that a number has none or that of something else. */
export const UNIT_WORD =
  /mg\/L|g\/L|g\/hL|mol|\b(litres?|millilitres?|grams?|milligrams?|kilograms?|percent|degrees?|pH|ppm|milliseconds?|seconds?|minutes?)\b|\d (L|g|mL|kg)\b|\bin (L|g|mL|kg)\b|%|°|_(L|mL|hL|g|kg|mg_L|g_L|C|K|percent|share|ms)\b|(no|without) (unit|dimension)|dimensionless|pure number|\bunits?\b|\b(digits|decimals|count|how many|number of|share|position|rows?|columns?|characters?)\b/i;
