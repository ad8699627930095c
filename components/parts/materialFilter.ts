// The filter by material is style alone, so that it works before any script does: a chosen box hides what is cut from something else.

/** How a material is written into attributes and style, by its place in the list. */
export const materialMark = (index: number): string => `m${index}`;

/** Id of a material's box. */
export const boxId = (index: number): string => `material-${materialMark(index)}`;

/**
 * Style text: with a material's box chosen, parts of others, groups without any of it, and the ways to them leave the page.
 * Without quotation marks, which a page may write as entities that no browser reads inside a style.
 */
export const filterStyle = (count: number): string =>
  Array.from({ length: count }, (_, index) => {
    const chosen = `[data-parts]:has(#${boxId(index)}:checked)`;
    const others = `[data-material]:not([data-material=${materialMark(index)}])`;
    const groups = `[data-materials]:not([data-materials~=${materialMark(index)}])`;
    return `${chosen} :is(${others},${groups}){display:none}`;
  }).join('');
