using RangeReduce.SampleData;

if (args.Length is < 1 or > 2)
{
    Console.Error.WriteLine("Usage: dotnet run --project sampledata/generator -c Release -- SAMPLE-DATA-FOLDER [NEC-REFERENCE-FILE]");
    return 2;
}

var folder = args[0];
var design = Simulate("design", ["as designed"], Scenario.Design);
foreach (var (run, words, states) in Scenario.Runs)
{
    var spring = string.Equals(run, "spring-build", StringComparison.Ordinal);
    var asBuilt = Simulate(run, words, states);
    new RunFolderWriter(folder, run, spring ? "2025-04-09" : "2025-10-15").Write(asBuilt, design, spring ? "right" : null);
}

if (args.Length == 2)
{
    NecReferenceFile.Write(args[1]);
}

return 0;

// Each deck is kept beside the data, as it was run.
SimulatedAntenna[] Simulate(string name, string[] words, DipolePairGeometry[] geometries)
{
    var antennas = new SimulatedAntenna[geometries.Length];
    Parallel.For(0, geometries.Length, i =>
    {
        string[] title = ["Crossed dipoles of unequal length over a round plate,", .. words, $"State {Scenario.States[i]}; axis z, long arm along y makes a right-hand wave"];
        var deck = DipolePairDeck.Write(title, geometries[i], SimulatedAntenna.ControlCards);
        new DataText().Lines(deck.TrimEnd('\n')).Save(Path.Combine(folder, "decks", $"{name}-{Scenario.States[i]}.nec"));
        antennas[i] = SimulatedAntenna.Of(deck);
    });
    return antennas;
}
