export function stepThrough(_idPrefix: string, _by: 1 | -1) {}
