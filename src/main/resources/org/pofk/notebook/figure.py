from html import escape

try:
    from IPython.display import SVG, display
except ImportError:
    SVG = display = None


def figure(name, y, settled):
    """y(k) over k with the values it approaches; numbers are rounded for drawing alone."""
    low, high = float(min(y + settled)), float(max(y + settled))
    height = high - low if high > low else 1.0
    across = [70 + 500 * k / (len(y) - 1) for k in range(len(y))]

    def down(value):
        return 230 - 190 * (float(value) - low) / height

    lines = ['<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 600 270" width="600" height="270"'
             ' font-family="sans-serif" font-size="12">',
             '<rect width="600" height="270" fill="white"/>',
             '<text x="70" y="22">' + escape(name) + '(k)</text>',
             '<path d="M70 35V235H575" fill="none" stroke="black"/>',
             '<text x="64" y="44" text-anchor="end">%.4g</text>' % high,
             '<text x="64" y="234" text-anchor="end">%.4g</text>' % low,
             '<text x="70" y="252" text-anchor="middle">0</text>',
             '<text x="570" y="252" text-anchor="middle">k = %d</text>' % (len(y) - 1)]
    lines += ['<path d="M70 %.2fH570" stroke="#b44" stroke-dasharray="5 4"/>' % down(value) for value in dict.fromkeys(settled)]
    lines.append('<polyline fill="none" stroke="#9bd" points="'
                 + ' '.join('%.2f,%.2f' % (x, down(value)) for x, value in zip(across, y)) + '"/>')
    lines += ['<circle cx="%.2f" cy="%.2f" r="2.2" fill="#147"/>' % (x, down(value)) for x, value in zip(across, y)]
    svg = '\n'.join(lines + ['</svg>'])
    if SVG is None:
        print(svg)
    else:
        display(SVG(svg))
