using ClubBench.Planning.Figures;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Advising;

/// <summary>The advice every stage kind gives unless it knows better: judge the last reading against its window, name a likely slip,
/// apply the one turn rule to windings, otherwise the kind's own ladder.</summary>
public static class ReadingAdvice
{
    /// <summary>Advice on the last reading of the request. Throws when there is none.</summary>
    public static Advice Give(AdviceRequest request)
    {
        if (request.Readings.Count == 0) throw new ArgumentException("There is no reading to advise on.", nameof(request));
        var reading = request.Readings[^1];
        var expected = request.Plan.Expected.FirstOrDefault(e => e.Point == reading.Point);
        if (expected is null || reading.Instrument is null) return new Advice(ReadingVerdict.Noted, [], NextPoint(request, reading), [], "noted");
        var corrected = CorrectedReading.Of(reading, request.Instruments);
        return WindowJudgement.Of(expected, corrected) switch
        {
            { Verdict: ReadingVerdict.Doubtful } j => Doubtful(expected, reading, corrected, j),
            _ when expected.Winding is not null => WindingAdvice.Give(request, expected, corrected, NextPoint(request, reading)),
            var j => ByWindow(request, expected, corrected, j, NextPoint(request, reading)),
        };
    }

    private static Advice Doubtful(ExpectedReading expected, Reading reading, CorrectedReading corrected, WindowJudgement judgement)
    {
        var figures = ReadingFigures.Of(expected, corrected);
        var step = judgement.LikelySi is { } likely
            ? new Step("advice.did-you-mean", [.. figures, Figure.Of("likely", expected.Kind, likely)])
            : new Step("advice.read-again", figures);
        return new Advice(ReadingVerdict.Doubtful, [step], reading.Point, [], "slip");
    }

    private static Advice ByWindow(AdviceRequest request, ExpectedReading expected, CorrectedReading corrected, WindowJudgement judgement, string? next)
    {
        var figures = ReadingFigures.Of(expected, corrected);
        return judgement.Verdict switch
        {
            ReadingVerdict.Good => new Advice(ReadingVerdict.Good, [], next, [], "window"),
            ReadingVerdict.NearEdge => new Advice(ReadingVerdict.NearEdge, [new Step("advice.near-edge", figures)], next, [], "window"),
            _ when request.BatchAlert => new Advice(ReadingVerdict.Out, [new Step("advice.batch-off", figures)], next, [], "batch"),
            _ => new Advice(ReadingVerdict.Out, [.. request.Plan.Card.Notes.IfOutside.Select(l => new Step(l.Code, [.. l.Figures, .. figures]))], expected.Point, [], "window"),
        };
    }

    private static string? NextPoint(AdviceRequest request, Reading reading)
    {
        var read = request.Readings.Where(r => r.Instrument is not null).Select(r => r.Point).Append(reading.Point).ToHashSet(StringComparer.Ordinal);
        return request.Plan.Expected.Select(e => e.Point).FirstOrDefault(p => !read.Contains(p));
    }
}
