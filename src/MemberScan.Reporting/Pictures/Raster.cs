namespace MemberScan.Reporting.Pictures;

/// <summary>A picture of red, green and blue bytes that lines are drawn into.</summary>
internal sealed class Raster
{
    public Raster(int width, int height, (byte R, byte G, byte B) ground)
    {
        (Width, Height, Pixels) = (width, height, new byte[3 * width * height]);
        for (var i = 0; i < width * height; i++) Put(i, ground);
    }

    public int Width { get; }

    public int Height { get; }

    /// <summary>Row by row from the top, three bytes each.</summary>
    public byte[] Pixels { get; }

    /// <summary>Draws a line; both ends must lie within a hundred pictures of this one.</summary>
    /// <param name="a">One end, from the left and from the top.</param>
    /// <param name="b">The other end.</param>
    /// <param name="half">Half of its width; 0 for one point.</param>
    /// <param name="colour">Red, green, blue.</param>
    public void Line((double X, double Y) a, (double X, double Y) b, int half, (byte R, byte G, byte B) colour)
    {
        var steps = (int)Math.Ceiling(Math.Max(Math.Abs(b.X - a.X), Math.Abs(b.Y - a.Y)));
        for (var i = 0; i <= steps; i++)
        {
            var t = steps == 0 ? 0 : (double)i / steps;
            Disc((int)Math.Round(a.X + t * (b.X - a.X)), (int)Math.Round(a.Y + t * (b.Y - a.Y)), half, colour);
        }
    }

    private void Disc(int x, int y, int half, (byte R, byte G, byte B) colour)
    {
        for (var v = Math.Max(0, y - half); v <= Math.Min(Height - 1, y + half); v++)
            for (var u = Math.Max(0, x - half); u <= Math.Min(Width - 1, x + half); u++)
                if ((u - x) * (u - x) + (v - y) * (v - y) <= half * half) Put(v * Width + u, colour);
    }

    private void Put(int pixel, (byte R, byte G, byte B) colour) => (Pixels[3 * pixel], Pixels[3 * pixel + 1], Pixels[3 * pixel + 2]) = (colour.R, colour.G, colour.B);
}
