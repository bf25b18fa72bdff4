/** An invented record of about so many lines: states, tubes, sites, requirements and values that use one another. */
export function record(lines: number): string {
  const written = ['let room = 21 °C ± 2 K', ''];
  for (let count = 1; written.length < lines; count += 1) {
    written.push(
      `## The gas at station ${count}.`,
      `state gas${count} of N2 {`,
      `  pressure    = ${count}e-3 mbar ± 10 %`,
      '  temperature = room',
      '}',
      `tube line${count} { bore = ${10 + (count % 50)} mm, length = 1.8 m }`,
      `site place${count} = gas${count} in line${count}`,
      `require place${count}.knudsen > 1e-4`,
      `let path${count} = 2 * gas${count}.mean_free_path`,
      '',
    );
  }
  return written.join('\n');
}
