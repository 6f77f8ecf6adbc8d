export type FormValue = string | FormValue[] | { [key: string]: FormValue };
export type FormObject = { [key: string]: FormValue };

// No prototype, so that a key such as __proto__ is only a key.
const bare = (): FormObject => Object.create(null);

function keysOf(name: string): string[] {
  const [head = '', ...rest] = name.split('[');
  return [head, ...rest.map((part) => part.replace(/\]$/, ''))];
}

function settle(value: FormValue): FormValue {
  if (typeof value === 'string' || Array.isArray(value)) return value;
  const keys = Object.keys(value);
  for (const key of keys) value[key] = settle(value[key] as FormValue);
  if (keys.length > 0 && keys.every((key) => /^\d+$/.test(key)))
    return keys.sort((a, b) => Number(a) - Number(b)).map((key) => value[key] as FormValue);
  return value;
}

/** `a[b][0][c]=d` and `a[]=d` as the SDK and curl write them → nested objects and lists; every leaf is a string. */
export function parseForm(text: string): FormObject {
  const root = bare();
  for (const [name, leaf] of new URLSearchParams(text)) {
    const keys = keysOf(name);
    let here = root;
    keys.forEach((key, i) => {
      const step = key === '' ? String(Object.keys(here).length) : key;
      if (i === keys.length - 1) {
        here[step] = leaf;
        return;
      }
      const next = here[step];
      if (next === undefined || typeof next === 'string' || Array.isArray(next)) here[step] = bare();
      here = here[step] as FormObject;
    });
  }
  for (const key of Object.keys(root)) root[key] = settle(root[key] as FormValue);
  return root;
}
