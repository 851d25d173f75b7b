/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Gap</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * An air gap across a leg.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Gap#getLength <em>Length</em>}</li>
 *   <li>{@link gapwright.model.Gap#getPieces <em>Pieces</em>}</li>
 *   <li>{@link gapwright.model.Gap#getFringing <em>Fringing</em>}</li>
 *   <li>{@link gapwright.model.Gap#getWindowHeight <em>Window Height</em>}</li>
 *   <li>{@link gapwright.model.Gap#getPosition <em>Position</em>}</li>
 *   <li>{@link gapwright.model.Gap#getPlace <em>Place</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getGap()
 * @model
 * @generated
 */
public interface Gap extends Element {
	/**
	 * Returns the value of the '<em><b>Length</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Length of each piece.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Length</em>' attribute.
	 * @see #setLength(Quantity)
	 * @see gapwright.model.GapwrightPackage#getGap_Length()
	 * @model dataType="gapwright.model.Length" required="true"
	 * @generated
	 */
	Quantity getLength();

	/**
	 * Sets the value of the '{@link gapwright.model.Gap#getLength <em>Length</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Length</em>' attribute.
	 * @see #getLength()
	 * @generated
	 */
	void setLength(Quantity value);

	/**
	 * Returns the value of the '<em><b>Pieces</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Number of equal pieces the gap is split into.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Pieces</em>' attribute.
	 * @see #setPieces(int)
	 * @see gapwright.model.GapwrightPackage#getGap_Pieces()
	 * @model default="1"
	 * @generated
	 */
	int getPieces();

	/**
	 * Sets the value of the '{@link gapwright.model.Gap#getPieces <em>Pieces</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Pieces</em>' attribute.
	 * @see #getPieces()
	 * @generated
	 */
	void setPieces(int value);

	/**
	 * Returns the value of the '<em><b>Fringing</b></em>' attribute.
	 * The literals are from the enumeration {@link gapwright.model.Fringing}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How the spreading of the field round the gap is reckoned.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Fringing</em>' attribute.
	 * @see gapwright.model.Fringing
	 * @see #setFringing(Fringing)
	 * @see gapwright.model.GapwrightPackage#getGap_Fringing()
	 * @model
	 * @generated
	 */
	Fringing getFringing();

	/**
	 * Sets the value of the '{@link gapwright.model.Gap#getFringing <em>Fringing</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Fringing</em>' attribute.
	 * @see gapwright.model.Fringing
	 * @see #getFringing()
	 * @generated
	 */
	void setFringing(Fringing value);

	/**
	 * Returns the value of the '<em><b>Window Height</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Height of the winding window beside the gap; left out: taken from the drawing where a method needs it.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Window Height</em>' attribute.
	 * @see #setWindowHeight(Quantity)
	 * @see gapwright.model.GapwrightPackage#getGap_WindowHeight()
	 * @model dataType="gapwright.model.Length"
	 * @generated
	 */
	Quantity getWindowHeight();

	/**
	 * Sets the value of the '{@link gapwright.model.Gap#getWindowHeight <em>Window Height</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Window Height</em>' attribute.
	 * @see #getWindowHeight()
	 * @generated
	 */
	void setWindowHeight(Quantity value);

	/**
	 * Returns the value of the '<em><b>Position</b></em>' attribute.
	 * The default value is <code>"0.5"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Place of its middle along the leg, as a fraction of the leg's length from its from joint.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Position</em>' attribute.
	 * @see #setPosition(double)
	 * @see gapwright.model.GapwrightPackage#getGap_Position()
	 * @model default="0.5"
	 * @generated
	 */
	double getPosition();

	/**
	 * Sets the value of the '{@link gapwright.model.Gap#getPosition <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Position</em>' attribute.
	 * @see #getPosition()
	 * @generated
	 */
	void setPosition(double value);

	/**
	 * Returns the value of the '<em><b>Place</b></em>' attribute.
	 * The literals are from the enumeration {@link gapwright.model.GapPlace}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the pole faces of the gap stand opposite; decides how far the field spreads.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Place</em>' attribute.
	 * @see gapwright.model.GapPlace
	 * @see #setPlace(GapPlace)
	 * @see gapwright.model.GapwrightPackage#getGap_Place()
	 * @model
	 * @generated
	 */
	GapPlace getPlace();

	/**
	 * Sets the value of the '{@link gapwright.model.Gap#getPlace <em>Place</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Place</em>' attribute.
	 * @see gapwright.model.GapPlace
	 * @see #getPlace()
	 * @generated
	 */
	void setPlace(GapPlace value);

} // Gap
