declare const __CORE_HASH__: string | undefined

/**
 * A hash of the core's source, set when the program is built, by which cached results are told apart from
 * those of another version; null when running unbuilt, where nothing is kept between runs.
 */
export const CORE_HASH: string | null = typeof __CORE_HASH__ === 'string' ? __CORE_HASH__ : null
