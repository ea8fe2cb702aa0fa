// Making elements without markup in strings.

/**
 * @template {keyof HTMLElementTagNameMap} K
 * @param {K} tag
 * @param {{[name: string]: string | undefined}} [attributes] `text` and `class` among them; undefined ones are left out
 * @param {(Node | string)[]} children
 * @returns {HTMLElementTagNameMap[K]}
 */
export function make(tag, attributes = {}, ...children) {
  const element = document.createElement(tag);
  for (const [name, value] of Object.entries(attributes)) {
    if (value === undefined) continue;
    if (name === 'text') element.textContent = value;
    else element.setAttribute(name, value);
  }
  element.append(...children);
  return element;
}

/**
 * Sets an attribute, or takes it off when the value is empty.
 * @param {Element} element
 * @param {string} name
 * @param {string | undefined} value
 */
export function attribute(element, name, value) {
  if (value) element.setAttribute(name, value);
  else element.removeAttribute(name);
}

/**
 * A text that takes no room while it is empty.
 * @param {HTMLElement} element
 * @param {string | undefined} value
 */
export function words(element, value) {
  element.textContent = value ?? '';
  element.hidden = !value;
}

/**
 * The element of that id, which the page's skeleton has.
 * @param {string} id
 * @returns {HTMLElement}
 */
export function part(id) {
  const element = document.getElementById(id);
  if (!element) throw new Error(`the page has no ${id}`);
  return element;
}
