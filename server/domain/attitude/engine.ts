/** Name and version of the numerical core; goes up whenever an answer could change by a bit. */
export const ENGINE = 'dextral-attitude/1.0.0';
