namespace ScanSim.Display.Films;

/// <summary>Makes a film's bytes of its frames.</summary>
internal interface IFilmEncoder
{
    /// <summary>Encodes one frame. Called for several frames at the same time; the result depends on the arguments alone.</summary>
    ReadOnlyMemory<byte> Encode(int index, FrameBuffer frame, FrameBuffer? before);

    /// <summary>Takes the encoded frames, one after the other in their order.</summary>
    void Write(ReadOnlyMemory<byte> encoded);

    /// <summary>Called after the last frame.</summary>
    void Finish();
}
