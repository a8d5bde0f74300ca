import { describe, expect, test } from "vitest";
import { parseLine } from "../../src/equations/line.js";
import { escapeXml, plainSymbol, toMathML } from "../../src/equations/mathml.js";

/** Typeset, with what only spaces or frames it taken off. */
function typeset(text: string): string {
  return toMathML("y", parseLine(text), plainSymbol)
    .replace('<math display="block"><mrow><mi>y</mi><mo>=</mo>', "")
    .replace("</mrow></math>", "");
}

describe("MathML of a line", () => {
  test("a division is a fraction, and divisions in a row are one fraction", () => {
    expect(typeset("(a+b)/c")).toBe("<mfrac><mrow><mi>a</mi><mo>+</mo><mi>b</mi></mrow><mi>c</mi></mfrac>");
    expect(typeset("a/b/c")).toBe("<mfrac><mi>a</mi><mrow><mi>b</mi><mo>⋅</mo><mi>c</mi></mrow></mfrac>");
  });
  test("roots", () => {
    expect(typeset("a^0.5")).toBe("<msqrt><mi>a</mi></msqrt>");
    expect(typeset("SQRT(a)")).toBe("<msqrt><mi>a</mi></msqrt>");
    expect(typeset("a^(1/3)")).toBe("<mroot><mrow><mi>a</mi></mrow><mn>3</mn></mroot>");
  });
  test("other exponents keep their form", () => {
    expect(typeset("a^(1/4)")).toBe("<msup><mi>a</mi><mrow><mn>1</mn><mo>/</mo><mn>4</mn></mrow></msup>");
    expect(typeset("a^0.8")).toBe("<msup><mi>a</mi><mn>0.8</mn></msup>");
    expect(typeset("LN(a)^2")).toContain('<mo>(</mo><mrow><mi mathvariant="normal">ln</mi>');
  });
  test("large and small numbers are powers of ten", () => {
    expect(typeset("1.4e9")).toBe("<mrow><mn>1.4</mn><mo>⋅</mo><msup><mn>10</mn><mn>9</mn></msup></mrow>");
    expect(typeset("1e-4")).toBe('<msup><mn>10</mn><mrow><mo form="prefix">−</mo><mn>4</mn></mrow></msup>');
    expect(typeset("282000")).toBe("<mn>282000</mn>");
  });
  test("IF is a list of cases, continued where the last place is an IF again", () => {
    const cases = typeset("IF(a<=1,2,IF(a<=3,4,5))");
    expect(cases.match(/<mtr>/g)).toHaveLength(3);
    expect(cases).toContain("<mtext>if </mtext><mrow><mi>a</mi><mo>≤</mo><mn>1</mn></mrow>");
    expect(cases).toContain("<mtext>otherwise</mtext>");
    expect(typeset('IF(s="square",1,0/0)').match(/<mtr>/g)).toHaveLength(1);
  });
  test("brackets stand where the meaning needs them", () => {
    expect(typeset("a-(b-c)")).toContain("<mo>−</mo><mrow><mo>(</mo>");
    expect(typeset("(a+b)*c")).toContain("<mo>(</mo><mrow><mi>a</mi>");
    expect(typeset("a*b+c")).not.toContain("<mo>(</mo>");
    expect(typeset("2*IF(a>0,1,2)")).toContain("<mo>(</mo><mrow><mo stretchy");
  });
  test("names with a suffix are subscripts; everything is escaped", () => {
    expect(plainSymbol("Nu_V")).toBe('<msub><mi mathvariant="normal">Nu</mi><mi>V</mi></msub>');
    expect(escapeXml(`<a href="x">&'`)).toBe("&#60;a href=&#34;x&#34;&#62;&#38;&#39;");
    expect(typeset('IF(a="<b>",1,2)')).not.toContain("<b>");
  });
  test("every tag that opens closes", () => {
    const text = toMathML(
      "y",
      parseLine(
        "IF(AND(a<1,NOT(b>=2)),-ABS(a)^2,INT(a)+ROUND(b,1)+LOG(a)+LOG(a,2)+LOG10(b)+SUM(a,b)*PI()+COS(RADIANS(a+b))+MIN(a,b,ERF(a)))",
      ),
      plainSymbol,
    );
    const open: string[] = [];
    for (const [, slash, tag] of text.matchAll(/<(\/?)([a-z]+)[^>]*>/g)) {
      if (slash === "") open.push(tag as string);
      else expect(open.pop()).toBe(tag);
    }
    expect(open).toEqual([]);
  });
});
