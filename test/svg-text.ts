/** Stands for an imported SVG in unit tests, where no bundler reads it as text. */
const svg = '<svg></svg>';
export default svg;
