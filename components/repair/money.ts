/** An amount as people say it: whole units of the organisation's currency. */
export const moneyText = (amount: number, currency: string): string =>
  new Intl.NumberFormat('en-GB', { style: 'currency', currency, maximumFractionDigits: 0 }).format(amount);

/** An amount as it was entered or paid: with its cents, where it has any. */
export const exactMoneyText = (amount: number, currency: string): string =>
  new Intl.NumberFormat('en-GB', { style: 'currency', currency, trailingZeroDisplay: 'stripIfInteger' }).format(amount);
