/** Every time zone this server's calendar data knows by name. */
export const listTimeZones = (): string[] => Intl.supportedValuesOf('timeZone');

/** Every currency by its code and name, those of the code first: "EUR, euro". */
export function listCurrencies(): { value: string; label: string }[] {
  const names = new Intl.DisplayNames('en-GB', { type: 'currency' });
  return Intl.supportedValuesOf('currency').map((code) => ({
    value: code,
    label: `${code}, ${names.of(code) ?? code}`,
  }));
}
