using System.Globalization;
using System.Text;

namespace RangeReduce.SampleData;

/// <summary>Writes the antenna as an input deck of NEC-2 (Burke and Poggio 1981), lengths in metres.</summary>
internal static class DipolePairDeck
{
    private const double PlateRadiusMm = 90.0;
    private const int PlateRings = 7;
    private const double FeedWireMm = 8.0;
    private const double StowGapMm = 6.0;
    private const double ArmRadiusMm = 1.0;
    private const double WireRadiusMm = 0.5;
    private const int ArmSegments = 6;

    /// <summary>Writes a deck.</summary>
    /// <param name="title">Comment lines of at most 75 characters, since longer cards are refused.</param>
    /// <param name="geometry">The antenna.</param>
    /// <param name="controlCards">What is to be computed: FR, XQ and RP cards.</param>
    public static string Write(string[] title, DipolePairGeometry geometry, params string[] controlCards)
    {
        var text = new StringBuilder();
        foreach (var line in title)
        {
            text.Append("CM ").Append(line).Append('\n');
        }

        text.Append("CE\n");
        var tag = 0;
        var (top, bottom) = (geometry.HeightMm + (FeedWireMm / 2.0), geometry.HeightMm - (FeedWireMm / 2.0));
        Wire(3, (0.0, 0.0, bottom), (0.0, 0.0, top), WireRadiusMm);
        Arm(1.0, 0.0, geometry.XArmMm + geometry.ExtraPlusXMm, top);
        Arm(0.0, 1.0, geometry.YArmMm + geometry.ExtraPlusYMm, top);
        Arm(-1.0, 0.0, geometry.XArmMm, bottom);
        Arm(0.0, -1.0, geometry.YArmMm, bottom);
        Plate();
        text.Append("GE 0\n");
        Line($"LD 0 1 2 2 0 0 {geometry.FeedCapacitorPf:0.000}E-12");
        if (geometry.JointOhm > 0.0)
        {
            for (var arm = 2; arm <= 5; arm++)
            {
                Line($"LD 0 {arm} 1 1 {geometry.JointOhm:0.000} 0 0");
            }
        }

        text.Append("EX 0 1 2 0 1 0\nPT -1\n");
        foreach (var card in controlCards)
        {
            text.Append(card).Append('\n');
        }

        return text.Append("EN\n").ToString();

        void Arm(double x, double y, double length, double z)
        {
            var start = geometry.ArmsConnected ? 0.0 : StowGapMm;
            Wire(ArmSegments, (x * start, y * start, z), (x * length, y * length, z), ArmRadiusMm);
        }

        // Rings with spokes; 12 spokes near the middle, 24 further out, so that no mesh side is over an eighth of a wavelength.
        void Plate()
        {
            for (var ring = 1; ring <= PlateRings; ring++)
            {
                var corners = SpokesAt(ring);
                for (var corner = 0; corner < corners; corner++)
                {
                    Wire(1, OnPlate(ring, 360.0 * corner / corners), OnPlate(ring, 360.0 * (corner + 1) / corners), WireRadiusMm);
                }

                for (var spoke = 0; ring > 1 && spoke < SpokesAt(ring - 1); spoke++)
                {
                    var angleDeg = 360.0 * spoke / SpokesAt(ring - 1);
                    Wire(1, OnPlate(ring - 1, angleDeg), OnPlate(ring, angleDeg), WireRadiusMm);
                }
            }
        }

        void Wire(int segments, (double X, double Y, double Z) from, (double X, double Y, double Z) to, double radiusMm) =>
            Line($"GW {++tag} {segments} {Metres(from.X)} {Metres(from.Y)} {Metres(from.Z)} {Metres(to.X)} {Metres(to.Y)} {Metres(to.Z)} {Metres(radiusMm)}");

        void Line(FormattableString card) => text.Append(card.ToString(CultureInfo.InvariantCulture)).Append('\n');
    }

    private static int SpokesAt(int ring) => ring < 3 ? 12 : 24;

    private static (double X, double Y, double Z) OnPlate(int ring, double angleDeg)
    {
        var (sine, cosine) = Math.SinCos(angleDeg % 360.0 * Math.PI / 180.0);
        var radius = PlateRadiusMm * ring / PlateRings;
        return (radius * cosine, radius * sine, 0.0);
    }

    // Six decimals of a metre; a rounded minus zero would make one point of the plate look like two.
    private static string Metres(double mm) => (Math.Round(mm / 1000.0, 6) + 0.0).ToString("0.000000", CultureInfo.InvariantCulture);
}
