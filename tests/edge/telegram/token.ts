/** The token that the fake Bot API accepts. */
export const TOKEN = '4455667788:a-made-up-token-of-an-invented-cellar';
