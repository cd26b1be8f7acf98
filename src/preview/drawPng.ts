/** Dots of the picture file for each px of the SVG. */
const density = 2;

/** An SVG picture as PNG, base64. */
export async function drawPng(svg: string): Promise<string> {
  const image = new Image();
  const bytes = [...new TextEncoder().encode(svg)].map((byte) => String.fromCharCode(byte)).join("");
  image.src = `data:image/svg+xml;base64,${btoa(bytes)}`;
  await image.decode();
  const canvas = document.createElement("canvas");
  canvas.width = image.naturalWidth * density;
  canvas.height = image.naturalHeight * density;
  canvas.getContext("2d")?.drawImage(image, 0, 0, canvas.width, canvas.height);
  return canvas.toDataURL("image/png").replace(/^data:image\/png;base64,/, "");
}
