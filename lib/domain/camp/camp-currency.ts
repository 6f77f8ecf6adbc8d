import { isCurrency, listCurrencies } from '../shared/money';

// ISO 4217 lists these too, but nobody pays with them: metals, test and accounting codes, funds.
const NO_MONEY = /^(X(AG|AU|BA|BB|BC|BD|DR|PD|PT|SU|TS|UA|XX)|BOV|CHE|CHW|CLF|COU|MXV|USN|UYI|UYW|ZWL)$/;

/** A currency that a price may be in. */
export const isCampCurrency = (code: string): boolean => isCurrency(code) && !NO_MONEY.test(code);

export const listCampCurrencies = (): { code: string; name: string }[] =>
  listCurrencies().filter(({ code }) => isCampCurrency(code));
